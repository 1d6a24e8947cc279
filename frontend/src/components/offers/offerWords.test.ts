import { describe, expect, it } from 'vitest';
import { ageWords, breaksWords, validityWords } from './offerWords';

describe('an offer in words', () => {
  it('writes its breaks in one line', () => {
    const breaks = [
      { quantity: 1, unitPrice: 1240 },
      { quantity: 10, unitPrice: 1110 },
      { quantity: 100, unitPrice: 985 },
    ];
    expect(breaksWords({ breaks, currency: 'EUR', per: 1 })).toBe('1: 12.40 · 10: 11.10 · 100: 9.85 EUR');
  });

  it('says what the prices are for, and keeps to the decimals of the currency', () => {
    const breaks = [{ quantity: 2.5, unitPrice: 1500 }];
    expect(breaksWords({ breaks, currency: 'JPY', per: 100 })).toBe('2.5: 1,500 JPY per 100');
  });

  it('says from when and until when it holds', () => {
    const days = { validFrom: '2026-11-01', validUntil: '2026-12-31' };
    expect(validityWords({ state: 'valid', ...days })).toBe('until 31 Dec 2026');
    expect(validityWords({ state: 'expired', ...days })).toBe('ended 31 Dec 2026');
    expect(validityWords({ state: 'not-yet', ...days })).toBe('from 1 Nov 2026');
    expect(validityWords({ state: 'valid', ...days, validUntil: null })).toBe('until further notice');
  });

  it('writes the age of a price', () => {
    expect([0, 1, 264].map(ageWords)).toEqual(['of today', '1 day old', '264 days old']);
  });
});
