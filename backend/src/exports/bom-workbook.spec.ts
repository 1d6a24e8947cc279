import ExcelJS from 'exceljs';
import readWorkbook, { readSheet, type Row } from 'read-excel-file/node';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { PartsService } from '../parts/parts.service.js';
import { newRequirement } from '../testing/new-brief.js';
import { LIBRARIAN, newPart } from '../testing/new-part.js';
import { newTrain } from '../testing/new-train.js';
import { addSignedIn } from '../testing/people.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { TrainPricesService } from '../train-prices/train-prices.service.js';
import { BomService } from '../trains/bom.service.js';
import { bomWorkbook, type PricedRecord, workbookName } from './bom-workbook.js';
import { CAUTIONS } from './cautions.js';
import { HEAD_ROW } from './sheet-heading.js';

const DATE = new Date('2026-03-09T10:20:30Z');
const HEADS = [
  'Find no.',
  'Part number',
  'Description',
  'Quantity of one',
  'Unit',
  'Material',
  'Made or bought',
  'Supplier',
  "Supplier's number",
  'Needed',
  'Order quantity',
  'Currency',
  'Unit price',
  'Price per',
  'Line total',
  'Price date',
  'Lead time, days',
  'Mass each, kg',
  'Source',
  'Note',
];

let temp: TempApp;
let record: PricedRecord;
let bytes: Buffer;

async function makeRecord(actor: SignedInUser): Promise<PricedRecord> {
  const wheels = { pinion: { min: 17, max: 24 }, wheel: { min: 20, max: 96 } };
  const requirement = newRequirement({
    teeth: wheels,
    envelope: { length: 400, width: 200, height: 200, wall: 4 },
    duty: { inputSpeed: 1400, outputTorque: 12 },
  });
  const train = await newTrain(temp.app, actor, {
    title: '=HYPERLINK("http://evil.example","winch")',
    requirement,
  });
  const prices = await temp.app.get(TrainPricesService).ofTrain(train.code);
  return { ...(await temp.app.get(BomService).record(train.code)), prices };
}

beforeAll(async () => {
  temp = await openTempApp();
  const parts = temp.app.get(PartsService);
  for (const bore of [6, 7, 8, 9, 10, 12, 15, 17]) {
    await parts.create(
      LIBRARIAN,
      newPart(
        'bearing',
        { bore, outerDiameter: bore + 16, width: 6, type: 'deep groove' },
        {
          standing: 'cleared',
          description: `-ball bearing, bore ${bore}`,
          supplier: '@Tidewater Bearings',
          mass: 0.0125,
        },
      ),
    );
  }
  record = await makeRecord(await addSignedIn(temp.app, 'designer'));
  bytes = await bomWorkbook(record, DATE);
});
afterAll(() => temp.close());

/** Rows of the BOM sheet below its head that are lines, and the row of sums. */
async function readBom(workbook: Buffer): Promise<{ lines: Row[]; sums: Row }> {
  const rows = (await readSheet(workbook, 'BOM')).slice(HEAD_ROW);
  const lines = rows.filter((row) => typeof row[0] === 'number');
  const sums = rows[lines.length];
  if (!sums) throw new Error('The sums are missing.');
  return { lines, sums };
}

