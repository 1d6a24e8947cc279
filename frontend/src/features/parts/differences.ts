import type { Difference } from '../../components/DifferenceList';
import { shownValue } from './attributes';
import { ATTRIBUTES } from './partKinds';

const FIELD_NAMES: Record<string, string> = {
  number: 'Number',
  kind: 'Kind',
  description: 'Description',
  standing: 'Standing',
  successorNumber: 'Successor',
  material: 'Material',
  mass: 'Mass, kg',
  supply: 'Supply',
  supplier: 'Supplier',
  note: 'Note',
};

const ATTRIBUTE_NAMES: Record<string, string> = Object.fromEntries(
  Object.values(ATTRIBUTES)
    .flat()
    .map(({ name, label, unit }) => [name, unit === undefined ? label : `${label}, ${unit}`]),
);

type Fields = Readonly<Record<string, unknown>>;

const fieldsOf = (value: unknown): Fields =>
  typeof value === 'object' && value !== null ? (value as Fields) : {};

/** Field by field what differs between two states of a part, attributes included; either may hold only some fields. */
export function differences(before: object | null, after: object | null): Difference[] {
  const [old, now] = [fieldsOf(before), fieldsOf(after)];
  const plain = compare(old, now, FIELD_NAMES);
  const attributes = compare(fieldsOf(old['attributes']), fieldsOf(now['attributes']), ATTRIBUTE_NAMES);
  return [...plain, ...attributes];
}

function compare(old: Fields, now: Fields, names: Record<string, string>): Difference[] {
  return Object.entries(names)
    .map(([key, field]) => ({ field, before: shownValue(old[key]), after: shownValue(now[key]) }))
    .filter(({ before, after }) => before !== after);
}
