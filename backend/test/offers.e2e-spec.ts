import { addDays, calendarDay } from '@stageyard/libs/bill-of-materials';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newOffer, newSupplier } from '../src/testing/new-offer.js';
import { newGear, newPart } from '../src/testing/new-part.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Offer {
  id: string;
  part: { number: string; unit: string };
  supplier: { code: string };
  state: string;
  standing: string;
  currency: string;
  breaks: { quantity: number; unitPrice: number }[];
  ageDays: number;
  tooOld: boolean;
  effectiveLeadTimeDays: number | null;
  version: number;
}
interface PartOffers {
  quantity: number;
  unit: string;
  onShelf: number | null;
  offers: (Offer & {
    price: {
      orderQuantity: number;
      lineTotal: { minor: number; currency: string };
      cheaperAt: object | null;
    };
    arrivalDays: number | null;
    chosen: boolean;
  })[];
  reason: string | null;
}
interface Refusal {
  code: string;
  message: string;
  errors?: { field: string; message: string }[];
  current?: Offer;
}
interface Page {
  items: Offer[];
  total: number;
}

const day = (offset: number) => addDays(calendarDay(new Date()), offset);

let server: TestServer;
let purchaser: Client;
let librarian: Client;
let supplierCode: string;
let partNumber: string;
beforeAll(async () => {
  server = await startServer();
  purchaser = await server.as('purchaser');
  librarian = await server.as('librarian');
  supplierCode = await addSupplier();
  partNumber = await addPart();
});
afterAll(() => server.close());

async function addSupplier(changes: Parameters<typeof newSupplier>[0] = {}): Promise<string> {
  return (await purchaser.post<{ code: string }>('/api/suppliers', newSupplier(changes))).body.code;
}

async function addPart(input: object = newGear({ standing: 'cleared' })): Promise<string> {
  return (await librarian.post<{ number: string }>('/api/parts', input)).body.number;
}

const offer = (changes: object = {}) => ({ ...newOffer({ partNumber, supplierCode }), ...changes });

async function add(changes: object = {}): Promise<Offer> {
  const { status, body } = await purchaser.post<Offer>('/api/offers', offer(changes));
  expect([status, body]).toEqual([201, body]);
  return body;
}

