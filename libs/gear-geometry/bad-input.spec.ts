import { describe, expect, it } from 'vitest';
import { DomainError, type FieldIssue } from '../units/index.js';
import {
  gearGeometry,
  huntingTooth,
  meshGeometry,
  overPins,
  shiftForPolicy,
  spanMeasurement,
  toothOutline,
} from './index.js';

/** The issues of a refusal; fails when there is none. */
function refusal(act: () => unknown): FieldIssue[] {
  try {
    act();
  } catch (error) {
    expect(error).toBeInstanceOf(DomainError);
    return (error as DomainError).errors;
  }
  throw new Error('Expected a refusal.');
}

/** As JSON from outside may look: whatever somebody typed. */
const gearOf = (input: unknown) => () => gearGeometry(input as never);
const meshOf = (input: unknown) => () => meshGeometry(input as never);
const shiftOf = (input: unknown) => () => shiftForPolicy(input as never);

const good = { teeth: 20, module: 2 };

it('a helix too slight for an axial pitch has none', () => {
  expect(gearGeometry({ ...good, helixAngleDeg: 1e-308 }).axialPitch).toBeNull();
  expect(gearGeometry({ ...good, helixAngleDeg: 1e-3 }).axialPitch).toBeGreaterThan(3e5);
});

describe('a gear is refused', () => {
  it.each<[string, unknown, unknown]>([
    ['teeth', { module: 2 }, undefined],
    ['teeth', { ...good, teeth: 19.5 }, 19.5],
    ['teeth', { ...good, teeth: 3 }, 3],
    ['teeth', { ...good, teeth: -20 }, -20],
    ['teeth', { ...good, teeth: 1e9 }, 1e9],
    ['teeth', { ...good, teeth: '20' }, '20'],
    ['teeth', { ...good, teeth: NaN }, NaN],
    ['module', { ...good, module: 0 }, 0],
    ['module', { ...good, module: -2 }, -2],
    ['module', { ...good, module: Infinity }, Infinity],
    ['module', { ...good, module: 1e6 }, 1e6],
    ['module', { ...good, module: 1e-300 }, 1e-300],
    ['pressureAngleDeg', { ...good, pressureAngleDeg: 21 }, 21],
    ['pressureAngleDeg', { ...good, pressureAngleDeg: NaN }, NaN],
    ['helixAngleDeg', { ...good, helixAngleDeg: -1 }, -1],
    ['helixAngleDeg', { ...good, helixAngleDeg: 46 }, 46],
    ['profileShift', { ...good, profileShift: NaN }, NaN],
    ['profileShift', { ...good, profileShift: 1e3 }, 1e3],
    ['tipShortening', { ...good, tipShortening: 2 }, 2],
    ['faceWidth', { ...good, faceWidth: 0 }, 0],
    ['hand', { ...good, hand: 'up' }, 'up'],
    ['rack', { ...good, rack: 'A' }, 'A'],
    ['rack.addendum', { ...good, rack: { addendum: -1 } }, -1],
    ['rack.dedendum', { ...good, rack: { dedendum: 2.2 } }, 2.2],
    ['rack.tipRadius', { ...good, rack: { tipRadius: 0.5 } }, 0.5],
    ['rack.tipRadius', { ...good, rack: { tipRadius: -0.1 } }, -0.1],
    ['thicknessAllowance.upper', { ...good, thicknessAllowance: { upper: 0.1, lower: -0.1 } }, 0.1],
    ['thicknessAllowance.lower', { ...good, thicknessAllowance: { upper: -0.2, lower: -0.1 } }, -0.1],
    ['thicknessAllowance.lower', { ...good, thicknessAllowance: { upper: 0 } }, undefined],
    // Pointed; cut down to the axis; no involute left.
    ['profileShift', { teeth: 10, module: 2, profileShift: 0.8 }, 0.8],
    ['profileShift', { teeth: 5, module: 2, profileShift: -1.5 }, -1.5],
    ['profileShift', { teeth: 40, module: 2, profileShift: -2.5 }, -2.5],
  ])('for %s in %o', (field, input, value) => {
    const issues = refusal(gearOf(input));
    expect(issues.map((issue) => issue.field)).toEqual([field]);
    expect(issues[0]?.value).toEqual(value);
    // In a designer's words: what the field is called, what is wrong, what to do.
    expect(issues[0]?.message).toMatch(/^[A-Z][a-z ]+.*\.$/);
    expect(issues[0]?.message).not.toMatch(/undefined|null|object|function|NaN|Infinity/);
  });

  it.each([null, undefined, 12, 'gear', []])('when it is %o', (input) => {
    expect(refusal(gearOf(input))[0]?.field).toBe('gear');
  });

  it('with every fault at once, each with its limit', () => {
    const issues = refusal(gearOf({ teeth: 2, module: 0, helixAngleDeg: 60 }));
    expect(issues.map(({ field, limit }) => [field, limit])).toEqual([
      ['teeth', 4],
      ['module', 'above 0'],
      ['helixAngleDeg', 45],
    ]);
  });

  it('with the shift that would still do when the teeth are pointed', () => {
    const [issue] = refusal(gearOf({ teeth: 10, module: 2, profileShift: 0.8 }));
    // published.md: z 10 is pointed at 0.700 (recomputed).
    expect(Number(issue?.limit)).toBeCloseTo(0.7, 3);
    expect(gearOf({ teeth: 10, module: 2, profileShift: issue?.limit })).not.toThrow();
  });

  it('in a short line even when the value is very long', () => {
    const [issue] = refusal(gearOf({ ...good, module: 'x'.repeat(100_000) }));
    expect(issue?.message.length).toBeLessThan(200);
  });

  it('the same way by every function on one gear', () => {
    const bad = { teeth: 3, module: 2 };
    for (const act of [() => spanMeasurement(bad), () => overPins(bad, 3), () => toothOutline(bad)]) {
      expect(refusal(act)[0]?.field).toBe('teeth');
    }
  });

  it('with the largest rounding that fits, which itself is taken', () => {
    const [issue] = refusal(gearOf({ ...good, pressureAngleDeg: 25, rack: { tipRadius: 0.38 } }));
    // ρ_max = (π/4 − 1.25 tan 25°) cos 25°/(1 − sin 25°)
    expect(Number(issue?.limit)).toBeCloseTo(0.3178, 4);
    const fits = { ...good, pressureAngleDeg: 25, rack: { tipRadius: Number(issue?.limit) } };
    expect(gearOf(fits)).not.toThrow();
    expect(gearOf({ ...good, pressureAngleDeg: 25 })).not.toThrow();
  });
});

