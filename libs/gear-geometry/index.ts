export { HOUSE_LIMITS, INPUT_LIMITS, PRESSURE_ANGLES_DEG } from './limits.js';
export {
  type GearFigures,
  type GearInput,
  type GearRadii,
  type Rack,
  type RackTip,
  type ThicknessAllowance,
} from './types.js';
export { type Finding, type GearGeometry, type MeshGeometry, type Severity } from './results.js';
export { involute, inverseInvolute } from './involute.js';
export { gearGeometry } from './gear.js';
export { gearRadii } from './gear-radii.js';
export { meshGeometry, type MeshInput } from './mesh.js';
export { meshKernel, shiftSumForDistance, zeroBacklashDistance } from './mesh-kernel.js';
export { meshInterferes } from './tip-corner.js';
export { assertMeshable, huntingTooth, type HuntingTooth } from './pair.js';
export {
  SHIFT_POLICIES,
  leastClearShift,
  shiftForPolicy,
  type ShiftInput,
  type ShiftPolicy,
  type ShiftResult,
} from './shift.js';
export { spanMeasurement, type SpanMeasurement } from './span.js';
export { overPins, type PinMeasurement } from './pins.js';
export { standardRack } from './resolve.js';
export { toothOutline, type OutlinePoint } from './outline.js';
export { BASIC_RACKS, STANDARD_MODULES } from './standards.js';
