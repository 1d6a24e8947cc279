import { fieldError } from '../../units/index.js';

/** The largest quantity that is reckoned with, in the part's unit. */
export const MOST_QUANTITY = 1_000_000_000;

/** What binary fractions may add to a product such as 3 × 0.1, in thousandths. */
const NOISE = 1e-4;

/** Whether a figure as it was typed, up to 1,000,000,000, has at most three decimals: those are the nearest doubles. */
export function isInThousandths(quantity: number): boolean {
  return Math.round(quantity * 1000) / 1000 === quantity;
}

/**
 * A quantity as a whole number of thousandths, so that sums and multiples are exact.
 * @param quantity in the part's unit, from 0 to 1,000,000,000, at most three decimals
 * @param field path named in the refusal
 * @throws InputError for a quantity that is no finite number, out of range or finer than a thousandth
 */
export function toThousandths(quantity: number, field = 'quantity'): number {
  if (!(quantity >= 0 && quantity <= MOST_QUANTITY)) {
    const message = `A quantity must be a number from 0 to ${MOST_QUANTITY.toLocaleString('en-GB')}.`;
    throw fieldError(field, String(quantity), message, MOST_QUANTITY);
  }
  const thousandths = Math.round(quantity * 1000);
  if (Math.abs(quantity * 1000 - thousandths) > NOISE + quantity * Number.EPSILON * 2000) {
    const message = `A quantity has at most three decimals; ${quantity} has more. Round it first.`;
    throw fieldError(field, quantity, message, 0.001);
  }
  return thousandths;
}

/** The quantity that a whole number of thousandths stands for, as the nearest double: 1500 is 1.5. */
export function fromThousandths(thousandths: number): number {
  return thousandths / 1000;
}
