import { describe, expect, it } from 'vitest';
import { InputError, money } from '../../units/index.js';
import { newOfferTerms } from '../testing/offer-builder.js';
import { orderQuantity, priceAt } from './index.js';

describe('the quantity to order', () => {
  it.each([
    // need, pack, least quantity, first break → smallest multiple of the pack that is at least the largest of the rest
    { need: 7, pack: 1, least: 1, first: 1, order: 7, why: '7 = 7 × 1' },
    { need: 7, pack: 5, least: 1, first: 1, order: 10, why: '7 lies between 1 × 5 and 2 × 5' },
    { need: 10, pack: 5, least: 1, first: 1, order: 10, why: '10 = 2 × 5 exactly' },
    { need: 7, pack: 5, least: 12, first: 1, order: 15, why: 'least 12 lies between 2 × 5 and 3 × 5' },
    { need: 7, pack: 5, least: 1, first: 25, order: 25, why: 'no price below 25 = 5 × 5' },
    { need: 7, pack: 4, least: 9, first: 13, order: 16, why: 'largest of 7, 9, 13 is 13; 4 × 4 = 16' },
    {
      need: 0.25,
      pack: 0.5,
      least: 0.001,
      first: 0.001,
      order: 0.5,
      why: 'a quarter litre takes one half-litre can',
    },
    {
      need: 0.1 + 0.2,
      pack: 0.1,
      least: 0.1,
      first: 0.1,
      order: 0.3,
      why: 'three tenths are 3 packs, not 4',
    },
    {
      need: 1.001,
      pack: 1,
      least: 1,
      first: 1,
      order: 2,
      why: 'one thousandth more than a pack takes a second',
    },
  ])('$need in packs of $pack, least $least, priced from $first: $order ($why)', (example) => {
    const { need, pack, least, first, order } = example;
    const breaks = [{ quantity: first, unitPrice: 100 }];
    expect(orderQuantity(need, { breaks, pack, leastQuantity: least })).toBe(order);
  });
});

