import 'reflect-metadata';
import { parentPort, workerData } from 'node:worker_threads';
import { bulkLoad } from '../bulk-loading/bulk-load.js';
import { type BulkLoadTask, type ThreadMessage } from '../bulk-loading/bulk-messages.js';
import { ProblemError } from '../common/errors.js';

/** Thread entry point: checks and books one load; writes only when the server says go. */
const say = (message: ThreadMessage) => parentPort?.postMessage(message);
const nextMessage = () => new Promise((resolve) => parentPort?.once('message', resolve));

async function turn(work: () => void): Promise<void> {
  const go = nextMessage();
  say({ kind: 'turn' });
  await go;
  try {
    work();
  } finally {
    say({ kind: 'over' });
  }
}

try {
  const report = (progress: Extract<ThreadMessage, { kind: 'progress' }>['progress']) =>
    say({ kind: 'progress', progress });
  say({ kind: 'done', result: await bulkLoad(workerData as BulkLoadTask, { report, turn }) });
} catch (error) {
  // A refusal is data, since an error loses its fields between threads.
  if (!(error instanceof ProblemError)) throw error;
  say({ kind: 'refused', message: error.message, errors: [...(error.errors ?? [])] });
}
