import { type FoundTrain } from './best-list.js';
import { type CheckedRequest, type OptionRequest } from './option-request.js';
import { RatioWindow } from './ratio-window.js';
import { hundredthsUp, type Relaxation } from './relaxations.js';
import { type StagePairs } from './stage-pairs.js';
import { type WhyNot } from './train-option.js';
import { outputDirection, TrainSearch, trainWidthNm } from './train-search.js';
import { REQUEST_BOUNDS } from './validate-request.js';
import { type WorkWatch } from './work-watch.js';

/** Loosens the limits of one request for one stage count. */
export class Explanation {
  readonly #stages: number;
  readonly #request: CheckedRequest;
  readonly #stagePairs: StagePairs;
  readonly #watch: WorkWatch;

  constructor(stages: number, request: CheckedRequest, stagePairs: StagePairs, watch: WorkWatch) {
    this.#stages = stages;
    this.#request = request;
    this.#stagePairs = stagePairs;
    this.#watch = watch;
  }

  /** Whether the request as it stands has a train of this stage count. */
  works(): boolean {
    return this.#searchWith({}).anyTrain(this.#stages, this.#watch) !== null;
  }

  /** Outer width in mm that the planes and walls of this stage count need, rounded up to 0.01 mm. */
  neededWidth(): number {
    return hundredthsUp(trainWidthNm(this.#stages, this.#stagePairs.faceWidth), this.#request) / 100;
  }

  /** Least tolerance in per cent, rounded up to three decimals or, where that is coarse, three digits. */
  tolerance(): WhyNot | null {
    const request = this.#request;
    const train = new TrainSearch(request, this.#stagePairs).nearestRatio(this.#stages, this.#watch);
    if (!train) return null;
    const { target, tolerancePercent } = request.ratio;
    const percent = new RatioWindow(target, null).error(train.n, train.d) * 100;
    const decimals = Math.min(12, Math.max(3, 2 - Math.floor(Math.log10(percent))));
    // Start a hair low, where float noise cannot have jumped a step, and let the exact check decide.
    let units = Math.ceil(percent * 10 ** decimals - 1e-6);
    const inside = () => new RatioWindow(target, decimal(units, decimals)).contains(train.n, train.d);
    while (!inside()) units++;
    const nearest = Number(decimal(units, decimals));
    if (nearest > REQUEST_BOUNDS.tolerancePercent[1]) return null;
    const rest = `within ${nearest} % of ${target} : 1 at best; the brief allows ${tolerancePercent} %.`;
    const ratio = { target, tolerancePercent: nearest };
    return this.#reason('ratio.tolerancePercent', 'come', rest, nearest, { ratio });
  }

  /** The least loosening of a limit with a figure, found by halving: looser never loses a train. */
  limit(relaxation: Relaxation): WhyNot | null {
    const { towards, perUnit, loosest } = relaxation;
    const current = relaxation.current(this.#request);
    if (current === null || (loosest - current) * towards <= 0) return null;
    const needed = (step: number): number | null => {
      const change = relaxation.change(this.#request, step / perUnit);
      const search = this.#searchWith(change);
      const train = search.anyTrain(this.#stages, this.#watch);
      return train && relaxation.neededBy(train, search.pool, this.#request);
    };
    let works = this.#firstThatWorks(current, relaxation, needed);
    if (works === null) return null;
    let fails = current;
    while (Math.abs(works - fails) > 1) {
      const middle: number = fails + Math.trunc((works - fails) / 2);
      const found = needed(middle);
      if (found === null) fails = middle;
      else works = found;
    }
    const figure = works / perUnit;
    const { verb, rest } = relaxation.words(figure, this.#request);
    return this.#reason(relaxation.limit, verb, rest, figure, relaxation.change(this.#request, figure));
  }

  /** Loosens in growing strides: a far limit makes a large space, and most answers lie near. */
  #firstThatWorks(
    current: number,
    { towards, loosest }: Relaxation,
    needed: (step: number) => number | null,
  ): number | null {
    for (let stride = Math.max(1, Math.abs(current) >> 1); ; stride *= 4) {
      const reach = current + towards * stride;
      const last = (loosest - reach) * towards <= 0;
      const found = needed(last ? loosest : reach);
      if (found !== null || last) return found;
    }
  }

  width(): WhyNot | null {
    const { envelope } = this.#request;
    if (envelope?.width === undefined) return null;
    const needed = this.neededWidth();
    if (needed <= envelope.width) return null;
    const rest = `a width of at least ${needed.toFixed(2)} mm; the box allows ${envelope.width} mm.`;
    return this.#ifItHelps('envelope.width', 'need', rest, needed, {
      envelope: { ...envelope, width: needed },
    });
  }

  undercut(): WhyNot | null {
    if (this.#request.undercut === 'allow') return null;
    const rest = 'undercut teeth; the brief refuses undercut.';
    return this.#ifItHelps('undercut', 'need', rest, 'allow', { undercut: 'allow' });
  }

  direction(): WhyNot | null {
    const { direction } = this.#request;
    const turns = outputDirection(this.#stages);
    if (direction === 'any' || direction === turns) return null;
    const rest =
      turns === 'same'
        ? 'the output the same way as the input; the brief asks for the opposite.'
        : 'the output against the input; the brief asks for the same direction.';
    return this.#ifItHelps('direction', 'turn', rest, turns, { direction: turns });
  }

  #ifItHelps(
    limit: string,
    verb: string,
    rest: string,
    nearest: number | string,
    change: Partial<OptionRequest>,
  ): WhyNot | null {
    const train: FoundTrain | null = this.#searchWith(change).anyTrain(this.#stages, this.#watch);
    return train && this.#reason(limit, verb, rest, nearest, change);
  }

  #searchWith(change: Partial<OptionRequest>): TrainSearch {
    // A change sets fields to figures of the same kind, so the request stays a checked one.
    const request = { ...this.#request, ...change } as CheckedRequest;
    return new TrainSearch(request, this.#stagePairs, this.#stages);
  }

  #reason(
    limit: string,
    verb: string,
    rest: string,
    nearest: number | string,
    change: Partial<OptionRequest>,
  ): WhyNot {
    const stages = this.#stages;
    const message = `${countOf(stages)} ${verb}${stages === 1 ? (verb === 'reach' ? 'es' : 's') : ''} ${rest}`;
    return { stages, limit, message, nearest, relaxed: { ...change, stages: { min: stages, max: stages } } };
  }
}

/** "One stage", "Two stages" … at the beginning of a sentence. */
export function countOf(stages: number): string {
  return ['One stage', 'Two stages', 'Three stages'][stages - 1] ?? `${stages} stages`;
}

function decimal(units: number, decimals: number): string {
  return (units / 10 ** decimals).toFixed(decimals);
}
