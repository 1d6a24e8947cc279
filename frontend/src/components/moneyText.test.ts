import { CURRENCY_CODES, currencyDecimals } from '@stageyard/libs/units';
import { describe, expect, it } from 'vitest';
import { amountText, amountWords, readMoney } from './moneyText';

describe('readMoney', () => {
  it.each([
    // ISO 4217: two decimals for EUR, none for JPY, three for KWD (memory).
    ['12.40', 'EUR', 1240],
    ['12,4', 'EUR', 1240],
    [' 1 234,50 ', 'EUR', 123450],
    ['1,234.50', 'EUR', 123450],
    ['0.01', 'EUR', 1],
    ['1500', 'JPY', 1500],
    ['0.125', 'KWD', 125],
  ])('reads “%s” %s as %s minor units', (typed, currency, minor) => {
    expect(readMoney(typed, currency)).toEqual({ kind: 'money', minor });
  });

  it.each([
    ['-3', 'EUR', /above 0/],
    ['0', 'EUR', /above 0/],
    ['1.005', 'EUR', /2 decimals/],
    ['1.5', 'JPY', /0 decimals/],
    ['twelve', 'EUR', /not an amount/],
    ['1,400', 'EUR', /1400 or as 1\.4\b/],
    ['1,250', 'KWD', /1250 or as 1\.25\b/],
    ['5 USD', 'EUR', /not an amount|expected/],
  ])('refuses “%s” %s and says why', (typed, currency, why) => {
    const reading = readMoney(typed, currency);
    expect(reading.kind === 'problem' && reading.message).toMatch(why);
  });

  it('takes nothing for nothing', () => {
    expect(readMoney('  ', 'EUR')).toEqual({ kind: 'blank' });
  });

  it.each([1, 7, 10, 99, 100, 101, 999, 1000, 12_345, 100_000, 987_654_321, Number.MAX_SAFE_INTEGER])(
    'reads back exactly what it wrote for %s minor units, in every currency',
    (minor) => {
      for (const currency of CURRENCY_CODES) {
        const text = amountText(minor, currency);
        expect(readMoney(text, currency)).toEqual({ kind: 'money', minor });
        expect(text.split('.')[1]?.length ?? 0).toBe(currencyDecimals(currency));
      }
    },
  );
});

it('writes an amount without its currency', () => {
  expect(amountWords(123450, 'EUR')).toBe('1,234.50');
  expect(amountWords(1500, 'JPY')).toBe('1,500');
  expect(amountText(null, 'EUR')).toBe('');
});
