import { formatNumber } from '@stageyard/libs/units';
import type { TrainOption, WhyNot } from '../../api/types';
import { leastContact, stageCountWords, teethWords } from '../../components/optionWords';

/**
 * Fewer stages against more, in plain sentences: the best of each count among those shown (by centre-distance sum),
 * each held against the one with the fewest stages.
 */
export function fewerAgainstMore(options: readonly TrainOption[], whyNot: readonly WhyNot[] = []): string[] {
  const sentences: string[] = [];
  const byCount = bestPerCount(options);
  const [fewest, ...others] = byCount;
  if (!fewest) return sentences;
  const missingOne = whyNot.find(({ stages }) => stages === 1);
  if (fewest.stages.length > 1 && missingOne) sentences.push(missingOne.message);
  for (const other of others) sentences.push(held(other, fewest));
  if (others.length === 0 && options.length > 1) {
    sentences.push(
      `All shown have ${stageCountWords(fewest.stages.length).toLowerCase()}; pin an option with another count to weigh one against the other.`,
    );
  }
  return sentences;
}

function bestPerCount(options: readonly TrainOption[]): TrainOption[] {
  const best = new Map<number, TrainOption>();
  for (const option of options) {
    const known = best.get(option.stages.length);
    if (!known || option.centreDistanceSum < known.centreDistanceSum) best.set(option.stages.length, option);
  }
  return [...best.values()].sort((a, b) => a.stages.length - b.stages.length);
}

function held(more: TrainOption, fewer: TrainOption): string {
  const parts = [
    change(more.centreDistanceSum, fewer.centreDistanceSum, 'mm of centre distance', 1),
    change(more.mass, fewer.mass, 'kg of gears', 2),
    change(more.backlashArcmin, fewer.backlashArcmin, '′ of backlash', 1),
  ].filter((part) => part !== null);
  const extra = more.stages.length - fewer.stages.length;
  const cost = `${extra} more ${extra === 1 ? 'shaft' : 'shafts'}, ${2 * extra} more bearings and ${2 * extra} more gears`;
  const contact = leastContact(more) - leastContact(fewer);
  const contactPart =
    Math.abs(contact) < 0.0005
      ? ''
      : `; its least contact ratio is ${formatNumber(Math.abs(contact), 3)} ${contact > 0 ? 'higher' : 'lower'}`;
  const figures = parts.length === 0 ? 'changes no figure here' : `means ${joined(parts)}`;
  return `${stageCountWords(more.stages.length)} (${teethWords(more.stages)}) instead of ${stageCountWords(
    fewer.stages.length,
  ).toLowerCase()} (${teethWords(fewer.stages)}) ${figures}, for ${cost}${contactPart}.`;
}

function change(value: number, reference: number, what: string, decimals: number): string | null {
  const text = formatNumber(Math.abs(value - reference), decimals);
  if (Number(text) === 0) return null;
  const space = what.startsWith('′') ? '' : ' ';
  return `${text}${space}${what} ${value < reference ? 'less' : 'more'}`;
}

function joined(parts: readonly string[]): string {
  return parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;
}
