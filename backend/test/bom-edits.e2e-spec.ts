import { readSheet } from 'read-excel-file/node';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Change } from '../src/audit/dto/change.js';
import { type Page } from '../src/common/list-query.js';
import { type PartInputDto } from '../src/parts/dto/part-input.dto.js';
import { type PartDto } from '../src/parts/dto/part.dto.js';
import { PartsLoader } from '../src/parts/parts-loader.service.js';
import { StockService } from '../src/stock/stock.service.js';
import { type SubstitutesDto } from '../src/substitutes/dto/substitutes.dto.js';
import { addOffer, addSupplier } from '../src/testing/add-offer.js';
import { newRequirement } from '../src/testing/new-brief.js';
import { LIBRARIAN, newGear, newPart } from '../src/testing/new-part.js';
import { newTrain } from '../src/testing/new-train.js';
import { addSignedIn } from '../src/testing/people.js';
import { type SwapResultDto } from '../src/trains/bom-edits/dto/swap-result.dto.js';
import { type BomDto } from '../src/trains/dto/bom.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  code: string;
  message: string;
  errors?: { field: string; message: string }[];
  current?: TrainDto;
}

let server: TestServer;
let designer: Client;
let librarian: Client;
let train: TrainDto;

const bearing = (number: string, sizes: [number, number, number], changes: Partial<PartInputDto> = {}) => {
  const [bore, outerDiameter, width] = sizes;
  const attributes = { bore, outerDiameter, width, type: 'deep groove ball' };
  return newPart('bearing', attributes, {
    number,
    description: `Bearing ${number}`,
    standing: 'cleared',
    ...changes,
  });
};

/** A single stage of module 2 on two shafts of 12 mm, four trains at once: 16 bearings. */
beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
  librarian = await server.as('librarian');
  const { app } = server;
  await app
    .get(PartsLoader)
    .createMany(LIBRARIAN, [
      bearing('B-12', [12, 28, 8], { mass: 0.022 }),
      bearing('B-12X', [12, 32, 10], { mass: 0.037 }),
      bearing('B-12-DRAFT', [12, 28, 8], { standing: 'draft' }),
      bearing('B-15', [15, 32, 9]),
      newPart(
        'seal',
        { shaftDiameter: 12, outerDiameter: 22, width: 6 },
        { number: 'W-12', standing: 'cleared' },
      ),
      newPart(
        'fastener',
        { thread: 'M6', length: 20, strengthClass: '8.8' },
        { number: 'F-6', standing: 'cleared' },
      ),
      newPart(
        'lubricant',
        { viscosityGrade: 'ISO VG 68', packVolume: 1 },
        { number: 'L-68', standing: 'cleared' },
      ),
    ]);
  const person = await addSignedIn(app, 'designer');
  const requirement = newRequirement({
    ratio: { target: '4', tolerancePercent: '1' },
    stages: { min: 1, max: 1 },
    modules: [2],
    buildQuantity: 4,
  });
  train = await newTrain(app, person, { requirement });
  const { code } = await addSupplier(app, { name: 'Corrie Bearings' });
  // 16 bearings: 16 × 4.00 = 64.00 EUR in 21 days, 16 × 3.00 = 48.00 EUR in 30 days.
  await addOffer(app, 'B-12', code, { breaks: [{ quantity: 1, unitPrice: 400 }], leadTimeDays: 21 });
  // Sooner and dearer: the prices of a train are by price, and so are those that a swap names.
  await addOffer(app, 'B-12', code, { breaks: [{ quantity: 1, unitPrice: 900 }], leadTimeDays: 2 });
  await addOffer(app, 'B-12X', code, { breaks: [{ quantity: 1, unitPrice: 300 }], leadTimeDays: 30 });
  await app
    .get(StockService)
    .book(LIBRARIAN, { number: 'B-12X', kind: 'received', quantity: 16, place: 'Rack A' });
  await edit({ shaftDiameters: [12, 12] });
});
afterAll(() => server.close());

const path = () => `/api/trains/${train.code}`;
async function edit(patch: object): Promise<void> {
  train = (await designer.patch<TrainDto>(path(), { version: train.version, ...patch })).body;
}
const bom = async () => (await designer.get<BomDto>(`${path()}/bom`)).body;
const lineOf = async (key: string) => (await bom()).lines.find((line) => line.key === key);
const swap = (body: object, client = designer) =>
  client.post<SwapResultDto & Refusal>(`${path()}/swaps`, { version: train.version, dryRun: false, ...body });
