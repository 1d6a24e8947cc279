import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { paths } from '../schema';
import type { StockPage } from '../types';

export type StockQuery = NonNullable<paths['/api/stock']['get']['parameters']['query']>;

/** One page of the shelf; null asks for nothing. */
export function useStock(query: StockQuery | null) {
  const { data, error, isLoading, isValidating, mutate } = useSWR<StockPage, unknown>(
    query === null ? null : ['/api/stock', query],
    () => answer(api.GET('/api/stock', { params: { query: query ?? {} } })),
    { keepPreviousData: true },
  );
  return {
    page: data,
    problem: error === undefined ? null : asProblem(error),
    isLoading: isLoading || (isValidating && data === undefined),
    mutate,
  };
}
