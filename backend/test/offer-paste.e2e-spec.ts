import { addDays, calendarDay } from '@stageyard/libs/bill-of-materials';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PartsLoader } from '../src/parts/parts-loader.service.js';
import { newOffer, newSupplier } from '../src/testing/new-offer.js';
import { LIBRARIAN, newGear } from '../src/testing/new-part.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Row {
  row: number;
  action: string;
  partNumber: string | null;
  summary: string;
  changes: string[];
  problems: { column: string; value: string; message: string }[];
}
interface Preview {
  columns: { name: string; from: string }[];
  rows: Row[];
  counts: { add: number; change: number; same: number; wrong: number };
  token: string;
}
interface Offer {
  id: string;
  part: { number: string };
  supplierPartNumber: string;
  breaks: { quantity: number; unitPrice: number }[];
  currency: string;
  per: number;
  pack: number;
  leadTimeDays: number | null;
  validFrom: string;
  validUntil: string | null;
  pricedOn: string;
  source: string;
  version: number;
}
interface Refusal {
  code: string;
  message: string;
  errors?: { field: string; message: string }[];
  current?: Preview;
}

const day = (offset: number) => addDays(calendarDay(new Date()), offset);

let server: TestServer;
let purchaser: Client;
let parts: string[];
beforeAll(async () => {
  server = await startServer();
  purchaser = await server.as('purchaser');
  const inputs = Array.from({ length: 520 }, () => newGear({ standing: 'cleared' }));
  parts = await server.app.get(PartsLoader).createMany(LIBRARIAN, inputs);
});
afterAll(() => server.close());

const part = (index: number) => parts[index] ?? '';

async function addSupplier(changes: Parameters<typeof newSupplier>[0] = {}): Promise<string> {
  return (await purchaser.post<{ code: string }>('/api/suppliers', newSupplier(changes))).body.code;
}

async function preview(supplierCode: string, text: string, defaults?: object): Promise<Preview> {
  const body = { supplierCode, text, ...(defaults && { defaults }) };
  const answer = await purchaser.post<Preview>('/api/offers/paste', body);
  expect([answer.status, answer.body]).toEqual([200, answer.body]);
  return answer.body;
}

function book<T = { added: number; changed: number; same: number; leftOut: number }>(body: object) {
  return purchaser.post<T>('/api/offers/paste/book', { leaveOutWrong: false, ...body });
}

async function offersOf(supplierCode: string, query = 'sort=part'): Promise<Offer[]> {
  const { body } = await purchaser.get<{ items: Offer[] }>(
    `/api/offers?supplier=${supplierCode}&size=100&${query}`,
  );
  return body.items;
}

const countOf = async (supplierCode: string, query = '') =>
  (await purchaser.get<{ total: number }>(`/api/offers?supplier=${supplierCode}&size=1${query}`)).body.total;

