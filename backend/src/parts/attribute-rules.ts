import { type GearGeometry } from '@stageyard/libs/gear-geometry';
import { type FieldIssue } from '../common/errors.js';
import { type AttributesOf, type PartAttributes } from './dto/attributes/part-attributes.js';
import { type PartKind } from './part-kinds.js';

/** One size that must stay below another, mm. */
interface Below {
  field: string;
  value: number;
  limit: number;
  message: string;
}

const below = (field: string, value: number, limit: number, name: string, than: string): Below => ({
  field: `attributes.${field}`,
  value,
  limit,
  message: `${name} is ${value} mm; it must be smaller than ${than}, ${Number(limit.toFixed(3))} mm.`,
});

/** Sizes of one part that contradict each other; empty when they do not. */
export function contradictions(
  kind: PartKind,
  attributes: PartAttributes,
  geometry: GearGeometry | null,
): FieldIssue[] {
  return rulesOf(kind, attributes, geometry).filter(({ value, limit }) => value >= limit);
}

function rulesOf(kind: PartKind, attributes: PartAttributes, geometry: GearGeometry | null): Below[] {
  switch (kind) {
    case 'gear': {
      const { bore, hubDiameter } = attributes as AttributesOf<'gear'>;
      return [
        ...(geometry ? [below('bore', bore, geometry.rootDiameter, 'The bore', 'the root diameter')] : []),
        ...(hubDiameter === null ? [] : [below('bore', bore, hubDiameter, 'The bore', 'the hub diameter')]),
      ];
    }
    case 'bearing': {
      const { bore, outerDiameter } = attributes as AttributesOf<'bearing'>;
      return [below('bore', bore, outerDiameter, 'The bore', 'the outer diameter')];
    }
    case 'seal': {
      const { shaftDiameter, outerDiameter } = attributes as AttributesOf<'seal'>;
      return [
        below('shaftDiameter', shaftDiameter, outerDiameter, 'The shaft diameter', 'the outer diameter'),
      ];
    }
    case 'retaining-ring': {
      const { shaftDiameter, grooveDiameter } = attributes as AttributesOf<'retaining-ring'>;
      return [
        below('grooveDiameter', grooveDiameter, shaftDiameter, 'The groove diameter', 'the shaft diameter'),
      ];
    }
    case 'housing': {
      const { length, width, height, wall } = attributes as AttributesOf<'housing'>;
      const side = Math.min(length, width, height);
      return [below('wall', wall, side / 2, 'The wall', 'half the shortest side')];
    }
    default:
      return [];
  }
}
