import { fieldError } from './errors.js';
import { compareRatios, divide, multiply, ratio, toRatio, type Ratio, type RatioInput } from './ratio.js';

const HUNDRED = ratio(100);

/** The nearest double to an exact fraction, correctly rounded within the normal range of doubles. */
export function ratioToNumber(value: Ratio): number {
  const negative = value.numerator < 0n;
  const n = negative ? -value.numerator : value.numerator;
  if (n === 0n) return 0;
  // Keep 66 bits or more of quotient and a sticky last bit, so that one rounding happens, in Number().
  const shift = 66 - (bitLength(n) - bitLength(value.denominator));
  const scaled = shift >= 0 ? n << BigInt(shift) : n;
  const divisor = shift >= 0 ? value.denominator : value.denominator << BigInt(-shift);
  const quotient = scaled / divisor;
  const sticky = scaled % divisor === 0n ? quotient : quotient | 1n;
  // Two steps, since a single power of two may leave the range of doubles where the result does not.
  const half = Math.trunc(shift / 2);
  const magnitude = Number(sticky) * 2 ** -half * 2 ** -(shift - half);
  return negative ? -magnitude : magnitude;
}

/**
 * Signed error (value / target − 1) × 100, exact until the last rounding to a double.
 * @throws InputError when the target is not above 0
 */
export function ratioErrorPercent(value: RatioInput, target: RatioInput): number {
  return ratioToNumber(exactErrorPercent(toRatio(value, 'value'), positiveTarget(target)));
}

/**
 * Whether value lies within ± tolerance of the target. Exact, and the limit itself is inside.
 * @param tolerancePercent per cent of the target, 0 or more; a number is read as its shortest decimal
 * @throws InputError when the target is not above 0 or the tolerance is below 0
 */
export function withinTolerance(
  value: RatioInput,
  target: RatioInput,
  tolerancePercent: RatioInput,
): boolean {
  const tolerance = toRatio(tolerancePercent, 'tolerancePercent');
  if (tolerance.numerator < 0n) {
    const shown = ratioToFixed(tolerance, 3);
    throw fieldError('tolerancePercent', shown, 'The tolerance must be 0 % or more.', 0);
  }
  const error = exactErrorPercent(toRatio(value, 'value'), positiveTarget(target));
  const size = error.numerator < 0n ? { ...error, numerator: -error.numerator } : error;
  return compareRatios(size, tolerance) <= 0;
}

/** Exact decimal rounding, half away from zero. @param digits decimals shown, 0–30 */
export function ratioToFixed(value: Ratio, digits: number): string {
  const negative = value.numerator < 0n;
  const n = negative ? -value.numerator : value.numerator;
  const scale = 10n ** BigInt(digits);
  const rounded = (2n * n * scale + value.denominator) / (2n * value.denominator);
  const text = rounded.toString().padStart(digits + 1, '0');
  const whole = text.slice(0, text.length - digits);
  const shown = digits === 0 ? whole : `${whole}.${text.slice(text.length - digits)}`;
  return negative && rounded !== 0n ? `\u2212${shown}` : shown;
}

/** `37.5 : 1`; at most `digits` decimals, trailing zeros dropped. */
export function formatRatio(value: Ratio, digits = 4): string {
  const fixed = ratioToFixed(value, digits);
  return `${fixed.includes('.') ? fixed.replace(/\.?0+$/, '') : fixed} : 1`;
}

/** `191 : 23`, the exact ratio in lowest terms. */
export function formatExactRatio(value: Ratio): string {
  return `${value.numerator.toString().replace('-', '\u2212')} : ${value.denominator}`;
}

function exactErrorPercent(value: Ratio, target: Ratio): Ratio {
  const quotient = divide(value, target);
  const excess = ratio(quotient.numerator - quotient.denominator, quotient.denominator);
  return multiply(excess, HUNDRED);
}

/** @throws InputError when the target is not above 0 */
export function positiveTarget(target: RatioInput): Ratio {
  const exact = toRatio(target, 'target');
  if (exact.numerator <= 0n) {
    const shown = typeof target === 'object' ? formatExactRatio(exact) : target;
    throw fieldError('target', shown, 'The target ratio must be above 0.', 0);
  }
  return exact;
}

function bitLength(value: bigint): number {
  return value.toString(2).length;
}
