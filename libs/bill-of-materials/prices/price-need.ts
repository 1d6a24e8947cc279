import { addMoney, type Money } from '../../units/index.js';
import { type ChoiceRules, chooseOffer, type OfferCandidate, type PricedOffer } from './choose-offer.js';
import { fromThousandths, toThousandths } from './thousandths.js';

/** Something to buy: how much of it, who offers it, and what a person decided. */
export interface Need<T extends OfferCandidate = OfferCandidate> {
  /** In the part's unit, above 0, at most 1,000,000,000 and three decimals. */
  needed: number;
  /** Every offer known for the part, those that cannot be used too. */
  candidates: readonly T[];
  /** The offer that a person chose; null: the rule chooses. */
  chosenId: string | null;
}

export interface PricedNeed<T extends OfferCandidate = OfferCandidate> {
  /** What to order from, with its price; null when nothing can be. */
  offer: PricedOffer<T> | null;
  chosenBy: 'rule' | 'person' | null;
  /** Why there is no price. */
  reason: 'no-offers' | 'none-valid' | null;
  /** Further offers that could be used instead. */
  otherOffers: number;
  /** What became of a person's choice that cannot be used; null where it is used, or none was made. */
  lostChoice: 'gone' | 'closed' | 'expired' | 'not-yet' | 'supplier-closed' | 'not-priced' | null;
}

/**
 * Prices a need at the offer a person chose or, without a usable choice, at the one that the rule ranks first. A choice
 * that cannot be used is named and never used silently.
 * @throws InputError for a need out of range
 */
export function priceNeed<T extends OfferCandidate>(
  { needed, candidates, chosenId }: Need<T>,
  rules: ChoiceRules,
): PricedNeed<T> {
  const { chosen, priced, reason } = chooseOffer(candidates, needed, rules);
  const usable = priced.filter(({ competes }) => competes);
  const wanted = chosenId === null ? undefined : priced.find(({ id }) => id === chosenId);
  const byPerson = wanted?.competes ? wanted : null;
  const offer = byPerson ?? chosen;
  return {
    offer,
    chosenBy: byPerson ? 'person' : offer && 'rule',
    reason,
    otherOffers: usable.length - (offer ? 1 : 0),
    lostChoice: chosenId === null || byPerson ? null : lostBecause(wanted),
  };
}

function lostBecause(wanted: PricedOffer | undefined): PricedNeed['lostChoice'] {
  if (!wanted) return 'gone';
  if (wanted.state !== 'valid') return wanted.state;
  return wanted.supplierStanding === 'closed' ? 'supplier-closed' : 'not-priced';
}

/**
 * What so many builds need of a line: exact to a thousandth.
 * @param each quantity of one build, at most three decimals
 * @param builds whole
 * @returns null where the product is beyond 1,000,000,000
 */
export function neededQuantity(each: number, builds: number): number | null {
  const product = toThousandths(each) * builds;
  return product > toThousandths(1_000_000_000) ? null : fromThousandths(product);
}

/** The sum of the amounts of one currency, and how many they are. */
export interface CurrencyTotal {
  total: Money;
  amounts: number;
}

/**
 * Totals by currency, the house currency first and the others by their code. There are no exchange rates: currencies
 * are never added to each other.
 * @throws InputError when a sum is beyond 9,007,199,254,740,991 minor units
 */
export function totalsByCurrency(amounts: readonly Money[], houseCurrency: string): CurrencyTotal[] {
  const totals = new Map<string, CurrencyTotal>();
  for (const amount of amounts) {
    const before = totals.get(amount.currency);
    totals.set(
      amount.currency,
      before
        ? { total: addMoney(before.total, amount), amounts: before.amounts + 1 }
        : { total: amount, amounts: 1 },
    );
  }
  const rank = (currency: string) => (currency === houseCurrency ? '' : currency);
  return [...totals.values()].sort((a, b) => {
    const [first, second] = [rank(a.total.currency), rank(b.total.currency)];
    return first < second ? -1 : Number(first > second);
  });
}
