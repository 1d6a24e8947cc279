import { formatContactRatio, formatNumber, formatTrimmed } from '@stageyard/libs/units';
import type { TrainOption } from '../api/types';

/** How an option is written wherever it stands: in the table, in a pin, beside another. */
type StageTeeth = Pick<TrainOption['stages'][number], 'pinionTeeth' | 'wheelTeeth' | 'module'>;

const COUNT_WORDS = ['No', 'One', 'Two', 'Three', 'Four'];

/** `18/110 · 19/116`: pinion over wheel, stage by stage from the input. */
export function teethWords(stages: readonly Pick<StageTeeth, 'pinionTeeth' | 'wheelTeeth'>[]): string {
  return stages.map(({ pinionTeeth, wheelTeeth }) => `${pinionTeeth}/${wheelTeeth}`).join(' · ');
}

/** `m 1` when every stage has the same module, else `m 0.8 · 1`. */
export function moduleWords(stages: readonly Pick<StageTeeth, 'module'>[]): string {
  const modules = stages.map(({ module }) => formatTrimmed(module, 4));
  const all = new Set(modules).size === 1 ? modules.slice(0, 1) : modules;
  return `m ${all.join(' · ')}`;
}

/** `One stage`, `Two stages`. */
export function stageCountWords(count: number): string {
  return `${COUNT_WORDS[count] ?? String(count)} ${count === 1 ? 'stage' : 'stages'}`;
}

/** `37.500`; the exact fraction is `exactRatioWords`. */
export const ratioWords = (value: number): string => formatNumber(value, 3);

/** `75/2 : 1`, or `36 : 1` for a whole ratio. */
export function exactRatioWords({
  numerator,
  denominator,
}: {
  numerator: string;
  denominator: string;
}): string {
  return denominator === '1' ? `${numerator} : 1` : `${numerator}/${denominator} : 1`;
}

/** Signed, three decimals, no unit: it stands in the column's head. */
export function errorWords(percent: number | null): string {
  const text = formatNumber(percent, 3);
  return percent !== null && percent > 0 && Number(text) > 0 ? `+${text}` : text;
}

/** `152 × 40 × 116`: length, width, height in whole mm, rounded up so that the box never reads too small. */
export function boxWords({ length, width, height }: TrainOption['box']): string {
  return [length, width, height].map((side) => String(Math.ceil(side - 1e-6))).join(' × ');
}

/** The smallest contact ratio of the train, at the worst distance where one is given. */
export function leastContact(option: TrainOption): number {
  return Math.min(...option.stages.map((stage) => stage.contactRatioWorst ?? stage.contactRatio));
}

export const leastContactWords = (option: TrainOption): string => formatContactRatio(leastContact(option));

export function boxVolume({ length, width, height }: TrainOption['box']): number {
  return length * width * height;
}

export const longestSide = ({ length, width, height }: TrainOption['box']): number =>
  Math.max(length, width, height);
