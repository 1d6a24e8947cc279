import { fieldError, InputError, toRatio } from '../units/index.js';
import { FieldReader, isGiven } from './field-reader.js';
import { type TrainSpec } from './train-spec.js';

/** Wide bounds: what lies outside has no meaning for a machine. */
const BOUNDS = {
  inputSpeed: [0, 1e7],
  torque: [0, 1e9],
  applicationFactor: [0.01, 100],
  gap: [0, 1e5],
  wall: [0, 1e4],
  density: [1, 1e5],
  leastContactRatio: [0, 5],
} as const;

/**
 * Checks what a train says beside its gears, which the mesh calculation checks by itself.
 * @throws InputError naming every field at fault
 */
export function checkTrain(train: TrainSpec): void {
  if (train.stages.length === 0) {
    throw fieldError('stages', 0, 'The train has no stage. Give at least one.', 1);
  }
  if (train.inputTorque !== undefined && train.outputTorque !== undefined) {
    const message =
      'Both an input and an output torque are given. Give one; the other follows from the ratio.';
    throw fieldError('outputTorque', train.outputTorque, message);
  }
  const read = new FieldReader();
  const optional = (value: unknown, field: string, words: string, bounds: readonly [number, number]) => {
    if (isGiven(value)) read.number(value, field, words, bounds);
  };
  optional(train.leastContactRatio, 'leastContactRatio', 'The least contact ratio', BOUNDS.leastContactRatio);
  optional(train.inputSpeed, 'inputSpeed', 'The input speed in rpm', BOUNDS.inputSpeed);
  optional(train.inputTorque, 'inputTorque', 'The input torque in N·m', BOUNDS.torque);
  optional(train.outputTorque, 'outputTorque', 'The output torque in N·m', BOUNDS.torque);
  optional(train.applicationFactor, 'applicationFactor', 'The application factor', BOUNDS.applicationFactor);
  optional(train.gap, 'gap', 'The gap between planes in mm', BOUNDS.gap);
  // A side without a limit may also stand as Infinity; the wall is added up.
  optional(train.envelope?.wall, 'envelope.wall', 'The wall in mm', BOUNDS.wall);
  train.stages.forEach(({ pinion, wheel }, stage) => {
    for (const [role, gear] of Object.entries({ pinion, wheel })) {
      optional(gear.density, `stages.${stage}.${role}.density`, 'The density in kg/m³', BOUNDS.density);
    }
  });
  if (read.issues.length > 0) throw new InputError(read.issues);
  if (train.target) {
    toRatio(train.target.ratio, 'target.ratio');
    toRatio(train.target.tolerancePercent, 'target.tolerancePercent');
  }
}