describe('an offer', () => {
  it('takes what was left out from the supplier and from today', async () => {
    const code = await addSupplier({ currency: 'JPY', leadTimeDays: 21 });
    const added = await add({ supplierCode: code, partNumber: partNumber.toLowerCase() });
    expect(added).toMatchObject({
      part: { number: partNumber, unit: 'pcs', kind: 'gear' },
      supplier: { code, standing: 'active' },
      currency: 'JPY',
      per: 1,
      pack: 1,
      leastQuantity: 1,
      leadTimeDays: null,
      effectiveLeadTimeDays: 21,
      validFrom: day(0),
      validUntil: null,
      pricedOn: day(0),
      state: 'valid',
      ageDays: 0,
      tooOld: false,
      version: 1,
    });
    expect((await purchaser.get(`/api/offers/${added.id}`)).body).toEqual(added);
  });

  it('says its state today and the age of its price against the house rule of 180 days', async () => {
    const past = await add({ validFrom: day(-400), validUntil: day(-1), pricedOn: day(-181) });
    expect(past).toMatchObject({ state: 'expired', ageDays: 181, tooOld: true });
    const last = await add({ validFrom: day(-400), validUntil: day(0), pricedOn: day(-180) });
    expect(last).toMatchObject({ state: 'valid', ageDays: 180, tooOld: false });
    expect((await add({ validFrom: day(1) })).state).toBe('not-yet');
  });

  it.each([
    ['a negative price', { breaks: [{ quantity: 1, unitPrice: -5 }] }, ['breaks.0.unitPrice']],
    ['a price of nothing', { breaks: [{ quantity: 1, unitPrice: 0 }] }, ['breaks.0.unitPrice']],
    ['a price of half a cent', { breaks: [{ quantity: 1, unitPrice: 0.5 }] }, ['breaks.0.unitPrice']],
    [
      'break quantities out of order',
      {
        breaks: [
          { quantity: 10, unitPrice: 5 },
          { quantity: 1, unitPrice: 6 },
        ],
      },
      ['breaks.1.quantity'],
    ],
    [
      'a break quantity twice',
      {
        breaks: [
          { quantity: 10, unitPrice: 5 },
          { quantity: 10, unitPrice: 6 },
        ],
      },
      ['breaks.1.quantity'],
    ],
    ['no price', { breaks: [] }, ['breaks']],
    [
      '21 breaks',
      { breaks: Array.from({ length: 21 }, (_, index) => ({ quantity: index + 1, unitPrice: 100 - index })) },
      ['breaks'],
    ],
    ['a quantity of 1e12', { breaks: [{ quantity: 1e12, unitPrice: 5 }] }, ['breaks.0.quantity']],
    ['a pack of 1e12', { pack: 1e12 }, ['pack']],
    ['a least quantity of 0', { leastQuantity: 0 }, ['leastQuantity']],
    ['half a piece', { pack: 0.5, leastQuantity: 1.5 }, ['pack', 'leastQuantity']],
    ['an unknown currency', { currency: 'XYZ' }, ['currency']],
    ['prices for 7', { per: 7 }, ['per']],
    ['a lead time of -1 days', { leadTimeDays: -1 }, ['leadTimeDays']],
    ['an end before its start', { validFrom: '2026-05-02', validUntil: '2026-05-01' }, ['validUntil']],
    ['the 30th of February', { pricedOn: '2026-02-30' }, ['pricedOn']],
    ['a price that was stated in two days', { pricedOn: day(2) }, ['pricedOn']],
    ['an unknown part', { partNumber: 'KW-99999' }, ['partNumber']],
    [
      'an unknown supplier and part',
      { partNumber: 'KW-99999', supplierCode: 'S-9' },
      ['partNumber', 'supplierCode'],
    ],
    ['a field that is not there', { discount: 5 }, ['discount']],
  ])('is refused %s, naming the field', async (_, changes, fields) => {
    const before = (await purchaser.get<Page>('/api/offers')).body.total;
    const { status, body } = await purchaser.post<Refusal>('/api/offers', offer(changes));
    expect(status).toBe(400);
    expect(body.errors?.map(({ field }) => field)).toEqual(fields);
    expect((await purchaser.get<Page>('/api/offers')).body.total).toBe(before);
  });

  it('in litres takes thousandths, and no finer', async () => {
    const number = await addPart(
      newPart('lubricant', { viscosityGrade: 'ISO VG 220', packVolume: 5 }, { standing: 'cleared' }),
    );
    const litres = {
      partNumber: number,
      pack: 0.125,
      leastQuantity: 0.5,
      breaks: [{ quantity: 0.5, unitPrice: 900 }],
    };
    expect((await add(litres)).part.unit).toBe('l');
    const { status, body } = await purchaser.post<Refusal>('/api/offers', offer({ ...litres, pack: 0.0005 }));
    expect([status, body.errors?.[0]?.field]).toEqual([400, 'pack']);
  });

  it('is not made for a withdrawn part, and says which part replaces it', async () => {
    const [old, next] = [await addPart(), await addPart()];
    await librarian.patch(`/api/parts/${old}`, { version: 1, standing: 'withdrawn', successorNumber: next });
    const { status, body } = await purchaser.post<Refusal>('/api/offers', offer({ partNumber: old }));
    expect([status, body.errors?.[0]?.field]).toEqual([400, 'partNumber']);
    expect(body.message).toContain('withdrawn');
    expect(body.message).toContain(next);
  });

  it('is not made by a closed supplier; theirs can still be closed, and not opened again', async () => {
    const code = await addSupplier();
    const { id } = await add({ supplierCode: code });
    await purchaser.patch(`/api/suppliers/${code}`, { version: 1, standing: 'closed' });
    const refused = await purchaser.post<Refusal>('/api/offers', offer({ supplierCode: code }));
    expect([refused.status, refused.body.errors?.[0]?.field]).toEqual([400, 'supplierCode']);
    expect(refused.body.message).toContain('closed');
    const closed = await purchaser.patch<Offer>(`/api/offers/${id}`, { version: 1, standing: 'closed' });
    expect(closed.body).toMatchObject({ standing: 'closed', state: 'closed', version: 2 });
    const opened = await purchaser.patch<Refusal>(`/api/offers/${id}`, { version: 2, standing: 'open' });
    expect([opened.status, opened.body.errors?.[0]?.field]).toEqual([400, 'standing']);
  });

  it('sent twice is there once', async () => {
    const code = await addSupplier();
    const answers = await Promise.all(
      [1, 2].map(() => purchaser.post<Refusal & Offer>('/api/offers', offer({ supplierCode: code }))),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const [first, second] = answers.sort((a, b) => a.status - b.status);
    expect(second?.body.code).toBe('offer-doubled');
    expect(second?.body.current).toEqual(first?.body);
  });

  it('keeps script text as the text it is', async () => {
    const source = '<img src=x onerror=alert(1)>';
    const { id } = await add({ source, supplierPartNumber: '"><b>7</b>' });
    expect((await purchaser.get(`/api/offers/${id}`)).body).toMatchObject({
      source,
      supplierPartNumber: '"><b>7</b>',
    });
  });
});

describe('two people who change one offer at once', () => {
  it('get one success and one 409 that shows it as it stands', async () => {
    const { id } = await add({ source: 'two people' });
    const answers = await Promise.all(
      [purchaser, librarian].map((client, index) =>
        client.patch<Refusal & Offer>(`/api/offers/${id}`, {
          version: 1,
          breaks: [{ quantity: 1, unitPrice: 2000 + index }],
        }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = answers.find(({ status }) => status === 200);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost?.body.code).toBe('changed-meanwhile');
    expect(lost?.body.current).toEqual(won?.body);
  });

  it('leave one row in the record out of twenty tries, with the prices before and after', async () => {
    const { id } = await add({ source: 'twenty tries' });
    const tries = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        purchaser.patch(`/api/offers/${id}`, { version: 1, leadTimeDays: index }),
      ),
    );
    expect(tries.filter(({ status }) => status === 200)).toHaveLength(1);
    await purchaser.patch(`/api/offers/${id}`, { version: 2, breaks: [{ quantity: 1, unitPrice: 999 }] });
    const { body } = await purchaser.get<{
      items: { action: string; before: object; after: object; summary: string }[];
    }>(`/api/offers/${id}/changes`);
    expect(body.items.map(({ action }) => action)).toEqual(['changed', 'changed', 'added']);
    expect(body.items[0]).toMatchObject({ after: { breaks: [{ quantity: 1, unitPrice: 999 }] } });
    expect(body.items[0]?.summary).toContain('9.99 EUR from 1');
  });
});

describe('the offers of a part', () => {
  it('are priced at the quantity and ranked: house currency, total, then others', async () => {
    const number = await addPart();
    const [near, far, abroad, shut] = [
      await addSupplier({ leadTimeDays: 30 }),
      await addSupplier({ leadTimeDays: 2 }),
      await addSupplier({ currency: 'USD', leadTimeDays: 1 }),
      await addSupplier(),
    ];
    // 12 in packs of 5 are 15; from 10 on at 11.00: 165.00. Singly 12 at 14.00: 168.00.
    await add({ partNumber: number, supplierCode: near, pack: 5 });
    await add({ partNumber: number, supplierCode: far, breaks: [{ quantity: 1, unitPrice: 1400 }] });
    await add({ partNumber: number, supplierCode: abroad, breaks: [{ quantity: 1, unitPrice: 1 }] });
    await add({ partNumber: number, supplierCode: shut, breaks: [{ quantity: 1, unitPrice: 1 }] });
    await purchaser.patch(`/api/suppliers/${shut}`, { version: 1, standing: 'closed' });
    const ask = async (query: string) =>
      (await purchaser.get<PartOffers>(`/api/parts/${number.toLowerCase()}/offers?${query}`)).body;
    const byPrice = await ask('quantity=12');
    expect(byPrice).toMatchObject({ quantity: 12, unit: 'pcs', onShelf: null, reason: null });
    expect(byPrice.offers.map(({ supplier, chosen }) => [supplier.code, chosen])).toEqual([
      [near, true],
      [far, false],
      [abroad, false],
      [shut, false],
    ]);
    expect(byPrice.offers[0]?.price).toMatchObject({
      orderQuantity: 15,
      lineTotal: { minor: 16500, currency: 'EUR' },
    });
    expect(byPrice.offers[1]?.price).toMatchObject({
      orderQuantity: 12,
      lineTotal: { minor: 16800, currency: 'EUR' },
    });
    const byArrival = await ask('quantity=12&prefer=arrival');
    expect(byArrival.offers.map(({ arrivalDays }) => arrivalDays)).toEqual([1, 2, 30, 14]);
    expect(byArrival.offers.find(({ chosen }) => chosen)?.supplier.code).toBe(abroad);
    // 9 at 12.50 are 112.50, 10 at 11.00 are 110.00: but packs of 5 make it 10 anyway.
    expect((await ask('quantity=9')).offers[0]?.price.lineTotal.minor).toBe(11000);
    await librarian.post('/api/stock/movements', { number, kind: 'received', quantity: 7, place: 'A-1' });
    expect((await ask('quantity=9')).onShelf).toBe(7);
  });

  it('say why none is chosen', async () => {
    const number = await addPart();
    const reason = async () => (await purchaser.get<PartOffers>(`/api/parts/${number}/offers`)).body.reason;
    expect(await reason()).toBe('no-offers');
    await add({ partNumber: number, validFrom: day(-9), validUntil: day(-2) });
    expect(await reason()).toBe('none-valid');
    await add({ partNumber: number });
    expect(await reason()).toBeNull();
  });

  it.each(['quantity=0', 'quantity=-1', 'quantity=1e12', 'quantity=1.5', 'quantity=ten', 'prefer=luck'])(
    'are refused %s',
    async (query) => {
      const { status, body } = await purchaser.get<Refusal>(`/api/parts/${partNumber}/offers?${query}`);
      expect([status, body.errors?.[0]?.field]).toEqual([400, query.split('=')[0]]);
    },
  );

  it('answer 404 for an unknown part', async () => {
    expect((await purchaser.get('/api/parts/KW-99999/offers')).status).toBe(404);
  });
});

describe('the list of offers', () => {
  it('is filtered and sorted, with what is not known last', async () => {
    const code = await addSupplier({ name: 'Lantern Gears', leadTimeDays: null });
    const [a, b, c] = [
      await addPart(newGear({ number: 'OFF-A', description: 'Winch wheel', standing: 'cleared' })),
      await addPart(newGear({ number: 'OFF-B', description: 'Vent wheel', standing: 'cleared' })),
      await addPart(newGear({ number: 'OFF-C', description: 'Vent pinion', standing: 'cleared' })),
    ];
    const mine = { supplierCode: code };
    await add({ ...mine, partNumber: b, supplierPartNumber: 'LG 7%', pricedOn: day(-200), leadTimeDays: 5 });
    await add({ ...mine, partNumber: a, validUntil: day(10), currency: 'CHF', leadTimeDays: 9 });
    await add({ ...mine, partNumber: c, validFrom: day(-9), validUntil: day(-1) });
    const parts = async (query: string) =>
      (await purchaser.get<Page>(`/api/offers?supplier=${code.toLowerCase()}&${query}`)).body.items.map(
        ({ part }) => part.number,
      );
    expect(await parts('sort=part')).toEqual([a, b, c]);
    expect(await parts('sort=-part&size=2&page=2')).toEqual([a]);
    expect(await parts('sort=leadTimeDays')).toEqual([b, a, c]);
    expect(await parts('sort=-leadTimeDays')).toEqual([a, b, c]);
    expect(await parts('sort=validUntil')).toEqual([c, a, b]);
    expect(await parts('sort=-validUntil')).toEqual([a, c, b]);
    expect(await parts('sort=supplier,-part')).toEqual([c, b, a]);
    expect(await parts('state=valid&sort=part')).toEqual([a, b]);
    expect(await parts('state=expired')).toEqual([c]);
    expect(await parts('tooOld=true')).toEqual([b]);
    expect(await parts('tooOld=false&sort=part')).toEqual([a, c]);
    expect(await parts(`endsBy=${day(30)}`)).toEqual([a]);
    expect(await parts(`endsBy=${day(9)}`)).toEqual([]);
    expect(await parts('currency=chf')).toEqual([a]);
    expect(await parts('part=off-b')).toEqual([b]);
    expect(await parts('text=lantern%20vent&sort=part')).toEqual([b, c]);
    expect(await parts('text=7%25')).toEqual([b]);
    expect(await parts('text=%00')).toEqual([]);
    expect((await purchaser.get('/api/offers?state=maybe')).status).toBe(400);
    expect((await purchaser.get('/api/offers?endsBy=soon')).status).toBe(400);
    const counted = await purchaser.get<{ offers: object }>(`/api/suppliers/${code}`);
    expect(counted.body.offers).toEqual({ open: 2, expired: 1, oldestPricedOn: day(-200) });
  });
});

describe('people without prices', () => {
  it('see no offer and no price anywhere', async () => {
    const viewer = await server.as('viewer');
    const { id } = await add({ source: 'Quotation 4711', breaks: [{ quantity: 1, unitPrice: 771133 }] });
    await purchaser.patch(`/api/offers/${id}`, { version: 1, breaks: [{ quantity: 1, unitPrice: 771144 }] });
    for (const path of [
      '/api/offers',
      `/api/offers/${id}`,
      `/api/offers/${id}/changes`,
      `/api/parts/${partNumber}/offers`,
    ]) {
      expect((await viewer.get(path)).status).toBe(403);
    }
    expect((await viewer.post('/api/offers', offer())).status).toBe(403);
    for (const query of ['', '?entity=offer', '?text=7%2C711', `?entity=offer&entityId=${id}`, '?size=100']) {
      const seen = await viewer.get(`/api/audit${query}`);
      expect(seen.status).toBe(200);
      expect(seen.bytes.toString()).not.toMatch(/7711(33|44)|7,711\.|4711/);
    }
    const designer = await server.as('designer');
    expect((await designer.get(`/api/audit?entity=offer&entityId=${id}`)).bytes.toString()).toContain(
      '771144',
    );
    expect((await designer.post('/api/offers', offer())).status).toBe(403);
  });
});
