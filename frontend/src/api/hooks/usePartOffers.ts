import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { PartOffers } from '../types';

/** Every offer for a part with its price at a quantity (blank: one), the chosen one marked. */
export function usePartOffers(number: string, quantity: number | null, prefer: 'price' | 'arrival') {
  const query = { prefer, ...(quantity === null ? {} : { quantity }) };
  const { data, error, isLoading, mutate } = useSWR<PartOffers, unknown>(
    ['/api/parts/offers', number, query],
    () => answer(api.GET('/api/parts/{number}/offers', { params: { path: { number }, query } })),
    { keepPreviousData: true },
  );
  return { offers: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
