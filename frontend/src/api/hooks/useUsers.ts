import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { User } from '../types';

/** Everybody who can sign in; a team's worth, the first hundred by name. */
export function useUsers(active: boolean) {
  const { data, error, isLoading, mutate } = useSWR<User[], unknown>(
    active ? '/api/users' : null,
    async () => {
      const page = await answer(api.GET('/api/users', { params: { query: { size: 100 } } }));
      return page.items;
    },
  );
  return { users: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}
