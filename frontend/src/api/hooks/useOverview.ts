import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Overview } from '../types';

/** Counts for the navigation and what waits for this person on the first page. */
export function useOverview() {
  const { data, error, isLoading, mutate } = useSWR<Overview, unknown>('/api/overview', () =>
    answer(api.GET('/api/overview')),
  );
  return { overview: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
