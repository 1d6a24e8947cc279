import { type MappedTable } from '@stageyard/libs/bill-of-materials';
import { badInput, conflict, type ProblemError } from '../errors.js';

/** Wrong rows named by one refusal. */
const MOST_NAMED = 20;

interface PreviewedRow {
  row: number;
  action: string;
  summary: string;
}

/** The columns of a pasted table as they were understood. */
export function columnsOf({ columns, ignored }: MappedTable): { name: string; from: string }[] {
  return [
    ...columns.map(({ label, from, index }) => ({ name: label, from: from ?? `column ${index + 1}` })),
    ...ignored.map((from) => ({ name: 'left out', from })),
  ];
}

/** 409: the rows would now do something else than the person saw. */
export function previewOutdated(preview: unknown): ProblemError {
  const message =
    'What the rows would do has changed since the preview, so nothing was booked. Look at the new preview, then book again.';
  return conflict('preview-outdated', message, { current: preview });
}

/** 400: rows are wrong and were not to be left out. */
export function wrongRows(rows: readonly PreviewedRow[]): ProblemError {
  const wrong = rows.filter(({ action }) => action === 'wrong');
  const message = `${wrong.length} ${wrong.length === 1 ? 'row is' : 'rows are'} wrong, so nothing was booked. Correct them, or leave them out.`;
  const named = wrong.slice(0, MOST_NAMED).map(({ row, summary }) => ({
    field: 'text',
    value: `row ${row}`,
    message: `Row ${row}: ${summary}`,
  }));
  return badInput(named, message);
}
