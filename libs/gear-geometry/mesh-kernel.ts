import { inverseInvolute, involute } from './involute.js';
import { type GearRadii } from './types.js';

/**
 * Transverse contact ratio ε_α of two gears at the distance `a`, undercut included; 0 when there is no
 * contact or the base circles overlap. All lengths in mm. No checks and no allocation: it runs in the
 * innermost loop of the option search.
 */
export function meshKernel(pinion: GearRadii, wheel: GearRadii, a: number, basePitch: number): number {
  const bases = pinion.base + wheel.base;
  const square = a * a - bases * bases;
  if (!(square > 0)) return 0;
  // T1T2, the length of the common tangent of the base circles.
  const tangent = Math.sqrt(square);
  const e1 = pinion.tipReach;
  const e2 = wheel.tipReach;
  const c1 = pinion.formReach;
  const c2 = wheel.formReach;
  let path = e1 + e2 - tangent;
  if (e1 - c1 < path) path = e1 - c1;
  if (e2 - c2 < path) path = e2 - c2;
  if (tangent - c1 - c2 < path) path = tangent - c1 - c2;
  return path > 0 ? path / basePitch : 0;
}

/**
 * Centre distance a_0 (mm) at which the pair meshes without backlash (ISO 21771:
 * inv α_wt = inv α_t + 2 tan α (x1 + x2)/(z1 + z2)); 0 when no such distance exists.
 * Angles in radians, shifts in modules, nothing is checked.
 */
export function zeroBacklashDistance(
  z1: number,
  z2: number,
  x1: number,
  x2: number,
  m: number,
  alphaRad: number,
  betaRad: number,
): number {
  const cosBeta = Math.cos(betaRad);
  const referenceDistance = (m * (z1 + z2)) / cosBeta / 2;
  if (x1 + x2 === 0) return referenceDistance;
  const alphaT = betaRad === 0 ? alphaRad : Math.atan(Math.tan(alphaRad) / cosBeta);
  const alphaW = inverseInvolute(involute(alphaT) + (2 * Math.tan(alphaRad) * (x1 + x2)) / (z1 + z2));
  return alphaW > 0 ? (referenceDistance * Math.cos(alphaT)) / Math.cos(alphaW) : 0;
}

/**
 * Sum of the profile shifts (modules) that makes `a` (mm) the zero-backlash distance, the inverse of
 * `zeroBacklashDistance`. Angles in radians; `a` must exceed the sum of the base radii; nothing is checked.
 */
export function shiftSumForDistance(
  z1: number,
  z2: number,
  a: number,
  m: number,
  alphaRad: number,
  betaRad: number,
): number {
  const cosBeta = Math.cos(betaRad);
  const alphaT = betaRad === 0 ? alphaRad : Math.atan(Math.tan(alphaRad) / cosBeta);
  const alphaW = Math.acos((m * (z1 + z2) * Math.cos(alphaT)) / (2 * cosBeta * a));
  return ((z1 + z2) * (involute(alphaW) - involute(alphaT))) / (2 * Math.tan(alphaRad));
}
