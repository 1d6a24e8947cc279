import { describe, expect, it } from 'vitest';
import { type OfferContent } from '../offer-changes.js';
import { changeLines } from './change-lines.js';

const offer: OfferContent = {
  supplierPartNumber: '',
  standing: 'open',
  currency: 'EUR',
  per: 1,
  breaks: [{ quantity: 1, unitPrice: 1250 }],
  pack: 1,
  leastQuantity: 1,
  leadTimeDays: null,
  validFrom: '2026-01-01',
  validUntil: null,
  pricedOn: '2026-01-01',
  source: '',
  note: '',
};

describe('what changes of an offer', () => {
  it.each([
    // ISO 4217 (from memory): yen have no decimals, euros two, dinars of Kuwait three.
    ['JPY', '1,250 JPY from 1'],
    ['EUR', '12.50 EUR from 1'],
    ['KWD', '1.250 KWD from 1'],
  ])('tells prices in %s as people write them, old and new', (currency, old) => {
    const before = { ...offer, currency };
    const after: OfferContent = {
      ...before,
      per: 100,
      breaks: [...before.breaks, { quantity: 10, unitPrice: 5 }],
    };
    const [line, ...others] = changeLines(before, after);
    expect(line?.startsWith(`Price: ${old} → ${old}, `)).toBe(true);
    expect(line?.endsWith('from 10 (for 100)')).toBe(true);
    expect(others).toEqual([]);
  });

  it('tells each other field in a line, and what is empty in words', () => {
    const after = { ...offer, supplierPartNumber: 'A1', leadTimeDays: 9, validUntil: '2026-12-31' };
    expect(changeLines(offer, after)).toEqual([
      'Supplier part number: blank → A1',
      'Lead time: the usual → 9 days',
      'Valid until: until further notice → 2026-12-31',
    ]);
    expect(changeLines(offer, { ...offer })).toEqual([]);
  });
});
