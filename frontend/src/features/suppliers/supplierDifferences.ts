import type { Supplier } from '../../api/types';
import type { Difference } from '../../components/DifferenceList';
import { NOTHING } from '../../components/figures';
import { moneyWords } from '../../components/moneyText';
import { leadTimeWords } from '../../components/offers/offerWords';
import { freightWords, languageName } from './supplierWords';

type State = Partial<Supplier>;
type Shown = (state: State, currency: string) => string | undefined;

const text = (value: string | undefined): string | undefined => (value === '' ? NOTHING : value);

const FIELDS: Record<string, Shown> = {
  Name: ({ name }) => text(name),
  Standing: ({ standing }) => standing,
  Currency: ({ currency }) => currency,
  Language: ({ language }) => language && languageName(language),
  Contacts: ({ contacts }) => contacts && contactsWords(contacts),
  Address: ({ address }) => text(address),
  Freight: ({ freight }, currency) => freight && freightWords(freight, currency),
  'Least order value': ({ leastOrderValue }, currency) =>
    typeof leastOrderValue === 'number'
      ? moneyWords(leastOrderValue, currency)
      : leastOrderValue === null
        ? 'none'
        : undefined,
  'Usual lead time': ({ leadTimeDays }) =>
    leadTimeDays === undefined ? undefined : leadTimeWords(leadTimeDays),
  Note: ({ note }) => text(note),
};

function contactsWords(contacts: Supplier['contacts']): string {
  if (contacts.length === 0) return 'none';
  return contacts
    .map(({ name, role, email, phone }) =>
      [name, role, email, phone].filter((each) => each !== '').join(', '),
    )
    .join('; ');
}

/**
 * Field by field what differs between two states of a supplier; either may hold only some fields.
 * @param currency of amounts in states that do not name one: it did not change then
 */
export function supplierDifferences(
  before: object | null,
  after: object | null,
  currency: string,
): Difference[] {
  const [old, now] = [(before ?? {}) as State, (after ?? {}) as State];
  return Object.entries(FIELDS).flatMap(([field, shown]) => {
    const was = shown(old, old.currency ?? currency) ?? NOTHING;
    const is = shown(now, now.currency ?? currency) ?? NOTHING;
    return was === is ? [] : [{ field, before: was, after: is }];
  });
}
