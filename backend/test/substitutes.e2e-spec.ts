import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type PartInputDto } from '../src/parts/dto/part-input.dto.js';
import { type PartDto } from '../src/parts/dto/part.dto.js';
import { PartsLoader } from '../src/parts/parts-loader.service.js';
import { StockService } from '../src/stock/stock.service.js';
import { type SubstitutesDto } from '../src/substitutes/dto/substitutes.dto.js';
import { addOffer, addSupplier } from '../src/testing/add-offer.js';
import { LIBRARIAN, newGear, newPart } from '../src/testing/new-part.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  code: string;
  errors?: { field: string; message: string }[];
}

let server: TestServer;
let purchaser: Client;
let librarian: Client;

const gear = (number: string, attributes: object = {}, changes: Partial<PartInputDto> = {}): PartInputDto =>
  newGear({
    number,
    standing: 'cleared',
    ...changes,
    attributes: { teeth: 30, bore: 15, profileShift: 0, ...attributes },
  });

beforeAll(async () => {
  server = await startServer();
  purchaser = await server.as('purchaser');
  librarian = await server.as('librarian');
  const { app } = server;
  const parts = [
    ...['G-OLD', 'G-SHELF', 'G-QUICK', 'G-CHEAP', 'G-DEAR', 'G-YEN', 'G-NO-OFFER'].map((number) =>
      gear(number),
    ),
    gear('G-BORE', { bore: 12 }),
    gear('G-CHECK', { profileShift: null }),
    // What must never be offered: grey iron bears less than C45 (σ_Hlim about 308 for 360 N/mm²).
    gear('G-WEAK', {}, { material: 'EN-GJL-250' }),
    gear('G-WIDE-BORE', { bore: 18 }),
    gear('G-NARROW', { faceWidth: 18 }),
    gear('G-TEETH', { teeth: 31 }),
    gear('G-SHIFTED', { profileShift: 0.2 }),
    gear('G-DRAFT', {}, { standing: 'draft' }),
    newPart('other', {}, { number: 'O-1', standing: 'cleared' }),
    newPart(
      'lubricant',
      { viscosityGrade: 'ISO VG 220', packVolume: 1 },
      { number: 'L-1', standing: 'cleared' },
    ),
    newPart(
      'lubricant',
      { viscosityGrade: 'ISO VG 220', packVolume: 5 },
      { number: 'L-5', standing: 'cleared' },
    ),
  ];
  await app.get(PartsLoader).createMany(LIBRARIAN, parts);
  const { code } = await addSupplier(app, { name: 'Inlet Gears' });
  const { code: yen } = await addSupplier(app, { name: 'Shionagi Gears', currency: 'JPY' });
  const offer = (number: string, unitPrice: number, leadTimeDays: number, supplier = code) =>
    addOffer(app, number, supplier, { breaks: [{ quantity: 1, unitPrice }], leadTimeDays });
  await offer('G-QUICK', 2000, 3);
  await offer('G-CHEAP', 1200, 10);
  await offer('G-CHEAP', 900, 30);
  await offer('G-DEAR', 1500, 10);
  await offer('G-YEN', 500, 10, yen);
  const stock = app.get(StockService);
  for (const number of ['G-SHELF', 'G-CHECK']) {
    await stock.book(LIBRARIAN, { number, kind: 'received', quantity: 5, place: 'Rack A' });
  }
});
afterAll(() => server.close());

const ask = (number: string, query = '', client = purchaser) =>
  client.get<SubstitutesDto & Refusal>(`/api/parts/${number}/substitutes${query}`);
const numbers = ({ items }: SubstitutesDto) => items.map(({ part }) => part.number);

