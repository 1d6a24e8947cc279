import { gearGeometry, type GearGeometry, type GearInput } from '@stageyard/libs/gear-geometry';
import { InputError } from '@stageyard/libs/units';
import type { PartAttributes } from './dto/attributes/part-attributes.js';
import { ToothedAttributes } from './dto/attributes/toothed-attributes.js';
import { isToothed, type PartKind } from './part-kinds.js';

/**
 * Geometry of a part with teeth; null for other kinds. A shift or allowance that is not known counts as 0.
 * @throws InputError naming `attributes.…` when such a gear cannot exist
 */
export function toothedGeometry(kind: PartKind, attributes: PartAttributes): GearGeometry | null {
  if (!isToothed(kind)) return null;
  try {
    return gearGeometry(toGearInput(attributes as ToothedAttributes), 'attributes');
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(error.errors.map((issue) => ({ ...issue, field: attributeOf(issue.field) })));
  }
}

/** A part keeps its allowances as two attributes of their own. */
function attributeOf(field: string): string {
  return field
    .replace('thicknessAllowance.upper', 'thicknessAllowanceUpper')
    .replace('thicknessAllowance.lower', 'thicknessAllowanceLower');
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
