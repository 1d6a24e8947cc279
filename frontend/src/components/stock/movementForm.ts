import type { MovementInput, MovementKind, StockItem } from '../../api/types';
import { numberOrNull, type NumberLimits } from '../NumberField';

/** What stands in the form, as typed. */
export interface MovementForm {
  number: string;
  kind: MovementKind;
  quantity: string;
  place: string;
  reason: string;
}

export const MOVEMENT_FIELDS: readonly (keyof MovementForm)[] = [
  'number',
  'kind',
  'quantity',
  'place',
  'reason',
];

/** As the server checks it; said at the field before anything is sent. */
export function quantityLimits(kind: MovementKind, unit: StockItem['unit'] | undefined): NumberLimits {
  const whole = unit !== 'l';
  if (kind === 'counted') return { min: 0, max: 1_000_000, whole };
  if (kind === 'corrected') return { min: -1_000_000, max: 1_000_000, whole };
  return { min: 0, above: true, max: 1_000_000, whole };
}

/** What lies at the typed place by the books; null when the part never lay there. */
export function levelAt(item: StockItem | undefined, place: string) {
  const wanted = place.trim().replace(/\s+/g, ' ').toLowerCase();
  return item?.places.find((level) => level.place.toLowerCase() === wanted) ?? null;
}

/** The request; a count says what it saw, so that a movement in between is not counted away. */
export function movementOf(
  form: MovementForm,
  item: StockItem | undefined,
  requestKey: string,
): MovementInput {
  const { number, kind, quantity, place, reason } = form;
  const seen =
    kind === 'counted' && item ? { seenMovementId: levelAt(item, place)?.lastMovementId ?? 0 } : {};
  return {
    number: number.trim(),
    kind,
    quantity: numberOrNull(quantity) ?? 0,
    place: place.trim(),
    reason: reason.trim(),
    requestKey,
    ...seen,
  };
}
