import { type Worksheet } from 'exceljs';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type TrainPricesDto } from '../train-prices/dto/train-prices.dto.js';
import { type BomDto } from '../trains/dto/bom.dto.js';
import { BOM_COLUMNS, BUILD_QUANTITY_CELL, COLUMN } from './bom-columns.js';
import { writeBomSums } from './bom-sums.js';
import { keepTogether, setPrintArea } from './page-layout.js';
import { pricedLines } from './priced-line.js';
import { HEAD_ROW, longDate } from './sheet-heading.js';
import { type PlacedTable, writeTable } from './table.js';
import { COLOUR, dress, font } from './workbook-style.js';

/** Writes the build quantity, the lines with their prices, and below them the sums. */
export function writeBomSheet(sheet: Worksheet, bom: BomDto, prices: TrainPricesDto): void {
  writeBuildQuantity(sheet, prices);
  const table = writeTable(sheet, HEAD_ROW, BOM_COLUMNS, pricedLines(bom, prices), true);
  sheet.autoFilter = {
    from: { row: table.headRow, column: 1 },
    to: { row: Math.max(table.headRow, table.lastRow), column: BOM_COLUMNS.length },
  };
  markShortOrders(sheet, table);
  const last = writeBomSums(sheet, bom, prices, table);
  // The sums never stand alone on a page.
  const widths = BOM_COLUMNS.map(({ width }) => width);
  keepTogether(sheet, widths, { first: table.lastRow, last, repeated: HEAD_ROW });
  setPrintArea(sheet, COLUMN.note, last);
}

/** Needs follow this cell; prices do not, since offers have breaks: the words say so. */
function writeBuildQuantity(sheet: Worksheet, { buildQuantity, on }: TrainPricesDto): void {
  const { row, column } = BUILD_QUANTITY_CELL;
  sheet.getRow(row).height = 20;
  const label = sheet.getCell(row, 1);
  sheet.mergeCells(row, 1, row, 2);
  label.value = 'Build quantity';
  const middle = { vertical: 'middle', horizontal: 'left' } as const;
  dress(label, { font: font({ size: 11, bold: true }), alignment: middle });
  const cell = sheet.getCell(`${column}${row}`);
  cell.value = buildQuantity;
  dress(cell, {
    font: font({ size: 11, bold: true }),
    alignment: { ...middle, indent: 1 },
    numFmt: '#,##0',
  });
  sheet.mergeCells(`${COLUMN.quantity}${row}:${COLUMN.note}${row}`);
  const words = sheet.getCell(`${COLUMN.quantity}${row}`);
  words.value =
    `Offers as of ${longDate(new Date(`${on}T00:00:00Z`))}, chosen at this build quantity. ` +
    `A price older than ${HOUSE_RULES.priceAgeDays} days is too old. Each currency has its own total: there are no exchange rates.`;
  dress(words, { font: font({ color: { argb: COLOUR.slate } }), alignment: middle });
}

/** An order below the need stands out, also after somebody overtypes a quantity. */
function markShortOrders(sheet: Worksheet, { firstRow, lastRow }: PlacedTable): void {
  if (lastRow < firstRow) return;
  const { order, needed } = COLUMN;
  sheet.addConditionalFormatting({
    ref: `${order}${firstRow}:${order}${lastRow}`,
    rules: [
      {
        type: 'expression',
        priority: 1,
        formulae: [`${order}${firstRow}<${needed}${firstRow}`],
        style: { font: { bold: true, color: { argb: COLOUR.rust } } },
      },
    ],
  });
}
