import { answer, api } from '../client';
import type { OfferPasteBooked, OfferPasteBookInput, OfferPasteInput, OfferPastePreview } from '../types';
import { readOffersAgain } from './useOffer';

/** What booking pasted rows of one supplier would do; books nothing. @throws Problem when refused */
export function previewOffers(body: OfferPasteInput): Promise<OfferPastePreview> {
  return answer(api.POST('/api/offers/paste', { body }));
}

/**
 * Books pasted rows as they were previewed, all in one go or not at all.
 * @throws Problem when refused; `preview-outdated` carries what would happen now
 */
export async function bookOffers(body: OfferPasteBookInput): Promise<OfferPasteBooked> {
  const result = await answer(api.POST('/api/offers/paste/book', { body }));
  readOffersAgain();
  return result;
}
