import { describe, expect, it } from 'vitest';
import { InputError } from '../../units/index.js';
import { newOfferTerms } from '../testing/offer-builder.js';
import { checkOfferTerms, isCalendarDate, type OfferTerms } from './index.js';

function faultsOf(terms: OfferTerms, path?: string): { field: string; message: string }[] {
  try {
    checkOfferTerms(terms, path);
    return [];
  } catch (error) {
    if (error instanceof InputError) return error.errors;
    throw error;
  }
}

const fieldsOf = (terms: OfferTerms, path?: string) => faultsOf(terms, path).map(({ field }) => field);
const breaksOf = (...pairs: [quantity: number, unitPrice: number][]) =>
  pairs.map(([quantity, unitPrice]) => ({ quantity, unitPrice }));

describe('what an offer may say', () => {
  it.each<[string, Partial<OfferTerms>]>([
    ['the usual', {}],
    ['no lead time, no last day', { leadTimeDays: null, validUntil: null }],
    ['one day only', { validFrom: '2026-05-04', validUntil: '2026-05-04' }],
    ['a leap day', { pricedOn: '2024-02-29' }],
    ['decimals of litres', { pack: 0.5, leastQuantity: 2.125, breaks: breaksOf([0.5, 899]) }],
    ['the bounds', { pack: 1_000_000, leadTimeDays: 3650, breaks: breaksOf([0.001, 1], [1_000_000, 1e9]) }],
    ['a price that rises', { breaks: breaksOf([1, 100], [10, 120]) }],
  ])('takes %s', (_name, changes) => {
    expect(faultsOf(newOfferTerms(changes))).toEqual([]);
  });

  it.each<[string, Partial<OfferTerms>, string[]]>([
    ['a negative price', { breaks: breaksOf([1, -420]) }, ['breaks.0.unitPrice']],
    ['a price of nothing', { breaks: breaksOf([1, 0]) }, ['breaks.0.unitPrice']],
    ['half a cent', { breaks: breaksOf([1, 42.5]) }, ['breaks.0.unitPrice']],
    ['a price beyond a thousand million', { breaks: breaksOf([1, 1e9 + 1]) }, ['breaks.0.unitPrice']],
    ['no breaks', { breaks: [] }, ['breaks']],
    ['breaks out of order', { breaks: breaksOf([10, 390], [1, 420]) }, ['breaks.1.quantity']],
    ['a break given twice', { breaks: breaksOf([1, 420], [10, 390], [10, 380]) }, ['breaks.2.quantity']],
    [
      '21 breaks',
      { breaks: Array.from({ length: 21 }, (_, i) => ({ quantity: i + 1, unitPrice: 9 })) },
      ['breaks'],
    ],
    ['a break from 0', { breaks: breaksOf([0, 420]) }, ['breaks.0.quantity']],
    ['a break that is no number', { breaks: breaksOf([Number.NaN, 420]) }, ['breaks.0.quantity']],
    ['an unknown currency', { currency: 'XYZ' }, ['currency']],
    ['a currency in small letters', { currency: 'eur' }, ['currency']],
    ['a price for 5', { per: 5 as unknown as 10 }, ['per']],
    ['a pack of nothing', { pack: 0 }, ['pack']],
    ['a pack of a ten-thousandth', { pack: 0.0001 }, ['pack']],
    ['a pack above a million', { pack: 1_000_001 }, ['pack']],
    ['a least quantity below 0', { leastQuantity: -1 }, ['leastQuantity']],
    ['a least quantity of 1e12', { leastQuantity: 1e12 }, ['leastQuantity']],
    ['a lead time below 0', { leadTimeDays: -1 }, ['leadTimeDays']],
    ['half a day', { leadTimeDays: 0.5 }, ['leadTimeDays']],
    ['eleven years', { leadTimeDays: 3651 }, ['leadTimeDays']],
    ['an end before the start', { validFrom: '2026-05-02', validUntil: '2026-05-01' }, ['validUntil']],
    ['30 February', { validUntil: '2026-02-30' }, ['validUntil']],
    ['a 29 February without one', { validFrom: '2026-02-29' }, ['validFrom']],
    ['a date with slashes', { pricedOn: '01/02/2026' }, ['pricedOn']],
    ['no first day', { validFrom: null as unknown as string }, ['validFrom']],
  ])('refuses %s', (_name, changes, fields) => {
    const faults = faultsOf(newOfferTerms(changes));
    expect(faults.map(({ field }) => field)).toEqual(fields);
    expect(faults[0]?.message).toMatch(/^[A-Z“0-9].{10,160}\.$/);
  });

  it('says what is out of order and what ends before it starts', () => {
    const [outOfOrder] = faultsOf(newOfferTerms({ breaks: breaksOf([10, 390], [1, 420]) }));
    expect(outOfOrder?.message).toMatch(/from 1 .* from 10/);
    const [ends] = faultsOf(newOfferTerms({ validFrom: '2026-05-02', validUntil: '2026-05-01' }));
    expect(ends?.message).toMatch(/ends on 2026-05-01, before it starts on 2026-05-02/);
  });

  it('tells everything wrong at once, under the path it is given', () => {
    const terms = newOfferTerms({ currency: 'XYZ', pack: -1, breaks: breaksOf([1, -1]), pricedOn: 'soon' });
    expect(fieldsOf(terms, 'offers.3')).toEqual([
      'offers.3.currency',
      'offers.3.breaks.0.unitPrice',
      'offers.3.pack',
      'offers.3.pricedOn',
    ]);
  });

  it('keeps its refusal short whatever was sent', () => {
    const long = 'E'.repeat(100_000);
    const message = faultsOf(newOfferTerms({ currency: long, validFrom: long })).map(
      (fault) => fault.message,
    );
    expect(message.join(' ').length).toBeLessThan(300);
  });
});

describe('days of the calendar', () => {
  it.each([
    // Gregorian rule: years divisible by 4 are leap years, hundreds only when divisible by 400.
    ['2024-02-29', true],
    ['2025-02-29', false],
    ['2000-02-29', true],
    ['1900-02-29', false],
    ['2026-04-30', true],
    ['2026-04-31', false],
    ['2026-13-01', false],
    ['2026-00-10', false],
    ['2026-01-00', false],
    ['2026-1-5', false],
    ['2026-01-05T00:00:00Z', false],
    ['0001-01-01', false],
    ['', false],
  ])('%s: %s', (text, is) => {
    expect(isCalendarDate(text)).toBe(is);
  });
});
