import { readTable } from '@stageyard/libs/bill-of-materials';
import type { PastePreview } from './pasteTypes';

/**
 * The rows that were left out, as text to mend and check again, under the heads where the text had some.
 * @param text as pasted and previewed
 */
export function wrongRowsOf(text: string, { rows }: Pick<PastePreview, 'rows'>): string {
  const wrong = new Set(rows.filter(({ action }) => action === 'wrong').map(({ row }) => row));
  // A row of heads is counted but is no row of the preview.
  const hasHeads = rows.every(({ row }) => row > 1);
  return readTable(text)
    .filter((_, index) => (index === 0 && hasHeads) || wrong.has(index + 1))
    .map((cells) => cells.map(quoted).join('\t'))
    .join('\n');
}

/** As spreadsheets write it: a cell with a tab, a line end or a quotation mark stands in quotation marks. */
const quoted = (cell: string): string => (/["\t\r\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);
