import { workerData } from 'node:worker_threads';
import type BetterSqlite3 from 'better-sqlite3';
import { openReading } from '../database/connection.js';
import { KeptRows } from '../database/kept-rows.js';
import { type ReadStatement, type ReadTask, type ReadThreadData, type Row } from '../database/read-task.js';

const database = openReading((workerData as ReadThreadData).file);
const kept = new KeptRows();
const prepared = new Map<string, BetterSqlite3.Statement<unknown[], Row>>();
/** Texts vary with the filters used; beyond this many the oldest is prepared anew. */
const MOST_PREPARED = 100;

function statement(sql: string): BetterSqlite3.Statement<unknown[], Row> {
  const known = prepared.get(sql);
  if (known) return known;
  const fresh = database.prepare<unknown[], Row>(sql);
  const [oldest] = prepared.keys();
  if (prepared.size >= MOST_PREPARED && oldest !== undefined) prepared.delete(oldest);
  prepared.set(sql, fresh);
  return fresh;
}

function rowsOf({ sql, params, whole }: ReadStatement): Row[] {
  const found = statement(sql).all(...params);
  if (whole === undefined) return found;
  const one = statement(whole);
  return found.map((row) => one.get(Object.values(row)[0])).filter((row) => row !== undefined);
}

/** Thread entry point: reads lists on a connection of its own. */
export default function read({ statements }: ReadTask): Row[][] {
  return database.transaction(() => {
    kept.of(Number(database.pragma('data_version', { simple: true })));
    return statements.map((one) => (one.keep ? kept.get(one, rowsOf) : rowsOf(one)));
  })();
}
