import { meshGeometry, type MeshGeometry } from '../gear-geometry/index.js';
import { ratio, ratioErrorPercent } from '../units/index.js';
import { type FoundTrain } from './best-list.js';
import { type CheckedRequest } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { type StageGear, type StagePairs } from './stage-pairs.js';
import { lengthOfPairsNm, toNm } from './train-box.js';
import { outputBacklash } from './output-backlash.js';
import { type Box, type OptionStage, type TrainOption } from './train-option.js';
import { trainWidthNm } from './train-search.js';

/** Turns trains of the search into options with all their figures. Meshes are computed once per pair. */
export class OptionFigures {
  readonly #request: CheckedRequest;
  readonly #stagePairs: StagePairs;
  readonly #pool: PairPool;
  readonly #stages = new Map<number, { stage: OptionStage; mesh: MeshGeometry }>();

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
      mass: mass / 1e6,
      box: this.#box(train.pairs),
      backlashArcmin: outputBacklash(entries.map(({ mesh }) => mesh)),
      lossPercent: null,
      cost: null,
      newParts: null,
    };
  }

  #stage(row: number): { stage: OptionStage; mesh: MeshGeometry } {
    const known = this.#stages.get(row);
    if (known) return known;
    const pool = this.#pool;
    const pinion = this.#stagePairs.gear(pool.pinion[row] as number) as StageGear;
    const wheel = this.#stagePairs.gear(pool.wheel[row] as number) as StageGear;
    const centreDistance = pool.centreDistance[row] as number;
    const { module, faceWidth } = this.#stagePairs;
    const { pressureAngleDeg, helixAngleDeg, leastContactRatio } = this.#request;
    const shape = { module, pressureAngleDeg, helixAngleDeg, faceWidth };
    const mesh = meshGeometry({
      pinion: { ...shape, teeth: pinion.teeth, profileShift: pinion.shift },
      wheel: { ...shape, teeth: wheel.teeth, profileShift: wheel.shift },
      centreDistance,
      leastContactRatio,
    });
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
    const entry = { stage, mesh };
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
