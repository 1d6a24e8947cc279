import type { TrainOption } from '../../../api/types';
import { boxVolume, leastContact } from '../../../components/optionWords';

/** What the option table can be ordered by, and the figure it then goes by. */
const FIGURES: Record<OptionSort, (option: TrainOption) => number> = {
  stages: (option) => option.stages.length,
  ratio: (option) => option.ratio.value,
  error: (option) => Math.abs(option.ratio.errorPercent),
  centres: (option) => option.centreDistanceSum,
  box: (option) => boxVolume(option.box),
  mass: (option) => option.mass,
  contact: (option) => leastContact(option),
  backlash: (option) => option.backlashArcmin,
};

export type OptionSort = 'stages' | 'ratio' | 'error' | 'centres' | 'box' | 'mass' | 'contact' | 'backlash';

export interface OptionOrder {
  by: OptionSort;
  down: boolean;
}

/** `-mass` → by mass, largest first; anything unknown → null, the order of the search. */
export function readOrder(text: string | null): OptionOrder | null {
  const by = (text ?? '').replace(/^-/, '');
  return Object.hasOwn(FIGURES, by) ? { by: by as OptionSort, down: text?.startsWith('-') ?? false } : null;
}

export const writeOrder = (order: OptionOrder | null): string | null =>
  order && `${order.down ? '-' : ''}${order.by}`;

/** First press: ascending (contact ratio: the best, descending), second: the other way, third: as found. */
export function nextOrder(current: OptionOrder | null, by: OptionSort): OptionOrder | null {
  const firstDown = by === 'contact';
  if (current?.by !== by) return { by, down: firstDown };
  return current.down === firstDown ? { by, down: !firstDown } : null;
}

/** The options of the chosen stage counts (all when none is chosen) in the chosen order; ties stay as found. */
export function orderedOptions(
  options: readonly TrainOption[],
  stages: readonly number[],
  order: OptionOrder | null,
): TrainOption[] {
  const kept = options.filter((option) => stages.length === 0 || stages.includes(option.stages.length));
  if (!order) return kept;
  const figure = FIGURES[order.by];
  return kept.sort((a, b) => (order.down ? figure(b) - figure(a) : figure(a) - figure(b)));
}

/** `2,3` → [2, 3]; anything else is dropped. */
export function readStages(text: string | null): number[] {
  return (text ?? '')
    .split(',')
    .map(Number)
    .filter((count) => Number.isInteger(count) && count >= 1 && count <= 4);
}
