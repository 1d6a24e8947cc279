/** The blank of a stock gear: what bore and hub a maker would give it, and what it weighs. */
export interface Blank {
  teeth: number;
  /** mm */
  module: number;
  helixAngleDeg: number;
  /** mm */
  faceWidth: number;
}

export interface Hub {
  /** mm */
  diameter: number;
  /** mm, beyond the face width */
  length: number;
}

/** Usual bores, mm; from 3 mm on each has a rolling bearing of ISO 15 and a ring of DIN 471. */
const BORES = [2, 3, 4, 5, 6, 8, 10, 12, 15, 17, 20, 25, 30, 35, 40];

const referenceDiameter = ({ teeth, module, helixAngleDeg }: Blank): number =>
  (teeth * module) / Math.cos((helixAngleDeg * Math.PI) / 180);

const rootDiameter = (blank: Blank): number => referenceDiameter(blank) - 2.5 * blank.module;

/**
 * The bore in mm: about a third of the root diameter, at least 2.5 modules of rim left under a 12-tooth pinion's
 * root, and no wider than the face width can guide.
 */
export function boreFor(blank: Blank): number {
  const room = rootDiameter(blank) - 5 * blank.module;
  const wanted = Math.min(Math.max(rootDiameter(blank) / 3, room * 0.6), room, blank.faceWidth * 1.5);
  return BORES.filter((bore) => bore <= wanted).at(-1) ?? BORES[0]!;
}

/** A hub of 1.6 bores, shorter than the face; null where the root leaves no step for one. */
export function hubFor(blank: Blank, bore: number): Hub | null {
  const diameter = Math.round(Math.min(bore * 1.6 + 4, rootDiameter(blank) - 1.5 * blank.module));
  if (diameter < bore + 4) return null;
  return { diameter, length: Math.max(4, Math.round(blank.faceWidth * 0.6)) };
}

/** Mass in kg, the toothed part taken as a disc of the reference diameter; density in kg/m³. */
export function gearMass(blank: Blank, bore: number, hub: Hub | null, density: number): number {
  const disc = (referenceDiameter(blank) ** 2 - bore ** 2) * blank.faceWidth;
  const ring = hub === null ? 0 : (hub.diameter ** 2 - bore ** 2) * hub.length;
  const kilograms = (Math.PI / 4) * (disc + ring) * 1e-9 * density;
  return Number(kilograms.toPrecision(3));
}
