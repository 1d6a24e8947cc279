import { formatCount } from '../figures';
import { booksSomething, type PasteRow } from './pasteTypes';

const ACTION_WORDS: Record<string, string> = {
  add: 'to add',
  change: 'to change',
  choose: 'to choose',
  same: 'the same already',
  wrong: 'wrong',
};

/** `to add`, `wrong`: after a number, and alone as a row's word. */
export const actionWords = (action: string): string => ACTION_WORDS[action] ?? action;

const rowsWords = (count: number): string => (count === 1 ? '1 row' : `${formatCount(count)} rows`);

export interface BookOffer {
  /** The button's words. */
  name: string;
  /** Nothing can be booked, and why; null when something can. */
  why: string | null;
  leaveOutWrong: boolean;
}

/** What the button offers for a preview: all, all but the wrong rows, or nothing and why. */
export function bookOffer(rows: readonly PasteRow[]): BookOffer {
  const wrong = rows.filter(({ action }) => action === 'wrong').length;
  const books = rows.filter(booksSomething).length;
  if (rows.length === 0) return nothing('There are no rows under the heads.');
  if (books === 0) {
    return nothing(
      wrong === 0
        ? 'Nothing to book: every row stands there already.'
        : wrong === rows.length
          ? 'Nothing to book: every row is wrong. Mend them above, or in the spreadsheet, and check again.'
          : 'Nothing to book: the rows that are right stand there already.',
    );
  }
  if (wrong === 0) {
    return {
      name: books === 1 ? 'Book 1 row' : `Book all ${rowsWords(books)}`,
      why: null,
      leaveOutWrong: false,
    };
  }
  return {
    name: `Book ${rowsWords(books)}, leave out ${formatCount(wrong)} wrong`,
    why: null,
    leaveOutWrong: true,
  };
}

const nothing = (why: string): BookOffer => ({ name: 'Book', why, leaveOutWrong: false });

/** `“-3” in Price: An amount must be above 0.` */
export function problemWords({ column, value, message }: PasteRow['problems'][number]): string {
  const text = value === null ? '' : String(value);
  if (column === '') return message;
  return text === '' ? `${column}: ${message}` : `${column} “${text}”: ${message}`;
}
