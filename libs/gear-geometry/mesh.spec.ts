import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  assertMeshable,
  gearRadii,
  huntingTooth,
  meshGeometry,
  meshInterferes,
  meshKernel,
  zeroBacklashDistance,
  type GearInput,
} from './index.js';
import { scaledMesh } from './testing/scaled.js';

function zeroBacklashOf(pinion: GearInput, wheel: GearInput): number {
  return zeroBacklashDistance(
    pinion.teeth,
    wheel.teeth,
    pinion.profileShift ?? 0,
    wheel.profileShift ?? 0,
    pinion.module,
    ((pinion.pressureAngleDeg ?? 20) * Math.PI) / 180,
    ((pinion.helixAngleDeg ?? 0) * Math.PI) / 180,
  );
}

/** Pairs over the whole useful range: spur and helical, shifted, undercut, moved apart and together. */
const pairs = fc
  .record({
    z1: fc.integer({ min: 7, max: 40 }),
    z2: fc.integer({ min: 12, max: 120 }),
    x1: fc.double({ min: -0.4, max: 0.5, noNaN: true }),
    x2: fc.double({ min: -0.4, max: 0.5, noNaN: true }),
    alpha: fc.constantFrom(14.5, 15, 17.5, 20, 22.5, 25),
    beta: fc.constantFrom(0, 0, 8, 20, 35),
    allowance: fc.double({ min: -0.2, max: 0.8, noNaN: true }),
  })
  .map(({ z1, z2, x1, x2, alpha, beta, allowance }) => {
    const shared = { module: 1, pressureAngleDeg: alpha, helixAngleDeg: beta };
    const pinion: GearInput = { ...shared, teeth: z1, profileShift: x1 };
    const wheel: GearInput = { ...shared, teeth: z2, profileShift: x2 };
    return { pinion, wheel, allowance };
  })
  .filter(({ pinion, wheel, allowance }) => {
    const [p, w] = [gearRadii(pinion), gearRadii(wheel)];
    const a0 = zeroBacklashOf(pinion, wheel);
    const teethStand = [p, w].every((gear) => gear.tipThickness > 0.01 && gear.tip > gear.base);
    return teethStand && a0 > 0 && a0 + Math.min(0, allowance) > p.base + w.base + 0.01;
  });

const runs = { numRuns: 400, seed: 11 };

