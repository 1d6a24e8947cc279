import type BetterSqlite3 from 'better-sqlite3';
import { type BulkLoadTask, type BulkResult } from './bulk-messages.js';

/**
 * Writes a row of the record in the transaction of a turn. A load of one turn is one row, “loaded”; a longer one says
 * with its first turn that it began, so that a load that broke off is seen as such.
 */
export function recordLoad(
  database: BetterSqlite3.Database,
  { actor, at }: BulkLoadTask,
  load: BulkResult,
  action: 'loaded' | 'began to load',
): void {
  const { parts, offers, counts, first, last } = load;
  const figure = (count: number, one: string) =>
    `${count.toLocaleString('en-GB')} ${one}${count === 1 ? '' : 's'}`;
  const what = `${figure(parts, 'part')} with ${figure(offers, 'offer')} and ${figure(counts, 'opening count')}`;
  const summary =
    action === 'loaded'
      ? `Loaded ${what}: ${first} to ${last}`
      : `Began to load ${what}, from ${first} on; another entry follows when all are there`;
  database
    .prepare(
      `INSERT INTO "audit_entries"
          ("at", "actorId", "actorName", "action", "entity", "entityId", "summary", "before", "after")
        VALUES (?, ?, ?, ?, 'part', ?, ?, NULL, ?)`,
    )
    .run(at, actor.id, actor.name, action, first, summary, JSON.stringify(load));
}
