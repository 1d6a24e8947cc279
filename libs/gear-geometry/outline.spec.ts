import { describe, expect, it } from 'vitest';
import { gearGeometry, overPins, spanMeasurement, toothOutline, type GearInput } from './index.js';
import { RackEnvelope, greatest } from './testing/rack-envelope.js';

const gear = (teeth: number, more: Partial<GearInput> = {}): GearInput => ({ teeth, module: 2, ...more });

/** The same gear for the rolling rack; the allowance draws the cutter in. */
function rolled(input: GearInput, allowance = 0): RackEnvelope {
  const drawnIn = allowance / (2 * input.module * Math.tan(Math.PI / 9));
  return new RackEnvelope({
    z: input.teeth,
    m: input.module,
    betaDeg: input.helixAngleDeg ?? 0,
    x: (input.profileShift ?? 0) + drawnIn,
  });
}

describe('a tooth outline', () => {
  it.each<[string, GearInput, number]>([
    ['plain', gear(20), 0],
    ['undercut', gear(10), 0],
    ['helical', gear(8, { helixAngleDeg: 30 }), 0],
    ['shifted', gear(12, { profileShift: 0.5 }), 0],
    ['thinned', gear(30, { thicknessAllowance: { upper: -0.1, lower: -0.3 } }), -0.2],
  ])('is what the rolling rack leaves: %s', (_, input, allowance) => {
    const cut = rolled(input, allowance);
    const flank = toothOutline(input, { pointsPerFlank: 24 }).slice(1, 24);
    for (const { x, y } of flank) {
      const gapAngle = Math.PI / input.teeth - Math.atan2(x, y);
      const radius = Math.hypot(x, y);
      expect(Math.abs(cut.gapAt(radius) - gapAngle) * radius).toBeLessThan(1e-6);
    }
  });

  it.each<GearInput>([
    gear(20),
    gear(10),
    gear(8, { helixAngleDeg: 30 }),
    gear(12, { profileShift: 0.5, tipShortening: 0.1 }),
    gear(30, { thicknessAllowance: { upper: -0.1, lower: -0.1 } }),
    gear(4),
  ])('runs from root circle to tip circle, once round, tooth first on +y: %o', (input) => {
    const figures = gearGeometry(input);
    const points = toothOutline(input, { pointsPerFlank: 20 });
    const radii = points.map(({ x, y }) => Math.hypot(x, y));
    expect(Math.max(...radii)).toBeCloseTo(figures.tipDiameter / 2, 9);
    expect(Math.min(...radii)).toBeCloseTo(figures.rootDiameter / 2, 9);
    expect(points.length % input.teeth).toBe(0);
    // Shoelace area: counter-clockwise, between the root disc and the tip disc.
    const area = points.reduce((sum, { x, y }, i) => {
      const next = points[(i + 1) % points.length] ?? { x: 0, y: 0 };
      return sum + (x * next.y - next.x * y) / 2;
    }, 0);
    expect(area).toBeGreaterThan((Math.PI * figures.rootDiameter ** 2) / 4);
    expect(area).toBeLessThan((Math.PI * figures.tipDiameter ** 2) / 4);
    // Symmetric about +y, with the tip of the first tooth on it.
    const top = points.filter(({ x, y }) => Math.abs(x) < 1e-9 && y > 0);
    expect(top.some(({ y }) => Math.abs(y - figures.tipDiameter / 2) < 1e-9)).toBe(true);
    expect(points.reduce((sum, { x }) => sum + x, 0)).toBeCloseTo(0, 6);
  });
});

describe('the tip', () => {
  it.each([0, 15, 35])(
    'of a gear with helix %i° is as thick as the rolling rack leaves it, square to it',
    (beta) => {
      const input = gear(17, { helixAngleDeg: beta, profileShift: 0.2 });
      const cut = rolled(input);
      const transverse = 2 * cut.tip * (Math.PI / 17 - cut.gapAt(cut.tip));
      // The lead is one for all cylinders: tan of the helix angle grows with the radius.
      const helixAtTip = Math.atan((Math.tan((beta * Math.PI) / 180) * cut.tip) / cut.reference);
      expect(gearGeometry(input).tipThickness).toBeCloseTo(transverse * Math.cos(helixAtTip), 8);
    },
  );
});

describe('span and pins', () => {
  it.each([
    [12, 0.3],
    [20, 0],
    [33, -0.2],
    [60, 0.5],
  ])('span of %i teeth with shift %f is the width between parallel faces over the cut teeth', (teeth, x) => {
    const input = gear(teeth, { profileShift: x });
    const span = spanMeasurement(input);
    const cut = rolled(input);
    // The outer flank of the group furthest from its middle line.
    const half = greatest(
      gearGeometry(input).formDiameter / 2,
      cut.tip * 0.9999,
      (radius) => radius * Math.sin((span.teeth * Math.PI) / teeth - cut.gapAt(radius)),
      60,
    ).value;
    expect(span.nominal).toBeCloseTo(2 * half, 6);
    expect(span.obstacle).toBeNull();
  });

  it('span shrinks by the thickness allowance along the base tangent', () => {
    const span = spanMeasurement(gear(24, { thicknessAllowance: { upper: -0.05, lower: -0.09 } }));
    expect(span.nominal - span.upper).toBeCloseTo(0.05 * Math.cos(Math.PI / 9), 12);
    expect(span.nominal - span.lower).toBeCloseTo(0.09 * Math.cos(Math.PI / 9), 12);
  });

  it('says when a helical gear is too narrow to be spanned', () => {
    const narrow = gear(40, { helixAngleDeg: 30, faceWidth: 5 });
    expect(spanMeasurement(narrow).obstacle).toMatch(/face width.*at least/);
    expect(spanMeasurement({ ...narrow, faceWidth: 40 }).obstacle).toBeNull();
  });

  it.each([
    [20, 0, 3.4],
    [21, 0, 3.4],
    [13, 0.4, 3.6],
    [48, -0.1, 3.4],
  ])('pins in %i teeth with shift %f, pin %f, touch both cut flanks', (teeth, x, pin) => {
    const allowance = -0.08;
    const input = gear(teeth, { profileShift: x, thicknessAllowance: { upper: 0, lower: allowance } });
    const { nominal, lower } = overPins(input, pin);
    for (const [over, cut] of [
      [nominal, rolled(input)],
      [lower, rolled(input, allowance)],
    ] as const) {
      const spread = teeth % 2 === 0 ? 1 : Math.cos(Math.PI / (2 * teeth));
      const centre = (over - pin) / 2 / spread;
      // Distance from the pin's centre, in the middle of a gap, to the flank.
      const nearest = -greatest(
        cut.root + 0.1,
        cut.tip,
        (radius) => {
          const angle = cut.gapAt(radius);
          return -Math.hypot(radius * Math.sin(angle), radius * Math.cos(angle) - centre);
        },
        60,
      ).value;
      expect(nearest).toBeCloseTo(pin / 2, 6);
    }
  });
});