describe('a mesh', () => {
  it('loses contact ratio strictly with distance while the tip circles set both ends of the path', () => {
    let compared = 0;
    fc.assert(
      fc.property(pairs, fc.double({ min: 1e-6, max: 0.3, noNaN: true }), (pair, further) => {
        const near = meshGeometry(pair);
        const far = meshGeometry({ ...pair, allowance: pair.allowance + further });
        const tipsDecide = near.contactRatioLimitedBy === null && far.contactRatio > 0;
        if (!tipsDecide) return;
        compared++;
        expect(far.contactRatio).toBeLessThan(near.contactRatio);
      }),
      runs,
    );
    expect(compared).toBeGreaterThan(100);
  });

  it('scales with the module', () => {
    fc.assert(
      fc.property(pairs, fc.double({ min: 0.2, max: 20, noNaN: true }), (pair, by) => {
        const one = meshGeometry(pair);
        const scaled = meshGeometry(scaledMesh(pair, by));
        for (const [field, value] of Object.entries(one)) {
          const other: unknown = scaled[field as keyof typeof scaled];
          if (typeof value !== 'number' || typeof other !== 'number') continue;
          const plain = /ratio|angle|arcmin|allowance/i.test(field);
          expect(Math.abs(other / (plain ? 1 : by) - value)).toBeLessThan(
            1e-9 * Math.max(1, Math.abs(value)),
          );
        }
        expect(scaled.findings.map((finding) => finding.code)).toEqual(
          one.findings.map((finding) => finding.code),
        );
      }),
      runs,
    );
  });

  it('gives the planner and the screens the same ratio, distance and interference', () => {
    fc.assert(
      fc.property(pairs, (pair) => {
        const mesh = meshGeometry(pair);
        const { pinion, wheel } = pair;
        const [p, w] = [gearRadii(pinion), gearRadii(wheel)];
        expect(mesh.zeroBacklashCentreDistance).toBe(zeroBacklashOf(pinion, wheel));
        expect(meshKernel(p, w, mesh.centreDistance, p.basePitch)).toBe(mesh.contactRatio);
        const found = mesh.findings.some((finding) => finding.code === 'interference');
        expect(meshInterferes(p, w, mesh.centreDistance)).toBe(found);
        expect(Math.max(0, mesh.approachLength + mesh.recessLength)).toBeCloseTo(mesh.pathOfContact, 10);
      }),
      runs,
    );
  });

  it('is the same seen from the wheel', () => {
    fc.assert(
      fc.property(pairs, ({ pinion, wheel, allowance }) => {
        const one = meshGeometry({ pinion, wheel, allowance });
        const other = meshGeometry({ pinion: wheel, wheel: pinion, allowance });
        expect(other.contactRatio).toBeCloseTo(one.contactRatio, 10);
        expect(other.tipClearancePinion).toBeCloseTo(one.tipClearanceWheel, 10);
        expect(other.normalBacklash).toBeCloseTo(one.normalBacklash, 10);
      }),
      { ...runs, numRuns: 100 },
    );
  });

  it('never gives a figure that is not finite, and never a finding without words', () => {
    fc.assert(
      fc.property(pairs, (pair) => {
        const text = JSON.stringify(meshGeometry(pair), (key, value: unknown) =>
          typeof value === 'number' && !Number.isFinite(value) ? `broken ${key}` : value,
        );
        expect(text).not.toMatch(/broken|NaN|undefined/);
      }),
      runs,
    );
  });

  it('still has the ratio it promises at the largest allowance, and less beyond it', () => {
    let compared = 0;
    fc.assert(
      fc.property(pairs, (pair) => {
        const { allowanceAtContactRatioOne: one, allowanceAtLeastContactRatio: least } = meshGeometry(pair);
        for (const [allowance, ratio] of [
          [one, 1],
          [least, 1.2],
        ] as const) {
          if (allowance === null) continue;
          compared++;
          expect(meshGeometry({ ...pair, allowance }).contactRatio).toBeCloseTo(ratio, 9);
          expect(meshGeometry({ ...pair, allowance: allowance + 1e-3 }).contactRatio).toBeLessThan(ratio);
        }
      }),
      runs,
    );
    expect(compared).toBeGreaterThan(200);
  });
});

describe('backlash', () => {
  const pinion = { teeth: 20, module: 2 };
  const wheel = { teeth: 40, module: 2 };

  it('is exactly zero at the zero-backlash distance', () => {
    const shifted = meshGeometry({
      pinion: { ...pinion, profileShift: 0.3 },
      wheel: { ...wheel, profileShift: 0.1 },
    });
    expect(shifted.normalBacklash).toBe(0);
  });

  it('at the reference distance is the sum of the thickness allowances, drawn to the base tangent', () => {
    // ISO 21771: j_bn = (|A_s1| + |A_s2|) cos α for a pair at its zero-backlash distance.
    const thin = { upper: -0.04, lower: -0.06 };
    const mesh = meshGeometry({
      pinion: { ...pinion, thicknessAllowance: thin },
      wheel: { ...wheel, thicknessAllowance: thin },
    });
    expect(mesh.circumferentialBacklash).toBeCloseTo(0.1, 12);
    expect(mesh.normalBacklash).toBeCloseTo(0.1 * Math.cos(Math.PI / 9), 12);
    expect(mesh.angularBacklashArcmin).toBeCloseTo((0.1 / 40) * (10800 / Math.PI), 9);
    // The allowance draws the cutter in, and with it root and form circle; the tip stays.
    const plain = meshGeometry({ pinion, wheel });
    expect(mesh.gear.pinion.rootDiameter).toBeLessThan(plain.gear.pinion.rootDiameter);
    expect(mesh.gear.pinion.tipDiameter).toBe(plain.gear.pinion.tipDiameter);
    expect(mesh.gear.pinion.toothThickness).toBe(plain.gear.pinion.toothThickness);
    const drawnIn = 0.05 / (2 * 2 * Math.tan(Math.PI / 9));
    expect(mesh.gear.pinion.effectiveShift).toBeCloseTo(-drawnIn, 12);
    expect(mesh.tipClearanceWheel - plain.tipClearanceWheel).toBeCloseTo(2 * drawnIn, 12);
  });
});

