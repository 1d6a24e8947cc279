import { ratioToNumber, toRatio, type Ratio, type RatioInput } from '../units/index.js';
import { type CheckedRequest, type WholeRange } from './option-request.js';
import { toNm } from './train-box.js';

/** A limit with its nearest float beside it. */
export interface ExactLimit {
  exact: Ratio;
  value: number;
}

/** What a request asks of every single stage. */
export interface StageLimits {
  pinion: WholeRange;
  wheel: WholeRange;
  ratioMin: ExactLimit;
  ratioMax: ExactLimit | null;
  leastContactRatio: number;
  refuseUndercut: boolean;
  /** Greatest tip diameter that the height leaves, whole nm. */
  greatestTipDiameter: number;
}

export function stageLimits(request: CheckedRequest): StageLimits {
  const { teeth, stageRatio, envelope } = request;
  return {
    pinion: teeth.pinion,
    wheel: teeth.wheel,
    ratioMin: exactLimit(stageRatio.min),
    ratioMax: stageRatio.max === undefined ? null : exactLimit(stageRatio.max),
    leastContactRatio: request.leastContactRatio,
    refuseUndercut: request.undercut === 'refuse',
    greatestTipDiameter: roomNm(envelope?.height, envelope?.wall),
  };
}

/** Room between two walls, whole nm; Infinity without a limit. */
export function roomNm(outer: number | undefined, wall = 0): number {
  return outer === undefined ? Infinity : toNm(outer) - toNm(2 * wall);
}

function exactLimit(input: RatioInput): ExactLimit {
  const exact = toRatio(input);
  return { exact, value: ratioToNumber(exact) };
}
