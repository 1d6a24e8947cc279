import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Part } from '../types';

/** One part. An edit form keeps its own copy: this does not ask again on focus. */
export function usePart(number: string) {
  const { data, error, isLoading, mutate } = useSWR<Part, unknown>(
    ['/api/parts', number],
    () => answer(api.GET('/api/parts/{number}', { params: { path: { number } } })),
    { revalidateOnFocus: false },
  );
  return { part: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
