import { type BestList } from './best-list.js';
import { RatioBounds } from './ratio-bounds.js';
import { countTrains, distanceLimit, TrainIntake, type SearchSpace } from './search-space.js';
import { sortedOrder } from './sorted-order.js';
import { firstAbove, firstNotBelow, RangeLeast } from './sorted-search.js';
import { type WorkWatch } from './work-watch.js';

/** Widens float windows so that a ratio on the limit is always looked at; the exact check follows. */
const WIDER = 1 + 1e-14;

/**
 * Best trains by an additive cost, in whole nm or mg once it is summed. Depth first over falling ratios; a branch is left when its cost
 * plus the least cost of the ratio still missing exceeds the worst train kept, or when it can no longer fit the
 * length. Ties are always followed, so the outcome is exact.
 */
export function searchByCost(space: SearchSpace, best: BestList, watch: WorkWatch): void {
  if (space.pool.length === 0) return;
  if (space.stages === 1) settleOneStage(space, best, watch);
  else new CostSearch(space, best, watch).run();
}

/** A single stage needs no bounds: every pair inside the ratio window is looked at. */
function settleOneStage(space: SearchSpace, best: BestList, watch: WorkWatch): void {
  const { pool, window } = space;
  const intake = new TrainIntake(space, best);
  const cost = costColumn(space);
  const start = firstNotBelow(pool.ratio, window.low / WIDER, 0, pool.length);
  const end = firstAbove(pool.ratio, window.high * WIDER, start, pool.length);
  for (let row = start; row < end; row++) {
    watch.step();
    if ((cost[row] as number) > best.costLimit) continue;
    const n = pool.wheel[row] as number;
    const d = pool.pinion[row] as number;
    if (window.contains(n, d)) intake.take([row], cost[row] as number, pool.distance[row] as number, n, d);
  }
}

function costColumn({ pool, objective }: SearchSpace): Float64Array {
  return objective === 'mass' ? pool.mass : pool.distance;
}

class CostSearch {
  readonly #space: SearchSpace;
  readonly #best: BestList;
  readonly #watch: WorkWatch;
  readonly #intake: TrainIntake;
  readonly #cost: Float64Array;
  readonly #least: RangeLeast;
  readonly #costBounds: RatioBounds;
  readonly #distanceBounds: RatioBounds | null;
  readonly #distanceLimit: number;
  readonly #logs: Float64Array;
  readonly #logLow: number;
  /** Rows chosen so far, by level. */
  readonly #chosen: number[] = [];
  /** Ranges still to visit, one stack for each level, as pairs of ends. */
  readonly #pending: number[][];

  constructor(space: SearchSpace, best: BestList, watch: WorkWatch) {
    const { pool, window, stages } = space;
    this.#space = space;
    this.#best = best;
    this.#watch = watch;
    this.#intake = new TrainIntake(space, best);
    this.#cost = costColumn(space);
    this.#least = new RangeLeast(this.#cost, () => watch.look());
    this.#costBounds = new RatioBounds(pool.ratio, this.#cost, window.low, window.high);
    watch.look();
    this.#distanceLimit = distanceLimit(space);
    this.#distanceBounds =
      this.#distanceLimit === Infinity
        ? null
        : new RatioBounds(pool.ratio, pool.distance, window.low, window.high);
    watch.look();
    this.#logs = pool.ratio.map(Math.log);
    watch.look();
    this.#logLow = Math.log(window.low);
    this.#pending = Array.from({ length: stages }, () => []);
  }

