import type { PartQuery } from '../../api/hooks/useParts';
import { readDecimal } from '../../components/decimalText';
import { writeSort, type ListState } from '../../components/useListState';

export const PART_FILTERS = [
  'text',
  'kind',
  'standing',
  'module',
  'material',
  'teethMin',
  'teethMax',
  'pressureAngleDeg',
  'helixAngleDeg',
  'hand',
  'boreMin',
  'boreMax',
  'faceWidthMin',
  'faceWidthMax',
  'shelf',
] as const;
export type PartFilter = (typeof PART_FILTERS)[number];

export const PART_SORTS = [
  'number',
  'description',
  'kind',
  'teeth',
  'module',
  'faceWidth',
  'bore',
  'mass',
  'standing',
  'updatedAt',
] as const;

export const SORT_NAMES: Record<(typeof PART_SORTS)[number], string> = {
  number: 'number',
  description: 'description',
  kind: 'kind',
  teeth: 'teeth',
  module: 'module',
  faceWidth: 'face width',
  bore: 'bore',
  mass: 'mass',
  standing: 'standing',
  updatedAt: 'last change',
};

const WORDS: ReadonlySet<PartFilter> = new Set(['text', 'kind', 'standing', 'material', 'hand']);

/**
 * The server's query for what the address holds. A figure in the address that is no number is left out rather than
 * sent: an old or hand-made link should still show a list.
 */
export function partQuery(state: ListState<PartFilter>): PartQuery {
  const query: Record<string, string | number | boolean> = { page: state.page, size: state.size };
  if (state.sort.length > 0) query.sort = writeSort(state.sort);
  for (const name of PART_FILTERS) {
    const value = state.filters[name];
    if (value === undefined) continue;
    if (name === 'shelf') {
      if (value === 'there') query.onShelf = true;
      if (value === 'low') query.low = true;
      continue;
    }
    if (WORDS.has(name)) {
      query[name] = value;
      continue;
    }
    const reading = readDecimal(value);
    if (reading.kind === 'number') query[name] = reading.value;
  }
  return query;
}
