import { readTable } from '@stageyard/libs/bill-of-materials';
import type { PastePreview } from './pasteTypes';

/**
 * The rows that were left out, as text to mend and check again, under the heads where the text had some.
 * @param text as pasted and previewed
 */
export function wrongRowsOf(text: string, { columns, rows }: PastePreview): string {
  const wrong = new Set(rows.filter(({ action }) => action === 'wrong').map(({ row }) => row));
  const hasHeads = columns.some(({ from }) => from !== null);
  return readTable(text)
    .filter((_, index) => (index === 0 && hasHeads) || wrong.has(index + 1))
    .map((cells) => cells.map(quoted).join('\t'))
    .join('\n');
}

/** As spreadsheets write it: a cell with a tab, a line end or a quotation mark stands in quotation marks. */
const quoted = (cell: string): string => (/["\t\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);
