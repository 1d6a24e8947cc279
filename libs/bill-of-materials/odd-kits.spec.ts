import { describe, expect, it } from 'vitest';
import { InputError } from '../units/index.js';
import { buildBom, type BomLine, type KitRequest } from './index.js';
import { emptyLibrary, twoStageKit } from './testing/kit-builder.js';

const ofKind = (lines: BomLine[], kind: BomLine['kind']) => lines.filter((line) => line.kind === kind);

describe('sizes without a standard part', () => {
  it('keeps the line and says what to do', () => {
    const kit = twoStageKit();
    const sizes = [5, 23, 20];
    const shafts = kit.shafts.map((shaft, i) => ({ ...shaft, diameter: sizes[i] ?? 20 }));
    const lines = buildBom({ ...kit, shafts }, emptyLibrary);
    expect(ofKind(lines, 'key')[0]?.flags[0]).toBe(
      'no DIN 6885-1 key for bore 5 mm: choose another way to hold the gear',
    );
    const ring = ofKind(lines, 'retaining-ring').find((line) => line.description.includes('Ø23'));
    // The pinion of stage 2 is too thin for a keyway at 23 mm: the wheel and the locating bearing are left.
    expect(ring).toMatchObject({ quantity: 2 });
    expect(ring?.flags[0]).toBe('DIN 471 has no ring for 23 mm: step the seat to 22 mm or use another way');
    expect(ofKind(lines, 'bearing')[1]?.flags).toContain(
      '23 mm is no bearing bore; the next bearing bore is 25 mm',
    );
  });
});

describe('a shaft too thick for its gears', () => {
  it('keeps both gears on the list and says why they cannot be', () => {
    const kit = twoStageKit();
    // Root circles with the default rack: 30 − 3.75 = 26.25 mm and 90 − 3.75 = 86.25 mm.
    const shafts = kit.shafts.map((shaft) => ({ ...shaft, diameter: 90 }));
    const lines = buildBom({ ...kit, shafts }, emptyLibrary);
    const pinion = lines.find((line) => line.source.includes('Stage 1 pinion, shaft 0'));
    expect(pinion?.flags).toContain('shaft thicker than the root circle, 26.25 mm');
    const wheel = lines.find((line) => line.source.includes('Stage 1 wheel'));
    expect(wheel?.flags).toContain('bore 90 mm does not fit inside the root circle, 86.25 mm');
    expect(wheel?.mass).toBeNull();
  });
});

describe('a request without meaning', () => {
  const kit = twoStageKit();
  const refusal = (over: Partial<KitRequest>) => {
    try {
      buildBom({ ...kit, ...over }, emptyLibrary);
    } catch (error) {
      if (error instanceof InputError) return error.errors.map((issue) => issue.field);
      throw error;
    }
    return [];
  };
  const withGear = (over: object) => ({
    gears: kit.gears.map((gear, i) => (i === 0 ? { ...gear, ...over } : gear)),
  });

  it('is refused by field', () => {
    expect(refusal({})).toEqual([]);
    expect(refusal(withGear({ teeth: 3.5 }))).toEqual(['gears.0.teeth']);
    expect(refusal(withGear({ module: 0, profileShift: Number.NaN }))).toEqual([
      'gears.0.module',
      'gears.0.profileShift',
    ]);
    expect(refusal(withGear({ helixAngleDeg: 60 }))).toEqual(['gears.0.helixAngleDeg']);
    expect(refusal({ box: { ...kit.box, wall: 40 } })).toEqual(['box.wall']);
    expect(refusal({ box: { ...kit.box, length: Number.POSITIVE_INFINITY } })).toEqual(['box.length']);
    expect(refusal({ shafts: kit.shafts.slice(0, 2) })).toEqual(['gears']);
    expect(refusal({ shafts: kit.shafts.slice(1) })).toEqual(['shafts']);
    expect(refusal({ shafts: [] })).toEqual(['shafts']);
    expect(refusal({ gears: kit.gears.slice(1) })).toEqual(['gears']);
  });
});
