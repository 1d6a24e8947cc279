import { describe, expect, it } from 'vitest';
import { describeTrain, searchOptions, type OptionRequest, type TrainSpec } from './index.js';

function request(target: string, tolerancePercent: string, change: Partial<OptionRequest>): OptionRequest {
  return {
    ratio: { target, tolerancePercent },
    stages: { min: 2, max: 2 },
    teeth: { pinion: { min: 12, max: 60 }, wheel: { min: 12, max: 60 } },
    modules: [1],
    objective: 'ratio-error',
    limit: 500,
    ...change,
  };
}

function train(stages: [pinion: number, wheel: number][], change: Partial<TrainSpec> = {}): TrainSpec {
  const gear = (teeth: number) => ({ teeth, profileShift: 0, faceWidth: 20 });
  return {
    pressureAngleDeg: 20,
    helixAngleDeg: 0,
    leastContactRatio: 1.2,
    stages: stages.map(([z1, z2]) => ({
      module: 2,
      centreDistance: z1 + z2,
      pinion: gear(z1),
      wheel: gear(z2),
    })),
    ...change,
  };
}

describe('published trains', () => {
  // Gear train design problem of the optimisation literature; seen.
  it('solves 1/6.931 with teeth 12–60 exactly, and its next two', () => {
    const { options, search } = searchOptions(request('6.931', '1', { leastContactRatio: 0 }));
    expect(search.complete).toBe(true);
    const squared = options.map(
      ({ ratio }) => (1 / 6.931 - Number(ratio.denominator) / Number(ratio.numerator)) ** 2,
    );
    const distinct = squared.filter((value, index) => index === 0 || value !== squared[index - 1]);
    expect(distinct[0]).toBeCloseTo(2.70085715e-12, 20);
    expect(distinct[1]).toBeCloseTo(2.30782e-11, 16);
    expect(distinct[2]).toBeCloseTo(9.93988e-11, 16);
    const keysOf = (rank: number) =>
      options.filter((_option, index) => squared[index] === distinct[rank]).map((option) => option.key);
    expect(keysOf(0).sort()).toEqual(['16/43m1+19/49m1', '16/49m1+19/43m1'].sort());
    expect(keysOf(1)).toContain('13/53m1+20/34m1');
    expect(keysOf(2)).toContain('13/57m1+31/49m1');
  });

  // Bevan, Theory of Machines, ch. 11; seen.
  it('finds change wheels 65, 25, 75, 30 for 26 : 4', () => {
    const teeth = { pinion: { min: 20, max: 32 }, wheel: { min: 60, max: 80 } };
    const { options } = searchOptions(request('6.5', '0', { teeth }));
    expect(options.map((option) => option.key)).toContain('25/65m1+30/75m1');
    expect(options.every((option) => option.ratio.errorPercent === 0)).toBe(true);
  });

  // Bevan, Theory of Machines, ch. 11 (7 in, diametral pitches 7 and 5); seen.
  it('gives 8.9074 for the reverted train 74/24 · 52/18', () => {
    expect(
      describeTrain(
        train([
          [24, 74],
          [18, 52],
        ]),
      ).ratio.value,
    ).toBeCloseTo(8.9074, 4);
  });

  // Khurmi & Gupta, Theory of Machines 13.1; seen.
  it('slows 975 rpm through 20/50 · 25/75 · 26/65 to 52 rpm', () => {
    const { shafts, direction } = describeTrain(
      train(
        [
          [20, 50],
          [25, 75],
          [26, 65],
        ],
        { inputSpeed: 975 },
      ),
    );
    expect(shafts.map((shaft) => shaft.speed)).toEqual([975, 390, 130, 52]);
    expect(direction).toBe('opposite');
  });

  // Shigley, Mechanical Engineering Design, 13-5; memory.
  it('has the exact 30 : 1 with equal tooth sums among its options', () => {
    const teeth = { pinion: { min: 16, max: 24 }, wheel: { min: 90, max: 110 } };
    const { options } = searchOptions(request('30', '0', { teeth }));
    const sums = (key: string) => key.match(/\d+\/\d+/g)?.map((pair) => pair.split('/').map(Number));
    const reverted = options.filter(({ key }) => {
      const [first, second] = sums(key) ?? [];
      return (first?.[0] ?? 0) + (first?.[1] ?? 0) === (second?.[0] ?? 0) + (second?.[1] ?? 0);
    });
    expect(reverted.map((option) => option.key)).toContain('18/108m1+21/105m1');
  });

  // N. B. Hui, machine design course notes: one stage up to about 6, two to 35, three to 200; seen.
  it('reaches about 6, 35 and 200 with one, two and three stages of common size', () => {
    const common = { teeth: { pinion: { min: 17, max: 40 }, wheel: { min: 17, max: 105 } } };
    const counts = (target: string) =>
      [1, 2, 3].map((stages) => {
        const outcome = searchOptions(
          request(target, '1', { ...common, stages: { min: stages, max: stages }, limit: 1 }),
        );
        return outcome.options.length;
      });
    expect(counts('6')).toEqual([1, 1, 1]);
    expect(counts('35')).toEqual([0, 1, 1]);
    expect(counts('200')).toEqual([0, 0, 1]);
    expect(counts('300')).toEqual([0, 0, 0]);
  });

  // Exact j_t = 2 a' (inv α_w' − inv α): m 2, 20/40, Δa 0.05 → 0.036542 mm; formula.
  it('carries the backlash of every mesh to the output', () => {
    const wide = train([[20, 40]]);
    for (const stage of wide.stages) stage.centreDistance += 0.05;
    const one = describeTrain(wide);
    expect(one.meshes[0]?.circumferentialBacklash).toBeCloseTo(0.036542, 6);
    const atWheel = ((0.036542 / ((60.05 * 2) / 3)) * 10800) / Math.PI;
    expect(one.backlashArcmin).toBeCloseTo(atWheel, 3);
    const two = describeTrain({ ...wide, stages: [...wide.stages, ...wide.stages] });
    expect(two.backlashArcmin).toBeCloseTo(atWheel * 1.5, 3);
  });
});
