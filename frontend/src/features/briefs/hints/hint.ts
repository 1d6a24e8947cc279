import { formatTrimmed } from '@stageyard/libs/units';
import type { Requirement } from '../../../api/types';
import type { BriefField } from '../form/briefForm';

/** A remark on one field: `crossed` means no option can come of it, `note` tells a consequence worth knowing. */
export interface Hint {
  field: BriefField;
  kind: 'crossed' | 'note';
  message: string;
}

/** A requirement with its defaults filled in, and the figures the hints share. */
export interface HintBasis {
  requirement: Requirement;
  target: number;
  /** Least and greatest ratio inside the tolerance. */
  least: number;
  greatest: number;
  smallestModule: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
}

const COUNT_WORDS = ['no', 'one', 'two', 'three', 'four'];

/** 1 → 'one stage', 3 → 'three stages'. */
export function stageCount(count: number): string {
  return `${COUNT_WORDS[count] ?? String(count)} ${count === 1 ? 'stage' : 'stages'}`;
}

/** A figure without trailing noughts, at most `decimals` of them. */
export function figure(value: number, decimals = 2): string {
  return formatTrimmed(value, decimals);
}

export function hintBasis(requirement: Requirement): HintBasis {
  const target = Number(requirement.ratio.target);
  const tolerance = Number(requirement.ratio.tolerancePercent) / 100;
  return {
    requirement,
    target,
    least: target * (1 - tolerance),
    greatest: target * (1 + tolerance),
    smallestModule: Math.min(...requirement.modules),
    pressureAngleDeg: requirement.pressureAngleDeg ?? 20,
    helixAngleDeg: requirement.helixAngleDeg ?? 0,
  };
}
