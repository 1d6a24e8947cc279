import type { PartKind } from '../../part-kinds.js';
import { BearingAttributes } from './bearing-attributes.js';
import { FastenerAttributes } from './fastener-attributes.js';
import { GearAttributes } from './gear-attributes.js';
import { HousingAttributes } from './housing-attributes.js';
import { KeyAttributes } from './key-attributes.js';
import { LubricantAttributes } from './lubricant-attributes.js';
import { OtherAttributes } from './other-attributes.js';
import { PinionShaftAttributes } from './pinion-shaft-attributes.js';
import { RetainingRingAttributes } from './retaining-ring-attributes.js';
import { SealAttributes } from './seal-attributes.js';
import { ShaftAttributes } from './shaft-attributes.js';

/** The attributes class of each kind; the one place that ties them together. */
export const ATTRIBUTES_OF_KIND = {
  gear: GearAttributes,
  'pinion-shaft': PinionShaftAttributes,
  shaft: ShaftAttributes,
  bearing: BearingAttributes,
  key: KeyAttributes,
  'retaining-ring': RetainingRingAttributes,
  seal: SealAttributes,
  housing: HousingAttributes,
  fastener: FastenerAttributes,
  lubricant: LubricantAttributes,
  other: OtherAttributes,
} as const satisfies Record<PartKind, new () => object>;

export type AttributesOf<K extends PartKind> = InstanceType<(typeof ATTRIBUTES_OF_KIND)[K]>;
export type PartAttributes = AttributesOf<PartKind>;

export const ATTRIBUTE_CLASSES = Object.values(ATTRIBUTES_OF_KIND);
