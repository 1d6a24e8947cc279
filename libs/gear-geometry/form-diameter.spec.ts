import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gearGeometry, gearRadii, type GearInput } from './index.js';
import { RackEnvelope, turningPoint, type EnvelopeGear } from './testing/rack-envelope.js';

/**
 * √(r_F² − r_b²) as the rolling rack leaves it, found without any formula of the tooth. Below the form circle
 * the rounding of the rack reaches deeper into the tooth than its flank does. Undercut, the two profiles cross
 * there and the flank's part at work lies well above its end; else they part in a common tangent, and where the
 * flank's last bit goes out of work is the sharper mark. At the onset of undercut the two can not be told apart
 * by looking, so there `missing` says how much of the flank's end (the missing shift) lies past the base circle.
 */
function formReachByRolling(gear: EnvelopeGear, base: number, missing = 0) {
  const cut = new RackEnvelope(gear);
  const at = (reach: number) => Math.hypot(base, reach);
  const top = Math.sqrt(cut.tip ** 2 - base ** 2);
  const crossing = turningPoint(
    0,
    top,
    (reach) => cut.reachOfRounding(at(reach)) > cut.reachOfFlank(at(reach), missing),
  );
  const undercut = missing > 0 || cut.flankEnd - cut.flankDepthAt(at(crossing + 1e-6)) > 0.02;
  const until = (step: number) => turningPoint(0, top, (reach) => !cut.flankShapes(at(reach), step));
  return { undercut, reach: undercut ? crossing : 2 * until(1e-4) - until(2e-4) };
}

function inputOf(gear: EnvelopeGear): GearInput {
  return {
    teeth: gear.z,
    module: 1,
    pressureAngleDeg: gear.alphaDeg ?? 20,
    helixAngleDeg: gear.betaDeg ?? 0,
    profileShift: gear.x ?? 0,
    rack: { dedendum: gear.dedendum ?? 1.25, tipRadius: gear.tipRadius ?? 0.38 },
  };
}

function compare(gear: EnvelopeGear, missing = 0): { error: number; undercutAgrees: boolean } {
  const ours = gearRadii(inputOf(gear));
  const rolled = formReachByRolling(gear, ours.base, missing);
  return {
    error: Math.abs(ours.formReach - rolled.reach),
    undercutAgrees: ours.undercut === rolled.undercut,
  };
}

describe('form diameter', () => {
  // published.md "Undercut, interference, tips", rows R (recomputed from the formula), m 1.
  it.each([
    { z: 18, beta: 0, diameter: 16.91729, digits: 5 },
    { z: 20, beta: 0, diameter: 18.82007, digits: 5 },
    { z: 40, beta: 0, diameter: 38.39528, digits: 5 },
    { z: 10, beta: 0, diameter: 9.451204, digits: 6 },
    { z: 10, beta: 20, diameter: 9.951517, digits: 6 },
    { z: 8, beta: 30, diameter: 8.544678, digits: 6 },
  ])('of $z teeth at β $beta° is $diameter m', ({ z, beta, diameter, digits }) => {
    for (const module of [1, 0.5, 8]) {
      const found = gearGeometry({ teeth: z, module, helixAngleDeg: beta }).formDiameter / module;
      expect(found).toBeCloseTo(diameter, digits);
    }
  });

  it.each<EnvelopeGear>([
    { z: 10 },
    { z: 10, betaDeg: 20 },
    { z: 8, betaDeg: 30 },
    { z: 6 },
    { z: 18 },
    { z: 40 },
    { z: 12, x: 0.6 },
    { z: 20, x: -0.5 },
    { z: 9, alphaDeg: 25, tipRadius: 0.3, x: -0.2 },
    { z: 20, alphaDeg: 14.5 },
    { z: 11, tipRadius: 0, dedendum: 1 },
    { z: 12, betaDeg: 40, x: -0.4 },
  ])('is where the rolling rack ends the involute: %o', (gear) => {
    const { error, undercutAgrees } = compare(gear);
    expect(undercutAgrees).toBe(true);
    expect(error).toBeLessThan(1e-7);
  });

  it('agrees with the rolling rack for any gear away from the onset of undercut', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 6, max: 60 }),
        fc.double({ min: -0.5, max: 0.7, noNaN: true }),
        fc.constantFrom(14.5, 15, 17.5, 20, 22.5, 25),
        fc.double({ min: 0, max: 40, noNaN: true }),
        fc.double({ min: 0.05, max: 0.3, noNaN: true }),
        (z, x, alphaDeg, betaDeg, tipRadius) => {
          const gear = { z, x, alphaDeg, betaDeg, tipRadius };
          const { leastShift, formReach, tipReach, tipThickness } = gearRadii(inputOf(gear));
          fc.pre(Math.abs(x - leastShift) > 0.03 && formReach < tipReach && tipThickness > 0);
          const { error, undercutAgrees } = compare(gear);
          expect(undercutAgrees).toBe(true);
          expect(error).toBeLessThan(1e-6);
        },
      ),
      { numRuns: 60, seed: 2 },
    );
  });

  describe('at the onset of undercut', () => {
    const gears: EnvelopeGear[] = [{ z: 12 }, { z: 8, betaDeg: 25 }, { z: 11, alphaDeg: 15, tipRadius: 0.2 }];

    it.each(gears)('keeps 1e-6 m against the rolling rack: %o', (gear) => {
      const { leastShift } = gearRadii(inputOf(gear));
      for (const missing of [1e-2, 1e-3, 3e-4, 1e-4]) {
        expect(compare({ ...gear, x: leastShift - missing }, missing).error).toBeLessThan(1e-6);
      }
    });

    it.each(gears)('shrinks in proportion to the missing shift down to nothing: %o', (gear) => {
      const { leastShift } = gearRadii(inputOf(gear));
      const reachAt = (missing: number) => gearRadii(inputOf({ ...gear, x: leastShift - missing })).formReach;
      // Linear with a small quadratic part: two coarse values foretell the fine ones.
      const slope = (2 * reachAt(1e-3)) / 1e-3 - reachAt(2e-3) / 2e-3;
      for (const missing of [1e-4, 1e-5, 1e-6, 1e-7, 1e-8]) {
        expect(Math.abs(reachAt(missing) - slope * missing)).toBeLessThan(1e-5 * missing + 5 * missing ** 2);
      }
    });
  });

  it('reports undercut exactly when the generating shift is below the least one', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 6, max: 40 }),
        fc.double({ min: 0, max: 40, noNaN: true }),
        fc.constantFrom(-0.03, -1e-4, -1e-8, 0, 1e-8, 1e-4, 0.03),
        fc.double({ min: -0.15, max: 0, noNaN: true }),
        (teeth, helixAngleDeg, beyond, allowance) => {
          const gear = { teeth, module: 2, helixAngleDeg };
          const least = gearGeometry(gear).leastShiftWithoutUndercut;
          const thinning = allowance / (2 * 2 * Math.tan(Math.PI / 9));
          const profileShift = least + beyond - thinning;
          fc.pre(Math.abs(profileShift) < 0.45);
          const cut = gearGeometry({
            ...gear,
            profileShift,
            thicknessAllowance: { upper: allowance, lower: allowance },
          });
          expect(cut.undercut).toBe(beyond < -1e-9);
          expect(cut.leastShiftWithoutUndercut).toBe(least);
        },
      ),
      { numRuns: 200, seed: 3 },
    );
  });
});
