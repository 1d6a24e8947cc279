import { radToDeg } from '../units/index.js';
import { checkedGear } from './check-gear.js';
import { figuresOf } from './gear-radii.js';
import { type GearGeometry } from './results.js';
import { spanOf } from './span.js';
import { type GearFigures, type GearInput, type ResolvedGear } from './types.js';

/**
 * Geometry of one external involute gear, spur or helical (ISO 21771), cut by the given basic rack.
 * Throws an `InputError` listing every field at fault; `path` goes in front of the field names.
 */
export function gearGeometry(input: GearInput, path = ''): GearGeometry {
  const gear = checkedGear(input, path);
  return geometryOf(gear, figuresOf(gear));
}

/** `gearGeometry` of a gear already checked. */
export function geometryOf(gear: ResolvedGear, figures: GearFigures): GearGeometry {
  const m = gear.module;
  const span = spanOf(gear);
  const toothThickness = m * (Math.PI / 2 + 2 * gear.shift * Math.tan(gear.alpha));
  // Chords are measured in the normal section, whose circle has the diameter d/cos²β.
  const normalDiameter = (2 * figures.reference) / Math.cos(gear.beta) ** 2;
  const halfAngle = toothThickness / normalDiameter;
  return {
    referenceDiameter: 2 * figures.reference,
    baseDiameter: 2 * figures.base,
    tipDiameter: 2 * figures.tip,
    rootDiameter: 2 * figures.root,
    formDiameter: 2 * figures.form,
    undercut: figures.undercut,
    leastShiftWithoutUndercut: figures.leastShift,
    tipThickness: figures.tipThickness,
    toothThickness,
    basePitch: figures.basePitch,
    spanTeeth: span.teeth,
    spanLength: span.nominal,
    effectiveShift: gear.effectiveShift,
    transverseModule: m / Math.cos(gear.beta),
    transversePressureAngleDeg: radToDeg(gear.alphaT),
    baseHelixAngleDeg: radToDeg(gear.betaB),
    axialPitch: axialPitch(gear),
    toothDepth: figures.tip - figures.root,
    chordalThickness: normalDiameter * Math.sin(halfAngle),
    chordalHeight: figures.tip - figures.reference + (normalDiameter / 2) * (1 - Math.cos(halfAngle)),
  };
}

/** p_x = π m/sin β, mm; null for a spur gear, and for a helix so slight that the pitch is beyond any number. */
function axialPitch(gear: ResolvedGear): number | null {
  const pitch = (Math.PI * gear.module) / Math.sin(gear.beta);
  return Number.isFinite(pitch) ? pitch : null;
}
