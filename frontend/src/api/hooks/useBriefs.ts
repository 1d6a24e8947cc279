import useSWR from 'swr';
import { answer, api } from '../client';
import type { paths } from '../schema';

export type BriefQuery = NonNullable<paths['/api/briefs']['get']['parameters']['query']>;

/** One page of briefs; the page before stays on the screen while the next is read. */
export function useBriefs(query: BriefQuery) {
  return useSWR(['/api/briefs', query], () => answer(api.GET('/api/briefs', { params: { query } })), {
    keepPreviousData: true,
  });
}