describe('500 pasted rows of which 3 are wrong', () => {
  let supplierCode: string;
  let text: string;
  beforeAll(async () => {
    supplierCode = await addSupplier();
    const rows = Array.from({ length: 500 }, (_, index) => [
      part(index),
      `NW-${index}`,
      '1',
      `${index + 1}.50`,
      '12',
    ]);
    Object.assign(rows[99] ?? [], { 0: 'KW-99999' });
    Object.assign(rows[249] ?? [], { 3: '12,500' });
    Object.assign(rows[499] ?? [], { 3: '-4.00' });
    const head = ['Part number', 'Supplier part number', 'From quantity', 'Price', 'Lead time days'];
    text = [head, ...rows].map((cells) => cells.join('\t')).join('\r\n');
  });

  it('are looked at, and the three are named with the column and the reason; nothing is booked', async () => {
    const { counts, rows } = await preview(supplierCode, text);
    expect(counts).toEqual({ add: 497, change: 0, same: 0, wrong: 3 });
    // The head is row 1 of the sheet, so the hundredth row below it is row 101.
    expect(
      rows.filter(({ action }) => action === 'wrong').map(({ row, problems }) => [row, problems]),
    ).toEqual([
      [
        101,
        [
          {
            column: 'Part number',
            value: 'KW-99999',
            message: expect.stringContaining('There is no part') as string,
          },
        ],
      ],
      [251, [{ column: 'Price', value: '12,500', message: expect.stringContaining('two ways') as string }]],
      [501, [{ column: 'Price', value: '-4.00', message: expect.stringContaining('below 0') as string }]],
    ]);
    expect(await countOf(supplierCode)).toBe(0);
  });

  it('are refused as a whole unless the wrong ones are to be left out', async () => {
    const { token } = await preview(supplierCode, text);
    const { status, body } = await book<Refusal>({ supplierCode, text, token });
    expect([status, body.code]).toEqual([400, 'bad-input']);
    expect(body.message).toContain('3 rows are wrong');
    expect(body.errors?.map(({ message }) => message.split(':')[0])).toEqual([
      'Row 101',
      'Row 251',
      'Row 501',
    ]);
    expect(await countOf(supplierCode)).toBe(0);
  });

  it('leave out the three and book 497, each with its row in the record', async () => {
    const { token } = await preview(supplierCode, text);
    const { status, body } = await book({ supplierCode, text, token, leaveOutWrong: true });
    expect([status, body]).toEqual([200, { added: 497, changed: 0, same: 0, leftOut: 3 }]);
    expect(await countOf(supplierCode)).toBe(497);
    const added = await purchaser.get<{ total: number }>(
      `/api/audit?entity=offer&text=of%20${supplierCode}%20for`,
    );
    expect(added.body.total).toBe(497);
    const [offer] = await offersOf(supplierCode, `part=${part(0)}`);
    expect(offer).toMatchObject({
      supplierPartNumber: 'NW-0',
      breaks: [{ quantity: 1, unitPrice: 150 }],
      currency: 'EUR',
      leadTimeDays: 12,
      validFrom: day(0),
      pricedOn: day(0),
      version: 1,
    });
  });

  it('are the same when they are pasted again, and change what differs', async () => {
    expect((await preview(supplierCode, text)).counts).toEqual({ add: 0, change: 0, same: 497, wrong: 3 });
    const dearer = text.replace('1.50\t12', '1.75\t14');
    const { rows, counts, token } = await preview(supplierCode, dearer);
    expect(counts).toEqual({ add: 0, change: 1, same: 496, wrong: 3 });
    expect(rows[0]).toMatchObject({
      action: 'change',
      changes: ['Price: 1.50 EUR from 1 → 1.75 EUR from 1', 'Lead time: 12 days → 14 days'],
    });
    const { body } = await book({ supplierCode, text: dearer, token, leaveOutWrong: true });
    expect(body).toEqual({ added: 0, changed: 1, same: 496, leftOut: 3 });
    const [offer] = await offersOf(supplierCode, `part=${part(0)}`);
    expect(offer).toMatchObject({ breaks: [{ quantity: 1, unitPrice: 175 }], leadTimeDays: 14, version: 2 });
    const { body: changes } = await purchaser.get<{
      items: { action: string; before: object; after: object }[];
    }>(`/api/offers/${offer?.id}/changes`);
    expect(changes.items[0]).toMatchObject({
      action: 'changed',
      before: { breaks: [{ quantity: 1, unitPrice: 150 }], leadTimeDays: 12 },
      after: { breaks: [{ quantity: 1, unitPrice: 175 }], leadTimeDays: 14 },
    });
  });
});

