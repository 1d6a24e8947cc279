import { InputError } from '../units/index.js';
import { FieldChecks, isRecord, plain } from './check-fields.js';
import { figuresOf } from './gear-radii.js';
import { HOUSE_LIMITS, INPUT_LIMITS, UNDERCUT_SLACK } from './limits.js';
import { meshOf, pairOf } from './mesh.js';
import { checkPair } from './pair.js';
import { resolveGear } from './resolve.js';
import { type MeshGeometry } from './results.js';
import { type GearInput, type ResolvedGear } from './types.js';

/** Shift policies that can be asked for. */
export const SHIFT_POLICIES = ['none', 'clear-undercut'] as const;
export type ShiftPolicy = (typeof SHIFT_POLICIES)[number];

export interface ShiftInput {
  pinion: GearInput;
  wheel: GearInput;
  policy: ShiftPolicy;
  /** True: the shifts cancel out, so that the pair keeps its reference centre distance. */
  keepReferenceDistance?: boolean;
  /** Normal tip thickness below which the findings object, modules; default 0.2. */
  leastTipThickness?: number;
}

/** The shifts (modules, multiples of 1e-4) and the mesh at the zero-backlash distance. */
export interface ShiftResult {
  pinionShift: number;
  wheelShift: number;
  mesh: MeshGeometry;
}

/**
 * Profile shifts by a policy; shifts given with the gears are ignored. `none` leaves both at 0;
 * `clear-undercut` takes the least shift, rounded up to 1e-4, that leaves no undercut.
 * Refuses a pair for which the policy has no answer, naming the field.
 */
export function shiftForPolicy(input: ShiftInput): ShiftResult {
  const checks = new FieldChecks();
  const given: unknown = input;
  if (!isRecord(given)) {
    throw new InputError([
      { field: 'shift', value: given, message: 'Shift: give a pinion, a wheel and a policy.' },
    ]);
  }
  const gears = checkPair(withoutShift(input.pinion), withoutShift(input.wheel), checks);
  checkOptions(given, checks);
  checks.finish();
  if (gears === null) throw new Error('A pair without issues must resolve.');
  const shifts =
    input.policy === 'none'
      ? { x1: 0, x2: 0 }
      : clearUndercut(gears.pinion, gears.wheel, input.keepReferenceDistance === true);
  return withShifts(input, shifts.x1, shifts.x2);
}

/**
 * The least shift, a multiple of 1e-4 and not negative, at which a gear as cut is free of undercut; the shift
 * given with the gear is ignored. Checks nothing.
 */
export function leastClearShift(input: GearInput): number {
  return clearShiftOf(resolveGear(input));
}

function clearShiftOf(gear: ResolvedGear): number {
  return Math.max(0, roundUp(neededShift(gear)));
}

/** x_min, and more by as much as a thickness allowance draws the cutter in. */
function neededShift(gear: ResolvedGear): number {
  return figuresOf(gear).leastShift + (gear.shift - gear.effectiveShift);
}

/** Up to the next multiple of 1e-4; within the slack of the undercut rule a multiple counts as reached. */
function roundUp(shift: number): number {
  return Math.ceil((shift - UNDERCUT_SLACK / 2) * 1e4) / 1e4;
}

function clearUndercut(pinion: ResolvedGear, wheel: ResolvedGear, keepDistance: boolean) {
  const x1 = clearShiftOf(pinion);
  if (!keepDistance) return { x1, x2: clearShiftOf(wheel) };
  const x2 = x1 === 0 ? 0 : -x1;
  const needed = neededShift(wheel);
  if (x2 < needed - UNDERCUT_SLACK) {
    const message = `Keep reference distance: the pinion's shift ${plain(x1)} would give the wheel ${plain(x2)}, but the wheel's ${wheel.teeth} teeth need at least ${plain(roundUp(needed))} to be free of undercut. Let the distance change or use more teeth.`;
    throw new InputError([{ field: 'keepReferenceDistance', value: true, limit: needed, message }]);
  }
  return { x1, x2 };
}

function withShifts(input: ShiftInput, x1: number, x2: number): ShiftResult {
  const checks = new FieldChecks();
  const pinion: GearInput = { ...input.pinion, profileShift: x1 };
  const wheel: GearInput = { ...input.wheel, profileShift: x2 };
  const gears = checkPair(pinion, wheel, checks);
  if (gears === null) {
    const reasons = checks.issues.map((issue) => ({
      ...issue,
      message: `The policy needs this shift, but it cannot be cut. ${issue.message}`,
    }));
    throw new InputError(reasons);
  }
  const limits = {
    contactRatio: HOUSE_LIMITS.contactRatio,
    tipThickness: input.leastTipThickness ?? HOUSE_LIMITS.tipThickness,
  };
  const mesh = meshOf(pairOf(gears.pinion, gears.wheel), {}, limits);
  return { pinionShift: x1, wheelShift: x2, mesh };
}

function withoutShift(gear: unknown): unknown {
  return isRecord(gear) ? { ...gear, profileShift: 0 } : gear;
}

function checkOptions(input: Record<string, unknown>, checks: FieldChecks): void {
  const policy = input.policy;
  if (!SHIFT_POLICIES.some((known) => known === policy)) {
    const list = SHIFT_POLICIES.join(', ');
    checks.refuse('policy', policy, 'Shift policy', `is not available. Choose one of ${list}.`, list);
  }
  const keep = input.keepReferenceDistance;
  if (keep !== undefined && typeof keep !== 'boolean') {
    const mend = 'is neither true nor false.';
    checks.refuse('keepReferenceDistance', keep, 'Keep reference distance', mend, 'true or false');
  }
  const label = 'Least tip thickness';
  const bounds = INPUT_LIMITS.leastTipThickness;
  checks.optionalNumber('leastTipThickness', input.leastTipThickness, label, bounds, 'modules');
}
