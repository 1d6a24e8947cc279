import { type Money, fieldError, money, multiplyMoney, ratio } from '../../units/index.js';
import { type OfferTerms, type PriceBreak } from './offer-terms.js';
import { fromThousandths, toThousandths } from './thousandths.js';

/** What decides how much must be ordered. */
export type QuantityTerms = Pick<OfferTerms, 'breaks' | 'pack' | 'leastQuantity'>;

/** What decides the price of a quantity. */
export type PriceTerms = QuantityTerms & Pick<OfferTerms, 'currency' | 'per'>;

/** The price of a needed quantity at one offer. Quantities are in the part's unit. */
export interface PricedQuantity {
  needed: number;
  /** What has to be ordered: whole packs, at least the least quantity and the first break. */
  orderQuantity: number;
  /** Ordered beyond the need. */
  surplus: number;
  /** Minor units for `per` units of the part, at the break that the order reaches. */
  unitPrice: number;
  per: OfferTerms['per'];
  /** From this quantity on the price holds. */
  breakQuantity: number;
  /** Order quantity × unit price ÷ per, rounded once, half away from zero. */
  lineTotal: Money;
  /** The cheapest larger order, where one costs less in total than what is needed; null where none does. */
  cheaperAt: { orderQuantity: number; lineTotal: Money; saves: Money } | null;
}

/**
 * The smallest multiple of the pack that covers the need, the least quantity and the first price break.
 * @param needed in the part's unit, above 0, at most 1,000,000,000 and three decimals
 * @throws InputError for a need out of range, or terms without a break or a pack
 */
export function orderQuantity(needed: number, terms: QuantityTerms): number {
  return fromThousandths(ordered(neededThousandths(needed), terms));
}

/**
 * Prices a needed quantity. Exact whole numbers throughout: a price never passes through a floating figure.
 * @param needed in the part's unit, above 0, at most 1,000,000,000 and three decimals
 * @param terms as `checkOfferTerms` accepts them
 * @throws InputError for a need out of range, or a total beyond 9,007,199,254,740,991 minor units
 */
export function priceAt(needed: number, terms: PriceTerms): PricedQuantity {
  const need = neededThousandths(needed);
  const order = ordered(need, terms);
  const { quantity: breakQuantity, unitPrice } = breakAt(order, terms);
  const lineTotal = totalOf(order, terms);
  return {
    needed: fromThousandths(need),
    orderQuantity: fromThousandths(order),
    surplus: fromThousandths(order - need),
    unitPrice,
    per: terms.per,
    breakQuantity,
    lineTotal,
    cheaperAt: cheaperOrder(order, lineTotal, terms),
  };
}

function neededThousandths(needed: number): number {
  const need = toThousandths(needed, 'needed');
  if (need === 0) throw fieldError('needed', needed, 'The quantity needed must be above 0.', 0);
  return need;
}

function ordered(need: number, terms: QuantityTerms): number {
  const least = toThousandths(terms.leastQuantity, 'leastQuantity');
  const first = toThousandths(firstBreak(terms).quantity, 'breaks.0.quantity');
  return wholePacks(Math.max(need, least, first), terms);
}

function wholePacks(quantity: number, { pack }: QuantityTerms): number {
  const size = toThousandths(pack, 'pack');
  if (size === 0) throw fieldError('pack', pack, 'The pack must hold more than 0.', 0);
  return Math.ceil(quantity / size) * size;
}

/** A larger break is worth a look at its first whole pack only: beyond it the total grows again. */
function cheaperOrder(order: number, lineTotal: Money, terms: PriceTerms): PricedQuantity['cheaperAt'] {
  let best: { order: number; lineTotal: Money } | null = null;
  for (const { quantity } of terms.breaks) {
    const larger = wholePacks(toThousandths(quantity), terms);
    if (larger <= order) continue;
    const total = totalOf(larger, terms);
    if (total.minor < (best?.lineTotal ?? lineTotal).minor) best = { order: larger, lineTotal: total };
  }
  if (best === null) return null;
  const saves = money(lineTotal.minor - best.lineTotal.minor, terms.currency);
  return { orderQuantity: fromThousandths(best.order), lineTotal: best.lineTotal, saves };
}

function totalOf(order: number, terms: PriceTerms): Money {
  const { unitPrice } = breakAt(order, terms);
  return multiplyMoney(money(unitPrice, terms.currency), ratio(order, 1000 * terms.per));
}

function breakAt(order: number, terms: QuantityTerms): PriceBreak {
  const reached = terms.breaks.filter(({ quantity }) => toThousandths(quantity) <= order);
  return reached.at(-1) ?? firstBreak(terms);
}

function firstBreak({ breaks }: QuantityTerms): PriceBreak {
  const [first] = breaks;
  if (first === undefined) throw fieldError('breaks', 'none', 'The offer has no price. Give at least one.');
  return first;
}
