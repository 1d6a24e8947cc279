import { type OfferCandidate, type OfferTerms } from '../prices/index.js';

/** An offer valid through 2026: 4.20 EUR each, 3.90 from 10, 3.50 from 50. */
export function newOfferTerms(changes: Partial<OfferTerms> = {}): OfferTerms {
  return {
    currency: 'EUR',
    per: 1,
    breaks: [
      { quantity: 1, unitPrice: 420 },
      { quantity: 10, unitPrice: 390 },
      { quantity: 50, unitPrice: 350 },
    ],
    pack: 1,
    leastQuantity: 1,
    leadTimeDays: 14,
    validFrom: '2026-01-01',
    validUntil: '2026-12-31',
    pricedOn: '2026-01-01',
    ...changes,
  };
}

export function newCandidate(id: string, changes: Partial<OfferCandidate> = {}): OfferCandidate {
  return {
    ...newOfferTerms(),
    id,
    supplierName: `Supplier ${id}`,
    standing: 'open',
    supplierStanding: 'active',
    ...changes,
  };
}
