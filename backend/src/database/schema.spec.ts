import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTempDatabase, type TempDatabase } from '../testing/temp-database.js';
import { openWriting } from './connection.js';
import { DATABASE_FILE, openWritingSource } from './data-sources.js';

let database: TempDatabase;
beforeAll(async () => {
  database = await openTempDatabase();
});
afterAll(() => database.close());

async function pragma(source: TempDatabase['source'], name: string): Promise<unknown> {
  const [row] = await source.query<Record<string, unknown>[]>(`PRAGMA ${name}`);
  return Object.values(row ?? {})[0];
}

describe('the database', () => {
  it('is set up so that a commit is never lost and references always hold', async () => {
    // The queue waits for the disk after each of its commits; a connection of its own must do so itself.
    const [NORMAL, FULL] = [1, 2];
    expect(await pragma(database.writing, 'journal_mode')).toBe('wal');
    expect(await pragma(database.writing, 'synchronous')).toBe(NORMAL);
    const thread = openWriting(path.join(database.dataDir, DATABASE_FILE));
    expect(thread.pragma('synchronous', { simple: true })).toBe(FULL);
    thread.close();
    expect(await pragma(database.writing, 'foreign_keys')).toBe(1);
    expect(await pragma(database.writing, 'busy_timeout')).toBe(5000);
    expect(await pragma(database.source, 'query_only')).toBe(1);
    expect(await pragma(database.source, 'busy_timeout')).toBe(5000);
  });

  it('has exactly the tables and columns that the entities describe', async () => {
    const pending = await database.writing.driver.createSchemaBuilder().log();
    expect(pending.upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('opens a second time without migrating again, and keeps what is there', async () => {
    const again = await openWritingSource(database.dataDir);
    const rows = await again.query<{ name: string }[]>('SELECT name FROM "migrations"');
    await again.destroy();
    expect(rows).toHaveLength(again.migrations.length);
  });

  it('can undo every migration', async () => {
    const other = await openTempDatabase();
    await other.writing.query('PRAGMA foreign_keys = OFF');
    for (let left = other.writing.migrations.length; left > 0; left -= 1)
      await other.writing.undoLastMigration();
    const tables = await other.writing.query<{ name: string }[]>(
      `SELECT name FROM sqlite_master WHERE type = 'table' AND name NOT LIKE 'sqlite_%' AND name <> 'migrations'`,
    );
    await other.close();
    expect(tables).toEqual([]);
  });

  it('keeps the record of changes from being rewritten', async () => {
    const values = `'2026-01-01', 'Somebody', 'added', 'part', 'KW-00001', 'added'`;
    const columns = '"at", "actorName", "action", "entity", "entityId", "summary"';
    await database.writing.query(`INSERT INTO "audit_entries" (${columns}) VALUES (${values})`);
    await expect(database.writing.query(`UPDATE "audit_entries" SET "summary" = ''`)).rejects.toThrow(
      'never changed',
    );
    await expect(database.writing.query('DELETE FROM "audit_entries"')).rejects.toThrow('never deleted');
  });
});
