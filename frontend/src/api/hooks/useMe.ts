import { useState } from 'react';
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

/**
 * Who is signed in (`null`: nobody, `undefined`: not known yet) and what they may do. When the session ends in the
 * middle, `can` goes on answering for the person who was here: a page must not take its form away, with everything
 * typed, before they have signed in again. What may be saved is the server's to say.
 */
export function useMe() {
  const { data, error, isLoading, mutate } = useSWR<Me | null, unknown>(ME_KEY, whoAmI, {
    shouldRetryOnError: false,
  });
  const [last, setLast] = useState<Me | null>(null);
  if (data && data !== last) setLast(data);
  const can = (permission: Permission): boolean => (data ?? last)?.permissions.includes(permission) ?? false;
  return { me: data, can, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
