import { type MessagePort } from 'node:worker_threads';
import { type OptionRequest, type SearchOutcome } from '@stageyard/libs/train-planner';
import { type FieldIssue } from '@stageyard/libs/units';

/** How far a search has come; `settled` and `total` count combinations of the present phase. */
export interface SearchProgress {
  phase: string;
  stages: number;
  settled: number;
  total: number;
  found: number;
}

/** What the pool hands to a worker thread. */
export interface SearchTask {
  request: OptionRequest;
  timeLimitMs: number;
  /** One shared word; other than 0 means stop. */
  stop: Int32Array;
  reports: MessagePort;
}

/** What a worker thread says while it works. */
export type SearchReport = { kind: 'started' } | { kind: 'progress'; progress: SearchProgress };

/** What a worker thread answers. A refusal is data, since an error loses its fields between threads. */
export type SearchReply =
  { ok: true; outcome: SearchOutcome } | { ok: false; message: string; errors: FieldIssue[] };
