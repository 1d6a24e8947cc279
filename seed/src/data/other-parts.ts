import { SUPPLIER } from './supplier-names.js';

/** A demo part that is no gear; `attributes` are those of its kind. */
export interface OtherRow {
  kind:
    'bearing' | 'key' | 'retaining-ring' | 'seal' | 'shaft' | 'housing' | 'lubricant' | 'fastener' | 'other';
  description: string;
  standing: 'cleared';
  material: string | null;
  /** kg each; for a lubricant, kg a litre */
  mass: number;
  supply: 'made' | 'bought';
  supplier: string | null;
  attributes: Record<string, number | string | null>;
}

const OWN_SHOP = null;
export const STEEL = 7850;

export const cylinder = (diameter: number, length: number): number =>
  (Math.PI / 4) * diameter ** 2 * length * 1e-9;
export const rounded = (kilograms: number): number => Number(kilograms.toPrecision(3));

/** Boundary dimensions d × D × B in mm of ISO 15, dimension series 18, 10 and 02 (from memory). */
export const BEARINGS: [number, number, number][] = [
  [3, 10, 4], [4, 13, 5], [5, 16, 5], [6, 19, 6], [8, 22, 7],
  [10, 19, 5], [12, 21, 5], [15, 24, 5], [17, 26, 5], [20, 32, 7], [25, 37, 7], [30, 42, 7],
  [10, 26, 8], [12, 28, 8], [15, 32, 9], [17, 35, 10], [20, 42, 12], [25, 47, 12], [30, 55, 13], [35, 62, 14],
  [40, 68, 15], [45, 75, 16], [50, 80, 16],
  [10, 30, 9], [12, 32, 10], [15, 35, 11], [17, 40, 12], [20, 47, 14], [25, 52, 15], [30, 62, 16], [35, 72, 17],
  [40, 80, 18],
]; // prettier-ignore

export function bearing([bore, outerDiameter, width]: [number, number, number]): OtherRow {
  return {
    kind: 'bearing',
    description: `Deep-groove ball bearing ${bore} × ${outerDiameter} × ${width} mm`,
    standing: 'cleared',
    material: 'bearing steel',
    // About 0.6 of the ring's volume is steel; the rest is the space between balls and cage.
    mass: rounded((cylinder(outerDiameter, width) - cylinder(bore, width)) * STEEL * 0.6),
    supply: 'bought',
    supplier: SUPPLIER.corrie,
    // Load ratings come from the supplier's data sheet; the demo has none, and says so by leaving them empty.
    attributes: {
      bore,
      outerDiameter,
      width,
      dynamicLoadRating: null,
      staticLoadRating: null,
      type: 'deep-groove ball',
    },
  };
}

/** Key sections of DIN 6885-1 with the lengths the workshop keeps, mm. */
const KEYS: [number, number, number[]][] = [
  [2, 2, [8, 10]],
  [3, 3, [10, 14]],
  [4, 4, [12, 16]],
  [5, 5, [14, 20, 25]],
  [6, 6, [16, 20, 28]],
  [8, 7, [20, 25, 36]],
  [10, 8, [25, 32, 45]],
  [12, 8, [32, 45]],
  [14, 9, [40, 50]],
];

export function key(width: number, height: number, length: number): OtherRow {
  return {
    kind: 'key',
    description: `Parallel key ${width} × ${height} × ${length} mm, DIN 6885 form A`,
    standing: 'cleared',
    material: 'C45',
    mass: rounded(width * height * length * 1e-9 * STEEL),
    supply: 'bought',
    supplier: SUPPLIER.tidewrack,
    attributes: { width, height, length },
  };
}

/** Shaft diameter, thickness and groove diameter of DIN 471, mm (from memory). */
const RINGS: [number, number, number][] = [
  [3, 0.4, 2.8], [4, 0.4, 3.8], [5, 0.6, 4.8], [6, 0.7, 5.7], [8, 0.8, 7.6], [10, 1, 9.6], [12, 1, 11.5],
  [14, 1, 13.4], [15, 1, 14.3], [16, 1, 15.2], [17, 1, 16.2], [18, 1.2, 17], [20, 1.2, 19], [22, 1.2, 21],
  [25, 1.2, 23.9], [28, 1.5, 26.6], [30, 1.5, 28.6], [35, 1.5, 33], [40, 1.75, 37.5], [45, 1.75, 42.5],
]; // prettier-ignore

