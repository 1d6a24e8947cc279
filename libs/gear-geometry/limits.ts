/** Normal pressure angles that the team's cutters exist for, in degrees. */
export const PRESSURE_ANGLES_DEG: readonly number[] = [14.5, 15, 17.5, 20, 22.5, 25];

/** Bounds outside which an input has no meaning for a machine gear. Lengths in mm, shifts in modules. */
export const INPUT_LIMITS = {
  teeth: { min: 4, max: 10_000 },
  module: { above: 0, max: 100 },
  helixAngleDeg: { min: 0, max: 45 },
  profileShift: { min: -5, max: 5 },
  tipShortening: { min: -0.5, max: 1 },
  faceWidth: { above: 0, max: 5_000 },
  addendum: { above: 0, max: 2.5 },
  dedendum: { above: 0, max: 3 },
  centreDistance: { above: 0, max: 1_000_000 },
  allowance: { min: -5, max: 10 },
  leastContactRatio: { min: 0, max: 5 },
  leastTipThickness: { min: 0, max: 2 },
  pinDiameter: { above: 0, max: 1_000 },
} as const;

/** Below this (mm) a module has no meaning, though it is above 0. */
export const LEAST_MODULE = 1e-6;

/** The team's own limits on a pair, in modules where not a ratio. */
export const HOUSE_LIMITS = {
  contactRatio: 1.2,
  tipThickness: 0.2,
  tipThicknessCaseHardened: 0.4,
  tipClearance: 0.12,
} as const;

/** Shift below the least one by less than this (modules) does not count as undercut. */
export const UNDERCUT_SLACK = 1e-9;

/** Lengths along the path of contact closer than this (modules) count as equal when judging interference. */
export const INTERFERENCE_SLACK = 1e-6;

/** How deep (modules) a mate's tip corner may run into a cut tooth before it counts as interference. */
export const CORNER_BITE_LIMIT = 1e-3;

/** Default basic rack tip radius in modules, where the rack has room for it (ISO 53, type A). */
export const DEFAULT_TIP_RADIUS = 0.38;
