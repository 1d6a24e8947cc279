export { buildBom } from './build-bom.js';
export { bomTotals, partNumberText, type BomLine, type BomTotals } from './bom-line.js';
export { BOM_KINDS, type BomKind, type Hand } from './part-kinds.js';
export type { KitBox, KitGear, KitGearFigures, KitRequest, KitShaft } from './kit.js';
export type * from './part-finder.js';
export { FLAG } from './flags.js';
export { gearDataRows, type GearDataInput, type GearDataRow } from './gear-data.js';
export { trainGearData, type TrainGearData } from './train-gear-data.js';
export {
  KEY_BORE_RANGE,
  keyLengthForHub,
  keyVolume,
  parallelKeyForBore,
  type ParallelKey,
} from './parallel-key.js';
export { retainingRingBelow, retainingRingForShaft, type RetainingRing } from './retaining-ring.js';
export { bearingBoreFor, isBearingBore } from './bearing-bore.js';
export * from './paste/index.js';
export * from './prices/index.js';
export {
  buildEditedBom,
  type AddedLine,
  type ChosenPart,
  type EditedBom,
  type KitEdits,
} from './edited-bom.js';
export { fitAsSubstitute } from './substitutes/fit-as-substitute.js';
export { placeOf, placePart } from './substitutes/place-part.js';
export type {
  Fit,
  FitPlace,
  RatedStrength,
  SizesOf,
  SubstitutePart,
  SubstituteSizes,
  SubstituteTeeth,
} from './substitutes/substitute-part.js';
