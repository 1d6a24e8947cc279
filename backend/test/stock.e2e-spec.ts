import { calendarDay } from '@stageyard/libs/bill-of-materials';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { newGear } from '../src/testing/new-part.js';
import { type Answer, type Client, startServer, type TestServer } from './harness.js';

interface Movement {
  id: number;
  kind: string;
  change: number;
  after: number;
  by: string;
}
interface Item {
  quantity: number;
  version: number;
  places: { place: string; quantity: number; lastMovementId: number }[];
}
type Booked = Movement & {
  code: string;
  message: string;
  current: Item;
  errors: { field: string; limit?: unknown }[];
};

let server: TestServer;
let librarian: Client;
let purchaser: Client;
let number: string;
beforeAll(async () => {
  server = await startServer();
  librarian = await server.as('librarian');
  purchaser = await server.as('purchaser');
});
beforeEach(async () => {
  ({ number } = (await librarian.post<{ number: string }>('/api/parts', newGear())).body);
});
afterAll(() => server.close());

const book = (client: Client, changes: object): Promise<Answer<Booked>> =>
  client.post<Booked>('/api/stock/movements', {
    number,
    kind: 'received',
    quantity: 1,
    place: 'Rack A',
    ...changes,
  });
const item = async () => (await purchaser.get<Item>(`/api/stock/items/${number}`)).body;
const ledger = async () =>
  (await purchaser.get<{ items: Movement[]; total: number }>(`/api/stock/movements?part=${number}&size=100`))
    .body;
const statuses = (answers: Answer[]) => answers.map(({ status }) => status).sort();

describe('two people at the shelf at once', () => {
  it('cannot both take the last three pieces: one gets them, one is told what is there', async () => {
    await book(librarian, { quantity: 3 });
    const take = { kind: 'issued', quantity: 3 };
    const answers = await Promise.all([book(librarian, take), book(purchaser, take)]);
    expect(statuses(answers)).toEqual([201, 409]);
    const lost = answers.find(({ status }) => status === 409)?.body;
    expect(lost?.code).toBe('not-enough-there');
    expect(lost?.message).toContain(`0 pcs of ${number} lie at Rack A`);
    expect(lost?.current).toMatchObject({ quantity: 0, places: [{ place: 'Rack A', quantity: 0 }] });
    expect((await ledger()).total).toBe(2);
  });

  it('lose and double no movement out of twenty, and the shelf is their sum', async () => {
    await book(librarian, { quantity: 30 });
    const acts = Array.from({ length: 20 }, (_, index) => ({
      kind: ['received', 'issued', 'corrected', 'issued'][index % 4],
      quantity: (index % 3) + 1,
      place: index % 5 === 0 ? 'Rack B' : 'Rack A',
      reason: `Act ${index}`,
    }));
    const answers = await Promise.all(acts.map((act, index) => book(index % 2 ? librarian : purchaser, act)));
    const won = answers.filter(({ status }) => status === 201);
    expect(answers.every(({ status }) => status === 201 || status === 409)).toBe(true);
    const { items, total } = await ledger();
    expect(total).toBe(won.length + 1);
    expect(new Set(items.map(({ id }) => id)).size).toBe(total);
    // The sum by hand: what each accepted request asked for.
    const asked = answers.reduce((sum, { status }, index) => {
      const { kind, quantity } = acts[index] ?? { kind: '', quantity: 0 };
      return status === 201 ? sum + (kind === 'issued' ? -quantity : quantity) : sum;
    }, 30);
    expect((await item()).quantity).toBe(asked);
    expect(items.reduce((sum, { change }) => sum + change, 0)).toBe(asked);
  });

  it('are told when a count saw an older shelf: nothing is booked, and what stands there now is shown', async () => {
    await book(librarian, { quantity: 5 });
    const seen = (await item()).places[0]?.lastMovementId;
    await book(purchaser, { kind: 'issued', quantity: 2 });
    const count = { kind: 'counted', quantity: 5, seenMovementId: seen };
    const late = await book(librarian, count);
    expect(late).toMatchObject({ status: 409, body: { code: 'changed-meanwhile' } });
    expect(late.body.message).toContain('Test purchaser issued 2 pcs');
    expect(late.body.current).toMatchObject({ quantity: 3 });
    const now = late.body.current.places[0]?.lastMovementId;
    const again = await book(librarian, { ...count, quantity: 4, seenMovementId: now });
    expect(again).toMatchObject({ status: 201, body: { change: 1, after: 4 } });
    const first = await book(librarian, { ...count, place: 'Rack B', seenMovementId: 0 });
    expect(first.status).toBe(201);
    expect((await book(purchaser, { ...count, place: 'Rack B', seenMovementId: 0 })).status).toBe(409);
    expect((await book(purchaser, { ...count, place: 'Rack C' })).status).toBe(409);
  });

  it('count at the same moment: one count stands, the other is shown it', async () => {
    const counts = [librarian, purchaser].map((client, index) =>
      book(client, { kind: 'counted', quantity: 7 + index, seenMovementId: 0 }),
    );
    expect(statuses(await Promise.all(counts))).toEqual([201, 409]);
    expect((await ledger()).total).toBe(1);
  });

  it('set the least stock at the same moment: one is refused with the shelf as it stands', async () => {
    const { version } = await item();
    const least = (client: Client, leastStock: number) =>
      client.put<Booked>(`/api/stock/items/${number}/least`, { leastStock, version });
    const answers = await Promise.all([least(librarian, 4), least(purchaser, 9)]);
    expect(statuses(answers)).toEqual([200, 409]);
    const lost = answers.find(({ status }) => status === 409)?.body;
    expect(lost).toMatchObject({ code: 'changed-meanwhile', current: { version: version + 1 } });
  });
});

