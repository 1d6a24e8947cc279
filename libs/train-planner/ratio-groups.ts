import { type PairPool } from './pair-pool.js';

/** Rows of a pool gathered by equal ratio; group g holds rows start[g] … start[g + 1] − 1. */
export interface RatioGroups {
  readonly length: number;
  readonly start: Int32Array;
  readonly ratio: Float64Array;
  /** Least operating distance within the group, nm. */
  readonly leastDistance: Float64Array;
}

export function groupByRatio(pool: PairPool): RatioGroups {
  const starts: number[] = [];
  for (let row = 0; row < pool.length; row++) {
    const previous = row - 1;
    const same =
      row > 0 &&
      (pool.wheel[row] as number) * (pool.pinion[previous] as number) ===
        (pool.wheel[previous] as number) * (pool.pinion[row] as number);
    if (!same) starts.push(row);
  }
  const ends = [...starts.slice(1), pool.length];
  return {
    length: starts.length,
    start: Int32Array.from([...starts, pool.length]),
    ratio: Float64Array.from(starts, (row) => pool.ratio[row] as number),
    leastDistance: Float64Array.from(starts, (row, group) => {
      let least = Infinity;
      for (let index = row; index < (ends[group] as number); index++) {
        least = Math.min(least, pool.distance[index] as number);
      }
      return least;
    }),
  };
}
