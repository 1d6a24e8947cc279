import { DEFAULT_GAP } from './train-box.js';
import { type TrainShaft, type TrainSpec } from './train-spec.js';

/** Share of the torque that a mesh passes on, where losses are counted (from the output backwards). */
const MESH_EFFICIENCY = 0.98;
/** Torsional stress for the least shaft diameter, MPa. */
const SHAFT_STRESS = 25;
const DEFAULT_APPLICATION_FACTOR = 1.25;

/** Shafts 0 … n of a train in line, with what turns in them. @param ratios of the stages, in order */
export function trainShafts(train: TrainSpec, ratios: readonly number[]): TrainShaft[] {
  const torques = shaftTorques(train, ratios);
  const spans = shaftSpans(train);
  let x = 0;
  let ratioSoFar = 1;
  return spans.map(([z1, z2], index) => {
    if (index > 0) {
      x += train.stages[index - 1]?.centreDistance ?? 0;
      ratioSoFar *= ratios[index - 1] ?? 1;
    }
    const speed = train.inputSpeed === undefined ? null : train.inputSpeed / ratioSoFar;
    const torque = torques ? (torques[index] ?? null) : null;
    return {
      index,
      x,
      y: 0,
      z1,
      z2,
      speed,
      torque,
      // kW from N·m and rpm.
      power: speed === null || torque === null ? null : (torque * speed * 2 * Math.PI) / 60_000,
      direction: index % 2 === 0 ? 1 : -1,
      leastDiameter: torque === null ? null : leastShaftDiameter(torque, train.applicationFactor),
    };
  });
}

/**
 * Least diameter of a solid shaft for torsion, (16·1000·K_A·T/(π τ))^⅓ with τ = 25 MPa, rounded up to whole mm.
 * @param torque N·m
 */
export function leastShaftDiameter(torque: number, applicationFactor = DEFAULT_APPLICATION_FACTOR): number {
  const exact = Math.cbrt((16 * 1000 * applicationFactor * torque) / (Math.PI * SHAFT_STRESS));
  return Math.ceil(exact - 1e-9);
}

/** N·m by shaft: from the input nothing is lost; from the output every mesh in between takes its part. */
function shaftTorques({ inputTorque, outputTorque }: TrainSpec, ratios: readonly number[]): number[] | null {
  if (inputTorque !== undefined) {
    const torques = [inputTorque];
    for (const ratio of ratios) torques.push((torques.at(-1) ?? 0) * ratio);
    return torques;
  }
  if (outputTorque === undefined) return null;
  const torques = [outputTorque];
  for (const ratio of [...ratios].reverse()) {
    torques.unshift((torques[0] ?? 0) / (ratio * MESH_EFFICIENCY));
  }
  return torques;
}

/** Planes stand one after the other from z = 0, the inner face of the input's wall. */
export function stagePlanes(train: TrainSpec): { start: number; end: number }[] {
  const gap = train.gap ?? DEFAULT_GAP;
  let start = 0;
  return train.stages.map(({ pinion, wheel }) => {
    const end = start + Math.max(pinion.faceWidth, wheel.faceWidth);
    const plane = { start, end };
    start = end + gap;
    return plane;
  });
}

/** A shaft spans its gears' planes and half a gap each side; the first and the last run through their walls. */
function shaftSpans(train: TrainSpec): [number, number][] {
  const half = (train.gap ?? DEFAULT_GAP) / 2;
  const wall = train.envelope?.wall ?? 0;
  const planes = stagePlanes(train);
  const last = planes.length;
  return Array.from({ length: last + 1 }, (_unused, shaft) => {
    const first = planes[Math.max(0, shaft - 1)];
    const final = planes[Math.min(last - 1, shaft)];
    const start = (first?.start ?? 0) - (shaft === 0 ? Math.max(half, wall) : half);
    const end = (final?.end ?? 0) + (shaft === last ? Math.max(half, wall) : half);
    return [start, end];
  });
}
