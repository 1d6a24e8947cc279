import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Substitutes } from '../types';

/** Parts that drop in for one of the library, the soonest there first. */
export function usePartSubstitutes(number: string, quantity: number | null) {
  const query = quantity === null ? {} : { quantity };
  const { data, error, isLoading, mutate } = useSWR<Substitutes, unknown>(
    ['/api/parts/substitutes', number, query],
    () => answer(api.GET('/api/parts/{number}/substitutes', { params: { path: { number }, query } })),
    { keepPreviousData: true },
  );
  return { substitutes: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
