import { type LibraryRow } from './library.js';
import { randomOf } from './random.js';

/** What the workshop builds. */
export type ProductLine = 'winch' | 'vent' | 'turntable';

export interface Build {
  line: ProductLine;
  /** As people write it on the slip. */
  name: string;
  /** Days from the day of loading, below 0. */
  day: number;
  /** Drives built in the batch. */
  drives: number;
}

/** First and last day on which parts were taken for a build; the year's count lies before. */
export const FIRST_BUILD_DAY = -352;
export const LAST_BUILD_DAY = -3;

const LINES: Record<ProductLine, { name: string; first: number; drives: [least: number, most: number] }> = {
  winch: { name: 'Kelp-farm winch, batch', first: 41, drives: [1, 3] },
  vent: { name: 'Vent drive, batch', first: 117, drives: [3, 8] },
  turntable: { name: 'Packing turntable, batch', first: 23, drives: [1, 2] },
};

/** The year's builds in order: one every four or five days, the product lines taking turns. */
export function demoBuilds(): Build[] {
  const random = randomOf('builds');
  const order = Object.keys(LINES) as ProductLine[];
  const builds: Build[] = [];
  for (let day = FIRST_BUILD_DAY; day <= LAST_BUILD_DAY; day += random.whole(4, 5)) {
    const line = order[builds.length % order.length] ?? 'winch';
    const { name, first, drives } = LINES[line];
    const batch = first + Math.floor(builds.length / order.length);
    builds.push({ line, name: `${name} ${batch}`, day, drives: random.whole(...drives) });
  }
  return builds;
}

/** Which drives a part goes into. */
export function lineOf(row: LibraryRow): ProductLine {
  const random = randomOf(`line of ${row.description}`);
  if (row.kind !== 'gear') return random.pick(['winch', 'vent', 'turntable']);
  if (row.attributes.helixAngleDeg > 0 || ['POM', 'PA 6 G', 'CuZn39Pb3'].includes(row.material))
    return 'turntable';
  return row.material === 'C45' && random.chance(0.7) ? 'vent' : 'winch';
}
