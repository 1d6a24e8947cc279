import { type Hand } from '../part-kinds.js';

/** Allowable stress numbers of a gear's material, N/mm²: the caller rates it. */
export interface RatedStrength {
  /** σ_Hlim */
  contact: number;
  /** σ_Flim */
  bending: number;
}

/** Teeth of a part, lengths mm, angles degrees, shift in modules. */
export interface SubstituteTeeth {
  teeth: number;
  module: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  hand: Hand | null;
  /** null: not stated, counted as 0. */
  profileShift: number | null;
  faceWidth: number;
  heatTreatment: string | null;
  /** The teeth are so hard that a bore can no longer be turned without more ado. */
  hardened: boolean;
  /** null: the material is not rated. */
  strength: RatedStrength | null;
  /** A plastic, brass or the like: weaker than any rated material. */
  softerThanSteel: boolean;
  /** Root diameter; worked out from the standard rack when left out. */
  rootDiameter?: number;
}

export interface SubstituteGear extends SubstituteTeeth {
  kind: 'gear';
  bore: number;
  hubDiameter: number | null;
  /** Length of the bore, face width and hub together; the face width when null. */
  hubLength: number | null;
}

export interface SubstitutePinionShaft extends SubstituteTeeth {
  kind: 'pinion-shaft';
  shaftDiameter: number;
  shaftLength: number;
}

/** Sizes mm, load ratings kN; null: not known, or not asked for by the place. */
export type SubstituteSizes =
  | SubstituteGear
  | SubstitutePinionShaft
  | { kind: 'shaft'; diameter: number; length: number }
  | {
      kind: 'bearing';
      bore: number;
      outerDiameter: number | null;
      width: number | null;
      type: string | null;
      dynamicLoadRating: number | null;
      staticLoadRating: number | null;
    }
  | { kind: 'key'; width: number; height: number; length: number }
  | { kind: 'retaining-ring'; shaftDiameter: number; thickness: number; grooveDiameter: number | null }
  | { kind: 'seal'; shaftDiameter: number; outerDiameter: number | null; width: number | null }
  | { kind: 'housing'; length: number; width: number; height: number; wall: number }
  | { kind: 'lubricant'; viscosityGrade: string; packVolume: number | null }
  | { kind: 'fastener'; thread: string; length: number; strengthClass: string }
  | { kind: 'other' };

export type SizesOf<K extends SubstituteSizes['kind']> = Extract<SubstituteSizes, { kind: K }>;

/** A part, or a place that asks for one, as the rules of fit look at it. */
export interface SubstitutePart {
  /** null: a place without a part of its own. */
  number: string | null;
  standing: 'draft' | 'cleared' | 'withdrawn';
  material: string | null;
  sizes: SubstituteSizes;
}

/** What a place in a train asks for where it is not just what the original has. Lengths mm. */
export interface FitPlace {
  /** Face width that the train counts with; the original's when left out. */
  leastFaceWidth?: number;
  /** Room beside the neighbouring gears; not limited when left out. */
  mostFaceWidth?: number;
  /** The shaft that a gear sits on; the original's bore when left out. */
  shaftDiameter?: number;
}

/** Whether a part drops in. */
export interface Fit {
  fits: boolean;
  /** Why it does not fit; empty when it does. */
  misfits: string[];
  /** Where it is not the same, though it fits. */
  differences: string[];
  /** What is not known and a person must look at. */
  toCheck: string[];
}
