import { describe, expect, it } from 'vitest';
import { InputError } from '../units/index.js';
import { describeTrain, leastShaftDiameter, searchOptions, trainStrip, type TrainSpec } from './index.js';
import { winchRequest } from './testing/sample-requests.js';

const gear = (teeth: number, faceWidth = 10) => ({ teeth, profileShift: 0, faceWidth });

/** Two stages of m 2, 20/60 and 25/75, a little apart. */
function winch(change: Partial<TrainSpec> = {}): TrainSpec {
  return {
    pressureAngleDeg: 20,
    helixAngleDeg: 0,
    target: { ratio: '9', tolerancePercent: '1' },
    leastContactRatio: 1.2,
    stages: [
      { module: 2, centreDistance: 80.1, pinion: gear(20, 18), wheel: gear(60, 16) },
      { module: 2, centreDistance: 100.1, pinion: gear(25, 22), wheel: gear(75, 20) },
    ],
    ...change,
  };
}

const verdict = (train: TrainSpec, code: string, stage?: number) =>
  describeTrain(train).checks.find((check) => check.code === code && check.stage === stage)?.verdict;

describe('a whole train', () => {
  it('has the figures of its parts', () => {
    const figures = describeTrain(winch());
    expect(figures.ratio).toEqual({ numerator: '9', denominator: '1', value: 9, errorPercent: 0 });
    expect(figures.centreDistanceSum).toBeCloseTo(180.2, 9);
    expect(figures.direction).toBe('same');
    expect(figures.meshes).toHaveLength(2);
    // Tips reach m above the reference circle: 22 mm before the input axis, 77 mm after the output axis.
    expect(figures.box.length).toBeCloseTo(22 + 180.2 + 77, 6);
    expect(figures.box.height).toBeCloseTo(2 * 77, 6);
    expect(figures.box.width).toBeCloseTo(18 + 5 + 22, 6);
    // Steel discs, π/4 d² b · 7,850 kg/m³.
    const disc = (diameter: number, width: number) => ((Math.PI / 4) * diameter ** 2 * width * 7850) / 1e9;
    expect(figures.mass).toBeCloseTo(disc(40, 18) + disc(120, 16) + disc(50, 22) + disc(150, 20), 5);
  });

  it('adds walls and the gap given', () => {
    const envelope = { length: 300, width: 60, height: 165, wall: 4 };
    const { box } = describeTrain(winch({ envelope, gap: 3 }));
    expect(box.width).toBeCloseTo(18 + 3 + 22 + 8, 6);
    expect(box.height).toBeCloseTo(162, 6);
  });

  it('places shafts along the planes and turns them against each other', () => {
    const { shafts } = describeTrain(winch({ inputSpeed: 900 }));
    expect(shafts.map((shaft) => shaft.x)).toEqual(
      [0, 80.1, 180.2].map((x) => expect.closeTo(x, 9) as number),
    );
    expect(shafts.map((shaft) => shaft.direction)).toEqual([1, -1, 1]);
    expect(shafts.map((shaft) => shaft.speed)).toEqual([900, 300, 100]);
    // Planes at 0–18 and 23–45; half a gap of 2.5 mm each side.
    expect(shafts.map((shaft) => [shaft.z1, shaft.z2])).toEqual([
      [-2.5, 20.5],
      [-2.5, 47.5],
      [20.5, 47.5],
    ]);
  });

  it('passes torque on without loss from the input, with 0.98 a mesh from the output', () => {
    const fromInput = describeTrain(winch({ inputTorque: 5, inputSpeed: 900 })).shafts;
    expect(fromInput.map((shaft) => shaft.torque)).toEqual([5, 15, 45]);
    // P = 2π n T/60: 5 N·m at 900 rpm is 471 W on every shaft.
    for (const { power } of fromInput) expect(power).toBeCloseTo(0.4712, 4);
    const fromOutput = describeTrain(winch({ outputTorque: 45 })).shafts.map((shaft) => shaft.torque ?? 0);
    expect(fromOutput[2]).toBe(45);
    expect(fromOutput[1]).toBeCloseTo(45 / 3 / 0.98, 9);
    expect(fromOutput[0]).toBeCloseTo(45 / 9 / 0.98 ** 2, 9);
    expect(describeTrain(winch()).shafts.every((shaft) => shaft.torque === null)).toBe(true);
  });

  it('sizes shafts for torsion, d = (16 T/(π τ))^⅓ (Shigley, shafts in pure torsion; memory)', () => {
    // 45 N·m × 1.25 at 25 MPa: 22.55 mm, so 23.
    expect(leastShaftDiameter(45, 1.25)).toBe(23);
    const exact = (Math.PI * 25 * 20 ** 3) / 16_000;
    expect(leastShaftDiameter(exact, 1)).toBe(20);
    expect(leastShaftDiameter(exact * 1.001, 1)).toBe(21);
    const shafts = describeTrain(winch({ outputTorque: 45, applicationFactor: 1.25 })).shafts;
    expect(shafts[2]?.leastDiameter).toBe(23);
  });

  it('names the stage and the field that have no meaning', () => {
    const stages = winch().stages.map((stage) => ({ ...stage, wheel: gear(2) }));
    try {
      describeTrain(winch({ stages }));
      expect.unreachable();
    } catch (error) {
      expect(error).toBeInstanceOf(InputError);
      expect((error as InputError).errors[0]).toMatchObject({ field: 'stages.0.wheel.teeth', value: 2 });
    }
    expect(() => describeTrain(winch({ stages: [] }))).toThrow(/no stage/);
    expect(() => describeTrain(winch({ inputTorque: 1, outputTorque: 9 }))).toThrow(/Give one/);
  });
});

