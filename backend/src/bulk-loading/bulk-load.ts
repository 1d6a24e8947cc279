import { calendarDay } from '@stageyard/libs/bill-of-materials';
import { openWriting } from '../database/connection.js';
import { badInput, type FieldIssue } from '../common/errors.js';
import { type Supplier } from '../suppliers/entities/supplier.entity.js';
import { Booking } from './booking.js';
import { type BulkLoadTask, type BulkProgress, type BulkResult } from './bulk-messages.js';
import { type BulkRows } from './bulk-row.js';
import { checkRow, type KnownSuppliers } from './check-row.js';
import { MOST_FINDINGS, Stage } from './stage.js';
import { issuesOf } from '../common/under-path.js';

type Database = ReturnType<typeof openWriting>;

/** Rows between two reports. */
const REPORT_EVERY = 2000;
/** The log of writes is emptied into the database after so many turns: oftener would write the same pages again. */
const TURNS_TO_CHECKPOINT = 3;

/** 256 MiB while a load runs (negative means KiB): inserts touch every index at places all over it. */
const CACHE_SIZE = -256 * 1024;

/** What the thread needs of the server. */
export interface LoadOffice {
  report(progress: BulkProgress): void;
  /** Runs the work while no other write is under way. */
  turn(work: () => void): Promise<void>;
}

/**
 * Loads every row of the source: checks all of them first, then books them turn by turn. Runs in a thread of its own.
 * @throws ProblemError listing rows at fault (the first 100), before anything is booked. A failure later on leaves the
 * turns that were booked, each of them whole.
 */
export async function bulkLoad(task: BulkLoadTask, office: LoadOffice): Promise<BulkResult> {
  const database = openWriting(task.file);
  database.pragma(`cache_size = ${CACHE_SIZE}`);
  // Otherwise every commit would empty the log, while others wait.
  database.pragma('wal_autocheckpoint = 0');
  const stage = new Stage(database, task.stageFile);
  try {
    await fill(stage, task, suppliersOf(database), office);
    return await book(database, stage, task, office);
  } finally {
    stage.remove();
    database.close();
  }
}

async function fill(
  stage: Stage,
  { source, at }: BulkLoadTask,
  suppliers: KnownSuppliers,
  office: LoadOffice,
): Promise<void> {
  const { default: rows } = (await import(source.module)) as { default: BulkRows };
  const findings: FieldIssue[] = [];
  const today = calendarDay(new Date(at));
  let index = 0;
  for await (const row of rows(source.options)) {
    try {
      stage.add(index + 1, checkRow(row, suppliers, today));
    } catch (error) {
      const issues = issuesOf(error);
      if (issues === null) throw error;
      findings.push(...issues.map((issue) => ({ ...issue, field: `rows.${index}.${issue.field}` })));
      if (findings.length >= MOST_FINDINGS) break;
    }
    index += 1;
    if (index % REPORT_EVERY === 0) office.report({ phase: 'checking', done: index, of: null });
  }
  findings.push(...stage.close());
  const [first] = findings;
  if (!first) return;
  const more =
    findings.length > 1 ? ` There are ${Math.min(findings.length, MOST_FINDINGS)} such faults.` : '';
  throw badInput(
    findings.slice(0, MOST_FINDINGS),
    `Nothing was loaded. ${first.field}: ${first.message}${more}`,
  );
}

async function book(
  database: Database,
  stage: Stage,
  task: BulkLoadTask,
  office: LoadOffice,
): Promise<BulkResult> {
  const booking = new Booking(database, stage, task);
  for (let turns = 1; !booking.isOver; turns += 1) {
    await office.turn(() => {
      // In a turn, and before its rows: a write meanwhile, or the first one after it, would wait for the disk on the
      // server's loop.
      if (turns % TURNS_TO_CHECKPOINT === 0) database.pragma('wal_checkpoint(RESTART)');
      booking.turn();
    });
    office.report({ phase: 'booking', done: booking.done, of: stage.parts });
  }
  // The long log gives its room on the disk back.
  await office.turn(() => database.pragma('wal_checkpoint(TRUNCATE)'));
  const { parts, offers, counts } = stage;
  return { parts, offers, counts, first: booking.first, last: booking.last };
}

function suppliersOf(database: Database): KnownSuppliers {
  const rows = database.prepare<[], Supplier>(`SELECT * FROM "main"."supplier"`).all();
  return new Map(rows.map((supplier) => [supplier.code.toUpperCase(), supplier]));
}
