import { describe, expect, it } from 'vitest';
import { searchOptions, type OptionRequest } from './index.js';
import { exhaustiveSearch } from './testing/exhaustive-search.js';
import { compareWithExhaustive } from './testing/random-requests.js';

describe('the search against looking at every train', () => {
  it('gives the same options in the same order, ties included', () => {
    // The draws must not be mostly empty spaces, or the comparison would say nothing.
    expect(compareWithExhaustive(20, 300)).toBeGreaterThan(120);
  });

  it('resolves masses of exact ties: one target, many trains', () => {
    for (const objective of ['centre-distance', 'ratio-error', 'mass'] as const) {
      const request: OptionRequest = {
        ratio: { target: '8', tolerancePercent: '0' },
        stages: { min: 1, max: 3 },
        teeth: { pinion: { min: 17, max: 21 }, wheel: { min: 34, max: 43 } },
        modules: [1],
        objective,
        limit: 40,
      };
      const expected = exhaustiveSearch(request).map((train) => train.key);
      expect(expected.length).toBe(40);
      expect(searchOptions(request).options.map((option) => option.key)).toEqual(expected);
    }
  });
});
