import { setImmediate as nextTurn } from 'node:timers/promises';

/** Work done before other requests get their turn, ms. */
const TURN_MS = 15;

/** Gives others their turn once enough work was done since the last time; call it after each small piece of work. */
export function politePause(): () => Promise<void> {
  let since = performance.now();
  return async () => {
    if (performance.now() - since < TURN_MS) return;
    await nextTurn();
    since = performance.now();
  };
}
