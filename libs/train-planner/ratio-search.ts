import { type BestList } from './best-list.js';
import { groupByRatio, type RatioGroups } from './ratio-groups.js';
import { countTrains, distanceLimit, TrainIntake, type SearchSpace } from './search-space.js';
import { firstAbove, firstNotBelow } from './sorted-search.js';
import { type WorkWatch } from './work-watch.js';

/** Widens float windows so that a ratio on the limit is always looked at; the exact check follows. */
const WIDER = 1 + 1e-14;

/**
 * Best trains by ratio error. Works on groups of pairs with the same ratio: all but the last stage are run
 * through, and for the last the groups around the ratio still missing are visited outwards from the nearest.
 */
export function searchByRatioError(space: SearchSpace, best: BestList, watch: WorkWatch): void {
  if (space.pool.length > 0) new RatioSearch(space, best, watch).run();
}

class RatioSearch {
  readonly #space: SearchSpace;
  readonly #best: BestList;
  readonly #watch: WorkWatch;
  readonly #intake: TrainIntake;
  readonly #groups: RatioGroups;
  readonly #distanceLimit: number;
  readonly #leastOfAll: number;
  readonly #chosenGroups: number[] = [];
  readonly #chosen: number[] = [];

  constructor(space: SearchSpace, best: BestList, watch: WorkWatch) {
    this.#space = space;
    this.#best = best;
    this.#watch = watch;
    this.#intake = new TrainIntake(space, best);
    this.#groups = groupByRatio(space.pool, () => watch.step());
    this.#distanceLimit = distanceLimit(space);
    this.#leastOfAll = this.#groups.leastDistance.reduce((least, value) => Math.min(least, value), Infinity);
  }

  run(): void {
    const { stages, ordered, window } = this.#space;
    const { length, ratio, start } = this.#groups;
    if (stages === 1) {
      this.#visitNearest(length, 0, 1, 1, 0);
      return;
    }
    const { low } = this.#window();
    for (let group = length - 1; group >= 0; group--) {
      const value = ratio[group] as number;
      // No later stage has a larger ratio than the first.
      if (value ** stages * WIDER < Math.max(low, window.low)) break;
      this.#chooseGroup(0, group, 1, 1, 0);
      const before = countTrains(start[group] as number, stages, ordered);
      this.#watch.settled += countTrains(start[group + 1] as number, stages, ordered) - before;
    }
  }

  /** Train ratios that may still enter, by what has been found so far. */
  #window(): { low: number; high: number } {
    const { window } = this.#space;
    const error = this.#best.errorLimit;
    if (error === Infinity) return window;
    const low = Math.max(window.low, window.target * Math.max(0, 1 - error));
    return { low, high: Math.min(window.high, window.target * (1 + error)) };
  }

  #chooseGroup(level: number, group: number, n: number, d: number, distance: number): void {
    const { pool, stages } = this.#space;
    const { ratio, start, leastDistance } = this.#groups;
    this.#watch.step();
    const rest = stages - level - 1;
    const nextDistance = distance + (leastDistance[group] as number);
    if (nextDistance + rest * this.#leastOfAll > this.#distanceLimit) return;
    const row = start[group] as number;
    const nextN = n * (pool.wheel[row] as number);
    const nextD = d * (pool.pinion[row] as number);
    this.#chosenGroups[level] = group;
    if (rest === 1) {
      this.#visitNearest(group + 1, level + 1, nextN, nextD, nextDistance);
      return;
    }
    const { low, high } = this.#window();
    const from = firstNotBelow(ratio, Math.sqrt((low * nextD) / nextN) / WIDER, 0, group + 1);
    const highest = (((high * nextD) / nextN) * WIDER) / (ratio[0] as number);
    const to = firstAbove(ratio, highest, from, group + 1);
    for (let next = to - 1; next >= from; next--) {
      this.#chooseGroup(level + 1, next, nextN, nextD, nextDistance);
    }
  }

  /** Visits groups below `to` as the last stage, outwards from the ratio still missing. */
  #visitNearest(to: number, level: number, n: number, d: number, distance: number): void {
    const { ratio } = this.#groups;
    const { target } = this.#space.window;
    const factor = d / n;
    let above = firstNotBelow(ratio, target * factor, 0, to);
    let below = above - 1;
    for (;;) {
      const { low, high } = this.#window();
      const aboveFits = above < to && (ratio[above] as number) <= high * factor * WIDER;
      const belowFits = below >= 0 && (ratio[below] as number) >= (low * factor) / WIDER;
      if (!aboveFits && !belowFits) return;
      if (aboveFits) this.#settle(above++, level, n, d, distance);
      if (belowFits) this.#settle(below--, level, n, d, distance);
    }
  }

  /** All trains whose stages lie in the chosen groups and `group`. */
  #settle(group: number, level: number, n: number, d: number, distance: number): void {
    const { pool, window } = this.#space;
    this.#watch.step();
    const least = distance + (this.#groups.leastDistance[group] as number);
    if (least > this.#distanceLimit) return;
    const row = this.#groups.start[group] as number;
    const trainN = n * (pool.wheel[row] as number);
    const trainD = d * (pool.pinion[row] as number);
    if (!window.contains(trainN, trainD)) return;
    this.#chosenGroups[level] = group;
    if (this.#best.admits(0, trainN, trainD, least)) this.#expand(0, 0, trainN, trainD);
  }

  /** Chooses the pair of each group in turn, equal groups in falling order so that every multiset comes once. */
  #expand(level: number, distance: number, n: number, d: number): void {
    const { pool, stages } = this.#space;
    const { start, leastDistance } = this.#groups;
    if (level === stages) {
      this.#intake.take(this.#chosen, 0, distance, n, d);
      return;
    }
    const group = this.#chosenGroups[level] as number;
    const sameAsBefore = level > 0 && this.#chosenGroups[level - 1] === group;
    const last = sameAsBefore ? (this.#chosen[level - 1] as number) : (start[group + 1] as number) - 1;
    let rest = 0;
    for (let later = level + 1; later < stages; later++) {
      rest += leastDistance[this.#chosenGroups[later] as number] as number;
    }
    for (let row = last; row >= (start[group] as number); row--) {
      this.#watch.step();
      const sum = distance + (pool.distance[row] as number);
      if (sum + rest > this.#distanceLimit || !this.#best.admits(0, n, d, sum + rest)) continue;
      this.#chosen[level] = row;
      this.#expand(level + 1, sum, n, d);
    }
  }
}
