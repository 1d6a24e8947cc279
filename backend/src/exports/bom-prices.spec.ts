import ExcelJS from 'exceljs';
import { readSheet, type Row } from 'read-excel-file/node';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findOffice, recalculate } from '../testing/office.js';
import { addSignedIn } from '../testing/people.js';
import { newPricedTrain } from '../testing/priced-train.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { TrainPricesService } from '../train-prices/train-prices.service.js';
import { BomService } from '../trains/bom.service.js';
import { bomWorkbook, type PricedRecord } from './bom-workbook.js';
import { HEAD_ROW } from './sheet-heading.js';

let temp: TempApp;
let record: PricedRecord;
let bytes: Buffer;

beforeAll(async () => {
  temp = await openTempApp();
  const { train } = await newPricedTrain(temp.app, await addSignedIn(temp.app, 'designer'));
  const prices = await temp.app.get(TrainPricesService).ofTrain(train.code);
  record = { ...(await temp.app.get(BomService).record(train.code)), prices };
  bytes = await bomWorkbook(record, new Date('2026-03-09T10:20:30Z'));
});
afterAll(() => temp.close());

const rowOf = (rows: Row[], text: string) => rows.findIndex((row) => row[1] === text || row[11] === text);

/** Rows of the sheet by part number or, below the lines, by currency. */
async function read(workbook: Buffer) {
  const rows = await readSheet(workbook, 'BOM');
  return {
    rows,
    line: (partNumber: string) => rows[rowOf(rows, partNumber)] ?? [],
    total: (currency: string) =>
      rows.slice(HEAD_ROW + record.bom.lines.length).find((row) => row[11] === currency),
  };
}

const keyNumber = () => record.bom.lines.find(({ kind }) => kind === 'key')?.partNumber ?? '';

/** Supplier to lead time. */
const OFFER = [7, 17] as const;
const date = (text: string) => new Date(`${text}T00:00:00Z`);

describe('prices in the workbook', () => {
  it('says for how many it is, and that of which day', async () => {
    const { rows } = await read(bytes);
    expect(rows[HEAD_ROW - 2]?.slice(0, 3)).toEqual(['Build quantity', null, 25]);
    expect(rows[HEAD_ROW - 2]?.[3]).toContain('older than 180 days');
  });

  it('names the chosen supplier with what to order, from the need to the lead time', async () => {
    const { line } = await read(bytes);
    const today = date(record.prices.on);
    // 100 × 3.10 = 310.00 EUR
    expect(line('B-12').slice(...OFFER)).toEqual([
      'Tidewater Bearings',
      'TW 12/28',
      100,
      100,
      'EUR',
      3.1,
      1,
      310,
      date('2020-02-03'),
      21,
    ]);
    // 50 needed, sold by the hundred: 100 × 9.50 ÷ 100 = 9.50 EUR
    const key = ['Tidewater Bearings', null, 50, 100, 'EUR', 9.5, 100, 9.5, today, 21];
    expect(line(keyNumber()).slice(...OFFER)).toEqual(key);
    expect(line('W-12').slice(9, 15)).toEqual([50, 50, 'JPY', 150, 1, 7500]);
    // 5 × 12.345 ÷ 10 = 6.1725 KWD: half a fils up, 6.173
    expect(line('L-220').slice(9, 15)).toEqual([5, 5, 'KWD', 12.345, 10, 6.173]);
  });

  it('has a total for each currency and says how many lines stand in it', async () => {
    const { total, rows } = await read(bytes);
    expect(total('EUR')?.slice(14, 16)).toEqual([319.5, '2 lines']);
    expect(total('JPY')?.slice(14, 16)).toEqual([7500, '1 line']);
    expect(total('KWD')?.slice(14, 16)).toEqual([6.173, '1 line']);
    const sums = rows[HEAD_ROW + record.bom.lines.length];
    expect(sums?.[12]).toBe(`4 of ${record.bom.lines.length} lines priced`);
  });

  it('shows amounts with the decimals of their currency', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const { rows } = await read(bytes);
    const formatOf = (column: string, text: string) =>
      book.getWorksheet('BOM')?.getCell(`${column}${rowOf(rows, text) + 1}`).numFmt;
    for (const column of ['M', 'O']) {
      expect(formatOf(column, 'B-12')).toBe('#,##0.00');
      expect(formatOf(column, 'W-12')).toBe('#,##0');
      expect(formatOf(column, 'L-220')).toBe('#,##0.000');
    }
    expect(formatOf('P', 'B-12')).toBe('yyyy-mm-dd');
  });

  it('marks a price that is too old, and lines to be bought without an offer', async () => {
    const { line, rows } = await read(bytes);
    expect(line('B-12')[19]).toMatch(/Price too old: [\d,]+ days\./);
    expect(line('W-12')[19] ?? '').not.toContain('Price too old');
    const lines = rows.slice(HEAD_ROW, HEAD_ROW + record.bom.lines.length);
    const open = lines.filter((row) => String(row[19]).includes('No price: no part chosen.'));
    expect(open.map((row) => row[0])).toEqual(record.prices.unpriced.map(({ findNumber }) => findNumber));
    expect(open.length).toBeGreaterThan(0);
  });

  it('tells of a chosen offer that cannot be used', async () => {
    const lostChoices = [
      { partNumber: 'W-12', offerId: '1', key: 'W-12', message: 'The chosen offer ended.' },
      { partNumber: 'B-9', offerId: '2', key: null, message: 'B-9 is no longer on the bill.' },
    ];
    const told = { ...record, prices: { ...record.prices, lostChoices } };
    const { line, rows } = await read(await bomWorkbook(told, new Date()));
    expect(line('W-12')[19]).toContain('The chosen offer ended.');
    expect(rows.at(-1)?.[2]).toBe('B-9 is no longer on the bill.');
  });

  it('names the cells it multiplies and sums', async () => {
    const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
    const sheet = book.getWorksheet('BOM');
    const { rows } = await read(bytes);
    const oil = rowOf(rows, 'L-220') + 1;
    expect(sheet?.getCell(`J${oil}`).formula).toBe(`ROUND(D${oil}*$C$6,3)`);
    expect(sheet?.getCell(`O${oil}`).formula).toBe(
      `IF(ISNUMBER(M${oil}),ROUND(K${oil}*M${oil}/IF(ISNUMBER(N${oil}),N${oil},1),3),"")`,
    );
    const first = HEAD_ROW + 1;
    const last = HEAD_ROW + record.bom.lines.length;
    // House currency first, then JPY and KWD.
    const kwd = last + 4;
    expect(sheet?.getCell(`O${kwd}`).formula).toBe(
      `ROUND(SUMIF(L$${first}:L$${last},L${kwd},O$${first}:O$${last}),3)`,
    );
    expect(sheet?.getCell(`R${last + 1}`).formula).toBe(
      `SUMPRODUCT(D$${first}:D$${last},R$${first}:R$${last})`,
    );
  });
});

