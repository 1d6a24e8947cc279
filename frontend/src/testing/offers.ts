import type { Offer, Supplier } from '../api/types';

/** A stored supplier for tests; give what matters to the test. */
export function newSupplier(given: Partial<Supplier> = {}): Supplier {
  return {
    id: '1',
    code: 'S-0001',
    name: 'Sundmark Gear Works',
    standing: 'active',
    currency: 'EUR',
    language: 'en',
    contacts: [],
    address: '',
    freight: { kind: 'included', charge: null, freeFrom: null },
    leastOrderValue: null,
    leadTimeDays: 12,
    note: '',
    offers: { open: 0, expired: 0, oldestPricedOn: null },
    version: 1,
    createdAt: '2026-11-01T08:00:00.000Z',
    updatedAt: '2026-11-02T08:00:00.000Z',
    updatedBy: 'Petra Voss',
    ...given,
  };
}

/** A stored offer of that supplier for part KW-00017. */
export function newOffer(given: Partial<Offer> = {}): Offer {
  return {
    id: '7',
    part: {
      number: 'KW-00017',
      description: 'Spur gear, steel, 28 teeth',
      kind: 'gear',
      standing: 'cleared',
      unit: 'pcs',
    },
    supplier: { code: 'S-0001', name: 'Sundmark Gear Works', standing: 'active' },
    supplierPartNumber: 'M-2031',
    standing: 'open',
    state: 'valid',
    currency: 'EUR',
    per: 1,
    breaks: [
      { quantity: 1, unitPrice: 1240 },
      { quantity: 10, unitPrice: 1110 },
    ],
    pack: 1,
    leastQuantity: 1,
    leadTimeDays: null,
    effectiveLeadTimeDays: 12,
    validFrom: '2026-11-01',
    validUntil: null,
    pricedOn: '2026-11-01',
    ageDays: 30,
    tooOld: false,
    source: '',
    note: '',
    version: 3,
    createdAt: '2026-11-01T08:00:00.000Z',
    updatedAt: '2026-11-02T08:00:00.000Z',
    updatedBy: 'Petra Voss',
    ...given,
  };
}
