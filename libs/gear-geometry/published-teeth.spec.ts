import { describe, expect, it } from 'vitest';
import {
  BASIC_RACKS,
  STANDARD_MODULES,
  gearGeometry,
  meshGeometry,
  overPins,
  spanMeasurement,
  type GearInput,
} from './index.js';
import { SCALES, scaledGear } from './testing/scaled.js';

/** The sharp-cornered rack that textbooks use for undercut and interference. */
const SHARP = { addendum: 1, dedendum: 1, tipRadius: 0 };

function expectPrinted(found: number, printed: number, decimals: number): void {
  expect(Math.abs(found - printed)).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9));
}

/** Teeth (not whole) at which the least shift is zero; it falls in a straight line with the teeth. */
function teethWithoutUndercut(pressureAngleDeg: number, depth = 1): number {
  const rack = { addendum: depth, dedendum: depth, tipRadius: 0 };
  const least = (teeth: number) =>
    gearGeometry({ teeth, module: 1, pressureAngleDeg, rack }).leastShiftWithoutUndercut;
  return 10 + (10 * least(10)) / (least(10) - least(20));
}

/** Whether the wheel's tip stays short of the pinion's base tangent point T1. */
function tipShortOfT1(pinionTeeth: number, wheelTeeth: number): boolean {
  const pair = meshGeometry({
    pinion: { teeth: pinionTeeth, module: 1, rack: SHARP },
    wheel: { teeth: wheelTeeth, module: 1, rack: SHARP },
  });
  const { tipDiameter, baseDiameter } = pair.gear.wheel;
  return Math.sqrt(tipDiameter ** 2 - baseDiameter ** 2) / 2 <= pair.tangentPointDistance;
}

describe('undercut and interference', () => {
  // Shigley, Norton and Mott give the same table; from memory.
  it.each([
    [13, 16],
    [14, 26],
    [15, 45],
    [16, 101],
    [17, 1309],
  ])('a 20° pinion of %i teeth takes a wheel of up to %i', (pinion, largestWheel) => {
    expect(tipShortOfT1(pinion, largestWheel)).toBe(true);
    expect(tipShortOfT1(pinion, largestWheel + 1)).toBe(false);
  });

  it('12 teeth take no equal wheel, 18 any wheel (same sources)', () => {
    expect(tipShortOfT1(12, 12)).toBe(false);
    expect(tipShortOfT1(18, 10_000)).toBe(true);
  });

  it('a 3 : 1 pair needs 15 teeth (Bevan; seen), 4 : 1 needs 16 (Shigley; from memory)', () => {
    expect([tipShortOfT1(14, 42), tipShortOfT1(15, 45)]).toEqual([false, true]);
    expect([tipShortOfT1(15, 60), tipShortOfT1(16, 64)]).toEqual([false, true]);
  });

  // Elements of Metric Gear Technology: whole teeth; seen for 14.5° and 20°; decimals recomputed.
  it.each([
    { angle: 20, whole: 18, exact: 17.0973, decimals: 4 },
    { angle: 14.5, whole: 32, exact: 31.903, decimals: 3 },
    { angle: 25, whole: 12, exact: 11.198, decimals: 3 },
  ])('against a rack at $angle° takes $whole teeth', ({ angle, whole, exact, decimals }) => {
    expect(Math.ceil(teethWithoutUndercut(angle))).toBe(whole);
    expectPrinted(teethWithoutUndercut(angle), exact, decimals);
  });

  it('of stub teeth at 20° takes 14 (Elements of Metric Gear Technology; seen)', () => {
    expect(Math.ceil(teethWithoutUndercut(20, 0.8))).toBe(14);
  });

  it.each([
    [8, 0.5321],
    [10, 0.4151],
    [12, 0.2981],
    [14, 0.1812],
    [16, 0.0642],
    [17, 0.0057],
  ])('least shift of %i teeth is %f (formula, sharp rack)', (teeth, shift) => {
    const { leastShiftWithoutUndercut } = gearGeometry({ teeth, module: 1, rack: SHARP });
    expectPrinted(leastShiftWithoutUndercut, shift, 4);
  });
});

