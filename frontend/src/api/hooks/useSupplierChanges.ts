import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { ChangePage } from '../types';

/** Who changed what of a supplier, newest first; a new version asks anew. */
export function useSupplierChanges(code: string, page: number, version: number) {
  const { data, error, mutate } = useSWR<ChangePage, unknown>(
    ['/api/suppliers/changes', code, page, version],
    () =>
      answer(
        api.GET('/api/suppliers/{code}/changes', { params: { path: { code }, query: { page, size: 25 } } }),
      ),
    { keepPreviousData: true },
  );
  return { changes: data, problem: error === undefined ? null : asProblem(error), mutate };
}
