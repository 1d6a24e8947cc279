/** Closed offers are kept for the record and never chosen. */
export const OFFER_STANDINGS = ['open', 'closed'] as const;
export type OfferStanding = (typeof OFFER_STANDINGS)[number];

/** Prices are stated for this many: small parts cost less than one minor unit each. */
export const PRICE_PER = [1, 10, 100, 1000] as const;
export type PricePer = (typeof PRICE_PER)[number];
