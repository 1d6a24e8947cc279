import { type OfferState } from '@stageyard/libs/bill-of-materials';

/** Closed offers are kept for the record and never chosen. */
export const OFFER_STANDINGS = ['open', 'closed'] as const;
export type OfferStanding = (typeof OFFER_STANDINGS)[number];

/** Whether an offer can be ordered from on a day. */
export const OFFER_STATES = ['valid', 'not-yet', 'expired', 'closed'] as const satisfies OfferState[];

/** Prices are stated for this many: small parts cost less than one minor unit each. */
export const PRICE_PER = [1, 10, 100, 1000] as const;
export type PricePer = (typeof PRICE_PER)[number];

/** What an offer is chosen by among others. */
export const PREFERENCES = ['price', 'arrival'] as const;
export type Preference = (typeof PREFERENCES)[number];

/** Most characters of a supplier's own part number. */
export const SUPPLIER_NUMBER_LENGTH = 80;

/** Most characters of where a price comes from. */
export const SOURCE_LENGTH = 200;
