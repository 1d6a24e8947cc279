import { describe, expect, it, vi } from 'vitest';
import { InputError } from '../../units/index.js';
import { newCandidate } from '../testing/offer-builder.js';
import { addDays, calendarDay, chooseOffer, daysBetween, offerState, priceAge } from './index.js';

const RULES = { on: '2026-06-15', prefer: 'price', currency: 'EUR' } as const;
const price = (unitPrice: number) => ({ breaks: [{ quantity: 1, unitPrice }] });
const idsOf = (choice: ReturnType<typeof chooseOffer>) => choice.priced.map(({ id }) => id);

describe('state and age of an offer', () => {
  const year = { validFrom: '2026-01-01', validUntil: '2026-12-31' };

  it.each([
    ['2025-12-31', 'open', 'not-yet'],
    ['2026-01-01', 'open', 'valid'],
    ['2026-12-31', 'open', 'valid'],
    ['2027-01-01', 'open', 'expired'],
    ['2026-06-15', 'closed', 'closed'],
  ] as const)('on %s, %s: %s', (on, standing, state) => {
    expect(offerState(year, on, standing)).toBe(state);
  });

  it('without a last day holds until further notice', () => {
    expect(offerState({ validFrom: '2026-01-01', validUntil: null }, '2099-01-01', 'open')).toBe('valid');
  });

  it('counts calendar days', () => {
    // February 2024 has 29 days: 28 February to 1 March is 2 days. 2026 has 365.
    expect(priceAge('2024-02-28', '2024-03-01')).toBe(2);
    expect(priceAge('2026-01-01', '2027-01-01')).toBe(365);
    expect(priceAge('2026-07-01', '2026-06-15')).toBe(0);
    expect(daysBetween('2026-03-28', '2026-03-30')).toBe(2);
    expect(addDays('2026-01-01', -1)).toBe('2025-12-31');
  });

  it.each([
    // 30 November, 20:30 in Greenwich: the next morning 13 hours to the east, the same day 10 hours to the west.
    ['Pacific/Auckland', '2026-12-01'],
    ['UTC', '2026-11-30'],
    ['Pacific/Honolulu', '2026-11-30'],
  ])('says what day it is in %s', (zone, day) => {
    vi.stubEnv('TZ', zone);
    expect(calendarDay(new Date('2026-11-30T20:30:00Z'))).toBe(day);
    vi.unstubAllEnvs();
  });
});

describe('choosing an offer', () => {
  it('takes the lowest total at the quantity, not the lowest price of one', () => {
    // Need 12. A: 12 × 4.00 = 48.00. B: 3.50 each, but packs of 20: 70.00. C: 4.20, from 10 3.90: 46.80.
    const a = newCandidate('a', price(400));
    const b = newCandidate('b', { ...price(350), pack: 20 });
    const c = newCandidate('c');
    const choice = chooseOffer([a, b, c], 12, RULES);
    expect(idsOf(choice)).toEqual(['c', 'a', 'b']);
    expect(choice.chosen?.price?.lineTotal.minor).toBe(4680);
    expect(choice.reason).toBeNull();
  });

  it('puts the house currency first, since amounts of other currencies cannot be compared', () => {
    const yen = newCandidate('yen', { ...price(1), currency: 'JPY' });
    const dinar = newCandidate('dinar', { ...price(1), currency: 'BHD' });
    const euro = newCandidate('euro', price(99_999));
    expect(idsOf(chooseOffer([yen, dinar, euro], 1, RULES))).toEqual(['euro', 'dinar', 'yen']);
    expect(chooseOffer([dinar, yen], 1, { ...RULES, currency: 'JPY' }).chosen?.id).toBe('yen');
  });

  it('breaks ties by lead time with unknown last, then supplier, then id', () => {
    const tie = (id: string, leadTimeDays: number | null, supplierName: string) =>
      newCandidate(id, { ...price(100), leadTimeDays, supplierName });
    const offers = [
      tie('10', 7, 'B'),
      tie('9', 7, 'B'),
      tie('4', null, 'A'),
      tie('3', 9, 'A'),
      tie('2', 7, 'A'),
    ];
    expect(idsOf(chooseOffer(offers, 1, RULES))).toEqual(['2', '9', '10', '3', '4']);
  });

  it('prefers the earlier arrival on demand, with the supplier’s usual lead time where the offer has none', () => {
    const slow = newCandidate('slow', { ...price(100), leadTimeDays: 30 });
    const usual = newCandidate('usual', { ...price(900), leadTimeDays: null, supplierLeadTimeDays: 3 });
    const unknown = newCandidate('unknown', { ...price(1), leadTimeDays: null });
    const choice = chooseOffer([slow, unknown, usual], 1, { ...RULES, prefer: 'arrival' });
    expect(idsOf(choice)).toEqual(['usual', 'slow', 'unknown']);
    expect(choice.chosen?.arrivalDays).toBe(3);
    expect(chooseOffer([slow, unknown, usual], 1, RULES).chosen?.id).toBe('unknown');
  });

  it('lets only valid offers of active suppliers compete, and shows the others with their price', () => {
    const offers = [
      newCandidate('expired', { ...price(1), validUntil: '2026-06-14' }),
      newCandidate('not-yet', { ...price(2), validFrom: '2026-06-16' }),
      newCandidate('closed', { ...price(3), standing: 'closed' }),
      newCandidate('gone', { ...price(4), supplierStanding: 'closed' }),
      newCandidate('good', price(500)),
    ];
    const choice = chooseOffer(offers, 1, RULES);
    expect(choice.chosen?.id).toBe('good');
    expect(idsOf(choice)).toEqual(['good', 'expired', 'not-yet', 'closed', 'gone']);
    expect(choice.priced.map(({ state }) => state)).toEqual([
      'valid',
      'expired',
      'not-yet',
      'closed',
      'valid',
    ]);
    expect(choice.priced.at(-1)?.price?.lineTotal.minor).toBe(4);
    expect(chooseOffer(offers.slice(0, 4), 1, RULES)).toMatchObject({ chosen: null, reason: 'none-valid' });
  });

  it('says when there are no offers at all', () => {
    expect(chooseOffer([], 1, RULES)).toEqual({ chosen: null, priced: [], reason: 'no-offers' });
  });

  it('keeps one total beyond every measure from hiding the other offers', () => {
    // 900,000,000 × 1e9 minor units is beyond 2^53; × 1 is not.
    const offers = [newCandidate('huge', price(1_000_000_000)), newCandidate('plain', price(1))];
    const choice = chooseOffer(offers, 900_000_000, RULES);
    expect(choice.chosen?.id).toBe('plain');
    expect(choice.priced[1]).toMatchObject({ id: 'huge', price: null, competes: false });
  });

  it('refuses a need that makes no sense', () => {
    expect(() => chooseOffer([newCandidate('a')], 0, RULES)).toThrow(InputError);
    expect(() => chooseOffer([newCandidate('a')], 0.0001, RULES)).toThrow(InputError);
  });

  it('does not change the list it was given', () => {
    const offers = [newCandidate('dear', price(900)), newCandidate('cheap', price(100))];
    chooseOffer(offers, 1, RULES);
    expect(offers.map(({ id }) => id)).toEqual(['dear', 'cheap']);
  });
});