async function booked(body: object): Promise<SwapResultDto> {
  const answer = await swap(body);
  expect(answer.status).toBe(200);
  if (answer.body.train) train = answer.body.train;
  return answer.body;
}
const standing = async (number: string, change: object) => {
  const { version } = (await librarian.get<PartDto>(`/api/parts/${number}`)).body;
  expect((await librarian.patch(`/api/parts/${number}`, { version, ...change })).status).toBe(200);
};

describe('swapping a bought part', () => {
  it('is shown beforehand: part, mass, price and arrival at the build quantity, and nothing is booked', async () => {
    const before = await bom();
    const { status, body } = await swap({ key: 'B-12', partNumber: 'b-12x', dryRun: true });
    expect(status).toBe(200);
    expect(body.train).toBeNull();
    // Four bearings a train, 37 g for 22 g each: 60 g more.
    const mass = before.totals.massKg;
    expect(body.changes).toEqual([
      { what: 'Part', before: 'B-12, Bearing B-12', after: 'B-12X, Bearing B-12X', verdict: null },
      {
        what: 'Mass of all lines',
        before: `${mass.toFixed(2)} kg`,
        after: `${(mass + 0.06).toFixed(2)} kg`,
        verdict: null,
      },
      { what: 'Price of 16 pcs', before: '64.00 EUR', after: '48.00 EUR', verdict: 'better' },
      { what: 'Arrival of 16 pcs', before: '21 days', after: 'on the shelf', verdict: 'better' },
    ]);
    expect(await bom()).toEqual(before);
    expect((await designer.get<TrainDto>(path())).body.version).toBe(train.version);
  });

  it('is booked: the line keeps its key and names the part it replaces, and the record says who did it', async () => {
    const { version } = train;
    await booked({ key: 'B-12', partNumber: 'b-12x' });
    expect(train.version).toBe(version + 1);
    expect(await lineOf('B-12')).toMatchObject({
      partNumber: 'B-12X',
      quantity: 4,
      mass: 0.037,
      replaces: { partNumber: 'B-12', description: 'Bearing B-12' },
      note: 'Chosen in place of the kit’s own B-12, Bearing B-12.',
    });
    const changes = await designer.get<Page<Change>>(`${path()}/changes`);
    expect(changes.body.items[0]?.summary).toBe(`Took B-12X in place of B-12 on ${train.code}`);
  });

  it('stays over other edits of the train', async () => {
    await edit({ title: 'Renamed' });
    expect((await lineOf('B-12'))?.partNumber).toBe('B-12X');
  });

  it('books nothing the second time', async () => {
    const { version } = train;
    const { changes } = await booked({ key: 'B-12', partNumber: 'B-12X' });
    expect(changes).toEqual([]);
    expect(train.version).toBe(version);
  });

  it('stays when its part is withdrawn, flagged', async () => {
    await standing('B-12X', { standing: 'withdrawn' });
    const line = await lineOf('B-12');
    expect(line?.partNumber).toBe('B-12X');
    expect(line?.flags).toContain('part is withdrawn');
    await standing('B-12X', { standing: 'cleared' });
  });

  it('waits as an unused choice while its line is gone, and can be cleared', async () => {
    await edit({ shaftDiameters: [15, 15] });
    expect((await bom()).idleSwaps).toEqual([{ key: 'B-12', partNumber: 'B-12X' }]);
    await edit({ shaftDiameters: [12, 12] });
    expect((await lineOf('B-12'))?.partNumber).toBe('B-12X');
    await edit({ shaftDiameters: [15, 15] });
    await booked({ key: 'B-12', partNumber: null });
    await edit({ shaftDiameters: [12, 12] });
    expect(await lineOf('B-12')).toMatchObject({ partNumber: 'B-12', replaces: null });
    expect((await bom()).idleSwaps).toEqual([]);
  });

  it('is taken back with null', async () => {
    await booked({ key: 'B-12', partNumber: 'B-12X' });
    const { changes } = await booked({ key: 'B-12', partNumber: null });
    expect(changes.find(({ what }) => what.startsWith('Price'))?.verdict).toBe('worse');
    expect(await lineOf('B-12')).toMatchObject({ partNumber: 'B-12', replaces: null, note: '' });
  });
});

