import { InputError, radToArcmin, radToDeg } from '../units/index.js';
import { FieldChecks, isRecord, plain } from './check-fields.js';
import { meshFindings } from './findings.js';
import { geometryOf } from './gear.js';
import { figuresOf } from './gear-radii.js';
import { involute } from './involute.js';
import { HOUSE_LIMITS, INPUT_LIMITS } from './limits.js';
import { zeroBacklashDistance } from './mesh-kernel.js';
import { checkPair } from './pair.js';
import { largestAllowance, pathOfContact } from './path-of-contact.js';
import { type MeshGeometry } from './results.js';
import { type GearInput, type Pair, type PairLimits, type ResolvedGear } from './types.js';

/** One pair. Give the distance (mm), or the allowance (modules beyond zero backlash), or neither. */
export interface MeshInput {
  pinion: GearInput;
  wheel: GearInput;
  /** mm */
  centreDistance?: number;
  /** Modules added to the zero-backlash distance. */
  allowance?: number;
  /** Default 1.2. */
  leastContactRatio?: number;
}

/**
 * Geometry of one mesh of parallel shafts (ISO 21771) with its findings. Throws an `InputError` for gears
 * that have no meaning or cannot mesh, and for a distance at which the base circles overlap.
 */
export function meshGeometry(input: MeshInput): MeshGeometry {
  const checks = new FieldChecks();
  const given: unknown = input;
  if (!isRecord(given)) {
    throw new InputError([{ field: 'mesh', value: given, message: 'Mesh: give a pinion and a wheel.' }]);
  }
  const gears = checkPair(input.pinion, input.wheel, checks);
  const { centreDistance, allowance, leastContactRatio } = input;
  checks.optionalNumber(
    'centreDistance',
    centreDistance,
    'Centre distance',
    INPUT_LIMITS.centreDistance,
    'mm',
  );
  checks.optionalNumber('allowance', allowance, 'Distance allowance', INPUT_LIMITS.allowance, 'modules');
  const ratioLabel = 'Least contact ratio';
  checks.optionalNumber('leastContactRatio', leastContactRatio, ratioLabel, INPUT_LIMITS.leastContactRatio);
  if (centreDistance !== undefined && allowance !== undefined) {
    const mend = 'is given together with a centre distance. Give one of them, or neither for zero backlash.';
    checks.refuse('allowance', allowance, 'Distance allowance', mend);
  }
  checks.finish();
  if (gears === null) throw new Error('A pair without issues must resolve.');
  const limits: PairLimits = {
    contactRatio: leastContactRatio ?? HOUSE_LIMITS.contactRatio,
    tipThickness: HOUSE_LIMITS.tipThickness,
  };
  return meshOf(pairOf(gears.pinion, gears.wheel), { centreDistance, allowance }, limits);
}

/** Joins two checked gears with their figures. */
export function pairOf(pinion: ResolvedGear, wheel: ResolvedGear): Pair {
  return { pinion, wheel, p: figuresOf(pinion), w: figuresOf(wheel) };
}

/** `meshGeometry` of a pair already checked. */
export function meshOf(
  pair: Pair,
  place: { centreDistance?: number; allowance?: number },
  limits: PairLimits,
): MeshGeometry {
  const { pinion, wheel, p, w } = pair;
  const m = pinion.module;
  const zeroBacklash = distanceWithoutBacklash(pair);
  const a = place.centreDistance ?? zeroBacklash + (place.allowance ?? 0) * m;
  const bases = p.base + w.base;
  if (a <= bases) refuseDistance(place, a, bases, zeroBacklash, m);

  // Operating pressure angle from cos α_w,op = (r_b1 + r_b2)/a and sin α_w,op = T1T2/a.
  const tangent = Math.sqrt((a - bases) * (a + bases));
  const alphaW = Math.atan2(tangent, bases);
  const contact = pathOfContact(p, w, a, tangent);
  const overlapRatio = overlap(pinion, wheel);
  const backlash = backlashAt(pair, a, alphaW);
  const mesh: MeshGeometry = {
    ratio: wheel.teeth / pinion.teeth,
    zeroBacklashCentreDistance: zeroBacklash,
    referenceCentreDistance: p.reference + w.reference,
    centreDistance: a,
    operatingPressureAngleDeg: radToDeg(alphaW),
    tangentPointDistance: tangent,
    ...contact,
    basePitch: p.basePitch,
    overlapRatio,
    totalContactRatio: overlapRatio === null ? null : contact.contactRatio + overlapRatio,
    ...backlash,
    tipClearancePinion: a - p.tip - w.root,
    tipClearanceWheel: a - w.tip - p.root,
    allowanceAtContactRatioOne: largestAllowance(p, w, zeroBacklash, 1),
    allowanceAtLeastContactRatio: largestAllowance(p, w, zeroBacklash, limits.contactRatio),
    specificSliding: null,
    meshLossFactor: null,
    gear: { pinion: geometryOf(pinion, p), wheel: geometryOf(wheel, w) },
    findings: [],
  };
  mesh.findings = meshFindings(pair, mesh, limits);
  return mesh;
}

