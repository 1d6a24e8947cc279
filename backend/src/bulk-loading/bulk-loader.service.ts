import path from 'node:path';
import { Worker } from 'node:worker_threads';
import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { type AuditRecord } from '../audit/audit.service.js';
import { Clock } from '../common/clock.js';
import { badInput } from '../common/errors.js';
import { DATABASE_FILE } from '../database/data-sources.js';
import { WriteQueue } from '../database/write-queue.js';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { workerEntry } from '../workers/worker-entry.js';
import {
  type BulkLoadTask,
  type BulkProgress,
  type BulkResult,
  type ThreadMessage,
} from './bulk-messages.js';
import { type BulkSource } from './bulk-row.js';

/** Parts booked in one turn: about a second, for which another write may have to wait; shorter turns write more. */
const TURN_SIZE = 8000;
/** What the database driver starts with, pages. */
const USUAL_CHECKPOINT = 1000;

export interface BulkLoadOptions {
  onProgress?: (progress: BulkProgress) => void;
  /** Parts booked in one turn of the write queue. */
  turnSize?: number;
}

/**
 * Loads very many parts with their offers and opening counts while the server goes on serving. Everything is checked
 * before anything is booked: one wrong row refuses the load as a whole. Booking then takes turns with all other writes;
 * each turn leaves whole parts. A server that dies in between keeps the turns it had booked: the record then says that
 * the load began, and not that it is all there.
 */
@Injectable()
export class BulkLoader implements OnApplicationShutdown {
  private readonly threads = new Set<Worker>();
  private tail: Promise<unknown> = Promise.resolve();

  constructor(
    private readonly queue: WriteQueue,
    private readonly clock: Clock,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  /**
   * Loads the rows of a source; one load at a time, others wait.
   * @throws ProblemError 400 naming `rows.<index>.…` (the first 100 faults), with nothing booked
   */
  load(
    actor: AuditRecord['actor'],
    source: BulkSource,
    { onProgress, turnSize = TURN_SIZE }: BulkLoadOptions = {},
  ): Promise<BulkResult> {
    const { dataDir } = this.settings;
    const task = (): BulkLoadTask => ({
      file: path.join(dataDir, DATABASE_FILE),
      stageFile: path.join(dataDir, 'bulk-load.stage'),
      source,
      actor: { id: actor.id, name: actor.name },
      at: this.clock.iso(),
      turnSize,
    });
    const result = this.tail.then(() => this.withLongLog(() => this.runThread(task(), onProgress)));
    this.tail = result.catch(() => undefined);
    return result;
  }

  async onApplicationShutdown(): Promise<void> {
    await Promise.all([...this.threads].map((thread) => thread.terminate()));
  }

  /** The thread empties the log of writes; a small write of somebody else must not have to do it on the server's loop. */
  private async withLongLog<T>(load: () => Promise<T>): Promise<T> {
    await this.setCheckpoint(0);
    try {
      return await load();
    } finally {
      await this.setCheckpoint(USUAL_CHECKPOINT).catch(() => undefined);
    }
  }

  private setCheckpoint(pages: number): Promise<unknown> {
    return this.queue.run((manager) => manager.query(`PRAGMA wal_autocheckpoint = ${pages}`));
  }

  private runThread(task: BulkLoadTask, onProgress: BulkLoadOptions['onProgress']): Promise<BulkResult> {
    const thread = new Worker(workerEntry('bulk-load.worker'), { workerData: task });
    this.threads.add(thread);
    let endTurn = () => {};
    let ended = false;
    const giveTurn = () =>
      this.queue.lease(
        () =>
          new Promise<void>((resolve) => {
            if (ended) return resolve();
            endTurn = resolve;
            thread.postMessage({ kind: 'go' });
          }),
      );
    return new Promise<BulkResult>((resolve, reject) => {
      thread.on('message', (message: ThreadMessage) => {
        if (message.kind === 'progress') onProgress?.(message.progress);
        else if (message.kind === 'turn')
          giveTurn().catch((error: Error) => thread.terminate().then(() => reject(error)));
        else if (message.kind === 'over') endTurn();
        else if (message.kind === 'done') resolve(message.result);
        else reject(badInput(message.errors, message.message));
      });
      thread.on('error', reject);
      thread.on('exit', () => {
        ended = true;
        this.threads.delete(thread);
        // A thread that ends in its turn has rolled it back: the database closed with it.
        endTurn();
        reject(
          new Error('The load broke off. What was booked before stays; the record says how far it came.'),
        );
      });
    });
  }
}