describe('a train is refused', () => {
  it.each<[string, Partial<TrainSpec>]>([
    ['inputSpeed', { inputSpeed: NaN }],
    ['inputSpeed', { inputSpeed: -1 }],
    ['inputTorque', { inputTorque: Infinity }],
    ['outputTorque', { outputTorque: 1e308 }],
    ['applicationFactor', { applicationFactor: 0 }],
    ['gap', { gap: NaN }],
    ['envelope.wall', { envelope: { wall: NaN } }],
    ['leastContactRatio', { leastContactRatio: NaN }],
    ['target.ratio', { target: { ratio: 'four', tolerancePercent: 1 } }],
    ['target.tolerancePercent', { target: { ratio: '4', tolerancePercent: NaN } }],
  ])('for %s in %o', (field, change) => {
    let fields: string[] = [];
    try {
      describeTrain(winch(change));
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      fields = error.errors.map((issue) => issue.field);
    }
    expect(fields).toEqual([field]);
  });
});

describe('checks of a train', () => {
  it('passes a sound train and says every requirement in a sentence', () => {
    const { checks } = describeTrain(winch({ envelope: { length: 400, width: 90, height: 200, wall: 3 } }));
    expect(checks.filter(({ verdict: found }) => found !== 'passes')).toEqual([]);
    const codes = new Set(checks.map(({ code }) => code));
    for (const code of ['ratio', 'contact-ratio', 'interference', 'backlash', 'envelope-length']) {
      expect(codes).toContain(code);
    }
    for (const { message } of checks) expect(message).toMatch(/^\p{Lu}.*\.$/u);
  });

  it('tells passing, marginal and failing apart', () => {
    const target = (ratio: string, tolerancePercent: string) =>
      winch({ target: { ratio, tolerancePercent } });
    expect(verdict(target('9.08', '1'), 'ratio')).toBe('passes');
    expect(verdict(target('9.089', '1'), 'ratio')).toBe('marginal');
    expect(verdict(target('9.1', '1'), 'ratio')).toBe('fails');
    expect(verdict(target('9', '0'), 'ratio')).toBe('passes');
    const box = (length: number) => winch({ envelope: { length, width: 90, height: 200, wall: 0 } });
    expect(verdict(box(279.2), 'envelope-length')).toBe('marginal');
    expect(verdict(box(279.1), 'envelope-length')).toBe('fails');
    // 20/60 at 20° has ε about 1.67, a little less when 0.05 m apart.
    expect(verdict(winch({ leastContactRatio: 1.6 }), 'contact-ratio', 0)).toBe('marginal');
    expect(verdict(winch({ leastContactRatio: 1.8 }), 'contact-ratio', 0)).toBe('fails');
  });

  it('finds a train without backlash marginal and a jammed one failing', () => {
    const [first, second] = winch().stages as [TrainSpec['stages'][0], TrainSpec['stages'][0]];
    const at = (centreDistance: number) => winch({ stages: [{ ...first, centreDistance }, second] });
    expect(verdict(at(80), 'backlash', 0)).toBe('marginal');
    expect(verdict(at(79.9), 'backlash', 0)).toBe('fails');
    expect(verdict(at(79.9), 'backlash', 1)).toBe('passes');
  });

  it('notes undercut and fails interference (17 teeth, the common limit against a rack)', () => {
    const [first, second] = winch().stages as [TrainSpec['stages'][0], TrainSpec['stages'][0]];
    const small = { ...first, centreDistance: 70, pinion: gear(10) };
    expect(verdict(winch({ stages: [small, second] }), 'undercut-pinion', 0)).toBe('marginal');
    expect(verdict(winch(), 'undercut-pinion', 0)).toBe('passes');
    const close = { ...first, centreDistance: 77 };
    expect(verdict(winch({ stages: [close, second] }), 'interference', 0)).toBe('fails');
  });
});

