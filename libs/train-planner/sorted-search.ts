/** First index in [from, to) whose value is not below `bound`; `to` when there is none. Values rise. */
export function firstNotBelow(values: Float64Array, bound: number, from: number, to: number): number {
  let low = from;
  let high = to;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((values[middle] as number) < bound) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** First index in [from, to) whose value is above `bound`; `to` when there is none. Values rise. */
export function firstAbove(values: Float64Array, bound: number, from: number, to: number): number {
  let low = from;
  let high = to;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((values[middle] as number) <= bound) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Answers "where is the least value between two positions" at once, from a table of powers of two. */
export class RangeLeast {
  readonly #values: Float64Array;
  readonly #levels: Int32Array[];

  /** @param step called once for each level of the table */
  constructor(values: Float64Array, step: () => void = () => undefined) {
    this.#values = values;
    const single = new Int32Array(values.length);
    for (let index = 0; index < single.length; index++) single[index] = index;
    this.#levels = [single];
    for (let width = 2; width <= values.length; width *= 2) {
      const below = this.#levels[this.#levels.length - 1] as Int32Array;
      const level = new Int32Array(values.length - width + 1);
      for (let start = 0; start < level.length; start++) {
        level[start] = this.#lower(below[start] as number, below[start + width / 2] as number);
      }
      this.#levels.push(level);
      step();
    }
  }

  /** Position of the least value in [from, to); from < to. */
  at(from: number, to: number): number {
    const power = 31 - Math.clz32(to - from);
    const level = this.#levels[power] as Int32Array;
    return this.#lower(level[from] as number, level[to - (1 << power)] as number);
  }

  #lower(a: number, b: number): number {
    return (this.#values[b] as number) < (this.#values[a] as number) ? b : a;
  }
}
