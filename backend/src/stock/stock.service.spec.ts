import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AuditService } from '../audit/audit.service.js';
import { ProblemError } from '../common/errors.js';
import { PartsLoader } from '../parts/parts-loader.service.js';
import { PartsReader } from '../parts/parts-reader.service.js';
import { PartsService } from '../parts/parts.service.js';
import { LIBRARIAN, newGear, newPart } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import type { MovementInputDto } from './dto/movement-input.dto.js';
import { MOVEMENT_KINDS } from './movement-kinds.js';
import { MovementsReader } from './movements-reader.service.js';
import { StockLevels } from './stock-levels.service.js';
import { StockReader } from './stock-reader.service.js';
import { StockService } from './stock.service.js';

let library: TempLibrary;
let stock: StockService;
let reader: StockReader;
let movements: MovementsReader;
/** A part of its own for each test. */
let number: string;
beforeAll(async () => {
  library = await openTempLibrary();
  stock = library.module.get(StockService);
  reader = library.module.get(StockReader);
  movements = library.module.get(MovementsReader);
});
beforeEach(async () => {
  ({ number } = await library.module.get(PartsService).create(LIBRARIAN, newGear()));
});
afterAll(() => library.close());

const book = (changes: Partial<MovementInputDto>) =>
  stock.book(LIBRARIAN, { number, kind: 'received', quantity: 5, place: 'Rack A', ...changes });

const refusal = async (act: Promise<unknown>): Promise<ProblemError> => {
  const thrown: unknown = await act.then(
    () => null,
    (error: unknown) => error,
  );
  expect(thrown).toBeInstanceOf(ProblemError);
  return thrown as ProblemError;
};

describe('booking a movement', () => {
  it('adds, takes, counts and corrects, place by place', async () => {
    await book({ quantity: 10 });
    await book({ kind: 'issued', quantity: 3 });
    const counted = await book({ kind: 'counted', quantity: 6 });
    // 10 − 3 = 7 by the books; 6 were found.
    expect(counted.movement).toMatchObject({ change: -1, counted: 6, after: 6 });
    await book({ kind: 'corrected', quantity: -2, reason: 'Two were scrap' });
    await book({ quantity: 1, place: 'Rack B' });
    expect(await reader.item(number)).toMatchObject({
      quantity: 5,
      places: [
        { place: 'Rack A', quantity: 4, countedAt: counted.movement.at },
        { place: 'Rack B', quantity: 1, countedAt: null },
      ],
    });
  });

  it('takes a place for the same whatever its case and blanks, and keeps how it was written first', async () => {
    await book({ place: 'Shelf  C 1' });
    const { movement } = await book({ place: ' shelf c 1 ' });
    expect(movement).toMatchObject({ place: 'Shelf C 1', after: 10 });
  });

  it('does so beyond the letters A to Z, and however an accent was typed', async () => {
    await book({ place: 'Übergabe é' });
    // A small ü, and é as e with an accent of its own (U+0301).
    const { movement } = await book({ place: 'übergabe e\u0301' });
    expect(movement).toMatchObject({ place: 'Übergabe é', after: 10 });
  });

  it('keeps litres to the millilitre, exactly', async () => {
    const oil = await library.module
      .get(PartsService)
      .create(LIBRARIAN, newPart('lubricant', { viscosityGrade: 'ISO VG 220', packVolume: 5 }));
    for (let times = 0; times < 3; times += 1) await book({ number: oil.number, quantity: 0.1 });
    // As doubles, 0.1 + 0.1 + 0.1 is 0.30000000000000004.
    expect((await reader.item(oil.number)).quantity).toBe(0.3);
    const problem = await refusal(book({ number: oil.number, quantity: 0.0005 }));
    expect(problem.errors).toMatchObject([{ field: 'quantity' }]);
    expect(problem.message).toContain('three decimals');
  });

  it.each([
    ['a fraction of a piece', { quantity: 1.5 }, 'quantity'],
    ['nothing received', { quantity: 0 }, 'quantity'],
    ['less than nothing issued', { kind: 'issued', quantity: -1 }, 'quantity'],
    ['a count below zero', { kind: 'counted', quantity: -1 }, 'quantity'],
    ['a correction by nothing', { kind: 'corrected', quantity: 0, reason: 'Slip' }, 'quantity'],
    ['a correction without a reason', { kind: 'corrected', quantity: 1 }, 'reason'],
  ] as const)('refuses %s', async (_, changes, field) => {
    const problem = await refusal(book(changes));
    expect(problem).toMatchObject({ statusCode: 400, errors: [{ field }] });
    expect((await reader.item(number)).places).toEqual([]);
  });

  it('refuses to issue what is not there, and says what is there and where else', async () => {
    await book({ quantity: 2 });
    await book({ quantity: 7, place: 'Rack B' });
    const problem = await refusal(book({ kind: 'issued', quantity: 3 }));
    expect(problem).toMatchObject({ statusCode: 409, code: 'not-enough-there' });
    expect(problem.message).toContain(`Only 2 pcs of ${number} lie at Rack A`);
    expect(problem.message).toContain('7 pcs at Rack B');
    expect(problem.extra.current).toMatchObject({ number, quantity: 9 });
    expect((await refusal(book({ kind: 'issued', quantity: 1, place: 'Rack Z' }))).message).toContain(
      `0 pcs of ${number} lie at Rack Z`,
    );
    const correction = book({ kind: 'corrected', quantity: -3, reason: 'Slip' });
    expect(await refusal(correction)).toMatchObject({ code: 'not-enough-there' });
  });

  it('refuses more at a place than a count could state', async () => {
    await book({ quantity: 999_999 });
    expect(await refusal(book({ quantity: 2 }))).toMatchObject({ statusCode: 409, code: 'too-much-there' });
    expect((await book({ quantity: 1 })).movement.after).toBe(1_000_000);
  });

  it('leaves a row in the record of changes, and one in the ledger', async () => {
    await book({ quantity: 4 });
    const record = await library.module.get(AuditService).changesOf('stock', number, {});
    expect(record.items).toMatchObject([
      { action: 'received', by: LIBRARIAN.name, summary: `Received 4 pcs of ${number} at Rack A` },
    ]);
    expect((await movements.list({ part: number })).items).toMatchObject([
      { kind: 'received', change: 4, after: 4, by: LIBRARIAN.name },
    ]);
  });
});

