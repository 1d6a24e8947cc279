import { involute } from '../gear-geometry/index.js';
import { radToArcmin, ratio, ratioErrorPercent } from '../units/index.js';
import { type FoundTrain } from './best-list.js';
import { type CheckedRequest } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { type StageGear, type StagePairs } from './stage-pairs.js';
import { lengthOfPairsNm, toNm } from './train-box.js';
import { outputBacklash } from './output-backlash.js';
import { type Box, type OptionStage, type TrainOption } from './train-option.js';
import { trainWidthNm } from './train-search.js';

/** One stage with what the backlash at the output needs of it. */
interface StageEntry {
  stage: OptionStage;
  ratio: number;
  angularBacklashArcmin: number;
}

/** Turns trains of the search into options with all their figures. Each pair is worked out once. */
export class OptionFigures {
  readonly #request: CheckedRequest;
  readonly #stagePairs: StagePairs;
  readonly #pool: PairPool;
  readonly #stages = new Map<number, StageEntry>();

  constructor(request: CheckedRequest, stagePairs: StagePairs, pool: PairPool) {
    this.#request = request;
    this.#stagePairs = stagePairs;
    this.#pool = pool;
  }

  option(train: FoundTrain): TrainOption {
    const entries = train.pairs.map((row) => this.#stage(row));
    const exact = ratio(train.n, train.d);
    const mass = train.pairs.reduce((sum, row) => sum + (this.#pool.mass[row] as number), 0);
    return {
      key: entries.map(({ stage }) => `${stage.pinionTeeth}/${stage.wheelTeeth}m${stage.module}`).join('+'),
      stages: entries.map(({ stage }) => ({ ...stage })),
      ratio: {
        numerator: exact.numerator.toString(),
        denominator: exact.denominator.toString(),
        value: train.n / train.d,
        errorPercent: ratioErrorPercent(exact, this.#request.ratio.target),
      },
      centreDistanceSum: train.distance / 1e6,
      mass: Math.round(mass) / 1e6,
      box: this.#box(train.pairs),
      backlashArcmin: outputBacklash(entries),
      lossPercent: null,
      cost: null,
      newParts: null,
    };
  }

  #stage(row: number): StageEntry {
    const known = this.#stages.get(row);
    if (known) return known;
    const pool = this.#pool;
    const pinion = this.#stagePairs.gear(pool.pinion[row] as number) as StageGear;
    const wheel = this.#stagePairs.gear(pool.wheel[row] as number) as StageGear;
    const centreDistance = pool.centreDistance[row] as number;
    const { module, faceWidth } = this.#stagePairs;
    const stage: OptionStage = {
      pinionTeeth: pinion.teeth,
      wheelTeeth: wheel.teeth,
      module,
      faceWidth,
      pinionShift: pinion.shift,
      wheelShift: wheel.shift,
      pinionTipDiameter: 2 * pinion.tip,
      wheelTipDiameter: 2 * wheel.tip,
      centreDistance,
      contactRatio: pool.contactRatio[row] as number,
      contactRatioWorst: null,
    };
    const allowance = this.#request.centreDistanceAllowance * module;
    const entry = {
      stage,
      ratio: wheel.teeth / pinion.teeth,
      angularBacklashArcmin: angularBacklash(pinion, wheel, centreDistance, allowance),
    };
    this.#stages.set(row, entry);
    return entry;
  }

  #box(pairs: readonly number[]): Box {
    const pool = this.#pool;
    const walls = toNm(2 * (this.#request.envelope?.wall ?? 0));
    const tip = pairs.reduce(
      (most, row) => Math.max(most, pool.pinionTip[row] as number, pool.wheelTip[row] as number),
      0,
    );
    return {
      length: (lengthOfPairsNm(pool, pairs) + walls) / 1e6,
      width: (trainWidthNm(pairs.length, this.#stagePairs.faceWidth) + walls) / 1e6,
      height: (toNm(2 * tip) + walls) / 1e6,
    };
  }
}

/**
 * Angular backlash at the wheel, arcmin: j_wt = 2a (inv α_w,op − inv α_wt) over r_w2 = a z2/(z1 + z2). Without an
 * allowance on the distance there is none.
 */
function angularBacklash(pinion: StageGear, wheel: StageGear, a: number, allowance: number): number {
  if (allowance === 0) return 0;
  const bases = pinion.base + wheel.base;
  const spread = involute(Math.acos(bases / a)) - involute(Math.acos(bases / (a - allowance)));
  return radToArcmin((2 * spread * (pinion.teeth + wheel.teeth)) / wheel.teeth);
}
