import { type BomKind, type Hand } from './part-kinds.js';

/** What the kit needs of one gear. Lengths mm, angles degrees, shift in modules. */
export interface GearNeed {
  kind: 'gear';
  /** The part the designer chose; null asks for an exact match by size. */
  partNumber: string | null;
  teeth: number;
  module: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  /** null for a spur gear, or where either hand will do. */
  hand: Hand | null;
  profileShift: number;
  faceWidth: number;
  bore: number;
}

/** A pinion cut on its shaft: the gear's needs, and the shaft it is cut on. */
export interface PinionShaftNeed extends Omit<GearNeed, 'kind' | 'bore'> {
  kind: 'pinion-shaft';
  shaftDiameter: number;
  shaftLength: number;
}

export interface ShaftNeed {
  kind: 'shaft';
  partNumber: string | null;
  diameter: number;
  /** Span between the bearing faces; a stock shaft is longer, for its seats and ends, and is cut down. */
  length: number;
}

export interface BearingNeed {
  kind: 'bearing';
  bore: number;
}

/** A parallel key of DIN 6885-1. */
export interface KeyNeed {
  kind: 'key';
  width: number;
  height: number;
  length: number;
}

/** A retaining ring of DIN 471 by nominal shaft diameter. */
export interface RetainingRingNeed {
  kind: 'retaining-ring';
  shaftDiameter: number;
  thickness: number;
}

export interface SealNeed {
  kind: 'seal';
  shaftDiameter: number;
}

/** Outer sizes and wall, each at least this large. */
export interface HousingNeed {
  kind: 'housing';
  length: number;
  width: number;
  height: number;
  wall: number;
}

export interface LubricantNeed {
  kind: 'lubricant';
  /** ISO 3448 viscosity grade, such as `ISO VG 220`. */
  viscosityGrade: string;
}

export type PartNeed =
  | GearNeed
  | PinionShaftNeed
  | ShaftNeed
  | BearingNeed
  | KeyNeed
  | RetainingRingNeed
  | SealNeed
  | HousingNeed
  | LubricantNeed;

/** The gear data of a library part; null where the library does not know. */
export interface PartGear {
  teeth: number;
  module: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  hand: Hand | null;
  profileShift: number | null;
  faceWidth: number;
  /** null for a pinion shaft. */
  bore: number | null;
  /** Length of the bore, face width and hub together; the face width when left out. */
  hubLength?: number | null;
  thicknessAllowance: { upper: number; lower: number } | null;
  heatTreatment?: string | null;
}

/** A part that a person chose for a line: the line it stands on, and what the kit rules would have taken. */
export interface ChosenInstead {
  lineKey: string;
  partNumber: string | null;
  description: string;
  /** Why it does not fit the place as it now is; empty when it does. */
  misfits: string[];
}

/** A part the library holds, as far as a bill of materials needs it. */
export interface PartRef {
  number: string;
  kind: BomKind;
  description: string;
  material: string | null;
  supply: 'made' | 'bought';
  supplier: string | null;
  /** kg each; a lubricant's is per pack. */
  mass: number | null;
  standing?: 'draft' | 'cleared' | 'withdrawn';
  /** Gears and pinion shafts. */
  gear?: PartGear;
  /** Shafts: length, mm. */
  length?: number | null;
  /** Lubricants: litres per pack. */
  packVolume?: number | null;
  instead?: ChosenInstead;
}

/** Looks parts up. It answers at once: the caller loads what it may need beforehand. */
export interface PartFinder {
  /**
   * The best part that meets the need exactly, or null. A chosen gear or pinion shaft is returned by its number
   * whatever its sizes.
   */
  find(need: PartNeed): PartRef | null;
}
