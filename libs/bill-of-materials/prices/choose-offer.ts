import { InputError } from '../../units/index.js';
import { type OfferState, offerState } from './offer-state.js';
import { type OfferTerms } from './offer-terms.js';
import { type PricedQuantity, priceAt } from './price.js';

/** An offer as the choice needs it. */
export interface OfferCandidate extends OfferTerms {
  id: string;
  supplierName: string;
  standing: 'open' | 'closed';
  supplierStanding: 'active' | 'closed';
  /** The supplier's usual lead time, calendar days: counts where the offer has none. */
  supplierLeadTimeDays?: number | null;
}

export type PricedOffer<T extends OfferCandidate = OfferCandidate> = T & {
  state: OfferState;
  /** Null when the total is too large to be reckoned. */
  price: PricedQuantity | null;
  /** Calendar days until it arrives when ordered that day; null when not known. */
  arrivalDays: number | null;
  /** Valid that day, from an active supplier, and priced. */
  competes: boolean;
};

export interface ChoiceRules {
  /** The day, ISO 8601 date. */
  on: string;
  prefer: 'price' | 'arrival';
  /** House currency, ISO 4217: there are no exchange rates, so its offers come before those in other currencies. */
  currency: string;
}

export interface OfferChoice<T extends OfferCandidate = OfferCandidate> {
  chosen: PricedOffer<T> | null;
  /** All candidates: those that compete first, each part ranked. */
  priced: PricedOffer<T>[];
  /** Why nothing is chosen. */
  reason: 'no-offers' | 'none-valid' | null;
}

type Order = (a: PricedOffer, b: PricedOffer) => number;

/**
 * Prices a need at every offer, ranks them and chooses the first that is valid, of an active supplier.
 *
 * By price: the house currency first, then other currencies by their code, within one the lower line total; ties go to
 * the shorter lead time (unknown last), the supplier's name and the id. By arrival: lead time, then the same.
 * @param needed in the part's unit, above 0, at most 1,000,000,000 and three decimals
 * @throws InputError for a need out of range
 */
export function chooseOffer<T extends OfferCandidate>(
  candidates: readonly T[],
  needed: number,
  rules: ChoiceRules,
): OfferChoice<T> {
  const byPrice = priceOrder(rules.currency);
  const orders = rules.prefer === 'arrival' ? [byArrival, ...byPrice] : byPrice;
  const priced = candidates.map((candidate) => pricedOffer(candidate, needed, rules.on));
  priced.sort((a, b) => orders.reduce((result, order) => result || order(a, b), byCompeting(a, b)));
  const [first] = priced;
  if (first === undefined) return { chosen: null, priced, reason: 'no-offers' };
  return first.competes
    ? { chosen: first, priced, reason: null }
    : { chosen: null, priced, reason: 'none-valid' };
}

function pricedOffer<T extends OfferCandidate>(candidate: T, needed: number, on: string): PricedOffer<T> {
  const state = offerState(candidate, on, candidate.standing);
  const price = priceWithin(candidate, needed);
  return {
    ...candidate,
    state,
    price,
    arrivalDays: candidate.leadTimeDays ?? candidate.supplierLeadTimeDays ?? null,
    competes: price !== null && state === 'valid' && candidate.supplierStanding === 'active',
  };
}

/** One price beyond every measure must not keep the others from being shown. */
function priceWithin(candidate: OfferCandidate, needed: number): PricedQuantity | null {
  try {
    return priceAt(needed, candidate);
  } catch (error) {
    const needIsWrong = error instanceof InputError && error.errors.some(({ field }) => field === 'needed');
    if (needIsWrong || !(error instanceof InputError)) throw error;
    return null;
  }
}

const byCompeting: Order = (a, b) => Number(b.competes) - Number(a.competes);

const byArrival: Order = (a, b) => compareKnown(a.arrivalDays, b.arrivalDays);

function priceOrder(houseCurrency: string): Order[] {
  return [
    (a, b) => Number(b.currency === houseCurrency) - Number(a.currency === houseCurrency),
    (a, b) => compareText(a.currency, b.currency),
    (a, b) => compareKnown(a.price?.lineTotal.minor ?? null, b.price?.lineTotal.minor ?? null),
    byArrival,
    (a, b) => compareText(a.supplierName, b.supplierName),
    (a, b) => a.id.length - b.id.length || compareText(a.id, b.id),
  ];
}

/** Lower first, unknown last. */
function compareKnown(a: number | null, b: number | null): number {
  if (a === null || b === null) return Number(a === null) - Number(b === null);
  return a - b;
}

function compareText(a: string, b: string): number {
  return a < b ? -1 : Number(a > b);
}
