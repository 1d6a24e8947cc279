import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { paths } from '../schema';
import type { MovementPage } from '../types';

export type MovementQuery = NonNullable<paths['/api/stock/movements']['get']['parameters']['query']>;

/** One page of the ledger, the newest first. */
export function useMovements(query: MovementQuery) {
  const { data, error, isLoading, isValidating, mutate } = useSWR<MovementPage, unknown>(
    ['/api/stock/movements', query],
    () => answer(api.GET('/api/stock/movements', { params: { query } })),
    { keepPreviousData: true },
  );
  return {
    page: data,
    problem: error === undefined ? null : asProblem(error),
    isLoading: isLoading || (isValidating && data === undefined),
    mutate,
  };
}
