import useSWR from 'swr';
import { answer, api } from '../client';
import { asProblem } from '../problem';
import type { Offer, OfferInput, OfferPatch } from '../types';
import { readAgain } from './readAgain';

/** What shows offers, or counts them. */
const SHOWING = ['/api/offers', '/api/parts/offers', '/api/suppliers', '/api/suppliers/one', '/api/overview'];

/** Has everything read again that shows offers. */
export const readOffersAgain = (): void => readAgain(...SHOWING);

/** One offer. An edit form keeps its own copy: this does not ask again on focus. */
export function useOffer(id: string) {
  const { data, error, isLoading, mutate } = useSWR<Offer, unknown>(
    ['/api/offers/one', id],
    () => answer(api.GET('/api/offers/{id}', { params: { path: { id } } })),
    { revalidateOnFocus: false },
  );
  return { offer: data, problem: error === undefined ? null : asProblem(error), isLoading, mutate };
}

/** @throws Problem when refused */
export async function addOffer(body: OfferInput): Promise<Offer> {
  const offer = await answer(api.POST('/api/offers', { body }));
  readOffersAgain();
  return offer;
}

/** Changes an offer, if it still has the version that was seen. @throws Problem when refused */
export async function saveOffer(id: string, body: OfferPatch): Promise<Offer> {
  const offer = await answer(api.PATCH('/api/offers/{id}', { params: { path: { id } }, body }));
  readOffersAgain();
  return offer;
}
