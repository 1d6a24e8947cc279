import { type FoundTrain } from './best-list.js';
import { type CheckedRequest, type OptionRequest } from './option-request.js';
import { type PairPool } from './pair-pool.js';
import { lengthOfPairsNm, toNm } from './train-box.js';
import { REQUEST_BOUNDS } from './validate-request.js';

/**
 * One limit that can be loosened step by step. Steps are whole numbers in the unit `perUnit` steps to one
 * (0.01 mm has 100), so that every figure reported is a plain decimal that works when it is asked for.
 */
export interface Relaxation {
  limit: string;
  /** Steps rise (1) or fall (−1) as the limit is loosened. */
  towards: 1 | -1;
  perUnit: number;
  /** The request's own figure, in steps; not loose enough as it stands. */
  current(request: CheckedRequest): number | null;
  loosest: number;
  /** The part of the request that changes. */
  change(request: CheckedRequest, figure: number): Partial<OptionRequest>;
  /** The least loosening, in steps, that would let this train in. */
  neededBy(train: FoundTrain, pool: PairPool, request: CheckedRequest): number;
  /** What a train of this kind needs, after "One stage". */
  words(figure: number, request: CheckedRequest): { verb: 'need' | 'reach'; rest: string };
}

const { teeth: TEETH, stageRatio: STAGE_RATIO, envelopeSide: SIDE } = REQUEST_BOUNDS;

/** Float noise of a product with `perUnit`; never enough to skip a step that matters. */
const GRAIN = 1e-9;

export const RELAXATIONS: readonly Relaxation[] = [
  teethLimit('wheel', 'max', 1),
  teethLimit('pinion', 'min', -1),
  teethLimit('pinion', 'max', 1),
  teethLimit('wheel', 'min', -1),
  {
    limit: 'stageRatio.max',
    towards: 1,
    perUnit: 1000,
    current: ({ stageRatio }) =>
      stageRatio.max === undefined ? null : Math.floor(Number(stageRatio.max) * 1000 + GRAIN),
    loosest: STAGE_RATIO[1] * 1000,
    change: ({ stageRatio }, max) => ({ stageRatio: { ...stageRatio, max } }),
    neededBy: (train, pool) => most(train, (row) => thousandthsUp(pool, row)),
    words: (figure, { stageRatio }) => ({
      verb: 'need',
      rest: `a stage ratio of at least ${figure}; the brief allows ${stageRatio.max}.`,
    }),
  },
  {
    limit: 'stageRatio.min',
    towards: -1,
    perUnit: 1000,
    current: ({ stageRatio }) => {
      const least = Math.ceil(Number(stageRatio.min) * 1000 - GRAIN);
      return least > 1000 ? least : null;
    },
    loosest: 1000,
    change: ({ stageRatio }, min) => ({ stageRatio: { ...stageRatio, min } }),
    neededBy: (train, pool) =>
      -most(train, (row) => -Math.floor(((pool.wheel[row] as number) * 1000) / (pool.pinion[row] as number))),
    words: (figure, { stageRatio }) => ({
      verb: 'need',
      rest: `a stage ratio of at most ${figure}; the brief asks for at least ${stageRatio.min}.`,
    }),
  },
  {
    limit: 'leastContactRatio',
    towards: -1,
    perUnit: 1000,
    current: ({ leastContactRatio }) => Math.ceil(leastContactRatio * 1000 - GRAIN),
    // Below 1 the teeth lose contact: no brief should be loosened that far.
    loosest: 1000,
    change: (_request, leastContactRatio) => ({ leastContactRatio }),
    neededBy: (train, pool) => -most(train, (row) => -Math.floor((pool.contactRatio[row] as number) * 1000)),
    words: (figure, { leastContactRatio }) => ({
      verb: 'reach',
      rest: `a contact ratio of ${figure.toFixed(3)} at most; the brief asks for ${leastContactRatio}.`,
    }),
  },
  {
    ...boxSide('length'),
    neededBy: (train, pool, request) => hundredthsUp(lengthOfPairsNm(pool, train.pairs), request),
  },
  {
    ...boxSide('height'),
    neededBy: (train, pool, request) => {
      const tip = most(train, (row) => Math.max(pool.pinionTip[row] as number, pool.wheelTip[row] as number));
      return hundredthsUp(toNm(2 * tip), request);
    },
  },
];

function teethLimit(gear: 'pinion' | 'wheel', end: 'min' | 'max', towards: 1 | -1): Relaxation {
  return {
    limit: `teeth.${gear}.${end}`,
    towards,
    perUnit: 1,
    current: ({ teeth }) => teeth[gear][end],
    loosest: end === 'max' ? TEETH[1] : TEETH[0],
    change: ({ teeth }, figure) => ({ teeth: { ...teeth, [gear]: { ...teeth[gear], [end]: figure } } }),
    neededBy: (train, pool) => towards * most(train, (row) => towards * (pool[gear][row] as number)),
    words: (figure, { teeth }) => ({
      verb: 'need',
      rest:
        end === 'max'
          ? `a ${gear} of at least ${figure} teeth; the brief allows ${teeth[gear].max}.`
          : `a ${gear} of at most ${figure} teeth; the brief asks for at least ${teeth[gear].min}.`,
    }),
  };
}

function boxSide(side: 'length' | 'height'): Omit<Relaxation, 'neededBy'> {
  return {
    limit: `envelope.${side}`,
    towards: 1,
    perUnit: 100,
    current: ({ envelope }) => {
      const limit = envelope?.[side];
      return limit === undefined ? null : Math.floor(limit * 100 + GRAIN);
    },
    loosest: SIDE[1] * 100,
    change: ({ envelope }, figure) => ({ envelope: { ...envelope, [side]: figure } }),
    words: (figure, { envelope }) => ({
      verb: 'need',
      rest: `a ${side} of at least ${figure.toFixed(2)} mm; the box allows ${envelope?.[side]} mm.`,
    }),
  };
}

function most(train: FoundTrain, figure: (row: number) => number): number {
  return train.pairs.reduce((greatest, row) => Math.max(greatest, figure(row)), -Infinity);
}

function thousandthsUp(pool: PairPool, row: number): number {
  return Math.ceil(((pool.wheel[row] as number) * 1000) / (pool.pinion[row] as number));
}

/** Hundredths of a mm, rounded up, that a size in nm needs with the walls around it. */
export function hundredthsUp(sizeNm: number, { envelope }: CheckedRequest): number {
  return Math.ceil((sizeNm + toNm(2 * (envelope?.wall ?? 0))) / 10_000);
}
