import { type NoPriceReason } from '../train-prices/dto/train-prices.dto.js';
import { type PricedLine } from './priced-line.js';

const NO_PRICE: Record<NoPriceReason, string> = {
  made: '',
  'no-part': 'No price: no part chosen.',
  'no-offers': 'No price: no offer.',
  'none-valid': 'No price: no offer is valid.',
};

/** The kit's note as it stands, then what is the matter with the price, then the flags as one sentence. */
export function noteOf({ line, price, reason, lostChoice }: PricedLine): { text: string; warns: boolean } {
  const list = line.flags.join('; ');
  const warnings = [
    reason ? NO_PRICE[reason] : '',
    price?.tooOld ? `Price too old: ${price.ageDays.toLocaleString('en-GB')} days.` : '',
    lostChoice ?? '',
    list === '' ? '' : `${list.charAt(0).toUpperCase()}${list.slice(1)}.`,
  ].filter((text) => text !== '');
  const text = [line.note, ...warnings].filter((part) => part !== '').join(' ');
  return { text, warns: warnings.length > 0 };
}
