import type { Requirement } from '../../../api/types';
import { formFromRequirement, type BriefForm } from '../form/briefForm';
import { FIELD_NAMES } from '../form/fieldNames';

type SearchedField = keyof Omit<BriefForm, 'title' | 'note'>;

/** The duty sizes shafts only and the build quantity prices options only; neither changes a search. */
const NOT_SEARCHED = new Set<SearchedField>([
  'inputSpeed',
  'outputTorque',
  'applicationFactor',
  'buildQuantity',
]);

/** Names of the fields in which the brief differs from what was searched; a field left out equals its default. */
export function changedSince(searched: Requirement, now: Requirement): string[] {
  const before = formFromRequirement(searched);
  const after = formFromRequirement(now);
  return (Object.keys(before) as SearchedField[])
    .filter((field) => !NOT_SEARCHED.has(field) && !same(field, before[field], after[field]))
    .map((field) => FIELD_NAMES[field].label);
}

function same(
  field: SearchedField,
  before: BriefForm[SearchedField],
  after: BriefForm[SearchedField],
): boolean {
  const [a, b] = [String(before), String(after)];
  if (a === b) return true;
  // '1.0' and '1' ask the same; modules are a list and compare as text.
  return field !== 'modules' && a !== '' && b !== '' && Number(a) === Number(b);
}
