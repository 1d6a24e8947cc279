import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';

/** Counts for the navigation and what waits for this person on the first page. */
export function useOverview() {
  const { data, error, isLoading, mutate } = useSWR('/api/overview', () => answer(api.GET('/api/overview')));
  return { overview: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