/**
 * The workbook with some of its cells overtyped, by column letter and part number; row 6 holds the build quantity. Stored
 * results are taken out, so that the office suite has to work out every formula.
 */
async function overtyped(
  cells: [column: string, row: string | number, value: number | string][],
): Promise<Buffer> {
  const book = await new ExcelJS.Workbook().xlsx.load(bytes as unknown as ArrayBuffer);
  const { rows } = await read(bytes);
  for (const [column, row, value] of cells) {
    const at = typeof row === 'number' ? row : rowOf(rows, row) + 1;
    const cell = book.getWorksheet('BOM')?.getCell(`${column}${at}`);
    if (cell) cell.value = value;
  }
  book.eachSheet((sheet) =>
    sheet.eachRow((row) =>
      row.eachCell((cell) => {
        if (cell.formula) cell.value = { formula: cell.formula };
      }),
    ),
  );
  return Buffer.from(await book.xlsx.writeBuffer());
}

const office = findOffice();
/** As it is, with a price and a quantity overtyped, with words and a price without a currency, and for 50: in one go. */
let computed: Buffer[] = [];
/** A made gear: nothing is offered for it. */
const FIRST_LINE = HEAD_ROW + 1;
const officeChecks: [name: string, check: () => Promise<void>][] = [
  [
    'every figure is the one that was stored',
    async () => {
      const [stored, found] = [await read(bytes), await read(computed[0] ?? bytes)];
      stored.rows.forEach((row, index) => {
        row.forEach((value, column) => {
          const other = found.rows[index]?.[column] ?? null;
          if (typeof value === 'number') expect(other).toBeCloseTo(value, 9);
          else if (value !== null) expect(other).toEqual(value);
        });
      });
    },
  ],
  [
    'line totals and totals by currency follow what a purchaser overtypes',
    async () => {
      const { line, total, rows } = await read(computed[1] ?? bytes);
      // 200 × 3.00 = 600.00 EUR; the keys stay at 9.50; a gear to be made: 25 × 2.00 = 50.00 EUR.
      expect(line('B-12')[14]).toBe(600);
      expect(rows[FIRST_LINE - 1]?.[14]).toBe(50);
      expect(total('EUR')?.slice(14, 16)).toEqual([659.5, '3 lines']);
      // 5 × 1.2345 ÷ 1 = 6.1725 KWD again, with its price for one litre.
      expect(total('KWD')?.[14]).toBe(6.173);
      expect(total('JPY')?.[14]).toBe(7500);
    },
  ],
  [
    'words in place of a price spoil no total, and a price without a currency is said to be in none',
    async () => {
      const { line, total, rows } = await read(computed[2] ?? bytes);
      expect(line('B-12')[14] ?? '').toBe('');
      expect(total('EUR')?.slice(14, 16)).toEqual([9.5, '1 line']);
      const told = rows.flat().filter((value) => String(value).includes('in no total'));
      expect(told).toEqual(['Priced lines in no total: 1. Give each one of these currencies.']);
    },
  ],
  [
    'needs follow the build quantity',
    async () => {
      const { line, rows } = await read(computed[3] ?? bytes);
      expect(line('B-12').slice(9, 11)).toEqual([200, 100]);
      expect(line('L-220')[9]).toBe(10);
      expect(rows[FIRST_LINE - 1]?.slice(9, 11)).toEqual([50, 50]);
    },
  ],
];

describe('the prices in an office suite', () => {
  if (office === null) {
    process.stdout.write(`LibreOffice is not installed: ${officeChecks.length} checks not run\n`);
  }
  beforeAll(async () => {
    if (office === null) return;
    computed = recalculate(office, [
      await overtyped([]),
      await overtyped([
        ['M', 'B-12', 3],
        ['K', 'B-12', 200],
        ['M', FIRST_LINE, 2],
        ['L', FIRST_LINE, 'EUR'],
        ['M', 'L-220', 1.2345],
        ['N', 'L-220', 1],
      ]),
      await overtyped([
        ['M', 'B-12', 'on request'],
        ['M', FIRST_LINE, 2],
      ]),
      await overtyped([['C', 6, 50]]),
    ]);
  }, 90_000);
  it.each(office === null ? [] : officeChecks)('%s', async (_, check) => check());
});