/** Figures that look random and are the same in every run (a linear congruence with Knuth's constants). */
function sequence(seed: number): (below: number) => number {
  let state = BigInt(seed);
  return (below) => {
    state = (state * 6364136223846793005n + 1442695040888963407n) & 0xffff_ffff_ffff_ffffn;
    return Number((state >> 33n) % BigInt(below));
  };
}

describe('any sequence of movements', () => {
  it.each([1, 2, 3, 4, 5])('leaves each place at what was booked, never below zero (%i)', async (seed) => {
    const next = sequence(seed);
    const oneOf = <T>(values: readonly T[]) => values[next(values.length)] as T;
    /** The same ledger kept by hand, and the movements it took. */
    const expected = new Map<string, number>();
    let booked = 0;
    for (let step = 0; step < 120; step += 1) {
      const kind = oneOf(MOVEMENT_KINDS);
      const quantity = next(41) - 20;
      const place = oneOf(['Rack A', 'rack a', 'Rack B']);
      const reason = oneOf(['', 'Mended']);
      const there = expected.get(place.toLowerCase()) ?? 0;
      const isSense = {
        received: quantity > 0,
        issued: quantity > 0,
        counted: quantity >= 0,
        corrected: quantity !== 0 && reason !== '',
      }[kind];
      const after = { received: there + quantity, issued: there - quantity, counted: quantity }[
        kind as string
      ];
      const result = after ?? there + quantity;
      const act = book({ kind, quantity, place, reason });
      if (isSense && result >= 0) {
        expect((await act).movement.after).toBe(result);
        expected.set(place.toLowerCase(), result);
        booked += 1;
      } else {
        expect((await refusal(act)).statusCode).toBe(isSense ? 409 : 400);
      }
      const { places } = await reader.item(number);
      expect(new Map(places.map((level) => [level.place.toLowerCase(), level.quantity]))).toEqual(expected);
    }
    expect(booked).toBeGreaterThan(30);
    const pages = [1, 2].map((page) => movements.list({ part: number, size: 100, page }));
    const ledger = (await Promise.all(pages)).flatMap(({ items }) => items);
    expect(ledger).toHaveLength(booked);
    const sum = ledger.reduce((total, { change }) => total + change, 0);
    expect(sum).toBe((await reader.item(number)).quantity);
  });
});

describe('booking many movements', () => {
  it('takes ten thousand of a past year within seconds, and lets others read in between', async () => {
    const inputs = Array.from({ length: 50 }, () => newGear());
    const numbers = await library.module.get(PartsLoader).createMany(LIBRARIAN, inputs);
    // Midnight where the tests run, as the filter takes days.
    const newYear = new Date(2025, 0, 1);
    // Every part is received and issued in turn, so that all shelves are empty again at the end.
    const year = Array.from({ length: 10_000 }, (_, index) => ({
      number: numbers[index % 50] ?? '',
      kind: index % 100 < 50 ? ('received' as const) : ('issued' as const),
      quantity: 2,
      place: `Rack ${(index % 50) % 3}`,
      at: new Date(newYear.getTime() + index * 1_800_000).toISOString(),
    }));
    let turns = 0;
    const ticking = setInterval(() => (turns += 1), 1);
    const booked = await stock.bookMany(LIBRARIAN, year).finally(() => clearInterval(ticking));
    expect(booked).toBe(10_000);
    expect(turns).toBeGreaterThan(20);
    const shelves = await library.module.get(StockLevels).ofParts(numbers);
    expect([...shelves.values()].map(({ total }) => total)).toEqual(Array.from({ length: 50 }, () => 0));
    const first = numbers[0] ?? '';
    const ledger = await movements.list({ part: first, from: '2025-01-01', until: '2025-01-01' });
    // A movement of this part every 50 half hours: the second falls on 2 January.
    expect(ledger).toMatchObject({ total: 1, items: [{ at: newYear.toISOString(), kind: 'received' }] });
  });

  it('books nothing when one makes no sense or lies in the future, and names it', async () => {
    const good = { number, kind: 'received' as const, quantity: 1, place: 'Rack A' };
    const blank = await refusal(stock.bookMany(LIBRARIAN, [good, { ...good, place: ' ' }]));
    expect(blank.errors?.map(({ field }) => field)).toEqual(['movements.1.place']);
    const tomorrow = new Date(Date.now() + 86_400_000).toISOString();
    const future = await refusal(stock.bookMany(LIBRARIAN, [good, { ...good, at: tomorrow }]));
    expect(future.errors?.map(({ field }) => field)).toEqual(['movements.1.at']);
    expect((await reader.item(number)).places).toEqual([]);
  });
});

