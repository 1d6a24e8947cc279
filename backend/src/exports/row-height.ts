import { type Row } from 'exceljs';

/** Points a line of 10-point text takes, with room for faces that stand in for ours. */
const LINE = 13;
/** Points a sheet's row can be high at most. */
const HIGHEST = 409;
/** Characters lost to the air at both sides of a cell, and to one step of indent. */
const AIR = 0.8;
const INDENT = 1.4;
/** Our text is 10 points; column widths count figures of 11 points. The little more is kept in hand. */
const SIZE = 0.93;
const BOLD = 1.08;

/** How wide a character is, in figures: the wider of the usual office face and the ones that replace it. */
function widthOf(character: string): number {
  if (/[\sijlI.,:;'’|!]/.test(character)) return 0.5;
  if (/[frt()[\]\-–/]/.test(character)) return 0.7;
  if (/[sckvxyz]/.test(character)) return 0.9;
  if (/[mwMW@%—]/.test(character)) return 1.55;
  return /\p{Lu}/u.test(character) ? 1.15 : 1.02;
}

function lengthOf(text: string): number {
  return [...text].reduce((sum, character) => sum + widthOf(character), 0) * SIZE;
}

/** Lines a text takes when it wraps at words in a column. @param width of the column, in characters */
export function wrappedLines(
  text: string,
  width: number,
  look: { bold?: boolean; indent?: number } = {},
): number {
  const room = Math.max(1, width - AIR - INDENT * (look.indent ?? 0)) / (look.bold ? BOLD : 1);
  return text.split('\n').reduce((lines, paragraph) => lines + paragraphLines(paragraph, room), 0);
}

function paragraphLines(paragraph: string, room: number): number {
  let lines = 1;
  let used = 0;
  for (const word of paragraph.split(' ')) {
    const length = lengthOf(word);
    const joined = used === 0 ? length : used + lengthOf(' ') + length;
    if (joined <= room) {
      used = joined;
      continue;
    }
    if (used > 0) lines += 1;
    // A word longer than the column is broken.
    const broken = Math.ceil(length / room) - 1;
    lines += Math.max(0, broken);
    used = length - Math.max(0, broken) * room;
  }
  return lines;
}

/** Height for a number of lines, points. */
export function heightOfLines(lines: number): number {
  return Math.min(HIGHEST, LINE * lines + 1);
}

/**
 * Makes a row high enough for its longest wrapping text: not every office suite does so when it opens a workbook.
 * @param widths of the columns, in characters
 */
export function fitRowHeight(row: Row, widths: readonly number[], least = 1): void {
  const lines = widths.map((width, index) => {
    const { value, alignment, font } = row.getCell(index + 1);
    // Its type says that a cell has them; a cell never dressed has none.
    const look = { bold: font?.bold === true, indent: alignment?.indent ?? 0 };
    return typeof value === 'string' && alignment?.wrapText ? wrappedLines(value, width, look) : 1;
  });
  row.height = heightOfLines(Math.max(least, ...lines));
}
