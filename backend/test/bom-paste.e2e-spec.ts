import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { PartsLoader } from '../src/parts/parts-loader.service.js';
import { newRequirement } from '../src/testing/new-brief.js';
import { LIBRARIAN, newPart } from '../src/testing/new-part.js';
import { newTrain } from '../src/testing/new-train.js';
import { addSignedIn } from '../src/testing/people.js';
import {
  type BomPasteBookedDto,
  type BomPastePreviewDto,
} from '../src/trains/bom-edits/dto/bom-paste.dto.js';
import { type BomDto } from '../src/trains/dto/bom.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  code: string;
  message: string;
  errors?: { field: string; value: unknown; message: string }[];
  current?: BomPastePreviewDto & TrainDto;
}

let server: TestServer;
let designer: Client;
let train: TrainDto;

/** Screws of the library; the other rows name things without a number. */
const SCREWS = 100;
const screw = (index: number) => `F-${String(index).padStart(3, '0')}`;

beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
  const { app } = server;
  const bearing = (number: string, bore: number, outerDiameter: number) =>
    newPart(
      'bearing',
      { bore, outerDiameter, width: 8, type: 'deep groove ball' },
      { number, standing: 'cleared' },
    );
  await app
    .get(PartsLoader)
    .createMany(LIBRARIAN, [
      bearing('B-12', 12, 28),
      bearing('B-12X', 12, 32),
      bearing('B-15', 15, 32),
      newPart(
        'lubricant',
        { viscosityGrade: 'ISO VG 68', packVolume: 1 },
        { number: 'L-68', standing: 'cleared' },
      ),
      ...Array.from({ length: SCREWS }, (_, index) =>
        newPart(
          'fastener',
          { thread: 'M6', length: 10 + index, strengthClass: '8.8' },
          { number: screw(index), standing: index === 99 ? 'draft' : 'cleared' },
        ),
      ),
    ]);
  const person = await addSignedIn(app, 'designer');
  const requirement = newRequirement({
    ratio: { target: '4', tolerancePercent: '1' },
    stages: { min: 1, max: 1 },
    modules: [2],
  });
  train = await newTrain(app, person, { requirement });
  const shafts = await designer.patch<TrainDto>(path(), { version: train.version, shaftDiameters: [12, 12] });
  train = shafts.body;
});
afterAll(() => server.close());
beforeEach(async () => {
  train = (await designer.get<TrainDto>(path())).body;
});

const path = () => `/api/trains/${train.code}`;
const bom = async () => (await designer.get<BomDto>(`${path()}/bom`)).body;
const table = (...rows: (string | number)[][]) => rows.map((row) => row.join('\t')).join('\r\n');
const preview = (text: string, client = designer) =>
  client.post<BomPastePreviewDto & Refusal>(`${path()}/bom-paste`, { text });
const book = (
  text: string,
  { token, version }: { token: string; version: number },
  over: object = {},
  client = designer,
) =>
  client.post<BomPasteBookedDto & Refusal>(`${path()}/bom-paste/book`, {
    ...{ text, token, version, leaveOutWrong: false },
    ...over,
  });
const clear = async () => {
  const answer = await designer.put<TrainDto>(`${path()}/extra-lines`, { version: train.version, lines: [] });
  train = answer.body;
};
const bearings = async () => (await bom()).lines.find(({ kind }) => kind === 'bearing')?.findNumber ?? 0;