describe('the workbook, opened by another reader', () => {
  it('has its three sheets', async () => {
    const sheets = await readWorkbook(bytes);
    expect(sheets.map(({ sheet }) => sheet)).toEqual(['BOM', 'Stages', 'Checks']);
  });

  it('says which train, which revision, when, and the exact ratio', async () => {
    const { train } = record;
    const { numerator, denominator } = train.figures.ratio;
    for (const name of ['BOM', 'Stages', 'Checks']) {
      const head = (await readSheet(bytes, name)).slice(0, HEAD_ROW - 1).map((row) => String(row[0] ?? ''));
      expect(head[0]).toBe(train.title);
      expect(head[1]).toContain(`${train.code}, revision A`);
      expect(head[2]).toContain(`Ratio ${numerator} : ${denominator} exactly`);
      expect(head[3]).toContain('9 March 2026');
    }
  });

  it('has every line of the bill of materials in the columns agreed', async () => {
    const [head] = (await readSheet(bytes, 'BOM')).slice(HEAD_ROW - 1);
    expect(head).toEqual(HEADS);
    const { lines } = await readBom(bytes);
    expect(lines.map((row) => [row[0], row[2], row[3], row[4], row[6], row[17], row[18]])).toEqual(
      record.bom.lines.map((line) => [
        line.findNumber,
        line.description,
        line.quantity,
        line.unit,
        line.supply,
        line.mass,
        line.source.join(', '),
      ]),
    );
    const made =
      lines[record.bom.lines.findIndex((line) => line.partNumber === null && line.supply === 'made')];
    expect(made?.[1]).toBe('to be made');
  });

  it('has no price and no total where nothing is offered', async () => {
    const { lines } = await readBom(bytes);
    const shown = lines.flatMap((row) => [...row.slice(11, 17)]).filter((value) => value !== '');
    expect(shown.every((value) => value === null)).toBe(true);
  });

  it('sums the masses: quantity × mass over the lines', async () => {
    const { lines, sums } = await readBom(bytes);
    const total = lines.reduce((sum, row) => sum + Number(row[3]) * Number(row[17] ?? 0), 0);
    expect(total).toBeGreaterThan(0);
    expect(sums[17]).toBeCloseTo(total, 9);
    expect(record.bom.totals.massKg).toBeCloseTo(total, 9);
  });

  it('keeps text that begins like a formula as text', async () => {
    const { lines } = await readBom(bytes);
    const bearing = lines.find((row) => String(row[2]).startsWith('-ball bearing'));
    expect(bearing?.[7]).toBe('@Tidewater Bearings');
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const formulas: string[] = [];
    book.eachSheet((sheet) =>
      sheet.eachRow((row) => row.eachCell((cell) => cell.formula && formulas.push(cell.formula))),
    );
    // The only formulas are ours: need, order and total of a line (nothing is priced), how many totals there are, the
    // sum of masses, the total in the house currency with its count, and what stands in no total.
    expect(formulas).toHaveLength(3 * record.bom.lines.length + 5);
    expect(formulas.every((formula) => /^(IF|ROUND|COUNT|COUNTIFS|SUMPRODUCT)\(|^J\d+$/.test(formula))).toBe(
      true,
    );
  });

  it('gives the data of every gear in the order of ISO 1340, tooth data after the body', async () => {
    const rows = await readSheet(bytes, 'Stages');
    const labels = rows.slice(HEAD_ROW).map((row) => String(row[0]));
    const order = [
      'Gear body: tip diameter',
      'Normal module',
      'Number of teeth',
      'Normal pressure angle',
      'Meshes',
      'Shafts',
    ];
    const places = order.map((label) => labels.indexOf(label));
    expect(places).not.toContain(-1);
    expect(places).toEqual([...places].sort((a, b) => a - b));
    const teeth = rows.find((row) => row[0] === 'Number of teeth')?.slice(3, 3 + record.gearData.length);
    expect(teeth).toEqual(
      record.train.spec.stages.flatMap(({ pinion, wheel }) => [pinion.teeth, wheel.teeth]),
    );
  });

  it('has every check with its verdict, every finding, and the cautions', async () => {
    const text = (await readSheet(bytes, 'Checks')).map((row) => row.map(String));
    for (const { label, verdict, message } of record.train.figures.checks) {
      expect(text.some((row) => row[1] === label && row[5] === verdict && row[6] === message)).toBe(true);
    }
    for (const { message } of record.train.figures.findings) {
      expect(text.some((row) => row[6] === message)).toBe(true);
    }
    expect(
      text.map((row) => row[0]).filter((first) => CAUTIONS.some((caution) => caution === first)),
    ).toEqual([...CAUTIONS]);
  });
});

describe('the workbook as a document', () => {
  it('is named after train and revision', () => {
    expect(workbookName({ code: 'T-0001', revision: 'A' })).toBe('T-0001-A-bom.xlsx');
  });

  it('prints on A4 landscape with the table head and page numbers on every page, and stays readable on a screen', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const sheet = book.getWorksheet('BOM');
    expect(sheet?.pageSetup).toMatchObject({
      paperSize: 9,
      orientation: 'landscape',
      fitToWidth: 1,
      fitToHeight: 0,
    });
    expect(sheet?.pageSetup.printTitlesRow).toBe(`${HEAD_ROW}:${HEAD_ROW}`);
    expect(sheet?.headerFooter.oddFooter).toContain('Page &P of &N');
    expect(sheet?.views[0]).toMatchObject({ state: 'frozen', ySplit: HEAD_ROW });
    expect(sheet?.autoFilter).toBe(`A${HEAD_ROW}:T${HEAD_ROW + record.bom.lines.length}`);
    expect(sheet?.getCell(`D${HEAD_ROW + 1}`).numFmt).toBe('0.###');
    expect(sheet?.getCell(`M${HEAD_ROW + 1}`).numFmt).toBe('#,##0.00');
    expect(sheet?.getColumn(3).width).toBe(30);
    expect(sheet?.getCell(`R${HEAD_ROW + 1}`).numFmt).toBe('0.0000');
  });

  it('repeats the head of the one table of a sheet, and nothing where a sheet has three', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const repeated = book.worksheets.map(({ pageSetup }) => pageSetup.printTitlesRow);
    expect(repeated).toEqual([`${HEAD_ROW}:${HEAD_ROW}`, undefined, `${HEAD_ROW}:${HEAD_ROW}`]);
  });

  it('makes rows high enough for the text that wraps in them', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const sheet = book.getWorksheet('BOM');
    record.bom.lines.forEach((_, index) => {
      const row = sheet?.getRow(HEAD_ROW + 1 + index);
      const note = row?.getCell(20).text ?? '';
      // Even narrow letters do not get more than one and a half times its characters into a column.
      const fewest = Math.max(1, Math.ceil(note.length / (1.5 * (sheet?.getColumn(20).width ?? 0))));
      expect(row?.height).toBeGreaterThanOrEqual(fewest * 12);
    });
  });

  it('says on Checks what a shift is held against, and leaves no figure blank', async () => {
    const rows = (await readSheet(bytes, 'Checks')).slice(HEAD_ROW);
    const undercut = rows.filter((row) => row[1] === 'Profile shift against undercut, pinion');
    expect(undercut.map((row) => [row[0], row[4]])).toEqual(
      record.train.spec.stages.map((_, stage) => [`Stage ${stage + 1}`, 'modules']),
    );
    const clear = rows.filter((row) => row[1] === 'Interference' && row[5] === 'passes');
    expect(clear.length).toBeGreaterThan(0);
    for (const row of clear) expect(row.slice(2, 5)).toEqual(['–', '–', null]);
  });

  it('shows the train strip on every sheet, one picture stored once', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    expect(book.worksheets.map((sheet) => sheet.getImages().length)).toEqual([1, 1, 1]);
    const pictures = book.model.media;
    expect(new Set(pictures.map(({ name }) => name)).size).toBe(1);
    // A PNG begins with its own name.
    const picture = pictures[0]?.buffer as unknown as Uint8Array | undefined;
    expect(Buffer.from(picture ?? []).toString('latin1', 1, 4)).toBe('PNG');
  });

  it('tells nothing of the machine it was made on', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    expect(book).toMatchObject({
      creator: 'Stageyard',
      lastModifiedBy: 'Stageyard',
      created: DATE,
      modified: DATE,
    });
    expect(bytes.includes(temp.settings.dataDir)).toBe(false);
  });
});
