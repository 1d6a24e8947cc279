/** From this quantity on the price holds. */
export interface PriceBreak {
  /** In the part's unit, above 0, at most three decimals. */
  quantity: number;
  /** Whole minor units of the offer's currency, for `per` units of the part. */
  unitPrice: number;
}

/** What decides the price of an offer. Quantities are in the part's unit, at most three decimals. */
export interface OfferTerms {
  /** ISO 4217 */
  currency: string;
  /** Prices are for this many. */
  per: 1 | 10 | 100 | 1000;
  /** At least one, quantities ascending. */
  breaks: readonly PriceBreak[];
  /** Sold in multiples of this. */
  pack: number;
  leastQuantity: number;
  /** Calendar days; null when not known. */
  leadTimeDays: number | null;
  /** ISO 8601 dates; `validUntil` is the last day, null: until further notice. */
  validFrom: string;
  validUntil: string | null;
  pricedOn: string;
}