describe('500 pasted rows with 3 wrong ones', () => {
  const rows = Array.from({ length: 500 }, (_, index): (string | number)[] =>
    index < 99 ? ['', screw(index), index + 1, 'pcs'] : ['', '', 2, 'pcs', `Bracket ${index}`],
  );
  // A part that is not there, a quantity below 0, and half a piece.
  rows[41] = ['', 'F-900', 1, 'pcs'];
  rows[250] = ['', '', -2, 'pcs', 'Bracket 250'];
  rows[499] = ['', '', 1.5, 'pcs', 'Bracket 499'];
  const text = table(...rows);

  it('are shown row by row before anything is booked', async () => {
    const before = await bom();
    const { status, body } = await preview(text);
    expect(status).toBe(200);
    expect(body.counts).toEqual({ choose: 0, add: 497, same: 0, wrong: 3 });
    expect(body.rows).toHaveLength(500);
    expect(body.columns.map(({ name }) => name)).toEqual([
      'Find number',
      'Part number',
      'Quantity',
      'Unit',
      'Description',
      'Note',
    ]);
    expect(body.rows[0]).toMatchObject({
      row: 1,
      action: 'add',
      partNumber: 'F-000',
      partDescription: 'A fastener',
    });
    const wrong = body.rows.filter(({ action }) => action === 'wrong');
    expect(wrong.map(({ row, problems }) => [row, problems[0]?.column, problems[0]?.value])).toEqual([
      [42, 'Part number', 'F-900'],
      [251, 'Quantity', '-2'],
      [500, 'Quantity', '1.5'],
    ]);
    expect(await bom()).toEqual(before);
  });

  it('are refused whole unless the wrong ones are to be left out', async () => {
    const answer = await book(text, (await preview(text)).body);
    expect(answer.status).toBe(400);
    expect(answer.body.message).toContain('3 rows are wrong');
    expect(answer.body.errors?.map(({ value }) => value)).toEqual(['row 42', 'row 251', 'row 500']);
    expect((await bom()).extraLines).toEqual([]);
  });

  it('are booked in one edit without them, and the same rows again change nothing', async () => {
    const { body } = await book(text, (await preview(text)).body, { leaveOutWrong: true });
    expect(body).toMatchObject({ chosen: 0, added: 497, same: 0, leftOut: 3 });
    expect(body.train.version).toBe(train.version + 1);
    train = body.train;
    const { extraLines } = await bom();
    expect(extraLines).toHaveLength(497);
    // Row 42 is one of the wrong ones: what follows moves up.
    expect(extraLines[97]).toMatchObject({ partNumber: 'F-098', quantity: 99, unit: 'pcs' });
    const again = (await preview(text)).body;
    expect(again.counts).toEqual({ choose: 0, add: 0, same: 497, wrong: 3 });
    const nothing = await book(text, again, { leaveOutWrong: true });
    expect(nothing.body).toMatchObject({
      added: 0,
      same: 497,
      leftOut: 3,
      train: { version: train.version },
    });
    await clear();
  });
});

