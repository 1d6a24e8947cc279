import { describe, expect, it } from 'vitest';
import { ProblemError } from '../common/errors.js';
import { type Part } from '../parts/entities/part.entity.js';
import { type AdoptedGear, type AdoptedSpec } from './adopted-spec.js';
import { type TrainPatchDto } from './dto/train-patch.dto.js';
import { patchSpec } from './patch-spec.js';

const gear = (teeth: number, hand?: 'left' | 'right'): AdoptedGear => ({
  teeth,
  profileShift: 0.1,
  faceWidth: 20,
  partNumber: null,
  ...(hand ? { hand } : {}),
});

const spec = (helixAngleDeg = 0): AdoptedSpec => ({
  pressureAngleDeg: 20,
  helixAngleDeg,
  leastContactRatio: 1.2,
  stages: [
    {
      module: 2,
      centreDistance: 62,
      pinion: gear(20, helixAngleDeg ? 'right' : undefined),
      wheel: gear(40, helixAngleDeg ? 'left' : undefined),
    },
  ],
  shafts: [
    { diameter: 12, basis: 'start' },
    { diameter: 15, basis: 'start' },
  ],
});

const GOOD = {
  number: 'KW-00001',
  kind: 'gear',
  standing: 'cleared',
  teeth: 20,
  module: 2,
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  hand: null,
  profileShift: 0.1,
  faceWidth: 20,
  bore: 12,
} as const;
const part = (changes: object = {}) => ({ ...GOOD, ...changes }) as Part;

function change(patch: Partial<TrainPatchDto>, stock: Part[] = [], of = spec()): AdoptedSpec {
  return patchSpec(of, patch, new Map(stock.map((one) => [one.number, one])));
}

function refused(patch: object, stock: Part[] = [], of = spec()): [string, unknown][] {
  try {
    change(patch, stock, of);
  } catch (error) {
    if (!(error instanceof ProblemError)) throw error;
    return (error.errors ?? []).map(({ field, limit }) => [field, limit]);
  }
  return [];
}

const choosePinion = { stages: [{ pinion: { partNumber: 'KW-00001' } }] };

describe('choosing a part for a gear', () => {
  it('takes a cleared gear with the same data and leaves the given specification alone', () => {
    const before = spec();
    expect(change(choosePinion, [part()], before).stages[0]?.pinion.partNumber).toBe('KW-00001');
    expect(before.stages[0]?.pinion.partNumber).toBeNull();
  });

  it('takes a wider gear, and one whose shift is unknown where none is asked for', () => {
    expect(refused(choosePinion, [part({ faceWidth: 25 })])).toEqual([]);
    const plain = spec();
    if (plain.stages[0]) plain.stages[0].pinion.profileShift = 0;
    expect(refused(choosePinion, [part({ profileShift: null })], plain)).toEqual([]);
  });

  it.each([
    ['another tooth count', { teeth: 21 }, 20],
    ['another module', { module: 2.5 }, 2],
    ['another pressure angle', { pressureAngleDeg: 14.5 }, 20],
    ['another helix angle', { helixAngleDeg: 15 }, 0],
    ['another shift', { profileShift: 0 }, 0.1],
    ['too narrow a face', { faceWidth: 18 }, 20],
    ['a draft', { standing: 'draft' }, 'cleared'],
    ['a withdrawn part', { standing: 'withdrawn' }, 'cleared'],
    ['a part that is no gear', { kind: 'bearing' }, 'gear'],
  ])('refuses %s by name and limit', (_, changes, limit) => {
    expect(refused(choosePinion, [part(changes)])).toEqual([['stages.0.pinion.partNumber', limit]]);
  });

  it('refuses a number that is not in the library', () => {
    expect(refused(choosePinion)).toEqual([['stages.0.pinion.partNumber', undefined]]);
  });

  it('goes back to made to order with null', () => {
    const chosen = change(choosePinion, [part()]);
    const back = change({ stages: [{ pinion: { partNumber: null } }] }, [part()], chosen);
    expect(back.stages[0]?.pinion.partNumber).toBeNull();
  });

  it('wants one entry a stage', () => {
    expect(refused({ stages: [{}, {}] })).toEqual([['stages', 1]]);
  });
});

describe('changing hands', () => {
  const swap = { stages: [{ pinion: { hand: 'left' }, wheel: { hand: 'right' } }] };

  it('swaps both and lets go of a stock gear of the old hand', () => {
    const helical = spec(20);
    if (helical.stages[0]) helical.stages[0].pinion.partNumber = 'KW-00001';
    const stock = [part({ helixAngleDeg: 20, hand: 'right' })];
    const changed = change(swap as Partial<TrainPatchDto>, stock, helical);
    expect(changed.stages[0]).toMatchObject({
      pinion: { hand: 'left', partNumber: null },
      wheel: { hand: 'right' },
    });
  });

  it('refuses two gears of one hand, and a hand for a spur gear', () => {
    expect(refused({ stages: [{ pinion: { hand: 'left' } }] }, [], spec(20))).toEqual([
      ['stages.0.pinion.hand', 'right'],
    ]);
    expect(refused(swap).map(([field]) => field)).toEqual(['stages.0.pinion.hand', 'stages.0.wheel.hand']);
  });
});

describe('typing shaft diameters', () => {
  it('marks what was typed and leaves out what is null or the same', () => {
    expect(change({ shaftDiameters: [14, null] }).shafts).toEqual([
      { diameter: 14, basis: 'typed' },
      { diameter: 15, basis: 'start' },
    ]);
    expect(change({ shaftDiameters: [12, 15] }).shafts[0]?.basis).toBe('start');
  });

  it.each([
    ['0', 0, 2],
    ['text', '14', 2],
    ['600 mm', 600, 500],
    // Root diameter m (z + 2 x − 2.5) = 2 (20 + 0.2 − 2.5) = 35.4 mm.
    ['more than the root allows', 36, 35],
  ])('refuses %s', (_, diameter, limit) => {
    expect(refused({ shaftDiameters: [diameter, null] })).toEqual([['shaftDiameters.0', limit]]);
  });
});
