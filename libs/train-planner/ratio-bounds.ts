/** Slack on logarithms, far above their rounding and far below a bin. */
const LOG_SLACK = 1e-11;

/**
 * Least cost that one or two more stages add, for the ratio still missing. Pairs are sorted into bins of the
 * logarithm of their ratio; every bin answers for all ratios in it, so the answer is never above the truth.
 */
export class RatioBounds {
  readonly #binWidth: number;
  readonly #firstBin: number;
  readonly #least: Float64Array;
  readonly #oneStart: number;
  readonly #one: Float64Array;
  #two: Float64Array | null = null;
  readonly #unlimited: boolean;
  readonly #leastOfAll: number;

  /**
   * @param ratios rising, at least one
   * @param costs one for each ratio, at least 0
   * @param low, high the window of the train ratio; `high` may be Infinity
   */
  constructor(ratios: Float64Array, costs: Float64Array, low: number, high: number) {
    const first = Math.log(ratios[0] as number);
    const last = Math.log(ratios[ratios.length - 1] as number);
    const bins = Math.max(32, Math.min(1500, ratios.length >> 1));
    this.#unlimited = !(low > 0 && high < Infinity);
    const windowLog = this.#unlimited ? 0 : Math.log(high / low);
    const width = Math.max((last - first) / bins, windowLog / 256, 1e-6);
    this.#binWidth = width;
    this.#firstBin = Math.floor(first / width);
    this.#least = new Float64Array(Math.floor(last / width) - this.#firstBin + 1).fill(Infinity);
    for (let index = 0; index < ratios.length; index++) {
      const bin = Math.floor(Math.log(ratios[index] as number) / width) - this.#firstBin;
      this.#least[bin] = Math.min(this.#least[bin] as number, costs[index] as number);
    }
    this.#leastOfAll = Math.min(...this.#least);
    // A window that starts anywhere in a bin reaches at most `reach` bins further.
    const reach = Math.floor((windowLog + 4 * LOG_SLACK) / width) + 1;
    this.#oneStart = this.#firstBin - reach;
    this.#one = slidingLeast(this.#least, reach);
  }

  /** @param logLow logarithm of the lower end of the ratio still missing */
  least(stages: 1 | 2, logLow: number): number {
    if (this.#unlimited) return stages * this.#leastOfAll;
    const bin = Math.floor((logLow - LOG_SLACK) / this.#binWidth);
    if (stages === 1) return this.#one[bin - this.#oneStart] ?? Infinity;
    this.#two ??= this.#leastOfTwo();
    return this.#two[bin - this.#firstBin - this.#oneStart] ?? Infinity;
  }

  /** A pair in bin i leaves, of a window that starts in bin b, one that starts in bin b − i − 1 or b − i. */
  #leastOfTwo(): Float64Array {
    const one = this.#one;
    const two = new Float64Array(one.length + this.#least.length).fill(Infinity);
    for (let i = 0; i < this.#least.length; i++) {
      const cost = this.#least[i] as number;
      if (cost === Infinity) continue;
      for (let j = 0; j < one.length; j++) {
        const sum = cost + (one[j] as number);
        if (sum < (two[i + j] as number)) two[i + j] = sum;
        if (sum < (two[i + j + 1] as number)) two[i + j + 1] = sum;
      }
    }
    return two;
  }
}

/** For each start from −reach to the last: the least of the values at start … start + reach. */
function slidingLeast(values: Float64Array, reach: number): Float64Array {
  const out = new Float64Array(values.length + reach).fill(Infinity);
  const queue: number[] = [];
  let head = 0;
  for (let end = 0; end < values.length + reach; end++) {
    if (end < values.length) {
      while (
        queue.length > head &&
        (values[queue[queue.length - 1] as number] as number) >= (values[end] as number)
      ) {
        queue.pop();
      }
      queue.push(end);
    }
    while (queue.length > head && (queue[head] as number) < end - reach) head++;
    out[end] = queue.length > head ? (values[queue[head] as number] as number) : Infinity;
  }
  return out;
}
