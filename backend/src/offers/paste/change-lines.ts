import { type OfferContent, offerChange, pricesText } from '../offer-changes.js';

const NAMES: Partial<Record<keyof OfferContent, string>> = {
  supplierPartNumber: 'Supplier part number',
  pack: 'Pack',
  leastQuantity: 'Least quantity',
  leadTimeDays: 'Lead time',
  validFrom: 'Valid from',
  validUntil: 'Valid until',
  pricedOn: 'Priced on',
  source: 'Source',
  note: 'Note',
};

const PRICE_FIELDS: ReadonlySet<string> = new Set(['breaks', 'currency', 'per']);
const LONGEST_SHOWN = 60;

/** What changes of an offer, one line each; prices in one line. */
export function changeLines(before: OfferContent, after: OfferContent): string[] {
  const { fields } = offerChange(before, after);
  const prices = fields.some((field) => PRICE_FIELDS.has(field))
    ? [`Price: ${pricesText(before)} → ${pricesText(after)}`]
    : [];
  const others = fields.flatMap((field) => {
    const name = NAMES[field];
    return name ? [`${name}: ${told(field, before)} → ${told(field, after)}`] : [];
  });
  return [...prices, ...others];
}

function told(field: keyof OfferContent, content: OfferContent): string {
  const value = content[field];
  if (value === null) return field === 'validUntil' ? 'until further notice' : 'the usual';
  if (value === '') return 'blank';
  if (typeof value === 'object') return pricesText(content);
  if (field === 'leadTimeDays') return `${value} days`;
  const text = String(value);
  return text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}…` : text;
}