describe('tips (recomputed from the formula)', () => {
  it.each([
    [12, 0, 0.6209],
    [12, 0.3, 0.4357],
    [12, 0.6, 0.2018],
    [17, 0, 0.6741],
    [20, 0, 0.6949],
  ])('of %i teeth with shift %f are %f m thick', (teeth, profileShift, thickness) => {
    for (const by of SCALES) {
      const { tipThickness } = gearGeometry({ teeth, module: by, profileShift });
      expectPrinted(tipThickness / by, thickness, 4);
    }
  });

  it.each([
    [8, 0.566],
    [10, 0.7],
    [12, 0.82],
    [17, 1.083],
    [20, 1.222],
  ])('of %i teeth are pointed from shift %f', (teeth, profileShift) => {
    const at = (x: number) => () => gearGeometry({ teeth, module: 1, profileShift: x });
    expect(at(profileShift - 0.0005)).not.toThrow();
    expect(at(profileShift + 0.0005)).toThrow(/pointed/);
  });
});

describe.each(SCALES)('thickness, span and pins, every length times %f', (by) => {
  const scaled = (input: GearInput) => scaledGear(input, by);

  it('span of m 3, z 24, x 0.4 is 32.8266 over 4 teeth (from memory)', () => {
    const span = spanMeasurement(scaled({ teeth: 24, module: 3, profileShift: 0.4 }));
    expect(span.teeth).toBe(4);
    expectPrinted(span.nominal / by, 32.8266, 4);
    expect(span.obstacle).toBeNull();
  });

  it.each([
    [10, 2, 4.5683],
    [17, 2, 4.6663],
    [20, 3, 7.6604],
    [25, 3, 7.7305],
    [30, 4, 10.7526],
    [50, 6, 16.937],
    [100, 12, 35.3501],
  ])('span of %i teeth, m 1, is over %i teeth and %f long (recomputed)', (teeth, count, length) => {
    const figures = gearGeometry(scaled({ teeth, module: 1 }));
    expect(figures.spanTeeth).toBe(count);
    expectPrinted(figures.spanLength / by, length, 4);
  });

  it('rounds the exact halves of 20° one way: 18, 27, 36 teeth span 2, 3, 4 (k + ½ is exactly z/9 + ½)', () => {
    const counts = [18, 27, 36].map((teeth) => gearGeometry(scaled({ teeth, module: 1 })).spanTeeth);
    expect(counts).toEqual([2, 3, 4]);
  });

  it('over pins of 1.7, m 1, z 20 is 22.2941, angle 24.1350° (from memory)', () => {
    const pins = overPins(scaled({ teeth: 20, module: 1 }), 1.7 * by);
    expectPrinted(pins.pressureAngleAtPinDeg, 24.135, 4);
    expectPrinted(pins.nominal / by, 22.2941, 4);
  });

  it('chord of m 10, z 12, x 0.3 is 17.8256 at 13.6657 (Elements of Metric Gear Technology; seen)', () => {
    const figures = gearGeometry(scaled({ teeth: 12, module: 10, profileShift: 0.3 }));
    expectPrinted((figures.tipDiameter - figures.referenceDiameter) / 2 / by, 13, 4);
    expectPrinted(figures.toothThickness / by, 17.8918, 4);
    expectPrinted(figures.chordalThickness / by, 17.8256, 4);
    expectPrinted(figures.chordalHeight / by, 13.6657, 4);
  });
});

describe('standards', () => {
  it('racks clear by 0.25, 0.25, 0.25, 0.40 and round by 0.38, 0.30, 0.25, 0.39 (ISO 53; from memory)', () => {
    const racks = Object.values(BASIC_RACKS);
    expect(racks.map((rack) => rack.dedendum)).toEqual([1.25, 1.25, 1.25, 1.4]);
    expect(racks.map((rack) => Number((rack.dedendum - rack.addendum).toFixed(2)))).toEqual([
      0.25, 0.25, 0.25, 0.4,
    ]);
    expect(racks.map((rack) => rack.tipRadius)).toEqual([0.38, 0.3, 0.25, 0.39]);
    for (const rack of racks) expect(() => gearGeometry({ teeth: 20, module: 2, rack })).not.toThrow();
  });

  it('modules are the eighteen and eighteen of ISO 54 (from memory)', () => {
    const text = (series: readonly number[]) => series.join(' ');
    expect(text(STANDARD_MODULES.I)).toBe('1 1.25 1.5 2 2.5 3 4 5 6 8 10 12 16 20 25 32 40 50');
    expect(text(STANDARD_MODULES.II)).toBe(
      '1.125 1.375 1.75 2.25 2.75 3.5 4.5 5.5 6.5 7 9 11 14 18 22 28 36 45',
    );
  });
});
