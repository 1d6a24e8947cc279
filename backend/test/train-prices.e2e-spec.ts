import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { StockService } from '../src/stock/stock.service.js';
import { LIBRARIAN } from '../src/testing/new-part.js';
import { addSignedIn } from '../src/testing/people.js';
import { newPricedTrain } from '../src/testing/priced-train.js';
import { type TrainPricesDto } from '../src/train-prices/dto/train-prices.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  code: string;
  message?: string;
  errors?: { field: string; message: string }[];
  current?: TrainDto;
}

let server: TestServer;
let purchaser: Client;
let designer: Client;
let train: TrainDto;
/** Ids of offers: two for the bearing, one for a key. */
let tidewater: string;
let quick: string;
let keys: string;

beforeAll(async () => {
  server = await startServer();
  purchaser = await server.as('purchaser');
  designer = await server.as('designer');
  const { app } = server;
  ({ train, tidewater, quick, keys } = await newPricedTrain(app, await addSignedIn(app, 'designer')));
  const stock = app.get(StockService);
  await stock.book(LIBRARIAN, { number: 'B-12', kind: 'received', quantity: 100, place: 'Rack A' });
  await stock.book(LIBRARIAN, { number: 'W-12', kind: 'received', quantity: 49, place: 'Rack A' });
});
afterAll(() => server.close());

const path = () => `/api/trains/${train.code}`;
const prices = async (query = '') => (await purchaser.get<TrainPricesDto>(`${path()}/prices${query}`)).body;
const lineOf = (answer: TrainPricesDto, partNumber: string) =>
  answer.lines.find((line) => line.partNumber === partNumber);
const choose = (body: object, client = purchaser) =>
  client.put<TrainDto & Refusal>(`${path()}/buying`, { version: train.version, ...body });

describe('the prices of a train', () => {
  it.each([
    // Bearings 4 × 5.15 = 20.60 at Quickhaven, since ten at 4.20 come to 42.00; keys 2 → 100 at 9.50; seals 2 × 180; oil 0.2 l → 5 × 12.345 ÷ 10 = 6.1725.
    [1, { EUR: 3010, JPY: 360, KWD: 6173 }],
    // Bearings 100 × 3.10 = 310.00; keys 50 → 100 at 9.50; seals 50 × 150; oil 5 l.
    [25, { EUR: 31_950, JPY: 7500, KWD: 6173 }],
    // Bearings 2,000 × 2.55 = 5,100.00; keys 1,000 at 0.095; seals 1,000 × 150; oil 100 × 1.2345 = 123.45.
    [500, { EUR: 519_500, JPY: 150_000, KWD: 123_450 }],
  ])('are totals by currency for %i builds, across the breaks', async (quantity, expected) => {
    const answer = await prices(`?quantity=${quantity}`);
    expect(lineOf(answer, 'L-220')?.needed).toBe(quantity / 5);
    expect(answer.totals.map(({ currency, minor }) => [currency, minor])).toEqual(Object.entries(expected));
    expect(answer.totals.map(({ lines }) => lines)).toEqual([2, 1, 1]);
  });

  it('are those of the build quantity that the brief named, line by line', async () => {
    expect(train.buildQuantity).toBe(25);
    const answer = await prices();
    expect(answer.buildQuantity).toBe(25);
    expect(lineOf(answer, 'B-12')).toMatchObject({
      needed: 100,
      unit: 'pcs',
      onShelf: 100,
      otherOffers: 1,
      reason: null,
      price: {
        offerId: tidewater,
        supplier: { code: 'S-0001', name: 'Tidewater Bearings' },
        supplierPartNumber: 'TW 12/28',
        currency: 'EUR',
        per: 1,
        unitPrice: 310,
        orderQuantity: 100,
        lineTotal: 31_000,
        surplus: 0,
        // The supplier's usual one: the offer has none.
        leadTimeDays: 21,
        pricedOn: '2020-02-03',
        tooOld: true,
        validUntil: null,
        chosenBy: 'rule',
      },
    });
    expect(answer).toMatchObject({ oldestPricedOn: '2020-02-03', tooOld: 1, longestLeadTimeDays: 40 });
    // 100 bearings cover the need; 49 seals for 50 do not; keys and oil never lay on a shelf.
    expect(answer.shelf).toEqual({ covered: 1, lines: 4 });
  });

  it('name what has no price, and leave made parts out of that', async () => {
    const answer = await prices();
    const { body: bom } = await purchaser.get<{ lines: { key: string; supply: string }[] }>(`${path()}/bom`);
    expect(answer.lines.map(({ key }) => key)).toEqual(bom.lines.map(({ key }) => key));
    const open = answer.lines.filter(({ price }) => price === null);
    expect(open.length).toBeGreaterThan(0);
    for (const { key, reason } of open) {
      const made = bom.lines.find((line) => line.key === key)?.supply === 'made';
      expect(reason).toBe(made ? 'made' : 'no-part');
    }
    expect(answer.unpriced.map(({ key }) => key)).toEqual(
      open.filter(({ reason }) => reason !== 'made').map(({ key }) => key),
    );
  });

  it('say where a larger order costs less', async () => {
    // 12 builds need 48 bearings → 50 × 3.10. 11 need 44 → 50 too. 10 need 40 × 4.20 = 168.00; 50 × 3.10 = 155.00.
    const answer = await prices('?quantity=10');
    expect(lineOf(answer, 'B-12')?.price?.cheaperAt).toEqual({
      orderQuantity: 50,
      lineTotal: 15_500,
      saves: 1300,
    });
  });

  it('prefer the earlier arrival where that is asked for', async () => {
    const answer = await prices('?prefer=arrival');
    // 100 × 5.15 EUR
    expect(lineOf(answer, 'B-12')?.price).toMatchObject({
      offerId: quick,
      leadTimeDays: 2,
      lineTotal: 51_500,
    });
  });
});

