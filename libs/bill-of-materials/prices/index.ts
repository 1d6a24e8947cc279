export { addDays, calendarDay, daysBetween, isCalendarDate } from './calendar-date.js';
export { checkOfferTerms, OFFER_LIMITS } from './check-offer.js';
export {
  chooseOffer,
  type ChoiceRules,
  type OfferCandidate,
  type OfferChoice,
  type PricedOffer,
} from './choose-offer.js';
export { offerState, priceAge, type OfferState } from './offer-state.js';
export type { OfferTerms, PriceBreak } from './offer-terms.js';
export { orderQuantity, priceAt, type PricedQuantity, type PriceTerms, type QuantityTerms } from './price.js';
export { fromThousandths, isInThousandths, MOST_QUANTITY, toThousandths } from './thousandths.js';
export {
  neededQuantity,
  priceNeed,
  totalsByCurrency,
  type CurrencyTotal,
  type Need,
  type PricedNeed,
} from './price-need.js';
