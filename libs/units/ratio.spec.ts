import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  compareRatios,
  divide,
  formatExactRatio,
  formatRatio,
  InputError,
  multiply,
  parseDecimal,
  ratio,
  ratioErrorPercent,
  ratioToFixed,
  ratioToNumber,
  withinTolerance,
} from './index.js';

const term = fc.bigInt({ min: 1n, max: 10n ** 18n });
const fraction = fc.tuple(term, term).map(([n, d]) => ratio(n, d));

describe('exact ratios', () => {
  it('multiplies the stages of published trains', () => {
    // R. S. Khurmi & J. K. Gupta, Theory of Machines, ex. 13.1 (seen): 975 rpm through 20/50 · 25/75 · 26/65 → 52 rpm.
    const output = multiply(ratio(975), ratio(20, 50), ratio(25, 75), ratio(26, 65));
    expect(output).toEqual(ratio(52));
    // T. Bevan, Theory of Machines, ch. 11 (seen): reverted train 74/24 · 52/18 = 8.9074.
    expect(ratioToFixed(multiply(ratio(74, 24), ratio(52, 18)), 4)).toBe('8.9074');
    // Shigley 13-5 (memory): 108/18 · 105/21 is exactly 30.
    expect(multiply(ratio(108, 18), ratio(105, 21))).toEqual(ratio(30));
  });

  it('keeps lowest terms with the sign in the numerator', () => {
    expect(ratio(-6, -4)).toEqual({ numerator: 3n, denominator: 2n });
    expect(ratio(6, -4)).toEqual({ numerator: -3n, denominator: 2n });
    expect(ratio(0, -7)).toEqual({ numerator: 0n, denominator: 1n });
  });

  it('multiplying and dividing by the same fraction gives the first one back', () => {
    fc.assert(
      fc.property(fraction, fraction, (a, b) => {
        expect(divide(multiply(a, b), b)).toEqual(a);
        expect(compareRatios(a, b)).toBe(-compareRatios(b, a) + 0);
      }),
    );
  });

  it.each([
    ['denominator 0', () => ratio(1, 0)],
    ['numerator not whole', () => ratio(1.5, 2)],
    ['NaN', () => ratio(Number.NaN)],
    ['division by 0', () => divide(ratio(1), ratio(0))],
  ])('refuses %s', (_name, act) => {
    expect(act).toThrow(InputError);
  });
});

describe('parseDecimal', () => {
  it.each([
    ['37.5', 75n, 2n],
    ['-0.25', -1n, 4n],
    ['\u22121.5', -3n, 2n],
    ['6.931', 6931n, 1000n],
    ['.5', 1n, 2n],
    ['5.', 5n, 1n],
    ['1.2e3', 1200n, 1n],
    ['1E-7', 1n, 10_000_000n],
    ['  8 ', 8n, 1n],
  ])('reads %s exactly', (text, numerator, denominator) => {
    expect(parseDecimal(text)).toEqual({ numerator, denominator });
  });

  it.each(['', ' ', '.', 'e5', '1/6.931', '1,400', 'NaN', 'Infinity', '0x10', '1e999', '1 2', '--1'])(
    'refuses “%s”',
    (text) => {
      expect(() => parseDecimal(text, 'ratio.target')).toThrow(InputError);
      try {
        parseDecimal(text, 'ratio.target');
      } catch (error) {
        expect(error).toMatchObject({ code: 'bad-input', errors: [{ field: 'ratio.target' }] });
        expect((error as InputError).message.length).toBeLessThan(200);
      }
    },
  );

  it('refuses a text of 100,000 characters shortly', () => {
    expect(() => parseDecimal('1'.repeat(100_000))).toThrow(/^.{1,200}$/);
  });

  it('reads every literal exactly: scaled back, the digits return', () => {
    fc.assert(
      fc.property(fc.bigInt({ min: 0n, max: 10n ** 25n }), fc.nat(12), (digits, places) => {
        const text = digits.toString().padStart(places + 1, '0');
        const cut = text.length - places;
        const literal = places === 0 ? text : `${text.slice(0, cut)}.${text.slice(cut)}`;
        expect(parseDecimal(literal)).toEqual(ratio(digits, 10n ** BigInt(places)));
        expect(ratioToFixed(parseDecimal(literal), places)).toBe(literal);
      }),
    );
  });
});

