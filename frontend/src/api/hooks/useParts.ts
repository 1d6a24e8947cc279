import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { paths } from '../schema';
import type { PartPage } from '../types';

export type PartQuery = NonNullable<paths['/api/parts']['get']['parameters']['query']>;

/** One page of the library. The key carries the whole query, so an answer to an older one is never shown for it. */
export function useParts(query: PartQuery) {
  const { data, error, isLoading, isValidating, mutate } = useSWR<PartPage, unknown>(
    ['/api/parts', query],
    () => answer(api.GET('/api/parts', { params: { query } })),
    { keepPreviousData: true },
  );
  return {
    page: data,
    problem: error === undefined ? null : asProblem(error),
    isLoading: isLoading || (isValidating && data === undefined),
    mutate,
  };
}
