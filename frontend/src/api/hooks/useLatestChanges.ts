import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { ChangePage } from '../types';

/** What was changed last by anybody, newest first; asks only where `active`. */
export function useLatestChanges(active: boolean, size: number) {
  const { data, error, mutate } = useSWR<ChangePage, unknown>(active ? ['/api/audit', { size }] : null, () =>
    answer(api.GET('/api/audit', { params: { query: { size } } })),
  );
  return { changes: data, problem: error === undefined ? null : asProblem(error), mutate };
}
