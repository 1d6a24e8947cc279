import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { divide, multiply, ratio, toRatio } from '../units/index.js';
import { RatioBounds } from './ratio-bounds.js';
import { RatioWindow } from './ratio-window.js';
import { countTrains } from './search-space.js';
import { firstAbove, firstNotBelow, RangeLeast } from './sorted-search.js';

describe('RangeLeast', () => {
  it('finds the least value of any range', () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(20), { minLength: 1, maxLength: 70 }),
        fc.nat(),
        fc.nat(),
        (values, a, b) => {
          const from = a % values.length;
          const to = from + 1 + (b % (values.length - from));
          const at = new RangeLeast(Float64Array.from(values)).at(from, to);
          expect(at >= from && at < to).toBe(true);
          expect(values[at]).toBe(Math.min(...values.slice(from, to)));
        },
      ),
      { seed: 1 },
    );
  });
});

describe('searching rising values', () => {
  it('finds the first not below and the first above', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(30)), fc.nat(32), (drawn, bound) => {
        const values = Float64Array.from(drawn).sort();
        const end = values.length;
        const at = (test: (value: number) => boolean) => [...values, Infinity].findIndex(test);
        expect(firstNotBelow(values, bound, 0, end)).toBe(at((value) => value >= bound));
        expect(firstAbove(values, bound, 0, end)).toBe(at((value) => value > bound));
      }),
      { seed: 2 },
    );
  });
});

describe('RatioBounds', () => {
  it('never exceeds the true least cost of one or two stages that complete the ratio', () => {
    const pair = fc.tuple(fc.integer({ min: 12, max: 40 }), fc.integer({ min: 12, max: 150 }), fc.nat(1000));
    fc.assert(
      fc.property(
        fc.array(pair, { minLength: 1, maxLength: 40 }),
        fc.double({ min: 1, max: 60, noNaN: true }),
        fc.constantFrom(1.0000001, 1.001, 1.02, 1.5, 3),
        fc.double({ min: 0.8, max: 8, noNaN: true }),
        (drawn, low, width, soFar) => {
          const rows = drawn
            .map(([z1, z2, cost]) => ({ ratio: z2 / z1, cost }))
            .sort((a, b) => a.ratio - b.ratio);
          const bounds = new RatioBounds(
            Float64Array.from(rows, (row) => row.ratio),
            Float64Array.from(rows, (row) => row.cost),
            low,
            low * width,
          );
          const completes = (value: number) => value * soFar >= low && value * soFar <= low * width;
          const one = rows.filter((row) => completes(row.ratio)).map((row) => row.cost);
          const two = rows.flatMap((a) =>
            rows.filter((b) => completes(a.ratio * b.ratio)).map((b) => a.cost + b.cost),
          );
          const missing = Math.log(low) - Math.log(soFar);
          expect(bounds.least(1, missing)).toBeLessThanOrEqual(Math.min(Infinity, ...one));
          expect(bounds.least(2, missing)).toBeLessThanOrEqual(Math.min(Infinity, ...two));
        },
      ),
      { seed: 3, numRuns: 400 },
    );
  });

  it('rules out what cannot be completed', () => {
    const bounds = new RatioBounds(Float64Array.of(1, 2, 3), Float64Array.of(5, 6, 7), 50, 51);
    expect(bounds.least(2, Math.log(50))).toBe(Infinity);
    expect(bounds.least(2, Math.log(8.9))).toBe(14);
  });
});

describe('RatioWindow', () => {
  const teeth = fc.integer({ min: 1, max: 64_000_000 });

  it('takes in its limits and nothing beyond them', () => {
    fc.assert(
      fc.property(teeth, teeth, fc.constantFrom('0', '0.000001', '1', '12.5'), (n, d, tolerance) => {
        const share = multiply(toRatio(tolerance), ratio(1, 100));
        /** A window with n/d exactly on its upper (1) or lower (−1) limit. */
        const windowAt = (side: 1n | -1n) => {
          const limit = ratio(share.denominator + side * share.numerator, share.denominator);
          return new RatioWindow(multiply(ratio(n, d), divide(ratio(1), limit)), tolerance);
        };
        expect(windowAt(1n).contains(n, d)).toBe(true);
        expect(windowAt(1n).contains(n + 1, d)).toBe(false);
        expect(windowAt(-1n).contains(n, d)).toBe(true);
        expect(windowAt(-1n).contains(n, d + 1)).toBe(false);
      }),
      { seed: 4 },
    );
  });

  it('orders errors exactly where floats cannot', () => {
    const window = new RatioWindow('1', '50');
    // Errors 1/(k + 1) and 1/k differ by less than a float of 1 can show.
    const k = 40_000_000;
    expect(window.compareErrors(k + 2, k + 1, k + 1, k)).toBeLessThan(0);
    expect(window.compareErrors(k + 1, k, k + 2, k + 1)).toBeGreaterThan(0);
    expect(window.compareErrors(2 * k + 2, 2 * k, k + 1, k)).toBe(0);
    expect(window.compareErrors(9, 10, 11, 10)).toBe(0);
  });
});

describe('countTrains', () => {
  it('counts multisets, or sequences where the order counts', () => {
    expect(countTrains(4, 1, false)).toBe(4);
    expect(countTrains(4, 2, false)).toBe(10);
    expect(countTrains(4, 3, false)).toBe(20);
    expect(countTrains(4, 3, true)).toBe(64);
    expect(countTrains(0, 2, false)).toBe(0);
  });
});
