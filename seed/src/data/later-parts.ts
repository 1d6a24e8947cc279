import {
  bearing,
  BEARINGS,
  cylinder,
  fastener,
  housing,
  key,
  lubricant,
  type OtherRow,
  ring,
  rounded,
  seal,
  shaft,
  STEEL,
} from './other-parts.js';
import { SUPPLIER } from './supplier-names.js';

/** Boundary dimensions d × D × B in mm of ISO 15, dimension series 03 (from memory). */
const HEAVY_BEARINGS: [number, number, number][] = [
  [10, 35, 11], [12, 37, 12], [15, 42, 13], [17, 47, 14], [20, 52, 15], [25, 62, 17], [30, 72, 19], [35, 80, 21],
  [40, 90, 23],
]; // prettier-ignore

/** More lengths for the key sections of DIN 6885-1, mm. */
const KEYS: [number, number, number[]][] = [
  [2, 2, [6, 12]],
  [3, 3, [8, 12, 16]],
  [4, 4, [10, 14, 20]],
  [5, 5, [12, 16, 18, 28, 32]],
  [6, 6, [14, 18, 22, 25, 32, 36]],
  [8, 7, [18, 22, 28, 32, 40]],
  [10, 8, [22, 28, 36, 40, 50]],
  [12, 8, [28, 36, 40, 50]],
  [14, 9, [36, 45, 56]],
];

/** Between the sizes of DIN 471 that the library began with: shaft, thickness, groove, mm (from memory). */
const RINGS: [number, number, number][] = [
  [7, 0.8, 6.7], [9, 1, 8.6], [11, 1, 10.5], [13, 1, 12.4], [19, 1.2, 18], [24, 1.2, 22.9], [26, 1.2, 24.9],
  [32, 1.5, 30.3], [38, 1.75, 36], [50, 2, 47],
]; // prettier-ignore

const SEALS: [number, number, number][] = [
  [8, 24, 7], [10, 26, 7], [12, 28, 7], [15, 26, 7], [17, 30, 7], [20, 40, 7], [25, 47, 7], [30, 52, 7], [35, 62, 7],
  [40, 62, 7], [45, 62, 8], [50, 72, 8],
]; // prettier-ignore

const SHAFTS: [number, number][] = [[8, 200], [10, 250], [12, 250], [15, 300], [20, 400], [25, 400], [30, 500]]; // prettier-ignore
const HOUSINGS: [number, number, number, number][] = [[120, 60, 90, 5], [200, 90, 150, 6], [320, 120, 210, 8]]; // prettier-ignore
const LUBRICANTS: [string, number][] = [
  ['ISO VG 68', 1],
  ['ISO VG 100', 1],
  ['ISO VG 100', 5],
  ['ISO VG 150', 5],
  ['ISO VG 320', 1],
  ['ISO VG 460', 5],
  ['ISO VG 220', 20],
];

const SCREWS: [string, number[]][] = [
  ['M3', [8, 12, 16]],
  ['M4', [10, 16, 20, 25]],
  ['M5', [10, 12, 20, 25, 30]],
  ['M6', [12, 16, 25, 30, 40]],
  ['M8', [16, 20, 30, 35, 40, 50]],
  ['M10', [20, 25, 35, 40, 50]],
  ['M12', [25, 30, 40, 50]],
];

const HEXAGON_SCREWS: [string, number[]][] = [
  ['M5', [16, 20, 25]],
  ['M6', [16, 20, 25, 30]],
  ['M8', [20, 25, 30, 40]],
  ['M10', [25, 30, 40, 50]],
  ['M12', [30, 40, 50]],
];

function sealedBearing(size: [number, number, number]): OtherRow {
  const open = bearing(size);
  return {
    ...open,
    description: `${open.description}, sealed both sides`,
    attributes: { ...open.attributes, type: 'deep-groove ball, sealed' },
  };
}

function hexagonScrew(thread: string, length: number): OtherRow {
  const screw = fastener([thread, length]);
  return { ...screw, description: `Hexagon head screw ${thread} × ${length}, ISO 4017` };
}

