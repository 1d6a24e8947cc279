import { buildBom, type GearNeed, type PartNeed } from '@stageyard/libs/bill-of-materials';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LIBRARIAN, newGear, newPart } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { type PartInputDto } from './dto/part-input.dto.js';
import { PartsLoader } from './parts-loader.service.js';
import { PartsService } from './parts.service.js';
import { StockFinder } from './stock-finder.service.js';

let library: TempLibrary;
let stock: StockFinder;

const cleared = (number: string, kind: PartInputDto['kind'], attributes: object): PartInputDto =>
  newPart(kind, attributes, { number, standing: 'cleared' });
const gear = (number: string, attributes: object, standing: 'draft' | 'cleared' = 'cleared'): PartInputDto =>
  newGear({ number, standing, attributes });

beforeAll(async () => {
  library = await openTempLibrary();
  stock = library.module.get(StockFinder);
  await library.module
    .get(PartsLoader)
    .createMany(LIBRARIAN, [
      gear('G-WIDE', { faceWidth: 30 }),
      gear('G-FIT', { faceWidth: 22 }),
      gear('G-NARROW', { faceWidth: 15 }),
      gear('G-DRAFT', { faceWidth: 20 }, 'draft'),
      gear('G-GONE', { faceWidth: 20 }),
      gear('G-SHIFTED', { faceWidth: 20, profileShift: 0.3 }),
      gear('G-ZERO', { teeth: 30, profileShift: 0, faceWidth: 20 }),
      gear('A-UNSTATED', { teeth: 30, faceWidth: 20 }),
      gear('G-LEFT', { helixAngleDeg: 15, hand: 'left' }),
      cleared('B-20', 'bearing', { bore: 20, outerDiameter: 47, width: 14, type: 'deep groove ball' }),
      cleared('K-25', 'key', { width: 6, height: 6, length: 25 }),
      cleared('K-20', 'key', { width: 6, height: 6, length: 20 }),
      cleared('S-LONG', 'shaft', { diameter: 20, length: 300 }),
      cleared('S-SHORT', 'shaft', { diameter: 20, length: 160 }),
      cleared('R-20', 'retaining-ring', { shaftDiameter: 20, thickness: 1.2, grooveDiameter: 19 }),
      cleared('W-20', 'seal', { shaftDiameter: 20, outerDiameter: 35, width: 7 }),
      cleared('H-BIG', 'housing', { length: 300, width: 200, height: 120, wall: 8 }),
      cleared('H-THIN', 'housing', { length: 220, width: 140, height: 90, wall: 3 }),
      cleared('H-FIT', 'housing', { length: 230, width: 150, height: 100, wall: 6 }),
      cleared('L-220', 'lubricant', { viscosityGrade: 'ISO VG 220', packVolume: 1 }),
    ]);
  await library.module.get(PartsService).update(LIBRARIAN, 'G-GONE', { version: 1, standing: 'withdrawn' });
});

afterAll(() => library.close());

const need = (changes: Partial<GearNeed> = {}): GearNeed => ({
  kind: 'gear',
  partNumber: null,
  teeth: 24,
  module: 2,
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  hand: null,
  profileShift: 0,
  faceWidth: 18,
  bore: 12,
  ...changes,
});
const numberFor = async (wanted: PartNeed): Promise<string | undefined> =>
  (await stock.findForKit(wanted))?.number;

