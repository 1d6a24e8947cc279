import { formatTrimmed } from '@stageyard/libs/units';
import type { Requirement } from '../../../api/types';
import { formatCount } from '../../../components/figures';
import { stageCountWords } from '../../../components/optionWords';

/**
 * What any train of this stage count needs at the very least, held against the brief: for a count that several limits
 * keep out at once. Both are lower bounds and never more than is true: the stage ratios multiply to the ratio, so that
 * one of them is at least its nth root, and a sum of numbers with a given product is least when they are equal.
 * @returns one sentence for each limit that cannot be met; empty when nothing can be said so simply
 */
export function leastNeeds(stages: number, requirement: Requirement): string[] {
  const { ratio, teeth, modules, helixAngleDeg = 0, envelope } = requirement;
  const least = Number(ratio.target) * (1 - Number(ratio.tolerancePercent) / 100);
  const module = Math.min(...modules);
  if (!(least > 1) || !(module > 0)) return [];
  const each = least ** (1 / stages);
  const needs: string[] = [];
  const wheel = Math.ceil(teeth.pinion.min * each - 1e-6);
  if (wheel > teeth.wheel.max) {
    needs.push(
      `With a pinion of ${teeth.pinion.min} teeth the largest wheel needs at least ${formatCount(wheel)}; the brief allows ${teeth.wheel.max}.`,
    );
  }
  const perModule = module / Math.cos((helixAngleDeg * Math.PI) / 180);
  const centres = (stages * perModule * teeth.pinion.min * (1 + each)) / 2;
  if (envelope?.length !== undefined && centres > envelope.length) {
    needs.push(
      `${stageCountWords(stages)} of m ${formatTrimmed(module, 4)} ${stages === 1 ? 'puts' : 'put'} the input and output axes at least ${formatCount(Math.floor(centres))} mm apart; the box is ${formatTrimmed(envelope.length, 2)} mm long.`,
    );
  }
  return needs;
}
