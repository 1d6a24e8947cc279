import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { currencyDecimals, money } from '../../units/index.js';
import { neededQuantity, type OfferCandidate, priceNeed, totalsByCurrency } from './index.js';

const offer = (id: string, changes: Partial<OfferCandidate> = {}): OfferCandidate => ({
  id,
  supplierName: `Supplier ${id}`,
  standing: 'open',
  supplierStanding: 'active',
  currency: 'EUR',
  per: 1,
  breaks: [
    { quantity: 1, unitPrice: 420 },
    { quantity: 50, unitPrice: 310 },
  ],
  pack: 1,
  leastQuantity: 1,
  leadTimeDays: 10,
  validFrom: '2026-01-01',
  validUntil: null,
  pricedOn: '2026-01-01',
  ...changes,
});
const rules = { on: '2026-06-15', prefer: 'price', currency: 'EUR' } as const;
/** 60 × 3.10 EUR = 186.00 EUR against 60 × 2.90 EUR = 174.00 EUR. */
const dear = offer('1');
const cheap = offer('2', { breaks: [{ quantity: 1, unitPrice: 290 }] });

describe('the price of a need', () => {
  it('is that of the offer which the rule ranks first', () => {
    const priced = priceNeed({ needed: 60, candidates: [dear, cheap], chosenId: null }, rules);
    expect(priced.offer).toMatchObject({ id: '2', price: { lineTotal: money(17_400, 'EUR') } });
    expect(priced).toMatchObject({ chosenBy: 'rule', reason: null, otherOffers: 1, lostChoice: null });
  });

  it('is that of the offer which a person chose, dearer or not', () => {
    const priced = priceNeed({ needed: 60, candidates: [dear, cheap], chosenId: '1' }, rules);
    expect(priced.offer).toMatchObject({ id: '1', price: { lineTotal: money(18_600, 'EUR') } });
    expect(priced).toMatchObject({ chosenBy: 'person', otherOffers: 1, lostChoice: null });
  });

  it.each([
    ['expired', { validUntil: '2026-06-14' }],
    ['not-yet', { validFrom: '2026-06-16' }],
    ['closed', { standing: 'closed' }],
    ['supplier-closed', { supplierStanding: 'closed' }],
  ] as const)('names a choice that is %s, and the rule chooses', (lostChoice, changes) => {
    const candidates = [offer('1', changes), cheap];
    const priced = priceNeed({ needed: 60, candidates, chosenId: '1' }, rules);
    expect(priced).toMatchObject({ lostChoice, chosenBy: 'rule', otherOffers: 0 });
    expect(priced.offer?.id).toBe('2');
  });

  it('names a choice that is gone, also where there is nothing else', () => {
    expect(priceNeed({ needed: 1, candidates: [cheap], chosenId: '9' }, rules).lostChoice).toBe('gone');
    expect(priceNeed({ needed: 1, candidates: [], chosenId: '9' }, rules)).toEqual({
      offer: null,
      chosenBy: null,
      reason: 'no-offers',
      otherOffers: 0,
      lostChoice: 'gone',
    });
  });

  it('is none where every offer has run out, and says so', () => {
    const candidates = [offer('1', { validUntil: '2026-06-14' })];
    expect(priceNeed({ needed: 1, candidates, chosenId: null }, rules)).toMatchObject({
      offer: null,
      chosenBy: null,
      reason: 'none-valid',
    });
  });
});

describe('what so many builds need', () => {
  it('is exact to a thousandth: 0.1 l in three builds is 0.3 l', () => {
    expect(neededQuantity(0.1, 3)).toBe(0.3);
    expect(neededQuantity(0.007, 1100)).toBe(7.7);
    expect(neededQuantity(4, 25)).toBe(100);
  });

  it('is not reckoned beyond 1,000,000,000', () => {
    expect(neededQuantity(10_000, 100_000)).toBe(1_000_000_000);
    expect(neededQuantity(10_001, 100_000)).toBeNull();
  });
});

describe('totals by currency', () => {
  it('stand side by side, the house currency first and the others by code', () => {
    // EUR 12.50 + 0.05 = 12.55; JPY 980; KWD 1.005 + 0.250 = 1.255
    const amounts = [
      money(980, 'JPY'),
      money(1250, 'EUR'),
      money(1005, 'KWD'),
      money(5, 'EUR'),
      money(250, 'KWD'),
    ];
    expect(totalsByCurrency(amounts, 'EUR')).toEqual([
      { total: { minor: 1255, currency: 'EUR' }, amounts: 2 },
      { total: { minor: 980, currency: 'JPY' }, amounts: 1 },
      { total: { minor: 1255, currency: 'KWD' }, amounts: 2 },
    ]);
    expect(totalsByCurrency([], 'EUR')).toEqual([]);
  });

  it('are whole minor units in every currency, and nothing is lost', () => {
    // Currencies with 0, 2 and 3 decimals by ISO 4217.
    const amount = fc
      .tuple(fc.integer({ min: 1, max: 2 ** 40 }), fc.constantFrom('JPY', 'EUR', 'USD', 'KWD'))
      .map(([minor, currency]) => money(minor, currency));
    fc.assert(
      fc.property(fc.array(amount, { maxLength: 50 }), (amounts) => {
        const totals = totalsByCurrency(amounts, 'EUR');
        const sum = (list: readonly { minor: number }[]) =>
          list.reduce((total, { minor }) => total + BigInt(minor), 0n);
        for (const { total, amounts: count } of totals) {
          const own = amounts.filter(({ currency }) => currency === total.currency);
          expect(Number.isSafeInteger(total.minor)).toBe(true);
          expect(BigInt(total.minor)).toBe(sum(own));
          expect(count).toBe(own.length);
          expect(currencyDecimals(total.currency)).toBeDefined();
        }
        expect(totals.reduce((count, total) => count + total.amounts, 0)).toBe(amounts.length);
      }),
    );
  });
});
