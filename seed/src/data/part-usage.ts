import { type LibraryRow } from './library.js';
import { salesFormOf } from './offer-terms-of.js';
import { randomOf } from './random.js';

/**
 * How the workshop uses a part over the year. Quantities in steps: one piece, or a tenth of a litre, so that all are
 * whole.
 */
export interface PartUsage {
  /** Steps in one unit of the part. */
  stepsPerUnit: 1 | 10;
  /** How often a build of its line takes it, 0 to 1. */
  pace: number;
  /** For one drive. */
  perDrive: number;
  opening: number;
  /** From here on it is ordered again. */
  reorderAt: number;
  /** Ordered in multiples of this. */
  pack: number;
  /** Whether the low-stock list watches it. */
  watched: boolean;
  /** The last order was forgotten, as happens. */
  orderedLate: boolean;
}

/** Gears of the demo trains: always on the shelf. */
const ALWAYS_KEPT: ReadonlySet<string> = new Set([
  'Spur gear, steel, 18 teeth, module 1.5',
  'Spur gear, steel, 66 teeth, module 1.5',
  'Helical gear, hardened steel, 16 teeth, module 1.5, right hand 15°',
  'Helical gear, hardened steel, 16 teeth, module 1.5, left hand 15°',
]);

const PER_DRIVE: Record<LibraryRow['kind'], [least: number, most: number]> = {
  gear: [1, 2],
  bearing: [2, 4],
  key: [2, 4],
  'retaining-ring': [2, 6],
  seal: [1, 2],
  shaft: [1, 2],
  housing: [1, 1],
  lubricant: [3, 9],
  fastener: [4, 16],
  other: [1, 6],
};

/** Null for parts that never lay on a shelf: drafts, and what was withdrawn. */
export function usageOf(row: LibraryRow): PartUsage | null {
  if (row.standing !== 'cleared') return null;
  const random = randomOf(`usage of ${row.description}`);
  const always = ALWAYS_KEPT.has(row.description);
  const used = random.chance(row.kind === 'gear' ? 0.62 : 0.93) || always;
  const stepsPerUnit = row.kind === 'lubricant' ? 10 : 1;
  const perDrive = random.whole(...PER_DRIVE[row.kind]);
  // What no build took this year lies there all the same.
  const pace = always ? 0.7 : used ? paceOf(row, random.next()) : 0;
  // A third of the 78 builds of a year are of one line; about three drives each.
  const monthly = Math.max(1, Math.round((26 / 12) * pace * perDrive * 3));
  return {
    stepsPerUnit,
    pace,
    perDrive,
    opening: always ? 40 : Math.round(monthly * (1 + random.next() * 3)) + perDrive,
    reorderAt: pace === 0 ? 0 : Math.max(2, Math.round(monthly * 1.4)),
    pack: Math.max(1, Math.round(salesFormOf(row).pack * stepsPerUnit)),
    watched: pace >= 0.2 || (pace > 0 && random.chance(0.07)),
    orderedLate: !always && random.chance(0.45),
  };
}

function paceOf(row: LibraryRow, drawn: number): number {
  const usual = row.kind === 'gear' ? 0.03 : 0.09;
  return drawn < 0.14 ? usual * 2 + 0.18 : drawn < 0.6 ? usual : usual / 2;
}
