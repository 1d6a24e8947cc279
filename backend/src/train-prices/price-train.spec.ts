import { describe, expect, it } from 'vitest';
import { type PartOffer } from '../offers/offers-finder.service.js';
import { type PriceBasis, priceTrain } from './price-train.js';

type Line = Parameters<typeof priceTrain>[0][number];

const line = (findNumber: number, changes: Partial<Line> = {}): Line => ({
  key: `line ${findNumber}`,
  findNumber,
  partNumber: 'B-12',
  quantity: 4,
  unit: 'pcs',
  supply: 'bought',
  ...changes,
});
const offer = (changes: Partial<PartOffer> = {}): PartOffer => ({
  id: '7',
  supplierCode: 'S-0001',
  supplierName: 'Tidewater Bearings',
  supplierPartNumber: '',
  standing: 'open',
  supplierStanding: 'active',
  supplierLeadTimeDays: null,
  currency: 'EUR',
  per: 1,
  breaks: [{ quantity: 1, unitPrice: 250 }],
  pack: 1,
  leastQuantity: 1,
  leadTimeDays: null,
  validFrom: '2026-01-01',
  validUntil: null,
  pricedOn: '2026-01-01',
  ...changes,
});
const basis = (changes: Partial<PriceBasis> = {}): PriceBasis => ({
  buildQuantity: 3,
  on: '2026-06-30',
  prefer: 'price',
  offers: new Map([['B-12', [offer()]]]),
  levels: new Map(),
  choices: {},
  ...changes,
});
const messages = (offers: PartOffer[]) =>
  priceTrain(
    [line(401)],
    basis({ offers: new Map([['B-12', offers]]), choices: { 'B-12': 7 } }),
  ).lostChoices.map(({ message }) => message);

describe('a line without a price', () => {
  it('says why: made, no part, no offer, none that is valid', () => {
    const expired = offer({ validUntil: '2026-06-29' });
    const offers = new Map([
      ['B-12', [expired]],
      ['G-24', [expired]],
    ]);
    const lines = [
      line(101, { partNumber: null, supply: 'made' }),
      line(102, { partNumber: 'G-18', supply: 'made' }),
      line(103, { partNumber: 'G-24', supply: 'made' }),
      line(401),
      line(402, { partNumber: 'B-15' }),
      line(403, { partNumber: null }),
    ];
    const { lines: priced, unpriced } = priceTrain(lines, basis({ offers }));
    expect(priced.map(({ reason }) => reason)).toEqual([
      'made',
      'made',
      'none-valid',
      'none-valid',
      'no-offers',
      'no-part',
    ]);
    expect(unpriced.map(({ findNumber }) => findNumber)).toEqual([103, 401, 402, 403]);
  });

  it('does not stop the others when its need is beyond all measure', () => {
    const { lines, totals } = priceTrain(
      [line(401, { quantity: 900_000 }), line(402)],
      basis({ buildQuantity: 100_000 }),
    );
    expect(lines.map(({ reason }) => reason)).toEqual(['none-valid', null]);
    // 400,000 × 2.50 EUR
    expect(totals).toEqual([{ currency: 'EUR', minor: 100_000_000, lines: 1 }]);
  });
});

describe('the shelf', () => {
  it('covers two lines of one part only when it covers both together', () => {
    const lines = [line(401), line(402, { quantity: 2 }), line(901, { partNumber: null })];
    // 3 × 4 + 3 × 2 = 18
    const cover = (total: number) =>
      priceTrain(lines, basis({ levels: new Map([['B-12', { total }]]) })).shelf;
    expect(cover(18)).toEqual({ covered: 2, lines: 2 });
    expect(cover(17)).toEqual({ covered: 0, lines: 2 });
  });
});

describe('the age of a price', () => {
  it('is too old from the day after the house rule of 180 days', () => {
    // 1 January to 30 June 2026: 31 + 28 + 31 + 30 + 31 + 29 = 180 days.
    expect(priceTrain([line(401)], basis()).lines[0]?.price).toMatchObject({ ageDays: 180, tooOld: false });
    const later = priceTrain([line(401)], basis({ on: '2026-07-01' }));
    expect(later).toMatchObject({ tooOld: 1, lines: [{ price: { ageDays: 181, tooOld: true } }] });
  });
});

describe('an offer chosen by a person that is not used', () => {
  const other = offer({ id: '8', supplierName: 'Quickhaven' });
  it.each([
    [{ standing: 'closed' }, 'is closed.'],
    [{ validUntil: '2026-06-29' }, 'ended on 2026-06-29.'],
    [{ validFrom: '2026-07-01' }, 'starts on 2026-07-01.'],
    [{ supplierStanding: 'closed' }, 'cannot be used: the supplier is closed.'],
  ] as const)('is told of: %o', (changes, words) => {
    expect(messages([offer(changes), other])).toEqual([
      `The offer of Tidewater Bearings chosen for B-12 ${words} The rule chose Quickhaven in its place. Choose another offer, or leave it to the rule.`,
    ]);
  });

  it('is told of when it is gone, also where nothing takes its place', () => {
    expect(messages([])[0]).toBe(
      'The offer chosen for B-12 is no longer there. No other offer can be used, so the line has no price. Choose another offer, or leave it to the rule.',
    );
  });
});
