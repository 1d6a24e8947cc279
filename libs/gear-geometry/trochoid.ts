import { involuteOfTangent } from './involute.js';
import { type RackTip } from './types.js';

/*
 * The fillet that the rounded tip of the rack leaves on the tooth.
 *
 * ε ≥ 0 is the angle on the rounding measured from where it leaves the straight flank (in the normal section;
 * a helical gear's transverse section stretches the circle into an ellipse with the same parameter).
 * The point cut at ε is written in the frame whose origin is the base tangent point T, one axis along the
 * line of action towards the pitch point (p), the other radial (q). Everything is expressed through ε and
 * the signed end reach, so that no digits cancel at the onset of undercut, where p, √ε and the form reach
 * all shrink in proportion to the missing shift.
 */

/** Component along the line of action, mm. */
export function filletAlong(tip: RackTip, eps: number): number {
  const rise = heightRise(tip, eps);
  return tip.endReach + rise / tip.sinAlphaT - (tip.endHeight + rise) * slopeChange(tip, eps) * tip.cosAlphaT;
}

/** Component along the radius through the base tangent point, measured from the base circle, mm. */
export function filletAcross(tip: RackTip, eps: number): number {
  return (tip.endHeight + heightRise(tip, eps)) * tip.sinAlphaT * slopeChange(tip, eps);
}

/** Square of the length of the tangent from the fillet point to the base circle, mm²; negative inside it. */
export function filletReachSquared(tip: RackTip, eps: number): number {
  const p = filletAlong(tip, eps);
  const q = filletAcross(tip, eps);
  return p * p + q * (2 * tip.base + q);
}

/** Radius of the fillet point from the gear's axis, mm. */
export function filletRadius(tip: RackTip, eps: number): number {
  return Math.hypot(tip.base + filletAcross(tip, eps), filletAlong(tip, eps));
}

/**
 * Polar angle of the fillet point from the origin of the involute on the base circle, radians, positive into
 * the tooth. An involute point whose tangent length is T has the angle T/r_b − atan(T/r_b).
 */
export function filletTurn(tip: RackTip, eps: number): number {
  const p = filletAlong(tip, eps);
  const q = filletAcross(tip, eps);
  const half = Math.sin(eps / 2);
  const offFlank = (-2 * tip.radius * half * half) / (tip.reference * tip.cosBeta * Math.cos(tip.alpha));
  const radial = tip.base + q;
  return offFlank + (p * q) / (tip.base * radial) + involuteOfTangent(p / radial);
}

/** How far the rounding's point lies above the end of the straight flank, mm (never positive). */
function heightRise(tip: RackTip, eps: number): number {
  return -2 * tip.radius * Math.cos(tip.alpha + eps / 2) * Math.sin(eps / 2);
}

/** cos β (cot α − cot(α + ε)): how much the normal has turned, as a slope. */
function slopeChange(tip: RackTip, eps: number): number {
  return (tip.cosBeta * Math.sin(eps)) / (Math.sin(tip.alpha) * Math.sin(tip.alpha + eps));
}

/** ε at the deepest point of the rounding. */
export function deepestEps(tip: RackTip): number {
  return Math.PI / 2 - tip.alpha;
}

/** ε where the fillet reaches the base circle; the gear must be undercut. */
function epsAtBaseCircle(tip: RackTip): number {
  let high = deepestEps(tip);
  // Near the onset ε falls with the square of the missing shift, so shrink the bracket by factors first.
  while (high > 1e-300 && filletReachSquared(tip, high / 4) < 0) high /= 4;
  let low = high / 4;
  for (let step = 0; step < 50; step++) {
    const mid = (low + high) / 2;
    if (filletReachSquared(tip, mid) < 0) high = mid;
    else low = mid;
  }
  return low;
}

/**
 * ε where the fillet gives way to the involute: at the end of the straight flank (0), or, undercut, where the
 * trochoid of the rack's tip rounding crosses the involute.
 */
export function filletEndEps(tip: RackTip, undercut: boolean): number {
  if (!undercut) return 0;
  let low = 0;
  let high = epsAtBaseCircle(tip);
  for (let step = 0; step < 60; step++) {
    const mid = (low + high) / 2;
    if (mid === low || mid === high) break;
    const reach = Math.sqrt(Math.max(0, filletReachSquared(tip, mid)));
    if (filletTurn(tip, mid) < involuteOfTangent(reach / tip.base)) low = mid;
    else high = mid;
  }
  return (low + high) / 2;
}

/** c = √(r_F² − r_b²) in mm, the tangent length at the ε where the usable involute begins. */
export function formReach(tip: RackTip, endEps: number): number {
  if (endEps === 0) return Math.max(0, tip.endReach);
  return Math.sqrt(Math.max(0, filletReachSquared(tip, endEps)));
}
