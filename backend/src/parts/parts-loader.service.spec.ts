import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ProblemError } from '../common/errors.js';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { PartsLoader } from './parts-loader.service.js';
import { PartsReader } from './parts-reader.service.js';

let library: TempLibrary;
let loader: PartsLoader;
let reader: PartsReader;
beforeAll(async () => {
  library = await openTempLibrary();
  loader = library.module.get(PartsLoader);
  reader = library.module.get(PartsReader);
});
afterAll(() => library.close());

describe('adding many parts', () => {
  it('gives them running numbers in order, each with its own row on record', async () => {
    const inputs = Array.from({ length: 120 }, (_, index) => newGear({ attributes: { teeth: 12 + index } }));
    const numbers = await loader.createMany(LIBRARIAN, inputs);
    expect(new Set(numbers).size).toBe(120);
    expect(numbers).toEqual([...numbers].sort());
    const last = numbers.at(-1) ?? '';
    expect((await reader.get(last)).attributes).toMatchObject({ teeth: 131 });
    expect((await reader.changes(last, {})).items).toMatchObject([{ action: 'added', by: LIBRARIAN.name }]);
  });

  it('lets others read in between', async () => {
    let turns = 0;
    const ticking = setInterval(() => (turns += 1), 1);
    const inputs = Array.from({ length: 400 }, () => newGear());
    await loader.createMany(LIBRARIAN, inputs);
    clearInterval(ticking);
    expect(turns).toBeGreaterThan(3);
  });

  it('adds nothing when one of them is wrong, and names it', async () => {
    const before = await reader.count();
    const inputs = [newGear(), newGear({ attributes: { teeth: 2 } })];
    const thrown: unknown = await loader.createMany(LIBRARIAN, inputs).catch((error: unknown) => error);
    expect(thrown).toBeInstanceOf(ProblemError);
    expect((thrown as ProblemError).errors?.map(({ field }) => field)).toEqual(['parts.1.attributes.teeth']);
    const unknown = [{ ...newGear(), colour: 'green' }];
    const refused: unknown = await loader.createMany(LIBRARIAN, unknown).catch((error: unknown) => error);
    expect((refused as ProblemError).errors?.map(({ field }) => field)).toEqual(['parts.0.colour']);
    expect(await reader.count()).toBe(before);
  });
});
