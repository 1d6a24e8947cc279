export {
  MATERIAL_FIELDS,
  MATERIAL_GROUPS,
  TREATMENTS,
  type MaterialField,
  type MaterialGroup,
  type Treatment,
} from './materials.js';
export { statedHardness } from './hardness.js';
export { isSurfaceHardened, strengthOf, type MaterialStrength, type StatedMaterial } from './strength.js';
