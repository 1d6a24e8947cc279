import { DataSource } from 'typeorm';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { BulkLoader } from '../src/bulk-loading/bulk-loader.service.js';
import { type ProblemError } from '../src/common/errors.js';
import { OffersFinder } from '../src/offers/offers-finder.service.js';
import { LIBRARIAN, newGear } from '../src/testing/new-part.js';
import { SuppliersService } from '../src/suppliers/suppliers.service.js';
import { type Client, startServer, type TestServer } from './harness.js';

const MODULE = new URL('./bulk-rows.mjs', import.meta.url).href;

let server: TestServer;
let librarian: Client;
let supplier: string;
beforeEach(async () => {
  server = await startServer();
  librarian = await server.as('librarian');
  const input = { name: 'Gannet Rock Gearing', currency: 'EUR' };
  supplier = (await server.app.get(SuppliersService).create(LIBRARIAN, input)).code;
});
afterEach(() => server.close());

const load = (options: object, more: Parameters<BulkLoader['load']>[2] = {}) =>
  server.app.get(BulkLoader).load(LIBRARIAN, { module: MODULE, options: { supplier, ...options } }, more);

async function one<T>(sql: string): Promise<T> {
  const [row] = await server.app.get(DataSource).query<Record<string, T>[]>(sql);
  return Object.values(row ?? {})[0] as T;
}

const count = (table: string, where = '1') => one<number>(`SELECT COUNT(*) FROM "${table}" WHERE ${where}`);

/** What must hold whatever was loaded and however it ended. */
async function expectConsistent(): Promise<void> {
  const source = server.app.get(DataSource);
  expect(await source.query('PRAGMA foreign_key_check')).toEqual([]);
  expect(await one('PRAGMA integrity_check')).toBe('ok');
  const words = `SELECT COUNT(*) FROM "part_search" WHERE "part_search" MATCH '"Loaded gear"'`;
  expect(await one(words)).toBe(await count('part', `"description" LIKE 'Loaded gear%'`));
  // Row n of a load has 1 + n % 3 offers; a part without them all would be half a part.
  const halves = `SELECT COUNT(*) FROM "part" WHERE "description" LIKE 'Loaded gear%' AND
    (SELECT COUNT(*) FROM "offer" WHERE "partId" = "part"."id") <> 1 + CAST(SUBSTR("description", 13) AS integer) % 3`;
  expect(await one(halves)).toBe(0);
  const levels = `SELECT COUNT(*) FROM "stock_level" WHERE "quantity" <> (SELECT SUM("change") FROM "stock_movement"
    WHERE "stock_movement"."partId" = "stock_level"."partId")`;
  expect(await one(levels)).toBe(0);
}

