import { type NewPart } from '../parts/new-part.js';
import { type OfferContent } from '../offers/offer-changes.js';

/** Names every column once: the type complains when one is missing. */
const keysOf = <T>(columns: Record<keyof T, true>) => Object.keys(columns) as (keyof T & string)[];

/** Columns of a part that the load states; id, number and who added it when come with the booking. */
export const PART_COLUMNS = keysOf<NewPart>({
  kind: true,
  description: true,
  standing: true,
  successorNumber: true,
  material: true,
  mass: true,
  supply: true,
  supplier: true,
  note: true,
  attributes: true,
  teeth: true,
  module: true,
  pressureAngleDeg: true,
  helixAngleDeg: true,
  hand: true,
  profileShift: true,
  faceWidth: true,
  bore: true,
  shaftDiameter: true,
  length: true,
  width: true,
  height: true,
  leastStock: true,
  version: true,
});

/** Columns of an offer that the load states. */
export const OFFER_COLUMNS = keysOf<OfferContent>({
  supplierPartNumber: true,
  standing: true,
  currency: true,
  per: true,
  breaks: true,
  pack: true,
  leastQuantity: true,
  leadTimeDays: true,
  validFrom: true,
  validUntil: true,
  pricedOn: true,
  source: true,
  note: true,
});

/** Column names for a statement. */
export function list(columns: readonly string[], table?: string): string {
  return columns.map((column) => (table ? `"${table}"."${column}"` : `"${column}"`)).join(', ');
}
