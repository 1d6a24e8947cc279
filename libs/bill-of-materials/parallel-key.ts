/** A parallel key form A for a bore, sizes in mm. */
export interface ParallelKey {
  /** b */
  width: number;
  /** h */
  height: number;
  /** Keyway depth in the shaft, t1. */
  shaftDepth: number;
  /** Keyway depth in the hub, t2. */
  hubDepth: number;
  /** Range of lengths made for this section. */
  leastLength: number;
  greatestLength: number;
}

// DIN 6885-1: bore up to and including, b, h, t1, t2, lengths from and to. Above 75 mm, and the lengths of the two
// sections below it, from memory.
const ROWS: readonly (readonly [number, number, number, number, number, number, number])[] = [
  [8, 2, 2, 1.2, 1.0, 6, 20],
  [10, 3, 3, 1.8, 1.4, 6, 36],
  [12, 4, 4, 2.5, 1.8, 8, 45],
  [17, 5, 5, 3.0, 2.3, 10, 56],
  [22, 6, 6, 3.5, 2.8, 14, 70],
  [30, 8, 7, 4.0, 3.3, 18, 90],
  [38, 10, 8, 5.0, 3.3, 22, 110],
  [44, 12, 8, 5.0, 3.3, 28, 140],
  [50, 14, 9, 5.5, 3.8, 36, 160],
  [58, 16, 10, 6.0, 4.3, 45, 180],
  [65, 18, 11, 7.0, 4.4, 50, 200],
  [75, 20, 12, 7.5, 4.9, 56, 220],
  [85, 22, 14, 9.0, 5.4, 63, 250],
  [95, 25, 14, 9.0, 5.4, 70, 280],
  [110, 28, 16, 10.0, 6.4, 80, 320],
  [130, 32, 18, 11.0, 7.4, 90, 360],
];

/** Standard lengths of DIN 6885-1, mm (from memory). */
const LENGTHS: readonly number[] = [
  6, 8, 10, 12, 14, 16, 18, 20, 22, 25, 28, 32, 36, 40, 45, 50, 56, 63, 70, 80, 90, 100, 110, 125, 140, 160,
  180, 200, 220, 250, 280, 320, 360,
];

/** Smallest and largest bore of the table, mm. */
export const KEY_BORE_RANGE = { least: 6, greatest: 130 } as const;

/**
 * The parallel key of DIN 6885-1 for a bore: ranges run "over … up to and including"; 6 mm itself counts as the first.
 * @param boreMm mm
 * @returns null outside 6 to 130 mm, where the table has no key
 */
export function parallelKeyForBore(boreMm: number): ParallelKey | null {
  if (!(boreMm >= KEY_BORE_RANGE.least)) return null;
  const row = ROWS.find(([upTo]) => boreMm <= upTo);
  if (!row) return null;
  const [, width, height, shaftDepth, hubDepth, leastLength, greatestLength] = row;
  return { width, height, shaftDepth, hubDepth, leastLength, greatestLength };
}

/**
 * The longest standard length that stays within the hub; the shortest of the section when the hub is shorter still.
 * @param hubLength mm
 */
export function keyLengthForHub(key: ParallelKey, hubLength: number): { length: number; fits: boolean } {
  const made = LENGTHS.filter((length) => length >= key.leastLength && length <= key.greatestLength);
  const within = made.filter((length) => length <= hubLength).at(-1);
  return within === undefined ? { length: key.leastLength, fits: false } : { length: within, fits: true };
}

/** Volume of a form A key (round ends), mm³. */
export function keyVolume(width: number, height: number, length: number): number {
  return height * (width * length - (1 - Math.PI / 4) * width * width);
}
