import { type LibraryRow } from './library.js';
import { randomOf } from './random.js';

const SHELVES = ['A', 'B', 'C', 'D', 'E', 'F'] as const;

/** Racks by what the gears are made of. */
const RACKS: Record<string, number> = {
  C45: 1,
  '42CrMo4': 2,
  '16MnCr5': 3,
  'X17CrNi16-2': 4,
  'EN-GJL-250': 4,
  CuZn39Pb3: 5,
  POM: 5,
  'PA 6 G': 5,
};

/** For what no longer fits its own place. */
export const OVERFLOW_PLACE = 'Rack 9, shelf A';

/** Where a part lies. */
export function placeOf(row: LibraryRow): string {
  const random = randomOf(`place of ${row.description}`);
  switch (row.kind) {
    case 'gear':
      return `Rack ${RACKS[row.material] ?? 6}, shelf ${SHELVES[Math.min(5, Math.floor(row.attributes.module * 1.5))]}`;
    case 'bearing':
      return `Bearing cabinet, drawer ${1 + Math.min(7, Math.floor(Number(row.attributes.bore) / 5))}`;
    case 'fastener':
      return `Screw rack, bin ${random.whole(1, 24)}`;
    case 'shaft':
      return `Bar store, bay ${random.whole(1, 3)}`;
    case 'housing':
      return `Rack 8, shelf ${random.pick(SHELVES)}`;
    case 'lubricant':
      return 'Oil store';
    case 'key':
    case 'retaining-ring':
    case 'seal':
    case 'other':
      return `Small parts, drawer ${random.whole(1, 16)}`;
  }
}
