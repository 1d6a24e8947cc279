import type { Offer } from '../../api/types';
import type { Difference } from '../../components/DifferenceList';
import { formatDay, formatPlain, NOTHING } from '../../components/figures';
import { breaksWords, leadTimeWords } from '../../components/offers/offerWords';

type State = Partial<Offer>;
type Currency = Pick<Offer, 'currency' | 'per'>;
type Shown = (state: State, prices: Currency) => string | undefined;

const text = (value: string | undefined): string | undefined => (value === '' ? NOTHING : value);
const figure = (value: number | undefined): string | undefined =>
  value === undefined ? undefined : formatPlain(value, 3);
const day = (iso: string | undefined): string | undefined => (iso === undefined ? undefined : formatDay(iso));

const FIELDS: Record<string, Shown> = {
  Standing: ({ standing }) => standing,
  'Their part number': ({ supplierPartNumber }) => text(supplierPartNumber),
  Prices: ({ breaks }, prices) => breaks && breaksWords({ breaks, ...prices }),
  Currency: ({ currency }) => currency,
  'Prices are for': ({ per }) => figure(per),
  'Packs of': ({ pack }) => figure(pack),
  'Least order': ({ leastQuantity }) => figure(leastQuantity),
  'Lead time': ({ leadTimeDays }) => (leadTimeDays === undefined ? undefined : leadTimeWords(leadTimeDays)),
  'Priced on': ({ pricedOn }) => day(pricedOn),
  'Valid from': ({ validFrom }) => day(validFrom),
  'Valid until': ({ validUntil }) => (validUntil === null ? 'until further notice' : day(validUntil)),
  Source: ({ source }) => text(source),
  Note: ({ note }) => text(note),
};

/**
 * Field by field what differs between two states of an offer; either may hold only some fields.
 * @param now what currency and for how many the prices are in states that do not say: it did not change then
 */
export function offerDifferences(before: object | null, after: object | null, now: Currency): Difference[] {
  const [old, fresh] = [(before ?? {}) as State, (after ?? {}) as State];
  const prices = ({ currency = now.currency, per = now.per }: State): Currency => ({ currency, per });
  return Object.entries(FIELDS).flatMap(([field, shown]) => {
    const was = shown(old, prices(old)) ?? NOTHING;
    const is = shown(fresh, prices(fresh)) ?? NOTHING;
    return was === is ? [] : [{ field, before: was, after: is }];
  });
}
