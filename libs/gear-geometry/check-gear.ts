import { FieldChecks, isRecord, plain } from './check-fields.js';
import { figuresOf, thicknessAt } from './gear-radii.js';
import { INPUT_LIMITS, LEAST_MODULE, PRESSURE_ANGLES_DEG } from './limits.js';
import { largestTipRadius, resolveGear } from './resolve.js';
import { type GearInput, type ResolvedGear } from './types.js';
import { degToRad } from '../units/index.js';

/**
 * Checks one gear and fills in its defaults. Every fault is added to `checks` under `path` (`pinion` gives
 * `pinion.teeth`); null when there is one.
 */
export function checkGear(input: unknown, path: string, checks: FieldChecks): ResolvedGear | null {
  const before = checks.issues.length;
  if (!isRecord(input)) {
    const mend = `is ${input === undefined || input === null ? 'missing' : 'not a gear'}. Give at least teeth and module.`;
    checks.refuse(path || 'gear', input, titled('', path || 'gear'), mend);
    return null;
  }
  const at = (field: string) => (path === '' ? field : `${path}.${field}`);
  const label = (name: string) => titled(path, name);

  checkTeeth(input.teeth, at('teeth'), label('number of teeth'), checks);
  const module = input.module;
  if (
    checks.number(at('module'), module, label('module'), INPUT_LIMITS.module, 'mm') &&
    module < LEAST_MODULE
  ) {
    const mend = `is too small. Enter a number from ${LEAST_MODULE} to ${INPUT_LIMITS.module.max} mm.`;
    checks.refuse(at('module'), module, label('module'), mend, LEAST_MODULE);
  }
  checkPressureAngle(input.pressureAngleDeg, at('pressureAngleDeg'), label('pressure angle'), checks);
  const optional = [
    ['helixAngleDeg', 'helix angle', '°'],
    ['profileShift', 'profile shift', ''],
    ['tipShortening', 'tip shortening', ''],
    ['faceWidth', 'face width', 'mm'],
  ] as const;
  for (const [field, name, unit] of optional) {
    checks.optionalNumber(at(field), input[field], label(name), INPUT_LIMITS[field], unit);
  }
  if (input.hand !== undefined && input.hand !== 'left' && input.hand !== 'right') {
    checks.refuse(
      at('hand'),
      input.hand,
      label('hand'),
      'is not a hand. Choose left or right.',
      'left or right',
    );
  }
  checkRack(input, at('rack'), label, checks);
  checkAllowance(input, at('thicknessAllowance'), label, checks);
  if (checks.issues.length > before) return null;

  // The checks above are what makes the input a gear.
  const gear = resolveGear(input as unknown as GearInput);
  checkShape(gear, at, label, checks);
  return checks.issues.length > before ? null : gear;
}

/** The checked gear, or an `InputError` that lists every field at fault. */
export function checkedGear(input: unknown, path = ''): ResolvedGear {
  const checks = new FieldChecks();
  const gear = checkGear(input, path, checks);
  checks.finish();
  if (gear === null) throw new Error('A gear without issues must resolve.');
  return gear;
}

/** `Pinion, number of teeth` for the path `pinion`; `Number of teeth` without a path. */
function titled(path: string, name: string): string {
  const owner = path.split('.').at(-1) ?? '';
  const text = owner === '' || owner === name ? name : `${owner}, ${name}`;
  return text.charAt(0).toUpperCase() + text.slice(1);
}

function checkTeeth(teeth: unknown, field: string, label: string, checks: FieldChecks): void {
  if (typeof teeth === 'number' && Number.isFinite(teeth) && !Number.isInteger(teeth)) {
    checks.refuse(field, teeth, label, 'is not a whole number. Enter a whole number from 4.', 'whole number');
    return;
  }
  checks.number(field, teeth, label, INPUT_LIMITS.teeth);
}

function checkPressureAngle(angle: unknown, field: string, label: string, checks: FieldChecks): void {
  if (angle === undefined || (typeof angle === 'number' && PRESSURE_ANGLES_DEG.includes(angle))) return;
  const list = PRESSURE_ANGLES_DEG.join(', ');
  checks.refuse(field, angle, label, `is not on the list. Choose one of ${list} degrees.`, list);
}