describe('loading very many parts', () => {
  it('keeps serving readers and writers, and leaves everything complete', async () => {
    const COUNT = 3000;
    let loading = true;
    const answers: number[] = [];
    const readers = [
      '/api/parts?sort=-mass&size=50',
      '/api/parts?kind=gear&text=gear&page=3',
      '/api/parts/facets',
    ];
    const ask = async (path: string) => {
      while (loading) answers.push((await librarian.get(path)).status);
    };
    let added = 0;
    const write = async () => {
      while (loading) {
        const answer = await librarian.post('/api/parts', newGear());
        expect(answer.status).toBe(201);
        added += 1;
      }
    };
    const clients = [...readers.map(ask), write()];
    const result = await load({ count: COUNT }, { turnSize: 200 }).finally(() => (loading = false));
    await Promise.all(clients);

    // 1 + 2 + 3 offers for every three parts; every second part was counted.
    expect(result).toMatchObject({ parts: COUNT, offers: COUNT * 2, counts: COUNT / 2 });
    expect(answers.length).toBeGreaterThan(10);
    expect(new Set(answers)).toEqual(new Set([200]));
    expect(added).toBeGreaterThan(0);
    const list = await librarian.get<{ total: number }>('/api/parts?text=loaded&size=1');
    expect(list.body.total).toBe(COUNT);
    expect(await count('part')).toBe(COUNT + added);
    await expectConsistent();
    const record = await one<number>(`SELECT COUNT(*) FROM "audit_entries" WHERE "action" = 'loaded'`);
    expect(record).toBe(1);
    const [entry] = await server.app
      .get(DataSource)
      .query<{ summary: string }[]>(`SELECT "summary" FROM "audit_entries" WHERE "action" = 'loaded'`);
    expect(entry?.summary).toMatch(/^Loaded 3,000 parts with 6,000 offers and 1,500 opening counts: KW-/);
  });

  it('gives a loaded part everything that one added by hand has', async () => {
    const { last } = await load({ count: 31 });
    const { body } = await librarian.get<Record<string, unknown>>(`/api/parts/${last}`);
    expect(body).toMatchObject({
      number: 'KW-00031',
      description: 'Loaded gear 30',
      standing: 'cleared',
      attributes: { teeth: 42, module: 2, pressureAngleDeg: 20, helixAngleDeg: 0 },
      shelf: 30,
      leastStock: 5,
      version: 1,
      updatedBy: LIBRARIAN.name,
    });
    const offers = await server.app.get(OffersFinder).forParts([last ?? '']);
    expect(offers.get('KW-00031')).toMatchObject([
      {
        supplierCode: supplier,
        supplierPartNumber: '30-0',
        standing: 'open',
        currency: 'EUR',
        per: 1,
        breaks: [{ quantity: 1, unitPrice: 530 }],
        pack: 1,
        leastQuantity: 1,
        validUntil: null,
      },
    ]);
    // One turn holds it all: the record says it once. The next part gets the next number.
    expect(await count('audit_entries', `"action" IN ('loaded', 'began to load')`)).toBe(1);
    expect((await librarian.post('/api/parts', newGear())).body).toMatchObject({ number: 'KW-00032' });
  });

  it('leaves out running numbers that parts have or will have', async () => {
    await librarian.post('/api/parts', newGear({ number: 'kw-00003' }));
    const own = { part: { ...newGear(), number: 'KW-00009' } };
    await load({ count: 6, changes: { 5: own } }, { turnSize: 4 });
    const numbers = await server.app
      .get(DataSource)
      .query<{ number: string }[]>(`SELECT "number" FROM "part" ORDER BY "number"`);
    // Four blanks in a row of which 3 is taken start after it; the fifth follows them.
    expect(numbers.map(({ number }) => number)).toEqual([
      'kw-00003',
      'KW-00004',
      'KW-00005',
      'KW-00006',
      'KW-00007',
      'KW-00008',
      'KW-00009',
    ]);
  });

  it('refuses the whole load for its wrong rows, naming them by the same rules as one part', async () => {
    await librarian.post('/api/parts', newGear({ number: 'T-1' }));
    const gear = (changes: object) => ({ part: { ...newGear(), ...changes } });
    const changes = {
      3: gear({ attributes: { teeth: 2, module: 2, faceWidth: 20, bore: 8 } }),
      4: { offers: [{ supplierCode: 'S-9999', breaks: [{ quantity: 1, unitPrice: 1 }] }] },
      5: { offers: [{ supplierCode: supplier, breaks: [{ quantity: 1, unitPrice: -1 }] }] },
      6: { opening: { place: 'Rack 1', quantity: 1.5 } },
      7: gear({ number: 'X-1' }),
      8: gear({ number: 'x-1' }),
      9: gear({ number: 't-1' }),
    };
    const refusal = (await load({ count: 20, changes }).catch((error: unknown) => error)) as ProblemError;
    expect(refusal.message).toMatch(/^Nothing was loaded\. /);
    expect(refusal.errors?.map(({ field }) => field)).toEqual([
      'rows.3.part.attributes.teeth',
      'rows.4.offers.0.supplierCode',
      'rows.5.offers.0.breaks.0.unitPrice',
      'rows.6.opening.quantity',
      'rows.8.part.number',
      'rows.9.part.number',
    ]);
    expect(await count('part')).toBe(1);
    expect(await count('offer')).toBe(0);
    expect(await count('audit_entries', `"action" LIKE '%load%'`)).toBe(0);
  });

  it('leaves whole parts and a free write queue when it breaks off in the middle', async () => {
    const loader = server.app.get(BulkLoader);
    const broken = load(
      { count: 1000 },
      {
        turnSize: 100,
        onProgress: ({ phase, done }) => {
          if (phase === 'booking' && done >= 200) void loader.onApplicationShutdown();
        },
      },
    );
    await expect(broken).rejects.toThrow('broke off');
    const booked = await count('part');
    expect(booked).toBeGreaterThanOrEqual(200);
    expect(booked % 100).toBe(0);
    await expectConsistent();
    expect(await count('audit_entries', `"action" = 'began to load'`)).toBe(1);
    expect(await count('audit_entries', `"action" = 'loaded'`)).toBe(0);
    expect((await librarian.post('/api/parts', newGear())).status).toBe(201);
    expect(await load({ count: 10 })).toMatchObject({ parts: 10 });
  });
});
