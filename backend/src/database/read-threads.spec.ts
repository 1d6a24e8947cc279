import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openTempDatabase, type TempDatabase } from '../testing/temp-database.js';
import { workerEntry } from '../workers/worker-entry.js';
import { DATABASE_FILE } from './data-sources.js';
import { ReadThreads } from './read-threads.js';

let database: TempDatabase;
let threads: ReadThreads;
beforeEach(async () => {
  database = await openTempDatabase();
  threads = new ReadThreads(workerEntry('read.worker'), path.join(database.dataDir, DATABASE_FILE));
});
afterEach(async () => {
  await threads.onApplicationShutdown();
  await database.close();
});

const add = (prefix: string, last: number) =>
  database.queue.run((manager) =>
    manager.query('INSERT INTO "part_number_series" VALUES (?, ?)', [prefix, last]),
  );
const COUNT = { sql: 'SELECT COUNT(*) AS "count" FROM "part_number_series"', params: [], keep: true };

describe('reading threads', () => {
  it('answer several statements, with whole rows in the order of their keys', async () => {
    await add('A-', 1);
    await add('B-', 2);
    const keys = 'SELECT "prefix" FROM "part_number_series" WHERE "last" > ? ORDER BY "prefix" DESC';
    const whole = 'SELECT "last", "prefix" FROM "part_number_series" WHERE "prefix" = ?';
    const [rows, counted] = await threads.read({ sql: keys, params: [0], whole }, COUNT);
    expect(rows).toEqual([
      { last: 2, prefix: 'B-' },
      { last: 1, prefix: 'A-' },
    ]);
    expect(counted).toEqual([{ count: 2 }]);
  });

  it('keep an answer only until something is committed', async () => {
    for (let added = 0; added < 5; added += 1) {
      for (let again = 0; again < 3; again += 1) {
        expect(await threads.read(COUNT)).toEqual([[{ count: added }]]);
      }
      await add(`${added}-`, 1);
    }
  });

  it('cannot write, and go on after a statement that fails', async () => {
    const write = { sql: `INSERT INTO "part_number_series" VALUES ('X-', 1)`, params: [] };
    await expect(threads.read(write)).rejects.toThrow();
    await expect(threads.read({ sql: 'SELECT nowhere', params: [] })).rejects.toThrow('no such column');
    expect(await threads.read(COUNT)).toEqual([[{ count: 0 }]]);
  });
});
