import { fromThousandths } from '@stageyard/libs/bill-of-materials';
import { badInput } from '../common/errors.js';
import { isCountable, type PartUnit } from '../parts/part-unit.js';

export { fromThousandths };

/** Most of a part that can lie at one place, in its unit. */
export const MOST_STOCK = 1_000_000;

const THOUSAND = 1000;

/**
 * A quantity as the database keeps it: whole thousandths of the unit, so that sums are exact.
 * @param quantity in the unit, within ±`MOST_STOCK`
 * @param field how the request names it
 * @throws ProblemError 400 for parts of a piece, or more than three decimals
 */
export function toThousandths(quantity: number, unit: PartUnit, field = 'quantity'): number {
  if (isCountable(quantity, unit)) return Math.round(quantity * THOUSAND);
  if (unit === 'pcs') {
    const message = `${field} must be a whole number: this part is counted in pieces.`;
    throw badInput([{ field, value: quantity, message }]);
  }
  const message = `${field} may have at most three decimals: litres are kept to the millilitre.`;
  throw badInput([{ field, value: quantity, limit: 3, message }]);
}

/** As people read it: `3 pcs`, `1.25 l`. */
export function quantityText(thousandths: number, unit: PartUnit): string {
  const figure = fromThousandths(thousandths).toLocaleString('en-GB', { maximumFractionDigits: 3 });
  return `${figure} ${unit}`;
}