describe('a stock gear', () => {
  it('is the cleared one of least sufficient width: no draft, nothing withdrawn', async () => {
    expect(await numberFor(need())).toBe('G-FIT');
    expect(await numberFor(need({ faceWidth: 22 }))).toBe('G-FIT');
    expect(await numberFor(need({ faceWidth: 22.5 }))).toBe('G-WIDE');
    expect(await numberFor(need({ faceWidth: 31 }))).toBeUndefined();
  });

  it.each([
    ['teeth', { teeth: 25 }],
    ['module', { module: 2.5 }],
    ['pressure angle', { pressureAngleDeg: 25 }],
    ['bore', { bore: 10 }],
    ['profile shift', { profileShift: 0.1 }],
  ])('matches exactly by %s', async (_, changes) => {
    expect(await numberFor(need(changes))).toBeUndefined();
  });

  it('counts an unstated shift as 0, after a stated one', async () => {
    expect(await numberFor(need({ profileShift: 0.3 }))).toBe('G-SHIFTED');
    expect(await numberFor(need({ teeth: 30 }))).toBe('G-ZERO');
    expect((await stock.findForKit(need()))?.gear?.profileShift).toBeNull();
  });

  it('has the hand that is asked for', async () => {
    const helical = need({ helixAngleDeg: 15 });
    expect(await numberFor(helical)).toBe('G-LEFT');
    expect(await numberFor({ ...helical, hand: 'left' })).toBe('G-LEFT');
    expect(await numberFor({ ...helical, hand: 'right' })).toBeUndefined();
  });

  it('that was chosen by number is given as it is, a draft too', async () => {
    const part = await stock.findForKit(need({ partNumber: 'g-draft', teeth: 99 }));
    expect(part).toMatchObject({ number: 'G-DRAFT', standing: 'draft' });
    expect(await stock.findForKit(need({ partNumber: 'NOBODY' }))).toBeNull();
  });
});

describe('other stock parts', () => {
  const cases: [string, PartNeed][] = [
    ['B-20', { kind: 'bearing', bore: 20 }],
    ['K-20', { kind: 'key', width: 6, height: 6, length: 20 }],
    ['S-SHORT', { kind: 'shaft', partNumber: null, diameter: 20, length: 120 }],
    ['S-LONG', { kind: 'shaft', partNumber: null, diameter: 20, length: 200 }],
    ['R-20', { kind: 'retaining-ring', shaftDiameter: 20, thickness: 1.2 }],
    ['W-20', { kind: 'seal', shaftDiameter: 20 }],
    ['H-FIT', { kind: 'housing', length: 220, width: 140, height: 90, wall: 5 }],
    ['L-220', { kind: 'lubricant', viscosityGrade: 'iso vg 220' }],
  ];
  it.each(cases)('%s is found', async (number, wanted) => {
    expect(await numberFor(wanted)).toBe(number);
  });

  it('are not taken when they do not fit', async () => {
    expect(await numberFor({ kind: 'bearing', bore: 25 })).toBeUndefined();
    expect(await numberFor({ kind: 'key', width: 6, height: 6, length: 22 })).toBeUndefined();
    expect(await numberFor({ kind: 'lubricant', viscosityGrade: 'ISO VG 46' })).toBeUndefined();
  });
});

describe('a whole kit', () => {
  it('is built from what the library holds, though it is looked up between its runs', async () => {
    const figures = { module: 2, pressureAngleDeg: 20, helixAngleDeg: 0, profileShift: 0, faceWidth: 18 };
    const lines = await stock.gather((finder) =>
      buildBom(
        {
          trainTitle: 'Packing turntable',
          gears: [
            { ...figures, stage: 1, role: 'pinion', teeth: 24, mounting: 'keyed' },
            { ...figures, stage: 1, role: 'wheel', teeth: 30, mounting: 'keyed' },
          ],
          shafts: [
            { index: 0, diameter: 12, length: 100 },
            { index: 1, diameter: 12, length: 100 },
          ],
          box: { length: 220, width: 140, height: 90, wall: 5 },
        },
        finder,
      ),
    );
    const numbers = lines.map(({ partNumber }) => partNumber);
    expect(numbers).toEqual(expect.arrayContaining(['G-FIT', 'G-ZERO', 'H-FIT', 'L-220']));
    // Nothing of 12 mm bore but the gears is in stock: the rest is listed all the same.
    expect(lines.some(({ kind, partNumber }) => kind === 'bearing' && partNumber === null)).toBe(true);
  });
});
