import useSWR from 'swr';
import { answer, api } from '../client';
import type { Facets } from '../types';

/** What the library holds, for the choices of the filter bar; without it the bar still works, with fewer choices. */
export function usePartFacets() {
  const { data, mutate } = useSWR<Facets, unknown>(
    '/api/parts/facets',
    () => answer(api.GET('/api/parts/facets')),
    { revalidateOnFocus: false },
  );
  return { facets: data, mutate };
}
