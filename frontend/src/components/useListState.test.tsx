import { act, renderHook } from '@testing-library/react';
import type { ReactNode } from 'react';
import { MemoryRouter, useLocation } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { readSort, useListState } from './useListState';

const FILTERS = ['text', 'kind'] as const;
const SORTS = ['number', 'teeth', 'mass'];

function at(address: string) {
  const wrapper = ({ children }: { children: ReactNode }) => (
    <MemoryRouter initialEntries={[address]}>{children}</MemoryRouter>
  );
  return renderHook(() => ({ state: useListState(FILTERS, SORTS), search: useLocation().search }), {
    wrapper,
  });
}

describe('readSort', () => {
  it('reads two keys with their direction', () => {
    expect(readSort('-teeth,number', SORTS)).toEqual([
      { field: 'teeth', down: true },
      { field: 'number', down: false },
    ]);
  });

  it('drops what the list cannot be sorted by, doubles, and a third key', () => {
    expect(readSort('colour,teeth,-teeth,number,mass', SORTS)).toEqual([
      { field: 'teeth', down: false },
      { field: 'number', down: false },
    ]);
    expect(readSort(null, SORTS)).toEqual([]);
  });
});

describe('useListState', () => {
  it('reads page, size, sort and filters from the address', () => {
    const { result } = at('/parts?page=3&size=50&sort=-mass&kind=gear&text=spur');
    expect(result.current.state).toMatchObject({
      page: 3,
      size: 50,
      sort: [{ field: 'mass', down: true }],
      filters: { kind: 'gear', text: 'spur' },
      filterCount: 2,
    });
  });

  it('falls back on nonsense in the address', () => {
    const { result } = at('/parts?page=-2&size=10000&sort=%3Bdrop&kind=');
    expect(result.current.state).toMatchObject({ page: 1, size: 25, sort: [], filters: {}, filterCount: 0 });
  });

  it('goes back to the first page when a filter or the sort changes, and leaves other parameters alone', () => {
    const { result } = at('/parts?page=3&tab=all');
    act(() => result.current.state.setFilters({ kind: 'key' }));
    expect(result.current.search).toBe('?tab=all&kind=key');
    act(() => result.current.state.setPage(2));
    expect(result.current.search).toBe('?tab=all&kind=key&page=2');
    act(() => result.current.state.setSort([{ field: 'teeth', down: true }]));
    expect(result.current.search).toBe('?tab=all&kind=key&sort=-teeth');
    act(() => result.current.state.clearFilters());
    expect(result.current.search).toBe('?tab=all&sort=-teeth');
  });
});