describe('a mesh is refused', () => {
  const pair = { pinion: good, wheel: { ...good, teeth: 40 } };

  it.each<[string, unknown]>([
    ['pinion.teeth', { ...pair, pinion: { ...good, teeth: 2 } }],
    ['wheel', { pinion: good }],
    ['wheel.module', { ...pair, wheel: { ...good, module: 3 } }],
    ['centreDistance', { ...pair, centreDistance: 56 }],
    ['centreDistance', { ...pair, centreDistance: NaN }],
    ['centreDistance', { ...pair, centreDistance: -60 }],
    ['allowance', { ...pair, allowance: -2 }],
    ['allowance', { ...pair, allowance: 0.1, centreDistance: 60 }],
    ['leastContactRatio', { ...pair, leastContactRatio: -1 }],
    ['mesh', null],
  ])('for %s in %o', (field, input) => {
    expect(refusal(meshOf(input)).map((issue) => issue.field)).toEqual([field]);
  });

  it('when the base circles overlap, with the least distance', () => {
    const [issue] = refusal(meshOf({ ...pair, centreDistance: 50 }));
    // r_b1 + r_b2 = 60 cos 20°
    expect(Number(issue?.limit)).toBeCloseTo(56.3816, 4);
    expect(issue?.message).toMatch(/too small.*56\.3816 mm.*60 mm/);
  });

  it('when the shifts leave no distance free of backlash', () => {
    const input = {
      pinion: { teeth: 14, module: 1, profileShift: -0.4 },
      wheel: { teeth: 14, module: 1, profileShift: -0.4 },
    };
    expect(refusal(meshOf(input))[0]?.field).toBe('wheel.profileShift');
  });
});

describe('other requests are refused', () => {
  const pair = { pinion: good, wheel: { ...good, teeth: 40 } };

  it('a shift policy that is not available', () => {
    for (const policy of ['best-contact', 'balanced-sliding', '', undefined, 7]) {
      expect(refusal(shiftOf({ ...pair, policy }))[0]?.field).toBe('policy');
    }
    expect(refusal(shiftOf({ ...pair, policy: 'none', keepReferenceDistance: 1 }))[0]?.field).toBe(
      'keepReferenceDistance',
    );
    expect(refusal(shiftOf({ ...pair, policy: 'none', leastTipThickness: -1 }))[0]?.field).toBe(
      'leastTipThickness',
    );
    expect(refusal(shiftOf(null))[0]?.field).toBe('shift');
  });

  it('pins that do not fit', () => {
    for (const pin of [0.5, 8, 0, NaN]) {
      expect(refusal(() => overPins(good, pin))[0]?.field).toBe('pinDiameter');
    }
  });

  it('tooth numbers that are not whole', () => {
    expect(refusal(() => huntingTooth(12.5, 30))[0]?.field).toBe('pinionTeeth');
    expect(refusal(() => huntingTooth(12, 0))[0]?.field).toBe('wheelTeeth');
  });

  it('an outline of too many points', () => {
    expect(refusal(() => toothOutline(good, { pointsPerFlank: 1e9 }))[0]?.field).toBe('pointsPerFlank');
  });
});
