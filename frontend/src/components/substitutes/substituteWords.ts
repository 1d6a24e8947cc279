import type { Substitute } from '../../api/types';
import { formatPlain } from '../figures';
import { moneyWords } from '../moneyText';

/** When it is there: `on the shelf`, `in 14 days`, `not known`. */
export function arrivalWords({ arrivalDays }: Pick<Substitute, 'arrivalDays'>): string {
  if (arrivalDays === null) return 'not known when';
  if (arrivalDays === 0) return 'here now';
  return arrivalDays === 1 ? 'in 1 day' : `in ${arrivalDays} days`;
}

/** `60 on the shelf`; blank where it never lay on one. */
export function onShelfWords({ onShelf }: Pick<Substitute, 'onShelf'>): string {
  return onShelf === null ? '' : `${formatPlain(onShelf, 3)} on the shelf`;
}

/** `555.00 EUR for 50 from Tarn Gearworks`; blank without an offer, or where prices are not shown. */
export function offerWords({ offer }: Pick<Substitute, 'offer'>): string {
  if (offer === null) return '';
  const { lineTotal, currency, orderQuantity, supplier } = offer;
  return `${moneyWords(lineTotal, currency)} for ${formatPlain(orderQuantity, 3)} from ${supplier}`;
}