describe('the least stock of a part', () => {
  it('puts the part on the low list until enough lies on the shelf', async () => {
    const { version } = await reader.item(number);
    const item = await stock.setLeast(LIBRARIAN, number.toLowerCase(), { leastStock: 4, version });
    expect(item).toMatchObject({ leastStock: 4, low: true, quantity: 0, version: version + 1 });
    const lows = async () => (await reader.list({ low: true, text: number })).items.map((low) => low.number);
    expect(await lows()).toEqual([number]);
    await book({ quantity: 3 });
    expect(await lows()).toEqual([number]);
    await book({ quantity: 1, place: 'Rack B' });
    // Exactly the least is enough.
    expect(await lows()).toEqual([]);
    const changes = await library.module.get(PartsReader).changes(number, {});
    expect(changes.items[0]).toMatchObject({ before: { leastStock: null }, after: { leastStock: 4 } });
  });

  it('refuses a stale version, parts of a piece, and leaves the part as it was', async () => {
    const { version } = await reader.item(number);
    await stock.setLeast(LIBRARIAN, number, { leastStock: 2, version });
    const stale = await refusal(stock.setLeast(LIBRARIAN, number, { leastStock: 9, version }));
    expect(stale).toMatchObject({ statusCode: 409, code: 'changed-meanwhile' });
    expect(stale.extra.current).toMatchObject({ leastStock: 2, version: version + 1 });
    const half = await refusal(stock.setLeast(LIBRARIAN, number, { leastStock: 0.5, version: version + 1 }));
    expect(half.errors).toMatchObject([{ field: 'leastStock' }]);
    expect(await stock.setLeast(LIBRARIAN, number, { leastStock: null, version: version + 1 })).toMatchObject(
      {
        leastStock: null,
        low: false,
      },
    );
  });
});

describe('the shelf list', () => {
  it('holds parts that lay somewhere or are watched, and narrows and sorts them', async () => {
    const parts = library.module.get(PartsLoader);
    const inputs = ['Alder', 'Birch', 'Cedar'].map((wood) => newGear({ description: `${wood} test gear` }));
    const [alder = '', birch = '', cedar = ''] = await parts.createMany(LIBRARIAN, inputs);
    await book({ number: alder, quantity: 3, place: 'Bin 1' });
    await book({ number: birch, quantity: 8, place: 'Bin 2' });
    const watch = async (part: string, leastStock: number) =>
      stock.setLeast(LIBRARIAN, part, { leastStock, version: (await reader.item(part)).version });
    await watch(alder, 5);
    const text = 'test gear';
    const named = async (query: object) =>
      (await reader.list({ text, ...query })).items.map((item) => item.number);
    expect(await named({})).toEqual([alder, birch]);
    await watch(cedar, 9);
    expect(await named({ sort: '-quantity' })).toEqual([birch, alder, cedar]);
    // Short by: cedar 9 − 0, alder 5 − 3; birch is not watched and comes last.
    expect(await named({ sort: '-shortBy' })).toEqual([cedar, alder, birch]);
    expect(await named({ sort: 'shortBy' })).toEqual([alder, cedar, birch]);
    expect(await named({ low: true })).toEqual([alder, cedar]);
    expect(await named({ place: 'bin 2' })).toEqual([birch]);
    expect(await named({ kind: 'seal' })).toEqual([]);
    const places = await reader.places();
    expect(places).toContainEqual({ place: 'Bin 1', parts: 1 });
    const partsReader = library.module.get(PartsReader);
    const shelves = async (query: object) =>
      (await partsReader.list({ text, ...query })).items.map((part) => [part.number, part.shelf]);
    expect(await shelves({})).toEqual([
      [alder, 3],
      [birch, 8],
      [cedar, null],
    ]);
    expect(await shelves({ onShelf: true })).toEqual([
      [alder, 3],
      [birch, 8],
    ]);
    expect(await shelves({ low: true })).toEqual([
      [alder, 3],
      [cedar, null],
    ]);
  });
});
