import useSWR, { type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { OptionSupply, SearchSupply } from '../types';

/** Cost and stock of a search's options, by the option's key. */
export type SupplyByOption = ReadonlyMap<string, OptionSupply>;

/**
 * Cost and stock of every option of a finished search at a build quantity.
 * @param quantity null: nothing is asked (no build quantity named, or prices are not for this person)
 */
export function useSearchSupply(
  searchId: string | null,
  quantity: number | null,
): SWRResponse<SearchSupply, unknown> {
  const asked = searchId === null || quantity === null ? null : { searchId, quantity };
  return useSWR<SearchSupply, unknown>(
    asked && ['/api/searches/{id}/supply', asked.searchId, asked.quantity],
    () =>
      answer(
        api.GET('/api/searches/{id}/supply', {
          params: { path: { id: asked?.searchId ?? '' }, query: { quantity: asked?.quantity } },
        }),
      ),
  );
}

/** The options of an answer by their keys. */
export function supplyByOption(supply: SearchSupply | undefined): SupplyByOption {
  return new Map(supply?.options.map((option) => [option.key, option] as const));
}