describe('swapping a gear', () => {
  const wheel = async () => (await bom()).lines.find(({ source }) => source.includes('Stage 1 wheel'));

  it('chooses it for the places of its line; the checks and findings that change are named', async () => {
    const [stage] = train.spec.stages;
    const { teeth, faceWidth } = stage!.wheel;
    const gear = (number: string, bore: number) =>
      newGear({
        number,
        standing: 'cleared',
        attributes: { teeth, module: 2, faceWidth, profileShift: 0, bore },
      });
    await server.app.get(PartsLoader).createMany(LIBRARIAN, [gear('G-12', 12), gear('G-10', 10)]);
    const line = await wheel();
    // The kit takes a stock gear of the very bore by itself; the train has none chosen.
    const { changes } = await booked({ key: line?.key, partNumber: 'G-10' });
    expect(train.spec.stages[0]?.wheel.partNumber).toBe('G-10');
    const finding = changes.find(({ what }) => what === 'Finding');
    expect(finding).toMatchObject({ before: '', verdict: 'worse' });
    expect(finding?.after).toContain('has a bore of 10 mm; its shaft is 12 mm');
    expect(changes.find(({ what }) => what === 'Flag')?.after).toContain('bore 10 mm, bore out to 12 mm');
  });

  it('says that a finding is gone', async () => {
    const { changes } = await booked({ key: 'G-10', partNumber: 'G-12' });
    expect(changes.find(({ what }) => what === 'Finding')).toMatchObject({ after: '', verdict: 'better' });
    expect(changes.find(({ what }) => what === 'Part')).toMatchObject({
      before: 'G-10, Spur gear m 2, 24 teeth',
      after: 'G-12, Spur gear m 2, 24 teeth',
    });
    expect((await wheel())?.partNumber).toBe('G-12');
  });

  it('lists what drops in on its line, as its place needs it', async () => {
    const { body } = await designer.get<SubstitutesDto>(`${path()}/substitutes?key=G-12`);
    // One wheel a train, four trains.
    expect(body.quantity).toBe(4);
    expect(body.items.map(({ part, differences }) => [part.number, differences])).toEqual([
      ['G-10', ['bore 10 mm, to be bored out to 12 mm']],
    ]);
  });
});

describe('substitutes on a line', () => {
  it('without a part of its own are all that its place takes', async () => {
    await edit({ shaftDiameters: [12, 15] });
    const key =
      (await bom()).lines.find(({ description }) => description.includes('seal, shaft Ø15'))?.key ?? '';
    const none = await designer.get<SubstitutesDto>(`${path()}/substitutes?key=${encodeURIComponent(key)}`);
    expect(none.body.items).toEqual([]);
    const ofBearing = await designer.get<SubstitutesDto>(`${path()}/substitutes?key=B-12&quantity=3`);
    // 12 × 32 × 10 is no drop-in for 12 × 28 × 8.
    expect(ofBearing.body).toMatchObject({ quantity: 3, items: [] });
    await edit({ shaftDiameters: [12, 12] });
  });

  it('of a line that is not there are refused, naming the key', async () => {
    const answer = await designer.get<Refusal>(`${path()}/substitutes?key=nothing`);
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.[0]?.field).toBe('key');
    expect((await designer.get<Refusal>(`${path()}/substitutes`)).status).toBe(400);
  });
});

