import { checkOfferTerms, priceAt, type PricedQuantity } from '@stageyard/libs/bill-of-materials';
import { InputError } from '@stageyard/libs/units';
import { numberOrNull } from '../../components/NumberField';
import { termsOf, type OfferForm } from './offerForm';

export type LivePrice =
  { kind: 'waiting' } | { kind: 'refused'; message: string } | { kind: 'priced'; price: PricedQuantity };

type Typed = Pick<OfferForm, 'currency' | 'per' | 'breaks' | 'pack' | 'leastQuantity'>;

/** What the offer as typed asks for a quantity; waits while something is missing. */
export function livePrice(typed: Typed, quantity: string): LivePrice {
  const terms = termsOf(typed);
  const needed = numberOrNull(quantity);
  if (terms === null || needed === null || needed <= 0) return { kind: 'waiting' };
  try {
    // Days do not change a price, so any will do here.
    const day = '2000-01-01';
    checkOfferTerms({ ...terms, leadTimeDays: null, validFrom: day, validUntil: null, pricedOn: day });
    return { kind: 'priced', price: priceAt(needed, terms) };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { kind: 'refused', message: error.errors[0]?.message ?? error.message };
  }
}
