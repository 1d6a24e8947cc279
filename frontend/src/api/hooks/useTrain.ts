import useSWR, { mutate, type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { ChangePage, Train, TrainPatch } from '../types';
import { readAgain } from './readAgain';

const keyOf = (code: string) => ['/api/trains/{code}', code] as const;

/** One train with every figure; not read again on focus, so that a form never changes underfoot. */
export function useTrain(code: string): SWRResponse<Train, unknown> {
  return useSWR<Train, unknown, ReturnType<typeof keyOf>>(
    keyOf(code),
    ([, trainCode]) => answer(api.GET('/api/trains/{code}', { params: { path: { code: trainCode } } })),
    { revalidateOnFocus: false, revalidateOnReconnect: false },
  );
}

/** Puts a train the server has sent in front of every screen that shows it. */
export async function keepTrain(train: Train): Promise<Train> {
  await mutate(keyOf(train.code), train, { revalidate: false });
  readAgain(
    '/api/trains',
    '/api/trains/{code}/bom',
    '/api/trains/{code}/prices',
    '/api/trains/{code}/changes',
    '/api/overview',
  );
  return train;
}

/** @throws Problem 400 naming the fields, 409 `changed-meanwhile` with the train as it stands now */
export async function saveTrain(code: string, patch: TrainPatch): Promise<Train> {
  return keepTrain(
    await answer(api.PATCH('/api/trains/{code}', { params: { path: { code } }, body: patch })),
  );
}

/** Who changed the train, when, and what; newest first. */
export function useTrainChanges(code: string, page = 1) {
  return useSWR<ChangePage, unknown>(['/api/trains/{code}/changes', code, page], () =>
    answer(api.GET('/api/trains/{code}/changes', { params: { path: { code }, query: { page, size: 50 } } })),
  );
}
