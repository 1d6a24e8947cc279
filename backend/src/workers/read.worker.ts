import { workerData } from 'node:worker_threads';
import Database from 'better-sqlite3';
import { openReading } from '../database/connection.js';
import { KeptTables } from '../database/kept-tables.js';
import {
  type ReadReply,
  type ReadStatement,
  type ReadTask,
  type ReadThreadData,
  type Table,
} from '../database/read-task.js';

const database = openReading((workerData as ReadThreadData).file);
const kept = new KeptTables();

/** A statement whose rows come as arrays, with the names of its columns. */
interface Prepared {
  columns: string[];
  statement: Database.Statement<unknown[], unknown[]>;
}

const known = new Map<string, Prepared>();
/** Texts vary with the filters used; beyond this many the oldest is prepared anew. */
const MOST_KNOWN = 100;

function prepared(sql: string): Prepared {
  const before = known.get(sql);
  if (before) return before;
  const statement = database.prepare<unknown[], unknown[]>(sql).raw(true);
  const fresh = { statement, columns: statement.columns().map(({ name }) => name) };
  const [oldest] = known.keys();
  if (known.size >= MOST_KNOWN && oldest !== undefined) known.delete(oldest);
  known.set(sql, fresh);
  return fresh;
}

function tableOf({ sql, params, whole }: ReadStatement): Table {
  const { columns, statement } = prepared(sql);
  const rows = statement.all(...params);
  if (whole === undefined) return { columns, rows };
  const one = prepared(whole);
  const found = rows.map(([key]) => one.statement.get(key)).filter((row) => row !== undefined);
  return { columns: one.columns, rows: found };
}

/** Thread entry point: reads lists on a connection of its own. */
export default function read({ statements }: ReadTask): ReadReply {
  try {
    return { tables: readTables(statements) };
  } catch (error) {
    if (!(error instanceof Database.SqliteError)) throw error;
    return { failed: { message: error.message, code: error.code } };
  }
}

/** All statements on the same state of the database. */
const readTables = database.transaction((statements: readonly ReadStatement[]): Table[] => {
  kept.of(Number(database.pragma('data_version', { simple: true })));
  return statements.map((one) => (one.keep ? kept.get(one, tableOf) : tableOf(one)));
});
