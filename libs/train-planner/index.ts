export type { Envelope, Objective, OptionRequest, PlannerShiftPolicy, WholeRange } from './option-request.js';
export type {
  Box,
  OptionStage,
  SearchControl,
  SearchOutcome,
  SearchProgress,
  TrainOption,
  WhyNot,
} from './train-option.js';
export type {
  SpecGear,
  SpecStage,
  TrainCheck,
  TrainFigures,
  TrainShaft,
  TrainSpec,
  Verdict,
} from './train-spec.js';
export { trainStrip, type StripGear, type StripShape } from './train-strip.js';
export { REQUEST_BOUNDS, validateOptionRequest } from './validate-request.js';
export { searchOptions } from './search-options.js';
export { describeTrain } from './describe-train.js';
export { leastTrain, type LeastTrain } from './least-train.js';
export { leastShaftDiameter } from './train-shafts.js';