export function ring([shaftDiameter, thickness, grooveDiameter]: [number, number, number]): OtherRow {
  return {
    kind: 'retaining-ring',
    description: `Retaining ring for a ${shaftDiameter} mm shaft, DIN 471`,
    standing: 'cleared',
    material: 'spring steel',
    mass: rounded((cylinder(shaftDiameter * 1.25, thickness) - cylinder(shaftDiameter, thickness)) * STEEL),
    supply: 'bought',
    supplier: SUPPLIER.corrie,
    attributes: { shaftDiameter, thickness, grooveDiameter },
  };
}

/** Shaft, outer diameter and width of rotary shaft seals in ISO 6194 sizes, mm (from memory). */
const SEALS: [number, number, number][] = [
  [6, 16, 7], [8, 22, 7], [10, 22, 7], [12, 24, 7], [15, 30, 7], [17, 35, 7], [20, 35, 7], [25, 40, 7], [30, 47, 7],
  [35, 50, 8], [40, 55, 8],
]; // prettier-ignore

export function seal([shaftDiameter, outerDiameter, width]: [number, number, number]): OtherRow {
  return {
    kind: 'seal',
    description: `Rotary shaft seal ${shaftDiameter} × ${outerDiameter} × ${width} mm`,
    standing: 'cleared',
    material: 'NBR',
    mass: rounded((cylinder(outerDiameter, width) - cylinder(shaftDiameter, width)) * 1300),
    supply: 'bought',
    supplier: SUPPLIER.corrie,
    attributes: { shaftDiameter, outerDiameter, width },
  };
}

const SHAFTS: [number, number][] = [
  [6, 120], [8, 120], [10, 150], [12, 150], [15, 200], [17, 200], [20, 250], [25, 250], [30, 300], [35, 300], [40, 300],
]; // prettier-ignore

export function shaft([diameter, length]: [number, number]): OtherRow {
  return {
    kind: 'shaft',
    description: `Ground shaft ${diameter} h6 × ${length} mm`,
    standing: 'cleared',
    material: 'C45',
    mass: rounded(cylinder(diameter, length) * STEEL),
    supply: 'made',
    supplier: OWN_SHOP,
    attributes: { diameter, length },
  };
}

const HOUSINGS: [number, number, number, number][] = [
  [140, 60, 100, 5],
  [180, 80, 120, 6],
  [220, 90, 140, 6],
  [280, 110, 180, 8],
  [360, 140, 240, 8],
  [480, 160, 320, 10],
];

export function housing([length, width, height, wall]: [number, number, number, number]): OtherRow {
  const hollow = (length - 2 * wall) * (width - 2 * wall) * (height - 2 * wall);
  return {
    kind: 'housing',
    description: `Cast housing ${length} × ${width} × ${height} mm, wall ${wall} mm`,
    standing: 'cleared',
    material: 'EN AC-AlSi10Mg',
    mass: rounded((length * width * height - hollow) * 1e-9 * 2680),
    supply: 'made',
    supplier: OWN_SHOP,
    attributes: { length, width, height, wall },
  };
}

const LUBRICANTS: [string, number][] = [
  ['ISO VG 150', 1],
  ['ISO VG 220', 1],
  ['ISO VG 220', 5],
  ['ISO VG 320', 5],
];

export function lubricant([viscosityGrade, packVolume]: [string, number]): OtherRow {
  return {
    kind: 'lubricant',
    description: `Gear oil ${viscosityGrade}, ${packVolume} l can`,
    standing: 'cleared',
    material: 'mineral oil',
    mass: rounded(0.89 * packVolume),
    supply: 'bought',
    supplier: SUPPLIER.tidewrack,
    attributes: { viscosityGrade, packVolume },
  };
}

const FASTENERS: [string, number][] = [
  ['M4', 12],
  ['M5', 16],
  ['M6', 20],
  ['M8', 25],
  ['M10', 30],
];

export function fastener([thread, length]: [string, number]): OtherRow {
  const diameter = Number(thread.slice(1));
  return {
    kind: 'fastener',
    description: `Hexagon socket head screw ${thread} × ${length}, ISO 4762`,
    standing: 'cleared',
    material: 'steel',
    mass: rounded((cylinder(diameter, length) + cylinder(diameter * 1.6, diameter)) * STEEL),
    supply: 'bought',
    supplier: SUPPLIER.tidewrack,
    attributes: { thread, length, strengthClass: '8.8' },
  };
}

/** The first parts that are no gears, always in the same order. */
export function firstOtherParts(): OtherRow[] {
  return [
    ...BEARINGS.map(bearing),
    ...KEYS.flatMap(([width, height, lengths]) => lengths.map((length) => key(width, height, length))),
    ...RINGS.map(ring),
    ...SEALS.map(seal),
    ...SHAFTS.map(shaft),
    ...HOUSINGS.map(housing),
    ...LUBRICANTS.map(lubricant),
    ...FASTENERS.map(fastener),
  ];
}
