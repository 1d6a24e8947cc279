import { type Cell, type ColumnSpec, type MappedRow } from '@stageyard/libs/bill-of-materials';

/** Longest text of a cell that is shown again. */
const LONGEST_SHOWN = 80;

// eslint-disable-next-line no-control-regex -- the expression exists to find control characters
const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

/** One thing that is wrong in a pasted row. */
interface RowProblem {
  /** Name of the column on the screen; blank for the row as a whole. */
  column: string;
  value: string;
  message: string;
}

/** The cells of one pasted row, and what is wrong with them. */
export class RowReader<K extends string = string> {
  readonly problems: RowProblem[] = [];

  /** @param specs of the table, for the names of its columns */
  constructor(
    readonly source: MappedRow<K>,
    private readonly specs: readonly ColumnSpec<K>[],
  ) {
    if (source.spare.length === 0) return;
    const message = 'The row has more cells than there are columns. Add a head row that names them.';
    this.wrong(null, message, source.spare.join(' | '));
  }

  get row(): number {
    return this.source.row;
  }

  /** The text of a cell; blank when there is none. */
  text(key: K): string {
    return this.source.cells[key] ?? '';
  }

  /**
   * A text that is kept; null when it is blank, or wrong, which is noted.
   * @param lines line breaks and tabs of a quoted cell: refused, kept, or turned into blanks
   */
  bounded(key: K, max: number, lines: 'refused' | 'kept' | 'folded' = 'refused'): string | null {
    const cell = this.text(key);
    const text = lines === 'folded' ? cell.replace(/[\r\n\t ]+/g, ' ') : cell;
    if (text === '') return null;
    if (text.length > max) {
      const [has, most] = [text.length, max].map((count) => count.toLocaleString('en-GB'));
      return this.wrong(key, `It has ${has} characters; at most ${most} are kept. Shorten it.`);
    }
    if (CONTROL.test(text) || (lines === 'refused' && /[\r\n\t]/.test(text))) {
      return this.wrong(key, 'It has line breaks or signs that cannot be shown. Write it on one line.');
    }
    return text;
  }

  /** What a cell holds; null when it is blank, or wrong, which is noted. */
  value<T>(key: K, read: (text: string) => Cell<T>): T | null {
    const cell = read(this.text(key));
    return cell.problem === null ? cell.value : this.wrong(key, cell.problem);
  }

  /**
   * Notes what is wrong with a cell or, with null, with the row.
   * @param value shown again; the cell's own text when left out
   * @returns null, to stand in place of what could not be read
   */
  wrong(key: K | null, message: string, value = key === null ? '' : this.text(key)): null {
    const column = this.specs.find((spec) => spec.key === key)?.label ?? '';
    this.problems.push({ column, value: shownCell(value), message });
    return null;
  }
}

/** The text of a cell as it may be shown again. */
export function shownCell(text: string): string {
  return text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}…` : text;
}
