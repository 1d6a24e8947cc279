/**
 * Figures of one gear. Lengths in mm, shifts in modules, angles in degrees; `calc-api` names.
 * `rootDiameter`, `formDiameter` and `undercut` are of the tooth as cut (shift x_E at the mean thickness
 * allowance); `tipThickness`, `toothThickness`, chordal and span figures are nominal, normal section.
 */
export interface GearGeometry {
  referenceDiameter: number;
  baseDiameter: number;
  tipDiameter: number;
  rootDiameter: number;
  /** Where the usable involute begins, d_F. */
  formDiameter: number;
  undercut: boolean;
  leastShiftWithoutUndercut: number;
  tipThickness: number;
  toothThickness: number;
  /** Transverse base pitch p_bt. */
  basePitch: number;
  spanTeeth: number;
  /** Base tangent length W over `spanTeeth`. */
  spanLength: number;
  /** Generating shift x_E. */
  effectiveShift: number;
  transverseModule: number;
  transversePressureAngleDeg: number;
  baseHelixAngleDeg: number;
  /** Axial pitch p_x; null for a spur gear. */
  axialPitch: number | null;
  toothDepth: number;
  /** Chord of the nominal tooth thickness and its height below the tip circle. */
  chordalThickness: number;
  chordalHeight: number;
}

export type Severity = 'fail' | 'marginal' | 'note';

/** One judgement on a pair. `value` and `limit` share the unit that the message names. */
export interface Finding {
  code: string;
  severity: Severity;
  message: string;
  value?: number;
  limit?: number;
}

/** Figures of one pair at its operating distance. Lengths in mm; `calc-api` names. */
export interface MeshGeometry {
  /** Wheel teeth ÷ pinion teeth. */
  ratio: number;
  zeroBacklashCentreDistance: number;
  referenceCentreDistance: number;
  centreDistance: number;
  operatingPressureAngleDeg: number;
  /** T1T2, the common tangent of the base circles. */
  tangentPointDistance: number;
  /** A–C and C–E on the path of contact; either may be negative. */
  approachLength: number;
  recessLength: number;
  pathOfContact: number;
  basePitch: number;
  /** ε_α, undercut included; 0 without contact. */
  contactRatio: number;
  /** The textbook value, unclamped. */
  contactRatioIgnoringUndercut: number;
  /** Why the textbook value does not hold for this pair; null where it does. */
  contactRatioLimitedBy: string | null;
  /** ε_β; null for a helical pair without a face width. */
  overlapRatio: number | null;
  totalContactRatio: number | null;
  /** At the mean thickness allowances; negative means the teeth jam. */
  normalBacklash: number;
  circumferentialBacklash: number;
  /** At the wheel, the pinion held. */
  angularBacklashArcmin: number;
  /** a − r_a1 − r_f2. */
  tipClearancePinion: number;
  tipClearanceWheel: number;
  /** Largest distance allowance (modules beyond the zero-backlash distance) that still has a ratio of 1. */
  allowanceAtContactRatioOne: number | null;
  allowanceAtLeastContactRatio: number | null;
  specificSliding: { pinionRoot: number | null; wheelRoot: number | null } | null;
  meshLossFactor: number | null;
  gear: { pinion: GearGeometry; wheel: GearGeometry };
  findings: Finding[];
}