function checkRack(
  input: Record<string, unknown>,
  field: string,
  label: (name: string) => string,
  checks: FieldChecks,
): void {
  const rack = input.rack;
  if (rack === undefined) return;
  if (!isRecord(rack)) {
    checks.refuse(
      field,
      rack,
      label('rack'),
      'is not a rack. Give addendum, dedendum and tip radius in modules.',
    );
    return;
  }
  checks.optionalNumber(
    `${field}.addendum`,
    rack.addendum,
    label('rack addendum'),
    INPUT_LIMITS.addendum,
    'modules',
  );
  const angle = input.pressureAngleDeg ?? 20;
  if (typeof angle !== 'number' || !PRESSURE_ANGLES_DEG.includes(angle)) return;
  const alpha = degToRad(angle);
  // Deeper than this the rack's flanks would have met: π/4 = h_f tan α.
  const deepest = Math.min(INPUT_LIMITS.dedendum.max, Math.PI / (4 * Math.tan(alpha)));
  const bounds = { ...INPUT_LIMITS.dedendum, max: deepest };
  if (!checks.optionalNumber(`${field}.dedendum`, rack.dedendum, label('rack dedendum'), bounds, 'modules'))
    return;
  const dedendum = typeof rack.dedendum === 'number' ? rack.dedendum : 1.25;
  const largest = largestTipRadius(alpha, dedendum);
  const radius = rack.tipRadius;
  const radiusLabel = label('rack tip radius');
  if (typeof radius === 'number' && radius > largest + 1e-12) {
    const mend = `does not fit between the rack's flanks. At most ${plain(floorTo(largest, 4))} modules fit.`;
    checks.refuse(`${field}.tipRadius`, radius, radiusLabel, mend, floorTo(largest, 4));
  } else {
    checks.optionalNumber(`${field}.tipRadius`, radius, radiusLabel, { min: 0 }, 'modules');
  }
}

function checkAllowance(
  input: Record<string, unknown>,
  field: string,
  label: (name: string) => string,
  checks: FieldChecks,
): void {
  const allowance = input.thicknessAllowance;
  if (allowance === undefined) return;
  if (!isRecord(allowance)) {
    checks.refuse(field, allowance, label('thickness allowance'), 'needs an upper and a lower value in mm.');
    return;
  }
  const { upper, lower } = allowance;
  const module = typeof input.module === 'number' && input.module > 0 ? input.module : 1;
  const bounds = { min: -module / 2, max: 0 };
  const upperFine = checks.number(`${field}.upper`, upper, label('upper thickness allowance'), bounds, 'mm');
  const lowerFine = checks.number(`${field}.lower`, lower, label('lower thickness allowance'), bounds, 'mm');
  if (upperFine && lowerFine && lower > upper) {
    const mend = `is above the upper value ${plain(upper)}. Swap the two.`;
    checks.refuse(`${field}.lower`, lower, label('lower thickness allowance'), mend, upper);
  }
}

/** Refuses a gear whose single figures are fine but which no cutter can leave with usable teeth. */
function checkShape(
  gear: ResolvedGear,
  at: (field: string) => string,
  label: (name: string) => string,
  checks: FieldChecks,
): void {
  const figures = figuresOf(gear);
  const shift = label('profile shift');
  if (figures.root <= 0) {
    const least = gear.rack.dedendum - gear.teeth / (2 * Math.cos(gear.beta));
    const mend = `cuts the teeth down to the axis. Use more than ${plain(least)} or more teeth.`;
    checks.refuse(at('profileShift'), gear.shift, shift, mend, least);
  } else if (figures.tip <= Math.max(figures.base, figures.root)) {
    const least = (Math.max(figures.base, figures.root) - figures.reference) / gear.module;
    const limit = least - gear.rack.addendum + gear.tipShortening;
    const mend = `leaves no involute below the tip. Use more than ${plain(limit)} or a longer addendum.`;
    checks.refuse(at('profileShift'), gear.shift, shift, mend, limit);
  } else if (figures.tipThickness <= 0) {
    const limit = greatestShift(gear);
    const mend =
      limit === null
        ? 'leaves the teeth pointed, as does every smaller one. Shorten the tip or use more teeth.'
        : `makes the teeth pointed. Use at most ${plain(limit)}, shorten the tip or use more teeth.`;
    checks.refuse(at('profileShift'), gear.shift, shift, mend, limit ?? undefined);
  } else if (thicknessAt(gear, gear.effectiveShift, figures.tip) <= 0) {
    const mend = 'takes so much off that the teeth become pointed. Use an allowance nearer to zero.';
    const name = label('lower thickness allowance');
    checks.refuse(at('thicknessAllowance.lower'), gear.allowance.lower, name, mend, gear.allowance.upper);
  }
}

/** The shift at which the tip becomes pointed, rounded down to 4 decimals; null when no smaller shift helps. */
export function greatestShift(gear: ResolvedGear): number | null {
  const pointed = (shift: number) => {
    const trial = { ...gear, shift, effectiveShift: shift };
    return figuresOf(trial).tipThickness <= 0;
  };
  let high = gear.shift;
  if (!pointed(high)) return null;
  let low = high - 0.05;
  while (pointed(low)) {
    low -= 0.05;
    if (low < INPUT_LIMITS.profileShift.min) return null;
  }
  for (let step = 0; step < 40; step++) {
    const mid = (low + high) / 2;
    if (pointed(mid)) high = mid;
    else low = mid;
  }
  return floorTo(low, 4);
}

function floorTo(value: number, decimals: number): number {
  const scale = 10 ** decimals;
  return Math.floor(value * scale) / scale;
}
