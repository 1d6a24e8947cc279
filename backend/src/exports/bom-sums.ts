import { type CellValue, type Worksheet } from 'exceljs';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type TrainPricesDto } from '../train-prices/dto/train-prices.dto.js';
import { type BomDto } from '../trains/dto/bom.dto.js';
import { BOM_COLUMNS, COLUMN } from './bom-columns.js';
import { cellAmount, decimalsOf, moneyFormat } from './priced-line.js';
import { heightOfLines, wrappedLines } from './row-height.js';
import { type PlacedTable } from './table.js';
import { COLOUR, dress, font, TOTAL_ABOVE } from './workbook-style.js';

const MASS = '0.000';
const LEFT = { horizontal: 'left', indent: 1 } as const;
const RIGHT = { horizontal: 'right' } as const;

/** The rows of the table that sums name; one that is empty names its first row all the same. */
interface Span {
  first: number;
  last: number;
}

/**
 * Writes the sums below the table: what the lines are and weigh, one total a currency, and what no total holds.
 * @returns the last row written
 */
export function writeBomSums(
  sheet: Worksheet,
  bom: BomDto,
  prices: TrainPricesDto,
  { firstRow, lastRow }: PlacedTable,
): number {
  const span = { first: firstRow, last: Math.max(firstRow, lastRow) };
  const first = lastRow + 1;
  writeLineSums(sheet, first, bom, prices, span);
  const totals = totalsOf(prices);
  totals.forEach((total, index) => writeTotal(sheet, first + 1 + index, total, span));
  const check = first + totals.length + 1;
  const counted = totals.map((_, index) => countOf(first + 1 + index, span)).join('+');
  const outside = `COUNT(${cells(COLUMN.lineTotal, span)})-(${counted})`;
  writeText(sheet, check, COLUMN.supplier, {
    formula: `IF(${outside}=0,"","Priced lines in no total: "&${outside}&". Give each one of these currencies.")`,
    result: '',
  });
  const lost = prices.lostChoices.filter(({ key }) => key === null);
  lost.forEach(({ message }, index) => writeText(sheet, check + 1 + index, COLUMN.description, message));
  return check + lost.length;
}

function writeLineSums(
  sheet: Worksheet,
  row: number,
  { lines, totals }: BomDto,
  prices: TrainPricesDto,
  span: Span,
): void {
  sheet.getRow(row).height = heightOfLines(1) + 3;
  for (let column = 1; column <= BOM_COLUMNS.length; column += 1) {
    dress(sheet.getCell(row, column), { font: font({ bold: true }), border: TOTAL_ABOVE });
  }
  const words = sheet.getCell(`${COLUMN.description}${row}`);
  words.value = `${lines.length} lines, ${totals.made} made, ${totals.bought} bought`;
  words.alignment = LEFT;
  sheet.mergeCells(`${COLUMN.unitPrice}${row}:${COLUMN.lineTotal}${row}`);
  const priced = sheet.getCell(`${COLUMN.unitPrice}${row}`);
  priced.value = pricedCount(cells(COLUMN.lineTotal, span), lines.length, prices);
  const mass = sheet.getCell(`${COLUMN.massEach}${row}`);
  const quantities = cells(COLUMN.quantity, span);
  mass.value = {
    formula: `SUMPRODUCT(${quantities},${cells(COLUMN.massEach, span)})`,
    result: totals.massKg,
  };
  mass.numFmt = MASS;
  for (const sum of [priced, mass]) sum.alignment = RIGHT;
  sheet.mergeCells(`${COLUMN.source}${row}:${COLUMN.note}${row}`);
  const unit = sheet.getCell(`${COLUMN.source}${row}`);
  const unknown = totals.linesWithoutMass;
  unit.value = unknown === 0 ? 'kg in one' : `kg in one, without ${unknown} of unknown mass`;
  unit.alignment = LEFT;
}

/** Says how many lines the totals cover, so that a part of the sum never reads as the whole. */
function pricedCount(totals: string, lines: number, prices: TrainPricesDto): CellValue {
  const priced = prices.lines.filter(({ price }) => price !== null).length;
  return {
    formula: `COUNT(${totals})&" of ${lines} lines priced"`,
    result: `${priced} of ${lines} lines priced`,
  };
}

/** The house currency has a row even while nothing is priced in it: prices that are filled in need one. */
function totalsOf({ totals }: TrainPricesDto): TrainPricesDto['totals'] {
  const { currency } = HOUSE_RULES;
  return totals.some((total) => total.currency === currency)
    ? totals
    : [{ currency, minor: 0, lines: 0 }, ...totals];
}

function writeTotal(
  sheet: Worksheet,
  row: number,
  { currency, minor, lines }: TrainPricesDto['totals'][number],
  span: Span,
): void {
  sheet.getRow(row).height = heightOfLines(1);
  const bold = font({ bold: true });
  const code = `${COLUMN.currency}${row}`;
  const sum = `SUMIF(${cells(COLUMN.currency, span)},${code},${cells(COLUMN.lineTotal, span)})`;
  const values: [column: string, value: CellValue][] = [
    [COLUMN.order, 'Total'],
    [COLUMN.currency, currency],
    [
      COLUMN.lineTotal,
      { formula: `ROUND(${sum},${decimalsOf(currency)})`, result: cellAmount(minor, currency) },
    ],
    [
      COLUMN.priceDate,
      {
        formula: `${countOf(row, span)}&IF(${countOf(row, span)}=1," line"," lines")`,
        result: `${lines} ${lines === 1 ? 'line' : 'lines'}`,
      },
    ],
  ];
  for (const [column, value] of values) {
    const cell = sheet.getCell(`${column}${row}`);
    cell.value = value;
    const isText = column === COLUMN.currency || column === COLUMN.priceDate;
    dress(cell, { font: bold, alignment: isText ? LEFT : RIGHT });
  }
  sheet.getCell(`${COLUMN.lineTotal}${row}`).numFmt = moneyFormat(currency);
  sheet.mergeCells(`${COLUMN.priceDate}${row}:${COLUMN.leadTime}${row}`);
}

/** Lines that the total of a row sums up. */
function countOf(row: number, span: Span): string {
  // A price of words leaves text in the total, which is no number above or at 0.
  return `COUNTIFS(${cells(COLUMN.currency, span)},${COLUMN.currency}${row},${cells(COLUMN.lineTotal, span)},">=0")`;
}

function writeText(sheet: Worksheet, row: number, from: string, value: CellValue): void {
  sheet.mergeCells(`${from}${row}:${COLUMN.note}${row}`);
  const cell = sheet.getCell(`${from}${row}`);
  cell.value = value;
  dress(cell, {
    font: font({ color: { argb: COLOUR.rust } }),
    alignment: { ...LEFT, vertical: 'top', wrapText: true },
  });
  const start = cell.col;
  const width = BOM_COLUMNS.slice(Number(start) - 1).reduce((sum, column) => sum + column.width, 0);
  sheet.getRow(row).height = heightOfLines(typeof value === 'string' ? wrappedLines(value, width) : 1);
}

function cells(column: string, { first, last }: Span): string {
  return `${column}$${first}:${column}$${last}`;
}
