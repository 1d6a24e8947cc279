import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { ChangePage } from '../types';

/** Who changed what of an offer, newest first; a new version asks anew. */
export function useOfferChanges(id: string, page: number, version: number) {
  const { data, error, mutate } = useSWR<ChangePage, unknown>(
    ['/api/offers/changes', id, page, version],
    () =>
      answer(api.GET('/api/offers/{id}/changes', { params: { path: { id }, query: { page, size: 25 } } })),
    { keepPreviousData: true },
  );
  return { changes: data, problem: error === undefined ? null : asProblem(error), mutate };
}
