import { type BestList } from './best-list.js';
import { type Objective } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { type RatioWindow } from './ratio-window.js';
import { lengthOfPairsNm, toNm } from './train-box.js';

/** Everything a search over trains of one stage count needs; the pool already meets the limits of single stages. */
export interface SearchSpace {
  readonly pool: PairPool;
  readonly stages: number;
  readonly window: RatioWindow;
  readonly objective: Objective;
  /** Whether orders of the same stages are separate options. */
  readonly ordered: boolean;
  /** Greatest length over the gears, walls taken off, whole nm; Infinity without a limit. */
  readonly lengthLimit: number;
  /** Whether the flanks of a row's pair interfere; asked only of trains that would otherwise be taken. */
  interferes(row: number): boolean;
}

/** Greatest sum of distances, nm, that can still fit the length: the outer gears stick out at both ends. */
export function distanceLimit({ pool, lengthLimit }: SearchSpace): number {
  if (lengthLimit === Infinity) return Infinity;
  let pinionTip = Infinity;
  let wheelTip = Infinity;
  for (let index = 0; index < pool.length; index++) {
    pinionTip = Math.min(pinionTip, pool.pinionTip[index] as number);
    wheelTip = Math.min(wheelTip, pool.wheelTip[index] as number);
  }
  // Half a nm is lost in rounding the length, and half in rounding the tips.
  return lengthLimit - toNm(pinionTip + wheelTip) + 2;
}

/** Number of trains in the space: multisets of pairs, or sequences where the order counts. */
export function countTrains(pairs: number, stages: number, ordered: boolean): number {
  if (ordered) return pairs ** stages;
  let count = 1;
  for (let stage = 0; stage < stages; stage++) count = (count * (pairs + stage)) / (stage + 1);
  return Math.round(count);
}

/** Hands a multiset of pairs to the list: once in its standard order, or in every order that fits the length. */
export class TrainIntake {
  readonly #space: SearchSpace;
  readonly #best: BestList;

  constructor(space: SearchSpace, best: BestList) {
    this.#space = space;
    this.#best = best;
  }

  /**
   * @param pairs larger ratio first, equal ratios smaller pinion first; copied before it is kept
   * @param costSum, distanceSum as added up; rounded here, so that equal sums tie however they came about
   * @param n, d products of wheel and of pinion teeth; the caller has checked the ratio
   */
  take(pairs: readonly number[], costSum: number, distanceSum: number, n: number, d: number): void {
    const best = this.#best;
    const cost = Math.round(costSum);
    const distance = Math.round(distanceSum);
    if (!best.admits(cost, n, d, distance)) return;
    for (const row of pairs) if (this.#space.interferes(row)) return;
    if (!this.#space.ordered) {
      this.#offer(pairs, cost, distance, n, d);
      return;
    }
    for (const order of ORDERS[pairs.length] ?? []) {
      if (repeatsEqualNeighbour(order, pairs)) continue;
      this.#offer(
        order.map((place) => pairs[place] as number),
        cost,
        distance,
        n,
        d,
      );
    }
  }

  #offer(pairs: readonly number[], cost: number, distance: number, n: number, d: number): void {
    const { lengthLimit, pool } = this.#space;
    if (lengthLimit !== Infinity && lengthOfPairsNm(pool, pairs) > lengthLimit) return;
    this.#best.offer({ pairs: [...pairs], cost, distance, n, d });
  }
}

const ORDERS: Record<number, readonly (readonly number[])[]> = {
  1: [[0]],
  2: [
    [0, 1],
    [1, 0],
  ],
  3: [
    [0, 1, 2],
    [0, 2, 1],
    [1, 0, 2],
    [1, 2, 0],
    [2, 0, 1],
    [2, 1, 0],
  ],
};

/** Of orders that differ only by swapping equal pairs, one is kept: the one that leaves their places rising. */
function repeatsEqualNeighbour(order: readonly number[], pairs: readonly number[]): boolean {
  for (let late = 1; late < order.length; late++) {
    for (let early = 0; early < late; early++) {
      const [a, b] = [order[early] as number, order[late] as number];
      if (a > b && pairs[a] === pairs[b]) return true;
    }
  }
  return false;
}
