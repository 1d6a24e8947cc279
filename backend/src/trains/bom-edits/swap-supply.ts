import { formatMoney } from '@stageyard/libs/units';
import { type PartSupplyFigures } from '../../substitutes/supply-of-parts.service.js';
import { type SwapChangeDto } from './dto/swap-result.dto.js';

/** What a quantity costs and when it is there, before and after. Null: no part to ask for. */
export function supplyChanges(
  quantity: string,
  before: PartSupplyFigures | null,
  after: PartSupplyFigures | null,
): SwapChangeDto[] {
  const [old, now] = [before?.offer?.price?.lineTotal ?? null, after?.offer?.price?.lineTotal ?? null];
  const comparable = old !== null && now !== null && old.currency === now.currency;
  const changes: SwapChangeDto[] = [
    {
      what: `Price of ${quantity}`,
      before: old ? formatMoney(old) : 'no offer',
      after: now ? formatMoney(now) : 'no offer',
      verdict: comparable ? lowerIsBetter(old.minor, now.minor) : null,
    },
    {
      what: `Arrival of ${quantity}`,
      before: arrival(before),
      after: arrival(after),
      verdict: lowerIsBetter(before?.arrivalDays ?? null, after?.arrivalDays ?? null),
    },
  ];
  return changes.filter((change) => change.before !== change.after);
}

function arrival(supply: PartSupplyFigures | null): string {
  const days = supply?.arrivalDays ?? null;
  if (days === null) return 'not known';
  return days === 0 && supply?.offer?.arrivalDays !== 0
    ? 'on the shelf'
    : `${days} ${days === 1 ? 'day' : 'days'}`;
}

/** There are no exchange rates: only what can be compared gets a verdict. */
function lowerIsBetter(before: number | null, after: number | null): SwapChangeDto['verdict'] {
  if (before === null || after === null) return null;
  if (before === after) return 'same';
  return after < before ? 'better' : 'worse';
}
