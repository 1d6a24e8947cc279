import { describe, expect, it } from 'vitest';
import { type PartNeed } from '../part-finder.js';
import { fitAsSubstitute } from './fit-as-substitute.js';
import { placeOf, placePart } from './place-part.js';
import { type SizesOf, type SubstitutePart, type SubstituteSizes } from './substitute-part.js';

const part = (number: string, sizes: SubstituteSizes): SubstitutePart => ({
  number,
  standing: 'cleared',
  material: null,
  sizes,
});

/** The original with some sizes changed, in its place. */
const fit = <S extends SubstituteSizes>(original: S, changes: Partial<S>) =>
  fitAsSubstitute(part('OLD', original), part('NEW', { ...original, ...changes }));

// 6201 of ISO 15, dimension series 02: 12 × 32 × 10; ratings as makers commonly print them.
const bearing: SizesOf<'bearing'> = {
  ...{ kind: 'bearing' as const, bore: 12, outerDiameter: 32, width: 10, type: 'deep groove ball' },
  ...{ dynamicLoadRating: 7.28, staticLoadRating: 3.1 },
};
const key = { kind: 'key' as const, width: 6, height: 6, length: 20 };
const ring = { kind: 'retaining-ring' as const, shaftDiameter: 20, thickness: 1.2, grooveDiameter: 19 };
const seal = { kind: 'seal' as const, shaftDiameter: 20, outerDiameter: 35, width: 7 };
const shaft = { kind: 'shaft' as const, diameter: 20, length: 150 };
const housing = { kind: 'housing' as const, length: 200, width: 120, height: 90, wall: 5 };
const oil = { kind: 'lubricant' as const, viscosityGrade: 'ISO VG 220', packVolume: 1 };
const screw = { kind: 'fastener' as const, thread: 'M6', length: 20, strengthClass: '8.8' };

