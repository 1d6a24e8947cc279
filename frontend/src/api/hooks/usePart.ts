import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Part } from '../types';

/** One part; none where the number is null. An edit form keeps its own copy: this does not ask again on focus. */
export function usePart(number: string | null) {
  const { data, error, isLoading, mutate } = useSWR<Part, unknown>(
    number === null ? null : ['/api/parts', number],
    ([, wanted]: [string, string]) =>
      answer(api.GET('/api/parts/{number}', { params: { path: { number: wanted } } })),
    { revalidateOnFocus: false },
  );
  return { part: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
