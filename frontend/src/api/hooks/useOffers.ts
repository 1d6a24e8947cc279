import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { paths } from '../schema';
import type { OfferPage } from '../types';

export type OfferQuery = NonNullable<paths['/api/offers']['get']['parameters']['query']>;

/** One page of offers; the page before stays on the screen while the next is read. Asks only where `active`. */
export function useOffers(query: OfferQuery, active = true) {
  const { data, error, isLoading, mutate } = useSWR<OfferPage, unknown>(
    active ? ['/api/offers', query] : null,
    () => answer(api.GET('/api/offers', { params: { query } })),
    { keepPreviousData: true },
  );
  return { page: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
