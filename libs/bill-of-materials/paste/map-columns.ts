import { fieldError } from '../../units/index.js';

/** A column that may be pasted. */
export interface ColumnSpec<K extends string = string> {
  key: K;
  /** Name on the screen; a head with it is recognised whatever its case and punctuation. */
  label: string;
  /** Other heads that mean the same. */
  synonyms?: readonly string[];
  /** A head row must have it. */
  required?: boolean;
  /** Heads end in a figure, as in “Price from 10”, and there may be several. Never part of the default order. */
  series?: boolean;
}

/** A pasted column and what it was taken for. */
export interface MappedColumn<K extends string = string> {
  key: K;
  /** From 0. */
  index: number;
  label: string;
  /** The head as it was pasted; null where the default order was used. */
  from: string | null;
  /** The figure in the head of a series, as written; null otherwise. */
  figure: string | null;
}

export interface SeriesCell<K extends string = string> {
  key: K;
  figure: string;
  text: string;
}

export interface MappedRow<K extends string = string> {
  /** Row of the pasted table, from 1, the head row counted. */
  row: number;
  /** Filled cells only. */
  cells: Partial<Record<K, string>>;
  /** Filled cells of series, in the order of the columns. */
  series: SeriesCell<K>[];
  /** Filled cells that belong to no column. */
  spare: string[];
}

export interface MappedTable<K extends string = string> {
  hasHead: boolean;
  columns: MappedColumn<K>[];
  /** Heads that mean nothing here; their columns are left out. */
  ignored: string[];
  /** Rows with at least one filled cell, the head row left out. */
  rows: MappedRow<K>[];
}

/** One match may be chance in a data row; two, or nothing else, is a head. */
const HEAD_MATCHES = 2;
/** A longer cell names no column; matching one of a million characters could keep a server busy for minutes. */
const LONGEST_HEAD = 80;

/**
 * Says what each column of a pasted table is. A first row that names two columns or more (or nothing but columns) is
 * the head, and the columns may stand in any order; without a head they stand in the order of `specs`.
 * @param rows as `readTable` gives them
 * @param field path named in the refusal
 * @throws InputError when a head names a column twice or lacks a required one, or when only a head was pasted
 */
export function mapColumns<K extends string>(
  rows: readonly (readonly string[])[],
  specs: readonly ColumnSpec<K>[],
  field = 'text',
): MappedTable<K> {
  const head = headColumns(rows[0] ?? [], specs);
  if (head !== null) checkHead(head, specs, field);
  const columns = head ?? defaultColumns(specs);
  const hasHead = head !== null;
  const ignored = hasHead ? unnamed(rows[0] ?? [], columns) : [];
  const data = rows.flatMap((cells, index) =>
    (hasHead && index === 0) || cells.every((cell) => cell === '')
      ? []
      : [mappedRow(cells, index + 1, columns, hasHead)],
  );
  if (data.length === 0) {
    throw fieldError(field, '', 'Only column heads were pasted. Paste the rows below them too.');
  }
  return { hasHead, columns, ignored, rows: data };
}

function headColumns<K extends string>(
  cells: readonly string[],
  specs: readonly ColumnSpec<K>[],
): MappedColumn<K>[] | null {
  const columns = cells.flatMap((cell, index) => namedColumn(cell, index, specs) ?? []);
  const filled = cells.filter((cell) => cell !== '').length;
  return columns.length >= HEAD_MATCHES || (columns.length > 0 && columns.length === filled) ? columns : null;
}

function namedColumn<K extends string>(
  cell: string,
  index: number,
  specs: readonly ColumnSpec<K>[],
): MappedColumn<K> | null {
  if (cell.length > LONGEST_HEAD) return null;
  for (const { key, label, synonyms = [], series = false } of specs) {
    const name = series ? (/^(.*?\D)(\d[\d.,]*)$/s.exec(cell)?.[1] ?? '') : cell;
    if (![label, ...synonyms].some((known) => plainHead(known) === plainHead(name))) continue;
    return { key, index, label, from: cell, figure: series ? cell.slice(name.length).trim() : null };
  }
  return null;
}

/** Case, punctuation and spacing do not tell heads apart: `Part-No.` is `part no`. */
function plainHead(head: string): string {
  return head
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

function defaultColumns<K extends string>(specs: readonly ColumnSpec<K>[]): MappedColumn<K>[] {
  return specs
    .filter(({ series }) => !series)
    .map(({ key, label }, index) => ({ key, index, label, from: null, figure: null }));
}

function checkHead<K extends string>(
  columns: readonly MappedColumn<K>[],
  specs: readonly ColumnSpec<K>[],
  field: string,
): void {
  for (const [place, { key, figure, label, from }] of columns.entries()) {
    const first = columns.findIndex((other) => other.key === key && other.figure === figure);
    if (first === place) continue;
    const message = `The heads “${columns[first]?.from ?? ''}” and “${from ?? ''}” both mean ${label}. Keep one of them.`;
    throw fieldError(field, from, message);
  }
  const missing = specs.filter(({ key, required }) => required && !columns.some((one) => one.key === key));
  if (missing.length === 0) return;
  const names = missing.map(({ label }) => `“${label}”`).join(', ');
  throw fieldError(field, names, `The head row has no column ${names}. Add it, or paste without heads.`);
}

function unnamed(cells: readonly string[], columns: readonly MappedColumn[]): string[] {
  return cells.filter((cell, index) => cell !== '' && !columns.some((column) => column.index === index));
}

function mappedRow<K extends string>(
  cells: readonly string[],
  row: number,
  columns: readonly MappedColumn<K>[],
  hasHead: boolean,
): MappedRow<K> {
  const mapped: MappedRow<K> = { row, cells: {}, series: [], spare: [] };
  for (const { key, index, figure } of columns) {
    const text = cells[index] ?? '';
    if (text === '') continue;
    if (figure === null) mapped.cells[key] = text;
    else mapped.series.push({ key, figure, text });
  }
  const taken = new Set(columns.map(({ index }) => index));
  // Beside a head, columns with an unknown name are told once; without one, a cell too many is the row's own fault.
  if (!hasHead) mapped.spare = cells.filter((cell, index) => cell !== '' && !taken.has(index));
  return mapped;
}