describe('a request that is sent again', () => {
  it('books once, one after the other and at the same moment', async () => {
    const request = { quantity: 4, requestKey: `once-${number}` };
    const answers = await Promise.all(Array.from({ length: 6 }, () => book(librarian, request)));
    expect(statuses(answers)).toEqual([200, 200, 200, 200, 200, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    await book(librarian, { kind: 'issued', quantity: 4 });
    const late = await book(librarian, request);
    expect(late).toMatchObject({ status: 200, body: { kind: 'received', after: 4 } });
    expect((await item()).quantity).toBe(0);
    expect((await ledger()).total).toBe(2);
  });

  it('is refused when its key was used for another movement', async () => {
    const requestKey = `key-of-${number}`;
    await book(librarian, { requestKey });
    const other = await book(librarian, { requestKey, quantity: 2 });
    expect(other).toMatchObject({ status: 409, body: { code: 'request-key-used' } });
    expect((await item()).quantity).toBe(1);
  });
});

describe('bad input', () => {
  it.each([
    ['a count of −1', { kind: 'counted', quantity: -1 }, 'quantity'],
    ['a count of 1e12', { kind: 'counted', quantity: 1e12 }, 'quantity'],
    ['half a piece', { quantity: 0.5 }, 'quantity'],
    ['a quantity as text', { quantity: '3' }, 'quantity'],
    ['a blank place', { place: '   ' }, 'place'],
    ['a place of two lines', { place: 'Rack\nA' }, 'place'],
    ['a correction without a reason', { kind: 'corrected', quantity: 1 }, 'reason'],
    ['a correction with a blank reason', { kind: 'corrected', quantity: 1, reason: '  ' }, 'reason'],
    ['a kind that does not exist', { kind: 'stolen' }, 'kind'],
    ['a movement seen below zero', { seenMovementId: -1 }, 'seenMovementId'],
    ['a short request key', { requestKey: 'x' }, 'requestKey'],
    ['somebody else as who did it', { by: 'Test purchaser' }, 'by'],
  ])('is refused: %s', async (_, changes, field) => {
    const answer = await book(librarian, changes);
    expect(answer.status).toBe(400);
    expect(answer.body.errors.map((error) => error.field)).toEqual([field]);
    expect((await item()).places).toEqual([]);
  });

  it('is refused: stock issued below zero, with what is there', async () => {
    await book(librarian, { quantity: 2 });
    const answer = await book(purchaser, { kind: 'issued', quantity: 1_000_000 });
    expect(answer).toMatchObject({
      status: 409,
      body: { code: 'not-enough-there', current: { quantity: 2 } },
    });
    expect(answer.body.message).toContain(`Only 2 pcs of ${number} lie at Rack A`);
  });

  it('is refused: a part that does not exist, in every route', async () => {
    expect((await book(librarian, { number: 'NO-SUCH-1' })).status).toBe(404);
    expect((await librarian.get('/api/stock/items/NO-SUCH-1')).status).toBe(404);
    const least = await librarian.put('/api/stock/items/NO-SUCH-1/least', { leastStock: 1, version: 1 });
    expect(least.status).toBe(404);
  });

  it.each(['low=maybe', 'sort=passwordHash', 'place=' + 'x'.repeat(61), 'kind=goose', 'size=101'])(
    'is refused in the shelf list: %s',
    async (query) => expect((await librarian.get(`/api/stock?${query}`)).status).toBe(400),
  );

  it.each(['from=yesterday', 'until=2026-02-30', 'kind=lost', 'sort=reason'])(
    'is refused in the ledger: %s',
    async (query) => expect((await librarian.get(`/api/stock/movements?${query}`)).status).toBe(400),
  );
});

describe('the ledger over HTTP', () => {
  it('finds a part whatever the case of its number, and filters the movements', async () => {
    await book(librarian, { number: number.toLowerCase(), quantity: 6, reason: 'Delivery 4711' });
    await book(purchaser, { kind: 'issued', quantity: 2, place: 'rack a', reason: 'Winch 12' });
    const found = async (query: string) => {
      const path = `/api/stock/movements?part=${number.toLowerCase()}&${query}`;
      return (await purchaser.get<{ items: Movement[] }>(path)).body.items.map(({ change }) => change);
    };
    const today = calendarDay(new Date());
    expect(await found('')).toEqual([-2, 6]);
    expect(await found('sort=at')).toEqual([6, -2]);
    expect(await found('kind=issued')).toEqual([-2]);
    expect(await found('text=delivery')).toEqual([6]);
    expect(await found('place=RACK%20A')).toEqual([-2, 6]);
    expect(await found(`from=${today}&until=${today}`)).toEqual([-2, 6]);
    expect(await found('until=2020-01-01')).toEqual([]);
    expect((await purchaser.get<Item>(`/api/stock/items/${number.toLowerCase()}`)).body.quantity).toBe(4);
  });

  it('lets a viewer look and not book', async () => {
    const viewer = await server.as('viewer');
    expect((await viewer.get(`/api/stock?text=${number}`)).status).toBe(200);
    expect((await viewer.get('/api/stock/places')).status).toBe(200);
    expect((await book(viewer, {})).status).toBe(403);
    const least = await viewer.put(`/api/stock/items/${number}/least`, { leastStock: 1, version: 1 });
    expect(least.status).toBe(403);
  });
});
