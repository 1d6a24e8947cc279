import { describe, expect, it } from 'vitest';
import { newBomLine, newLinePrice, newPriceLine, newTrainPrices } from '../../../testing/boms';
import {
  endsSoonDays,
  endsSoonWords,
  marksOf,
  orderWords,
  PRICED_HEADS,
  pricedCells,
  pricedLines,
  unitPriceWords,
} from './pricedLine';

const ON = '2026-12-01';

describe('lines and their prices', () => {
  it('belong together by key, whatever the find numbers say', () => {
    const lines = [newBomLine({ key: 'a', findNumber: 401 }), newBomLine({ key: 'b', findNumber: 402 })];
    const prices = newTrainPrices([newPriceLine({ key: 'b', findNumber: 401, needed: 7 })]);
    expect(pricedLines(lines, prices).map(({ priced }) => priced?.needed ?? null)).toEqual([null, 7]);
    expect(pricedLines(lines, undefined).every(({ priced }) => priced === null)).toBe(true);
  });
});

describe('when an offer ends', () => {
  it.each([
    [null, null],
    ['2026-12-31', 30],
    ['2027-01-01', null],
    ['2026-12-02', 1],
    ['2026-12-01', 0],
  ])('until %s: %s days', (validUntil, days) => {
    expect(endsSoonDays({ validUntil }, ON)).toBe(days);
  });

  it('is said in words', () => {
    expect([0, 1, 12].map(endsSoonWords)).toEqual(['ends today', 'ends tomorrow', 'ends in 12 days']);
  });
});

describe('a line for the clipboard', () => {
  const cell = (cells: string[], head: string) => cells[PRICED_HEADS.indexOf(head)];

  it('gives amounts as plain figures with their own decimals, the currency beside them', () => {
    const line = newBomLine();
    const yen = newPriceLine({
      price: newLinePrice({
        currency: 'JPY',
        unitPrice: 48000,
        per: 100,
        lineTotal: 1234500,
        orderQuantity: 60,
      }),
    });
    const cells = pricedCells({ line, priced: yen }, ON);
    expect(cells).toHaveLength(PRICED_HEADS.length);
    // Yen have no minor unit: 48,000 minor are 48,000 yen.
    expect(cell(cells, 'Unit price')).toBe('48000');
    expect(cell(cells, 'Price for')).toBe('100');
    expect(cell(cells, 'Line total')).toBe('1234500');
    expect(cell(cells, 'Currency')).toBe('JPY');
    expect(cell(cells, 'Order quantity')).toBe('60');
    const dinar = newPriceLine({ price: newLinePrice({ currency: 'TND', lineTotal: 1234500 }) });
    // A dinar has 1,000 millimes.
    expect(cell(pricedCells({ line, priced: dinar }, ON), 'Line total')).toBe('1234.500');
  });

  it('says why there is no price, and invents no amount', () => {
    const cells = pricedCells(
      { line: newBomLine(), priced: newPriceLine({ price: null, reason: 'none-valid' }) },
      ON,
    );
    expect(cell(cells, 'Marks')).toBe('no valid offer');
    expect(cell(cells, 'Line total')).toBe('');
    expect(cell(cells, 'Currency')).toBe('');
  });
});

describe('what stands on the screen', () => {
  it('names the order only where it differs from what is needed', () => {
    expect(orderWords(newPriceLine({ needed: 50 }))).toBe('');
    expect(orderWords(newPriceLine({ needed: 44 }))).toBe('50 pcs');
  });

  it('says for how many the price is', () => {
    expect(unitPriceWords(newLinePrice())).toBe('3.57');
    expect(unitPriceWords(newLinePrice({ unitPrice: 4800, per: 100 }))).toBe('48.00 per 100');
  });

  it('marks what wants a look before ordering', () => {
    const price = newLinePrice({
      chosenBy: 'person',
      tooOld: true,
      validUntil: '2026-12-13',
      cheaperAt: { orderQuantity: 100, lineTotal: 17000, saves: 850 },
    });
    expect(marksOf(newPriceLine({ price }), ON)).toEqual([
      'chosen by hand',
      'price too old',
      'ends in 12 days',
      'ordering 100 costs less: 170.00 EUR',
    ]);
    expect(marksOf(newPriceLine(), ON)).toEqual([]);
  });
});
