import { InputError, radToDeg } from '../units/index.js';
import { FieldChecks, plain } from './check-fields.js';
import { checkGear } from './check-gear.js';
import { figuresOf } from './gear-radii.js';
import { inverseInvolute, involute } from './involute.js';
import { INPUT_LIMITS } from './limits.js';
import { type GearFigures, type GearInput, type ResolvedGear } from './types.js';

/** Diameter over two pins (spur) or balls (helical), mm. */
export interface PinMeasurement {
  pinDiameter: number;
  /** Pressure angle at the pin's centre, nominal tooth, degrees. */
  pressureAngleAtPinDeg: number;
  /** M without allowance. */
  nominal: number;
  /** M at the upper and lower thickness allowance. */
  upper: number;
  lower: number;
}

/**
 * Diameter over pins of a given diameter (mm), nominal and with allowances.
 * Refuses, with the field `pinDiameter`, a pin that touches beyond the usable involute, drops onto the root
 * or does not stand out above the tips.
 */
export function overPins(input: GearInput, pinDiameter: number, path = ''): PinMeasurement {
  const checks = new FieldChecks();
  const gear = checkGear(input, path, checks);
  checks.number('pinDiameter', pinDiameter, 'Pin diameter', INPUT_LIMITS.pinDiameter, 'mm');
  checks.finish();
  if (gear === null) throw new Error('A gear without issues must resolve.');

  const figures = figuresOf(gear);
  const angle = angleAtPin(gear, pinDiameter, gear.shift);
  refuseMisfit(gear, figures, pinDiameter, angle);
  const at = (allowance: number) => {
    const shift = gear.shift + allowance / (2 * gear.module * Math.tan(gear.alpha));
    return diameterOver(gear, figures.base, pinDiameter, angleAtPin(gear, pinDiameter, shift));
  };
  return {
    pinDiameter,
    pressureAngleAtPinDeg: radToDeg(angle),
    nominal: at(0),
    upper: at(gear.allowance.upper),
    lower: at(gear.allowance.lower),
  };
}

/** inv α_K = inv α_t + D_M/(m z cos α) − π/(2z) + 2x tan α/z; 0 when the pin sinks inside the base circle. */
function angleAtPin(gear: ResolvedGear, pin: number, shift: number): number {
  const z = gear.teeth;
  return inverseInvolute(
    involute(gear.alphaT) +
      pin / (gear.module * z * Math.cos(gear.alpha)) +
      (2 * shift * Math.tan(gear.alpha) - Math.PI / 2) / z,
  );
}

/** M = d_K + D_M; with an odd number of teeth the pins sit a half pitch off the diameter. */
function diameterOver(gear: ResolvedGear, base: number, pin: number, angle: number): number {
  const centres = (2 * base) / Math.cos(angle);
  return gear.teeth % 2 === 0 ? centres + pin : centres * Math.cos(Math.PI / (2 * gear.teeth)) + pin;
}

function refuseMisfit(gear: ResolvedGear, figures: GearFigures, pin: number, angle: number): void {
  const refuse = (why: string): never => {
    const message = `Pin diameter: ${plain(pin)} mm ${why} A pin near ${plain(1.7 * gear.module)} mm often fits.`;
    throw new InputError([{ field: 'pinDiameter', value: pin, message }]);
  };
  const touchReach = figures.base * Math.tan(angle) - (pin / 2) * Math.cos(gear.betaB);
  const centre = figures.base / Math.cos(angle);
  if (angle <= 0 || touchReach < figures.formReach)
    refuse('is too small: it would touch below the usable involute.');
  if (touchReach > figures.tipReach) refuse('is too large: it would rest on the tips.');
  if (centre - pin / 2 < figures.root) refuse('is too large: it would touch the root.');
  if (centre + pin / 2 <= figures.tip) refuse('is too small: it would not stand out above the tips.');
}
