import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { paths } from '../schema';
import type { SupplierPage } from '../types';

export type SupplierQuery = NonNullable<paths['/api/suppliers']['get']['parameters']['query']>;

/** One page of suppliers; the page before stays on the screen while the next is read. Asks only where `active`. */
export function useSuppliers(query: SupplierQuery, active = true) {
  const { data, error, isLoading, mutate } = useSWR<SupplierPage, unknown>(
    active ? ['/api/suppliers', query] : null,
    () => answer(api.GET('/api/suppliers', { params: { query } })),
    { keepPreviousData: true },
  );
  return { page: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
