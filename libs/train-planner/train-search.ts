import { BestList, FirstFound, type FoundTrain } from './best-list.js';
import { type CheckedRequest, type Objective } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { RatioWindow } from './ratio-window.js';
import { countTrains, type SearchSpace } from './search-space.js';
import { solve } from './solve.js';
import { roomNm, stageLimits, usefulRatios } from './stage-limits.js';
import { type StagePairs } from './stage-pairs.js';
import { DEFAULT_GAP, toNm, widthOfPlanes } from './train-box.js';
import { type WorkWatch } from './work-watch.js';

/** Ready to search one request, or a variant of it with a limit loosened, stage count by stage count. */
export class TrainSearch {
  readonly request: CheckedRequest;
  readonly pool: PairPool;
  readonly window: RatioWindow;
  readonly #stagePairs: StagePairs;

  /** @param onlyStages leaves out pairs that no train of this many stages could use, which saves time */
  constructor(request: CheckedRequest, stagePairs: StagePairs, onlyStages?: number) {
    this.request = request;
    this.#stagePairs = stagePairs;
    this.window = new RatioWindow(request.ratio.target, request.ratio.tolerancePercent);
    const limits = stageLimits(request);
    const band = onlyStages === undefined ? undefined : usefulRatios(limits, this.window, onlyStages);
    this.pool = stagePairs.within(limits, band);
  }

  /** An empty list for this request's order. */
  emptyList(size = this.request.limit): BestList {
    return new BestList(this.request.objective, size, this.pool, this.window);
  }

  /** Adds the best trains of one stage count to the list. */
  run(stages: number, best: BestList, watch: WorkWatch, phase = 'search'): void {
    const space = this.#space(stages, this.request.objective, this.window);
    if (!space) return;
    const before = watch.settled;
    const total = countTrains(this.pool.length, stages, space.ordered);
    watch.beginPhase(phase, stages, total);
    solve(space, best, watch);
    watch.settled = before + total;
  }

  /** Any train of this stage count, or null when there is none. */
  anyTrain(stages: number, watch: WorkWatch): FoundTrain | null {
    const space = this.#space(stages, 'centre-distance', this.window);
    if (!space) return null;
    const best = new BestList('centre-distance', 1, this.pool, this.window);
    best.stopAtFirst = true;
    try {
      solve(space, best, watch);
    } catch (error) {
      if (!(error instanceof FirstFound)) throw error;
    }
    return best.trains[0] ?? null;
  }

  /** The train nearest to the target with the ratio tolerance left aside, or null when there is none at all. */
  nearestRatio(stages: number, watch: WorkWatch): FoundTrain | null {
    const window = new RatioWindow(this.request.ratio.target, null);
    const space = this.#space(stages, 'ratio-error', window);
    if (!space) return null;
    const best = new BestList('ratio-error', 1, this.pool, window);
    solve(space, best, watch);
    return best.trains[0] ?? null;
  }

  /** Null where the stage count as such is ruled out, by the direction or by the width. */
  #space(stages: number, objective: Objective, window: RatioWindow): SearchSpace | null {
    const { direction, envelope } = this.request;
    if (direction !== 'any' && direction !== outputDirection(stages)) return null;
    if (trainWidthNm(stages, this.#stagePairs.faceWidth) > roomNm(envelope?.width, envelope?.wall)) {
      return null;
    }
    const ordered = objective === 'mass' || envelope !== undefined;
    const lengthLimit = roomNm(envelope?.length, envelope?.wall);
    const { pool } = this;
    const interferes = (row: number) =>
      this.#stagePairs.interferes(pool.pinion[row] as number, pool.wheel[row] as number);
    return { pool, stages, window, objective, ordered, lengthLimit, interferes };
  }
}

/** Every external mesh reverses the rotation. */
export function outputDirection(stages: number): 'same' | 'opposite' {
  return stages % 2 === 0 ? 'same' : 'opposite';
}

/** Width over the planes of a train, without walls, whole nm. */
export function trainWidthNm(stages: number, faceWidth: number): number {
  return toNm(widthOfPlanes(new Array<number>(stages).fill(faceWidth), DEFAULT_GAP));
}
