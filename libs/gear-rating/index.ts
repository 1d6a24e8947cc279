export {
  MATERIAL_FIELDS,
  MATERIAL_GROUPS,
  TREATMENTS,
  type MaterialField,
  type MaterialGroup,
  type Treatment,
} from './materials.js';
export { statedHardness } from './hardness.js';
export {
  isSofterThanSteel,
  isSurfaceHardened,
  strengthOf,
  type MaterialStrength,
  type StatedMaterial,
} from './strength.js';
