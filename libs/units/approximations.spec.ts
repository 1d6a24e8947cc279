import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convergents, InputError, mediants, ratio, type Approximation } from './index.js';

const shown = (list: Approximation[]) => list.map((item) => `${item.numerator}/${item.denominator}`);
const targets = fc
  .tuple(fc.bigInt({ min: 1n, max: 100_000n }), fc.bigInt({ min: 1n, max: 10_000n }))
  .map(([n, d]) => ratio(n, d));

describe('mediants', () => {
  it('gives the published approximations of 191/23', () => {
    // A. Brocot's clock-wheel example (memory): 25/3, 33/4, 58/7, 83/10, 108/13 by successive mediants.
    const found = shown(mediants(ratio(191, 23)));
    expect(found.slice(1, 6)).toEqual(['25/3', '33/4', '58/7', '83/10', '108/13']);
    // The walk begins with the mediant of 8/1 and 9/1 and ends with the target.
    expect(found[0]).toBe('17/2');
    expect(found.at(-1)).toBe('191/23');
    expect(found).toHaveLength(7);
  });

  it('stops before a term exceeds the limit, and after so many', () => {
    expect(shown(mediants(ratio(191, 23), { maxTerm: 100 })).at(-1)).toBe('83/10');
    expect(shown(mediants(ratio(191, 23), { maxTerm: 83 })).at(-1)).toBe('83/10');
    expect(shown(mediants(ratio(191, 23), { maxTerm: 82 })).at(-1)).toBe('58/7');
    expect(shown(convergents(ratio(191, 23), { maxTerm: 83 })).at(-1)).toBe('83/10');
    expect(shown(convergents(ratio(191, 23), { maxTerm: 82 })).at(-1)).toBe('25/3');
    expect(mediants(ratio(191, 23), { limit: 2 })).toHaveLength(2);
  });

  it('gives a whole target alone', () => {
    expect(shown(mediants('30'))).toEqual(['30/1']);
    expect(mediants('1000000000')).toEqual([]);
  });

  it('marks the tolerance without filtering', () => {
    const marks = mediants('8.3', { tolerancePercent: 1 }).map((item) => item.withinTolerance);
    expect(marks).toContain(true);
    expect(marks).toContain(false);
    expect(mediants('8.3')[0]).not.toHaveProperty('withinTolerance');
  });

  it('stays in lowest terms and ends at the target or at the limit', () => {
    fc.assert(
      fc.property(targets, (target) => {
        const found = mediants(target, { maxTerm: 300, limit: 10_000 });
        for (const item of found) {
          expect(ratio(item.numerator, item.denominator)).toMatchObject({ numerator: item.numerator });
          expect(item.numerator <= 300n && item.denominator <= 300n).toBe(true);
        }
        const reached = found.some((item) => item.errorPercent === 0);
        expect(reached).toBe(target.numerator <= 300n && target.denominator <= 300n);
      }),
    );
  });
});

describe('convergents', () => {
  it('gives the published convergents of 191/23', () => {
    // Continued fraction of 191/23, Brocot's example (memory): 8, 25/3, 83/10.
    expect(shown(convergents(ratio(191, 23)))).toEqual(['8/1', '25/3', '83/10', '191/23']);
  });

  it('alternates about the target and improves at every step', () => {
    fc.assert(
      fc.property(targets, (target) => {
        const found = convergents(target, { maxTerm: 1_000_000, limit: 100 });
        expect(found.at(-1)?.errorPercent).toBe(0);
        for (let i = 1; i < found.length; i += 1) {
          const [before, after] = [found[i - 1], found[i]];
          if (!before || !after) throw new Error('a list has no holes');
          expect(Math.abs(after.errorPercent)).toBeLessThan(Math.abs(before.errorPercent));
          expect(Math.sign(after.errorPercent)).not.toBe(Math.sign(before.errorPercent));
        }
      }),
    );
  });
});

it.each([
  ['target 0', () => mediants('0')],
  ['no target', () => mediants(null as never)],
  ['a list as target', () => convergents([] as never)],
  ['negative target', () => convergents('-3')],
  ['maxTerm not whole', () => mediants('3.5', { maxTerm: 2.5 })],
  ['limit 0', () => convergents('3.5', { limit: 0 })],
])('refuses %s', (_name, act) => {
  expect(act).toThrow(InputError);
});
