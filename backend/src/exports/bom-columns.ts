import { partNumberText } from '@stageyard/libs/bill-of-materials';
import { type CellValue } from 'exceljs';
import { cellAmount, decimalsOf, moneyFormat, type PricedLine } from './priced-line.js';
import { noteOf } from './bom-note.js';
import { type Column } from './table.js';
import { type CellLook, COLOUR, font, RULE_BELOW } from './workbook-style.js';

/** A retaining ring weighs less than a gram. */
const EACH = '0.0000';
const QUANTITY = '0.###';

/** Letters of the columns that formulas name. */
export const COLUMN = {
  description: 'C',
  quantity: 'D',
  supplier: 'H',
  needed: 'J',
  order: 'K',
  currency: 'L',
  unitPrice: 'M',
  per: 'N',
  lineTotal: 'O',
  priceDate: 'P',
  leadTime: 'Q',
  massEach: 'R',
  source: 'S',
  note: 'T',
} as const;

/** Where the build quantity stands, above the table. */
export const BUILD_QUANTITY_CELL = { row: 6, column: COLUMN.description } as const;
const BUILD_QUANTITY = `$${BUILD_QUANTITY_CELL.column}$${BUILD_QUANTITY_CELL.row}`;

const inPlum: CellLook = { font: font({ color: { argb: COLOUR.plum } }), border: RULE_BELOW };
const inMoney = ({ price }: PricedLine): CellLook => ({ numFmt: moneyFormat(price?.currency) });

/** The columns of the bill of materials, in their order. */
export const BOM_COLUMNS: readonly Column<PricedLine>[] = [
  { title: 'Find no.', width: 7, kind: 'figure', value: ({ line }) => line.findNumber, numFmt: '0' },
  {
    title: 'Part number',
    width: 12,
    kind: 'label',
    value: ({ line }) => partNumberText(line),
    look: ({ line }) =>
      line.partNumber === null
        ? { font: font({ italic: true, color: { argb: COLOUR.brass } }), border: RULE_BELOW }
        : {},
  },
  { title: 'Description', width: 30, kind: 'words', value: ({ line }) => line.description },
  {
    title: 'Quantity of one',
    width: 9,
    kind: 'figure',
    value: ({ line }) => line.quantity,
    numFmt: QUANTITY,
  },
  { title: 'Unit', width: 6, kind: 'words', value: ({ line }) => line.unit },
  { title: 'Material', width: 12, kind: 'words', value: ({ line }) => line.material },
  { title: 'Made or bought', width: 8, kind: 'words', value: ({ line }) => line.supply },
  {
    title: 'Supplier',
    width: 17,
    kind: 'words',
    value: ({ line, price }) => price?.supplier.name ?? line.supplier,
  },
  {
    title: "Supplier's number",
    width: 12,
    kind: 'words',
    value: ({ price }) => price?.supplierPartNumber ?? null,
  },
  { title: 'Needed', width: 8, kind: 'figure', value: needed, numFmt: QUANTITY },
  { title: 'Order quantity', width: 9, kind: 'figure', value: orderQuantity, numFmt: QUANTITY },
  { title: 'Currency', width: 10, kind: 'words', value: ({ price }) => price?.currency ?? null },
  {
    title: 'Unit price',
    width: 10,
    kind: 'figure',
    value: ({ price }) => price && cellAmount(price.unitPrice, price.currency),
    look: inMoney,
  },
  { title: 'Price per', width: 6, kind: 'figure', value: ({ price }) => price?.per ?? null, numFmt: '#,##0' },
  { title: 'Line total', width: 12, kind: 'figure', value: lineTotal, look: inMoney },
  {
    title: 'Price date',
    width: 10,
    kind: 'figure',
    value: ({ price }) => price && new Date(`${price.pricedOn}T00:00:00Z`),
    numFmt: 'yyyy-mm-dd',
    look: ({ price }) => (price?.tooOld ? inPlum : {}),
  },
  {
    title: 'Lead time, days',
    width: 8,
    kind: 'figure',
    value: ({ price }) => price?.leadTimeDays ?? null,
    numFmt: '0',
  },
  { title: 'Mass each, kg', width: 9, kind: 'figure', value: ({ line }) => line.mass, numFmt: EACH },
  { title: 'Source', width: 14, kind: 'words', value: ({ line }) => line.source.join(', ') },
  {
    title: 'Note',
    width: 35,
    kind: 'words',
    value: (line) => noteOf(line).text,
    look: (line) => (noteOf(line).warns ? inPlum : {}),
  },
];

/** Follows the quantity of one and the build quantity when somebody overtypes them. */
function needed({ needed: result }: PricedLine, row: number): CellValue {
  return { formula: `ROUND(${COLUMN.quantity}${row}*${BUILD_QUANTITY},3)`, result };
}

/** What the offer makes one order; without an offer, what is needed. */
function orderQuantity({ price, needed: result }: PricedLine, row: number): CellValue {
  return price ? price.orderQuantity : { formula: `${COLUMN.needed}${row}`, result };
}

/**
 * Rounded to the currency's decimals. Shows nothing until there is a price, nor where words stand in its place (“on
 * request”), which would spoil the sums. The stored result is what a reader without formulas sees.
 */
function lineTotal({ price }: PricedLine, row: number): CellValue {
  const unitPrice = `${COLUMN.unitPrice}${row}`;
  const per = `${COLUMN.per}${row}`;
  const total = `${COLUMN.order}${row}*${unitPrice}/IF(ISNUMBER(${per}),${per},1)`;
  return {
    formula: `IF(ISNUMBER(${unitPrice}),ROUND(${total},${decimalsOf(price?.currency)}),"")`,
    result: price ? cellAmount(price.lineTotal, price.currency) : '',
  };
}
