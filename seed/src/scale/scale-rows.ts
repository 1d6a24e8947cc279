import { type BulkRow } from '@stageyard/backend/bulk-loading/bulk-row';
import { randomOf } from '../data/random.js';
import { scaleGear } from './scale-gears.js';
import { scaleOffers } from './scale-offers.js';
import { scaleOther } from './scale-others.js';
import { type ScaleSupplier } from './scale-suppliers.js';

/** What decides a scale set, wholly: the same options give the same rows. */
export interface ScaleOptions {
  /** Parts. */
  count: number;
  /** Whole number. */
  seed: number;
  /** At least one. */
  suppliers: readonly ScaleSupplier[];
  /** ISO 8601 date; prices and their ends are counted from it. */
  today: string;
}

/** Four parts of five have teeth. */
const GEARS = 0.8;
/** A prime near 36⁵ ÷ the golden ratio: walks through all five-sign marks before one comes again. */
const MARK_STEP = 37_369_891;
const MARKS = 36 ** 5;

/** A five-sign mark that no other row of the set has. */
const markOf = (index: number) => ((index * MARK_STEP) % MARKS).toString(36).toUpperCase().padStart(5, '0');

/** The rows of a scale set one after the other; nothing of them is kept. */
export default function* scaleRows(options: ScaleOptions): Generator<BulkRow> {
  const dice = randomOf(`scale set ${options.seed}`);
  for (let index = 1; index <= options.count; index += 1) {
    const mark = markOf(index);
    const part = dice.chance(GEARS) ? scaleGear(dice, mark) : scaleOther(dice, mark);
    const offers = scaleOffers(dice, part, mark, options);
    const maker = options.suppliers.find(({ code }) => code === offers[0]?.supplierCode);
    const piece = part.kind === 'lubricant' ? 0.5 : 1;
    yield {
      part: {
        ...part,
        standing: dice.chance(0.93) ? 'cleared' : 'draft',
        supply: 'bought',
        supplier: maker?.name ?? null,
      },
      offers,
      leastStock: dice.chance(0.1) ? dice.whole(1, 40) * piece : null,
      opening: dice.chance(0.4)
        ? {
            place: `Rack ${dice.pick(['A', 'B', 'C', 'D'])} ${dice.whole(1, 120)}`,
            quantity: dice.whole(0, 250) * piece,
          }
        : null,
    };
  }
}
