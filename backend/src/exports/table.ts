import { type CellValue, type Worksheet } from 'exceljs';
import { fitRowHeight } from './row-height.js';
import { type CellLook, dress, font, HEAD_LOOK, RULE_BELOW } from './workbook-style.js';

/** One column of a table in a sheet. */
export interface Column<Row> {
  title: string;
  /** Characters. */
  width: number;
  value: (row: Row, rowNumber: number) => CellValue;
  /** Figures stand on the right, words on the left and wrap. */
  kind: 'figure' | 'words' | 'label';
  numFmt?: string;
  look?: (row: Row) => CellLook;
}

/** Where a table came to stand: row numbers count from 1. */
export interface PlacedTable {
  headRow: number;
  firstRow: number;
  lastRow: number;
}

/** Points below the words of a table's head. */
const FILTER_BUTTON = 14;
const HEAD_AIR = 4;

/**
 * Writes a table with its head at `headRow` and one row an item.
 * Text goes in as text: whatever it begins with, it never becomes a formula.
 * @param filtered leaves room below the head's words for the buttons that open a filter
 */
export function writeTable<Row>(
  sheet: Worksheet,
  headRow: number,
  columns: readonly Column<Row>[],
  rows: readonly Row[],
  filtered = false,
): PlacedTable {
  const widths = columns.map(({ width }) => width);
  columns.forEach(({ title, kind }, index) => {
    const cell = sheet.getCell(headRow, index + 1);
    cell.value = title;
    const horizontal = kind === 'figure' ? 'right' : 'left';
    const indent = kind === 'figure' ? 0 : 1;
    const vertical = filtered ? 'top' : 'middle';
    dress(cell, { ...HEAD_LOOK, alignment: { ...HEAD_LOOK.alignment, horizontal, indent, vertical } });
  });
  const head = sheet.getRow(headRow);
  fitRowHeight(head, widths);
  head.height = (head.height ?? 0) + (filtered ? FILTER_BUTTON : HEAD_AIR);
  rows.forEach((row, offset) => {
    const rowNumber = headRow + 1 + offset;
    columns.forEach((column, index) => {
      const cell = sheet.getCell(rowNumber, index + 1);
      cell.value = column.value(row, rowNumber);
      dress(cell, { ...plainLook(column), ...column.look?.(row) });
    });
    fitRowHeight(sheet.getRow(rowNumber), widths);
  });
  return { headRow, firstRow: headRow + 1, lastRow: headRow + rows.length };
}

function plainLook({ kind, numFmt }: Pick<Column<never>, 'kind' | 'numFmt'>): CellLook {
  return {
    font: font(kind === 'label' ? { bold: true } : {}),
    border: RULE_BELOW,
    alignment: {
      vertical: 'top',
      horizontal: kind === 'figure' ? 'right' : 'left',
      wrapText: kind === 'words',
      // Words beside right-aligned figures need air between.
      indent: kind === 'figure' ? 0 : 1,
    },
    ...(numFmt ? { numFmt } : {}),
  };
}
