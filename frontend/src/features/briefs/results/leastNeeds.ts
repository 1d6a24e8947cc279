import { leastTrain } from '@stageyard/libs/train-planner';
import { formatTrimmed } from '@stageyard/libs/units';
import type { Requirement } from '../../../api/types';
import { formatCount } from '../../../components/figures';
import { stageCountWords } from '../../../components/optionWords';

/**
 * What any train of this stage count needs at the very least, held against the brief: for a count that several limits
 * keep out at once. Both are lower bounds and never more than is true.
 * @returns one sentence for each limit that cannot be met; empty when nothing can be said so simply
 */
export function leastNeeds(stages: number, requirement: Requirement): string[] {
  const { ratio, teeth, modules, helixAngleDeg = 0, envelope } = requirement;
  const least = Number(ratio.target) * (1 - Number(ratio.tolerancePercent) / 100);
  const module = Math.min(...modules);
  if (!(least > 1) || !(module > 0)) return [];
  const bound = leastTrain(stages, least, teeth.pinion.min, module, helixAngleDeg);
  const { wheelTeeth: wheel, centreDistanceSum: centres } = bound;
  const needs: string[] = [];
  if (wheel > teeth.wheel.max) {
    needs.push(
      `With a pinion of ${teeth.pinion.min} teeth the largest wheel needs at least ${formatCount(wheel)}; the brief allows ${teeth.wheel.max}.`,
    );
  }
  if (envelope?.length !== undefined && centres > envelope.length) {
    needs.push(
      `${stageCountWords(stages)} of m ${formatTrimmed(module, 4)} ${stages === 1 ? 'puts' : 'put'} the input and output axes at least ${formatCount(Math.floor(centres))} mm apart; the box is ${formatTrimmed(envelope.length, 2)} mm long.`,
    );
  }
  return needs;
}
