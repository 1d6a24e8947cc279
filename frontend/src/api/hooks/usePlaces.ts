import useSWR from 'swr';
import { answer, api } from '../client';
import type { PlaceCount } from '../types';

/** Every place that the ledger knows; empty until they are read. */
export function usePlaces(): PlaceCount[] {
  const { data } = useSWR<PlaceCount[], unknown>('/api/stock/places', () =>
    answer(api.GET('/api/stock/places')),
  );
  return data ?? [];
}
