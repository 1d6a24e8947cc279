import { type AuditRecord } from '../audit/audit.service.js';
import { type FieldIssue } from '../common/errors.js';
import { type BulkSource } from './bulk-row.js';

/** What the thread is given at its start. */
export interface BulkLoadTask {
  /** The database file. */
  file: string;
  /** Where rows wait between being checked and being booked; made and removed by the thread. */
  stageFile: string;
  source: BulkSource;
  actor: AuditRecord['actor'];
  /** The moment of the load: ISO 8601, UTC. */
  at: string;
  /** Parts booked in one turn of the write queue. */
  turnSize: number;
}

/** How far a load has come, in parts. */
export interface BulkProgress {
  phase: 'checking' | 'booking';
  done: number;
  /** Null while rows are still being read. */
  of: number | null;
}

/** What a load added. */
export interface BulkResult {
  parts: number;
  offers: number;
  /** Parts that came with a count of their shelf. */
  counts: number;
  /** Numbers of the first and the last part; null for a load without rows. */
  first: string | null;
  last: string | null;
}

/** What the thread says. It writes only between the server's `go` and its own `over`. */
export type ThreadMessage =
  | { kind: 'progress'; progress: BulkProgress }
  | { kind: 'turn' }
  | { kind: 'over' }
  | { kind: 'done'; result: BulkResult }
  | { kind: 'refused'; message: string; errors: FieldIssue[] };
