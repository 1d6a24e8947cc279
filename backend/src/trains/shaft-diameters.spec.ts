import { describe, expect, it } from 'vitest';
import { type AdoptedGear } from './adopted-spec.js';
import { chooseShaftDiameters, rootLimit } from './shaft-diameters.js';

const gear = (teeth: number): AdoptedGear => ({ teeth, profileShift: 0, faceWidth: 20, partNumber: null });

/** One stage of module 2: root diameters m (z − 2.5), 35 mm and 75 mm. */
const spec = {
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  stages: [{ module: 2, centreDistance: 60, pinion: gear(20), wheel: gear(40) }],
};
const choose = (leastDiameter: number | null, bores: number[] = []) =>
  chooseShaftDiameters(spec, [
    { leastDiameter, bores },
    { leastDiameter: null, bores: [] },
  ])[0];

describe('a shaft diameter', () => {
  it.each([
    [7, 7],
    [11, 12],
    [13, 15],
    [16, 17],
    [18, 20],
    [21, 25],
  ])('of at least %i mm for the torque is the next bearing bore of ISO 15, %i mm', (least, diameter) => {
    expect(choose(least)).toEqual({ diameter, basis: 'torque' });
  });

  it('is the bore of a stock gear, unless that is too thin for the torque', () => {
    expect(choose(14, [16])).toEqual({ diameter: 16, basis: 'bore' });
    expect(choose(16, [16])).toEqual({ diameter: 16, basis: 'bore' });
    expect(choose(18, [16])).toEqual({ diameter: 20, basis: 'torque' });
  });

  it('takes the smaller of two bores, since the larger gear can be bushed', () => {
    expect(choose(null, [15, 12])).toEqual({ diameter: 12, basis: 'bore' });
  });

  it('starts at 10 mm when nothing is known', () => {
    expect(choose(null)).toEqual({ diameter: 10, basis: 'start' });
  });

  it('never reaches into the teeth: at most 35 mm inside a root of 35 mm', () => {
    expect(choose(50)).toEqual({ diameter: 35, basis: 'torque' });
    const slim = { ...spec, stages: [{ module: 1, centreDistance: 30, pinion: gear(19), wheel: gear(41) }] };
    // Root m (z − 2.5) = 16.5 mm: the bearing bore above 16 mm is 17 mm and does not fit; 16 mm does.
    const [input] = chooseShaftDiameters(slim, [{ leastDiameter: 16, bores: [] }]);
    expect(input).toEqual({ diameter: 16, basis: 'torque' });
  });

  it('starts smaller where 10 mm would leave no rim under the keyway', () => {
    // z 17, m 1: root 14.5; a bore of 6 leaves (14.5 − 6)/2 − 1.0 = 3.25 mm, one of 10 leaves 0.85 mm; 2 m = 2 mm.
    const small = {
      ...spec,
      stages: [{ module: 1, centreDistance: 28.5, pinion: gear(17), wheel: gear(40) }],
    };
    const [input] = chooseShaftDiameters(small, [
      { leastDiameter: null, bores: [] },
      { leastDiameter: null, bores: [] },
    ]);
    // DIN 6885-1: over 6 up to 8 mm t2 = 1.0, so (14.5 − 8)/2 − 1.0 = 2.25 mm still holds; 9 mm has t2 = 1.4.
    expect(input).toEqual({ diameter: 8, basis: 'start' });
  });
});

it('the room inside the teeth is the root diameter, m (z − 2.5), in whole mm', () => {
  const placed = { stage: 0, role: 'pinion' as const, gear: gear(17), module: 1.25 };
  expect(rootLimit(spec, placed)).toBe(Math.floor(1.25 * 14.5));
});
