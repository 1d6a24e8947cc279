import useSWR, { type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { paths } from '../schema';
import type { Train, TrainInput, TrainPage } from '../types';
import { readAgain } from './readAgain';
import { refreshBrief } from './useBrief';

export type TrainQuery = NonNullable<paths['/api/trains']['get']['parameters']['query']>;

/** One page of trains; the page before stays on the screen while the next is read. */
export function useTrains(query: TrainQuery): SWRResponse<TrainPage, unknown> {
  return useSWR<TrainPage, unknown>(
    ['/api/trains', query],
    () => answer(api.GET('/api/trains', { params: { query } })),
    {
      keepPreviousData: true,
    },
  );
}

/** Makes a pinned or listed option a train of its own, revision A. */
export async function adoptOption(input: TrainInput): Promise<Train> {
  const train = await answer(api.POST('/api/trains', { body: input }));
  readAgain('/api/trains', '/api/overview');
  void refreshBrief(input.briefId);
  return train;
}