  run(): void {
    const { stages, ordered } = this.#space;
    const { rows, bounds, order } = this.#firstStages();
    for (const place of order) {
      if ((bounds[place] as number) > this.#best.costLimit) break;
      const row = rows[place] as number;
      this.#choose(0, row, 0, 0, 1, 1);
      const before = countTrains(row, stages, ordered);
      this.#watch.settled += countTrains(row + 1, stages, ordered) - before;
    }
  }

  /** First stages that may lead to a train, with a lower bound of its cost; the most promising first. */
  #firstStages(): { rows: number[]; bounds: number[]; order: Uint32Array } {
    const { stages, window, pool } = this.#space;
    const rest = stages - 1 === 1 ? 1 : 2;
    const rows: number[] = [];
    const bounds: number[] = [];
    // No later stage has a larger ratio than the first.
    const smallest = window.low ** (1 / stages) / WIDER;
    for (let row = pool.length - 1; row >= 0 && (pool.ratio[row] as number) >= smallest; row--) {
      this.#watch.step();
      const missing = this.#logLow - (this.#logs[row] as number);
      const bound = (this.#cost[row] as number) + this.#costBounds.least(rest, missing);
      if (bound === Infinity) continue;
      rows.push(row);
      bounds.push(bound);
    }
    const byBound = (a: number, b: number) => (bounds[a] as number) - (bounds[b] as number);
    return { rows, bounds, order: sortedOrder(rows.length, byBound, () => this.#watch.step()) };
  }

  /** Takes `row` as stage `level` and goes on to the stages after it. */
  #choose(level: number, row: number, cost: number, distance: number, n: number, d: number): void {
    const { pool, stages, window } = this.#space;
    this.#watch.step();
    const nextCost = cost + (this.#cost[row] as number);
    const nextDistance = distance + (pool.distance[row] as number);
    const nextN = n * (pool.wheel[row] as number);
    const nextD = d * (pool.pinion[row] as number);
    const rest = stages - level - 1 === 1 ? 1 : 2;
    const missing = this.#logLow - Math.log(nextN / nextD);
    if (nextCost + this.#costBounds.least(rest, missing) > this.#best.costLimit) return;
    if (this.#distanceBounds) {
      if (nextDistance + this.#distanceBounds.least(rest, missing) > this.#distanceLimit) return;
    }
    this.#chosen[level] = row;
    if (rest === 1) {
      this.#visitLast(0, row + 1, nextCost, nextDistance, nextN, nextD);
      return;
    }
    const low = (window.low * nextD) / nextN;
    const high = (window.high * nextD) / nextN;
    // The next of two stages has the larger ratio of them, and leaves at least the smallest for the last.
    const from = firstNotBelow(pool.ratio, Math.sqrt(low) / WIDER, 0, row + 1);
    const to = firstAbove(pool.ratio, (high / (pool.ratio[0] as number)) * WIDER, from, row + 1);
    const stack = this.#pending[level + 1] as number[];
    stack.push(from, to);
    while (stack.length > 0) {
      const end = stack.pop() as number;
      const start = stack.pop() as number;
      if (start >= end) continue;
      const cheapest = this.#least.at(start, end);
      if (nextCost + (this.#cost[cheapest] as number) > this.#best.costLimit) continue;
      stack.push(cheapest + 1, end, start, cheapest);
      this.#choose(level + 1, cheapest, nextCost, nextDistance, nextN, nextD);
    }
  }

  /** Settles every row in [from, to) as the last stage, cheapest first. */
  #visitLast(from: number, to: number, cost: number, distance: number, n: number, d: number): void {
    const { pool, stages, window } = this.#space;
    const start = firstNotBelow(pool.ratio, (window.low * d) / n / WIDER, from, to);
    const end = firstAbove(pool.ratio, ((window.high * d) / n) * WIDER, start, to);
    const stack = this.#pending[stages - 1] as number[];
    stack.push(start, end);
    while (stack.length > 0) {
      const right = stack.pop() as number;
      const left = stack.pop() as number;
      if (left >= right) continue;
      this.#watch.step();
      const row = this.#least.at(left, right);
      const total = cost + (this.#cost[row] as number);
      if (total > this.#best.costLimit) continue;
      stack.push(row + 1, right, left, row);
      const sum = distance + (pool.distance[row] as number);
      if (sum > this.#distanceLimit) continue;
      const trainN = n * (pool.wheel[row] as number);
      const trainD = d * (pool.pinion[row] as number);
      if (!window.contains(trainN, trainD)) continue;
      this.#chosen[stages - 1] = row;
      this.#intake.take(this.#chosen, total, sum, trainN, trainD);
    }
  }
}
