import useSWR from 'swr';
import { answer, api } from '../client';
import type { PlaceCount } from '../types';

const NONE: PlaceCount[] = [];

/** Every place that the ledger knows, “drawer 2” before “drawer 10”; empty until they are read. */
export function usePlaces(): PlaceCount[] {
  const { data } = useSWR<PlaceCount[], unknown>('/api/stock/places', async () => {
    const places = await answer(api.GET('/api/stock/places'));
    return places.sort((one, two) => one.place.localeCompare(two.place, 'en', { numeric: true }));
  });
  return data ?? NONE;
}