describe('a helical mesh', () => {
  it('has the normal backlash (|A_s1| + |A_s2|) cos α at its zero-backlash distance, whatever the helix', () => {
    // cos α_t cos β_b = cos α cos β (ISO 21771), so the helix drops out.
    const thin = { thicknessAllowance: { upper: -0.05, lower: -0.05 } };
    for (const helixAngleDeg of [0, 15, 40]) {
      const gear = { teeth: 24, module: 3, helixAngleDeg, ...thin };
      const mesh = meshGeometry({ pinion: gear, wheel: { ...gear, teeth: 50 } });
      expect(mesh.normalBacklash).toBeCloseTo(0.1 * Math.cos(Math.PI / 9), 12);
    }
  });

  const pair = {
    pinion: { teeth: 20, module: 4, helixAngleDeg: 15, faceWidth: 60, hand: 'left' as const },
    wheel: { teeth: 50, module: 4, helixAngleDeg: 15, faceWidth: 50, hand: 'right' as const },
  };

  it('adds the overlap ratio b sin β/(π m) of the common face width', () => {
    const mesh = meshGeometry(pair);
    const overlap = (50 * Math.sin(Math.PI / 12)) / (Math.PI * 4);
    expect(mesh.overlapRatio).toBeCloseTo(overlap, 12);
    expect(mesh.totalContactRatio).toBeCloseTo(mesh.contactRatio + overlap, 12);
  });

  it('has no overlap ratio to give without a face width', () => {
    const bare = { teeth: 20, module: 4, helixAngleDeg: 15 };
    const mesh = meshGeometry({ pinion: bare, wheel: { ...bare, teeth: 50 } });
    expect([mesh.overlapRatio, mesh.totalContactRatio]).toEqual([null, null]);
  });
});

describe('a pair', () => {
  it.each([
    [17, 41, true, 41],
    [20, 40, false, 2],
    [18, 60, false, 10],
  ])('of %i and %i teeth: hunting tooth %s, repeats after %i pinion turns', (z1, z2, hunting, turns) => {
    expect(huntingTooth(z1, z2)).toEqual({ hunting, repeatsAfterPinionTurns: turns });
  });

  const pinion: GearInput = { teeth: 20, module: 2, helixAngleDeg: 15, hand: 'left' };
  const wheel: GearInput = { teeth: 40, module: 2, helixAngleDeg: 15, hand: 'right' };

  it.each<[string, Partial<GearInput>]>([
    ['wheel.module', { module: 2.5 }],
    ['wheel.pressureAngleDeg', { pressureAngleDeg: 25, rack: { tipRadius: 0.3 } }],
    ['wheel.helixAngleDeg', { helixAngleDeg: 20 }],
    ['wheel.hand', { hand: 'left' }],
    ['wheel.rack.addendum', { rack: { addendum: 0.8 } }],
    ['wheel.rack.dedendum', { rack: { dedendum: 1.4, tipRadius: 0.38 } }],
    ['wheel.rack.tipRadius', { rack: { tipRadius: 0.25 } }],
  ])('that differs in %s can not mesh', (field, change) => {
    expect(() => assertMeshable(pinion, wheel)).not.toThrow();
    let fields: string[] = [];
    try {
      assertMeshable(pinion, { ...wheel, ...change });
    } catch (error) {
      fields = (error as { errors: { field: string }[] }).errors.map((issue) => issue.field);
    }
    expect(fields).toContain(field);
  });
});