function other(description: string, material: string, mass: number): OtherRow {
  return {
    kind: 'other',
    description,
    standing: 'cleared',
    material,
    mass: rounded(mass),
    supply: 'bought',
    supplier: SUPPLIER.tidewrack,
    attributes: {},
  };
}

/** Bore, outer diameter and length of spacer sleeves, mm: our own sizes. */
const SLEEVES: [number, number, number[]][] = [
  [8, 12, [5, 10]],
  [10, 14, [5, 10, 15]],
  [12, 18, [5, 10, 20]],
  [15, 21, [5, 10, 20]],
  [20, 28, [8, 15, 25]],
  [25, 33, [8, 15, 25]],
  [30, 40, [10, 20]],
];

function ringPart(word: string, bore: number, outer: number, length: number, tail = ''): OtherRow {
  const mass = (cylinder(outer, length) - cylinder(bore, length)) * STEEL;
  return other(`${word} ${bore} × ${outer} × ${length} mm${tail}`, 'steel', mass);
}

/** Bore and outer diameter of shim rings, mm, DIN 988 (from memory). */
const SHIMS: [number, number][] = [[10, 16], [12, 18], [15, 21], [17, 24], [20, 28], [25, 35], [30, 42]]; // prettier-ignore
const SHIM_THICKNESSES = [0.1, 0.3, 0.5];

/** Thread, bore and outer diameter, thickness of washers, mm, ISO 7089 (from memory). */
const WASHERS: [string, number, number, number][] = [
  ['M4', 4.3, 9, 0.8], ['M5', 5.3, 10, 1], ['M6', 6.4, 12, 1.6], ['M8', 8.4, 16, 1.6], ['M10', 10.5, 20, 2],
  ['M12', 13, 24, 2.5],
]; // prettier-ignore

const FITTINGS: OtherRow[] = [
  ...['M10 × 1', 'M12 × 1.5', 'M16 × 1.5'].flatMap((thread) => [
    other(`Vent plug ${thread}`, 'brass', 0.02),
    other(`Drain plug ${thread}, magnetic`, 'steel', 0.03),
    other(`Oil level glass ${thread}`, 'aluminium', 0.025),
  ]),
  ...[10, 12, 15, 20, 25].map((bore) =>
    other(`Jaw coupling hub, bore ${bore} mm`, 'aluminium', bore * 0.008),
  ),
  ...['soft', 'hard'].map((word) => other(`Jaw coupling star, ${word}`, 'polyurethane', 0.015)),
  ...HOUSINGS.map(([length, width]) =>
    other(`Flat gasket for a housing of ${length} × ${width} mm`, 'fibre', 0.02),
  ),
];

/** What the library gained later, always in the same order. */
export function laterOtherParts(): OtherRow[] {
  return [
    ...BEARINGS.map(sealedBearing),
    ...HEAVY_BEARINGS.map(bearing),
    ...KEYS.flatMap(([width, height, lengths]) => lengths.map((length) => key(width, height, length))),
    ...RINGS.map(ring),
    ...SEALS.map(seal),
    ...SHAFTS.map(shaft),
    ...HOUSINGS.map(housing),
    ...LUBRICANTS.map(lubricant),
    ...SCREWS.flatMap(([thread, lengths]) => lengths.map((length) => fastener([thread, length]))),
    ...HEXAGON_SCREWS.flatMap(([thread, lengths]) => lengths.map((length) => hexagonScrew(thread, length))),
    ...WASHERS.map(([thread, bore, outer, thickness]) =>
      ringPart(`Washer ${thread},`, bore, outer, thickness, ', ISO 7089'),
    ),
    ...SLEEVES.flatMap(([bore, outer, lengths]) =>
      lengths.map((length) => ringPart('Spacer sleeve', bore, outer, length)),
    ),
    ...SHIMS.flatMap(([bore, outer]) =>
      SHIM_THICKNESSES.map((thickness) => ringPart('Shim ring', bore, outer, thickness, ', DIN 988')),
    ),
    ...FITTINGS,
  ];
}