describe('a preview that is out of date', () => {
  it('is refused with the new one when somebody changed an offer since', async () => {
    const supplierCode = await addSupplier();
    const { body: offer } = await purchaser.post<Offer>(
      '/api/offers',
      newOffer({ partNumber: part(0), supplierCode }),
    );
    const text = `${part(0)}\t\t1\t9.00\n${part(1)}\t\t1\t8.00`;
    const old = await preview(supplierCode, text);
    expect(old.counts).toEqual({ add: 1, change: 1, same: 0, wrong: 0 });
    await purchaser.patch(`/api/offers/${offer.id}`, { version: 1, leadTimeDays: 3 });
    const { status, body } = await book<Refusal>({ supplierCode, text, token: old.token });
    expect([status, body.code]).toEqual([409, 'preview-outdated']);
    expect(body.current?.token).not.toBe(old.token);
    expect(body.current?.rows.map(({ action }) => action)).toEqual(['change', 'add']);
    expect(await countOf(supplierCode)).toBe(1);
    const again = await book({ supplierCode, text, token: body.current?.token });
    expect(again.body).toEqual({ added: 1, changed: 1, same: 0, leftOut: 0 });
  });

  it('lets one of two bookings at once through', async () => {
    const supplierCode = await addSupplier();
    const text = `${part(0)}\t\t1\t9.00\n${part(1)}\t\t1\t8.00`;
    const { token } = await preview(supplierCode, text);
    const other = await server.as('librarian');
    const answers = await Promise.all(
      [purchaser, other].map((client) =>
        client.post('/api/offers/paste/book', { supplierCode, text, token, leaveOutWrong: false }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await countOf(supplierCode)).toBe(2);
  });

  it('is refused when the text is another', async () => {
    const supplierCode = await addSupplier();
    const { token } = await preview(supplierCode, `${part(0)}\t\t1\t9.00`);
    const { status, body } = await book<Refusal>({ supplierCode, text: `${part(0)}\t\t1\t9.01`, token });
    expect([status, body.code]).toEqual([409, 'preview-outdated']);
    expect(await countOf(supplierCode)).toBe(0);
  });
});

describe('rows of one part', () => {
  it('become the price breaks of one offer, as rows or as columns', async () => {
    const [rowwise, columnwise] = [await addSupplier(), await addSupplier()];
    const breaks = [
      { quantity: 1, unitPrice: 500 },
      { quantity: 10, unitPrice: 450 },
      { quantity: 50, unitPrice: 405 },
    ];
    const rows = `${part(0)}\t\t1\t5.00\n${part(0)}\t\t10\t4.50\n${part(0)}\t\t50\t4.05`;
    const seen = await preview(rowwise, rows);
    expect(seen.rows.map(({ action }) => action)).toEqual(['add', 'add', 'add']);
    expect((await book({ supplierCode: rowwise, text: rows, token: seen.token })).body.added).toBe(1);
    const heads = 'Price from 1\tPrice from 10\tPart no.\tPRICE FROM 50\tColour';
    const columns = `${heads}\n5.00\t4.50\t${part(0)}\t4.05\tblue`;
    const other = await preview(columnwise, columns);
    expect(other.columns).toContainEqual({ name: 'left out', from: 'Colour' });
    expect((await book({ supplierCode: columnwise, text: columns, token: other.token })).body.added).toBe(1);
    for (const code of [rowwise, columnwise]) expect((await offersOf(code))[0]?.breaks).toEqual(breaks);
  });

  it('are all wrong when one of them is', async () => {
    const supplierCode = await addSupplier();
    const { rows } = await preview(
      supplierCode,
      `${part(0)}\t\t10\t5.00\n${part(1)}\t\t1\t5\n${part(0)}\t\t1\t6.00`,
    );
    expect(rows.map(({ action }) => action)).toEqual(['wrong', 'add', 'wrong']);
    expect(rows[0]?.problems[0]?.message).toContain('Row 3');
    expect(rows[2]?.problems).toEqual([
      {
        column: 'From quantity',
        value: '1',
        message: expect.stringContaining('smaller quantity first') as string,
      },
    ]);
  });

  it('must agree in their terms', async () => {
    const supplierCode = await addSupplier();
    const text = `Part\tFrom\tPrice\tPack\n${part(0)}\t1\t5.00 EUR\t5\n${part(0)}\t10\t4.00 USD\t10`;
    const { rows } = await preview(supplierCode, text);
    expect(rows[1]?.problems.map(({ column }) => column)).toEqual(['Currency', 'Pack']);
  });
});

describe('what a pasted row changes', () => {
  it('is the offer under the same supplier number, else the one without a number', async () => {
    const supplierCode = await addSupplier();
    const [named, blank] = [
      (
        await purchaser.post<Offer>(
          '/api/offers',
          newOffer({ partNumber: part(0), supplierCode, supplierPartNumber: 'A1' }),
        )
      ).body,
      (await purchaser.post<Offer>('/api/offers', newOffer({ partNumber: part(1), supplierCode }))).body,
    ];
    const text = `${part(0)}\ta1\t1\t3.00\n${part(1)}\tB2\t1\t3.00\n${part(0)}\tA9\t1\t3.00`;
    const { rows, token } = await preview(supplierCode, text);
    expect(rows.map(({ action }) => action)).toEqual(['change', 'change', 'add']);
    await book({ supplierCode, text, token });
    expect((await purchaser.get<Offer>(`/api/offers/${named.id}`)).body.breaks).toEqual([
      { quantity: 1, unitPrice: 300 },
    ]);
    expect((await purchaser.get<Offer>(`/api/offers/${blank.id}`)).body.supplierPartNumber).toBe('B2');
  });

  it('is found by the supplier number alone', async () => {
    const supplierCode = await addSupplier();
    await purchaser.post(
      '/api/offers',
      newOffer({ partNumber: part(7), supplierCode, supplierPartNumber: 'ONLY-7' }),
    );
    const { rows } = await preview(supplierCode, 'Supplier part number\tPrice\nonly-7\t2.00\nONLY-8\t2.00');
    expect(rows[0]).toMatchObject({ action: 'change', partNumber: part(7) });
    expect(rows[1]).toMatchObject({ action: 'wrong' });
    expect(rows[1]?.problems[0]).toMatchObject({ column: 'Supplier part number', value: 'ONLY-8' });
  });

  it('is never an offer that has ended, and not the present one when the rows start later', async () => {
    const supplierCode = await addSupplier();
    const at = { supplierCode, pricedOn: day(-300), validFrom: day(-300) };
    await purchaser.post('/api/offers', newOffer({ ...at, partNumber: part(0), validUntil: day(-1) }));
    await purchaser.post('/api/offers', newOffer({ ...at, partNumber: part(1) }));
    const text = `${part(0)}\t\t1\t3.00\n${part(1)}\t\t1\t3.00`;
    const now = await preview(supplierCode, text);
    expect(now.rows.map(({ action }) => action)).toEqual(['add', 'change']);
    const later = await preview(supplierCode, text, { validFrom: day(30), pricedOn: day(0) });
    expect(later.rows.map(({ action }) => action)).toEqual(['add', 'add']);
    expect(later.rows[1]?.summary).toContain('goes on beside it');
    await book({
      supplierCode,
      text,
      token: later.token,
      defaults: { validFrom: day(30), pricedOn: day(0) },
    });
    // The same list again finds what it added; without a day it is about the present price.
    expect((await preview(supplierCode, text, { validFrom: day(30), pricedOn: day(0) })).counts.same).toBe(2);
    expect((await preview(supplierCode, text)).rows[1]?.action).toBe('change');
  });

  it('takes what the rows do not say from the defaults, for changed offers too', async () => {
    const supplierCode = await addSupplier({ currency: 'JPY' });
    const defaults = { currency: 'EUR', pricedOn: '2026-01-15', validUntil: '2199-12-31', source: 'List 9' };
    const text = `${part(0)}\t\t1\t3.00`;
    const { token } = await preview(supplierCode, text, defaults);
    await book({ supplierCode, text, token, defaults });
    expect((await offersOf(supplierCode))[0]).toMatchObject({
      currency: 'EUR',
      pricedOn: '2026-01-15',
      validUntil: '2199-12-31',
      source: 'List 9',
    });
  });

  it('lets a least quantity that came from the first price follow it, and keeps one that was stated', async () => {
    const supplierCode = await addSupplier();
    const fromTen = { supplierCode, breaks: [{ quantity: 10, unitPrice: 500 }] };
    await purchaser.post('/api/offers', newOffer({ ...fromTen, partNumber: part(0) }));
    await purchaser.post('/api/offers', newOffer({ ...fromTen, partNumber: part(1), leastQuantity: 20 }));
    const { rows } = await preview(supplierCode, `${part(0)}\t\t1\t6.00\n${part(1)}\t\t1\t6.00`);
    expect(rows[0]?.changes).toContain('Least quantity: 10 → 1');
    expect(rows[1]?.changes.join()).not.toContain('Least quantity');
  });

  it('never changes a price a hundredfold because a column is missing', async () => {
    const supplierCode = await addSupplier();
    await purchaser.post('/api/offers', newOffer({ partNumber: part(0), supplierCode, per: 100 }));
    await purchaser.post('/api/offers', newOffer({ partNumber: part(1), supplierCode, currency: 'USD' }));
    const { rows } = await preview(supplierCode, `${part(0)}\t\t1\t12.00\n${part(1)}\t\t1\t12.00`);
    expect(rows.map(({ problems }) => problems[0]?.column)).toEqual(['Per', 'Currency']);
    const said = `Part\tPrice\tPer\n${part(0)}\t12.00\t100\n${part(1)}\t12.00 USD\t`;
    expect((await preview(supplierCode, said)).counts).toEqual({ add: 0, change: 2, same: 0, wrong: 0 });
  });
});

describe('a pasted row is wrong', () => {
  it.each([
    ['that can be read two ways', 'X\t\t1\t3,500', 'Price'],
    ['with text in place of a price', 'X\t\t1\ton request', 'Price'],
    ['without a price', 'X\t\t1', 'Price'],
    ['with a price of nothing', 'X\t\t1\t0.00', 'Price'],
    ['with a tenth of a cent', 'X\t\t1\t0.125', 'Price'],
    ['with a quantity of 1e12', 'X\t\t1000000000000\t5.00', 'From quantity'],
    ['with half a piece', 'X\t\t0.5\t5.00', 'From quantity'],
    ['with an unknown currency', 'X\t\t1\t5.00\tXYZ', 'Currency'],
    ['with a price for 7', 'X\t\t1\t5.00\tEUR\t7', 'Per'],
    ['with a lead time of weeks', 'X\t\t1\t5.00\tEUR\t1\t1\t1\t3 weeks', 'Lead time days'],
    ['with a day that can be read two ways', 'X\t\t1\t5.00\tEUR\t1\t1\t1\t5\t03/04/2026', 'Valid from'],
    ['with an end before its start', 'X\t\t1\t5.00\tEUR\t1\t1\t1\t5\t2026-05-02\t2026-05-01', 'Valid until'],
    ['without a part', '\t\t1\t5.00', 'Part number'],
    ['with more cells than columns', `X\t\t1\t5.00${'\t'.repeat(11)}\tmore`, ''],
  ])('%s', async (_, line, column) => {
    const supplierCode = await addSupplier();
    const { rows, counts } = await preview(supplierCode, line.replace('X', part(0)));
    expect(counts).toEqual({ add: 0, change: 0, same: 0, wrong: 1 });
    expect(rows[0]?.problems.map((problem) => problem.column)).toEqual([column]);
    expect(rows[0]?.summary).toBe(rows[0]?.problems[0]?.message);
  });

  it('for a withdrawn part, and says which part replaces it', async () => {
    const librarian = await server.as('librarian');
    await librarian.patch(`/api/parts/${part(510)}`, {
      version: 1,
      standing: 'withdrawn',
      successorNumber: part(511),
    });
    const { rows } = await preview(await addSupplier(), `${part(510)}\t\t1\t5.00`);
    expect(rows[0]?.problems[0]).toMatchObject({ column: 'Part number' });
    expect(rows[0]?.summary).toContain(part(511));
  });

  it('when two of them change the same offer', async () => {
    const supplierCode = await addSupplier();
    await purchaser.post(
      '/api/offers',
      newOffer({ partNumber: part(0), supplierCode, supplierPartNumber: 'TWICE' }),
    );
    const { rows } = await preview(supplierCode, `${part(0)}\tTWICE\t1\t5.00\n${part(0)}\t\t1\t6.00`);
    expect(rows.map(({ action }) => action)).toEqual(['change', 'wrong']);
    expect(rows[1]?.summary).toContain('Row 1');
  });

  it('when two of them would add the same offer, one by the part number and one by the supplier number', async () => {
    const supplierCode = await addSupplier();
    const ended = { validFrom: day(-300), validUntil: day(-1), supplierPartNumber: 'ENDED' };
    await purchaser.post('/api/offers', newOffer({ ...ended, partNumber: part(2), supplierCode }));
    const { rows } = await preview(supplierCode, `${part(2)}\tENDED\t1\t5.00\n\tended\t1\t6.00`);
    expect(rows.map(({ action }) => action)).toEqual(['add', 'wrong']);
    expect(rows[1]?.summary).toContain('Row 1');
  });
});

describe('pasting', () => {
  it.each([
    ['nothing', { text: '  ' }, 'text'],
    ['a head alone', { text: 'Part number\tPrice' }, 'text'],
    ['a head without a price', { text: 'Part number\tLead time\nX\t5' }, 'text'],
    ['2,001 rows', { text: 'X\t\t1\t5\n'.repeat(2001) }, 'text'],
    ['an unknown default currency', { text: 'X', defaults: { currency: 'XYZ' } }, 'defaults.currency'],
    ['a default that is no day', { text: 'X', defaults: { pricedOn: 'yesterday' } }, 'defaults.pricedOn'],
  ])('refuses %s', async (_, body, field) => {
    const answer = await purchaser.post<Refusal>('/api/offers/paste', {
      supplierCode: await addSupplier(),
      ...body,
    });
    expect([answer.status, answer.body.errors?.[0]?.field]).toEqual([400, field]);
  });

  it('is for known and open suppliers, and for people who may write prices', async () => {
    const supplierCode = await addSupplier();
    const body = { supplierCode, text: `${part(0)}\t\t1\t5.00` };
    for (const role of ['viewer', 'designer'] as const) {
      expect((await (await server.as(role)).post('/api/offers/paste', body)).status).toBe(403);
      expect((await (await server.as(role)).post('/api/offers/paste/book', body)).status).toBe(403);
    }
    expect((await purchaser.post('/api/offers/paste', { ...body, supplierCode: 'S-9999' })).status).toBe(404);
    await purchaser.patch(`/api/suppliers/${supplierCode}`, { version: 1, standing: 'closed' });
    const closed = await purchaser.post<Refusal>('/api/offers/paste', body);
    expect([closed.status, closed.body.errors?.[0]?.field]).toEqual([400, 'supplierCode']);
  });

  it('keeps script text and formulas as the text they are', async () => {
    const supplierCode = await addSupplier();
    const text = `Part\tPrice\tSupplier part number\tSource\n${part(0)}\t5.00\t=1+1\t<script>alert(1)</script>`;
    const { token } = await preview(supplierCode, text);
    await book({ supplierCode, text, token });
    expect((await offersOf(supplierCode))[0]).toMatchObject({
      supplierPartNumber: '=1+1',
      source: '<script>alert(1)</script>',
    });
  });
});
