import { type Finding, type MeshGeometry } from '../gear-geometry/index.js';
import { type Envelope } from './option-request.js';
import { type Box } from './train-option.js';

/** One gear of a train. Face width mm, density kg/m³ (7,850 when left out), shift in modules. */
export interface SpecGear {
  teeth: number;
  profileShift: number;
  faceWidth: number;
  hand?: 'left' | 'right';
  density?: number;
}

export interface SpecStage {
  /** Normal module, mm. */
  module: number;
  /** Operating distance, mm. */
  centreDistance: number;
  pinion: SpecGear;
  wheel: SpecGear;
}

/** A whole train with what is asked of it. Speeds rpm, torques N·m, lengths mm. */
export interface TrainSpec {
  pressureAngleDeg: number;
  helixAngleDeg: number;
  target?: { ratio: string; tolerancePercent: number | string };
  leastContactRatio: number;
  inputSpeed?: number;
  /** Torque at the input; nothing is deducted for losses. */
  inputTorque?: number;
  /** Torque wanted at the output; divided by 0.98 for every mesh between a shaft and the output. */
  outputTorque?: number;
  applicationFactor?: number;
  /** A side left out is not limited. */
  envelope?: Envelope;
  /** Between the planes of neighbouring stages, mm; 5 when left out. */
  gap?: number;
  stages: SpecStage[];
}

/** Seen along the shafts: x along the line of axes, z along the shafts from the input's wall. */
export interface TrainShaft {
  index: number;
  x: number;
  y: number;
  z1: number;
  z2: number;
  speed: number | null;
  torque: number | null;
  /** kW */
  power: number | null;
  /** 1 turns like the input, −1 against it. */
  direction: 1 | -1;
  /** Least diameter for torsion at 25 MPa, whole mm; null while no torque is known. */
  leastDiameter: number | null;
}

export type Verdict = 'passes' | 'marginal' | 'fails';

/** One requirement held against the train. */
export interface TrainCheck {
  code: string;
  label: string;
  value: number | null;
  limit: number | null;
  unit: string;
  verdict: Verdict;
  /** 0 for the first stage; left out when the check concerns the whole train. */
  stage?: number;
  message: string;
}

export interface TrainFigures {
  ratio: { numerator: string; denominator: string; value: number; errorPercent: number | null };
  centreDistanceSum: number;
  /** kg; solid discs at the reference diameter. */
  mass: number;
  box: Box;
  backlashArcmin: number;
  direction: 'same' | 'opposite';
  shafts: TrainShaft[];
  meshes: MeshGeometry[];
  findings: (Finding & { stage?: number })[];
  checks: TrainCheck[];
}
