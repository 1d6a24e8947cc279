import { describe, expect, it } from 'vitest';
import type { SearchOutcome } from '../../../api/types';
import { optionOf } from '../../../testing/options';
import { outcomeWords, progressPercent, progressWords, type SearchAsked } from './searchWords';

const outcome = (changes: Partial<SearchOutcome['search']>, count = 1): SearchOutcome => ({
  options: Array.from({ length: count }, () => optionOf([[20, 75]])),
  search: { complete: true, combinations: 41_208_113, elapsedMs: 1900, ...changes },
  whyNot: [],
});

const asked = (state: SearchAsked['state'], bestOf: SearchAsked['request']['bestOf']): SearchAsked => ({
  state,
  request: { bestOf, limit: 50, stages: { min: 1, max: 3 } },
});

describe('progress', () => {
  it('says the stage, the counts and what was found', () => {
    const progress = { phase: 'search', stages: 2, settled: 1_204_331, total: 41_208_113, found: 37 };
    expect(progressWords(progress)).toBe(
      'Two stages: 1,204,331 of 41,208,113 combinations settled, 37 options so far',
    );
    expect(progressPercent(progress)).toBeCloseTo(2.92, 2);
  });

  it('claims no share while the total is not known', () => {
    expect(progressPercent({ phase: 'x', stages: 1, settled: 5, total: 0, found: 0 })).toBeNull();
    expect(progressPercent(null)).toBeNull();
  });
});

describe('outcomeWords', () => {
  it('claims that nothing better exists only when everything was settled', () => {
    expect(outcomeWords(asked('done', 'all'), outcome({}))).toBe(
      'Every combination settled: 41,208,113 in 1.9 s. Nothing better exists inside this brief.',
    );
    expect(outcomeWords(asked('done', 'each-count'), outcome({}))).toContain(
      'The best 50 of each stage count;',
    );
    expect(outcomeWords(asked('stopped', 'all'), outcome({ complete: false }))).toMatch(
      /^Stopped after .*better ones may/,
    );
    expect(outcomeWords(asked('done', 'all'), outcome({ complete: false }))).toMatch(
      /^Stopped at the time limit/,
    );
  });

  it('says plainly that no train meets the brief', () => {
    expect(outcomeWords(asked('done', 'all'), outcome({}, 0))).toContain('No train meets every limit');
  });
});
