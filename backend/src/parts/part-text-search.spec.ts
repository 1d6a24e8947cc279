import { DataSource } from 'typeorm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { Part } from './entities/part.entity.js';
import { narrowToAnyOf, narrowToText } from './part-text-search.js';
import { PartsLoader } from './parts-loader.service.js';

let library: TempLibrary;
let source: DataSource;
beforeAll(async () => {
  library = await openTempLibrary();
  source = library.module.get(DataSource);
  const descriptions = [
    'Winch pinion m 2',
    'Winch wheel 50% (x_1)',
    'Vent WINCH gear',
    'Öl-Förderrad',
    'Vent gear',
  ];
  await library.module.get(PartsLoader).createMany(
    LIBRARIAN,
    descriptions.map((description, index) => newGear({ number: `T-${index + 1}`, description })),
  );
});
afterAll(() => library.close());

/** Numbers found when words of that many matches count as common. */
async function found(text: string, many?: number): Promise<string[]> {
  const rows = source.getRepository(Part).createQueryBuilder('part').orderBy('part.number');
  await narrowToText(rows, text, many === undefined ? {} : { many });
  return (await rows.getMany()).map(({ number }) => number);
}

describe('searching for a text', () => {
  it.each([
    ['winch', ['T-1', 'T-2', 'T-3']],
    ['winch vent', ['T-3']],
    ['nch pin', ['T-1']],
    ['m 2 winch', ['T-1']],
    ['50%', ['T-2']],
    ['%', ['T-2']],
    ['x_1', ['T-2']],
    ['x-1', []],
    ['t-4', ['T-4']],
    ['öl-förder', ['T-4']],
    ['ÖL-FÖRDER', ['T-4']],
    ['nothing', []],
    ['"winch"', []],
  ])('finds the same parts of “%s” in the index and part by part', async (text, expected) => {
    expect(await found(text)).toEqual(expected);
    // Every word that is found at all counts as common.
    expect(await found(text, 1)).toEqual(expected);
  });

  it('stops at enough parts', async () => {
    for (const [text, count] of [
      ['winch', 2],
      ['w', 2],
      ['vent gear', 2],
      ['\u0000', 0],
    ] as const) {
      const rows = source.getRepository(Part).createQueryBuilder('part');
      narrowToAnyOf(rows, text, 2);
      expect(await rows.getMany(), text).toHaveLength(count);
    }
  });
});