describe('a swap that cannot be', () => {
  it.each<[string, object, string, string]>([
    ['an unknown part', { key: 'B-12', partNumber: 'NOBODY' }, 'partNumber', 'There is no part'],
    ['a draft', { key: 'B-12', partNumber: 'B-12-DRAFT' }, 'partNumber', 'is draft'],
    ['a part of another kind', { key: 'B-12', partNumber: 'W-12' }, 'partNumber', 'not a bearing'],
    ['a bore that does not fit', { key: 'B-12', partNumber: 'B-15' }, 'partNumber', 'bore 15 mm, not 12 mm'],
    ['a gear that is none', { key: 'G-12', partNumber: 'B-12' }, 'partNumber', 'not a gear'],
    ['an unknown line', { key: 'B-99', partNumber: 'B-12' }, 'key', 'has no line'],
    ['an unknown line put back', { key: 'B-99', partNumber: null }, 'key', 'has no line'],
    ['no line', { partNumber: 'B-12' }, 'key', 'key'],
    ['a number for a part', { key: 'B-12', partNumber: 7 }, 'partNumber', 'text'],
    ['100,000 characters', { key: 'x'.repeat(100_000), partNumber: null }, 'key', 'at most'],
    ['no word whether to book', { key: 'B-12', partNumber: null, dryRun: 'no' }, 'dryRun', 'true or false'],
    ['no version', { key: 'B-12', partNumber: null, version: null }, 'version', 'version'],
  ])('is refused: %s', async (_, body, field, words) => {
    const answer = await swap(body);
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.map((error) => error.field)).toContain(field);
    expect(answer.body.errors?.map((error) => error.message).join(' ')).toContain(words);
    expect((await designer.get<TrainDto>(path())).body.version).toBe(train.version);
  });

  it('is refused to people who do not edit trains, before anything is looked at', async () => {
    for (const role of ['viewer', 'librarian', 'purchaser'] as const) {
      const answer = await swap({ key: 'B-12', partNumber: 'B-12X' }, await server.as(role));
      expect(answer.status).toBe(403);
    }
  });

  it('is refused when the train changed since, in a dry run too', async () => {
    const stale = { key: 'B-12', partNumber: 'B-12X', version: train.version - 1 };
    for (const dryRun of [true, false]) {
      const answer = await swap({ ...stale, dryRun });
      expect(answer.status).toBe(409);
      expect(answer.body).toMatchObject({ code: 'changed-meanwhile', current: { version: train.version } });
    }
  });

  it('is booked by one of two people who swap at once', async () => {
    const other = await server.asAnother('designer');
    const answers = await Promise.all([
      swap({ key: 'B-12', partNumber: 'B-12X' }),
      swap({ key: 'W-12', partNumber: null }, other).then(() =>
        swap({ key: 'B-12', partNumber: 'B-12X' }, other),
      ),
    ]);
    const statuses = answers.map(({ status }) => status).sort();
    // The later one either comes too late, or finds nothing left to change.
    expect(statuses).toEqual([200, 409]);
    train = (await designer.get<TrainDto>(path())).body;
    await booked({ key: 'B-12', partNumber: null });
  });
});

