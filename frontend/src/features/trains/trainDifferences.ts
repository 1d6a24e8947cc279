import type { Train } from '../../api/types';
import { formatCount, formatPlain } from '../../components/figures';

type Compared = Pick<Train, 'title' | 'note' | 'buildQuantity' | 'offerChoices' | 'spec'>;

/** What differs between a train as this page knew it and as it stands now, one thing a sentence part. */
export function trainDifferences(before: Compared, after: Compared): string[] {
  const said: string[] = [];
  if (before.title !== after.title) said.push(`title “${before.title}” → “${after.title}”`);
  if (before.note !== after.note) said.push('note');
  if (before.buildQuantity !== after.buildQuantity)
    said.push(`build quantity ${formatCount(before.buildQuantity)} → ${formatCount(after.buildQuantity)}`);
  said.push(...gearDifferences(before.spec, after.spec));
  before.spec.shafts.forEach(({ diameter }, index) => {
    const now = after.spec.shafts[index]?.diameter;
    if (now !== undefined && now !== diameter)
      said.push(`shaft ${index} ${formatPlain(diameter, 2)} → ${formatPlain(now, 2)} mm`);
  });
  said.push(...choiceDifferences(before.offerChoices, after.offerChoices));
  return said;
}

function gearDifferences(before: Compared['spec'], after: Compared['spec']): string[] {
  return before.stages.flatMap((stage, index) =>
    (['pinion', 'wheel'] as const).flatMap((role) => {
      const was = stage[role].partNumber;
      const now = after.stages[index]?.[role].partNumber;
      if (now === undefined || now === was) return [];
      return [`stage ${index + 1} ${role} ${was ?? 'to be made'} → ${now ?? 'to be made'}`];
    }),
  );
}

function choiceDifferences(before: Compared['offerChoices'], after: Compared['offerChoices']): string[] {
  const was = new Map(before.map(({ partNumber, offerId }) => [partNumber, offerId] as const));
  const now = new Map(after.map(({ partNumber, offerId }) => [partNumber, offerId] as const));
  const numbers = [...new Set([...was.keys(), ...now.keys()])];
  return numbers
    .filter((number) => was.get(number) !== now.get(number))
    .map((number) => `offer for ${number}`);
}
