import type { OfferQuery } from '../../api/hooks/useOffers';
import { addDays } from '@stageyard/libs/bill-of-materials';
import { todayIso } from '../today';
import { writeSort, type ListState } from '../useListState';

export const OFFER_FILTERS = ['text', 'supplier', 'part', 'currency', 'state', 'tooOld', 'ends'] as const;
export type OfferFilter = (typeof OFFER_FILTERS)[number];

export const OFFER_SORTS = [
  'part',
  'supplier',
  'supplierPartNumber',
  'leadTimeDays',
  'pricedOn',
  'validUntil',
  'updatedAt',
] as const;

export const STATE_CHOICES = [
  { value: 'valid', name: 'valid' },
  { value: 'not-yet', name: 'not yet' },
  { value: 'expired', name: 'ended' },
  { value: 'closed', name: 'closed' },
] as const;

/** Days ahead within which a valid offer ends. */
export const ENDS_CHOICES = ['7', '30', '90'].map((value) => ({ value, name: `in ${value} days` }));

/**
 * The server's query for what the address holds; a value that means nothing is left out rather than sent: an old or
 * hand-made link should still show a list.
 * @param supplier code of the one supplier whose offers these are, whatever the address says
 */
export function offerQuery(state: ListState<OfferFilter>, supplier?: string): OfferQuery {
  const { text, part, currency, tooOld, ends } = state.filters;
  const from = supplier ?? state.filters.supplier;
  const known = STATE_CHOICES.find(({ value }) => value === state.filters.state)?.value;
  const days = ENDS_CHOICES.find(({ value }) => value === ends)?.value;
  return {
    page: state.page,
    size: state.size,
    sort: writeSort(state.sort) || 'part',
    ...(text ? { text } : {}),
    ...(part ? { part } : {}),
    ...(from ? { supplier: from } : {}),
    ...(currency ? { currency } : {}),
    ...(known ? { state: known } : {}),
    ...(tooOld === 'true' ? { tooOld: true } : {}),
    ...(days === undefined ? {} : { endsBy: addDays(todayIso(), Number(days)) }),
  };
}
