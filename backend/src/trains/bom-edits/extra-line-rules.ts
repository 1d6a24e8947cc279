import { isCountable } from '../../parts/part-unit.js';
import { type ExtraLine } from '../bom-edits.js';

/** Why a quantity cannot be in this unit; null when it can. */
export function quantityProblem(quantity: number, unit: ExtraLine['unit']): string | null {
  // Metres, which no part is counted in, go to the millimetre as litres do to the millilitre.
  if (isCountable(quantity, unit === 'pcs' ? 'pcs' : 'l')) return null;
  return unit === 'pcs'
    ? `${quantity} is not a whole number. Pieces are counted whole.`
    : `${quantity} has more than three decimals. Round it.`;
}
