import { type TrainOption } from '@stageyard/libs/train-planner';
import { type Requirement } from '../briefs/requirement.js';
import { type AdoptedGear, type AdoptedSpec, type AdoptedStage } from './adopted-spec.js';

const DEFAULTS = { pressureAngleDeg: 20, helixAngleDeg: 0, leastContactRatio: 1.2 } as const;

/**
 * The specification of a train that is to be what a search found: no parts chosen and no shafts sized yet.
 * In a helical train the hands alternate, so that both gears of a shaft between two stages have the same hand: the one
 * is driven and the other drives, and their axial forces then oppose each other.
 * @param requirement as it was searched: the option answers to it, not to a later state of the brief
 */
export function specFromOption(option: TrainOption, requirement: Requirement): AdoptedSpec {
  const { ratio, envelope, duty } = requirement;
  const helixAngleDeg = requirement.helixAngleDeg ?? DEFAULTS.helixAngleDeg;
  return {
    pressureAngleDeg: requirement.pressureAngleDeg ?? DEFAULTS.pressureAngleDeg,
    helixAngleDeg,
    target: { ratio: String(ratio.target), tolerancePercent: String(ratio.tolerancePercent) },
    leastContactRatio: requirement.leastContactRatio ?? DEFAULTS.leastContactRatio,
    ...(duty?.inputSpeed === undefined ? {} : { inputSpeed: duty.inputSpeed }),
    ...(duty?.outputTorque === undefined ? {} : { outputTorque: duty.outputTorque }),
    ...(duty?.applicationFactor === undefined ? {} : { applicationFactor: duty.applicationFactor }),
    ...(envelope ? { envelope } : {}),
    stages: option.stages.map((stage, index): AdoptedStage => {
      const gear = (teeth: number, profileShift: number, hand: 'left' | 'right'): AdoptedGear => ({
        teeth,
        profileShift,
        faceWidth: stage.faceWidth,
        ...(helixAngleDeg > 0 ? { hand } : {}),
        partNumber: null,
      });
      const [pinionHand, wheelHand] =
        index % 2 === 0 ? (['right', 'left'] as const) : (['left', 'right'] as const);
      return {
        module: stage.module,
        centreDistance: stage.centreDistance,
        pinion: gear(stage.pinionTeeth, stage.pinionShift, pinionHand),
        wheel: gear(stage.wheelTeeth, stage.wheelShift, wheelHand),
      };
    }),
    shafts: [],
  };
}