describe('added lines', () => {
  const put = (body: object, client = designer) =>
    client.put<TrainDto & Refusal>(`${path()}/extra-lines`, { version: train.version, ...body });

  it('stand after the kit’s lines of their kind, and keep their ids over edits', async () => {
    const lines = [
      { partNumber: 'f-6', quantity: 8 },
      { description: 'Name plate', quantity: 1, note: 'engraved' },
      { partNumber: 'L-68', quantity: 0.25 },
      { partNumber: 'B-12', quantity: 2, description: 'spare' },
    ];
    const answer = await put({ lines });
    expect(answer.status).toBe(200);
    train = answer.body;
    const { lines: all, extraLines, totals } = await bom();
    const added = all.filter(({ extraLineId }) => extraLineId !== null);
    expect(added.map(({ kind, partNumber, quantity, unit }) => [kind, partNumber, quantity, unit])).toEqual([
      ['bearing', 'B-12', 2, 'pcs'],
      ['lubricant', 'L-68', 0.25, 'l'],
      ['fastener', 'F-6', 8, 'pcs'],
      ['other', null, 1, 'pcs'],
    ]);
    expect(new Set(all.map(({ key }) => key)).size).toBe(all.length);
    expect(new Set(all.map(({ findNumber }) => findNumber)).size).toBe(all.length);
    expect(totals.lines).toBe(all.length);
    expect(extraLines.map(({ id }) => id)).toEqual(
      added.map(({ extraLineId }) => extraLineId).sort(byOrderOf(extraLines)),
    );
    await edit({ note: 'Something else' });
    expect((await bom()).extraLines).toEqual(extraLines);
  });

  it('are changed by their ids, and taken away by leaving them out', async () => {
    const [screws, plate] = (await bom()).extraLines;
    train = (await put({ lines: [{ ...screws, quantity: 12 }, plate] })).body;
    expect((await bom()).extraLines).toEqual([{ ...screws, quantity: 12 }, plate]);
  });

  it('and chosen parts stand in the workbook', async () => {
    await booked({ key: 'B-12', partNumber: 'B-12X' });
    const { bytes } = await designer.get(`${path()}/bom.xlsx`);
    const cells = (await readSheet(bytes, 'BOM')).flat();
    expect(cells).toEqual(expect.arrayContaining(['B-12X', 'F-6', 'Name plate']));
    expect(cells).not.toContain('B-12');
    await booked({ key: 'B-12', partNumber: null });
  });

  it('can be swapped for another part, but have none of the kit’s own', async () => {
    const screws = (await bom()).lines.find(({ partNumber }) => partNumber === 'F-6');
    await booked({ key: screws?.key, partNumber: 'B-12' });
    expect((await bom()).extraLines[0]?.partNumber).toBe('B-12');
    // A gear on an added line stands in no place of the train.
    const { changes } = await booked({ key: screws?.key, partNumber: 'G-10' });
    expect(changes[0]).toMatchObject({ what: 'Part', after: 'G-10, Spur gear m 2, 24 teeth' });
    const back = await booked({ key: screws?.key, partNumber: 'F-6' });
    expect(back.changes[0]?.before).toBe('G-10, Spur gear m 2, 24 teeth');
    expect((await swap({ key: screws?.key, partNumber: null })).status).toBe(400);
  });

  it('stay when their part is withdrawn, flagged', async () => {
    await standing('F-6', { standing: 'withdrawn' });
    const { lines, extraLines } = await bom();
    expect(lines.find(({ partNumber }) => partNumber === 'F-6')?.flags).toEqual(['part is withdrawn']);
    const again = await put({ lines: extraLines });
    expect(again.status).toBe(200);
    train = again.body;
    await standing('F-6', { standing: 'cleared' });
  });

  it.each<[string, object, string]>([
    ['an unknown part', { partNumber: 'NOBODY', quantity: 1 }, 'lines.0.partNumber'],
    ['a draft', { partNumber: 'B-12-DRAFT', quantity: 1 }, 'lines.0.partNumber'],
    ['neither part nor description', { quantity: 1 }, 'lines.0.description'],
    ['half a piece', { partNumber: 'F-6', quantity: 1.5 }, 'lines.0.quantity'],
    ['four decimals of a litre', { partNumber: 'L-68', quantity: 0.0001 }, 'lines.0.quantity'],
    ['a quantity of 0', { partNumber: 'F-6', quantity: 0 }, 'lines.0.quantity'],
    ['a quantity below 0', { partNumber: 'F-6', quantity: -1 }, 'lines.0.quantity'],
    ['a quantity of 1e12', { partNumber: 'F-6', quantity: 1e12 }, 'lines.0.quantity'],
    ['a quantity in words', { partNumber: 'F-6', quantity: 'ten' }, 'lines.0.quantity'],
    ['screws by the litre', { partNumber: 'F-6', quantity: 1, unit: 'l' }, 'lines.0.unit'],
    ['an unknown unit', { description: 'Rope', quantity: 1, unit: 'yd' }, 'lines.0.unit'],
    ['an id that is gone', { id: 'nothing', description: 'Rope', quantity: 1 }, 'lines.0.id'],
    [
      'a description of 100,000 characters',
      { description: 'x'.repeat(100_000), quantity: 1 },
      'lines.0.description',
    ],
  ])('are refused: %s', async (_, line, field) => {
    const answer = await put({ lines: [line] });
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.map((error) => error.field)).toContain(field);
  });

  it('are refused when the train changed since, and to people who do not edit trains', async () => {
    const stale = await put({ lines: [], version: train.version - 1 });
    expect(stale.status).toBe(409);
    expect(stale.body).toMatchObject({ code: 'changed-meanwhile', current: { version: train.version } });
    expect((await put({ lines: [] }, await server.as('viewer'))).status).toBe(403);
    expect((await bom()).extraLines).toHaveLength(2);
  });
});

function byOrderOf(lines: readonly { id: string }[]) {
  const place = (id: string | null) => lines.findIndex((line) => line.id === id);
  return (a: string | null, b: string | null) => place(a) - place(b);
}
