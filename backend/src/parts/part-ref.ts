import { type PartGear, type PartRef } from '@stageyard/libs/bill-of-materials';
import { type AttributesOf } from './dto/attributes/part-attributes.js';
import { type ToothedAttributes } from './dto/attributes/toothed-attributes.js';
import { type Part } from './entities/part.entity.js';
import { isToothed } from './part-kinds.js';

/** What a bill of materials needs to know of a part. */
export function toPartRef(part: Part): PartRef {
  return {
    number: part.number,
    kind: part.kind,
    description: part.description,
    material: part.material,
    supply: part.supply,
    supplier: part.supplier,
    mass: part.mass,
    standing: part.standing,
    ...(isToothed(part.kind) ? { gear: toPartGear(part.attributes as ToothedAttributes, part.bore) } : {}),
    ...(part.kind === 'shaft' ? { length: part.length } : {}),
    ...(part.kind === 'lubricant'
      ? { packVolume: (part.attributes as AttributesOf<'lubricant'>).packVolume }
      : {}),
  };
}

function toPartGear(attributes: ToothedAttributes, bore: number | null): PartGear {
  const { thicknessAllowanceUpper: upper, thicknessAllowanceLower: lower } = attributes;
  const hubLength = 'hubLength' in attributes ? (attributes.hubLength as number | null) : null;
  return {
    teeth: attributes.teeth,
    module: attributes.module,
    pressureAngleDeg: attributes.pressureAngleDeg,
    helixAngleDeg: attributes.helixAngleDeg,
    hand: attributes.hand,
    profileShift: attributes.profileShift,
    faceWidth: attributes.faceWidth,
    bore,
    // The library states the hub beyond the face; a key may be as long as both together.
    hubLength: hubLength === null ? null : attributes.faceWidth + hubLength,
    thicknessAllowance: upper === null || lower === null ? null : { upper, lower },
    heatTreatment: attributes.heatTreatment,
  };
}
