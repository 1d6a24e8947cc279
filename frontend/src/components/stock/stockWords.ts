import type { Movement, MovementKind, StockItem } from '../../api/types';
import { formatQuantity, formatSigned, NOTHING } from '../figures';

export const MOVEMENT_KINDS: readonly MovementKind[] = ['received', 'issued', 'counted', 'corrected'];

/** The act, as a button says it. */
export const ACT_NAMES: Record<MovementKind, string> = {
  received: 'Receive',
  issued: 'Issue',
  counted: 'Count',
  corrected: 'Correct',
};

/** A quantity without its unit: `1,250`, `0.5`; `–` for null. */
export const figureWords = (quantity: number | null): string => formatQuantity(quantity);

/** `12 pcs`, `1.25 l`; thousands parted. */
export function quantityWords(quantity: number, unit: string): string {
  return `${figureWords(quantity)} ${unit}`;
}

/** `+3`, `−2`, `±0` for a count that found what was expected. */
export function changeWords(change: number): string {
  return change === 0 ? '±0' : formatSigned(change, decimalsOf(change));
}

/** What one movement did, for a notice: "KW-00417: 3 pcs issued at Rack B 3; 9 pcs are there now." */
export function bookedWords({ number, kind, change, counted, after, unit, place }: Movement): string {
  const amount = quantityWords(Math.abs(kind === 'counted' ? (counted ?? 0) : change), unit);
  const act = kind === 'corrected' ? (change > 0 ? 'added' : 'taken off') : kind;
  const now = kind === 'counted' ? '' : `; ${quantityWords(after, unit)} there now`;
  return `${number}: ${amount} ${act} at ${place}${now}.`;
}

/** How much is missing to the least stock, with its unit; `–` when the part is not watched or has enough. */
export function shortWords({ low, leastStock, quantity, unit }: StockItem): string {
  if (!low || leastStock === null) return NOTHING;
  return quantityWords(leastStock - quantity, unit);
}

/** `Rack A: 12, Rack B: 3`; places with none left only where there is no other: that is where it belongs. */
export function placesWords({ places }: StockItem): string {
  const filled = places.filter(({ quantity }) => quantity > 0);
  const words = (filled.length > 0 ? filled : places).map(
    ({ place, quantity }) => `${place}: ${figureWords(quantity)}`,
  );
  return words.length > 0 ? words.join(', ') : NOTHING;
}

function decimalsOf(figure: number): number {
  return (String(Number(figure.toFixed(3))).split('.')[1] ?? '').length;
}
