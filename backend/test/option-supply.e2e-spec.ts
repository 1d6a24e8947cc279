import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type BriefDto } from '../src/briefs/dto/brief.dto.js';
import { type SearchSupplyDto } from '../src/option-supply/dto/search-supply.dto.js';
import { type SearchDto } from '../src/option-searches/dto/search.dto.js';
import { PartsLoader } from '../src/parts/parts-loader.service.js';
import { StockService } from '../src/stock/stock.service.js';
import { addOffer, addSupplier } from '../src/testing/add-offer.js';
import { newRequirement } from '../src/testing/new-brief.js';
import { LIBRARIAN, newGear } from '../src/testing/new-part.js';
import { newSearchedBrief } from '../src/testing/new-train.js';
import { addSignedIn } from '../src/testing/people.js';
import { type TrainPricesDto } from '../src/train-prices/dto/train-prices.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

let server: TestServer;
let designer: Client;
let search: SearchDto;

/** The searched trains have one stage of module 2; gears of 17 and 68 teeth stand in the library, twice the pinion. */
beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
  const { app } = server;
  const gear = (number: string, teeth: number, faceWidth: number) =>
    newGear({ number, standing: 'cleared', attributes: { teeth, module: 2, faceWidth, bore: 12 } });
  await app
    .get(PartsLoader)
    .createMany(LIBRARIAN, [gear('P-NARROW', 17, 20), gear('P-SHELF', 17, 22), gear('W-68', 68, 20)]);
  const { code } = await addSupplier(app, { leadTimeDays: 9 });
  const { code: other } = await addSupplier(app, { currency: 'JPY', leadTimeDays: 30 });
  // 12.50 EUR from 1, 11.00 EUR from 10; the wheel 4,000 JPY.
  await addOffer(app, 'P-NARROW', code, { breaks: [{ quantity: 1, unitPrice: 900 }] });
  await addOffer(app, 'P-SHELF', code);
  await addOffer(app, 'W-68', other, { breaks: [{ quantity: 1, unitPrice: 4000 }] });
  const place = 'Rack B';
  await app.get(StockService).book(LIBRARIAN, { number: 'P-SHELF', kind: 'received', quantity: 6, place });
  search = await newSearchedBrief(app, await addSignedIn(app, 'designer'), {
    requirement: newRequirement({
      ratio: { target: '4', tolerancePercent: '2' },
      stages: { min: 1, max: 1 },
      modules: [2],
      buildQuantity: 6,
      limit: 50,
    }),
  });
});
afterAll(() => server.close());

const supply = async (query = '', client = designer) =>
  (await client.get<SearchSupplyDto>(`/api/searches/${search.id}/supply${query}`)).body;
const optionOf = ({ options }: SearchSupplyDto, teeth: string) =>
  options.find(({ key }) => key.startsWith(teeth));

describe('cost and stock of the options of a search', () => {
  it('are those of the build quantity that the brief names', async () => {
    const answer = await supply();
    expect(answer.quantity).toBe(6);
    expect(answer.options.map(({ key }) => key)).toEqual(search.outcome?.options.map(({ key }) => key));
    // Six pinions lie on the shelf, and the same gear counts in the cost: 6 × 12.50 EUR; wheels 6 × 4,000 JPY.
    expect(optionOf(answer, '17/68')).toEqual({
      key: expect.stringMatching(/^17\/68/) as string,
      gears: 2,
      fromStock: 2,
      onShelf: 1,
      toMake: 0,
      costs: [
        { currency: 'EUR', minor: 7500 },
        { currency: 'JPY', minor: 24_000 },
      ],
      priced: 2,
      unpriced: 0,
      longestLeadTimeDays: 30,
    });
  });

  it('follow another build quantity of the brief, which does not make it open again', async () => {
    const path = `/api/briefs/${search.briefId}`;
    const { body: brief } = await designer.get<BriefDto>(path);
    const change = (version: number, changes: object) =>
      designer.patch<BriefDto>(path, { version, requirement: { ...brief.requirement, ...changes } });
    const more = await change(brief.version, { buildQuantity: 7 });
    expect(more.body).toMatchObject({ standing: 'searched', requirement: { buildQuantity: 7 } });
    expect((await supply()).quantity).toBe(7);
    const back = await change(brief.version + 1, {});
    expect(back.body).toMatchObject({ standing: 'searched', requirement: { buildQuantity: 6 } });
    const other = await change(brief.version + 2, { modules: [2.5] });
    expect(other.body.standing).toBe('open');
  });

  it('take the narrower pinion once the shelf no longer covers the need', async () => {
    // Seven: the shelf holds six; both are offered; P-NARROW is narrower: 7 × 9.00 EUR.
    expect(optionOf(await supply('?quantity=7'), '17/68')).toMatchObject({
      onShelf: 0,
      costs: [
        { currency: 'EUR', minor: 6300 },
        { currency: 'JPY', minor: 28_000 },
      ],
    });
  });

  it('say what is to be made and has no price', async () => {
    const answer = await supply();
    const made = answer.options.find(({ toMake }) => toMake === 2);
    expect(made).toMatchObject({ gears: 2, fromStock: 0, onShelf: 0, costs: [], priced: 0, unpriced: 2 });
    expect(made?.longestLeadTimeDays).toBeNull();
    // Another wheel on the pinion of the shelf: one is bought, one is made.
    const mixed = answer.options.find(({ key, toMake }) => key.startsWith('17/') && toMake === 1);
    expect(mixed).toMatchObject({ fromStock: 1, onShelf: 1, priced: 1, unpriced: 1 });
  });

  it('name the gears that adopting then takes, at the same price', async () => {
    const key = optionOf(await supply(), '17/68')?.key;
    const { briefId, id: searchId } = search;
    const { body: train } = await designer.post<TrainDto>('/api/trains', {
      briefId,
      searchId,
      optionKey: key,
    });
    const [stage] = train.spec.stages;
    expect([stage?.pinion.partNumber, stage?.wheel.partNumber]).toEqual(['P-SHELF', 'W-68']);
    expect(train.buildQuantity).toBe(6);
    const { body: prices } = await designer.get<TrainPricesDto>(`/api/trains/${train.code}/prices`);
    const gears = prices.lines.filter(({ findNumber }) => findNumber < 200);
    expect(gears.map(({ price }) => [price?.currency, price?.lineTotal])).toEqual([
      ['EUR', 7500],
      ['JPY', 24_000],
    ]);
  });

  it.each(['quantity=0', 'quantity=1.5', 'quantity=1e9'])('are refused for ?%s', async (query) => {
    const answer = await designer.get<{ errors?: { field: string }[] }>(
      `/api/searches/${search.id}/supply?${query}`,
    );
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.[0]?.field).toBe('quantity');
  });

  it('are nothing for a viewer, and for a search that is not there', async () => {
    const viewer = await server.as('viewer');
    expect((await viewer.get(`/api/searches/${search.id}/supply`)).status).toBe(403);
    expect((await designer.get('/api/searches/9999/supply')).status).toBe(404);
  });
});
