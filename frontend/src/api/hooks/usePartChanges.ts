import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { ChangePage } from '../types';

/** Who changed what of a part, newest first; a new version of the part asks anew. */
export function usePartChanges(number: string, page: number, version: number) {
  const { data, error, isLoading, mutate } = useSWR<ChangePage, unknown>(
    ['/api/parts/changes', number, page, version],
    () =>
      answer(
        api.GET('/api/parts/{number}/changes', { params: { path: { number }, query: { page, size: 25 } } }),
      ),
    { keepPreviousData: true },
  );
  return { changes: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
