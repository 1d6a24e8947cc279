/** A retaining ring for shafts, normal type, with its groove; mm. */
export interface RetainingRing {
  /** Nominal shaft diameter d1. */
  shaftDiameter: number;
  /** s */
  thickness: number;
  /** d2 */
  grooveDiameter: number;
  /** m, H13 */
  grooveWidth: number;
}

// DIN 471, normal type: d1 and d2, grouped by ring thickness s and groove width m. Groove
// diameters up to 52 mm seen in dealers' tables of the standard; the rest, thickness and groove width from memory.
const GROUPS: readonly { s: number; m: number; sizes: readonly (readonly [number, number])[] }[] = [
  {
    s: 0.4,
    m: 0.5,
    sizes: [
      [3, 2.8],
      [4, 3.8],
    ],
  },
  { s: 0.6, m: 0.7, sizes: [[5, 4.8]] },
  { s: 0.7, m: 0.8, sizes: [[6, 5.7]] },
  {
    s: 0.8,
    m: 0.9,
    sizes: [
      [7, 6.7],
      [8, 7.6],
    ],
  },
  {
    s: 1,
    m: 1.1,
    sizes: [
      [9, 8.6],
      [10, 9.6],
      [11, 10.5],
      [12, 11.5],
      [13, 12.4],
      [14, 13.4],
      [15, 14.3],
      [16, 15.2],
      [17, 16.2],
    ],
  },
  {
    s: 1.2,
    m: 1.3,
    sizes: [
      [18, 17],
      [19, 18],
      [20, 19],
      [21, 20],
      [22, 21],
      [24, 22.9],
      [25, 23.9],
      [26, 24.9],
    ],
  },
  {
    s: 1.5,
    m: 1.6,
    sizes: [
      [28, 26.6],
      [29, 27.6],
      [30, 28.6],
      [32, 30.3],
      [34, 32.3],
      [35, 33],
    ],
  },
  {
    s: 1.75,
    m: 1.85,
    sizes: [
      [36, 34],
      [38, 36],
      [40, 37.5],
      [42, 39.5],
      [45, 42.5],
      [48, 45.5],
    ],
  },
  {
    s: 2,
    m: 2.15,
    sizes: [
      [50, 47],
      [52, 49],
      [55, 52],
      [56, 53],
      [58, 55],
      [60, 57],
      [62, 59],
      [63, 60],
    ],
  },
  {
    s: 2.5,
    m: 2.65,
    sizes: [
      [65, 62],
      [68, 65],
      [70, 67],
      [72, 69],
      [75, 72],
      [78, 75],
      [80, 76.5],
    ],
  },
];

const RINGS: readonly RetainingRing[] = GROUPS.flatMap(({ s, m, sizes }) =>
  sizes.map(([shaftDiameter, grooveDiameter]) => ({
    shaftDiameter,
    thickness: s,
    grooveDiameter,
    grooveWidth: m,
  })),
);

/** The DIN 471 ring for exactly this nominal shaft diameter, or null when the standard has none (3 to 80 mm here). */
export function retainingRingForShaft(diameterMm: number): RetainingRing | null {
  return RINGS.find((ring) => ring.shaftDiameter === diameterMm) ?? null;
}

/** The largest nominal size below a diameter, for a stepped seat; null below the smallest. */
export function retainingRingBelow(diameterMm: number): RetainingRing | null {
  return RINGS.filter((ring) => ring.shaftDiameter < diameterMm).at(-1) ?? null;
}
