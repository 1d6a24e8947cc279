/** HRC with the HV that goes with it, ISO 18265 (from memory, whole HV). */
const HRC_TO_HV: readonly (readonly [hrc: number, hv: number])[] = [
  [20, 238],
  [25, 266],
  [30, 302],
  [35, 345],
  [40, 392],
  [45, 446],
  [50, 513],
  [55, 595],
  [58, 653],
  [60, 697],
  [62, 746],
  [65, 832],
];
/** About HBW = 0.95 HV, ISO 18265. */
export const HBW_PER_HV = 0.95;

const STATED = /(\d+(?:[.,]\d+)?)(?:\s*(?:[–-]|to)\s*(\d+(?:[.,]\d+)?))?\s*(HRC|HV|HBW|HB)/i;

/**
 * The least hardness that a text states, HV: `58–62 HRC`, `min. 190 HBW`, `280 HV 10`.
 * @returns null when nothing is stated, the words cannot be read, or HRC is outside 20 to 65
 */
export function statedHardness(text: string | null): number | null {
  const found = text?.match(STATED);
  if (!found) return null;
  const [, first = '', second = first, scale = ''] = found;
  const least = Math.min(...[first, second].map((figure) => Number(figure.replace(',', '.'))));
  const unit = scale.toUpperCase();
  if (unit === 'HV') return least;
  return unit === 'HRC' ? rockwellToVickers(least) : least / HBW_PER_HV;
}

/** Between the rows of the table in proportion. */
function rockwellToVickers(hrc: number): number | null {
  const above = HRC_TO_HV.findIndex(([row]) => row >= hrc);
  const upper = HRC_TO_HV[above];
  if (!upper) return null;
  if (upper[0] === hrc) return upper[1];
  const lower = HRC_TO_HV[above - 1];
  if (!lower) return null;
  return lower[1] + ((hrc - lower[0]) / (upper[0] - lower[0])) * (upper[1] - lower[1]);
}
