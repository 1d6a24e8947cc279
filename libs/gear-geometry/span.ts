import { checkedGear } from './check-gear.js';
import { figuresOf } from './gear-radii.js';
import { involute } from './involute.js';
import { type GearInput, type ResolvedGear } from './types.js';

/** Span (base tangent length) over several teeth, mm. */
export interface SpanMeasurement {
  /** Teeth spanned, k. */
  teeth: number;
  /** W without allowance. */
  nominal: number;
  /** W at the upper and lower thickness allowance. */
  upper: number;
  lower: number;
  /** Diameter at which the measuring faces touch. */
  contactDiameter: number;
  /** Null when it can be measured; else why not, in words. */
  obstacle: string | null;
}

/** Span over the recommended number of teeth, nominal and with allowances. Refuses what `gearGeometry` refuses. */
export function spanMeasurement(input: GearInput, path = ''): SpanMeasurement {
  return spanOf(checkedGear(input, path));
}

/** `spanMeasurement` of a checked gear (ISO 21771: W_k and k). */
export function spanOf(gear: ResolvedGear): SpanMeasurement {
  const figures = figuresOf(gear);
  const teeth = spanTeeth(gear);
  const nominal =
    gear.module *
    Math.cos(gear.alpha) *
    ((teeth - 0.5) * Math.PI + gear.teeth * involute(gear.alphaT) + 2 * gear.shift * Math.tan(gear.alpha));
  // An allowance A_s on the thickness is A_s cos α along the base tangent.
  const upper = nominal + gear.allowance.upper * Math.cos(gear.alpha);
  const lower = nominal + gear.allowance.lower * Math.cos(gear.alpha);
  const halfReach = (nominal * Math.cos(gear.betaB)) / 2;
  return {
    teeth,
    nominal,
    upper,
    lower,
    contactDiameter: 2 * Math.hypot(figures.base, halfReach),
    obstacle: obstacleTo(gear, halfReach, nominal, figures.tipReach, figures.formReach),
  };
}

/**
 * k so that the faces touch near the v-circle (radius r + x m):
 * K = 2√(r_v² − r_b²)/(z m cos α cos β_b) − inv α_t − 2(x/z) tan α, k = ⌈zK/π⌉, at least 2.
 * At 20° and x = 0 the teeth 18, 27, 36 sit exactly on a step: the slack keeps float noise out.
 */
function spanTeeth(gear: ResolvedGear): number {
  const z = gear.teeth;
  const reference = (gear.module * z) / Math.cos(gear.beta) / 2;
  const base = reference * Math.cos(gear.alphaT);
  const middle = reference + gear.shift * gear.module;
  const reach = Math.sqrt(Math.max(0, middle * middle - base * base));
  const k =
    (2 * reach) / (z * gear.module * Math.cos(gear.alpha) * Math.cos(gear.betaB)) -
    involute(gear.alphaT) -
    (2 * gear.shift * Math.tan(gear.alpha)) / z;
  return Math.max(2, Math.ceil((z * k) / Math.PI - 1e-9));
}

function obstacleTo(
  gear: ResolvedGear,
  halfReach: number,
  span: number,
  tipReach: number,
  formReach: number,
): string | null {
  if (halfReach > tipReach) return 'The measuring faces would touch beyond the tip circle.';
  if (halfReach < formReach) return 'The measuring faces would touch below the usable involute.';
  const leastWidth = span * Math.sin(gear.betaB);
  if (gear.faceWidth !== null && gear.faceWidth < leastWidth) {
    return `The face width is too small: at least ${leastWidth.toFixed(2)} mm is needed at this helix angle.`;
  }
  return null;
}
