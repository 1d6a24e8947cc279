import { type PairPool } from './pair-pool.js';

/** Whole nanometres of a length in mm: lengths are compared as integers. */
export function toNm(mm: number): number {
  return Math.round(mm * 1e6);
}

/** One stage as the box sees it, mm. */
export interface BoxStage {
  centreDistance: number;
  pinionTip: number;
  wheelTip: number;
}

/** Length along the line of axes over every gear's tip circle, mm, without walls. */
export function lengthInLine(stages: readonly BoxStage[]): number {
  let axis = 0;
  let left = Infinity;
  let right = -Infinity;
  for (const { centreDistance, pinionTip, wheelTip } of stages) {
    left = Math.min(left, axis - pinionTip);
    right = Math.max(right, axis + pinionTip);
    axis += centreDistance;
    left = Math.min(left, axis - wheelTip);
    right = Math.max(right, axis + wheelTip);
  }
  return right - left;
}

/** The same for rows of a pool, in whole nm; nothing is allocated. */
export function lengthOfPairsNm(pool: PairPool, pairs: readonly number[]): number {
  let axis = 0;
  let left = Infinity;
  let right = -Infinity;
  for (let stage = 0; stage < pairs.length; stage++) {
    const pair = pairs[stage] as number;
    const pinionTip = pool.pinionTip[pair] as number;
    left = Math.min(left, axis - pinionTip);
    right = Math.max(right, axis + pinionTip);
    axis += pool.centreDistance[pair] as number;
    const wheelTip = pool.wheelTip[pair] as number;
    left = Math.min(left, axis - wheelTip);
    right = Math.max(right, axis + wheelTip);
  }
  return toNm(right - left);
}

/** Width along the shafts, mm, without walls: planes stacked with a gap between them. */
export function widthOfPlanes(faceWidths: readonly number[], gap: number): number {
  return faceWidths.reduce((sum, width) => sum + width, 0) + (faceWidths.length - 1) * gap;
}

/** Gap between the planes of neighbouring stages, mm. */
export const DEFAULT_GAP = 5;
