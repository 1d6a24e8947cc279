import { searchOptions } from '@stageyard/libs/train-planner';
import { InputError } from '@stageyard/libs/units';
import { throttle } from './throttle.js';
import { type SearchProgress, type SearchReply, type SearchReport, type SearchTask } from './search-task.js';

/** About five reports a second: enough to look alive, too few to load the event loop of the server. */
const REPORT_EVERY_MS = 200;

/** Thread entry point: runs one option search and answers when it is done, stopped or out of time. */
export default function runOptionSearch(task: SearchTask): SearchReply {
  const report = (message: SearchReport) => task.reports.postMessage(message);
  report({ kind: 'started' });
  const onProgress = throttle(REPORT_EVERY_MS, (progress: SearchProgress) =>
    report({ kind: 'progress', progress }),
  );
  try {
    const outcome = searchOptions(task.request, {
      onProgress,
      shouldStop: () => Atomics.load(task.stop, 0) !== 0,
      timeLimitMs: task.timeLimitMs,
      now: () => performance.now(),
    });
    return { ok: true, outcome };
  } catch (error) {
    if (error instanceof InputError) return { ok: false, message: error.message, errors: error.errors };
    throw error;
  }
}
