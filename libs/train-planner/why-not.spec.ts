import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { searchOptions, type OptionRequest, type WhyNot } from './index.js';
import { exhaustiveSearch } from './testing/exhaustive-search.js';
import { winchRequest } from './testing/sample-requests.js';

const reasons = (change: Partial<OptionRequest>) => searchOptions(winchRequest(change)).whyNot;
const messages = (change: Partial<OptionRequest>) => reasons(change).map(({ message }) => message);

describe('why not', () => {
  it('names the least wheel of a single stage', () => {
    // 12 teeth and 37.125 : 1 need 445.5, so 446.
    expect(messages({ stages: { min: 1, max: 1 } })).toContain(
      'One stage needs a wheel of at least 446 teeth; the brief allows 150.',
    );
  });

  it('names what each limit would have to be', () => {
    const two = { min: 2, max: 2 };
    expect(messages({ stages: two, envelope: { length: 90, width: 60, height: 90 } })[0]).toMatch(
      /Two stages need a length/,
    );
    expect(messages({ stages: two, envelope: { length: 400, width: 20, height: 300 } })).toEqual([
      'Two stages need a width of at least 25.00 mm; the box allows 20 mm.',
    ]);
    expect(messages({ stages: two, direction: 'opposite' })).toEqual([
      'Two stages turn the output the same way as the input; the brief asks for the opposite.',
    ]);
    expect(messages({ stages: two, stageRatio: { max: '5' } })).toContainEqual(
      expect.stringMatching(/^Two stages need a stage ratio of at least 6\.\d+; the brief allows 5\.$/),
    );
    expect(messages({ stages: two, leastContactRatio: 1.9 })).toContainEqual(
      expect.stringMatching(
        /^Two stages reach a contact ratio of 1\.\d{3} at most; the brief asks for 1\.9\.$/,
      ),
    );
    const small = { pinion: { min: 12, max: 16 }, wheel: { min: 60, max: 120 } };
    expect(messages({ stages: two, teeth: small, undercut: 'refuse' })).toContain(
      'Two stages need undercut teeth; the brief refuses undercut.',
    );
  });

  it('names the limits that must give together, each with its least figure', () => {
    // By hand: 17 teeth and 37.125 : 1 need 631.1, so 632; r_a 9.5 and 317; a 324.5 + 0.02; length 9.5 + 324.52 + 317
    // and height 2 · 317, each with two walls of 6 mm.
    const request = winchRequest({
      ratio: { target: '37.5', tolerancePercent: 1 },
      stages: { min: 1, max: 1 },
      teeth: { pinion: { min: 17, max: 40 }, wheel: { min: 17, max: 120 } },
      modules: [1],
      centreDistanceAllowance: 0.02,
      envelope: { length: 220, width: 90, height: 140, wall: 6 },
    });
    const [reason, ...others] = searchOptions(request).whyNot;
    expect(others).toEqual([]);
    expect(reason?.message).toBe(
      'One stage needs a wheel of at least 632 teeth; the brief allows 120. That also takes a length of at least ' +
        '663.02 mm; the box allows 220 mm, and a height of at least 646.00 mm; the box allows 140 mm.',
    );
    const again = { ...request, ...reason?.relaxed };
    expect(searchOptions(again).options[0]?.key).toBe('17/632m1');
    expect(searchOptions(withLimit(again, 'envelope.length', 663.01)).options).toEqual([]);
    expect(searchOptions(withLimit(again, 'envelope.height', 645.99)).options).toEqual([]);
    expect(searchOptions(withLimit(again, 'teeth.wheel.max', 631)).options).toEqual([]);
  });

  it('names every side of a box that is too small in all of them', () => {
    const request = winchRequest({
      stages: { min: 2, max: 2 },
      envelope: { length: 3, width: 3, height: 3, wall: 1 },
    });
    const [reason, ...others] = searchOptions(request).whyNot;
    expect(others).toEqual([]);
    // Two planes of 10 mm, 5 mm between them and two walls of 1 mm.
    expect(reason).toMatchObject({ stages: 2, limit: 'envelope.width', nearest: 27 });
    expect(reason?.message).toMatch(
      /^Two stages need a width of at least 27\.00 mm; .*, and a length of at least .*, and a height of at least /,
    );
    const again = { ...request, ...reason?.relaxed };
    expect(searchOptions(again).options.length).toBeGreaterThan(0);
    for (const side of ['length', 'width', 'height'] as const) {
      const less = withLimit(
        again,
        `envelope.${side}`,
        Number(((again.envelope?.[side] ?? 0) - 0.01).toFixed(2)),
      );
      expect(searchOptions(less).options).toEqual([]);
    }
  });

  it('says so when loosening a limit and the room for it does not help', () => {
    const found = reasons({ stages: { min: 1, max: 1 }, leastContactRatio: 4 });
    expect(found).toHaveLength(1);
    expect(found[0]).toMatchObject({ stages: 1, limit: 'several', nearest: null });
  });

  it('says when a stage count works but ranks behind', () => {
    const [note] = reasons({ stages: { min: 2, max: 3 } });
    expect(note?.message).toBe('Two stages work, but none is among the best 50: the best sums to 85.50 mm.');
    const best = searchOptions(winchRequest({ ...note?.relaxed, limit: 1 })).options[0];
    expect(best?.centreDistanceSum).toBe(note?.nearest);
  });

  it('finds the least tolerance that works when an exact ratio is asked for', () => {
    const exact = { ratio: { target: '3.1415926', tolerancePercent: 0 }, stages: { min: 2, max: 2 } };
    const reason = reasons(exact).find(({ limit }) => limit === 'ratio.tolerancePercent');
    expect(reason?.nearest).toBeGreaterThan(0);
    expect(searchOptions(winchRequest(reason?.relaxed)).options.length).toBeGreaterThan(0);
  });

  it('answers a box smaller than one gear without failing', () => {
    const outcome = searchOptions(winchRequest({ envelope: { length: 3, width: 3, height: 3, wall: 1 } }));
    expect(outcome.options).toEqual([]);
    expect(outcome.search.complete).toBe(true);
    expect(outcome.whyNot.map(({ stages }) => stages)).toEqual([1, 2, 3]);
  });
});