describe('the price of a need', () => {
  it('takes the break that the order reaches, packs and least quantity included', () => {
    // Need 7, least quantity 10, packs of 5: order 10. Break from 10: 3.90. 10 × 3.90 = 39.00; 10 − 7 = 3 left over.
    // The break from 50 would cost 50 × 3.50 = 175.00: more than 39.00, so no word about it.
    expect(priceAt(7, newOfferTerms({ pack: 5, leastQuantity: 10 }))).toEqual({
      needed: 7,
      orderQuantity: 10,
      surplus: 3,
      unitPrice: 390,
      per: 1,
      breakQuantity: 10,
      lineTotal: money(3900, 'EUR'),
      cheaperAt: null,
    });
  });

  it('stays on the lower break one piece below the next', () => {
    // 9 × 4.20 = 37.80, and 10 × 3.90 = 39.00 is no cheaper.
    expect(priceAt(9, newOfferTerms())).toMatchObject({ unitPrice: 420, lineTotal: money(3780, 'EUR') });
    expect(priceAt(9, newOfferTerms()).cheaperAt).toBeNull();
  });

  it('says where ordering more costs less', () => {
    // Need 43 in packs of 5: order 45 at 3.90 = 175.50. 50 at 3.50 = 175.00, which is 0.50 less for 5 more.
    const price = priceAt(43, newOfferTerms({ pack: 5 }));
    expect(price).toMatchObject({ orderQuantity: 45, surplus: 2, lineTotal: money(17_550, 'EUR') });
    expect(price.cheaperAt).toEqual({
      orderQuantity: 50,
      lineTotal: money(17_500, 'EUR'),
      saves: money(50, 'EUR'),
    });
  });

  it('names no larger order that costs the same', () => {
    // 35 × 3.00 = 105.00 and 42 × 2.50 = 105.00.
    const breaks = [
      { quantity: 1, unitPrice: 300 },
      { quantity: 42, unitPrice: 250 },
    ];
    expect(priceAt(35, newOfferTerms({ breaks })).cheaperAt).toBeNull();
  });

  it('orders whole packs to reach the larger break', () => {
    // Packs of 12: the break from 50 is reached with 5 packs = 60. 48 × 9.00 = 432.00; 60 × 7.00 = 420.00, 12.00 less.
    const breaks = [
      { quantity: 1, unitPrice: 900 },
      { quantity: 50, unitPrice: 700 },
    ];
    const { orderQuantity: order, cheaperAt } = priceAt(48, newOfferTerms({ breaks, pack: 12 }));
    expect(order).toBe(48);
    expect(cheaperAt).toEqual({
      orderQuantity: 60,
      lineTotal: money(42_000, 'EUR'),
      saves: money(1200, 'EUR'),
    });
  });

  it.each([
    // order × unit price ÷ per, in minor units
    {
      need: 130,
      per: 100 as const,
      pack: 100,
      unitPrice: 385,
      currency: 'EUR',
      total: 770,
      why: '200 × 385 ÷ 100 = 770',
    },
    {
      need: 50,
      per: 1000 as const,
      pack: 50,
      unitPrice: 333,
      currency: 'EUR',
      total: 17,
      why: '50 × 333 ÷ 1000 = 16.65, up',
    },
    {
      need: 50,
      per: 1000 as const,
      pack: 50,
      unitPrice: 330,
      currency: 'EUR',
      total: 17,
      why: '16.5: half goes away from 0',
    },
    { need: 50, per: 1000 as const, pack: 50, unitPrice: 328, currency: 'EUR', total: 16, why: '16.4, down' },
    {
      need: 0.5,
      per: 1 as const,
      pack: 0.5,
      unitPrice: 899,
      currency: 'EUR',
      total: 450,
      why: '0.5 × 8.99 = 4.495, up',
    },
    {
      need: 12,
      per: 1 as const,
      pack: 1,
      unitPrice: 1250,
      currency: 'JPY',
      total: 15_000,
      why: '12 × 1,250 JPY, no decimals',
    },
    {
      need: 3,
      per: 1 as const,
      pack: 1,
      unitPrice: 1275,
      currency: 'KWD',
      total: 3825,
      why: '3 × 1.275 KWD = 3.825 KWD',
    },
    {
      need: 3,
      per: 10 as const,
      pack: 3,
      unitPrice: 1275,
      currency: 'KWD',
      total: 383,
      why: '382.5 fils: half goes up',
    },
  ])(
    '$need at $unitPrice per $per $currency: $total ($why)',
    ({ need, per, pack, unitPrice, currency, total }) => {
      const breaks = [{ quantity: 0.5, unitPrice }];
      const price = priceAt(need, newOfferTerms({ per, pack, currency, breaks, leastQuantity: 0.5 }));
      expect(price.lineTotal).toEqual(money(total, currency));
    },
  );

  it.each([
    ['no need', 0],
    ['a need below 0', -1],
    ['a need that is no number', Number.NaN],
    ['an endless need', Number.POSITIVE_INFINITY],
    ['a need beyond 1,000,000,000', 1_000_000_001],
    ['a need finer than a thousandth', 0.0005],
  ])('refuses %s', (_name, need) => {
    expect(() => priceAt(need, newOfferTerms())).toThrow(InputError);
    expect(() => orderQuantity(need, newOfferTerms())).toThrow(InputError);
  });

  it('refuses terms without a price and a total out of range', () => {
    expect(() => priceAt(1, newOfferTerms({ breaks: [] }))).toThrow(/no price/);
    expect(() => priceAt(1, newOfferTerms({ pack: 0 }))).toThrow(/pack/);
    // 1e9 pieces × 1e9 minor units = 1e18, above 2^53 ≈ 9.007e15.
    const breaks = [{ quantity: 1, unitPrice: 1_000_000_000 }];
    expect(() => priceAt(1_000_000_000, newOfferTerms({ breaks }))).toThrow(InputError);
  });
});
