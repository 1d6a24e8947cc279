import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addMoney,
  CURRENCY_CODES,
  currencyDecimals,
  formatMoney,
  InputError,
  money,
  multiplyMoney,
  parseMoney,
  ratio,
} from './index.js';

const currency = fc.constantFrom(...CURRENCY_CODES);
const anyMoney = fc.tuple(fc.maxSafeInteger(), currency).map(([minor, code]) => money(minor, code));

describe('currencies', () => {
  it.each([
    // ISO 4217 minor units (memory).
    ['EUR', 2],
    ['USD', 2],
    ['JPY', 0],
    ['KRW', 0],
    ['KWD', 3],
    ['TND', 3],
    ['XYZ', undefined],
    ['eur', undefined],
  ])('%s has %s decimals', (code, decimals) => {
    expect(currencyDecimals(code)).toBe(decimals);
  });
});

describe('money', () => {
  it('writes each number of decimals', () => {
    expect(formatMoney(money(123450, 'EUR'))).toBe('1,234.50 EUR');
    expect(formatMoney(money(1235, 'JPY'))).toBe('1,235 JPY');
    expect(formatMoney(money(-125, 'KWD'))).toBe('\u22120.125 KWD');
    expect(formatMoney(money(5, 'EUR'))).toBe('0.05 EUR');
    expect(formatMoney(money(100000000, 'EUR'))).toBe('1,000,000.00 EUR');
  });

  it.each([
    ['1,234.50 EUR', undefined, 123450, 'EUR'],
    ['EUR 1234.5', undefined, 123450, 'EUR'],
    ['12', 'JPY', 12, 'JPY'],
    ['-3.007 kwd', undefined, -3007, 'KWD'],
    ['0.1', 'EUR', 10, 'EUR'],
  ])('reads %s', (text, expected, minor, code) => {
    expect(parseMoney(text, expected)).toEqual({ minor, currency: code });
  });

  it.each([
    ['1,5 EUR', undefined],
    ['1.234,50 EUR', undefined],
    ['0,125 KWD', undefined],
    ['1.005 EUR', undefined],
    ['1.5 JPY', undefined],
    ['12.50', undefined],
    ['12.50 USD', 'EUR'],
    ['12.50 XYZ', undefined],
    ['EUR', undefined],
    ['', 'EUR'],
    ['1e5', 'EUR'],
    ['99999999999999999999', 'EUR'],
  ])('refuses “%s”', (text, expected) => {
    expect(() => parseMoney(text, expected)).toThrow(InputError);
  });

  it('refuses a text of 100,000 characters shortly', () => {
    expect(() => parseMoney('9'.repeat(100_000), 'EUR')).toThrow(/^.{1,200}$/);
    expect(() => parseMoney('1 EUR', 'E'.repeat(100_000))).toThrow(/^.{1,200}$/);
  });

  it('what is written reads back the same', () => {
    fc.assert(
      fc.property(anyMoney, (amount) => {
        expect(parseMoney(formatMoney(amount))).toEqual(amount);
      }),
    );
  });

  it('sums are whole minor units and equal the sum of integers', () => {
    const cents = fc.integer({ min: -1e12, max: 1e12 });
    fc.assert(
      fc.property(fc.array(cents, { minLength: 1, maxLength: 50 }), currency, (amounts, code) => {
        const [first, ...others] = amounts.map((minor) => money(minor, code));
        if (!first) throw new Error('at least one amount is drawn');
        const sum = addMoney(first, ...others);
        expect(Number.isSafeInteger(sum.minor)).toBe(true);
        expect(BigInt(sum.minor)).toBe(amounts.reduce((total, minor) => total + BigInt(minor), 0n));
      }),
    );
  });

  it('a tenth added ten times is one, unlike a floating sum', () => {
    const tenth = parseMoney('0.1 EUR');
    expect(addMoney(tenth, ...Array.from({ length: 9 }, () => tenth))).toEqual(money(100, 'EUR'));
    expect(Array.from({ length: 10 }, () => 0.1).reduce((a, b) => a + b)).not.toBe(1);
  });

  it('multiplies whole quantities exactly and rounds others once', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -1e9, max: 1e9 }),
        fc.integer({ min: 0, max: 1e6 }),
        (minor, quantity) => {
          const product = multiplyMoney(money(minor, 'EUR'), quantity).minor;
          expect(BigInt(product)).toBe(BigInt(minor) * BigInt(quantity));
          expect(Object.is(product, -0)).toBe(false);
        },
      ),
    );
    expect(multiplyMoney(money(105, 'EUR'), '0.5')).toEqual(money(53, 'EUR'));
    expect(multiplyMoney(money(-105, 'EUR'), '0.5')).toEqual(money(-53, 'EUR'));
    expect(multiplyMoney(money(100, 'EUR'), ratio(1, 3))).toEqual(money(33, 'EUR'));
  });

  it.each([
    ['a floating factor', () => multiplyMoney(money(100, 'EUR'), 0.1)],
    ['a fraction of a cent', () => money(0.5, 'EUR')],
    ['NaN', () => money(Number.NaN, 'EUR')],
    ['an unknown currency', () => money(1, 'XYZ')],
    ['two currencies in one sum', () => addMoney(money(1, 'EUR'), money(1, 'USD'))],
    ['a sum out of range', () => addMoney(money(Number.MAX_SAFE_INTEGER, 'EUR'), money(1, 'EUR'))],
    ['a product out of range', () => multiplyMoney(money(Number.MAX_SAFE_INTEGER, 'EUR'), 2)],
  ])('refuses %s', (_name, act) => {
    expect(act).toThrow(InputError);
  });
});
