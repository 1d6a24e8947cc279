import { describe, expect, it } from 'vitest';
import { NO_ROWS, rowAfterKey, selectRow } from './rowSelection';

const rows = (selection: { chosen: ReadonlySet<number> }) => [...selection.chosen].sort((a, b) => a - b);

describe('selectRow', () => {
  it('selects one row, then a range from it in either direction', () => {
    const one = selectRow(NO_ROWS, 5);
    expect(rows(one)).toEqual([5]);
    const down = selectRow(one, 7, { range: true });
    expect(rows(down)).toEqual([5, 6, 7]);
    expect(rows(selectRow(down, 4, { range: true }))).toEqual([4, 5]);
  });

  it('adds and takes off single rows', () => {
    const two = selectRow(selectRow(NO_ROWS, 1), 3, { toggle: true });
    expect(rows(two)).toEqual([1, 3]);
    expect(rows(selectRow(two, 1, { toggle: true }))).toEqual([3]);
  });
});

describe('rowAfterKey', () => {
  it.each([
    ['ArrowDown', 3, 4],
    ['ArrowUp', 0, 0],
    ['End', 3, 19],
    ['Home', 3, 0],
    ['PageDown', 15, 19],
  ])('%s from row %i leads to row %i', (key, at, expected) => {
    expect(rowAfterKey(key, at, 20)).toBe(expected);
  });

  it('leaves other keys alone', () => {
    expect(rowAfterKey('a', 3, 20)).toBeNull();
  });
});
