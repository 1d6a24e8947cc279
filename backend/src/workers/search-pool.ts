import { availableParallelism } from 'node:os';
import { MessageChannel } from 'node:worker_threads';
import { type OnApplicationShutdown } from '@nestjs/common';
import { type OptionRequest, type SearchOutcome } from '@stageyard/libs/train-planner';
import { InputError } from '@stageyard/libs/units';
import { Piscina } from 'piscina';
import { StopFlag } from './stop-flag.js';
import { type SearchProgress, type SearchReply, type SearchReport, type SearchTask } from './search-task.js';

export interface SearchRunOptions {
  /** Counted from the moment a thread takes the search; past it the outcome says `complete: false`. */
  timeLimitMs: number;
  onStart?: () => void;
  onProgress?: (progress: SearchProgress) => void;
  stopFlag?: StopFlag;
}

/** The thread that ran a search ended before it answered; the server itself goes on. */
export class SearchCrashed extends Error {
  constructor(cause: unknown) {
    super('The search broke off before it finished. Start it again; if it happens again, narrow the brief.');
    this.name = 'SearchCrashed';
    this.cause = cause;
  }
}

export interface SearchPoolOptions {
  /** Built thread entry point. */
  entry: string;
  threads?: number;
  /** How long a thread may take to notice a stop or its time limit before it is ended by force, ms. */
  graceMs?: number;
}

/** A thread past this ends as a crash of its search instead of taking the server's memory. */
const THREAD_MEMORY_MB = 1024;
const DEFAULT_GRACE_MS = 10_000;

/** Worker threads for option searches: one core stays free for answering requests. */
export class SearchPool implements OnApplicationShutdown {
  private readonly pool: Piscina<SearchTask, SearchReply>;
  private readonly graceMs: number;
  private readonly flags = new Set<StopFlag>();

  constructor(options: SearchPoolOptions) {
    this.graceMs = options.graceMs ?? DEFAULT_GRACE_MS;
    this.pool = new Piscina({
      filename: options.entry,
      // With none kept, a thread that dies would leave the searches that wait behind it waiting for ever.
      minThreads: 1,
      maxThreads: options.threads ?? Math.max(1, availableParallelism() - 1),
      idleTimeout: 60_000,
      // An idle thread that blocks on shared memory would not end by itself.
      atomics: 'disabled',
      resourceLimits: { maxOldGenerationSizeMb: THREAD_MEMORY_MB },
    });
  }

  /**
   * Runs one search on a thread, waiting for a free one.
   * @returns the outcome; after a stop or past the time limit the best found so far, `complete: false`
   * @throws InputError when the planner refuses the request; SearchCrashed when the thread ended before it answered
   */
  async run(request: OptionRequest, options: SearchRunOptions): Promise<SearchOutcome> {
    const stopFlag = options.stopFlag ?? new StopFlag();
    if (stopFlag.raised) return stoppedBeforeStart();
    const { port1: reports, port2: threadSide } = new MessageChannel();
    const abort = new AbortController();
    const timers: NodeJS.Timeout[] = [];
    const endByForceAfter = (ms: number) => timers.push(setTimeout(() => abort.abort(), ms));
    let started = false;
    reports.on('message', (report: SearchReport) => {
      if (report.kind === 'progress') return options.onProgress?.(report.progress);
      started = true;
      endByForceAfter(options.timeLimitMs + this.graceMs);
      options.onStart?.();
    });
    const forget = stopFlag.onRaise(() => (started ? endByForceAfter(this.graceMs) : abort.abort()));
    this.flags.add(stopFlag);
    try {
      const task: SearchTask = {
        request,
        timeLimitMs: options.timeLimitMs,
        stop: stopFlag.shared,
        reports: threadSide,
      };
      const reply = await this.pool.run(task, { transferList: [threadSide], signal: abort.signal });
      if (!reply.ok) throw new InputError(reply.errors, reply.message);
      return reply.outcome;
    } catch (error) {
      if (error instanceof InputError) throw error;
      if (stopFlag.raised && !started) return stoppedBeforeStart();
      throw new SearchCrashed(error);
    } finally {
      timers.forEach(clearTimeout);
      forget();
      this.flags.delete(stopFlag);
      reports.close();
    }
  }

  /** Stops what runs and ends the threads, so that the process can end. */
  async onApplicationShutdown(): Promise<void> {
    for (const flag of this.flags) flag.raise();
    await this.pool.destroy();
  }
}

function stoppedBeforeStart(): SearchOutcome {
  return { options: [], search: { complete: false, combinations: 0, elapsedMs: 0 }, whyNot: [] };
}
