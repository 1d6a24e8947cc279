import { meshKernel } from './mesh-kernel.js';
import { type GearFigures } from './types.js';

/** The path of contact, lengths in mm. */
export interface PathOfContact {
  approachLength: number;
  recessLength: number;
  pathOfContact: number;
  contactRatio: number;
  contactRatioIgnoringUndercut: number;
  contactRatioLimitedBy: string | null;
}

/**
 * The path of contact A–E measured from T1, with the pitch point C, at the distance `a`
 * with the common tangent T1T2 (mm):
 * A = max(T12 − e2, c1, 0), E = min(e1, T12 − c2, T12), C = T12 r_b1/(r_b1 + r_b2).
 */
export function pathOfContact(p: GearFigures, w: GearFigures, a: number, tangent: number): PathOfContact {
  const start = Math.max(tangent - w.tipReach, p.formReach, 0);
  const end = Math.min(p.tipReach, tangent - w.formReach, tangent);
  const pitchPoint = (tangent * p.base) / (p.base + w.base);
  const length = Math.max(0, end - start);
  return {
    approachLength: pitchPoint - start,
    recessLength: end - pitchPoint,
    pathOfContact: length,
    contactRatio: meshKernel(p, w, a, p.basePitch),
    contactRatioIgnoringUndercut: (p.tipReach + w.tipReach - tangent) / p.basePitch,
    contactRatioLimitedBy: limitedBy(p, w, tangent),
  };
}

/** Why the path between the two tip circles is not all usable, in words; null when it is. */
function limitedBy(p: GearFigures, w: GearFigures, tangent: number): string | null {
  const slack = 1e-12 * tangent;
  if (p.tipReach + w.tipReach < tangent)
    return 'The tip circles do not reach each other on the line of action.';
  const pinionShort = tangent - w.tipReach < p.formReach - slack;
  const wheelShort = tangent - p.tipReach < w.formReach - slack;
  if (!pinionShort && !wheelShort) return null;
  const cause = (gear: GearFigures) => (gear.undercut ? 'undercut has removed' : 'the fillet takes up');
  const reasons = [
    ...(pinionShort ? [`${cause(p)} the part of the pinion's flank that the wheel's tip should meet`] : []),
    ...(wheelShort ? [`${cause(w)} the part of the wheel's flank that the pinion's tip should meet`] : []),
  ];
  const text = reasons.join(', and ');
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
}

/**
 * Largest allowance δ (modules beyond the zero-backlash distance, may be negative) at which the contact ratio
 * is still `ratio`; null where the ends of the path are not both set by the tip circles, or when undercut
 * keeps the ratio out of reach.
 */
export function largestAllowance(
  p: GearFigures,
  w: GearFigures,
  zeroBacklash: number,
  ratio: number,
): number | null {
  const wanted = ratio * p.basePitch;
  const tangent = p.tipReach + w.tipReach - wanted;
  const least = wanted * (1 - 1e-12);
  const reachable =
    p.tipReach - p.formReach >= least &&
    w.tipReach - w.formReach >= least &&
    tangent - p.formReach - w.formReach >= least;
  return reachable ? (Math.hypot(tangent, p.base + w.base) - zeroBacklash) / p.module : null;
}