/** a_0, or a refusal when the shifts are so negative that no distance is free of backlash. */
function distanceWithoutBacklash({ pinion, wheel }: Pair): number {
  const { teeth: z1, shift: x1, module: m, alpha, beta } = pinion;
  const distance = zeroBacklashDistance(z1, wheel.teeth, x1, wheel.shift, m, alpha, beta);
  if (distance > 0) return distance;
  // inv α_wt must stay positive.
  const least = (-involute(pinion.alphaT) * (z1 + wheel.teeth)) / (2 * Math.tan(alpha));
  const sum = x1 + wheel.shift;
  const message =
    sum < 0
      ? `Wheel, profile shift: together the shifts are ${plain(sum)}, so the teeth are too thin to meet without backlash at any distance. Keep the sum above ${plain(least)}.`
      : `Wheel, profile shift: together the shifts are ${plain(sum)}, so the teeth are too thick to meet at any distance. Use smaller shifts.`;
  const limit = sum < 0 ? { limit: least - x1 } : {};
  throw new InputError([{ field: 'wheel.profileShift', value: wheel.shift, ...limit, message }]);
}

function refuseDistance(
  place: { centreDistance?: number; allowance?: number },
  a: number,
  bases: number,
  zeroBacklash: number,
  m: number,
): never {
  const fix = `Zero backlash is at ${plain(zeroBacklash)} mm.`;
  if (place.centreDistance !== undefined) {
    const message = `Centre distance: ${plain(a)} mm is too small, the base circles would overlap. Use more than ${plain(bases)} mm. ${fix}`;
    throw new InputError([{ field: 'centreDistance', value: a, limit: bases, message }]);
  }
  const limit = (bases - zeroBacklash) / m;
  const value = place.allowance ?? 0;
  const message = `Distance allowance: ${plain(value)} modules brings the shafts to ${plain(a)} mm, the base circles would overlap. Use more than ${plain(limit)} modules. ${fix}`;
  throw new InputError([{ field: 'allowance', value, limit, message }]);
}

/** ε_β = b sin β/(π m) over the common face width; null when helical and no width is known. */
function overlap(pinion: ResolvedGear, wheel: ResolvedGear): number | null {
  if (pinion.beta === 0) return 0;
  const width = Math.min(pinion.faceWidth ?? Infinity, wheel.faceWidth ?? Infinity);
  return width === Infinity ? null : (width * Math.sin(pinion.beta)) / (Math.PI * pinion.module);
}

/**
 * j_wt = 2a (inv α_w,op − inv α_wt) + (|A_s1| + |A_s2|)/cos β · cos α_t/cos α_w,op, at the mean allowances;
 * j_bn = j_wt cos α_w,op cos β_b; at the wheel j_wt/r_w2.
 */
function backlashAt({ pinion, wheel }: Pair, a: number, alphaW: number) {
  const { alpha, alphaT, beta, betaB } = pinion;
  const teeth = pinion.teeth + wheel.teeth;
  const zero = involute(alphaT) + (2 * Math.tan(alpha) * (pinion.shift + wheel.shift)) / teeth;
  const thinning = -(pinion.allowance.mean + wheel.allowance.mean) / Math.cos(beta);
  const raw = 2 * a * (involute(alphaW) - zero) + (thinning * Math.cos(alphaT)) / Math.cos(alphaW);
  // At the zero-backlash distance only rounding is left.
  const circumferential = Math.abs(raw) < 1e-13 * a ? 0 : raw;
  return {
    normalBacklash: circumferential * Math.cos(alphaW) * Math.cos(betaB),
    circumferentialBacklash: circumferential,
    angularBacklashArcmin: radToArcmin((circumferential * teeth) / (a * wheel.teeth)),
  };
}
