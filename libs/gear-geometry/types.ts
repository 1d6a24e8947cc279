/** Basic rack proportions in modules (ISO 53: h_aP, h_fP, ρ_fP). */
export interface Rack {
  addendum: number;
  dedendum: number;
  tipRadius: number;
}

/** Limits of the tooth-thickness allowance in mm, normal section, at the reference circle; both ≤ 0. */
export interface ThicknessAllowance {
  upper: number;
  lower: number;
}

/** One external involute gear as the designer states it. */
export interface GearInput {
  /** Whole number, at least 4. */
  teeth: number;
  /** Normal module, mm. */
  module: number;
  /** Normal pressure angle in degrees, default 20; one of the angles in `PRESSURE_ANGLES_DEG`. */
  pressureAngleDeg?: number;
  /** Helix angle at the reference circle, degrees, 0 to 45, default 0. */
  helixAngleDeg?: number;
  hand?: 'left' | 'right';
  /** Profile shift coefficient x, modules, default 0. */
  profileShift?: number;
  /** Tip shortening coefficient k, modules, default 0; positive makes the tip circle smaller. */
  tipShortening?: number;
  /** mm */
  faceWidth?: number;
  rack?: Partial<Rack>;
  thicknessAllowance?: ThicknessAllowance;
}

/**
 * A gear with every default filled in and angles in radians; lengths in mm, coefficients in modules.
 * Only `checkedGear` and `resolveGear` make one.
 */
export interface ResolvedGear {
  teeth: number;
  module: number;
  /** Normal pressure angle α. */
  alpha: number;
  /** Transverse pressure angle α_t. */
  alphaT: number;
  /** Helix angle β at the reference circle. */
  beta: number;
  /** Base helix angle β_b. */
  betaB: number;
  hand: 'left' | 'right' | null;
  /** Nominal shift x. */
  shift: number;
  /** Generating shift x_E = x + A_s/(2 m tan α) at the mean thickness allowance. */
  effectiveShift: number;
  tipShortening: number;
  faceWidth: number | null;
  rack: Rack;
  /** Mean, upper and lower thickness allowance A_s, mm; zero when none is given. */
  allowance: { mean: number; upper: number; lower: number };
}

/** The radii (mm) that decide how a gear meshes. */
export interface GearRadii {
  base: number;
  tip: number;
  root: number;
  /** Where the usable involute begins, r_F. */
  form: number;
  /** e = √(r_a² − r_b²), the length of the base tangent to the tip circle. */
  tipReach: number;
  /** c = √(r_F² − r_b²), the length of the base tangent to the form circle. */
  formReach: number;
}

/**
 * The tip of the generating rack as it sweeps the root, in the transverse section, mm: what is needed to
 * follow the trochoid (see `trochoid.ts`).
 */
export interface RackTip {
  base: number;
  reference: number;
  /** Normal pressure angle, radians. */
  alpha: number;
  sinAlphaT: number;
  cosAlphaT: number;
  cosBeta: number;
  radius: number;
  /** Height of the end of the straight flank above the rolling line, mm (negative: below it). */
  endHeight: number;
  /** Signed base-tangent length of the point cut by the end of the straight flank; negative when undercut. */
  endReach: number;
}

/** `GearRadii` with what the planner asks about one gear. */
export interface GearFigures extends GearRadii {
  teeth: number;
  module: number;
  reference: number;
  /** Transverse base pitch p_bt, mm. */
  basePitch: number;
  /** Normal tooth thickness at the tip circle, mm, without allowance; ≤ 0 means pointed. */
  tipThickness: number;
  undercut: boolean;
  /** Least shift without undercut x_min, modules. */
  leastShift: number;
  rackTip: RackTip;
  /** Angle on the rack's rounding where the fillet gives way to the involute, radians from the flank's end. */
  filletEnd: number;
}

/** Limits on a pair that a brief may set apart from the house rules. */
export interface PairLimits {
  contactRatio: number;
  /** Normal tip thickness, modules. */
  tipThickness: number;
}

/** Two checked gears with their figures. */
export interface Pair {
  pinion: ResolvedGear;
  wheel: ResolvedGear;
  p: GearFigures;
  w: GearFigures;
}
