import { describe, expect, it } from 'vitest';
import { meshGeometry, shiftForPolicy } from '../gear-geometry/index.js';
import { ratio, withinTolerance } from '../units/index.js';
import { searchOptions, type OptionRequest, type SearchProgress, type TrainOption } from './index.js';
import { winchRequest } from './testing/sample-requests.js';

const keys = (options: TrainOption[]) => options.map((option) => option.key);

describe('every option, recomputed by the geometry library', () => {
  const requests: Record<string, OptionRequest> = {
    plain: winchRequest(),
    'undercut refused, helical, with an allowance': winchRequest({
      undercut: 'refuse',
      helixAngleDeg: 15,
      centreDistanceAllowance: 0.08,
      modules: [2.5, 1.25],
      objective: 'mass',
    }),
    'shifted free of undercut, in a box': winchRequest({
      shiftPolicy: 'clear-undercut',
      teeth: { pinion: { min: 8, max: 30 }, wheel: { min: 20, max: 110 } },
      leastContactRatio: 1.15,
      centreDistanceAllowance: 0.05,
      stageRatio: { min: '1.5', max: '7' },
      envelope: { length: 160, width: 70, height: 95, wall: 4 },
      objective: 'ratio-error',
    }),
    'high pressure angle, output as the input': winchRequest({
      pressureAngleDeg: 25,
      direction: 'same',
      undercut: 'refuse',
    }),
  };

  it.each(Object.entries(requests))('meets every limit: %s', (_name, request) => {
    const { options, search } = searchOptions(request);
    expect(search.complete).toBe(true);
    expect(options.length).toBe(50);
    for (const option of options) expectWithinLimits(option, request);
  });
});

describe('equal sums', () => {
  // Helical distances are m·Σz/(2 cos β): no whole nm each, but the same for the same number of teeth in all.
  it('tie, however the teeth are split between the stages, and fall to the ratio error', () => {
    const helical = winchRequest({
      stages: { min: 2, max: 2 },
      helixAngleDeg: 17,
      modules: [1.25],
      limit: 200,
    });
    const { options } = searchOptions(helical);
    const cosBeta = Math.cos((17 * Math.PI) / 180);
    const teethOf = ({ stages }: TrainOption) =>
      stages.reduce((sum, { pinionTeeth, wheelTeeth }) => sum + pinionTeeth + wheelTeeth, 0);
    const errorOf = (option: TrainOption | undefined) => Math.abs(option?.ratio.errorPercent ?? NaN);
    let ties = 0;
    options.forEach((option, place) => {
      const exact = (1.25 * teethOf(option)) / (2 * cosBeta);
      expect(Math.abs(option.centreDistanceSum - exact)).toBeLessThan(0.51e-6);
      const before = options[place - 1];
      if (!before || teethOf(before) !== teethOf(option)) return;
      ties++;
      expect(before.centreDistanceSum).toBe(option.centreDistanceSum);
      expect(errorOf(before)).toBeLessThanOrEqual(errorOf(option) + 1e-12);
    });
    expect(ties).toBeGreaterThan(50);
  });
});

