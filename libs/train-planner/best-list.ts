import { type Objective } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { type RatioWindow } from './ratio-window.js';

/** One train as the search holds it: indices into the pair pool in the order of its stages. */
export interface FoundTrain {
  pairs: number[];
  /** Objective as a whole number (nm or mg); 0 for `ratio-error`. */
  cost: number;
  /** Sum of operating distances, nm. */
  distance: number;
  /** Product of wheel teeth and of pinion teeth; not reduced. */
  n: number;
  d: number;
}

/** The most that rounding takes off a sum, and a little for the float noise of adding up. */
const ROUNDING = 0.51;

/** Thrown by a list that wants a single train, whichever comes first; never leaves the planner. */
export class FirstFound extends Error {}

/**
 * The best K trains. Order: objective, ratio error, sum of distances, fewer stages, then the teeth in the order
 * pinion, wheel, stage by stage. Module and width follow in the full order but are equal for every train here.
 */
export class BestList {
  readonly trains: FoundTrain[] = [];
  readonly #size: number;
  readonly #pool: PairPool;
  readonly #window: RatioWindow;
  readonly #byError: boolean;
  /** True: any one train will do, and the search ends with it by `FirstFound`. */
  stopAtFirst = false;
  /** Cost (a sum not yet rounded) above which a train can no longer enter. */
  costLimit = Infinity;
  /** Float ratio error above which a train can no longer enter when the error is the objective. */
  errorLimit = Infinity;

  constructor(objective: Objective, size: number, pool: PairPool, window: RatioWindow) {
    this.#size = size;
    this.#pool = pool;
    this.#window = window;
    this.#byError = objective === 'ratio-error';
  }

  /**
   * Whether a train with these figures would enter, whatever its teeth (a tie counts as yes).
   * @param cost whole
   * @param distance may be a sum not yet rounded
   */
  admits(cost: number, n: number, d: number, distance: number): boolean {
    const last = this.trains[this.#size - 1];
    if (!last) return true;
    if (cost !== last.cost) return cost < last.cost;
    const byError = this.#window.compareErrors(n, d, last.n, last.d);
    return byError !== 0 ? byError < 0 : distance <= last.distance + ROUNDING;
  }

  /** Takes the train in if it is among the best. The caller has checked every limit. */
  offer(train: FoundTrain): void {
    const { trains } = this;
    const size = this.#size;
    const last = trains[size - 1];
    if (last && this.compare(train, last) >= 0) return;
    let low = 0;
    let high = trains.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (this.compare(trains[middle] as FoundTrain, train) <= 0) low = middle + 1;
      else high = middle;
    }
    trains.splice(low, 0, train);
    if (this.stopAtFirst) throw new FirstFound();
    if (trains.length > size) trains.pop();
    const worst = trains[size - 1];
    if (!worst) return;
    this.costLimit = worst.cost * (1 + 1e-14) + ROUNDING;
    // A hair wider than the float error, so that exact ties and near ties are still looked at.
    if (this.#byError) this.errorLimit = this.#window.error(worst.n, worst.d) * (1 + 1e-12) + 1e-14;
  }

  compare(a: FoundTrain, b: FoundTrain): number {
    if (a.cost !== b.cost) return a.cost - b.cost;
    const byError = this.#window.compareErrors(a.n, a.d, b.n, b.d);
    if (byError !== 0) return byError;
    if (a.distance !== b.distance) return a.distance - b.distance;
    if (a.pairs.length !== b.pairs.length) return a.pairs.length - b.pairs.length;
    const { pinion, wheel } = this.#pool;
    for (let stage = 0; stage < a.pairs.length; stage++) {
      const first = a.pairs[stage] as number;
      const second = b.pairs[stage] as number;
      const apart =
        (pinion[first] as number) - (pinion[second] as number) ||
        (wheel[first] as number) - (wheel[second] as number);
      if (apart !== 0) return apart;
    }
    return 0;
  }
}
