import { plainText } from './copyTsv';

/** Elements that do something rather than say something. */
const SILENT = 'button, [role="button"], svg, [aria-hidden="true"], [data-copy-skip]';
const LINE_BREAKERS = new Set(['DIV', 'P', 'LI', 'UL', 'OL', 'BR', 'DL', 'DT', 'DD']);

/**
 * What a cell says, for the clipboard: its `data-copy` attribute where it has one (a plain figure behind a formatted
 * one), else the text on the screen without buttons and signs, lines of one cell parted by a blank.
 */
export function cellText(cell: Element): string {
  const given = cell.getAttribute('data-copy');
  if (given !== null) return given;
  return plainText(textOf(cell).replace(/\s+/g, ' '));
}

function textOf(node: Node): string {
  if (node.nodeType === Node.TEXT_NODE) return node.textContent ?? '';
  if (!(node instanceof HTMLElement)) return '';
  if (node instanceof HTMLInputElement || node instanceof HTMLTextAreaElement) return node.value;
  if (node.matches(SILENT) || isHidden(node)) return '';
  const inside = [...node.childNodes].map(textOf).join('');
  return LINE_BREAKERS.has(node.tagName) ? ` ${inside} ` : inside;
}

const isHidden = (element: HTMLElement): boolean => getComputedStyle(element).display === 'none';

/** Rows of a table's body that can be selected. */
export function bodyRows(table: HTMLTableElement): HTMLTableRowElement[] {
  return [...table.tBodies].flatMap((body) => [...body.rows]);
}

/** The cells of one row as text; what the screen leaves out is left out here. */
export function rowText(row: HTMLTableRowElement): string[] {
  return [...row.cells]
    .filter((cell) => !cell.hasAttribute('data-copy-skip') && !isHidden(cell))
    .map(cellText);
}

/** The table's heads as one row; null for a table without any. */
export function headText(table: HTMLTableElement): string[] | null {
  const row = table.tHead?.rows.item(table.tHead.rows.length - 1);
  return row ? rowText(row) : null;
}
