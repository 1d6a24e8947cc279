import { daysBetween } from './calendar-date.js';
import { type OfferTerms } from './offer-terms.js';

/** Whether an offer can be ordered from on a day. Closed ones never; the others by their first and last day. */
export type OfferState = 'valid' | 'not-yet' | 'expired' | 'closed';

/**
 * State of an offer on a day; its first and its last day both count as valid.
 * @param on ISO 8601 date
 */
export function offerState(
  { validFrom, validUntil }: Pick<OfferTerms, 'validFrom' | 'validUntil'>,
  on: string,
  standing: 'open' | 'closed',
): OfferState {
  if (standing === 'closed') return 'closed';
  // ISO 8601 dates sort as text.
  if (on < validFrom) return 'not-yet';
  return validUntil !== null && on > validUntil ? 'expired' : 'valid';
}

/** Whole calendar days since the supplier stated the price; 0 for a day that is still to come. ISO 8601 dates. */
export function priceAge(pricedOn: string, on: string): number {
  return Math.max(0, daysBetween(pricedOn, on));
}
