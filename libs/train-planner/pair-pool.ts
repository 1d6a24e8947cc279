/**
 * Pinion-and-wheel pairs that may serve as a stage, as columns. Rows are sorted by rising ratio and, within one
 * ratio, by falling pinion teeth: read backwards this is "larger ratio first, equal ratios smaller pinion first".
 */
export interface PairPool {
  readonly length: number;
  readonly pinion: Int32Array;
  readonly wheel: Int32Array;
  /** wheel / pinion. */
  readonly ratio: Float64Array;
  /** Operating distance, mm, and the same rounded to whole nm. */
  readonly centreDistance: Float64Array;
  readonly distance: Float64Array;
  /** Both gears as solid discs, rounded to whole mg. */
  readonly mass: Float64Array;
  /** Tip radii, mm. */
  readonly pinionTip: Float64Array;
  readonly wheelTip: Float64Array;
  readonly contactRatio: Float64Array;
  /** 1 when either gear is undercut. */
  readonly undercut: Uint8Array;
}

const COLUMNS = [
  'ratio',
  'centreDistance',
  'distance',
  'mass',
  'pinionTip',
  'wheelTip',
  'contactRatio',
] as const;

type FloatColumn = (typeof COLUMNS)[number];
export type PairRow = Record<FloatColumn, number> & { pinion: number; wheel: number; undercut: number };

/** Collects rows in any order and hands them over sorted. */
export class PairPoolBuilder {
  readonly #rows: PairRow[] = [];

  add(row: PairRow): void {
    this.#rows.push(row);
  }

  build(): PairPool {
    const rows = this.#rows.sort((a, b) => a.wheel * b.pinion - b.wheel * a.pinion || b.pinion - a.pinion);
    const float = (column: FloatColumn) => Float64Array.from(rows, (row) => row[column]);
    const columns = Object.fromEntries(COLUMNS.map((column) => [column, float(column)]));
    return {
      length: rows.length,
      pinion: Int32Array.from(rows, (row) => row.pinion),
      wheel: Int32Array.from(rows, (row) => row.wheel),
      undercut: Uint8Array.from(rows, (row) => row.undercut),
      ...(columns as Record<FloatColumn, Float64Array>),
    };
  }
}

/** The rows that `keep` accepts, in the same order. */
export function selectPairs(pool: PairPool, keep: (index: number) => boolean): PairPool {
  const kept: number[] = [];
  for (let index = 0; index < pool.length; index++) if (keep(index)) kept.push(index);
  const float = (from: Float64Array) => Float64Array.from(kept, (index) => from[index] as number);
  const columns = Object.fromEntries(COLUMNS.map((column) => [column, float(pool[column])]));
  return {
    length: kept.length,
    pinion: Int32Array.from(kept, (index) => pool.pinion[index] as number),
    wheel: Int32Array.from(kept, (index) => pool.wheel[index] as number),
    undercut: Uint8Array.from(kept, (index) => pool.undercut[index] as number),
    ...(columns as Record<FloatColumn, Float64Array>),
  };
}
