import { expect, it } from 'vitest';
import { leastTrain, searchOptions } from './index.js';
import { winchRequest } from './testing/sample-requests.js';

it('bounds one stage by hand', () => {
  // 17 times 148.5 is 2524.5 teeth; (17 + 2524.5)/2 mm is 1270.75 mm, and twice that at a helix of 60° (cos 0.5).
  expect(leastTrain(1, 148.5, 17, 1)).toEqual({ wheelTeeth: 2525, centreDistanceSum: 1270.75 });
  expect(leastTrain(1, 148.5, 17, 1, 60).centreDistanceSum).toBeCloseTo(2541.5, 9);
});

it('keeps a whole tooth count whole', () => {
  // The cube root of 27 is 3.
  expect(leastTrain(3, 27, 20, 2)).toEqual({ wheelTeeth: 60, centreDistanceSum: 240 });
});

it('is never above what the search finds', () => {
  for (const stages of [2, 3]) {
    const { options } = searchOptions(winchRequest({ stages: { min: stages, max: stages } }));
    const bound = leastTrain(stages, 37.5 * 0.99, 12, 1);
    for (const option of options) {
      expect(option.centreDistanceSum).toBeGreaterThanOrEqual(bound.centreDistanceSum);
      expect(Math.max(...option.stages.map(({ wheelTeeth }) => wheelTeeth))).toBeGreaterThanOrEqual(
        bound.wheelTeeth,
      );
    }
    expect(options.length).toBeGreaterThan(0);
  }
});