describe('errors and tolerance', () => {
  it('is inclusive at the limit where floating figures would miss it', () => {
    // 37.875 is exactly 1 % above 37.5; in floating figures it comes out a hair above.
    expect(withinTolerance('37.875', '37.5', 1)).toBe(true);
    expect(withinTolerance('10.001', '10', 0.01)).toBe(true);
    expect((37.875 / 37.5 - 1) * 100 <= 1).toBe(false);
    expect(withinTolerance('10.0010000000000000001', '10', '0.01')).toBe(false);
    expect(withinTolerance('9.999', '10', 0.01)).toBe(true);
    expect(withinTolerance(ratio(191, 23), ratio(191, 23), 0)).toBe(true);
  });

  it('gives a signed error', () => {
    expect(ratioErrorPercent(40, 50)).toBe(-20);
    expect(ratioErrorPercent(ratio(75, 2), '37.5')).toBe(0);
    expect(ratioErrorPercent('37.6', '37.5')).toBeCloseTo(0.8 / 3, 14);
  });

  it('finds the published train for 1/6.931', () => {
    // Gear train design problem of the optimisation literature (seen): 16·19/(43·49), squared error 2.70085715e-12.
    const found = multiply(ratio(16, 43), ratio(19, 49));
    const target = ratio(1000, 6931);
    const error = ratioToNumber(found) - ratioToNumber(target);
    expect(error ** 2 / 2.70085715e-12).toBeCloseTo(1, 4);
    const exact = (ratioErrorPercent(found, target) / 100) * ratioToNumber(target);
    expect(exact ** 2 / 2.70085715e-12).toBeCloseTo(1, 8);
  });

  it('a value at target × (1 ± tolerance) is inside, the least step beyond is outside', () => {
    const percent = fc.integer({ min: 0, max: 5000 }).map((hundredths) => ratio(hundredths, 100));
    fc.assert(
      fc.property(fraction, percent, fc.boolean(), (target, tolerance, up) => {
        const sign = up ? 1n : -1n;
        const edge = ratio(
          tolerance.denominator * 100n + sign * tolerance.numerator,
          tolerance.denominator * 100n,
        );
        const limit = multiply(target, edge);
        expect(withinTolerance(limit, target, tolerance)).toBe(true);
        const beyond = multiply(limit, ratio(10n ** 30n + sign, 10n ** 30n));
        expect(withinTolerance(beyond, target, tolerance)).toBe(false);
      }),
    );
  });

  it.each([0, -1, '0', Number.NaN, Number.POSITIVE_INFINITY])('refuses the target %s', (target) => {
    expect(() => ratioErrorPercent(1, target)).toThrow(InputError);
    expect(() => withinTolerance(1, target, 1)).toThrow(InputError);
  });

  it('refuses a negative tolerance', () => {
    expect(() => withinTolerance(1, 1, -0.1)).toThrow(InputError);
  });
});

describe('ratioToNumber', () => {
  it('gives the nearest double, as one floating division of small terms does', () => {
    const small = fc.integer({ min: 1, max: 2 ** 31 });
    fc.assert(
      fc.property(small, small, fc.boolean(), (n, d, negative) => {
        const signed = negative ? -n : n;
        expect(ratioToNumber(ratio(signed, d))).toBe(signed / d);
      }),
    );
  });

  it('returns every double that a decimal literal names', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-30, max: 1e30, noNaN: true }), (value) => {
        expect(ratioToNumber(parseDecimal(String(value)))).toBe(value);
      }),
    );
  });

  it('rounds once: a hair above half a step goes up, half a step exactly goes to even', () => {
    // IEEE 754, round to nearest, ties to even: doubles near 1 stand 2⁻⁵² apart.
    const one = 1n << 200n;
    const halfStep = 1n << 147n;
    expect(ratioToNumber(ratio(one + halfStep, one))).toBe(1);
    expect(ratioToNumber(ratio(one + halfStep + 1n, one))).toBe(1 + 2 ** -52);
    expect(ratioToNumber(ratio(one + halfStep - 1n, one))).toBe(1);
  });

  it('survives terms beyond the range of doubles', () => {
    const huge = 10n ** 400n;
    expect(ratioToNumber({ numerator: 3n * huge, denominator: 2n * huge })).toBe(1.5);
    expect(ratioToNumber({ numerator: 1n, denominator: huge })).toBe(0);
  });
});

describe('shown ratios', () => {
  it('rounds half away from zero, exactly', () => {
    expect(ratioToFixed(parseDecimal('1.005'), 2)).toBe('1.01');
    expect(ratioToFixed(parseDecimal('-1.005'), 2)).toBe('\u22121.01');
    expect(ratioToFixed(parseDecimal('-0.001'), 2)).toBe('0.00');
    expect(ratioToFixed(ratio(1, 2), 0)).toBe('1');
  });

  it('shows the ratio to one, and the exact one', () => {
    expect(formatRatio(ratio(75, 2))).toBe('37.5 : 1');
    expect(formatRatio(ratio(30))).toBe('30 : 1');
    expect(formatRatio(ratio(191, 23))).toBe('8.3043 : 1');
    expect(formatExactRatio(ratio(191, 23))).toBe('191 : 23');
  });
});
