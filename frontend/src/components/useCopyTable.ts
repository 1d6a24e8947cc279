import { useEffect, useLayoutEffect, useRef, useState, type KeyboardEvent, type MouseEvent } from 'react';
import { copiedWords, copyTsv } from './copyTsv';
import { useNotices } from './Notices';
import { NO_ROWS, rowAfterKey, selectRow, type RowSelection } from './rowSelection';
import { bodyRows, headText, rowText } from './tableText';

/** Things in a row that take clicks for themselves. */
const OWN_CLICK = 'input, textarea, select, a, button, label, [role="button"], [role="combobox"]';

const allRows = (count: number, at: number): RowSelection => ({
  anchor: 0,
  at,
  chosen: new Set(Array.from({ length: count }, (_, row) => row)),
});

/**
 * Selecting and copying rows of a table whose rows somebody else draws. The rows are marked in the document itself
 * (`aria-selected`, one tab stop for the whole table), so that no table has to know of it.
 * @param opens a plain click on a row leads on; only with Ctrl or Shift it selects
 */
export function useCopyTable(opens: boolean) {
  const table = useRef<HTMLTableElement>(null);
  const [selection, setSelection] = useState(NO_ROWS);
  const { tell } = useNotices();

  useLayoutEffect(() => {
    const element = table.current;
    if (!element) return undefined;
    const mark = () => markRows(element, selection);
    mark();
    // Rows that come later without this table being drawn anew.
    const watch = new MutationObserver(mark);
    watch.observe(element, { childList: true, subtree: true });
    return () => watch.disconnect();
  });

  const some = selection.chosen.size > 0;
  useEffect(() => {
    if (!some) return undefined;
    // One table at a time: what is selected here is let go by a press anywhere else.
    const letGo = ({ target }: PointerEvent) => {
      if (!(target instanceof Element)) return;
      if (table.current?.contains(target) || target.closest('[role="toolbar"]')) return;
      setSelection(NO_ROWS);
    };
    document.addEventListener('pointerdown', letGo);
    return () => document.removeEventListener('pointerdown', letGo);
  }, [some]);

  async function copy(): Promise<void> {
    if (!table.current) return;
    const rows = bodyRows(table.current);
    const chosen = rows.filter((_, row) => selection.chosen.has(row));
    const copied = chosen.length > 0 ? chosen : rows;
    const heads = headText(table.current);
    tell(copiedWords(await copyTsv([...(heads ? [heads] : []), ...copied.map(rowText)]), copied.length));
  }

  function onKeyDown(event: KeyboardEvent<HTMLTableElement>): void {
    const target = event.target as HTMLElement;
    if (!table.current || target.matches('input, textarea')) return;
    const rows = bodyRows(table.current);
    const row = rows.findIndex((each) => each.contains(target));
    if (row < 0) return;
    const command = event.ctrlKey || event.metaKey;
    if (command && event.key === 'c') {
      if (document.getSelection()?.toString() !== '') return;
      void copy();
    } else if (target !== rows[row]) {
      return;
    } else if (command && event.key === 'a') {
      setSelection(allRows(rows.length, row));
    } else if (event.key === 'Escape' && some) {
      setSelection(NO_ROWS);
    } else if (event.key === ' ') {
      setSelection((before) => selectRow(before, row, { toggle: true }));
    } else if (event.key === 'Enter' && opens) {
      target.click();
    } else {
      const next = rowAfterKey(event.key, row, rows.length);
      if (next === null) return;
      setSelection((before) =>
        selectRow(before.chosen.size === 0 ? { ...before, anchor: row } : before, next, {
          range: event.shiftKey,
        }),
      );
      rows[next]?.focus();
    }
    event.preventDefault();
  }

  function onClickCapture(event: MouseEvent<HTMLTableElement>): void {
    const target = event.target as HTMLElement;
    const how = { range: event.shiftKey, toggle: event.ctrlKey || event.metaKey };
    if (!table.current || target.closest(OWN_CLICK)) return;
    if (opens && !how.range && !how.toggle) return;
    const row = bodyRows(table.current).findIndex((each) => each.contains(target));
    // Somebody who marks a word with the mouse wants that word.
    if (row < 0 || (!how.range && document.getSelection()?.toString())) return;
    if (how.range) document.getSelection()?.removeAllRanges();
    if (opens) event.stopPropagation();
    setSelection((before) => selectRow(before, row, how));
  }

  return {
    tableProps: { ref: table, onKeyDown, onClickCapture },
    selected: selection.chosen.size,
    copy: () => void copy(),
    clear: () => setSelection(NO_ROWS),
  };
}

/** Writes the selection into the rows: what is selected, and which row the Tab key reaches. */
function markRows(table: HTMLTableElement, { at, chosen }: RowSelection): void {
  const rows = bodyRows(table);
  const reached = Math.min(at, rows.length - 1);
  rows.forEach((row, index) => {
    setOnce(row, 'tabindex', index === reached ? '0' : '-1');
    setOnce(row, 'aria-selected', String(chosen.has(index)));
  });
}

function setOnce(element: Element, name: string, value: string): void {
  if (element.getAttribute(name) !== value) element.setAttribute(name, value);
}
