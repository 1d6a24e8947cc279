/** What is wrong with one cell of a pasted row. */
export interface PasteProblem {
  /** Name of the column as this product calls it; blank where the row as a whole is at fault. */
  column: string;
  value: string | number | boolean | null;
  message: string;
}

/** What booking would do with one pasted row. */
export interface PasteRow {
  /** Counted from 1 in the pasted text, a row of heads included. */
  row: number;
  /** `same` and `wrong` book nothing; any other word (`add`, `change`, `choose`) does. */
  action: string;
  partNumber: string | null;
  partDescription?: string | null;
  summary: string;
  /** Field by field, "Price from 10: 11.10 → 10.95 EUR". */
  changes: readonly string[];
  problems: readonly PasteProblem[];
}

export interface PastePreview {
  /** Which column of the text was read as what; `from` is its head or place in the text, null when not known. */
  columns: readonly { name: string; from: string | null }[];
  rows: readonly PasteRow[];
  /** Says to the server which preview the person saw. */
  token: string;
}

/** Explains what may be pasted. */
export interface PasteColumnsHelp {
  columns: readonly { name: string; hint: string; required?: boolean }[];
  /** Rows to copy and try, heads first. */
  example: readonly (readonly string[])[];
}

const BOOKS_NOTHING = ['same', 'wrong'];

export const booksSomething = ({ action }: Pick<PasteRow, 'action'>): boolean =>
  !BOOKS_NOTHING.includes(action);

/** How many rows there are of each action. */
export function countsOf(rows: readonly PasteRow[]): Map<string, number> {
  const counts = new Map<string, number>();
  for (const { action } of rows) counts.set(action, (counts.get(action) ?? 0) + 1);
  return counts;
}