describe('substitutes of a part', () => {
  it('are the parts that drop in, by arrival, price (house currency first) and number, those to check last', async () => {
    const { status, body } = await ask('g-old', '?quantity=4');
    expect(status).toBe(200);
    expect(numbers(body)).toEqual([
      'G-SHELF', // on the shelf
      'G-QUICK', // 3 days
      'G-CHEAP', // 10 days, 4 × 12.00 = 48.00 EUR
      'G-DEAR', // 10 days, 60.00 EUR
      'G-YEN', // 10 days, another currency
      'G-BORE', // not known, by number
      'G-NO-OFFER',
      'G-CHECK', // on the shelf, but the shift is not stated
    ]);
    expect(body).toMatchObject({ quantity: 4, leftOut: 0 });
  });

  it('say what differs, what to check, and what the soonest offer costs', async () => {
    const { items } = (await ask('G-OLD', '?quantity=4')).body;
    const of = (number: string) => items.find(({ part }) => part.number === number);
    expect(of('G-SHELF')).toMatchObject({
      arrivalDays: 0,
      onShelf: 5,
      offer: null,
      differences: [],
      toCheck: [],
    });
    // The dearer offer of the two is there 20 days sooner.
    expect(of('G-CHEAP')?.offer).toEqual({
      supplier: 'Inlet Gears',
      currency: 'EUR',
      lineTotal: 4800,
      orderQuantity: 4,
      leadTimeDays: 10,
    });
    expect(of('G-BORE')?.differences).toEqual(['bore 12 mm, to be bored out to 15 mm']);
    expect(of('G-CHECK')?.toCheck).toEqual(['profile shift is not stated, counted as 0']);
  });

  it('arrive later where the shelf does not cover the quantity', async () => {
    const { items } = (await ask('G-OLD', '?quantity=6')).body;
    expect(items.find(({ part }) => part.number === 'G-SHELF')).toMatchObject({
      onShelf: 5,
      arrivalDays: null,
    });
    expect(items[0]?.part.number).toBe('G-QUICK');
  });

  it('show a viewer the shelf but no price', async () => {
    const { items } = (await ask('G-OLD', '?quantity=4', await server.as('viewer'))).body;
    expect(items).toHaveLength(8);
    expect(items.every(({ offer }) => offer === null)).toBe(true);
    expect(items.filter(({ arrivalDays }) => arrivalDays !== null).map(({ part }) => part.number)).toEqual([
      'G-SHELF',
      'G-CHECK',
    ]);
  });

  it('begin with the successor of a withdrawn part, also along a chain', async () => {
    const withdraw = async (number: string, successorNumber: string) => {
      const { version } = (await librarian.get<PartDto>(`/api/parts/${number}`)).body;
      const change = { version, standing: 'withdrawn', successorNumber };
      expect((await librarian.patch(`/api/parts/${number}`, change)).status).toBe(200);
    };
    await withdraw('G-NO-OFFER', 'G-DEAR');
    await withdraw('G-OLD', 'G-NO-OFFER');
    const { items } = (await ask('G-OLD', '?quantity=4')).body;
    expect(items[0]).toMatchObject({ part: { number: 'G-DEAR' }, successor: true });
    expect(items.filter(({ successor }) => successor)).toHaveLength(1);
    expect(items.map(({ part }) => part.number)).not.toContain('G-NO-OFFER');
  });

  it('of oil count in litres; of a part without sizes there are none', async () => {
    const oil = await ask('L-1', '?quantity=0.125');
    expect(numbers(oil.body)).toEqual(['L-5']);
    expect(oil.body.items[0]?.differences).toEqual(['packs of 5 l, not 1 l']);
    expect((await ask('O-1')).body).toEqual({ quantity: 1, items: [], leftOut: 0 });
  });

  it.each(['0', '-1', '1e12', '1.5', 'many', 'NaN', '', '1000001', '0.0001'])(
    'refuse a quantity of “%s” gears',
    async (quantity) => {
      const { status, body } = await ask('G-OLD', `?quantity=${quantity}`);
      expect(status).toBe(400);
      expect(body.errors?.[0]?.field).toBe('quantity');
    },
  );

  it('of an unknown part are 404', async () => {
    expect((await ask('NOBODY')).status).toBe(404);
  });
});
