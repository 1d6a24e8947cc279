import { checkOfferTerms, daysBetween, offerState, priceAt } from '@stageyard/libs/bill-of-materials';
import { describe, expect, it } from 'vitest';
import { demoLibrary } from './library.js';
import { type OfferRow, offersOf } from './offers.js';
import { yearOf } from './stock-year.js';

const TODAY = '2026-03-10';
const library = demoLibrary();
const offers = library.flatMap((row, index) => offersOf(row, index, TODAY).map((offer) => ({ row, offer })));

const termsOf = ({
  currency,
  per,
  breaks,
  pack,
  leastQuantity,
  validFrom,
  validUntil,
  pricedOn,
}: OfferRow) => ({
  currency: currency ?? '',
  per: per ?? 1,
  breaks,
  pack: pack ?? 1,
  leastQuantity: leastQuantity ?? 1,
  leadTimeDays: null,
  validFrom: validFrom ?? '',
  validUntil: validUntil ?? null,
  pricedOn: pricedOn ?? '',
});

describe('demo offers', () => {
  it('say nothing that the rules of offers refuse, and cost less each the more is bought', () => {
    for (const { offer } of offers) {
      checkOfferTerms(termsOf(offer));
      const prices = offer.breaks.map(({ unitPrice }) => unitPrice);
      expect(prices).toEqual([...new Set(prices)].sort((a, b) => b - a));
    }
  });

  it('have prices that a workshop would believe, for one piece in EUR', () => {
    const each = (kind: string, material?: string) =>
      offers
        .filter(({ row, offer }) => row.kind === kind && offer.currency === 'EUR')
        .filter(({ row }) => material === undefined || row.material === material)
        .map(({ offer }) => (offer.breaks[0]?.unitPrice ?? 0) / 100 / (offer.per ?? 1))
        .sort((a, b) => a - b);
    // Common sense, no source: what such parts cost in 2020s Europe, to an order of magnitude.
    const usual = (prices: number[]) => [
      prices[Math.floor(prices.length * 0.05)],
      prices[Math.floor(prices.length * 0.9)],
    ];
    const between = (prices: number[], least: number, most: number) => {
      const [low = 0, high = 0] = usual(prices);
      expect(prices.length).toBeGreaterThan(10);
      expect(low).toBeGreaterThanOrEqual(least);
      expect(high).toBeLessThanOrEqual(most);
    };
    between(each('gear', 'C45'), 5, 150);
    between(each('gear', 'POM'), 1, 15);
    between(each('bearing'), 2, 40);
    between(each('fastener'), 0.02, 1);
  });

  it('keep their amounts whatever the day, and their days at the same distance from it', () => {
    const other = library.flatMap((row, index) => offersOf(row, index, '2028-02-29'));
    expect(other.map(({ breaks }) => breaks)).toEqual(offers.map(({ offer }) => offer.breaks));
    const ages = (list: OfferRow[], today: string) =>
      list.map((offer) => daysBetween(offer.pricedOn ?? '', today));
    expect(ages(other, '2028-02-29')).toEqual(
      ages(
        offers.map(({ offer }) => offer),
        TODAY,
      ),
    );
    const states = (list: OfferRow[], today: string) =>
      list.map((offer) => offerState(termsOf(offer), today, 'open'));
    expect(states(other, '2028-02-29')).toEqual(
      states(
        offers.map(({ offer }) => offer),
        TODAY,
      ),
    );
  });

  it('show on the demo trains a price too old to order by, none at all, and other currencies', () => {
    const of = (description: string) => offers.filter(({ row }) => row.description === description);
    const [old, ...more] = of('Spur gear, steel, 66 teeth, module 1.5');
    expect(more).toEqual([]);
    expect(daysBetween(old?.offer.pricedOn ?? TODAY, TODAY)).toBeGreaterThan(180);
    expect(old && offerState(termsOf(old.offer), TODAY, 'open')).toBe('valid');
    expect(of('Spur gear, steel, 72 teeth, module 1.5')).toEqual([]);
    const abroad = [
      ...of('Rotary shaft seal 8 × 22 × 7 mm'),
      ...of('Helical gear, hardened steel, 50 teeth, module 1.5, right hand 15°'),
    ];
    expect(abroad.map(({ offer }) => offer.currency)).toEqual(['GBP', 'JPY']);
    const usual = of('Spur gear, steel, 18 teeth, module 1.5').map(({ offer }) => termsOf(offer));
    expect(usual.some((terms) => offerState(terms, TODAY, 'open') === 'valid')).toBe(true);
    expect(usual.every((terms) => priceAt(24, terms).lineTotal.minor > 0)).toBe(true);
  });
});

describe('the demo year', () => {
  it('never takes more from a place than lies there', () => {
    for (const row of library) {
      const there = new Map<string, number>();
      for (const { kind, quantity, place } of yearOf(row).movements) {
        const before = there.get(place) ?? 0;
        const after = kind === 'counted' ? quantity : before + (kind === 'issued' ? -quantity : quantity);
        expect(after).toBeGreaterThanOrEqual(0);
        // Litres are taken by the tenth: the sums of such decimals are not exact in binary.
        there.set(place, Number(after.toFixed(1)));
      }
    }
  });

  it('goes forward in time, from the first count to the last days before today', () => {
    for (const row of library) {
      const days = yearOf(row)
        .movements.filter(({ place }) => place !== 'Rack 9, shelf A')
        .map(({ day }) => day);
      expect(days).toEqual([...days].sort((a, b) => a - b));
      expect(days.every((day) => day >= -364 && day <= -1)).toBe(true);
    }
  });
});