function expectWithinLimits(option: TrainOption, request: OptionRequest): void {
  const { teeth, stageRatio, envelope } = request;
  const module = Math.min(...request.modules);
  const angles = {
    pressureAngleDeg: request.pressureAngleDeg ?? 20,
    helixAngleDeg: request.helixAngleDeg ?? 0,
  };
  let [n, d, sum, backlash] = [1n, 1n, 0, 0];
  for (const stage of option.stages) {
    const { pinionTeeth: z1, wheelTeeth: z2 } = stage;
    n *= BigInt(z2);
    d *= BigInt(z1);
    expect(stage.module).toBe(module);
    expect(z1 >= teeth.pinion.min && z1 <= teeth.pinion.max).toBe(true);
    expect(z2 >= teeth.wheel.min && z2 <= teeth.wheel.max).toBe(true);
    expect(z2 / z1).toBeGreaterThanOrEqual(Number(stageRatio?.min ?? 1));
    expect(z2 / z1).toBeLessThanOrEqual(Number(stageRatio?.max ?? Infinity));
    const pinion = { teeth: z1, module, faceWidth: stage.faceWidth, ...angles };
    const wheel = { ...pinion, teeth: z2 };
    const policy = request.shiftPolicy ?? 'none';
    const { pinionShift, wheelShift } = shiftForPolicy({ pinion, wheel, policy });
    expect([stage.pinionShift, stage.wheelShift]).toEqual([pinionShift, wheelShift]);
    const mesh = meshGeometry({
      pinion: { ...pinion, profileShift: pinionShift },
      wheel: { ...wheel, profileShift: wheelShift },
      allowance: request.centreDistanceAllowance ?? 0,
      leastContactRatio: request.leastContactRatio ?? 1.2,
    });
    expect(mesh.findings.filter(({ severity }) => severity === 'fail')).toEqual([]);
    expect(stage.contactRatio).toBeCloseTo(mesh.contactRatio, 12);
    expect(stage.contactRatio).toBeGreaterThanOrEqual(request.leastContactRatio ?? 1.2);
    expect(stage.centreDistance).toBeCloseTo(mesh.centreDistance, 9);
    if (request.undercut === 'refuse') {
      expect([mesh.gear.pinion.undercut, mesh.gear.wheel.undercut]).toEqual([false, false]);
    }
    sum += mesh.centreDistance;
    backlash = backlash / mesh.ratio + mesh.angularBacklashArcmin;
  }
  expect(option.ratio).toMatchObject({
    numerator: ratio(n, d).numerator.toString(),
    denominator: ratio(n, d).denominator.toString(),
  });
  expect(withinTolerance(ratio(n, d), request.ratio.target, request.ratio.tolerancePercent)).toBe(true);
  expect(option.centreDistanceSum).toBeCloseTo(sum, 5);
  expect(option.backlashArcmin).toBeCloseTo(backlash, 6);
  if (request.direction === 'same') expect(option.stages.length % 2).toBe(0);
  if (envelope) {
    expect(option.box.length).toBeLessThanOrEqual(envelope.length ?? Infinity);
    expect(option.box.width).toBeLessThanOrEqual(envelope.width ?? Infinity);
    expect(option.box.height).toBeLessThanOrEqual(envelope.height ?? Infinity);
  }
  expect(option).toMatchObject({ lossPercent: null, cost: null, newParts: null });
}

