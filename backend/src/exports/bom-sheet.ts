import { partNumberText } from '@stageyard/libs/bill-of-materials';
import { type CellValue, type Worksheet } from 'exceljs';
import { type BomDto, type BomLineDto } from '../trains/dto/bom.dto.js';
import { type Column, type PlacedTable, writeTable } from './table.js';
import { keepTogether, setPrintArea } from './page-layout.js';
import { heightOfLines } from './row-height.js';
import { HEAD_ROW } from './sheet-heading.js';
import { COLOUR, dress, font, RULE_BELOW, TOTAL_ABOVE } from './workbook-style.js';

const MONEY = '#,##0.00';
/** A retaining ring weighs less than a gram. */
const EACH = '0.0000';
const TOTAL = '0.000';

/** Number of the column of suppliers: below it and the prices stands how many lines are priced. */
const SUPPLIER = 8;
/** Letters of the columns that formulas name. */
const QUANTITY = 'D';
const UNIT_PRICE = 'I';
const LINE_TOTAL = 'J';
const EACH_MASS = 'L';

/** The columns of the bill of materials, in their order. */
export const BOM_COLUMNS: readonly Column<BomLineDto>[] = [
  { title: 'Find no.', width: 8, kind: 'figure', value: (line) => line.findNumber, numFmt: '0' },
  {
    title: 'Part number',
    width: 13,
    kind: 'label',
    value: partNumberText,
    look: ({ partNumber }) =>
      partNumber === null
        ? { font: font({ italic: true, color: { argb: COLOUR.brass } }), border: RULE_BELOW }
        : {},
  },
  { title: 'Description', width: 36, kind: 'words', value: (line) => line.description },
  { title: 'Quantity', width: 10, kind: 'figure', value: (line) => line.quantity, numFmt: '0.###' },
  { title: 'Unit', width: 6, kind: 'words', value: (line) => line.unit },
  { title: 'Material', width: 15, kind: 'words', value: (line) => line.material },
  { title: 'Made or bought', width: 10, kind: 'words', value: (line) => line.supply },
  { title: 'Supplier', width: 21, kind: 'words', value: (line) => line.supplier },
  { title: 'Unit price', width: 10, kind: 'figure', value: () => null, numFmt: MONEY },
  { title: 'Line total', width: 12, kind: 'figure', value: (_, row) => lineTotal(row), numFmt: MONEY },
  { title: 'Lead time, days', width: 10, kind: 'figure', value: () => null, numFmt: '0' },
  { title: 'Mass each, kg', width: 10, kind: 'figure', value: (line) => line.mass, numFmt: EACH },
  { title: 'Source', width: 19, kind: 'words', value: (line) => line.source.join(', ') },
  {
    title: 'Note',
    width: 42,
    kind: 'words',
    value: noteOf,
    look: ({ flags }) =>
      flags.length > 0 ? { font: font({ color: { argb: COLOUR.plum } }), border: RULE_BELOW } : {},
  },
];

/** Writes the lines and below them the sums. */
export function writeBomSheet(sheet: Worksheet, bom: BomDto): void {
  const table = writeTable(sheet, HEAD_ROW, BOM_COLUMNS, bom.lines, true);
  sheet.autoFilter = {
    from: { row: table.headRow, column: 1 },
    to: { row: Math.max(table.headRow, table.lastRow), column: BOM_COLUMNS.length },
  };
  writeSums(sheet, bom, table);
  const last = table.lastRow + 1;
  // The sums never stand alone on a page.
  const widths = BOM_COLUMNS.map(({ width }) => width);
  keepTogether(sheet, widths, { first: table.lastRow, last, repeated: HEAD_ROW });
  setPrintArea(sheet, 'N', last);
}

/**
 * Shows nothing until a price is filled in, nor where words stand in its place (“on request”), which would spoil the
 * sum. The stored result is what a reader without formulas sees.
 */
function lineTotal(row: number): CellValue {
  const price = `${UNIT_PRICE}${row}`;
  return { formula: `IF(ISNUMBER(${price}),${QUANTITY}${row}*${price},"")`, result: '' };
}

/** Says how many lines a sum of prices covers, so that a part of the sum never reads as the whole. */
function pricedLines(prices: string, lines: number): CellValue {
  const count = `COUNT(${prices})`;
  return { formula: `IF(${count}=0,"",${count}&" of ${lines} priced")`, result: '' };
}

function writeSums(sheet: Worksheet, { lines, totals }: BomDto, { firstRow, lastRow }: PlacedTable): void {
  const row = lastRow + 1;
  sheet.getRow(row).height = heightOfLines(1) + 3;
  const last = Math.max(firstRow, lastRow);
  for (let column = 1; column <= BOM_COLUMNS.length; column += 1) {
    dress(sheet.getCell(row, column), { font: font({ bold: true }), border: TOTAL_ABOVE });
  }
  const unknown = totals.linesWithoutMass;
  const words = `${lines.length} lines, ${totals.made} made, ${totals.bought} bought`;
  sheet.getCell(row, 3).value = words;
  const totalPrice = sheet.getCell(`${LINE_TOTAL}${row}`);
  const prices = `${LINE_TOTAL}${firstRow}:${LINE_TOTAL}${last}`;
  totalPrice.value = { formula: `IF(COUNT(${prices})=0,"",SUM(${prices}))`, result: '' };
  totalPrice.numFmt = MONEY;
  sheet.mergeCells(row, SUPPLIER, row, SUPPLIER + 1);
  sheet.getCell(row, SUPPLIER).value = pricedLines(prices, lines.length);
  const totalMass = sheet.getCell(`${EACH_MASS}${row}`);
  const quantities = `${QUANTITY}${firstRow}:${QUANTITY}${last}`;
  const masses = `${EACH_MASS}${firstRow}:${EACH_MASS}${last}`;
  totalMass.value = { formula: `SUMPRODUCT(${quantities},${masses})`, result: totals.massKg };
  totalMass.numFmt = TOTAL;
  for (const sum of [sheet.getCell(row, SUPPLIER), totalPrice, totalMass])
    sum.alignment = { horizontal: 'right' };
  sheet.mergeCells(row, 13, row, 14);
  sheet.getCell(row, 13).alignment = { horizontal: 'left', indent: 1 };
  sheet.getCell(row, 3).alignment = { horizontal: 'left', indent: 1 };
  sheet.getCell(row, 13).value =
    unknown === 0 ? 'kg in all' : `kg in all, without ${unknown} of unknown mass`;
}

/** The kit's note as it stands, then the flags as one sentence. */
function noteOf({ note, flags }: BomLineDto): string {
  const list = flags.join('; ');
  const warning = list === '' ? '' : `${list.charAt(0).toUpperCase()}${list.slice(1)}.`;
  return [note, warning].filter((text) => text !== '').join(' ');
}
