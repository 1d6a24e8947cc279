import { Fraction } from 'fraction.js';
import { fieldError } from './errors.js';

/** An exact fraction in lowest terms; the denominator is positive, the sign stands in the numerator. */
export interface Ratio {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

/** Anything that names an exact figure: a fraction, a decimal literal, or a number read as its shortest decimal. */
export type RatioInput = Ratio | string | number;

/** Longest decimal literal that is read, in characters, and the largest power of ten it may carry. */
export const DECIMAL_LENGTH_LIMIT = 60;
export const DECIMAL_EXPONENT_LIMIT = 60;

const DECIMAL = /^([+-]?)(?=\.?\d)(\d*)(?:\.(\d*))?(?:e([+-]?\d{1,4}))?$/i;

/**
 * An exact fraction in lowest terms.
 * @param numerator whole number (a `number` must be a safe integer)
 * @param denominator whole number other than 0
 * @throws InputError when a term is not whole or the denominator is 0
 */
export function ratio(numerator: bigint | number, denominator: bigint | number = 1n): Ratio {
  const n = wholeTerm(numerator, 'numerator');
  const d = wholeTerm(denominator, 'denominator');
  if (d === 0n)
    throw fieldError('denominator', '0', 'The denominator is 0. Give a whole number other than 0.');
  return fromFraction(new Fraction(n, d));
}

/**
 * Reads a plain decimal such as `37.5`, `-0.25` or `1.2e3` without any rounding.
 * @param field path named in the refusal
 * @throws InputError for anything else: blanks, fractions, grouping, `NaN`, `Infinity`, too long, exponent too large
 */
export function parseDecimal(text: string, field = 'value'): Ratio {
  if (typeof text !== 'string' || text.length > DECIMAL_LENGTH_LIMIT) {
    const shown = typeof text === 'string' ? `${text.slice(0, 20)}…` : text;
    const message = `The figure must be a decimal of at most ${DECIMAL_LENGTH_LIMIT} characters, such as 37.5.`;
    throw fieldError(field, shown, message, DECIMAL_LENGTH_LIMIT);
  }
  const match = DECIMAL.exec(text.trim().replace('\u2212', '-'));
  if (!match) throw fieldError(field, text, `“${text}” is not a decimal figure. Write it like 37.5.`);
  const [, sign, whole = '', decimals = '', exponentText = '0'] = match;
  const exponent = Number(exponentText);
  if (Math.abs(exponent) > DECIMAL_EXPONENT_LIMIT) {
    const message = `The power of ten in “${text}” is beyond ±${DECIMAL_EXPONENT_LIMIT}. Write the figure in full.`;
    throw fieldError(field, text, message, DECIMAL_EXPONENT_LIMIT);
  }
  const digits = BigInt(whole + decimals);
  const shift = exponent - decimals.length;
  const scale = 10n ** BigInt(Math.abs(shift));
  const value = shift >= 0 ? new Fraction(digits * scale, 1n) : new Fraction(digits, scale);
  return fromFraction(sign === '-' ? value.neg() : value);
}

/**
 * The exact figure behind any input. A `number` counts as its shortest decimal literal: 0.1 is one tenth.
 * @throws InputError for NaN, Infinity and text that is no decimal
 */
export function toRatio(value: RatioInput, field = 'value'): Ratio {
  if (typeof value === 'string') return parseDecimal(value, field);
  if (isRatio(value)) return ratio(value.numerator, value.denominator);
  if (typeof value !== 'number') {
    throw fieldError(field, shownKind(value), 'The figure is missing. Give a decimal, such as 37.5.');
  }
  if (!Number.isFinite(value)) {
    throw fieldError(field, String(value), 'The figure must be a finite number, such as 37.5.');
  }
  return parseDecimal(String(value), field);
}

/** The exact product of any number of fractions; 1 for none. */
export function multiply(...factors: Ratio[]): Ratio {
  return fromFraction(factors.reduce((product, factor) => product.mul(toFraction(factor)), new Fraction(1)));
}

/** Exact a / b. @throws InputError when b is 0 */
export function divide(a: Ratio, b: Ratio): Ratio {
  if (b.numerator === 0n) throw fieldError('divisor', '0', 'A figure cannot be divided by 0.');
  return fromFraction(toFraction(a).div(toFraction(b)));
}

/** Exact order: −1 when a < b, 0 when equal, 1 when a > b. */
export function compareRatios(a: Ratio, b: Ratio): -1 | 0 | 1 {
  const difference = a.numerator * b.denominator - b.numerator * a.denominator;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}

export function toFraction(value: Ratio): Fraction {
  return new Fraction(value.numerator, value.denominator);
}

export function fromFraction(value: Fraction): Ratio {
  return { numerator: value.s * value.n, denominator: value.d };
}

function wholeTerm(term: bigint | number, field: string): bigint {
  if (typeof term === 'bigint') return term;
  if (!Number.isSafeInteger(term)) {
    throw fieldError(field, String(term), `The ${field} must be a whole number below 9,007,199,254,740,992.`);
  }
  return BigInt(term);
}

function isRatio(value: unknown): value is Ratio {
  return typeof value === 'object' && value !== null && 'numerator' in value && 'denominator' in value;
}

/** What stands where a figure should be, in a word: it may be anything when it comes from outside. */
function shownKind(value: unknown): string | null {
  return value === undefined || value === null ? null : `a ${typeof value}`;
}
