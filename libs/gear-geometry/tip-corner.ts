import { involuteOfTangent } from './involute.js';
import { CORNER_BITE_LIMIT, INTERFERENCE_SLACK } from './limits.js';
import { deepestEps, filletRadius, filletTurn } from './trochoid.js';
import { type GearFigures, type RackTip } from './types.js';

/** How one gear's root takes the mate's tip. */
export type RootVerdict = 'clear' | 'contact-lost' | 'interference';

/**
 * Whether the mate's tip runs clear of a gear's root at the distance `a` (mm), both flanks in driving contact.
 * - `interference`: the tip reaches below the form circle of a gear that is not undercut, or bites into the
 *   cut tooth of an undercut one by more than 0.001 module;
 * - `contact-lost`: the tip passes through the hollow that undercut left, without touching.
 */
export function rootVerdict(gear: GearFigures, mate: GearFigures, a: number): RootVerdict {
  const bases = gear.base + mate.base;
  const lowestContact = Math.sqrt(Math.max(0, a * a - bases * bases)) - mate.tipReach;
  if (!gear.undercut) {
    return lowestContact < gear.formReach - INTERFERENCE_SLACK * gear.module ? 'interference' : 'clear';
  }
  if (lowestContact >= gear.formReach) return 'clear';
  return cornerBite(gear, mate, a) > CORNER_BITE_LIMIT * gear.module ? 'interference' : 'contact-lost';
}

/** Whether either gear's tip runs into the other's root at the distance `a`; the verdict of the findings. */
export function meshInterferes(pinion: GearFigures, wheel: GearFigures, a: number): boolean {
  return rootVerdict(pinion, wheel, a) === 'interference' || rootVerdict(wheel, pinion, a) === 'interference';
}

/**
 * Greatest depth in mm, normal to the profile, by which the mate's tip corner enters the tooth as cut while
 * it is carried from the tip circle to the line of centres; negative when it stays clear.
 */
export function cornerBite(gear: GearFigures, mate: GearFigures, a: number): number {
  const path = cornerPath(gear, mate, a);
  const tip = gear.rackTip;
  const onFillet = greatest(gear.filletEnd, deepestEps(tip), (eps) => filletBite(path, tip, eps));
  const lowest = Math.max(gear.form, path.closest);
  if (lowest >= gear.tip) return onFillet;
  const onInvolute = greatest(lowest, gear.tip, (radius) => involuteBite(path, gear.base, radius));
  return Math.max(onFillet, onInvolute);
}

/** What fixes the path of the mate's tip corner in the gear's own frame. */
interface CornerPath {
  a: number;
  base: number;
  mateBase: number;
  mateTip: number;
  /** Least distance of the corner from the gear's axis. */
  closest: number;
  /** Operating pressure angle. */
  alphaW: number;
  /** Where the corner lies on the line of action, from T1, and its angle from the line of centres there. */
  contactAt: number;
  contactAngle: number;
}

function cornerPath(gear: GearFigures, mate: GearFigures, a: number): CornerPath {
  const bases = gear.base + mate.base;
  const tangent = Math.sqrt(Math.max(0, a * a - bases * bases));
  const alphaW = Math.atan2(tangent, bases);
  return {
    a,
    base: gear.base,
    mateBase: mate.base,
    mateTip: mate.tip,
    closest: a - mate.tip,
    alphaW,
    contactAt: tangent - mate.tipReach,
    contactAngle: Math.atan2(mate.tipReach, mate.base) - alphaW,
  };
}

/**
 * Polar angle of the corner from the origin of the gear's involute, into the tooth, when the corner is at
 * `radius` from the gear's axis and still before the line of centres; −∞ where it never comes.
 */
function cornerTurn(path: CornerPath, radius: number): number {
  const cosine =
    (path.a * path.a + path.mateTip * path.mateTip - radius * radius) / (2 * path.a * path.mateTip);
  if (cosine > 1 || cosine < -1) return Number.NEGATIVE_INFINITY;
  // Angle at the mate's axis between the line of centres and the corner.
  const gamma = Math.acos(cosine);
  // Roll of the pair, as a length on the base circles, zero where the flanks would touch at T1.
  const roll = path.contactAt + path.mateBase * (path.contactAngle - gamma);
  const fromCentreLine = Math.atan2(path.mateTip * Math.sin(gamma), path.a - path.mateTip * cosine);
  return roll / path.base - (path.alphaW - fromCentreLine);
}

function filletBite(path: CornerPath, tip: RackTip, eps: number): number {
  const turn = cornerTurn(path, filletRadius(tip, eps)) - filletTurn(tip, eps);
  // At the deepest point the cosine may round to just below zero, which would turn the sign.
  const along = tip.cosBeta * Math.max(0, Math.cos(tip.alpha + eps));
  const across = Math.sin(tip.alpha + eps);
  if (along === 0 || turn === Number.NEGATIVE_INFINITY) return Number.NEGATIVE_INFINITY;
  // The normal of the fillet passes the pitch point, so its lever about the axis is r times its slope.
  return (turn * tip.reference * along) / Math.hypot(along, across);
}

function involuteBite(path: CornerPath, base: number, radius: number): number {
  const reach = Math.sqrt(Math.max(0, (radius - base) * (radius + base)));
  return (cornerTurn(path, radius) - involuteOfTangent(reach / base)) * base;
}

const SAMPLES = 24;

/** Greatest value of a smooth function on an interval: samples, then golden section around the best one. */
function greatest(low: number, high: number, value: (at: number) => number): number {
  const step = (high - low) / SAMPLES;
  let best = low;
  let bestValue = value(low);
  for (let i = 1; i <= SAMPLES; i++) {
    const found = value(low + i * step);
    if (found > bestValue) {
      bestValue = found;
      best = low + i * step;
    }
  }
  let left = Math.max(low, best - step);
  let right = Math.min(high, best + step);
  for (let i = 0; i < 24; i++) {
    const third = (right - left) * 0.381966;
    const a = value(left + third);
    const b = value(right - third);
    bestValue = Math.max(bestValue, a, b);
    if (a > b) right -= third;
    else left += third;
  }
  return bestValue;
}
