import { useRef, useState, type KeyboardEvent, type MouseEvent } from 'react';
import { copiedWords, copyTsv } from './copyTsv';
import { useNotices } from './Notices';
import { NO_ROWS, rowAfterKey, selectRow } from './rowSelection';

interface RowSelectionOptions {
  /** Rows on the screen. */
  rows: number;
  /** Rows there are; copying without a selection takes them all. */
  allRows: number;
  /** Cells of one row for the clipboard. */
  cellsOf: (row: number) => string[];
  heads: string[];
  /** Space on a row; selects it where nothing else is meant. */
  onSpace?: (row: number) => void;
}

/** Keyboard reach and selection for a plain table: arrows move, Shift extends, Ctrl+A all, Ctrl+C copies. */
export function useRowSelection({ rows, allRows, cellsOf, heads, onSpace }: RowSelectionOptions) {
  const [selection, setSelection] = useState(NO_ROWS);
  const body = useRef<HTMLTableSectionElement>(null);
  const { tell } = useNotices();
  const at = Math.min(selection.at, Math.max(0, rows - 1));

  async function copy(): Promise<void> {
    const chosen = [...selection.chosen].filter((row) => row < rows).sort((a, b) => a - b);
    const copied = chosen.length > 0 ? chosen : Array.from({ length: allRows }, (_, row) => row);
    tell(copiedWords(await copyTsv([heads, ...copied.map(cellsOf)]), copied.length));
  }

  function onKeyDown(event: KeyboardEvent<HTMLElement>, row: number): void {
    const command = event.ctrlKey || event.metaKey;
    const target = event.target as HTMLElement;
    const onRow = target === event.currentTarget || target.matches('input[type="checkbox"]');
    if (command && event.key === 'c' && document.getSelection()?.toString() === '') {
      void copy();
    } else if (!onRow) {
      // A field, link or button in the row has its own keys.
      return;
    } else if (command && event.key === 'a') {
      setSelection({ anchor: 0, at: row, chosen: new Set(Array.from({ length: rows }, (_, each) => each)) });
    } else if (event.key === ' ') {
      // The tick box itself is ticked by its own key.
      if (target !== event.currentTarget) return;
      if (onSpace) onSpace(row);
      else setSelection((before) => selectRow(before, row, { toggle: true }));
    } else {
      const next = rowAfterKey(event.key, row, rows);
      if (next === null) return;
      setSelection((before) => selectRow(before, next, { range: event.shiftKey }));
      body.current?.querySelectorAll<HTMLElement>(':scope > tr')[next]?.focus();
    }
    event.preventDefault();
  }

  const rowProps = (row: number) => ({
    tabIndex: row === at ? 0 : -1,
    'aria-selected': selection.chosen.has(row),
    onKeyDown: (event: KeyboardEvent<HTMLElement>) => onKeyDown(event, row),
    onClick: (event: MouseEvent<HTMLElement>) => {
      if ((event.target as HTMLElement).closest('input, a, button')) return;
      if (event.shiftKey) document.getSelection()?.removeAllRanges();
      setSelection((before) =>
        selectRow(before, row, { range: event.shiftKey, toggle: event.ctrlKey || event.metaKey }),
      );
    },
  });

  return { body, rowProps, copy, selected: selection.chosen, clear: () => setSelection(NO_ROWS) };
}
