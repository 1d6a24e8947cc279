import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';

export interface SortKey {
  field: string;
  down: boolean;
}

export interface ListState<Filter extends string> {
  page: number;
  size: number;
  /** At most two keys; the first is the one the table's head shows. */
  sort: SortKey[];
  filters: Partial<Record<Filter, string>>;
  /** How many filters are set, the text included. */
  filterCount: number;
  setPage: (page: number, size?: number) => void;
  setSort: (sort: SortKey[]) => void;
  /** Sets or (blank) removes filters and goes back to the first page. */
  setFilters: (patch: Partial<Record<Filter, string>>) => void;
  clearFilters: () => void;
}

const PAGE_SIZES = [25, 50, 100] as const;

/** `number,-teeth` → two keys; anything not allowed is dropped. */
export function readSort(text: string | null, allowed: readonly string[]): SortKey[] {
  const keys = (text ?? '')
    .split(',')
    .filter((part) => part !== '')
    .map((part) => ({ field: part.replace(/^-/, ''), down: part.startsWith('-') }))
    .filter(({ field }) => allowed.includes(field));
  return keys.filter((key, at) => keys.findIndex(({ field }) => field === key.field) === at).slice(0, 2);
}

export function writeSort(sort: readonly SortKey[]): string {
  return sort.map(({ field, down }) => (down ? `-${field}` : field)).join(',');
}

const positive = (text: string | null): number | null => {
  const value = Number(text);
  return Number.isInteger(value) && value > 0 ? value : null;
};

/** Page, sort and filters of a list, held in the address, so that a link shows the same list. */
export function useListState<Filter extends string>(
  filterNames: readonly Filter[],
  sorts: readonly string[],
): ListState<Filter> {
  const [params, setParams] = useSearchParams();
  const known = useMemo(() => {
    const filters: Partial<Record<Filter, string>> = {};
    for (const name of filterNames) {
      const value = params.get(name);
      if (value !== null && value !== '') filters[name] = value;
    }
    const size = positive(params.get('size'));
    return {
      page: positive(params.get('page')) ?? 1,
      size: PAGE_SIZES.find((each) => each === size) ?? PAGE_SIZES[0],
      sort: readSort(params.get('sort'), sorts),
      filters,
      filterCount: Object.keys(filters).length,
    };
  }, [params, filterNames, sorts]);

  const change = useCallback(
    (patch: Record<string, string | null>) => {
      setParams(
        (before) => {
          const after = new URLSearchParams(before);
          for (const [name, value] of Object.entries(patch)) {
            if (value === null || value === '') after.delete(name);
            else after.set(name, value);
          }
          return after;
        },
        { replace: true, preventScrollReset: true },
      );
    },
    [setParams],
  );

  return {
    ...known,
    setPage: (page, size = known.size) =>
      change({ page: page > 1 ? String(page) : null, size: size === PAGE_SIZES[0] ? null : String(size) }),
    setSort: (sort) => change({ sort: writeSort(sort), page: null }),
    setFilters: (patch) => change({ ...(patch as Record<string, string>), page: null }),
    clearFilters: () => change(Object.fromEntries([...filterNames, 'page'].map((name) => [name, null]))),
  };
}
