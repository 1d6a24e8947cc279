import { type OptionRequest } from './option-request.js';

/** One stage of an option. Lengths in mm, shifts in modules. */
export interface OptionStage {
  pinionTeeth: number;
  wheelTeeth: number;
  module: number;
  faceWidth: number;
  pinionShift: number;
  wheelShift: number;
  pinionTipDiameter: number;
  wheelTipDiameter: number;
  /** Operating distance, allowance included. */
  centreDistance: number;
  /** At the operating distance. */
  contactRatio: number;
  /** At the worse end of the distance's tolerance band; null because no grade is given. */
  contactRatioWorst: number | null;
}

/** One train found for a request. */
export interface TrainOption {
  /** The same train always has the same key: `12/50m1+16/64m1`. */
  key: string;
  stages: OptionStage[];
  /** Exact, lowest terms, as strings of digits; the error is signed. */
  ratio: { numerator: string; denominator: string; value: number; errorPercent: number };
  /** Sum of the operating distances, mm. */
  centreDistanceSum: number;
  /** kg; solid discs at the reference diameter, 7,850 kg/m³. */
  mass: number;
  /** Outer size, mm. */
  box: Box;
  /** Angular backlash at the output shaft with the input held. */
  backlashArcmin: number;
  lossPercent: number | null;
  cost: number | null;
  newParts: number | null;
}

/** Length and height across the shafts, width along them; mm. */
export interface Box {
  length: number;
  width: number;
  height: number;
}

/** Why a stage count gives no option, or none among the best. */
export interface WhyNot {
  stages: number;
  /** The field whose limit stands in the way, such as `teeth.wheel.max`; `several` or `objective` otherwise. */
  limit: string;
  message: string;
  /** The least change of that limit that works, in the limit's own unit; null when there is none. */
  nearest: number | string | null;
  /** Merged over the request, this change makes an option of this stage count appear. */
  relaxed?: Partial<OptionRequest>;
}

export interface SearchOutcome {
  options: TrainOption[];
  search: {
    /** True when nothing in the space outranks the options returned. */
    complete: boolean;
    /** Trains settled, by looking at them or by a bound that rules them out. */
    combinations: number;
    elapsedMs: number;
  };
  whyNot: WhyNot[];
}

export interface SearchProgress {
  phase: string;
  stages: number;
  settled: number;
  total: number;
  found: number;
}

/** How a caller watches and ends a search. */
export interface SearchControl {
  onProgress?(progress: SearchProgress): void;
  /** Asked at least every 50 ms of work; true ends the search with the best found so far. */
  shouldStop?(): boolean;
  timeLimitMs?: number;
  /** Milliseconds from any origin; for tests. */
  now?(): number;
}
