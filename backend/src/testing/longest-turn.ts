import { setImmediate as nextTurn } from 'node:timers/promises';

/**
 * Runs the work and watches the loop beside it.
 * @returns what the work gave, and the longest that anybody else had to wait for a turn, ms. Time in which the machine was
 * busy with other programs does not count.
 */
export async function longestTurn<T>(work: () => Promise<T>): Promise<{ result: T; longest: number }> {
  let done = false;
  let longest = 0;
  const watching = (async () => {
    while (!done) {
      const [wall, processor] = [performance.now(), process.cpuUsage()];
      await nextTurn();
      const { user, system } = process.cpuUsage(processor);
      longest = Math.max(longest, Math.min(performance.now() - wall, (user + system) / 1000));
    }
  })();
  try {
    return { result: await work(), longest };
  } finally {
    done = true;
    await watching;
  }
}
