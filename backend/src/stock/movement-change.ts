import { badInput, conflict, type ProblemError } from '../common/errors.js';
import { unitOf } from '../parts/part-unit.js';
import type { MovementInputDto } from './dto/movement-input.dto.js';
import type { StockItemDto } from './dto/stock-item.dto.js';
import type { LedgerPart } from './ledger-page.js';
import type { MovementKind } from './movement-kinds.js';
import { MOST_STOCK, quantityText, toThousandths } from './thousandths.js';

/** What a movement does to its place; thousandths of the unit. */
export interface MovementChange {
  change: number;
  counted: number | null;
  after: number;
}

/** What a movement asks for, checked by itself; thousandths of the unit. */
export interface AskedMovement {
  kind: MovementKind;
  amount: number;
}

/** Other places that a refusal names. */
const MOST_OTHERS = 5;

/**
 * Checks what can be told without looking at the shelf.
 * @throws ProblemError 400 naming the field
 */
export function askedMovement(part: LedgerPart, input: MovementInputDto): AskedMovement {
  const { kind, quantity, reason } = input;
  const refuse = (field: string, value: unknown, message: string, limit?: number) =>
    badInput([{ field, value, message, ...(limit === undefined ? {} : { limit }) }]);
  const amount = toThousandths(quantity, unitOf(part.kind));
  if ((kind === 'received' || kind === 'issued') && amount <= 0) {
    throw refuse('quantity', quantity, `quantity must be above 0: it is how much was ${kind}.`, 0);
  }
  if (kind === 'counted' && amount < 0) {
    throw refuse('quantity', quantity, 'quantity must be 0 or more: it is what lies there.', 0);
  }
  if (kind === 'corrected' && amount === 0) {
    throw refuse(
      'quantity',
      quantity,
      'quantity must not be 0: it is what the correction adds or takes off.',
    );
  }
  if (kind === 'corrected' && !reason) {
    throw refuse('reason', reason ?? null, 'reason must not be blank: say what the correction mends.');
  }
  return { kind, amount };
}

/** What the movement makes of a place with that much; `canStand` says whether it may. */
export function changeOf({ kind, amount }: AskedMovement, quantity: number): MovementChange {
  if (kind === 'counted') return { change: amount - quantity, counted: amount, after: amount };
  const change = kind === 'issued' ? -amount : amount;
  return { change, counted: null, after: quantity + change };
}

const MOST = MOST_STOCK * 1000;

/** Nothing lies below zero, nor more than a count could state. */
export function canStand({ after }: MovementChange): boolean {
  return after >= 0 && after <= MOST;
}

/** The refusal of a movement that cannot be: says what is there, and where else. */
export function impossible(asked: AskedMovement, place: string, item: StockItemDto): ProblemError {
  const { number, unit } = item;
  const asks = quantityText(Math.abs(asked.amount), unit);
  const there = item.places.find((level) => level.place === place)?.quantity ?? 0;
  const lies = `${there.toLocaleString('en-GB')} ${unit} of ${number} ${there === 1 ? 'lies' : 'lie'} at ${place}`;
  if (asked.amount > 0 && asked.kind !== 'issued') {
    const message =
      `${lies}; with ${asks} more it would be above ${quantityText(MOST, unit)}, the most a place takes. ` +
      'Nothing was booked. Check the quantity.';
    return conflict('too-much-there', message, { current: item });
  }
  const others = item.places
    .filter((level) => level.place !== place && level.quantity > 0)
    .slice(0, MOST_OTHERS)
    .map((level) => `${level.quantity.toLocaleString('en-GB')} ${unit} at ${level.place}`);
  const message =
    `${there === 0 ? '' : 'Only '}${lies}, so ${asks} cannot be ${asked.kind === 'issued' ? 'issued' : 'taken off'}. Nothing was booked. ` +
    (others.length > 0 ? `Elsewhere: ${others.join(', ')}. ` : 'None lies anywhere else. ') +
    'Take less, take it from another place, or count this place first.';
  return conflict('not-enough-there', message, { current: item });
}
