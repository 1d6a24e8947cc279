import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addMoney, CURRENCY_CODES, currencyDecimals, formatMoney, parseMoney } from '../../units/index.js';
import { newOfferTerms } from '../testing/offer-builder.js';
import { priceAt, type PriceTerms } from './index.js';

const currencyOf = (decimals: 0 | 2 | 3) =>
  fc.constantFrom(...CURRENCY_CODES.filter((code) => currencyDecimals(code) === decimals));

/** Quantities are drawn in whole thousandths, so that the test itself never rounds. */
const thousandths = fc.oneof(
  fc.integer({ min: 1, max: 2_000_000 }),
  fc.integer({ min: 1, max: 2000 }).map((pieces) => pieces * 1000),
);

interface Drawn {
  terms: PriceTerms;
  need: number;
  pack: number;
  least: number;
  starts: number[];
}

const drawn = (decimals: 0 | 2 | 3): fc.Arbitrary<Drawn> =>
  fc
    .record({
      currency: currencyOf(decimals),
      per: fc.constantFrom(1 as const, 10 as const, 100 as const, 1000 as const),
      starts: fc.uniqueArray(thousandths, { minLength: 1, maxLength: 6 }),
      prices: fc.array(fc.integer({ min: 1, max: 1_000_000 }), { minLength: 6, maxLength: 6 }),
      pack: thousandths,
      least: thousandths,
      need: thousandths,
    })
    .map(({ currency, per, starts, prices, pack, least, need }) => {
      const ascending = starts.sort((a, b) => a - b);
      const breaks = ascending.map((start, index) => ({
        quantity: start / 1000,
        unitPrice: prices[index] ?? 1,
      }));
      const terms = newOfferTerms({ currency, per, breaks, pack: pack / 1000, leastQuantity: least / 1000 });
      return { terms, need, pack, least, starts: ascending };
    });

/** order × price ÷ per in minor units, as an exact fraction. */
function exactTotal(order: number, { terms, starts }: Drawn): { numerator: bigint; denominator: bigint } {
  const index = Math.max(0, starts.filter((start) => start <= order).length - 1);
  const price = terms.breaks[index]?.unitPrice ?? 0;
  return { numerator: BigInt(order) * BigInt(price), denominator: 1000n * BigInt(terms.per) };
}

/** `minor` is the whole number nearest to the fraction, and the upper one of two that are as near. */
function isRoundedHalfUp(minor: number, { numerator, denominator }: ReturnType<typeof exactTotal>): boolean {
  const twiceOff = 2n * (BigInt(minor) * denominator - numerator);
  return twiceOff > -denominator && twiceOff <= denominator;
}

describe.each([0, 2, 3] as const)('money in currencies with %s decimals never floats', (decimals) => {
  it('a line total is the exact product, rounded once, half away from zero', () => {
    fc.assert(
      fc.property(drawn(decimals), (example) => {
        const price = priceAt(example.need / 1000, example.terms);
        expect(Number.isSafeInteger(price.lineTotal.minor)).toBe(true);
        const order = Math.round(price.orderQuantity * 1000);
        expect(isRoundedHalfUp(price.lineTotal.minor, exactTotal(order, example))).toBe(true);
      }),
    );
  });

  it('an order is whole packs, covers the need and is the least that does', () => {
    fc.assert(
      fc.property(drawn(decimals), ({ terms, need, pack, least, starts }) => {
        const price = priceAt(need / 1000, terms);
        const order = Math.round(price.orderQuantity * 1000);
        const must = Math.max(need, least, starts[0] ?? 0);
        expect(order % pack).toBe(0);
        expect(order).toBeGreaterThanOrEqual(must);
        expect(order - pack).toBeLessThan(must);
        expect(Math.round(price.surplus * 1000)).toBe(order - need);
      }),
    );
  });

  it('a cheaper order is larger, truly cheaper, and the cheapest of all whole packs', () => {
    const few = drawn(decimals).filter(({ pack, starts }) => (starts.at(-1) ?? 0) / pack < 300);
    fc.assert(
      fc.property(few, (example) => {
        const { terms, need, pack, starts } = example;
        const price = priceAt(need / 1000, terms);
        const order = Math.round(price.orderQuantity * 1000);
        const totals: number[] = [];
        for (let larger = order + pack; larger < (starts.at(-1) ?? 0) + pack; larger += pack) {
          totals.push(priceAt(larger / 1000, { ...terms, leastQuantity: 0.001 }).lineTotal.minor);
        }
        const cheapest = Math.min(price.lineTotal.minor, ...totals);
        expect((price.cheaperAt?.lineTotal ?? price.lineTotal).minor).toBe(cheapest);
        if (price.cheaperAt === null) return;
        expect(price.cheaperAt.orderQuantity).toBeGreaterThan(price.orderQuantity);
        expect(price.cheaperAt.saves.minor).toBe(price.lineTotal.minor - cheapest);
        expect(price.cheaperAt.saves.minor).toBeGreaterThan(0);
      }),
    );
  });

  it('a total of lines is the sum of whole minor units, and reads back as written', () => {
    const lines = fc.array(drawn(decimals), { minLength: 1, maxLength: 20 });
    fc.assert(
      fc.property(currencyOf(decimals), lines, (currency, examples) => {
        const totals = examples.map(
          ({ terms, need }) => priceAt(need / 1000, { ...terms, currency }).lineTotal,
        );
        const [first, ...others] = totals;
        if (!first) throw new Error('at least one line is drawn');
        const sum = addMoney(first, ...others);
        expect(BigInt(sum.minor)).toBe(totals.reduce((all, { minor }) => all + BigInt(minor), 0n));
        const shown = formatMoney(sum);
        expect(parseMoney(shown)).toEqual(sum);
        expect(/\.(\d+) /.exec(shown)?.[1]?.length ?? 0).toBe(decimals);
      }),
    );
  });
});
