import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Welcome } from '../types';

/** What the sign-in page shows: in demo mode the accounts to try. */
export function useWelcome() {
  const { data, error, isLoading, mutate } = useSWR<Welcome, unknown>(
    '/api/auth/welcome',
    () => answer(api.GET('/api/auth/welcome')),
    { revalidateOnFocus: false },
  );
  return { welcome: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
