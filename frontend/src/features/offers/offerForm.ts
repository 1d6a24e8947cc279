import type { Offer, OfferInput } from '../../api/types';
import { amountText, minorOrNull } from '../../components/moneyText';
import { numberOrNull, textOf } from '../../components/NumberField';
import { todayIso } from '../../components/today';

export interface BreakRow {
  quantity: string;
  price: string;
}

/** The offer form holds text as typed; nothing is rewritten until it is sent. */
export interface OfferForm {
  partNumber: string;
  supplierCode: string;
  supplierPartNumber: string;
  currency: string;
  per: string;
  breaks: BreakRow[];
  pack: string;
  leastQuantity: string;
  leadTimeDays: string;
  validFrom: string;
  validUntil: string;
  pricedOn: string;
  source: string;
  note: string;
}

export const BLANK_BREAK: BreakRow = { quantity: '', price: '' };

export function newOfferForm(given: Partial<OfferForm> = {}): OfferForm {
  const today = todayIso();
  return {
    partNumber: '',
    supplierCode: '',
    supplierPartNumber: '',
    currency: 'EUR',
    per: '1',
    breaks: [{ quantity: '1', price: '' }],
    pack: '1',
    leastQuantity: '',
    leadTimeDays: '',
    validFrom: today,
    validUntil: '',
    pricedOn: today,
    source: '',
    note: '',
    ...given,
  };
}

export function formOfOffer(offer: Offer): OfferForm {
  return {
    partNumber: offer.part.number,
    supplierCode: offer.supplier.code,
    supplierPartNumber: offer.supplierPartNumber,
    currency: offer.currency,
    per: String(offer.per),
    breaks: offer.breaks.map(({ quantity, unitPrice }) => ({
      quantity: textOf(quantity),
      price: amountText(unitPrice, offer.currency),
    })),
    pack: textOf(offer.pack),
    leastQuantity: textOf(offer.leastQuantity),
    leadTimeDays: textOf(offer.leadTimeDays),
    validFrom: offer.validFrom,
    validUntil: offer.validUntil ?? '',
    pricedOn: offer.pricedOn,
    source: offer.source,
    note: offer.note,
  };
}

export const isBlankBreak = ({ quantity, price }: BreakRow): boolean =>
  quantity.trim() === '' && price.trim() === '';

type Per = Offer['per'];
type Terms = Pick<Offer, 'currency' | 'per' | 'breaks' | 'pack' | 'leastQuantity'>;

/** Price terms as typed; a row that is not whole or a figure that cannot be read makes them null. */
export function termsOf(
  form: Pick<OfferForm, 'currency' | 'per' | 'breaks' | 'pack' | 'leastQuantity'>,
): Terms | null {
  const breaks: Terms['breaks'] = [];
  for (const row of form.breaks) {
    if (isBlankBreak(row)) continue;
    const quantity = numberOrNull(row.quantity);
    const unitPrice = minorOrNull(row.price, form.currency);
    if (quantity === null || unitPrice === null) return null;
    breaks.push({ quantity, unitPrice });
  }
  const [first] = breaks;
  if (first === undefined) return null;
  return {
    currency: form.currency,
    per: Number(form.per) as Per,
    breaks,
    pack: form.pack.trim() === '' ? 1 : (numberOrNull(form.pack) ?? Number.NaN),
    leastQuantity:
      form.leastQuantity.trim() === '' ? first.quantity : (numberOrNull(form.leastQuantity) ?? Number.NaN),
  };
}

const blankToNull = (text: string): string | null => (text === '' ? null : text);

/** What both adding and editing send; the fields were checked one by one before. */
export function offerBody(form: OfferForm): Omit<OfferInput, 'partNumber' | 'supplierCode'> {
  const terms = termsOf(form);
  return {
    supplierPartNumber: form.supplierPartNumber.trim(),
    currency: form.currency,
    per: Number(form.per) as Per,
    breaks: terms?.breaks ?? [],
    ...(terms === null ? {} : { pack: terms.pack, leastQuantity: terms.leastQuantity }),
    leadTimeDays: numberOrNull(form.leadTimeDays),
    ...(form.validFrom === '' ? {} : { validFrom: form.validFrom }),
    validUntil: blankToNull(form.validUntil),
    ...(form.pricedOn === '' ? {} : { pricedOn: form.pricedOn }),
    source: form.source.trim(),
    note: form.note,
  };
}

export type OfferField = keyof OfferForm | `breaks.${number}.${keyof BreakRow}`;

const PLAIN: readonly string[] = Object.keys(newOfferForm()).filter((name) => name !== 'breaks');

/** Where the server's dotted path stands on this form; breaks are counted as they were sent, without blank rows. */
export function fieldOfOffer(path: string, form: OfferForm): OfferField | null {
  const inBreaks = /^breaks(?:\.(\d+)(?:\.(quantity|unitPrice))?)?$/.exec(path);
  if (inBreaks) {
    const sent = form.breaks.flatMap((row, index) => (isBlankBreak(row) ? [] : [index]));
    const index = sent[Number(inBreaks[1] ?? 0)] ?? 0;
    return `breaks.${index}.${inBreaks[2] === 'unitPrice' ? 'price' : 'quantity'}`;
  }
  return PLAIN.includes(path) ? (path as OfferField) : null;
}
