import { describe, expect, it } from 'vitest';
import {
  gearGeometry,
  gearRadii,
  meshGeometry,
  shiftSumForDistance,
  zeroBacklashDistance,
  type GearInput,
  type MeshInput,
} from './index.js';
import { SCALES, scaledGear, scaledMesh } from './testing/scaled.js';

const ALPHA = Math.PI / 9;

/** Asserts a figure to the printed digits: half a unit of the last one. */
function expectPrinted(found: number, printed: number, decimals: number): void {
  expect(Math.abs(found - printed)).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9));
}

describe.each(SCALES)('published pairs, every length times %f', (by) => {
  const mesh = (input: MeshInput) => meshGeometry(scaledMesh(input, by));
  const gear = (input: GearInput) => gearGeometry(scaledGear(input, by));

  describe('standard spur pair m 3, 12/24 (Kohara, Gear Technical Reference; from memory)', () => {
    const pair = { pinion: { teeth: 12, module: 3 }, wheel: { teeth: 24, module: 3 } };

    it('has the printed diameters and distance', () => {
      const { gear: gears, zeroBacklashCentreDistance } = mesh(pair);
      expectPrinted(zeroBacklashCentreDistance / by, 54, 4);
      for (const [figures, d, base, tip, root] of [
        [gears.pinion, 36, 33.829, 42, 28.5],
        [gears.wheel, 72, 67.658, 78, 64.5],
      ] as const) {
        expectPrinted(figures.referenceDiameter / by, d, 4);
        expectPrinted(figures.baseDiameter / by, base, 3);
        expectPrinted(figures.tipDiameter / by, tip, 4);
        expectPrinted(figures.rootDiameter / by, root, 4);
      }
    });

    it('has the textbook contact ratio and, with the undercut of 12 teeth, the smaller real one (recomputed)', () => {
      const figures = mesh(pair);
      expectPrinted(figures.contactRatioIgnoringUndercut, 1.51112, 5);
      expectPrinted(figures.contactRatio, 1.27456, 5);
      expect(figures.contactRatioLimitedBy).toMatch(/undercut.*pinion/i);
      expect(figures.gear.pinion.undercut).toBe(true);
    });
  });

  describe('profile-shifted spur pair m 3, 12/24, x 0.6/0.36 (Kohara; from memory)', () => {
    const shifts = { pinion: 0.6, wheel: 0.36 };
    const y = (zeroBacklashDistance(12, 24, 0.6, 0.36, 1, ALPHA, 0) - 18) / 1;
    const k = 0.96 - y;
    const pair = {
      pinion: { teeth: 12, module: 3, profileShift: shifts.pinion, tipShortening: k },
      wheel: { teeth: 24, module: 3, profileShift: shifts.wheel, tipShortening: k },
    };

    it('has the printed distance and angle', () => {
      const figures = mesh(pair);
      expectPrinted(y, 0.83329, 5);
      expectPrinted(figures.zeroBacklashCentreDistance / by, 56.4999, 4);
      expectPrinted(figures.operatingPressureAngleDeg, 26.0886, 4);
      const involute = (deg: number) => Math.tan((deg * Math.PI) / 180) - (deg * Math.PI) / 180;
      expectPrinted(involute(figures.operatingPressureAngleDeg), 0.034316, 6);
      expectPrinted(((figures.centreDistance / by) * 12) / 18, 37.667, 3);
      expectPrinted(((figures.centreDistance / by) * 24) / 18, 75.333, 3);
    });

    it('has the printed diameters with shortened tips, and the recomputed contact ratio', () => {
      const figures = mesh(pair);
      const { pinion, wheel } = figures.gear;
      expectPrinted((pinion.tipDiameter - pinion.referenceDiameter) / 2 / by, 4.42, 3);
      expectPrinted((wheel.tipDiameter - wheel.referenceDiameter) / 2 / by, 3.7, 3);
      expectPrinted(pinion.tipDiameter / by, 44.84, 3);
      expectPrinted(wheel.tipDiameter / by, 79.4, 3);
      expectPrinted(pinion.rootDiameter / by, 32.1, 3);
      expectPrinted(wheel.rootDiameter / by, 66.66, 3);
      expectPrinted(figures.contactRatio, 1.202102, 6);
    });

    it('comes back from the distance (same source, reverse; from memory)', () => {
      const unshifted = { pinion: { teeth: 12, module: 3 }, wheel: { teeth: 24, module: 3 } };
      const figures = mesh({ ...unshifted, centreDistance: 56.4999 });
      expectPrinted(figures.operatingPressureAngleDeg, 26.0886, 4);
      expectPrinted(shiftSumForDistance(12, 24, 56.4999 * by, 3 * by, ALPHA, 0), 0.96, 4);
    });
  });

  it('gives the pinion that runs with a rack d_a 45.600, a 51.800 at H 32 (Kohara; from memory)', () => {
    const { tipDiameter, referenceDiameter } = gear({ teeth: 12, module: 3, profileShift: 0.6 });
    expectPrinted(tipDiameter / by, 45.6, 3);
    // The rack's datum line lies x m above the pinion's reference circle.
    expectPrinted(32 + referenceDiameter / by / 2 + 0.6 * 3, 51.8, 3);
  });

  it('computes a helical pair stated in the transverse system (Kohara; from memory)', () => {
    const cosBeta = Math.cos(Math.PI / 6);
    const normalAlpha = Math.atan(Math.tan(ALPHA) * cosBeta);
    expectPrinted((normalAlpha * 180) / Math.PI, 17.49524, 5);
    const m = 3 * cosBeta * by;
    // This angle is on no cutter list, so only the unchecked functions take it.
    const shared = {
      module: m,
      pressureAngleDeg: (normalAlpha * 180) / Math.PI,
      helixAngleDeg: 30,
      tipShortening: 0.0130356,
      rack: { addendum: 1.154701, dedendum: 1.443376 },
    };
    const pinion = gearRadii({ ...shared, teeth: 12, profileShift: 0.34462 / cosBeta });
    const wheel = gearRadii({ ...shared, teeth: 60 });
    const a = zeroBacklashDistance(12, 60, 0.34462 / cosBeta, 0, m, normalAlpha, Math.PI / 6);
    expectPrinted(a / by, 109, 4);
    expectPrinted((Math.acos((pinion.base + wheel.base) / a) * 180) / Math.PI, 21.3975, 4);
    expectPrinted((2 * pinion.tip) / by, 44, 3);
    expectPrinted((2 * wheel.tip) / by, 185.932, 3);
    expectPrinted((2 * pinion.root) / by, 30.568, 3);
    expectPrinted((2 * wheel.root) / by, 172.5, 2);
  });

  it('computes the helical pair m_n 4, β 15°, 20/50 (Jindal, Machine Design, ex. 26-1; seen)', () => {
    const shared = { module: 4, helixAngleDeg: 15 };
    const { pinion, wheel } = mesh({
      pinion: { ...shared, teeth: 20 },
      wheel: { ...shared, teeth: 50 },
    }).gear;
    expectPrinted(pinion.transverseModule / by, 4.14, 2);
    expectPrinted(pinion.transversePressureAngleDeg, 20.647, 3);
    expectPrinted(pinion.tipDiameter / by, 90.8, 1);
    expectPrinted(wheel.tipDiameter / by, 215, 0);
    expectPrinted(pinion.rootDiameter / by, 72.8, 1);
    expectPrinted(wheel.rootDiameter / by, 197, 0);
    expectPrinted((pinion.axialPitch ?? 0) / by, 48.55, 2);
  });

  it.each([
    { type: 'C', x1: 0.1817, x2: 0.1715, tip1: 82.45, tip2: 118.35, ratio: 1.436 },
    { type: 'A', x1: 0.8532, x2: -0.5, tip1: 88.77, tip2: 112.5, ratio: 1.361 },
  ])('computes the test gears type $type of ISO 14635-1 (from memory; ε recomputed)', (row) => {
    const { x1, x2, tip1, tip2 } = row;
    const pair = mesh({
      pinion: { teeth: 16, module: 4.5, profileShift: x1, tipShortening: (72 - tip1) / 9 + 1 + x1 },
      wheel: { teeth: 24, module: 4.5, profileShift: x2, tipShortening: (108 - tip2) / 9 + 1 + x2 },
      centreDistance: 91.5,
    });
    expectPrinted(pair.gear.pinion.tipDiameter / by, tip1, 6);
    expectPrinted(pair.operatingPressureAngleDeg, 22.44, 2);
    expectPrinted(((pair.centreDistance / by) * 2 * 16) / 40, 73.2, 4);
    expectPrinted(((pair.centreDistance / by) * 2 * 24) / 40, 109.8, 4);
    expectPrinted(pair.zeroBacklashCentreDistance / by, 91.5, 2);
    expectPrinted(pair.contactRatio, row.ratio, 3);
  });

  describe('contact ratio', () => {
    const inch = 25.4;

    it('of 19/37 at diametral pitch 6 (Norton, Machine Design; from memory; second ratio recomputed)', () => {
      const pair = { pinion: { teeth: 19, module: inch / 6 }, wheel: { teeth: 37, module: inch / 6 } };
      const close = mesh(pair);
      expectPrinted(close.centreDistance / by / inch, 4.667, 3);
      expectPrinted(close.pathOfContact / by / inch, 0.798, 3);
      expectPrinted(close.contactRatio, 1.62, 2);
      const apart = mesh({ ...pair, centreDistance: (28 / 6) * inch * 1.02 });
      expectPrinted(apart.operatingPressureAngleDeg, 22.89, 2);
      expectPrinted(apart.contactRatio, 1.102185, 6);
    });

    it('of 30/80, m 12, addendum 10 (Khurmi & Gupta 12.3; inputs seen, answers from memory)', () => {
      const rack = { addendum: 10 / 12 };
      const pair = mesh({
        pinion: { teeth: 30, module: 12, rack },
        wheel: { teeth: 80, module: 12, rack },
      });
      expectPrinted(pair.approachLength / by, 27.3, 1);
      expectPrinted(pair.recessLength / by, 25, 1);
      expectPrinted(pair.pathOfContact / by, 52.3, 1);
      // The book rounds the path before it divides; to more digits the arc is 55.612 (recomputed).
      expectPrinted(pair.pathOfContact / by / Math.cos(ALPHA), 55.612, 3);
    });

    it('operating angle of 16/40, P 2, ¼ in apart (Shigley 13-1; inputs seen, recomputed: it rounds radii)', () => {
      const pair = mesh({
        pinion: { teeth: 16, module: inch / 2 },
        wheel: { teeth: 40, module: inch / 2 },
        centreDistance: 14.25 * inch,
      });
      expectPrinted(pair.operatingPressureAngleDeg, 22.6005, 4);
    });

    it('nears 1.98 as both gears become racks (limit value; from memory, more digits recomputed)', () => {
      const ratio = (teeth: number) =>
        mesh({ pinion: { teeth, module: 1 }, wheel: { teeth, module: 1 } }).contactRatio;
      expectPrinted(ratio(10_000), 1.98, 2);
      // The distance from the limit halves as the teeth double.
      expectPrinted(2 * ratio(10_000) - ratio(5_000), 1.980809, 5);
    });

    it.each([
      [12, 24, 1.5111],
      [17, 17, 1.5148],
      [20, 20, 1.5568],
      [20, 40, 1.6352],
      [25, 50, 1.6832],
      [30, 60, 1.7191],
      [100, 100, 1.8525],
    ])('textbook value of %i/%i is %f (recomputed only)', (z1, z2, ratio) => {
      const pair = mesh({ pinion: { teeth: z1, module: 1 }, wheel: { teeth: z2, module: 1 } });
      expectPrinted(pair.contactRatioIgnoringUndercut, ratio, 4);
    });

    it('is plausible where common practice is known (facts of the trade, no source)', () => {
      const nineTeeth = mesh({ pinion: { teeth: 9, module: 1 }, wheel: { teeth: 40, module: 1 } });
      expectPrinted(nineTeeth.contactRatio, 1.0025, 4);
      for (const [z1, z2] of [
        [18, 36],
        [20, 40],
        [25, 75],
      ] as const) {
        const pair = mesh({ pinion: { teeth: z1, module: 2 }, wheel: { teeth: z2, module: 2 } });
        expect(pair.allowanceAtContactRatioOne).toBeGreaterThan(0.55);
        expect(pair.allowanceAtContactRatioOne).toBeLessThan(0.95);
      }
    });
  });

  it('finds the exact backlash of a larger distance: m 2, 20/40, Δa 0.05 (formula)', () => {
    const pair = mesh({
      pinion: { teeth: 20, module: 2 },
      wheel: { teeth: 40, module: 2 },
      centreDistance: 60.05,
    });
    expectPrinted(pair.circumferentialBacklash / by, 0.036542, 6);
  });
});
