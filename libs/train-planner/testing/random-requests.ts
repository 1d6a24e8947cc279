import fc from 'fast-check';
import { expect } from 'vitest';
import { searchOptions, type OptionRequest } from '../index.js';
import { exhaustiveSearch } from './exhaustive-search.js';

/** Mostly the first value, now and then one of the others, so that few limits bite at once. */
function mostly<T>(usual: T, ...others: T[]): fc.Arbitrary<T> {
  return fc.oneof(
    { weight: 4, arbitrary: fc.constant(usual) },
    { weight: 1, arbitrary: fc.constantFrom(...others) },
  );
}

/** Small spaces with every limit of a brief switched on now and then. */
export const requests: fc.Arbitrary<OptionRequest> = fc
  .record({
    pinionMin: fc.integer({ min: 9, max: 24 }),
    pinions: fc.integer({ min: 1, max: 4 }),
    wheelMin: fc.integer({ min: 14, max: 48 }),
    wheels: fc.integer({ min: 1, max: 5 }),
    stagesMin: fc.integer({ min: 1, max: 3 }),
    moreStages: fc.integer({ min: 0, max: 2 }),
    targetScale: fc.integer({ min: 85, max: 115 }),
    decimals: fc.integer({ min: 0, max: 3 }),
    tolerance: mostly<string | number>('10', '0', '0.5', 1, '2.5', 40),
    objective: fc.constantFrom('centre-distance' as const, 'ratio-error' as const, 'mass' as const),
    shiftPolicy: fc.constantFrom('none' as const, 'clear-undercut' as const),
    shape: mostly([20, 0], [25, 0], [14.5, 0], [20, 15]),
    modules: fc.constantFrom<number[]>([1], [2, 1.25], [0.8]),
    allowance: mostly(0, 0.05, 0.2),
    leastContactRatio: mostly(1, 1.2, 1.45, 0),
    undercut: mostly<'allow' | 'refuse'>('allow', 'refuse'),
    direction: mostly<'any' | 'same' | 'opposite'>('any', 'same', 'opposite'),
    stageRatio: mostly<OptionRequest['stageRatio']>(
      undefined,
      { max: '2' },
      { min: '1.5' },
      { min: 0.5, max: '1.8' },
    ),
    envelope: mostly<number | undefined>(undefined, 0.85, 0.95, 1.05),
    limit: fc.constantFrom(1, 3, 10, 50),
  })
  .map((draw) => {
    const pinion = { min: draw.pinionMin, max: draw.pinionMin + draw.pinions };
    const wheel = { min: draw.wheelMin, max: draw.wheelMin + draw.wheels };
    const stages = { min: draw.stagesMin, max: Math.min(3, draw.stagesMin + draw.moreStages) };
    // Around the ratio in the middle of the space, as a short decimal so that exact hits happen.
    const middle = ((wheel.min + wheel.max) / (pinion.min + pinion.max)) ** stages.max;
    const target = ((middle * draw.targetScale) / 100).toFixed(draw.decimals);
    const request: OptionRequest = {
      ratio: { target: Number(target) > 0 ? target : '1', tolerancePercent: draw.tolerance },
      stages,
      teeth: { pinion, wheel },
      modules: draw.modules,
      pressureAngleDeg: draw.shape[0] ?? 20,
      helixAngleDeg: draw.shape[1] ?? 0,
      shiftPolicy: draw.shiftPolicy,
      leastContactRatio: draw.leastContactRatio,
      centreDistanceAllowance: draw.allowance,
      undercut: draw.undercut,
      direction: draw.direction,
      objective: draw.objective,
      limit: draw.limit,
    };
    if (draw.stageRatio) request.stageRatio = draw.stageRatio;
    if (draw.envelope) {
      const module = Math.min(...draw.modules);
      const sum = stages.max * ((pinion.min + wheel.max) / 2) + (pinion.max + wheel.max) / 2 + 6;
      request.envelope = { length: sum * module * draw.envelope, width: 200, wall: 2 };
      if (draw.envelope > 1) request.envelope.height = module * (wheel.max + 1) + 4;
    }
    return request;
  });

/** Searches random small spaces both ways; gives how many of them held options at all. */
export function compareWithExhaustive(seed: number, numRuns: number): number {
  let withOptions = 0;
  fc.assert(
    fc.property(requests, (request) => {
      const expected = exhaustiveSearch(request);
      const outcome = searchOptions(request);
      expect(outcome.search.complete).toBe(true);
      expect(outcome.options.map((option) => option.key)).toEqual(expected.map((train) => train.key));
      const distances = outcome.options.map((option) => BigInt(Math.round(option.centreDistanceSum * 1e6)));
      expect(distances).toEqual(expected.map((train) => train.distance));
      if (expected.length > 0) withOptions++;
    }),
    { seed, numRuns },
  );
  return withOptions;
}
