import { multiply, ratio, ratioToNumber, toRatio, type Ratio, type RatioInput } from '../units/index.js';

/** Relative size of the float noise of a quotient of two safe integers, with room to spare. */
const NOISE = 2e-15;

/**
 * The ratios a train may have, exact. Decisions run on floats while they are clear and are settled by whole-number
 * arithmetic when they are not, so no rounding ever decides.
 */
export class RatioWindow {
  readonly target: number;
  /** Nearest floats to the limits; 0 and Infinity without a tolerance. */
  readonly low: number;
  readonly high: number;
  readonly #exactTarget: Ratio;
  readonly #exactLow: Ratio | null;
  readonly #exactHigh: Ratio | null;

  /** @param tolerancePercent null: any ratio is inside, errors are still measured from the target */
  constructor(target: RatioInput, tolerancePercent: RatioInput | null) {
    this.#exactTarget = toRatio(target);
    this.target = ratioToNumber(this.#exactTarget);
    if (tolerancePercent === null) {
      this.#exactLow = null;
      this.#exactHigh = null;
      this.low = 0;
      this.high = Infinity;
      return;
    }
    const { numerator: p, denominator: q } = toRatio(tolerancePercent);
    this.#exactLow = multiply(this.#exactTarget, ratio(100n * q - p, 100n * q));
    this.#exactHigh = multiply(this.#exactTarget, ratio(100n * q + p, 100n * q));
    this.low = ratioToNumber(this.#exactLow);
    this.high = ratioToNumber(this.#exactHigh);
  }

  /** Whether n/d lies inside, limits included; n and d are safe integers above 0. */
  contains(n: number, d: number): boolean {
    const value = n / d;
    if (this.#exactLow === null || this.#exactHigh === null) return true;
    if (value > this.low * (1 + NOISE) && value < this.high * (1 - NOISE)) return true;
    if (value < this.low * (1 - NOISE) || value > this.high * (1 + NOISE)) return false;
    return compareFraction(n, d, this.#exactLow) >= 0 && compareFraction(n, d, this.#exactHigh) <= 0;
  }

  /** |n/d ÷ target − 1| as a float. */
  error(n: number, d: number): number {
    return Math.abs(n / d / this.target - 1);
  }

  /** Which of two ratios lies nearer to the target: below 0 for the first, 0 when exactly equal. */
  compareErrors(n1: number, d1: number, n2: number, d2: number): number {
    const first = this.error(n1, d1);
    const second = this.error(n2, d2);
    const apart = first - second;
    if (Math.abs(apart) > NOISE * (1 + first + second)) return apart;
    const cross1 = n1 * d2;
    const cross2 = n2 * d1;
    if (cross1 === cross2 && cross1 <= Number.MAX_SAFE_INTEGER) return 0;
    const difference = this.#deviation(n1, d1) * BigInt(d2) - this.#deviation(n2, d2) * BigInt(d1);
    return difference < 0n ? -1 : difference > 0n ? 1 : 0;
  }

  /** |n/d − target| · d · (target's denominator), a whole number. */
  #deviation(n: number, d: number): bigint {
    const { numerator, denominator } = this.#exactTarget;
    const deviation = BigInt(n) * denominator - BigInt(d) * numerator;
    return deviation < 0n ? -deviation : deviation;
  }
}

/** Sign of n/d − limit, exact. */
export function compareFraction(n: number, d: number, limit: Ratio): number {
  const difference = BigInt(n) * limit.denominator - BigInt(d) * limit.numerator;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}
