type Cell = string | number | null | undefined;

const FIGURE = /^[+-]?(?:\d+\.?\d*|\.\d+)$/;
const BEGINS_A_FORMULA = /^[=+\-@]/;

/**
 * Rows as tab-separated text that a spreadsheet takes in one paste. Tabs and line ends inside a cell become blanks;
 * text that a spreadsheet would run as a formula gets the apostrophe that keeps it text.
 */
export function toTsv(rows: readonly (readonly Cell[])[]): string {
  return rows.map((row) => row.map(cellText).join('\t')).join('\n');
}

function cellText(cell: Cell): string {
  const text = String(cell ?? '')
    .replace(/[\t\r\n]+/g, ' ')
    .trim();
  return BEGINS_A_FORMULA.test(text) && !FIGURE.test(text) ? `'${text}` : text;
}

const GROUPED = /^-?\d{1,3}(?:,\d{3})+(?:\.\d+)?$/;

/** What a screen shows, as a spreadsheet reads it: plain minus, no grouping commas, nothing for a lone dash. */
export function plainText(shown: string): string {
  const text = shown.trim().replace(/\u2212/g, '-');
  if (text === '–') return '';
  return GROUPED.test(text) ? text.replaceAll(',', '') : text;
}

/** What is told after copying. */
export function copiedWords(done: boolean, rows: number): string {
  if (!done) return 'The browser does not let this page use the clipboard.';
  return `${rows === 1 ? 'One row' : `${rows} rows`} copied; paste into a spreadsheet.`;
}

/** Puts rows on the clipboard; false when the browser forbids it. */
export async function copyTsv(rows: Parameters<typeof toTsv>[0]): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(toTsv(rows));
    return true;
  } catch {
    return false;
  }
}
