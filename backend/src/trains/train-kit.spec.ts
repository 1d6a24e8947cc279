import { describeTrain } from '@stageyard/libs/train-planner';
import { describe, expect, it } from 'vitest';
import { type AdoptedSpec } from './adopted-spec.js';
import { kitOf, STARTING_WALL } from './train-kit.js';

const gear = (teeth: number) => ({ teeth, profileShift: 0, faceWidth: 20, partNumber: null });
const shaft = { diameter: 12, basis: 'typed' as const };
const spec = (envelope?: AdoptedSpec['envelope']): AdoptedSpec => ({
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  leastContactRatio: 1.2,
  stages: [{ module: 2, centreDistance: 60, pinion: gear(20), wheel: gear(40) }],
  shafts: [shaft, shaft],
  ...(envelope ? { envelope } : {}),
});
const kit = (envelope?: AdoptedSpec['envelope']) => {
  const adopted = spec(envelope);
  return kitOf('Vent drive', adopted, describeTrain(adopted));
};

// m 2, 20/40: tips 44 and 84 mm, so 22 + 60 + 42 = 124 mm long, 84 mm high, 20 mm wide over the gears.
describe('the housing of a kit', () => {
  it.each([undefined, { wall: 0 }, { height: 200 }])(
    'has room for the gears inside the starting wall where the brief names none: %o',
    (envelope) => {
      const { box } = kit(envelope);
      expect(STARTING_WALL).toBe(5);
      expect(box).toEqual({ length: 134, width: 30, height: 94, wall: 5 });
    },
  );

  it('has the wall of the brief, and input and output shafts that reach through it', () => {
    const { box, shafts } = kit({ length: 200, wall: 8 });
    expect(box).toEqual({ length: 140, width: 36, height: 100, wall: 8 });
    // Face 20 mm, 8 mm of wall on one side and half the 5 mm gap, 2.5 mm, on the other, in whole mm.
    expect(shafts.map(({ length }) => length)).toEqual([31, 31]);
  });
});
