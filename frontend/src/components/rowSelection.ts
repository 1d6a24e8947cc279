/** Which rows of a table are selected; `anchor` is where a range begins, `at` where the keyboard stands. */
export interface RowSelection {
  anchor: number;
  at: number;
  chosen: ReadonlySet<number>;
}

export const NO_ROWS: RowSelection = { anchor: 0, at: 0, chosen: new Set() };

export interface SelectHow {
  /** Shift: from the anchor to here. */
  range?: boolean;
  /** Ctrl or ⌘: add this one or take it off. */
  toggle?: boolean;
}

/** Selecting a row by pointer or key, the way lists of files do it. */
export function selectRow(before: RowSelection, row: number, how: SelectHow = {}): RowSelection {
  if (how.range) {
    const [low, high] = row < before.anchor ? [row, before.anchor] : [before.anchor, row];
    const chosen = new Set(Array.from({ length: high - low + 1 }, (_, step) => low + step));
    return { anchor: before.anchor, at: row, chosen };
  }
  if (how.toggle) {
    const chosen = new Set(before.chosen);
    if (!chosen.delete(row)) chosen.add(row);
    return { anchor: row, at: row, chosen };
  }
  return { anchor: row, at: row, chosen: new Set([row]) };
}

/** Where an arrow, Home, End or a page key leads; null for any other key. */
export function rowAfterKey(key: string, at: number, rows: number): number | null {
  const steps: Record<string, number> = { ArrowDown: 1, ArrowUp: -1, PageDown: 10, PageUp: -10 };
  if (key === 'Home') return 0;
  if (key === 'End') return rows - 1;
  const step = steps[key];
  return step === undefined ? null : Math.max(0, Math.min(rows - 1, at + step));
}
