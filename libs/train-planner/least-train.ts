import { degToRad } from '../units/index.js';

/** What no train of a stage count can do with less. */
export interface LeastTrain {
  /** Teeth of the largest wheel. */
  wheelTeeth: number;
  /** Sum of the reference centre distances, mm. */
  centreDistanceSum: number;
}

/**
 * Lower bounds for every train of some stages without negative profile shift: the stage ratios multiply to the train
 * ratio, so one of them is at least its nth root, and a sum of numbers with a given product is least when they are
 * equal.
 * @param stages how many, ≥ 1
 * @param ratio least train ratio allowed, > 0
 * @param pinionTeeth least teeth of a pinion
 * @param module smallest normal module, mm
 * @param helixAngleDeg degrees, 0 to 45
 */
export function leastTrain(
  stages: number,
  ratio: number,
  pinionTeeth: number,
  module: number,
  helixAngleDeg = 0,
): LeastTrain {
  const stageRatio = ratio ** (1 / stages);
  const stageTeeth = pinionTeeth * (1 + stageRatio);
  return {
    // A hair low, so that a whole number is not lifted by float noise.
    wheelTeeth: Math.ceil(pinionTeeth * stageRatio - 1e-6),
    // a = m (z1 + z2)/(2 cos β)
    centreDistanceSum: (stages * module * stageTeeth) / (2 * Math.cos(degToRad(helixAngleDeg))),
  };
}
