import { isDeepStrictEqual } from 'node:util';
import { formatMoney, money } from '@stageyard/libs/units';
import { type Offer } from './entities/offer.entity.js';

/** What can change of an offer, in the order in which it is told. */
const FIELDS = [
  'supplierPartNumber',
  'standing',
  'currency',
  'per',
  'breaks',
  'pack',
  'leastQuantity',
  'leadTimeDays',
  'validFrom',
  'validUntil',
  'pricedOn',
  'source',
  'note',
] as const satisfies (keyof Offer)[];

/** The fields of an offer that people state; the rest is kept by the server. */
export type OfferContent = Pick<Offer, (typeof FIELDS)[number]>;

/** What a stored offer states. */
export function storedContent(offer: Offer): OfferContent {
  return Object.fromEntries(FIELDS.map((field) => [field, offer[field]])) as unknown as OfferContent;
}

interface OfferChange {
  /** Names of the fields that differ. */
  fields: (typeof FIELDS)[number][];
  before: Partial<OfferContent>;
  after: Partial<OfferContent>;
}

/** What an edit changed, field by field, for the record of changes. */
export function offerChange(before: Partial<OfferContent>, after: OfferContent): OfferChange {
  const fields = FIELDS.filter((field) => !isDeepStrictEqual(before[field], after[field]));
  const only = (offer: Partial<OfferContent>): Partial<OfferContent> =>
    Object.fromEntries(fields.map((field) => [field, offer[field]]));
  return { fields, before: only(before), after: only(after) };
}

/** The prices in one line: `12.50 EUR from 1, 11.80 EUR from 10`; `for 100` where they are for more than one. */
export function pricesText({ breaks, currency, per }: Pick<Offer, 'breaks' | 'currency' | 'per'>): string {
  const prices = breaks.map(({ quantity, unitPrice }) => {
    return `${formatMoney(money(unitPrice, currency))} from ${quantity}`;
  });
  return `${prices.join(', ')}${per === 1 ? '' : ` (for ${per})`}`;
}
