import useSWR, { type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { BuyingInput, Train, TrainPrices } from '../types';
import { keepTrain } from './useTrain';

/** What the rule ranks offers by. */
export type Prefer = 'price' | 'arrival';

/**
 * What a train costs at its build quantity, line by line.
 * @param version of the train: another version is priced anew
 * @param allowed false: nothing is asked, since prices are not for this person
 */
export function useTrainPrices(
  { code, version }: Pick<Train, 'code' | 'version'>,
  prefer: Prefer,
  allowed: boolean,
): SWRResponse<TrainPrices, unknown> {
  return useSWR<TrainPrices, unknown>(
    allowed ? ['/api/trains/{code}/prices', code, version, prefer] : null,
    () => answer(api.GET('/api/trains/{code}/prices', { params: { path: { code }, query: { prefer } } })),
    { keepPreviousData: true },
  );
}

/**
 * Sets the build quantity and the offers that a person chose.
 * @throws Problem 400 naming the fields, 409 `changed-meanwhile` with the train as it stands now
 */
export async function saveBuying(code: string, body: BuyingInput): Promise<Train> {
  return keepTrain(await answer(api.PUT('/api/trains/{code}/buying', { params: { path: { code } }, body })));
}
