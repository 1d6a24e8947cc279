import { availableParallelism } from 'node:os';
import { type OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import {
  type ReadReply,
  type ReadStatement,
  type ReadTask,
  type ReadThreadData,
  type Row,
  type Table,
} from './read-task.js';

/** A second one, so that a quick list need not wait behind a slow one. */
const MOST_THREADS = 2;

/**
 * Threads that read lists: sorting or counting hundreds of thousands of rows takes longer than the server's loop may be
 * held. Each thread has a read-only connection of its own; what is committed is seen at once.
 */
export class ReadThreads implements OnApplicationShutdown {
  private readonly pool: Piscina<ReadTask, ReadReply>;

  /**
   * @param entry built thread entry point
   * @param file the database, migrated already
   */
  constructor(entry: string, file: string) {
    this.pool = new Piscina({
      filename: entry,
      workerData: { file } satisfies ReadThreadData,
      minThreads: 1,
      maxThreads: Math.min(MOST_THREADS, Math.max(1, availableParallelism())),
      idleTimeout: 60_000,
      // An idle thread that blocks on shared memory would not end by itself.
      atomics: 'disabled',
    });
  }

  /**
   * Runs statements on one thread, all on the same state of the database.
   * @returns the rows of each, as the driver gives them
   * @throws Error of the database, for a statement that is wrong or would write
   */
  async read(...statements: ReadStatement[]): Promise<Row[][]> {
    const reply = await this.pool.run({ statements });
    if ('tables' in reply) return reply.tables.map(rowsOf);
    const { message, code } = reply.failed;
    throw Object.assign(new Error(message), { code });
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool.destroy();
  }
}

function rowsOf({ columns, rows }: Table): Row[] {
  return rows.map((values) => {
    const row: Row = {};
    columns.forEach((column, index) => (row[column] = values[index]));
    return row;
  });
}