describe('the winch', () => {
  it('lists options best first and settles its thousands of millions of trains', () => {
    const { options, search } = searchOptions(winchRequest());
    const sums = options.map((option) => option.centreDistanceSum);
    expect(sums).toEqual([...sums].sort((a, b) => a - b));
    expect(search.combinations).toBeGreaterThan(1e9);
    expect(new Set(keys(options)).size).toBe(50);
  });

  it('stands stages in the declared order where orders are one option, and lists orders where they are not', () => {
    const [merged] = searchOptions(winchRequest({ limit: 1 })).options;
    const ratios = merged?.stages.map((stage) => stage.wheelTeeth / stage.pinionTeeth) ?? [];
    expect(ratios).toEqual([...ratios].sort((a, b) => b - a));
    const byMass = searchOptions(winchRequest({ limit: 6, objective: 'mass' })).options;
    expect(new Set(byMass.map((option) => [...option.key.split('+')].sort().join())).size).toBe(1);
  });

  it('does not depend on the order of the module list', () => {
    const strip = (request: OptionRequest) => ({ ...searchOptions(request), search: null });
    const one = strip(winchRequest({ modules: [1.5, 1, 2.25], objective: 'mass' }));
    expect(strip(winchRequest({ modules: [2.25, 1.5, 1], objective: 'mass' }))).toEqual(one);
    expect(one.options[0]?.stages[0]?.module).toBe(1);
  });

  it.each<[string, Partial<OptionRequest>, Partial<OptionRequest>]>([
    ['contact ratio', { leastContactRatio: 1.5 }, { leastContactRatio: 1.3 }],
    ['tolerance', { ratio: { target: '37.5', tolerancePercent: '0.1' } }, {}],
    ['wheel', { teeth: { pinion: { min: 12, max: 40 }, wheel: { min: 12, max: 44 } } }, {}],
    ['pinion', { teeth: { pinion: { min: 17, max: 40 }, wheel: { min: 12, max: 150 } } }, {}],
    ['undercut', { undercut: 'refuse' }, { undercut: 'allow' }],
    ['stage ratio', { stageRatio: { max: 3.4 } }, { stageRatio: { max: 5 } }],
    ['length', { envelope: { length: 103 } }, { envelope: { length: 120 } }],
    ['height', { envelope: { height: 44 } }, { envelope: { height: 60 } }],
  ])('is never worse with a looser limit: %s', (_name, tight, loose) => {
    for (const objective of ['centre-distance', 'mass'] as const) {
      const best = (change: Partial<OptionRequest>) =>
        searchOptions(winchRequest({ ...change, objective, limit: 1 })).options[0];
      const [strict, free] = [best(tight), best(loose)];
      expect(strict).toBeDefined();
      const figure = objective === 'mass' ? 'mass' : 'centreDistanceSum';
      expect(free?.[figure]).toBeLessThanOrEqual(strict?.[figure] ?? 0);
    }
  });
});

describe('watching a search', () => {
  const wide = winchRequest({
    teeth: { pinion: { min: 12, max: 90 }, wheel: { min: 12, max: 300 } },
    stages: { min: 2, max: 3 },
    objective: 'ratio-error',
  });

  it('reports progress and stops when asked, with the best so far', () => {
    const reports: SearchProgress[] = [];
    let asked = 0;
    const outcome = searchOptions(wide, {
      onProgress: (progress) => reports.push(progress),
      shouldStop: () => reports.at(-1)?.phase === 'search' && ++asked > 300,
    });
    expect(outcome.search.complete).toBe(false);
    expect(asked).toBe(301);
    expect(outcome.options.length).toBeGreaterThan(0);
    expect(outcome.whyNot).toEqual([]);
    const phases = new Set(reports.map(({ phase }) => phase));
    expect(phases).toContain('search');
    for (const { settled, total } of reports) expect(settled).toBeLessThanOrEqual(total);
  });

  it('ends at its time limit', () => {
    let clock = 0;
    const outcome = searchOptions(wide, { timeLimitMs: 100, now: () => clock++ });
    expect(outcome.search.complete).toBe(false);
    expect(outcome.search.elapsedMs).toBeLessThan(200);
  });

  it('stops before the first pair is made', () => {
    const outcome = searchOptions(wide, { shouldStop: () => true });
    expect(outcome).toMatchObject({ options: [], search: { complete: false }, whyNot: [] });
  });
});

describe('best of each stage count', () => {
  it.each(['centre-distance', 'ratio-error', 'mass'] as const)(
    'by %s is what each count gives alone',
    (objective) => {
      const request = winchRequest({ objective, limit: 12 });
      const alone = [2, 3].map((count) =>
        keys(searchOptions({ ...request, stages: { min: count, max: count } }).options),
      );
      const together = searchOptions({
        ...request,
        stages: { min: 2, max: 3 },
        bestOf: 'each-count',
      }).options;
      const ofCount = (count: number) => keys(together.filter(({ stages }) => stages.length === count));
      expect([ofCount(2), ofCount(3)]).toEqual(alone);
      const overall = keys(searchOptions({ ...request, stages: { min: 2, max: 3 } }).options);
      expect(keys(together).slice(0, 12)).toEqual(overall);
    },
  );
});
