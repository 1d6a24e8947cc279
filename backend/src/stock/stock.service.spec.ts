import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { PartsLoader } from '../parts/parts-loader.service.js';
import { StockLevels } from './stock-levels.service.js';
import { StockService } from './stock.service.js';

let library: TempLibrary;
let stock: StockService;
let numbers: string[];
beforeAll(async () => {
  library = await openTempLibrary();
  stock = library.module.get(StockService);
  numbers = await library.module.get(PartsLoader).createMany(
    LIBRARIAN,
    Array.from({ length: 50 }, () => newGear()),
  );
});
afterAll(() => library.close());

describe('booking many movements', () => {
  it('takes ten thousand of a past year within seconds, and lets others read in between', async () => {
    const movements = Array.from({ length: 10_000 }, (_, index) => ({
      number: numbers[index % 50] ?? '',
      kind: index % 100 < 50 ? ('received' as const) : ('issued' as const),
      quantity: 2,
      place: `Rack ${(index % 50) % 3}`,
      at: new Date(Date.UTC(2025, 0, 1) + index * 1_800_000).toISOString(),
    }));
    let turns = 0;
    const ticking = setInterval(() => (turns += 1), 1);
    const start = performance.now();
    const booked = await stock.bookMany(LIBRARIAN, movements).finally(() => clearInterval(ticking));
    console.log(performance.now() - start, turns);
    expect(booked).toBe(10_000);
    console.log((await library.module.get(StockLevels).ofParts(numbers)).get(numbers[0] ?? ''));
  });
});
