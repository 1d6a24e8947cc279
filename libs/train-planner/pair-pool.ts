import { sortedOrder } from './sorted-order.js';

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
  /** Operating distance, mm, and the same in nm; sums are rounded to whole nm, so that equal sums tie. */
  readonly centreDistance: Float64Array;
  readonly distance: Float64Array;
  /** Both gears as solid discs, mg; sums are rounded as above. */
  readonly mass: Float64Array;
  /** Tip radii, mm. */
  readonly pinionTip: Float64Array;
  readonly wheelTip: Float64Array;
  readonly contactRatio: Float64Array;
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
export type PairRow = Record<FloatColumn, number> & { pinion: number; wheel: number };

/** Collects rows in any order and hands them over sorted. Columns, not objects: pools can hold 100,000s of rows. */
export class PairPoolBuilder {
  readonly #pinion: number[] = [];
  readonly #wheel: number[] = [];
  readonly #floats = Object.fromEntries(COLUMNS.map((name) => [name, [] as number[]])) as Record<
    FloatColumn,
    number[]
  >;

  add(row: PairRow): void {
    this.#pinion.push(row.pinion);
    this.#wheel.push(row.wheel);
    for (const name of COLUMNS) this.#floats[name].push(row[name]);
  }

  /** @param step called as the rows are sorted */
  build(step: () => void): PairPool {
    const pinion = this.#pinion;
    const wheel = this.#wheel;
    const byRatio = (a: number, b: number) => {
      const pinionA = pinion[a] as number;
      const pinionB = pinion[b] as number;
      return (wheel[a] as number) * pinionB - (wheel[b] as number) * pinionA || pinionB - pinionA;
    };
    const order = sortedOrder(pinion.length, byRatio, step);
    // Plain loops: `from` with a function is many times slower on large typed arrays.
    const sorted = <T extends Float64Array | Int32Array>(from: number[], to: T): T => {
      step();
      for (let place = 0; place < order.length; place++) to[place] = from[order[place] as number] as number;
      return to;
    };
    const columns = COLUMNS.map(
      (name) => [name, sorted(this.#floats[name], new Float64Array(order.length))] as const,
    );
    return {
      length: order.length,
      pinion: sorted(pinion, new Int32Array(order.length)),
      wheel: sorted(wheel, new Int32Array(order.length)),
      ...(Object.fromEntries(columns) as Record<FloatColumn, Float64Array>),
    };
  }
}
