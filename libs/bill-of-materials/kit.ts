import { type Hand } from './part-kinds.js';

/** Computed sizes of a gear (mm), named as in the gear calculation; what is not given stays blank in the gear data. */
export interface KitGearFigures {
  referenceDiameter?: number;
  baseDiameter?: number;
  tipDiameter?: number;
  rootDiameter?: number;
  formDiameter?: number;
  toothThickness?: number;
  spanTeeth?: number;
  spanLength?: number;
}

/** One gear of the train. Lengths mm, angles degrees, shift and tip shortening in modules. */
export interface KitGear {
  /** From 1. The pinion sits on shaft `stage − 1`, the wheel on shaft `stage`. */
  stage: number;
  role: 'pinion' | 'wheel';
  /** The library part the designer chose, or null when none is chosen. */
  partNumber?: string | null;
  teeth: number;
  module: number;
  pressureAngleDeg: number;
  helixAngleDeg: number;
  hand?: Hand | null;
  profileShift: number;
  tipShortening?: number;
  faceWidth: number;
  rack?: { addendum: number; dedendum: number; tipRadius: number };
  /** Limits of the tooth-thickness allowance, mm, normal, at the reference circle, ≤ 0. */
  thicknessAllowance?: { upper: number; lower: number } | null;
  material?: string | null;
  /** kg/m³; steel, 7,850, when left out. */
  density?: number;
  heatTreatment?: string | null;
  /** ISO 1328 tolerance class. */
  accuracyGrade?: number | null;
  /** Left out: a pinion is cut on its shaft when the rim under the keyway would be thinner than two modules. */
  mounting?: 'keyed' | 'integral';
  figures?: KitGearFigures;
}

export interface KitShaft {
  /** From 0, the input. */
  index: number;
  /** mm */
  diameter: number;
  /** Span between the bearing faces, mm; seats and ends come on top when the shaft is drawn. */
  length: number;
  partNumber?: string | null;
  material?: string | null;
  /** kg/m³; steel, 7,850, when left out. */
  density?: number;
}

/** Outside of the housing and its wall, mm. */
export interface KitBox {
  length: number;
  width: number;
  height: number;
  wall: number;
  material?: string | null;
  /** kg/m³; aluminium, 2,700, when left out. */
  density?: number;
}

/** Everything the kit rules need to know of a train. */
export interface KitRequest {
  trainTitle: string;
  /** Operating centre distance of each stage, mm, in stage order; for the gear data. */
  centreDistances?: number[];
  gears: KitGear[];
  shafts: KitShaft[];
  box: KitBox;
  /** ISO 3448 grade; `ISO VG 220` when left out. */
  viscosityGrade?: string;
}
