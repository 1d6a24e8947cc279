import type { SupplyByOption } from '../../../api/hooks/useSearchSupply';
import type { OptionSupply, TrainOption } from '../../../api/types';
import { boxVolume, leastContact } from '../../../components/optionWords';
import { costRank } from '../../../components/supplyWords';

/** What the option table can be ordered by, and the figure it then goes by. */
const FIGURES: Record<FigureSort, (option: TrainOption) => number> = {
  stages: (option) => option.stages.length,
  ratio: (option) => option.ratio.value,
  error: (option) => Math.abs(option.ratio.errorPercent),
  centres: (option) => option.centreDistanceSum,
  box: (option) => boxVolume(option.box),
  mass: (option) => option.mass,
  contact: (option) => leastContact(option),
  backlash: (option) => option.backlashArcmin,
};

type FigureSort = 'stages' | 'ratio' | 'error' | 'centres' | 'box' | 'mass' | 'contact' | 'backlash';
type SupplySort = 'cost' | 'stock';
export type OptionSort = FigureSort | SupplySort;

const isSupplySort = (by: OptionSort): by is SupplySort => by === 'cost' || by === 'stock';

export interface OptionOrder {
  by: OptionSort;
  down: boolean;
}

/** `-mass` → by mass, largest first; anything unknown → null, the order of the search. */
export function readOrder(text: string | null): OptionOrder | null {
  const by = (text ?? '').replace(/^-/, '');
  const known = Object.hasOwn(FIGURES, by) || isSupplySort(by as OptionSort);
  return known ? { by: by as OptionSort, down: text?.startsWith('-') ?? false } : null;
}

export const writeOrder = (order: OptionOrder | null): string | null =>
  order && `${order.down ? '-' : ''}${order.by}`;

/** First press: ascending (contact ratio and stock: the best, descending), second: the other way, third: as found. */
export function nextOrder(current: OptionOrder | null, by: OptionSort): OptionOrder | null {
  const firstDown = by === 'contact' || by === 'stock';
  if (current?.by !== by) return { by, down: firstDown };
  return current.down === firstDown ? { by, down: !firstDown } : null;
}

/**
 * The options of the chosen stage counts (all when none is chosen) in the chosen order; ties stay as found. Without
 * `supply` an order by cost or stock leaves them as found.
 */
export function orderedOptions(
  options: readonly TrainOption[],
  stages: readonly number[],
  order: OptionOrder | null,
  supply?: SupplyByOption,
): TrainOption[] {
  const kept = options.filter((option) => stages.length === 0 || stages.includes(option.stages.length));
  if (!order) return kept;
  const { by } = order;
  if (isSupplySort(by)) return supply?.size ? kept.sort(supplyOrder(by, order.down, supply)) : kept;
  const figure = FIGURES[by];
  return kept.sort((a, b) => (order.down ? figure(b) - figure(a) : figure(a) - figure(b)));
}

type Compare = (a: TrainOption, b: TrainOption) => number;

function supplyOrder(by: SupplySort, down: boolean, supply: SupplyByOption): Compare {
  const compare = by === 'cost' ? byCost(down) : byStock(down);
  return (a, b) => {
    const [one, other] = [supply.get(a.key), supply.get(b.key)];
    // What nothing is known of stands last, whichever way.
    if (!one || !other) return Number(!one) - Number(!other);
    return compare(one, other);
  };
}

/** Whole sums first, then parts of sums, whichever way: a part may look cheap. Currencies stand one after the other. */
const byCost = (down: boolean) => (a: OptionSupply, b: OptionSupply) => {
  const ranks = costRank(a) - costRank(b);
  const [one, other] = [a.costs[0], b.costs[0]];
  if (ranks !== 0 || !one || !other) return ranks;
  if (one.currency !== other.currency) return one.currency < other.currency ? -1 : 1;
  return down ? other.minor - one.minor : one.minor - other.minor;
};

/** By the share of gear lines on the shelf; among equals fewer to make is better. */
const byStock = (down: boolean) => (a: OptionSupply, b: OptionSupply) => {
  const share = (supply: OptionSupply) => (supply.gears === 0 ? 0 : supply.onShelf / supply.gears);
  const better = share(a) - share(b) || b.toMake - a.toMake;
  return down ? -better : better;
};

/** `2,3` → [2, 3]; anything else is dropped. */
export function readStages(text: string | null): number[] {
  return (text ?? '')
    .split(',')
    .map(Number)
    .filter((count) => Number.isInteger(count) && count >= 1 && count <= 4);
}
