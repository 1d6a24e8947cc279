import { gearGeometry, type GearGeometry, type GearInput } from '@stageyard/libs/gear-geometry';
import type { PartAttributes } from './dto/attributes/part-attributes.js';
import { ToothedAttributes } from './dto/attributes/toothed-attributes.js';
import { isToothed, type PartKind } from './part-kinds.js';

/**
 * Geometry of a part with teeth; null for other kinds. A shift or allowance that is not known counts as 0.
 * @throws InputError naming `attributes.…` when such a gear cannot exist
 */
export function toothedGeometry(kind: PartKind, attributes: PartAttributes): GearGeometry | null {
  if (!isToothed(kind)) return null;
  return gearGeometry(toGearInput(attributes as ToothedAttributes), 'attributes');
}

/** The geometry library's input for a stored gear. */
export function toGearInput(attributes: ToothedAttributes): GearInput {
  const upper = attributes.thicknessAllowanceUpper ?? attributes.thicknessAllowanceLower ?? 0;
  const lower = attributes.thicknessAllowanceLower ?? attributes.thicknessAllowanceUpper ?? 0;
  return {
    teeth: attributes.teeth,
    module: attributes.module,
    pressureAngleDeg: attributes.pressureAngleDeg,
    helixAngleDeg: attributes.helixAngleDeg,
    ...(attributes.hand ? { hand: attributes.hand } : {}),
    profileShift: attributes.profileShift ?? 0,
    faceWidth: attributes.faceWidth,
    thicknessAllowance: { upper, lower },
  };
}