const STEP: Record<string, number> = {
  'teeth.wheel.max': 1,
  'teeth.pinion.max': 1,
  'teeth.wheel.min': -1,
  'teeth.pinion.min': -1,
  'stageRatio.max': 0.001,
  'stageRatio.min': -0.001,
  leastContactRatio: -0.001,
  'envelope.length': 0.01,
  'envelope.height': 0.01,
  'ratio.tolerancePercent': 0.001,
};

/** The request with one limit set to a figure. */
function withLimit(request: OptionRequest, limit: string, figure: number): OptionRequest {
  const copy = structuredClone(request) as unknown as Record<string, unknown>;
  const path = limit.split('.');
  const last = path.pop() as string;
  const owner = path.reduce((part, name) => part[name] as Record<string, unknown>, copy);
  owner[last] = figure;
  return copy as unknown as OptionRequest;
}

/** A small request that can be met, but for one limit that is set too tight. */
const tight: fc.Arbitrary<OptionRequest> = fc
  .record({
    stages: fc.integer({ min: 1, max: 2 }),
    pinion: fc.integer({ min: 13, max: 19 }),
    wheel: fc.integer({ min: 28, max: 40 }),
    limit: fc.constantFrom(...Object.keys(STEP)),
    box: fc.boolean(),
  })
  .map(({ stages, pinion, wheel, limit, box }) => {
    const middle = (wheel + 1) / (pinion + 1);
    const target = (scale: number) => ((middle * scale) ** stages).toFixed(3);
    const request: OptionRequest = {
      ratio: { target: target(1), tolerancePercent: '3' },
      stages: { min: stages, max: stages },
      teeth: { pinion: { min: pinion, max: pinion + 2 }, wheel: { min: wheel, max: wheel + 2 } },
      modules: [1],
      leastContactRatio: 1,
      objective: 'centre-distance',
    };
    if (box || limit.startsWith('envelope')) {
      request.envelope = { length: 300, width: 100, height: 60, wall: 1.5 };
    }
    const tighten: Record<string, () => void> = {
      'teeth.wheel.max': () => (request.ratio.target = target(1.25)),
      'teeth.pinion.min': () => (request.ratio.target = target(1.25)),
      'teeth.wheel.min': () => (request.ratio.target = target(0.8)),
      'teeth.pinion.max': () => (request.ratio.target = target(0.8)),
      'stageRatio.max': () => (request.stageRatio = { max: (middle * 0.93).toFixed(2) }),
      'stageRatio.min': () => (request.stageRatio = { min: (middle * 1.07).toFixed(2) }),
      leastContactRatio: () => (request.leastContactRatio = 1.7),
      'envelope.length': () => (request.envelope = { length: 38.5 * stages, wall: 2 }),
      'envelope.height': () => (request.envelope = { length: 300, height: wheel, wall: 1.25 }),
      'ratio.tolerancePercent': () => (request.ratio.tolerancePercent = '0.001'),
    };
    tighten[limit]?.();
    return request;
  });

describe('the figure of every "why not", fed back', () => {
  it('gives an option, and a step less gives none', () => {
    const checked = new Map<string, number>();
    fc.assert(
      fc.property(tight, (request) => {
        const { options, whyNot } = searchOptions(request);
        if (options.length > 0) return;
        expect(whyNot.length).toBeGreaterThan(0);
        for (const reason of whyNot) checkReason(request, reason, checked);
      }),
      { seed: 7, numRuns: 100 },
    );
    for (const limit of Object.keys(STEP)) {
      expect.soft(checked.get(limit) ?? 0, limit).toBeGreaterThan(1);
    }
  });
});

function checkReason(request: OptionRequest, reason: WhyNot, checked: Map<string, number>): void {
  if (reason.limit === 'several') return;
  const relaxed = { ...request, ...reason.relaxed };
  const again = searchOptions(relaxed).options;
  expect(again.length).toBeGreaterThan(0);
  expect(again.every((option) => option.stages.length === reason.stages)).toBe(true);
  const step = STEP[reason.limit];
  if (step === undefined || typeof reason.nearest !== 'number') return;
  checked.set(reason.limit, (checked.get(reason.limit) ?? 0) + 1);
  // Large spaces are left to the search itself, whose answers are checked elsewhere.
  const { pinion, wheel } = relaxed.teeth;
  const pairs = (pinion.max - pinion.min + 1) * (wheel.max - wheel.min + 1);
  const less = withLimit(relaxed, reason.limit, Number((reason.nearest - step).toFixed(4)));
  if (pairs <= 60) expect(exhaustiveSearch(less)).toEqual([]);
  else expect(searchOptions(less).options).toEqual([]);
}
