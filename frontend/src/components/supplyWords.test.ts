import { describe, expect, it } from 'vitest';
import { newSupply } from '../testing/supply';
import {
  allCostWords,
  costInFull,
  costRank,
  currenciesOf,
  firstCostWords,
  plainCost,
  stockInFull,
} from './supplyWords';

const EUR = { currency: 'EUR', minor: 123450 };
const JPY = { currency: 'JPY', minor: 98000 };
const KWD = { currency: 'KWD', minor: 1250 };

describe('the cost of an option', () => {
  it('is written by currency with its own decimals and never added over currencies', () => {
    const supply = newSupply({ costs: [EUR, JPY, KWD] });
    expect(firstCostWords(supply)).toBe('1,234.50 EUR');
    // ISO 4217: two, no and three decimals.
    expect(allCostWords(supply)).toBe('1,234.50 EUR and 98,000 JPY and 1.250 KWD');
    expect(plainCost(supply, 'JPY')).toBe('98000');
    expect(plainCost(supply, 'KWD')).toBe('1.250');
    expect(plainCost(supply, 'USD')).toBe('');
  });

  it('says when it is only a part of the sum', () => {
    expect(costInFull(newSupply({ costs: [EUR], priced: 3, unpriced: 1 }))).toBe(
      '1,234.50 EUR, 3 of 4 priced',
    );
    expect(costInFull(newSupply({ costs: [EUR], priced: 4, unpriced: 0 }))).toBe('1,234.50 EUR');
    expect(costInFull(newSupply({ costs: [], priced: 0, unpriced: 4 }))).toBe('not priced');
  });

  it('ranks a whole sum before a part of one', () => {
    const ranks = [
      newSupply({ costs: [EUR], unpriced: 0 }),
      newSupply({ costs: [EUR, JPY], unpriced: 0 }),
      newSupply({ costs: [EUR], unpriced: 1 }),
      newSupply({ costs: [] }),
    ].map(costRank);
    expect(ranks).toEqual([0, 1, 2, 3]);
  });

  it('lists the currencies once, in the order they stand', () => {
    expect(currenciesOf([newSupply({ costs: [EUR] }), newSupply({ costs: [JPY, EUR] })])).toEqual([
      'EUR',
      'JPY',
    ]);
  });
});

describe('the stock of an option', () => {
  it.each([
    [{ gears: 6, onShelf: 4, toMake: 1 }, '4 of 6 on the shelf, 1 to make'],
    [{ gears: 4, onShelf: 4, toMake: 0 }, 'all 4 on the shelf'],
    [{ gears: 4, onShelf: 0, toMake: 4 }, '0 of 4 on the shelf, 4 to make'],
  ])('%o reads “%s”', (given, words) => {
    expect(stockInFull(newSupply(given))).toBe(words);
  });
});
