import path from 'node:path';
import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DataSource } from 'typeorm';
import { createApp } from '../app.js';
import { PartsReader } from '../parts/parts-reader.service.js';
import { StockReader } from '../stock/stock-reader.service.js';
import { tempSettings } from '../testing/temp-settings.js';
import { DATABASE_FILE, makeDataFolder } from './data-sources.js';
import { MIGRATIONS } from './migrations.js';
import { Initial1764600000000 } from './migrations/1764600000000-initial.js';

type Row = Record<string, unknown>;

const AT = '2026-01-05T08:00:00.000Z';
const OWNED = { ownerId: 'lena', version: 3, createdAt: AT, updatedAt: AT };
const PART = { standing: 'cleared', supply: 'bought', note: '', version: 2, createdAt: AT, updatedAt: AT };

/** Rows as the first release wrote them, parents first. */
const OLDER: [table: string, row: Row][] = [
  [
    'users',
    {
      id: 'lena',
      email: 'librarian@brackenbay.example',
      name: 'Lena Brook',
      passwordHash: 'x',
      roles: '["librarian"]',
      active: 1,
      demo: 0,
      version: 1,
      createdAt: AT,
      updatedAt: AT,
    },
  ],
  ['sessions', { id: 's', userId: 'lena', createdAt: AT, seenAt: AT, expiresAt: AT }],
  ['part_number_series', { prefix: 'KW-', last: 2 }],
  [
    'part',
    {
      ...PART,
      id: 7,
      number: 'KW-00001',
      kind: 'lubricant',
      description: 'Gear oil 220',
      attributes: '{"viscosityGrade":"ISO VG 220","packVolume":5}',
      updatedBy: 'Lena Brook',
    },
  ],
  [
    'part',
    {
      ...PART,
      id: 9,
      number: 'KW-00002',
      kind: 'other',
      description: 'Grease nipple',
      attributes: '{}',
      updatedBy: 'Lena Brook',
    },
  ],
  [
    'brief',
    { ...OWNED, id: 4, code: 'B-0004', title: 'Vent drive', note: '', requirement: '{}', standing: 'open' },
  ],
  [
    'train',
    {
      ...OWNED,
      id: 5,
      code: 'T-0005',
      title: 'Vent drive',
      note: 'As built',
      revision: 'A',
      state: 'working',
      briefId: 4,
      optionKey: 'k',
      spec: '{}',
    },
  ],
  [
    'audit_entries',
    {
      id: 1,
      at: AT,
      actorName: 'Lena Brook',
      action: 'added',
      entity: 'part',
      entityId: 'KW-00001',
      summary: 'Added KW-00001',
    },
  ],
];

// Not the demo: its start adds people.
const { settings, remove } = tempSettings({ demo: false });
const file = path.join(settings.dataDir, DATABASE_FILE);
const open = (options: { migrations?: (new () => Initial1764600000000)[] } = {}) =>
  new DataSource({ type: 'better-sqlite3', database: file, synchronize: false, ...options }).initialize();

async function fill(source: DataSource): Promise<void> {
  for (const [table, row] of OLDER) {
    const names = Object.keys(row).map((name) => `"${name}"`);
    const places = names.map(() => '?');
    await source.query(
      `INSERT INTO "${table}" (${names.join(', ')}) VALUES (${places.join(', ')})`,
      Object.values(row),
    );
  }
}

/** What the tables of the first release hold. */
async function contents(source: DataSource): Promise<[string, Row[]][]> {
  const tables = [...new Set(OLDER.map(([table]) => table))];
  return Promise.all(
    tables.map(async (table) => [table, await source.query<Row[]>(`SELECT * FROM "${table}" ORDER BY 1`)]),
  );
}

let before: [string, Row[]][];
let app: NestFastifyApplication;
beforeAll(async () => {
  makeDataFolder(settings.dataDir);
  const older = await open({ migrations: [Initial1764600000000] });
  await older.runMigrations();
  await fill(older);
  before = await contents(older);
  await older.destroy();
  app = await createApp(settings);
});
afterAll(async () => {
  await app.close();
  remove();
});

describe('the tables for suppliers and stock', () => {
  it('can be taken away again, and the first release finds what it wrote', async () => {
    const own = tempSettings({ demo: false });
    makeDataFolder(own.settings.dataDir);
    const source = await new DataSource({
      type: 'better-sqlite3',
      database: path.join(own.settings.dataDir, DATABASE_FILE),
      migrations: MIGRATIONS,
    }).initialize();
    const schema = () => source.query<Row[]>(`SELECT "name", "sql" FROM "sqlite_master" ORDER BY "name"`);
    await source.runMigrations();
    await fill(source);
    await source.undoLastMigration();
    expect(await contents(source)).toEqual(before);
    expect(await source.query('PRAGMA foreign_key_check')).toEqual([]);
    const names = (await schema()).map(({ name }) => name);
    expect(names.filter((name) => /supplier|offer|stock|least|kind_length/.test(String(name)))).toEqual([]);
    await source.runMigrations();
    expect(await contents(source)).toMatchObject(before);
    await source.destroy();
    own.remove();
  });
});

describe('a database of the first release, opened by this one', () => {
  it('keeps every row as it was, and what is new is empty', async () => {
    const after = await contents(app.get(DataSource));
    for (const [index, [table, rows]] of before.entries()) {
      expect(rows.length, table).toBeGreaterThan(0);
      expect(after[index], table).toMatchObject([table, rows]);
    }
    const trains = after.find(([table]) => table === 'train')?.[1];
    expect(trains).toMatchObject([{ buildQuantity: null, bomEdits: null, offerChoices: null }]);
  });

  it('leaves no row that refers to none, and checks that from now on', async () => {
    const checking = await open();
    expect(await checking.query('PRAGMA foreign_key_check')).toEqual([]);
    expect(await checking.query('PRAGMA integrity_check')).toEqual([{ integrity_check: 'ok' }]);
    await checking.destroy();
  });

  it('finds the old parts, with nothing on the shelf and nothing low', async () => {
    const found = await app.get(PartsReader).list({ text: 'gear oil' });
    expect(found.items).toMatchObject([{ number: 'KW-00001', shelf: null, leastStock: null, unit: 'l' }]);
    const stock = app.get(StockReader);
    expect(await stock.list({ low: true })).toMatchObject({ items: [], total: 0 });
    expect(await stock.list({})).toMatchObject({ items: [], total: 0 });
    expect(await stock.item('kw-00002')).toMatchObject({ quantity: 0, unit: 'pcs', low: false, places: [] });
  });
});
