import type { Offer } from '../../api/types';
import { formatDay, formatQuantity } from '../figures';
import { amountWords } from '../moneyText';

/** How an offer is written wherever it stands: in lists, on a part's page, at a supplier. */

/** `EUR`, or `EUR per 100` where the prices are for more than one. */
export function priceUnitWords({ currency, per }: Pick<Offer, 'currency' | 'per'>): string {
  return per === 1 ? currency : `${currency} per ${formatQuantity(per)}`;
}

/** `1: 12.40 · 10: 11.10 · 100: 9.85 EUR`: from which quantity which price holds. */
export function breaksWords(offer: Pick<Offer, 'breaks' | 'currency' | 'per'>): string {
  const steps = offer.breaks.map(
    ({ quantity, unitPrice }) => `${formatQuantity(quantity)}: ${amountWords(unitPrice, offer.currency)}`,
  );
  return `${steps.join(' · ')} ${priceUnitWords(offer)}`;
}

/** `250 pcs`, `2.5 l` */
export const quantityWords = (quantity: number, unit: string): string =>
  `${formatQuantity(quantity)} ${unit}`;

/** `today`, `1 day old`, `264 days old` */
export function ageWords(days: number): string {
  if (days === 0) return 'of today';
  return days === 1 ? '1 day old' : `${days} days old`;
}

/** `12 days`, `from stock` for none; `not known`. */
export function leadTimeWords(days: number | null): string {
  if (days === null) return 'not known';
  if (days === 0) return 'same day';
  return days === 1 ? '1 day' : `${days} days`;
}

/** Until when it holds, or from when, in words. */
export function validityWords(offer: Pick<Offer, 'state' | 'validFrom' | 'validUntil'>): string {
  const { state, validFrom, validUntil } = offer;
  if (state === 'not-yet') return `from ${formatDay(validFrom)}`;
  if (state === 'closed') return 'closed';
  if (validUntil === null) return 'until further notice';
  return state === 'expired' ? `ended ${formatDay(validUntil)}` : `until ${formatDay(validUntil)}`;
}
