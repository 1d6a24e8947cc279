import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTempDatabase, type TempDatabase } from '../testing/temp-database.js';

let database: TempDatabase;
beforeAll(async () => {
  database = await openTempDatabase();
  await database.writing.query(
    `INSERT INTO "part" ("id", "number", "kind", "description", "standing", "supply", "note", "attributes", "version",
      "createdAt", "updatedAt", "updatedBy")
      VALUES (1, 'KW-00001', 'other', 'Grease nipple', 'cleared', 'bought', '', '{}', 1, '2026', '2026', 'Lena')`,
  );
});
afterAll(() => database.close());

/** Adds a movement as any program with the file at hand could. */
function move(change: number, after: number, place = 'Rack A', kind = 'received'): Promise<unknown> {
  return database.writing.query(
    `INSERT INTO "stock_movement" ("partId", "kind", "change", "after", "place", "reason", "at", "actorName")
      VALUES (1, ?, ?, ?, ?, '', '2026-01-02T08:00:00.000Z', 'Lena')`,
    [kind, change, after, place],
  );
}

const levels = () =>
  database.writing.query<{ place: string; quantity: number }[]>(
    'SELECT "place", "quantity", "lastMovementId", "countedAt" FROM "stock_level" ORDER BY "place"',
  );

describe('the stock ledger in the database', () => {
  it('brings the level up to date by itself, place by place, whatever the case of the place', async () => {
    await move(5000, 5000);
    await move(-2000, 3000, 'rack a', 'issued');
    await move(1000, 1000, 'Rack B');
    await move(0, 3000, 'RACK A', 'counted');
    expect(await levels()).toEqual([
      { place: 'Rack A', quantity: 3000, lastMovementId: 4, countedAt: '2026-01-02T08:00:00.000Z' },
      { place: 'Rack B', quantity: 1000, lastMovementId: 3, countedAt: null },
    ]);
  });

  it.each([
    ['says more than the sum', 1000, 9000, 'Rack A'],
    ['says less than the sum', 1000, 1000, 'Rack A'],
    ['leaves a place below zero', -2000, -1000, 'Rack B'],
    ['starts a place with a sum it does not have', 1000, 2000, 'Rack C'],
    ['starts a place below zero', -1000, -1000, 'Rack C'],
  ])('refuses a movement that %s', async (_, change, after, place) => {
    const before = await levels();
    await expect(move(change, after, place)).rejects.toThrow('is the sum of its movements');
    expect(await levels()).toEqual(before);
    const [count] = await database.writing.query<{ n: number }[]>(
      'SELECT COUNT(*) AS n FROM "stock_movement"',
    );
    expect(count?.n).toBe(4);
  });

  it.each([
    ['a level set by hand', `UPDATE "stock_level" SET "quantity" = 7000 WHERE "place" = 'Rack A'`],
    [
      'a level for a place without movements',
      `INSERT INTO "stock_level" ("partId", "place", "quantity", "lastMovementId") VALUES (1, 'Rack D', 1000, 1)`,
    ],
    [
      'a level put in place of the true one',
      `INSERT OR REPLACE INTO "stock_level" ("partId", "place", "quantity", "lastMovementId")
        VALUES (1, 'Rack A', 1, 1)`,
    ],
    [
      'a level moved to another place',
      `UPDATE "stock_level" SET "place" = 'Rack E' WHERE "place" = 'Rack A'`,
    ],
    ['a level that is deleted', 'DELETE FROM "stock_level"'],
  ])('refuses %s', async (_, statement) => {
    await expect(database.writing.query(statement)).rejects.toThrow('is the sum of its movements');
  });

  it.each([
    ['changed', `UPDATE "stock_movement" SET "change" = 1 WHERE "id" = 1`],
    ['changed', `UPDATE "stock_movement" SET "reason" = 'other' WHERE "id" = 1`],
    ['deleted', 'DELETE FROM "stock_movement" WHERE "id" = 1'],
  ])('refuses a movement to be %s', async (word, statement) => {
    await expect(database.writing.query(statement)).rejects.toThrow(`never ${word}`);
  });

  it('refuses to put a movement in place of an older one', async () => {
    const replace = database.writing.query(
      `INSERT OR REPLACE INTO "stock_movement" ("id", "partId", "kind", "change", "after", "place", "reason", "at",
        "actorName") VALUES (1, 1, 'received', 9000, 7000, 'Rack A', '', '2026', 'Lena')`,
    );
    await expect(replace).rejects.toThrow('never replaced');
    const [sum] = await database.writing.query<{ total: number }[]>(
      `SELECT SUM("change") AS total FROM "stock_movement" WHERE "place" = 'Rack A'`,
    );
    expect(sum?.total).toBe(3000);
  });

  it('refuses a movement of a part that does not exist, and a part with movements to be deleted', async () => {
    await expect(database.writing.query('DELETE FROM "part" WHERE "id" = 1')).rejects.toThrow('FOREIGN KEY');
    const unknown = database.writing.query(
      `INSERT INTO "stock_movement" ("partId", "kind", "change", "after", "place", "reason", "at", "actorName")
        VALUES (99, 'received', 1, 1, 'Rack A', '', '2026', 'Lena')`,
    );
    await expect(unknown).rejects.toThrow('FOREIGN KEY');
  });
});
