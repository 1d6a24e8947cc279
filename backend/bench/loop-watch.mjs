import { readFileSync } from 'node:fs';

const TICK_MS = 2;
/** Nanoseconds that this process's first thread, the loop's, waited for a processor so far; the system counts them. */
const WAITED = `/proc/self/task/${process.pid}/schedstat`;

function waitedMs() {
  try {
    return Number(readFileSync(WAITED, 'utf8').split(' ')[1]) / 1e6;
  } catch {
    // Only Linux says; elsewhere all of a gap counts as a hold.
    return 0;
  }
}

/**
 * Watches how long the event loop is kept from turning. A gap between two ticks is a hold, less the time for which the
 * system gave the processor to other programs.
 */
export function watchLoop() {
  const seen = { gap: 0, hold: 0, holds: 0 };
  let last = performance.now();
  let lastWaited = waitedMs();
  const tick = () => {
    const now = performance.now();
    const waited = waitedMs();
    const gap = now - last - TICK_MS;
    const hold = gap - (waited - lastWaited);
    seen.gap = Math.max(seen.gap, gap);
    seen.hold = Math.max(seen.hold, hold);
    if (hold > 50) seen.holds += 1;
    last = performance.now();
    lastWaited = waited;
    timer = setTimeout(tick, TICK_MS);
  };
  let timer = setTimeout(tick, TICK_MS);
  return () => {
    clearTimeout(timer);
    return seen;
  };
}
