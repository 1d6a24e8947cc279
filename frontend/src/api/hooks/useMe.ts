import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Me, Permission } from '../types';

export const ME_KEY = '/api/auth/me';

async function whoAmI(): Promise<Me | null> {
  try {
    return await answer(api.GET('/api/auth/me'));
  } catch (error) {
    const problem = asProblem(error);
    if (problem.signedOut) return null;
    throw problem;
  }
}

/** Who is signed in (`null`: nobody, `undefined`: not known yet) and what they may do. */
export function useMe() {
  const { data, error, isLoading, mutate } = useSWR<Me | null, unknown>(ME_KEY, whoAmI, {
    shouldRetryOnError: false,
  });
  const can = (permission: Permission): boolean => data?.permissions.includes(permission) ?? false;
  return { me: data, can, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
