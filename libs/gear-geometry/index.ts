export { HOUSE_LIMITS, INPUT_LIMITS, PRESSURE_ANGLES_DEG, DEFAULT_TIP_RADIUS } from './limits.js';
export {
  type GearFigures,
  type GearInput,
  type GearRadii,
  type Rack,
  type RackTip,
  type ThicknessAllowance,
} from './types.js';
export { involute, inverseInvolute } from './involute.js';
export { gearRadii } from './gear-radii.js';
export { meshKernel, zeroBacklashDistance } from './mesh-kernel.js';
export { type Finding, type GearGeometry, type MeshGeometry, type Severity } from './results.js';
