import { type PriceBreak } from '@stageyard/libs/bill-of-materials';
import { type OfferColumn } from './paste-columns.js';
import { type StatedRow, type StatedTerms } from './read-row.js';

/** The rows of one offer: the same part, under the same number of the supplier. */
export interface StatedOffer {
  rows: StatedRow[];
  breaks: (PriceBreak & { row: StatedRow })[];
  terms: StatedTerms;
}

const TERMS: readonly (keyof StatedTerms & OfferColumn)[] = [
  'per',
  'pack',
  'leastQuantity',
  'leadTimeDays',
  'validFrom',
  'validUntil',
  'pricedOn',
  'source',
  'note',
];

/** Puts rows that belong to one offer together, in the order of their first rows. Rows that contradict say so. */
export function groupRows(rows: readonly StatedRow[]): StatedOffer[] {
  const offers = new Map<string, StatedOffer>();
  for (const row of rows) {
    const key = JSON.stringify([row.partNumber.toLowerCase(), row.supplierPartNumber.toLowerCase()]);
    const known = row.partNumber === '' && row.supplierPartNumber === '' ? undefined : offers.get(key);
    const breaks = row.breaks.map((price) => ({ ...price, row }));
    if (!known) {
      // Rows that name no part are wrong one by one.
      const own = row.partNumber === '' && row.supplierPartNumber === '' ? `${key}${row.reader.row}` : key;
      offers.set(own, { rows: [row], breaks, terms: { ...row.terms } });
      continue;
    }
    agree(known, row);
    known.rows.push(row);
    known.breaks.push(...breaks);
  }
  return [...offers.values()];
}

function agree({ rows: [first], terms }: StatedOffer, row: StatedRow): void {
  if (!first) return;
  const place = `row ${first.reader.row}`;
  if (row.currency !== first.currency) {
    const message = `The prices of one offer are in one currency: ${place} has ${first.currency}, this row has ${row.currency}.`;
    row.reader.wrong('currency', message);
  }
  for (const key of TERMS) {
    const [known, own] = [terms[key], row.terms[key]];
    if (own === null) continue;
    if (known === null) Object.assign(terms, { [key]: own });
    else if (known !== own) {
      row.reader.wrong(
        key,
        `It differs from the rows above of the same offer, first in ${place}. Make them agree.`,
      );
    }
  }
}
