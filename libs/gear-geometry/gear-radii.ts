import { involute } from './involute.js';
import { UNDERCUT_SLACK } from './limits.js';
import { resolveGear } from './resolve.js';
import { filletEndEps, formReach } from './trochoid.js';
import { type GearFigures, type GearInput, type RackTip, type ResolvedGear } from './types.js';

/**
 * Radii and limits of one gear for searches over many gears; lengths in mm.
 * Nothing is checked: give it only what `gearGeometry` would accept.
 */
export function gearRadii(input: GearInput): GearFigures {
  return figuresOf(resolveGear(input));
}

/** `gearRadii` for a gear whose defaults are already filled in (ISO 21771). */
export function figuresOf(gear: ResolvedGear): GearFigures {
  const m = gear.module;
  const cosBeta = Math.cos(gear.beta);
  const reference = (m * gear.teeth) / cosBeta / 2;
  const base = reference * Math.cos(gear.alphaT);
  const tip = reference + m * (gear.rack.addendum + gear.shift - gear.tipShortening);
  const root = reference - m * (gear.rack.dedendum - gear.effectiveShift);
  const leastShift = leastShiftWithoutUndercut(gear);
  const undercut = gear.effectiveShift < leastShift - UNDERCUT_SLACK;
  const rackTip = rackTipOf(gear, reference, base, leastShift);
  const filletEnd = filletEndEps(rackTip, undercut);
  const reach = formReach(rackTip, filletEnd);
  return {
    teeth: gear.teeth,
    module: m,
    reference,
    base,
    tip,
    root,
    form: Math.hypot(base, reach),
    tipReach: Math.sqrt(Math.max(0, (tip - base) * (tip + base))),
    formReach: reach,
    basePitch: (Math.PI * m * Math.cos(gear.alphaT)) / cosBeta,
    tipThickness: thicknessAt(gear, gear.shift, tip),
    undercut,
    leastShift,
    rackTip,
    filletEnd,
  };
}

/** x_min = h − z sin²α_t/(2 cos β), modules; h is the depth of the end of the rack's straight flank. */
export function leastShiftWithoutUndercut(gear: ResolvedGear): number {
  return straightDepth(gear) - (gear.teeth * Math.sin(gear.alphaT) ** 2) / (2 * Math.cos(gear.beta));
}

/** h = h_f − ρ(1 − sin α), modules. */
function straightDepth(gear: ResolvedGear): number {
  return gear.rack.dedendum - gear.rack.tipRadius * (1 - Math.sin(gear.alpha));
}

function rackTipOf(gear: ResolvedGear, reference: number, base: number, leastShift: number): RackTip {
  const sinAlphaT = Math.sin(gear.alphaT);
  return {
    base,
    reference,
    alpha: gear.alpha,
    sinAlphaT,
    cosAlphaT: Math.cos(gear.alphaT),
    cosBeta: Math.cos(gear.beta),
    radius: gear.rack.tipRadius * gear.module,
    endHeight: (gear.effectiveShift - straightDepth(gear)) * gear.module,
    // The same as r sin α_t − (h − x_E) m/sin α_t, without the cancellation at the onset of undercut.
    endReach: ((gear.effectiveShift - leastShift) * gear.module) / sinAlphaT,
  };
}

/**
 * Normal tooth thickness in mm of a tooth of shift x on the circle of radius `at`; negative beyond the point
 * where the flanks meet. `at` must not be inside the base circle. Give `gear.shift` for the nominal tooth,
 * `gear.effectiveShift` for the tooth as cut.
 */
export function thicknessAt(gear: ResolvedGear, shift: number, at: number): number {
  const reference = (gear.module * gear.teeth) / Math.cos(gear.beta) / 2;
  const alphaAt = Math.acos(Math.min(1, (reference * Math.cos(gear.alphaT)) / at));
  const halfAngle =
    (Math.PI / 2 + 2 * shift * Math.tan(gear.alpha)) / gear.teeth + involute(gear.alphaT) - involute(alphaAt);
  // tan β_a = tan β d_a/d
  const betaAt = Math.atan((Math.tan(gear.beta) * at) / reference);
  return 2 * at * halfAngle * Math.cos(betaAt);
}