describe('an option described as a train', () => {
  it('keeps its figures', () => {
    const request = winchRequest({
      centreDistanceAllowance: 0.1,
      helixAngleDeg: 12,
      shiftPolicy: 'clear-undercut',
      objective: 'mass',
      envelope: { length: 150, width: 80, height: 90, wall: 4 },
    });
    const { options } = searchOptions(request);
    expect(options.length).toBe(50);
    for (const option of options) {
      const figures = describeTrain({
        pressureAngleDeg: 20,
        helixAngleDeg: 12,
        target: { ratio: '37.5', tolerancePercent: '1' },
        leastContactRatio: 1.2,
        envelope: { length: 150, width: 80, height: 90, wall: 4 },
        stages: option.stages.map((stage) => ({
          module: stage.module,
          centreDistance: stage.centreDistance,
          pinion: {
            teeth: stage.pinionTeeth,
            profileShift: stage.pinionShift,
            faceWidth: stage.faceWidth,
            hand: 'left',
          },
          wheel: {
            teeth: stage.wheelTeeth,
            profileShift: stage.wheelShift,
            faceWidth: stage.faceWidth,
            hand: 'right',
          },
        })),
      });
      expect(figures.ratio).toEqual(option.ratio);
      expect(figures.box).toEqual(option.box);
      expect(figures.mass).toBe(option.mass);
      expect(figures.centreDistanceSum).toBe(option.centreDistanceSum);
      expect(figures.backlashArcmin).toBeCloseTo(option.backlashArcmin, 9);
      expect(figures.checks.filter((check) => check.verdict === 'fails')).toEqual([]);
    }
  });
});

describe('the train strip', () => {
  it('shows the train to scale with touching pitch circles, for a train and its option alike', () => {
    const strip = trainStrip(winch());
    expect(strip.axes.map(({ x }) => x)).toEqual([0, 80.1, 180.2].map((x) => expect.closeTo(x, 9) as number));
    expect(strip.gears.map(({ tipRadius }) => tipRadius)).toEqual([22, 62, 27, 77]);
    expect((strip.gears[0]?.pitchRadius ?? 0) + (strip.gears[1]?.pitchRadius ?? 0)).toBeCloseTo(80.1, 9);
    expect(strip.bounds).toEqual({ x: -22, y: -77, width: expect.closeTo(279.2, 9) as number, height: 154 });
    expect(strip.inputArrow).toMatchObject({ x: 0, y: 0 });

    const option = searchOptions(winchRequest({ limit: 1, centreDistanceAllowance: 0.1 })).options[0];
    if (!option) return expect.unreachable();
    const ofOption = trainStrip(option);
    expect(ofOption.bounds.width).toBeCloseTo(option.box.length, 5);
    expect(ofOption.bounds.height).toBeCloseTo(option.box.height, 5);
    const spec = winch({
      stages: option.stages.map((stage) => ({
        module: stage.module,
        centreDistance: stage.centreDistance,
        pinion: gear(stage.pinionTeeth),
        wheel: gear(stage.wheelTeeth),
      })),
    });
    expect(trainStrip(spec)).toEqual(ofOption);
  });
});
