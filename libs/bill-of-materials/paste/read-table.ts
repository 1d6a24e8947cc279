import { fieldError } from '../../units/index.js';

/** Bounds of what may be pasted in one go. */
export const PASTE_LIMITS = { characters: 1_000_000, rows: 2_000, columns: 40 } as const;

/** One cell and where the next one starts. */
interface ReadCell {
  text: string;
  end: number;
}

/**
 * Reads a table as spreadsheets put it on the clipboard: cells between tabs, rows between line breaks (any kind), cells
 * with tabs, line breaks or quotes in them quoted, their own quotes doubled. A quote that is never closed, or is
 * followed by more text, is part of the cell, as in `"wide" version`. Cells are trimmed; blank rows at the end are
 * dropped, others kept, so that the n-th row of the answer is the n-th row of the sheet.
 * @param field path named in the refusal
 * @throws InputError for a text without any filled cell, beyond 1,000,000 characters, 2,000 rows or 40 columns
 */
export function readTable(text: string, field = 'text'): string[][] {
  const most = PASTE_LIMITS;
  if (text.length > most.characters) {
    throw tooMuch(field, 'characters', text.length, most.characters);
  }
  const rows = rowsOf(text.replace(/^\uFEFF/, ''));
  while (rows.at(-1)?.every((cell) => cell === '')) rows.pop();
  if (rows.length === 0) {
    throw fieldError(
      field,
      '',
      'Nothing was pasted. Copy the rows in your spreadsheet, then paste them here.',
    );
  }
  if (rows.length > most.rows) throw tooMuch(field, 'rows', rows.length, most.rows);
  const columns = rows.reduce((widest, row) => Math.max(widest, filledWidth(row)), 0);
  if (columns > most.columns) throw tooMuch(field, 'columns', columns, most.columns);
  return rows;
}

function tooMuch(field: string, what: string, count: number, most: number): Error {
  const [shown, limit] = [count.toLocaleString('en-GB'), most.toLocaleString('en-GB')];
  const message = `The pasted text has ${shown} ${what}; at most ${limit} can be read at once. Paste it in parts.`;
  return fieldError(field, count, message, most);
}

function rowsOf(text: string): string[][] {
  const rows: string[][] = [];
  let row: string[] = [];
  let at = 0;
  for (;;) {
    const cell = quotedCell(text, at) ?? plainCell(text, at);
    row.push(cell.text.trim());
    const mark = text[cell.end];
    at = cell.end + 1;
    if (mark === '\t') continue;
    rows.push(row);
    row = [];
    if (mark === undefined) return rows;
    if (mark === '\r' && text[at] === '\n') at += 1;
  }
}

function plainCell(text: string, start: number): ReadCell {
  let end = start;
  while (!endsCell(text[end])) end += 1;
  return { text: text.slice(start, end), end };
}

/** Null where no quoted cell starts. Stops at the first quote that is not doubled, so that it never reads on in vain. */
function quotedCell(text: string, start: number): ReadCell | null {
  if (text[start] !== '"') return null;
  let quote = text.indexOf('"', start + 1);
  while (quote !== -1 && text[quote + 1] === '"') quote = text.indexOf('"', quote + 2);
  if (quote === -1 || !endsCell(text[quote + 1])) return null;
  return { text: text.slice(start + 1, quote).replaceAll('""', '"'), end: quote + 1 };
}

function endsCell(mark: string | undefined): boolean {
  return mark === undefined || mark === '\t' || mark === '\n' || mark === '\r';
}

function filledWidth(row: readonly string[]): number {
  return row.findLastIndex((cell) => cell !== '') + 1;
}
