import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { Problem } from '../../api/problem';
import { renderAt } from '../../testing/renderAt';
import { PasteDialog } from './PasteDialog';
import type { PastePreview, PasteRow } from './pasteTypes';
import { bookOffer } from './pasteWords';
import { wrongRowsOf } from './wrongRows';

const HELP = { columns: [{ name: 'Part number', hint: 'Ours' }], example: [['Part number', 'Price']] };

const row = (given: Partial<PasteRow> & Pick<PasteRow, 'row' | 'action'>): PasteRow => ({
  partNumber: `KW-${given.row}`,
  summary: 'Adds an offer.',
  changes: [],
  problems: [],
  ...given,
});

const WRONG = row({
  row: 3,
  action: 'wrong',
  partNumber: 'KW-99999',
  problems: [{ column: 'Part number', value: 'KW-99999', message: 'No part has this number.' }],
});

const preview = (rows: PasteRow[], token = 't1'): PastePreview => ({
  columns: [{ name: 'Part number', from: 'Part' }],
  rows,
  token,
});

const TEXT = 'Part\tPrice\nKW-2\t12.40\nKW-99999\t3.00\nKW-4\t7.10';

function open(calls: {
  preview: (text: string) => Promise<PastePreview>;
  book?: (text: string, token: string, leaveOutWrong: boolean) => Promise<string>;
}) {
  const onBooked = vi.fn();
  const onClose = vi.fn();
  const book = vi.fn(calls.book ?? (() => Promise.resolve('2 offers added.')));
  renderAt(
    '/offers',
    '/offers',
    <PasteDialog
      title="Paste offers"
      columnsHelp={HELP}
      preview={calls.preview}
      book={book}
      onBooked={onBooked}
      onClose={onClose}
    />,
  );
  return { user: userEvent.setup(), book, onBooked, onClose };
}

const box = () => screen.getByLabelText('Rows from the spreadsheet');

