import type { OptionSupply } from '../api/types';
import { amountWords, moneyWords } from './moneyText';

/** Cost and stock of an option in words. Currencies are never added: there are no exchange rates here. */

/** `1,234.50 EUR`, the first of its currencies; null where nothing is priced. */
export function firstCostWords({ costs }: Pick<OptionSupply, 'costs'>): string | null {
  const [first] = costs;
  return first ? moneyWords(first.minor, first.currency) : null;
}

/** Every currency: `1,234.50 EUR and 80.00 USD`; `not priced`. */
export function allCostWords({ costs }: Pick<OptionSupply, 'costs'>): string {
  if (costs.length === 0) return 'not priced';
  return costs.map(({ minor, currency }) => moneyWords(minor, currency)).join(' and ');
}

/** `3 of 4 priced`, so that a part of a sum never reads as the whole; blank where all are in it. */
export function pricedWords({ priced, unpriced }: Pick<OptionSupply, 'priced' | 'unpriced'>): string {
  return unpriced === 0 ? '' : `${priced} of ${priced + unpriced} priced`;
}

/** `4 of 6 on the shelf` */
export function shelfWords({ onShelf, gears }: Pick<OptionSupply, 'onShelf' | 'gears'>): string {
  return `${onShelf === gears && gears > 1 ? 'all' : `${onShelf} of`} ${gears} on the shelf`;
}

/** `1 to make`; blank where the library has a gear for every place. */
export function toMakeWords({ toMake }: Pick<OptionSupply, 'toMake'>): string {
  return toMake === 0 ? '' : `${toMake} to make`;
}

/** The whole of it for a title or a table cell: `1,234.50 EUR and 80.00 USD, 3 of 4 priced`. */
export function costInFull(supply: OptionSupply): string {
  return [allCostWords(supply), supply.priced > 0 ? pricedWords(supply) : ''].filter(Boolean).join(', ');
}

/** `4 of 6 on the shelf, 1 to make` */
export function stockInFull(supply: OptionSupply): string {
  return [shelfWords(supply), toMakeWords(supply)].filter(Boolean).join(', ');
}

/** Currencies over many options, in the order they first stand: the house currency leads where anything is in it. */
export function currenciesOf(supplies: Iterable<Pick<OptionSupply, 'costs'>>): string[] {
  const seen = new Set<string>();
  for (const { costs } of supplies) for (const { currency } of costs) seen.add(currency);
  return [...seen];
}

/** Plain amount in one currency for a spreadsheet: `1234.50`; blank where there is none. */
export function plainCost({ costs }: Pick<OptionSupply, 'costs'>, currency: string): string {
  const found = costs.find((each) => each.currency === currency);
  return found ? amountWords(found.minor, currency).replaceAll(',', '') : '';
}

/**
 * How far a cost can be held against others: 0 complete and in one currency, 1 complete in several, 2 only a part is
 * priced, 3 nothing is. Sums of different ranks are not to be compared.
 */
export function costRank({ costs, unpriced }: Pick<OptionSupply, 'costs' | 'unpriced'>): 0 | 1 | 2 | 3 {
  if (costs.length === 0) return 3;
  if (unpriced > 0) return 2;
  return costs.length === 1 ? 0 : 1;
}
