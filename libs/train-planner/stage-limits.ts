import { ratioToNumber, toRatio, type Ratio, type RatioInput } from '../units/index.js';
import { type CheckedRequest, type WholeRange } from './option-request.js';
import { type RatioWindow } from './ratio-window.js';
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

/**
 * Ratios that one stage of a train can have when the others take their extremes; a little wide, since it only
 * saves work. Empty (least above greatest) when the teeth as such cannot give the train ratio.
 */
export function usefulRatios(
  { pinion, wheel, ratioMin, ratioMax }: StageLimits,
  window: RatioWindow,
  stages: number,
): { least: number; greatest: number } {
  const lowest = Math.max(ratioMin.value, wheel.min / pinion.max);
  const highest = Math.min(ratioMax?.value ?? Infinity, wheel.max / pinion.min);
  return {
    least: (window.low / highest ** (stages - 1)) * (1 - 1e-9),
    greatest: (window.high / lowest ** (stages - 1)) * (1 + 1e-9),
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