describe('the box for pasted rows', () => {
  it('checks what is pasted, shows the wrong row and why, books the others and keeps the wrong one', async () => {
    const rows = [
      row({ row: 2, action: 'add' }),
      WRONG,
      row({ row: 4, action: 'change', changes: ['Price: 7.00 → 7.10 EUR'] }),
    ];
    const { user, book, onBooked, onClose } = open({ preview: () => Promise.resolve(preview(rows)) });
    await user.click(box());
    await user.paste(TEXT);
    expect(await screen.findByText('Part number “KW-99999”: No part has this number.')).toBeVisible();
    const table = screen.getByRole('table', { name: 'What booking would do' });
    // Wrong rows first; the others a click away.
    expect(within(table).queryByText('KW-4')).toBeNull();
    await user.click(screen.getByRole('button', { name: '3 in all' }));
    expect(screen.getByText('Price: 7.00 → 7.10 EUR')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Book 2 rows, leave out 1 wrong' }));
    expect(
      await screen.findByText(/2 offers added\. The rows that were left out are still here/),
    ).toBeVisible();
    expect(book).toHaveBeenCalledWith(TEXT, 't1', true);
    expect(onBooked).toHaveBeenCalledOnce();
    expect(onClose).not.toHaveBeenCalled();
    expect(box()).toHaveValue('Part\tPrice\nKW-99999\t3.00');
  });

  it('books all and closes when nothing is wrong', async () => {
    const { user, book, onClose } = open({
      preview: () =>
        Promise.resolve(preview([row({ row: 1, action: 'add' }), row({ row: 2, action: 'same' })])),
    });
    await user.click(box());
    await user.paste('KW-1\t1\nKW-2\t2');
    await user.click(await screen.findByRole('button', { name: 'Book 1 row' }));
    await waitFor(() => expect(onClose).toHaveBeenCalledOnce());
    expect(book).toHaveBeenCalledWith('KW-1\t1\nKW-2\t2', 't1', false);
    expect(screen.getByText('2 offers added.')).toBeInTheDocument();
  });

  it('keeps the text when the server refuses it, and says why', async () => {
    const { user } = open({
      preview: () =>
        Promise.reject(
          new Problem(400, 'bad-input', 'The rows were not read.', [
            { field: 'text', message: 'There are 2,001 rows; at most 2,000 are read at a time.' },
          ]),
        ),
    });
    await user.click(box());
    await user.paste(TEXT);
    expect(await screen.findByText(/at most 2,000 are read/)).toBeVisible();
    expect(box()).toHaveValue(TEXT);
  });

  it('shows what would happen now when the preview is outdated, and books nothing by itself', async () => {
    const rows = [row({ row: 2, action: 'add' })];
    const fresh = preview([row({ row: 2, action: 'change', changes: ['Price: 12.00 → 12.40 EUR'] })], 't2');
    let first = true;
    const { user, book, onClose } = open({
      preview: () => Promise.resolve(preview(rows)),
      book: () => {
        if (!first) return Promise.resolve('1 offer changed.');
        first = false;
        return Promise.reject(new Problem(409, 'preview-outdated', 'Outdated.', [], null, fresh));
      },
    });
    await user.click(box());
    await user.paste('Part\tPrice\nKW-2\t12.40');
    await user.click(await screen.findByRole('button', { name: 'Book 1 row' }));
    expect(await screen.findByText(/Nothing is booked yet/)).toBeVisible();
    expect(screen.getByText('Price: 12.00 → 12.40 EUR')).toBeVisible();
    expect(onClose).not.toHaveBeenCalled();
    await user.click(screen.getByRole('button', { name: 'Book 1 row' }));
    await waitFor(() => expect(onClose).toHaveBeenCalledOnce());
    expect(book.mock.calls.map(([, token]) => token)).toEqual(['t1', 't2']);
  });

  it('does not book what was typed after the check', async () => {
    const { user } = open({ preview: () => Promise.resolve(preview([row({ row: 1, action: 'add' })])) });
    await user.click(box());
    await user.paste('KW-1\t1');
    await screen.findByRole('button', { name: 'Book 1 row' });
    await user.type(box(), '0');
    expect(screen.queryByRole('button', { name: 'Book 1 row' })).toBeNull();
    expect(screen.getByRole('button', { name: 'Check the rows' })).toBeEnabled();
  });

  it('asks before rows that are not booked are left behind', async () => {
    const { user, onClose } = open({ preview: () => Promise.resolve(preview([WRONG])) });
    await user.type(box(), 'x');
    await user.click(screen.getByRole('button', { name: 'Cancel' }));
    expect(await screen.findByRole('dialog', { name: 'Leave without booking?' })).toBeVisible();
    expect(onClose).not.toHaveBeenCalled();
    await user.click(screen.getByRole('button', { name: 'Stay here' }));
    expect(box()).toHaveValue('x');
  });
});

describe('what the button offers', () => {
  it('counts 497 rows of 500 with 3 wrong ones', () => {
    const rows = Array.from({ length: 500 }, (_, index) =>
      row({ row: index + 1, action: index % 200 === 7 ? 'wrong' : 'add' }),
    );
    // Wrong at 8, 208 and 408.
    expect(bookOffer(rows)).toEqual({
      name: 'Book 497 rows, leave out 3 wrong',
      why: null,
      leaveOutWrong: true,
    });
  });

  it('offers nothing when every row is wrong or stands there already', () => {
    expect(bookOffer([WRONG]).why).toMatch(/every row is wrong/);
    expect(bookOffer([row({ row: 1, action: 'same' })]).why).toMatch(/stands there already/);
    expect(bookOffer([]).why).toMatch(/no rows/);
  });
});

describe('rows that were left out', () => {
  it('keep their cells, however they were quoted, and the heads above them', () => {
    const text = 'Part\tNote\r\nKW-1\tfine\r\nKW-2\t"two\nlines, ""quoted"""\r\n';
    const rows = [row({ row: 2, action: 'add' }), row({ row: 3, action: 'wrong' })];
    expect(wrongRowsOf(text, { rows })).toBe('Part\tNote\nKW-2\t"two\nlines, ""quoted"""');
  });

  it('stand alone where the text had no heads', () => {
    const rows = [row({ row: 1, action: 'add' }), row({ row: 2, action: 'wrong' })];
    expect(wrongRowsOf('KW-1\t1\nKW-2\tx', { rows })).toBe('KW-2\tx');
  });
});