describe('how a train is bought', () => {
  it('takes an offer chosen by hand, and goes back to the rule', async () => {
    const chosen = await choose({ choices: [{ partNumber: 'b-12', offerId: quick }], buildQuantity: 2 });
    expect([chosen.status, chosen.body.message]).toEqual([200, undefined]);
    train = chosen.body;
    expect(train).toMatchObject({ buildQuantity: 2, offerChoices: [{ partNumber: 'B-12', offerId: quick }] });
    const viewer = await server.as('viewer');
    expect((await viewer.get<TrainDto>(path())).body).toMatchObject({ buildQuantity: 2, offerChoices: [] });
    // Two builds need 8: 8 × 5.15 = 41.20 EUR, and 42.00 EUR for ten at the other.
    const answer = await prices();
    expect(lineOf(answer, 'B-12')?.price).toMatchObject({ chosenBy: 'person', lineTotal: 4120 });
    const back = await choose({ choices: [{ partNumber: 'B-12', offerId: null }], buildQuantity: 25 });
    train = back.body;
    expect(train).toMatchObject({ buildQuantity: 25, offerChoices: [] });
    expect(lineOf(await prices(), 'B-12')?.price).toMatchObject({ offerId: tidewater, chosenBy: 'rule' });
  });

  it('says so when a chosen offer has run out, and never uses it', async () => {
    train = (await choose({ choices: [{ partNumber: 'B-12', offerId: quick }] })).body;
    const offer = await purchaser.get<{ version: number }>(`/api/offers/${quick}`);
    const ends = { version: offer.body.version, validUntil: '2020-06-30' };
    expect((await purchaser.patch(`/api/offers/${quick}`, ends)).status).toBe(200);
    const answer = await prices();
    expect(lineOf(answer, 'B-12')).toMatchObject({ price: { offerId: tidewater, chosenBy: 'rule' } });
    expect(answer.lostChoices).toEqual([
      {
        partNumber: 'B-12',
        offerId: quick,
        key: 'B-12',
        message:
          'The offer of Quickhaven chosen for B-12 ended on 2020-06-30. The rule chose Tidewater Bearings in its place. Choose another offer, or leave it to the rule.',
      },
    ]);
  });

  it('says so when the part is no longer on the train, and lets the choice be taken back', async () => {
    const thinner = { version: train.version, shaftDiameters: [10, 10] };
    train = (await designer.patch<TrainDto>(path(), thinner)).body;
    const { lostChoices } = await prices();
    expect(lostChoices).toMatchObject([{ partNumber: 'B-12', offerId: quick, key: null }]);
    expect(lostChoices[0]?.message).toContain('no longer on the bill of materials');
    train = (await choose({ choices: [{ partNumber: 'B-12', offerId: null }] })).body;
    expect((await prices()).lostChoices).toEqual([]);
    const thicker = { version: train.version, shaftDiameters: [12, 12] };
    train = (await designer.patch<TrainDto>(path(), thicker)).body;
  });

  it('answers 409 with the train as it stands when it changed since', async () => {
    const stale = await choose({ version: train.version - 1, buildQuantity: 3 });
    expect(stale.status).toBe(409);
    expect(stale.body).toMatchObject({
      code: 'changed-meanwhile',
      current: { code: train.code, version: train.version, buildQuantity: 25 },
    });
    const choices = [{ partNumber: 'K-1', offerId: '1' }];
    expect((await choose({ version: train.version - 1, choices })).status).toBe(409);
  });

  it('changes no version where everything stands that way already', async () => {
    const same = await choose({ buildQuantity: 25, choices: [{ partNumber: 'B-12', offerId: null }] });
    expect([same.status, same.body]).toEqual([200, train]);
  });

  it.each<[string, object, string]>([
    ['a build quantity of 0', { buildQuantity: 0 }, 'buildQuantity'],
    ['a build quantity of one and a half', { buildQuantity: 1.5 }, 'buildQuantity'],
    ['a build quantity of 1e9', { buildQuantity: 1e9 }, 'buildQuantity'],
    ['a build quantity in words', { buildQuantity: 'some' }, 'buildQuantity'],
    ['no build quantity at all', { buildQuantity: null }, 'buildQuantity'],
    [
      'an offer of another part',
      { choices: [{ partNumber: 'B-12', offerId: '#keys' }] },
      'choices.0.offerId',
    ],
    ['an unknown offer', { choices: [{ partNumber: 'B-12', offerId: '99999' }] }, 'choices.0.offerId'],
    ['an offer in words', { choices: [{ partNumber: 'B-12', offerId: 'the best' }] }, 'choices.0.offerId'],
    ['an offer that ended', { choices: [{ partNumber: 'B-12', offerId: '#quick' }] }, 'choices.0.offerId'],
    [
      'a part that is not on the train',
      { choices: [{ partNumber: 'K-1', offerId: '1' }] },
      'choices.0.partNumber',
    ],
    [
      'one part twice',
      {
        choices: [
          { partNumber: 'B-12', offerId: null },
          { partNumber: 'b-12', offerId: null },
        ],
      },
      'choices.1.partNumber',
    ],
    ['a choice without a part', { choices: [{ offerId: null }] }, 'choices.0.partNumber'],
    ['choices that are no list', { choices: 'all' }, 'choices'],
    ['a choice that is nothing', { choices: [null] }, 'choices.0'],
    ['no version', { version: undefined, buildQuantity: 2 }, 'version'],
  ])('refuses %s, naming the field, and keeps what was', async (_, body, field) => {
    const sent = JSON.parse(JSON.stringify(body).replace('#keys', keys).replace('#quick', quick)) as object;
    const version = 'version' in body ? body.version : train.version;
    const answer = await purchaser.put<Refusal>(`${path()}/buying`, { ...sent, version });
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.map((error) => error.field)).toContain(field);
    expect((await designer.get<TrainDto>(path())).body).toEqual(train);
  });

  it.each(['quantity=0', 'quantity=1.5', 'quantity=1e9', 'quantity=many', 'prefer=beauty'])(
    'refuses to price for ?%s',
    async (query) => {
      const answer = await purchaser.get<Refusal>(`${path()}/prices?${query}`);
      expect(answer.status).toBe(400);
      expect(answer.body.errors?.[0]?.field).toBe(query.split('=', 1)[0]);
    },
  );

  it('is nothing for a viewer, who sees no price; a librarian sees and does not choose', async () => {
    const viewer = await server.as('viewer');
    const librarian = await server.as('librarian');
    expect((await viewer.get(`${path()}/prices`)).status).toBe(403);
    expect((await choose({ buildQuantity: 2 }, viewer)).status).toBe(403);
    expect((await librarian.get(`${path()}/prices`)).status).toBe(200);
    expect((await choose({ buildQuantity: 2 }, librarian)).status).toBe(403);
    expect((await purchaser.get('/api/trains/T-9999/prices')).status).toBe(404);
  });

  it('is on the record; who bought from whom only for people who read prices', async () => {
    type Changes = { items: { action: string; entity: string; summary: string }[] };
    const trail = `/api/audit?entityId=${train.code}&size=100`;
    const summaries = async (client: Client) =>
      (await client.get<Changes>(trail)).body.items.map(({ summary }) => summary);
    const told = await summaries(purchaser);
    expect(told).toContain(`Chose the offer of Quickhaven for B-12 of ${train.code}`);
    expect(told).toContain(`Left the offer for B-12 of ${train.code} to the rule`);
    const toViewer = await summaries(await server.as('viewer'));
    expect(toViewer).toContain(`Build quantity of ${train.code} is 2`);
    expect(toViewer.filter((summary) => summary.includes('offer'))).toEqual([]);
  });
});
