import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable, Logger, type OnApplicationShutdown } from '@nestjs/common';
import { type DataSource, type EntityManager } from 'typeorm';
import { WriteLog } from './write-log.js';

interface RunningWrite {
  open: boolean;
}

/** The driver is synchronous: a write that holds the queue this long is worth a line in the log. */
const SLOW_MS = 250;
/** A thread's turn keeps only other writes waiting. */
const SLOW_TURN_MS = 2000;

/**
 * The only way to change the database. Works are run one after the other, each in a transaction of its own:
 * a work that throws is rolled back alone, and its error reaches the caller.
 */
@Injectable()
export class WriteQueue implements OnApplicationShutdown {
  readonly #source: DataSource;
  readonly #log: WriteLog;
  readonly #running = new AsyncLocalStorage<RunningWrite>();
  readonly #logger = new Logger(WriteQueue.name);
  #tail: Promise<unknown> = Promise.resolve();
  #closed = false;

  readonly #afterClose: () => void;

  /** @param afterClose called once the last write is done and the database is closed */
  constructor(source: DataSource, afterClose: () => void = () => undefined) {
    this.#source = source;
    this.#log = new WriteLog(String(source.options.database));
    this.#afterClose = afterClose;
  }

  /**
   * Runs the work in a transaction once everything queued before it is settled. Resolves once the commit is on the disk.
   * @param work changes the database only through the manager it is given
   * @throws Error when called from inside another work: that would wait for itself for ever
   */
  async run<T>(work: (manager: EntityManager) => Promise<T>): Promise<T> {
    return this.#enqueue(async (write) => {
      const result = await this.#running.run(write, () => this.#source.transaction(work));
      write.open = false;
      await this.#log.toDisk();
      return result;
    }, SLOW_MS);
  }

  /**
   * Keeps every other write waiting while a thread writes on a connection of its own. Resolves when the turn is over.
   * @param turn settles once the thread has committed or rolled back
   * @throws Error when called from inside another work: that would wait for itself for ever
   */
  async lease<T>(turn: () => Promise<T>): Promise<T> {
    return this.#enqueue((write) => this.#running.run(write, turn), SLOW_TURN_MS);
  }

  async #enqueue<T>(work: (write: RunningWrite) => Promise<T>, slowMs: number): Promise<T> {
    if (this.#running.getStore()?.open) {
      throw new Error('WriteQueue.run was called inside a write. Pass the manager on instead.');
    }
    if (this.#closed) throw new Error('The database is closed.');
    const result = this.#tail.then(() => this.#timed(work, slowMs));
    this.#tail = result.catch(() => undefined);
    return result;
  }

  async onApplicationShutdown(): Promise<void> {
    this.#closed = true;
    await this.#tail;
    await this.#log.close();
    if (this.#source.isInitialized) {
      // A reading connection that closes last cannot empty the log: done here, a copied folder is whole without it.
      await this.#source.query('PRAGMA wal_checkpoint(TRUNCATE)');
      await this.#source.destroy();
    }
    this.#afterClose();
  }

  async #timed<T>(work: (write: RunningWrite) => Promise<T>, slowMs: number): Promise<T> {
    const write: RunningWrite = { open: true };
    const start = performance.now();
    try {
      return await work(write);
    } finally {
      write.open = false;
      const elapsed = performance.now() - start;
      if (elapsed > slowMs) this.#logger.warn(`A write held the queue for ${elapsed.toFixed(0)} ms`);
    }
  }
}
