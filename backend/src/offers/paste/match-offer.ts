import { type Offer } from '../entities/offer.entity.js';
import { type StatedOffer } from './group-rows.js';
import { type PastedPart, type PasteGround } from './paste-ground.js';

/** The offer that pasted rows are about. */
interface OfferMatch {
  /** It changes; null: a new one is added. */
  before: Offer | null;
  /** It stays beside a new one that starts later. */
  beside: Offer | null;
  problem: string | null;
}

/**
 * Finds the open offer of the supplier for the part that the rows change: the one under the same number of the supplier,
 * else one without a number, or the only one where the rows name none. Offers that have ended stay as they were. Rows that
 * start on a later day than an offer that holds today are a new offer: the present price goes on until then.
 */
export function matchOffer(
  { rows, terms }: StatedOffer,
  part: PastedPart,
  { offers, supplier, today }: PasteGround,
  defaultStart: string | undefined,
): OfferMatch {
  const own = rows[0]?.supplierPartNumber.toLowerCase() ?? '';
  const open = offers.get(part.id) ?? [];
  const sameNumber = open.filter(({ supplierPartNumber }) => supplierPartNumber.toLowerCase() === own);
  const others = own === '' ? open : open.filter(({ supplierPartNumber }) => supplierPartNumber === '');
  const pool = sameNumber.length > 0 ? sameNumber : others;
  const start = terms.validFrom ?? defaultStart;
  const [found] = pool;
  if (!found) return { before: null, beside: null, problem: null };
  const starting = pool.filter(({ validFrom }) => validFrom === start);
  const [exact] = starting;
  if (exact && starting.length === 1) return { before: exact, beside: null, problem: null };
  if (start !== undefined && start > today && pool.every(({ validFrom }) => validFrom <= today)) {
    return { before: null, beside: found, problem: null };
  }
  if (pool.length === 1) return { before: found, beside: null, problem: null };
  // A price without a day is the present one.
  const present = pool.filter(({ validFrom }) => validFrom <= today);
  const [only] = present;
  if (start === undefined && only && present.length === 1)
    return { before: only, beside: null, problem: null };
  const ids = pool.map(({ id }) => id).join(', ');
  const problem = `${supplier.code} has ${pool.length} open offers for ${part.number} (${ids}). Give the supplier part number and the day from which the one you mean is valid, or close the others.`;
  return { before: null, beside: null, problem };
}
