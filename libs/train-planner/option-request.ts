/** Whole numbers, both ends allowed. */
export interface WholeRange {
  min: number;
  max: number;
}

export type Objective = 'centre-distance' | 'ratio-error' | 'mass';
export type PlannerShiftPolicy = 'none' | 'clear-undercut';

/** Inner space for the train, mm. A side left out is not limited; `wall` is taken off twice on every side. */
export interface Envelope {
  length?: number;
  width?: number;
  height?: number;
  wall?: number;
}

/** What a designer asks for. Fields that are optional take the defaults of `validateOptionRequest`. */
export interface OptionRequest {
  /** Decimals, read exactly: '37.5' within ±'1' per cent, both limits allowed. */
  ratio: { target: string | number; tolerancePercent: string | number };
  stages: WholeRange;
  teeth: { pinion: WholeRange; wheel: WholeRange };
  /** Normal modules in mm. Without a load every stage takes the smallest. */
  modules: number[];
  pressureAngleDeg?: number;
  helixAngleDeg?: number;
  /** Face width in modules, rounded up to whole mm. */
  faceWidthFactor?: number;
  shiftPolicy?: PlannerShiftPolicy;
  leastContactRatio?: number;
  /** Added to the zero-backlash distance, in modules. */
  centreDistanceAllowance?: number;
  undercut?: 'allow' | 'refuse';
  /**
   * Wheel teeth / pinion teeth of every stage, decimals read exactly, both ends allowed; at least 1 unless `min`
   * says less. In a stage that speeds up the driving gear stands as pinion.
   */
  stageRatio?: { min?: string | number; max?: string | number };
  envelope?: Envelope;
  arrangement?: 'in-line';
  direction?: 'same' | 'opposite' | 'any';
  source?: 'any';
  objective: Objective;
  /** Most options returned; of each stage count where `bestOf` says so. */
  limit?: number;
  /** Whether the stage counts compete for the places (`all`) or each keeps its own best (`each-count`). */
  bestOf?: 'all' | 'each-count';
}

/** A request whose defaults are filled in and whose fields are known to be good. Still a valid request itself. */
export interface CheckedRequest extends Required<Omit<OptionRequest, 'envelope' | 'stageRatio'>> {
  stageRatio: { min: string | number; max?: string | number };
  envelope?: Envelope;
}