describe('pasted rows', () => {
  it('choose parts by find number, with a head in any order and columns that mean nothing here', async () => {
    const find = await bearings();
    const text = table(
      ['Part no.', 'Material', 'Find', 'Qty'],
      ['b-12x', 'steel', find, 4],
      ['F-001', '', '', 8],
    );
    const shown = (await preview(text)).body;
    expect(shown.columns).toEqual([
      { name: 'Part number', from: 'Part no.' },
      { name: 'Find number', from: 'Find' },
      { name: 'Quantity', from: 'Qty' },
      { name: 'left out', from: 'Material' },
    ]);
    expect(shown.rows.map(({ row, action, changes }) => [row, action, changes])).toEqual([
      [2, 'choose', ['part B-12 → B-12X']],
      [3, 'add', []],
    ]);
    const { body } = await book(text, shown);
    expect(body).toMatchObject({ chosen: 1, added: 1 });
    train = body.train;
    const { lines } = await bom();
    expect(lines.find(({ findNumber }) => findNumber === find)).toMatchObject({
      partNumber: 'B-12X',
      replaces: { partNumber: 'B-12' },
    });
    // The kit’s own number puts the kit’s own part back.
    const back = table([find, 'B-12']);
    train = (await book(back, (await preview(back)).body)).body.train;
    expect((await bom()).lines.find(({ findNumber }) => findNumber === find)).toMatchObject({
      partNumber: 'B-12',
      replaces: null,
    });
  });

  it('change an added line by its find number', async () => {
    const added = (await bom()).lines.find(({ partNumber }) => partNumber === 'F-001');
    const text = table([added?.findNumber ?? 0, 'F-002', 10, '', '', 'galvanised']);
    const shown = (await preview(text)).body;
    expect(shown.rows[0]).toMatchObject({
      action: 'choose',
      changes: ['part F-001 → F-002', 'quantity 8 → 10', 'note none → galvanised'],
    });
    train = (await book(text, shown)).body.train;
    const [line] = (await bom()).extraLines;
    expect(line).toMatchObject({
      id: added?.extraLineId,
      partNumber: 'F-002',
      quantity: 10,
      note: 'galvanised',
    });
    await clear();
  });

  it('are the same when the table of the screen is pasted back as it is', async () => {
    const { lines } = await bom();
    const text = table(
      ['Find', 'Part number', 'Description', 'Quantity', 'Unit', 'Note'],
      ...lines.map((line) => [
        ...[line.findNumber, line.partNumber ?? 'to be made', line.description],
        ...[line.quantity, line.unit, line.note],
      ]),
    );
    expect((await preview(text)).body.counts).toEqual({ choose: 0, add: 0, same: lines.length, wrong: 0 });
  });

  it.each<[string, (find: number) => (string | number)[][], string, string]>([
    ['an unknown find number', () => [[9999, 'B-12']], 'Find number', 'There is no find number 9999'],
    ['a find number in words', () => [['first', 'B-12']], 'Find number', 'is not a figure'],
    ['a part that does not fit', (find) => [[find, 'B-15']], 'Part number', 'bore 15 mm, not 12 mm'],
    ['a part of another kind', (find) => [[find, 'F-001']], 'Part number', 'not a bearing'],
    ['another quantity for a line of the kit', (find) => [[find, 'B-12X', 5]], 'Quantity', 'The kit gives 4'],
    ['another unit', (find) => [[find, 'B-12X', 4, 'l']], 'Unit', 'The line is in pcs'],
    ['a draft', () => [['', screw(99), 1]], 'Part number', 'is draft'],
    ['no quantity', () => [['', 'F-001']], 'Quantity', 'Say how many'],
    ['nothing to say what it is', () => [['', '', 3]], 'Part number', 'Give a part number'],
    ['an unknown unit', () => [['', 'F-001', 3, 'yd']], 'Unit', 'no unit'],
    ['screws by the litre', () => [['', 'F-001', 3, 'l']], 'Unit', 'counted in pcs'],
    ['a quantity of 0', () => [['', 'F-001', 0]], 'Quantity', 'above 0'],
    ['a quantity of 1e12', () => [['', 'F-001', '1000000000000']], 'Quantity', 'too large'],
    ['a quantity that can be read two ways', () => [['', 'F-001', '1,500']], 'Quantity', 'two ways'],
    ['four decimals of a litre', () => [['', 'L-68', '0.0001']], 'Quantity', 'decimals'],
    [
      'a cell too many',
      () => [['', 'F-001', 1, 'pcs', '', '', 'what?']],
      '',
      'more cells than there are columns',
    ],
    ['a long description', () => [['', '', 1, '', 'x'.repeat(201)]], 'Description', 'at most 200'],
    ['a control character', () => [['', '', 1, '', 'a bell \u0007']], 'Description', 'cannot be shown'],
  ])('are wrong with %s', async (_, rowsFor, column, words) => {
    const { body } = await preview(table(...rowsFor(await bearings())));
    expect(body.rows[0]).toMatchObject({ action: 'wrong' });
    const problem = body.rows[0]?.problems.find((one) => one.column === column);
    expect(problem?.message).toContain(words);
  });

  it('name a find number once', async () => {
    const find = await bearings();
    const { body } = await preview(table([find, 'B-12X'], [find, 'B-12']));
    expect(body.rows.map(({ action }) => action)).toEqual(['choose', 'wrong']);
    expect(body.rows[1]?.summary).toContain('Row 1');
  });

  it.each<[string, unknown]>([
    ['nothing', ''],
    ['blank rows', '\t\t\r\n\t\t'],
    ['only heads', 'Find number\tPart number'],
    ['no text', 7],
    ['more than 2,000 rows', '\tF-001\t1\n'.repeat(2001)],
    ['more than 1,000,000 characters', 'x'.repeat(1_000_001)],
  ])('are refused when they are %s', async (_, text) => {
    const answer = await designer.post<Refusal>(`${path()}/bom-paste`, { text });
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.map(({ field }) => field)).toContain('text');
  });
});

describe('booking a paste', () => {
  const text = table(['', 'F-003', 3]);

  it('of two people at once is done once; the other sees what it would do now', async () => {
    const shown = (await preview(text)).body;
    const other = await server.asAnother('designer');
    const answers = await Promise.all([book(text, shown), book(text, shown, {}, other)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect((await bom()).extraLines).toHaveLength(1);
    const late = await book(text, shown, {}, other);
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ code: 'preview-outdated', current: { counts: { same: 1, add: 0 } } });
    train = (await designer.get<TrainDto>(path())).body;
    await clear();
  });

  it('is refused when the train changed although the rows would do the same', async () => {
    const shown = (await preview(text)).body;
    await designer.patch(path(), { version: train.version, note: 'Meanwhile' });
    const answer = await book(text, shown);
    expect(answer.status).toBe(409);
    expect(answer.body).toMatchObject({ code: 'changed-meanwhile', current: { note: 'Meanwhile' } });
    expect((await bom()).extraLines).toEqual([]);
  });

  it('is for people who edit trains, and so is the preview', async () => {
    const shown = (await preview(text)).body;
    for (const role of ['viewer', 'purchaser', 'librarian'] as const) {
      const client = await server.as(role);
      expect((await preview(text, client)).status).toBe(403);
      expect((await book(text, shown, {}, client)).status).toBe(403);
    }
  });

  it('needs the token of the preview', async () => {
    const { version } = (await preview(text)).body;
    expect((await book(text, { token: 'made-up', version })).body.code).toBe('preview-outdated');
    expect((await book(text, { token: '', version })).status).toBe(400);
  });
});
