import { type Worksheet } from 'exceljs';

const POINTS_AN_INCH = 72;
const PIXELS_AN_INCH = 96;
/** A4 on its side, inches. */
const PAPER = { width: 11.69, height: 8.27 };
/** Inches. */
export const MARGINS = { left: 0.4, right: 0.4, top: 0.5, bottom: 0.6, header: 0.25, footer: 0.3 };
/** Part of a page that is counted on; printers and faces differ. */
const SURE = 0.98;

/** Pixels that a column of so many characters takes on a screen. */
export function columnPixels(characters: number): number {
  return Math.round(characters * 7 + 5);
}

/** Points of sheet that one printed page holds from top to bottom, when the columns are fitted to its width. */
function pageHeight(widths: readonly number[]): number {
  const pixels = widths.reduce((sum, width) => sum + columnPixels(width), 0);
  const points = (pixels * POINTS_AN_INCH) / PIXELS_AN_INCH;
  const scale = Math.min(1, ((PAPER.width - MARGINS.left - MARGINS.right) * POINTS_AN_INCH) / points);
  return ((PAPER.height - MARGINS.top - MARGINS.bottom) * POINTS_AN_INCH * SURE) / scale;
}

/**
 * Starts a new printed page before the rows `first` to `last` if they would be parted by the end of a page.
 * @param repeated row that every page repeats
 */
export function keepTogether(
  sheet: Worksheet,
  widths: readonly number[],
  { first, last, repeated }: { first: number; last: number; repeated: number },
): void {
  const room = pageHeight(widths);
  const heightOf = (row: number) => sheet.getRow(row).height ?? 15;
  let used = 0;
  let page = 1;
  let pageOfFirst = 1;
  for (let row = 1; row <= last; row += 1) {
    if (used + heightOf(row) > room) {
      page += 1;
      used = heightOf(repeated);
    }
    used += heightOf(row);
    if (row === first) pageOfFirst = page;
  }
  if (page > pageOfFirst) sheet.getRow(first - 1).addPageBreak();
}

/** Everything from the first cell to this column and row is printed. The writer adds the column's dollar sign itself. */
export function setPrintArea(sheet: Worksheet, column: string, row: number): void {
  sheet.pageSetup.printArea = `A$1:${column}$${row}`;
}
