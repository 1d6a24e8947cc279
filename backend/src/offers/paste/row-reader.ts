import { type Cell, type MappedRow } from '@stageyard/libs/bill-of-materials';
import { type OfferPasteProblemDto } from './dto/offer-paste-row.dto.js';
import { columnLabel, type OfferColumn } from './paste-columns.js';

/** Longest text of a cell that is shown again. */
const LONGEST_SHOWN = 80;

// eslint-disable-next-line no-control-regex -- the expression exists to find control characters
const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

/** The cells of one pasted row, and what is wrong with them. */
export class RowReader {
  readonly problems: OfferPasteProblemDto[] = [];

  constructor(readonly source: MappedRow<OfferColumn>) {
    if (source.spare.length === 0) return;
    const message = 'The row has more cells than there are columns. Add a head row that names them.';
    this.problems.push({ column: '', value: shown(source.spare.join(' | ')), message });
  }

  get row(): number {
    return this.source.row;
  }

  /** The text of a cell; blank when there is none. */
  text(key: OfferColumn): string {
    return this.source.cells[key] ?? '';
  }

  /** A text that is kept as it stands. @param lines whether it may have several lines */
  bounded(key: OfferColumn, max: number, { lines = false } = {}): string | null {
    const text = this.text(key);
    if (text === '') return null;
    if (text.length > max) {
      return this.wrong(
        key,
        `It has ${text.length} characters; at most ${max.toLocaleString('en-GB')} are kept. Shorten it.`,
      );
    }
    if (CONTROL.test(text) || (!lines && /[\r\n\t]/.test(text))) {
      return this.wrong(key, 'It has line breaks or signs that cannot be shown. Write it on one line.');
    }
    return text;
  }

  /** What a cell holds; null when it is blank, or wrong, which is noted. */
  value<T>(key: OfferColumn, read: (text: string) => Cell<T>): T | null {
    const cell = read(this.text(key));
    return cell.problem === null ? cell.value : this.wrong(key, cell.problem);
  }

  /** Notes what is wrong with a cell. @param value shown again; the cell's own text when left out */
  wrong(key: OfferColumn | null, message: string, value = key === null ? '' : this.text(key)): null {
    this.problems.push({ column: key === null ? '' : columnLabel(key), value: shown(value), message });
    return null;
  }
}

function shown(text: string): string {
  return text.length > LONGEST_SHOWN ? `${text.slice(0, LONGEST_SHOWN)}…` : text;
}
