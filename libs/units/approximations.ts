import { fieldError } from './errors.js';
import { compareRatios, ratio, type Ratio, type RatioInput } from './ratio.js';
import { positiveTarget, ratioErrorPercent, withinTolerance } from './ratio-figures.js';

/** A fraction near a target, with its signed error in per cent. */
export interface Approximation extends Ratio {
  readonly errorPercent: number;
  /** Present when a tolerance was given: whether the fraction lies within it. It marks, it does not filter. */
  readonly withinTolerance?: boolean;
}

export interface ApproximationLimits {
  /** Largest numerator or denominator allowed, such as the most teeth of a gear; whole, 1 to 1e9. */
  maxTerm?: number;
  /** Most fractions returned; whole, 1 to 10,000. */
  limit?: number;
  /** Marks each fraction as inside or outside this tolerance. */
  tolerancePercent?: RatioInput;
}

/**
 * Successive mediants towards the target (A. Brocot's method for clock wheels), in the order found. The walk
 * starts between floor and floor + 1, keeps the interval that holds the target, and stops after the mediant that
 * equals the target or before a term exceeds `maxTerm`. A whole target gives itself only.
 * @throws InputError when the target is not above 0 or a limit has no meaning
 */
export function mediants(target: RatioInput, limits: ApproximationLimits = {}): Approximation[] {
  const exact = positiveTarget(target);
  const { maxTerm, limit } = checkedLimits(limits);
  const floor = exact.numerator / exact.denominator;
  const found: Approximation[] = [];
  if (exact.denominator === 1n) {
    if (floor <= maxTerm) found.push(approximation(exact, exact, limits));
    return found;
  }
  let below: Ratio = ratio(floor);
  let above: Ratio = ratio(floor + 1n);
  while (found.length < limit) {
    const numerator = below.numerator + above.numerator;
    const denominator = below.denominator + above.denominator;
    if (numerator > maxTerm || denominator > maxTerm) break;
    // Neighbours in this walk differ by 1/(d1 d2), so a mediant is already in lowest terms.
    const mediant: Ratio = { numerator, denominator };
    found.push(approximation(mediant, exact, limits));
    const order = compareRatios(mediant, exact);
    if (order === 0) break;
    if (order < 0) below = mediant;
    else above = mediant;
  }
  return found;
}

/**
 * Convergents of the target's continued fraction, in order, up to the target itself or the last whose terms do
 * not exceed `maxTerm`. A target below 1 starts with 0/1.
 * @throws InputError when the target is not above 0 or a limit has no meaning
 */
export function convergents(target: RatioInput, limits: ApproximationLimits = {}): Approximation[] {
  const exact = positiveTarget(target);
  const { maxTerm, limit } = checkedLimits(limits);
  const found: Approximation[] = [];
  let [n, d] = [exact.numerator, exact.denominator];
  let [previousN, previousD, currentN, currentD] = [0n, 1n, 1n, 0n];
  while (d !== 0n && found.length < limit) {
    const term = n / d;
    [n, d] = [d, n % d];
    [previousN, currentN] = [currentN, term * currentN + previousN];
    [previousD, currentD] = [currentD, term * currentD + previousD];
    if (currentN > maxTerm || currentD > maxTerm) break;
    found.push(approximation({ numerator: currentN, denominator: currentD }, exact, limits));
  }
  return found;
}

function approximation(value: Ratio, target: Ratio, limits: ApproximationLimits): Approximation {
  const errorPercent = ratioErrorPercent(value, target);
  if (limits.tolerancePercent === undefined) return { ...value, errorPercent };
  return { ...value, errorPercent, withinTolerance: withinTolerance(value, target, limits.tolerancePercent) };
}

function checkedLimits({ maxTerm = 200, limit = 20 }: ApproximationLimits): {
  maxTerm: bigint;
  limit: number;
} {
  requireWhole('maxTerm', maxTerm, 1_000_000_000);
  requireWhole('limit', limit, 10_000);
  return { maxTerm: BigInt(maxTerm), limit };
}

function requireWhole(field: string, value: number, most: number): void {
  if (Number.isInteger(value) && value >= 1 && value <= most) return;
  const message = `${field} must be a whole number from 1 to ${most.toLocaleString('en-GB')}.`;
  throw fieldError(field, value, message, most);
}
