import {
  type RatedStrength,
  type SubstitutePart,
  type SubstituteSizes,
  type SubstituteTeeth,
} from '@stageyard/libs/bill-of-materials';
import { gearRadii } from '@stageyard/libs/gear-geometry';
import { isSofterThanSteel, isSurfaceHardened, strengthOf } from '@stageyard/libs/gear-rating';
import { type AttributesOf } from '../parts/dto/attributes/part-attributes.js';
import { type ToothedAttributes } from '../parts/dto/attributes/toothed-attributes.js';
import { type Part } from '../parts/entities/part.entity.js';
import { toGearInput } from '../parts/part-geometry.js';
import { type PartKind } from '../parts/part-kinds.js';

/** A part of the library as the rules of fit look at it. */
export function toFitPart({ number, standing, material, kind, attributes }: Part): SubstitutePart {
  return { number, standing, material, sizes: SIZES[kind](attributes, material) };
}

type SizesOfPart = (attributes: Part['attributes'], material: string | null) => SubstituteSizes;

/** Ties a mapping for one kind to the table of all kinds: the caller pairs kind and attributes. */
const of =
  <K extends PartKind>(
    map: (attributes: AttributesOf<K>, material: string | null) => SubstituteSizes,
  ): SizesOfPart =>
  (attributes, material) =>
    map(attributes as AttributesOf<K>, material);

const SIZES: Record<PartKind, SizesOfPart> = {
  gear: of<'gear'>((a, material) => ({
    ...teethOf(a, material),
    kind: 'gear',
    bore: a.bore,
    hubDiameter: a.hubDiameter,
    hubLength: a.hubLength === null ? null : a.faceWidth + a.hubLength,
    rootDiameter: 2 * gearRadii(toGearInput(a)).root,
  })),
  'pinion-shaft': of<'pinion-shaft'>((a, material) => ({
    ...teethOf(a, material),
    kind: 'pinion-shaft',
    shaftDiameter: a.shaftDiameter,
    shaftLength: a.shaftLength,
  })),
  shaft: of<'shaft'>(({ diameter, length }) => ({ kind: 'shaft', diameter, length })),
  bearing: of<'bearing'>(({ bore, outerDiameter, width, type, dynamicLoadRating, staticLoadRating }) => ({
    kind: 'bearing',
    bore,
    outerDiameter,
    width,
    type,
    dynamicLoadRating,
    staticLoadRating,
  })),
  key: of<'key'>(({ width, height, length }) => ({ kind: 'key', width, height, length })),
  'retaining-ring': of<'retaining-ring'>(({ shaftDiameter, thickness, grooveDiameter }) => ({
    kind: 'retaining-ring',
    shaftDiameter,
    thickness,
    grooveDiameter,
  })),
  seal: of<'seal'>(({ shaftDiameter, outerDiameter, width }) => ({
    kind: 'seal',
    shaftDiameter,
    outerDiameter,
    width,
  })),
  housing: of<'housing'>(({ length, width, height, wall }) => ({
    kind: 'housing',
    length,
    width,
    height,
    wall,
  })),
  fastener: of<'fastener'>(({ thread, length, strengthClass }) => ({
    kind: 'fastener',
    thread,
    length,
    strengthClass,
  })),
  lubricant: of<'lubricant'>(({ viscosityGrade, packVolume }) => ({
    kind: 'lubricant',
    viscosityGrade,
    packVolume,
  })),
  other: () => ({ kind: 'other' }),
};

function teethOf(a: ToothedAttributes, material: string | null): SubstituteTeeth {
  return {
    teeth: a.teeth,
    module: a.module,
    pressureAngleDeg: a.pressureAngleDeg,
    helixAngleDeg: a.helixAngleDeg,
    hand: a.hand,
    profileShift: a.profileShift,
    faceWidth: a.faceWidth,
    heatTreatment: a.heatTreatment,
    hardened: isSurfaceHardened(a.heatTreatment),
    strength: ratedStrength(a, material),
    softerThanSteel: isSofterThanSteel(material),
  };
}

function ratedStrength(
  { heatTreatment, hardness }: ToothedAttributes,
  material: string | null,
): RatedStrength | null {
  const { strength } = strengthOf({ material, heatTreatment, hardness });
  return strength && { contact: strength.contact, bending: strength.bending };
}
