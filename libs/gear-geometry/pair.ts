import { radToDeg } from '../units/index.js';
import { FieldChecks, plain } from './check-fields.js';
import { checkGear } from './check-gear.js';
import { INPUT_LIMITS } from './limits.js';
import { type GearInput, type ResolvedGear } from './types.js';

/** How often the same two teeth meet. */
export interface HuntingTooth {
  /** True when every pinion tooth meets every wheel tooth before any meeting repeats. */
  hunting: boolean;
  /** Pinion turns until the same two teeth meet again: wheel teeth ÷ greatest common divisor. */
  repeatsAfterPinionTurns: number;
}

/** Hunting-tooth check of two tooth numbers (whole, ≥ 1). */
export function huntingTooth(pinionTeeth: number, wheelTeeth: number): HuntingTooth {
  const checks = new FieldChecks();
  for (const [field, teeth, label] of [
    ['pinionTeeth', pinionTeeth, 'Pinion, number of teeth'],
    ['wheelTeeth', wheelTeeth, 'Wheel, number of teeth'],
  ] as const) {
    const bounds = { min: 1, max: INPUT_LIMITS.teeth.max };
    if (checks.number(field, teeth, label, bounds) && !Number.isInteger(teeth)) {
      checks.refuse(field, teeth, label, 'is not a whole number. Enter a whole number.', 'whole number');
    }
  }
  checks.finish();
  const divisor = greatestCommonDivisor(pinionTeeth, wheelTeeth);
  return { hunting: divisor === 1, repeatsAfterPinionTurns: wheelTeeth / divisor };
}

function greatestCommonDivisor(a: number, b: number): number {
  return b === 0 ? a : greatestCommonDivisor(b, a % b);
}

/**
 * Checks both gears and that they can mesh: same module, pressure angle, helix angle and rack, opposite hands.
 * Throws an `InputError` naming the wheel's fields that do not match the pinion's.
 */
export function assertMeshable(pinion: GearInput, wheel: GearInput): void {
  const checks = new FieldChecks();
  checkPair(pinion, wheel, checks);
  checks.finish();
}

/** The two checked gears, or null with every fault added to `checks`. */
export function checkPair(
  pinionInput: unknown,
  wheelInput: unknown,
  checks: FieldChecks,
): { pinion: ResolvedGear; wheel: ResolvedGear } | null {
  const pinion = checkGear(pinionInput, 'pinion', checks);
  const wheel = checkGear(wheelInput, 'wheel', checks);
  if (pinion === null || wheel === null) return null;
  const before = checks.issues.length;
  checkMatch(pinion, wheel, checks);
  return checks.issues.length > before ? null : { pinion, wheel };
}

function checkMatch(pinion: ResolvedGear, wheel: ResolvedGear, checks: FieldChecks): void {
  const degrees = (radians: number) => Number(radToDeg(radians).toPrecision(12));
  const pairs = [
    ['wheel.module', 'module', pinion.module, wheel.module, ' mm'],
    ['wheel.pressureAngleDeg', 'pressure angle', degrees(pinion.alpha), degrees(wheel.alpha), '°'],
    ['wheel.helixAngleDeg', 'helix angle', degrees(pinion.beta), degrees(wheel.beta), '°'],
    ['wheel.rack.addendum', 'rack addendum', pinion.rack.addendum, wheel.rack.addendum, ''],
    ['wheel.rack.dedendum', 'rack dedendum', pinion.rack.dedendum, wheel.rack.dedendum, ''],
    ['wheel.rack.tipRadius', 'rack tip radius', pinion.rack.tipRadius, wheel.rack.tipRadius, ''],
  ] as const;
  for (const [field, name, wanted, given, unit] of pairs) {
    if (Math.abs(given - wanted) <= 1e-9 * Math.max(1, wanted)) continue;
    const mend = `does not match the pinion's ${plain(wanted)}${unit}. Two gears mesh only with the same ${name}.`;
    checks.refuse(field, given, `Wheel, ${name}`, mend, wanted);
  }
  if (pinion.beta > 0 && pinion.hand !== null && pinion.hand === wheel.hand) {
    const other = pinion.hand === 'left' ? 'right' : 'left';
    const mend = `is the pinion's hand too. On parallel shafts the hands are opposite: choose ${other}.`;
    checks.refuse('wheel.hand', wheel.hand, 'Wheel, hand', mend, other);
  }
}
