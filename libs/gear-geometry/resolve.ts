import { degToRad } from '../units/index.js';
import { DEFAULT_TIP_RADIUS } from './limits.js';
import { type GearInput, type Rack, type ResolvedGear } from './types.js';

/**
 * Largest rounding (modules) that fits on the tip of a rack: there the two roundings of one tooth meet.
 * α in radians, dedendum in modules.
 */
export function largestTipRadius(alpha: number, dedendum: number): number {
  return ((Math.PI / 4 - dedendum * Math.tan(alpha)) * Math.cos(alpha)) / (1 - Math.sin(alpha));
}

/** Fills in the defaults (ISO 53 type A where it fits) and converts angles; checks nothing. */
export function resolveGear(input: GearInput): ResolvedGear {
  const alpha = degToRad(input.pressureAngleDeg ?? 20);
  const beta = degToRad(input.helixAngleDeg ?? 0);
  const alphaT = beta === 0 ? alpha : Math.atan(Math.tan(alpha) / Math.cos(beta));
  const shift = input.profileShift ?? 0;
  const upper = input.thicknessAllowance?.upper ?? 0;
  const lower = input.thicknessAllowance?.lower ?? 0;
  const mean = (upper + lower) / 2;
  return {
    teeth: input.teeth,
    module: input.module,
    alpha,
    alphaT,
    beta,
    // sin β_b = sin β cos α
    betaB: Math.asin(Math.sin(beta) * Math.cos(alpha)),
    hand: input.hand ?? null,
    shift,
    effectiveShift: shift + mean / (2 * input.module * Math.tan(alpha)),
    tipShortening: input.tipShortening ?? 0,
    faceWidth: input.faceWidth ?? null,
    rack: resolveRack(alpha, input.rack),
    allowance: { mean, upper, lower },
  };
}

/**
 * The rack that a gear gets when none is given: ISO 53 type A, in modules; the tip radius gives way where the flank
 * leaves no room. Pressure angle in degrees.
 */
export function standardRack(pressureAngleDeg: number): Rack {
  return resolveRack(degToRad(pressureAngleDeg));
}

function resolveRack(alpha: number, rack: Partial<Rack> = {}): Rack {
  const dedendum = rack.dedendum ?? 1.25;
  return {
    addendum: rack.addendum ?? 1,
    dedendum,
    tipRadius: rack.tipRadius ?? Math.max(0, Math.min(DEFAULT_TIP_RADIUS, largestTipRadius(alpha, dedendum))),
  };
}
