import { type ExtraLine } from '../bom-edits.js';

/** Why a quantity cannot be in this unit; null when it can. */
export function quantityProblem(quantity: number, unit: ExtraLine['unit']): string | null {
  if (unit === 'pcs') {
    return Number.isInteger(quantity) ? null : `${quantity} is not a whole number. Pieces are counted whole.`;
  }
  const thousandths = quantity * 1000;
  return Math.abs(thousandths - Math.round(thousandths)) < 1e-6
    ? null
    : `${quantity} has more than three decimals. Round it.`;
}
