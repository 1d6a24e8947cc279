import useSWR, { type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { paths } from '../schema';
import type { BriefPage } from '../types';

export type BriefQuery = NonNullable<paths['/api/briefs']['get']['parameters']['query']>;

/** One page of briefs; the page before stays on the screen while the next is read. */
export function useBriefs(query: BriefQuery): SWRResponse<BriefPage, unknown> {
  return useSWR<BriefPage, unknown>(
    ['/api/briefs', query],
    () => answer(api.GET('/api/briefs', { params: { query } })),
    {
      keepPreviousData: true,
    },
  );
}
