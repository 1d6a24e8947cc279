import ExcelJS, { type Worksheet } from 'exceljs';
import { describe, expect, it } from 'vitest';
import { keepTogether } from './page-layout.js';

/** A sheet of rows one inch high; a page holds seven inches at most (A4 on its side less its margins). */
function inchRows(count: number): Worksheet {
  const sheet = new ExcelJS.Workbook().addWorksheet('S');
  for (let row = 1; row <= count; row += 1) sheet.getRow(row).height = 72;
  return sheet;
}

const breaks = (sheet: Worksheet) => sheet.model.rowBreaks.map(({ id }) => id);
const NARROW = [20];

describe('rows that belong together', () => {
  it('stay where they are when they fit on the page', () => {
    const sheet = inchRows(7);
    keepTogether(sheet, NARROW, { first: 5, last: 7, repeated: 1 });
    expect(breaks(sheet)).toEqual([]);
  });

  it('begin a page when its end would part them', () => {
    const sheet = inchRows(9);
    keepTogether(sheet, NARROW, { first: 6, last: 9, repeated: 1 });
    expect(breaks(sheet)).toEqual([5]);
  });

  it('count the head that every page repeats', () => {
    // Seven rows, then the head and six: row 14 is on the third page.
    const sheet = inchRows(14);
    keepTogether(sheet, NARROW, { first: 13, last: 14, repeated: 1 });
    expect(breaks(sheet)).toEqual([12]);
  });

  it('have more room on a sheet so wide that it is made smaller', () => {
    const sheet = inchRows(9);
    keepTogether(sheet, [300], { first: 6, last: 9, repeated: 1 });
    expect(breaks(sheet)).toEqual([]);
  });
});
