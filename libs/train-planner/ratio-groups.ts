import { type PairPool } from './pair-pool.js';

/** Rows of a pool gathered by equal ratio; group g holds rows start[g] … start[g + 1] − 1. */
export interface RatioGroups {
  readonly length: number;
  readonly start: Int32Array;
  readonly ratio: Float64Array;
  /** Least operating distance within the group, nm. */
  readonly leastDistance: Float64Array;
}

/** @param step called once a row */
export function groupByRatio(pool: PairPool, step: () => void): RatioGroups {
  const { pinion, wheel, distance } = pool;
  const start = new Int32Array(pool.length + 1);
  const ratio = new Float64Array(pool.length);
  const leastDistance = new Float64Array(pool.length).fill(Infinity);
  let length = 0;
  for (let row = 0; row < pool.length; row++) {
    step();
    const before = row - 1;
    const same =
      row > 0 &&
      (wheel[row] as number) * (pinion[before] as number) ===
        (wheel[before] as number) * (pinion[row] as number);
    if (!same) {
      start[length] = row;
      ratio[length] = pool.ratio[row] as number;
      length++;
    }
    const group = length - 1;
    leastDistance[group] = Math.min(leastDistance[group] as number, distance[row] as number);
  }
  start[length] = pool.length;
  return {
    length,
    start,
    ratio: ratio.subarray(0, length),
    leastDistance: leastDistance.subarray(0, length),
  };
}
