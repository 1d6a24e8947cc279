import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gearGeometry, leastClearShift, shiftForPolicy, type GearInput } from './index.js';

const gear = (teeth: number, more: Partial<GearInput> = {}): GearInput => ({ teeth, module: 2, ...more });

/** True for a multiple of 1e-4, as written in decimals. */
const isMultiple = (shift: number) => Number(shift.toFixed(4)) === shift;

describe('shift policy none', () => {
  it('leaves both gears unshifted, whatever was given', () => {
    const pinion = gear(12, { profileShift: 0.4 });
    const { pinionShift, wheelShift, mesh } = shiftForPolicy({ pinion, wheel: gear(40), policy: 'none' });
    expect([pinionShift, wheelShift]).toEqual([0, 0]);
    expect(mesh.centreDistance).toBe(52);
    expect(mesh.gear.pinion.undercut).toBe(true);
  });
});

describe('shift policy clear-undercut', () => {
  const policy = 'clear-undercut';

  it('rounds the least shift up to the next 0.0001', () => {
    // x_min = 1.25 − 0.38 (1 − sin 20°) − z sin²20°/2 by hand: z 12 0.298101, z 14 0.181122.
    const { pinionShift, wheelShift } = shiftForPolicy({ pinion: gear(12), wheel: gear(14), policy });
    expect([pinionShift, wheelShift]).toEqual([0.2982, 0.1812]);
  });

  it('shifts neither gear when neither is undercut', () => {
    const result = shiftForPolicy({ pinion: gear(20), wheel: gear(40), policy });
    expect([result.pinionShift, result.wheelShift]).toEqual([0, 0]);
    expect(result.mesh.normalBacklash).toBe(0);
  });

  it('keeps the reference distance when asked, and moves it otherwise', () => {
    const keep = shiftForPolicy({ pinion: gear(12), wheel: gear(40), policy, keepReferenceDistance: true });
    expect([keep.pinionShift, keep.wheelShift]).toEqual([0.2982, -0.2982]);
    expect(keep.mesh.centreDistance).toBe(52);
    const free = shiftForPolicy({ pinion: gear(12), wheel: gear(40), policy });
    expect([free.pinionShift, free.wheelShift]).toEqual([0.2982, 0]);
    expect(free.mesh.centreDistance).toBeGreaterThan(52);
    expect(free.mesh.centreDistance).toBe(free.mesh.zeroBacklashCentreDistance);
  });

  it.each([
    [12, 20],
    [20, 12],
    [12, 14],
  ])('refuses to keep the distance of %i/%i: the wheel would be undercut', (z1, z2) => {
    const act = () =>
      shiftForPolicy({ pinion: gear(z1), wheel: gear(z2), policy, keepReferenceDistance: true });
    expect(act).toThrow(/Keep reference distance.*free of undercut/);
    try {
      act();
    } catch (error) {
      const { errors } = error as { errors: { field: string; limit: number }[] };
      expect(errors.map((issue) => issue.field)).toEqual(['keepReferenceDistance']);
      expect(errors[0]?.limit).toBeCloseTo(gearGeometry(gear(z2)).leastShiftWithoutUndercut, 12);
    }
  });

  it('refuses by field when clearing the undercut makes the teeth pointed', () => {
    const act = () => shiftForPolicy({ pinion: gear(5), wheel: gear(40), policy });
    expect(act).toThrow(/policy needs this shift.*pointed/);
    try {
      act();
    } catch (error) {
      const { errors } = error as { errors: { field: string }[] };
      expect(errors.map((issue) => issue.field)).toEqual(['pinion.profileShift']);
    }
  });

  it('really leaves no undercut, by the least multiple that does, allowances and helix included', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 8, max: 40 }),
        fc.integer({ min: 8, max: 60 }),
        fc.constantFrom(0, 12, 30),
        fc.double({ min: -0.1, max: 0, noNaN: true }),
        (z1, z2, helixAngleDeg, lower) => {
          const more = { helixAngleDeg, thicknessAllowance: { upper: 0, lower }, tipShortening: 0.2 };
          const { pinionShift, wheelShift, mesh } = shiftForPolicy({
            pinion: gear(z1, more),
            wheel: gear(z2, more),
            policy,
          });
          for (const [shift, teeth, figures] of [
            [pinionShift, z1, mesh.gear.pinion],
            [wheelShift, z2, mesh.gear.wheel],
          ] as const) {
            expect(isMultiple(shift)).toBe(true);
            expect(figures.undercut).toBe(false);
            expect(shift).toBe(leastClearShift(gear(teeth, more)));
            const less = gearGeometry(gear(teeth, { ...more, profileShift: shift - 1e-4 }));
            if (shift > 0) expect(less.undercut).toBe(true);
          }
        },
      ),
      { numRuns: 200, seed: 5 },
    );
  });

  it('measures thin tips against the limit asked for', () => {
    const codes = (leastTipThickness: number) =>
      shiftForPolicy({ pinion: gear(10), wheel: gear(40), policy, leastTipThickness }).mesh.findings.map(
        (finding) => finding.code,
      );
    expect(codes(0.5)).toContain('tip-thin');
    expect(codes(0.2)).not.toContain('tip-thin');
  });
});