describe('parts without teeth', () => {
  it.each<SubstituteSizes>([bearing, key, ring, seal, shaft, housing, oil, screw])(
    '$kind: fits when all is the same',
    (sizes) => {
      expect(fit(sizes, {})).toEqual({ fits: true, misfits: [], differences: [], toCheck: [] });
    },
  );

  it.each<[SubstituteSizes, object, string]>([
    [bearing, { bore: 10 }, 'bore 10 mm, not 12 mm'],
    [bearing, { outerDiameter: 28 }, 'outer diameter 28 mm, not 32 mm'],
    [bearing, { width: 8 }, 'width 8 mm, not 10 mm'],
    [bearing, { type: 'cylindrical roller' }, 'type cylindrical roller, not deep groove ball'],
    [bearing, { dynamicLoadRating: 6.8 }, 'dynamic load rating C 6.8 kN, less than 7.28 kN'],
    [bearing, { staticLoadRating: 3 }, 'static load rating C0 3 kN, less than 3.1 kN'],
    [key, { width: 5 }, 'width 5 mm, not 6 mm'],
    [key, { length: 18 }, 'length 18 mm, not 20 mm'],
    [ring, { thickness: 1 }, 'thickness 1 mm, not 1.2 mm'],
    [seal, { outerDiameter: 32 }, 'outer diameter 32 mm, not 35 mm'],
    [shaft, { diameter: 19 }, 'diameter 19 mm, not 20 mm'],
    [shaft, { length: 149 }, 'length 149 mm, less than 150 mm'],
    [housing, { wall: 4 }, 'wall 4 mm, less than 5 mm'],
    [housing, { height: 89 }, 'height inside 79 mm, less than 80 mm'],
    // A wall of 7 mm takes 4 mm of the inside: 200 − 14 = 186 < 190.
    [housing, { wall: 7 }, 'length inside 186 mm, less than 190 mm'],
    [oil, { viscosityGrade: 'ISO VG 150' }, 'viscosity grade ISO VG 150, not ISO VG 220'],
    [screw, { thread: 'M5' }, 'thread M5, not M6'],
    [screw, { length: 25 }, 'length 25 mm, not 20 mm'],
    [screw, { strengthClass: '5.6' }, 'strength class 5.6, lower than 8.8'],
    [screw, { strengthClass: 'A2-70' }, 'strength class A2-70, not 8.8'],
  ])('%o does not fit with %o', (sizes, changes, reason) => {
    const { fits, misfits } = fit(sizes, changes);
    expect(fits).toBe(false);
    expect(misfits).toContain(reason);
  });

  it('says where it is more than the original', () => {
    expect(fit(bearing, { dynamicLoadRating: 8 }).differences).toEqual([
      'dynamic load rating C 8 kN, 0.72 kN more',
    ]);
    expect(fit(shaft, { length: 200 }).differences).toEqual(['length 200 mm, 50 mm more']);
    expect(fit(screw, { strengthClass: '10.9' }).differences).toEqual([
      'strength class 10.9, higher than 8.8',
    ]);
    expect(fit(oil, { packVolume: 5 }).differences).toEqual(['packs of 5 l, not 1 l']);
    // 206 − 2·7 = 192 mm inside, 126 − 14 = 112 and 100 − 14 = 86, for 190, 110 and 80.
    expect(fit(housing, { length: 206, width: 126, height: 100, wall: 7 })).toMatchObject({
      fits: true,
      differences: [
        'length inside 192 mm, 2 mm more',
        'width inside 112 mm, 2 mm more',
        'height inside 86 mm, 6 mm more',
        'wall 7 mm, 2 mm more',
      ],
    });
  });

  it('compares classes by tensile and yield strength (ISO 898-1: 9.8 yields at 720, 10.9 at 900 N/mm²)', () => {
    expect(fit({ ...screw, strengthClass: '9.8' }, { strengthClass: '10.9' }).fits).toBe(true);
    expect(fit({ ...screw, strengthClass: '10.9' }, { strengthClass: '9.8' }).fits).toBe(false);
    // 5.8 yields at 400 and breaks at 500 N/mm²; 6.8 at 480 and 600.
    expect(fit({ ...screw, strengthClass: '5.8' }, { strengthClass: '6.8' }).fits).toBe(true);
    expect(fit({ ...screw, strengthClass: 'A2-70' }, { strengthClass: 'a2 70' }).fits).toBe(true);
  });

  it('has unknown load ratings checked', () => {
    expect(fit(bearing, { dynamicLoadRating: null })).toMatchObject({
      fits: true,
      toCheck: ['dynamic load rating C is not stated; at least 7.28 kN is needed'],
    });
    const unrated: SizesOf<'bearing'> = { ...bearing, dynamicLoadRating: null, staticLoadRating: null };
    expect(fit(unrated, {}).toCheck).toHaveLength(2);
    expect(fit(unrated, { dynamicLoadRating: 7 }).toCheck).toHaveLength(2);
  });

  it('knows nothing of other parts, and keeps kinds apart', () => {
    expect(fit({ kind: 'other' }, {}).fits).toBe(false);
    expect(fitAsSubstitute(part('A', key), part('B', shaft)).misfits).toEqual(['it is a shaft, not a key']);
  });
});

describe('a place without a part of its own', () => {
  it('takes what meets its need and leaves the rest to be checked', () => {
    const place = placePart({ kind: 'bearing', bore: 12 });
    expect(fitAsSubstitute(place, part('NEW', { ...bearing, bore: 15 })).fits).toBe(false);
    const { fits, toCheck } = fitAsSubstitute(place, part('NEW', bearing));
    expect(fits).toBe(true);
    expect(toCheck).toContain('outer diameter 32 mm: see that it fits');
  });

  it('asks of a gear the widest need and the thinnest shaft of its line', () => {
    const need: PartNeed = {
      ...{ kind: 'gear', partNumber: null, teeth: 40, module: 2, pressureAngleDeg: 20, helixAngleDeg: 0 },
      ...{ hand: null, profileShift: 0, faceWidth: 20, bore: 15 },
    };
    expect(placeOf([need, { ...need, faceWidth: 24, bore: 17 }], 5)).toEqual({
      leastFaceWidth: 24,
      // Beside the narrower gear there is room for 20 + 5 mm.
      mostFaceWidth: 25,
      shaftDiameter: 15,
    });
    expect(placeOf([{ kind: 'bearing', bore: 12 }], 5)).toEqual({});
  });
});
