import { describe, expect, it } from 'vitest';
import { compareWithExhaustive } from './random-requests.js';

describe('the search against looking at every train, at length', () => {
  it.each([1, 2, 3, 4, 5])('gives the same options in the same order (seed %i)', (seed) => {
    expect(compareWithExhaustive(seed, 1000)).toBeGreaterThan(400);
  });
});
