import { type KitGear, type KitRequest } from '@stageyard/libs/bill-of-materials';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { type AdoptedSpec, gearsOf } from './adopted-spec.js';

/** Wall of a housing when the brief says nothing of it, mm. */
export const STARTING_WALL = 5;

/** What the kit rules need to know of a train. */
export function kitOf(title: string, spec: AdoptedSpec, figures: TrainFigures): KitRequest {
  return {
    trainTitle: title,
    centreDistances: spec.stages.map((stage) => stage.centreDistance),
    gears: gearsOf(spec).map(({ gear, module, stage, role }): KitGear => {
      const computed = figures.meshes[stage]?.gear[role];
      return {
        stage: stage + 1,
        role,
        partNumber: gear.partNumber,
        teeth: gear.teeth,
        module,
        pressureAngleDeg: spec.pressureAngleDeg,
        helixAngleDeg: spec.helixAngleDeg,
        hand: gear.hand ?? null,
        profileShift: gear.profileShift,
        faceWidth: gear.faceWidth,
        ...(gear.density === undefined ? {} : { density: gear.density }),
        ...(computed ? { figures: computed } : {}),
      };
    }),
    shafts: spec.shafts.map(({ diameter }, index) => {
      const span = figures.shafts[index];
      return { index, diameter, length: span ? Math.ceil(span.z2 - span.z1) : 0 };
    }),
    box: { ...figures.box, wall: spec.envelope?.wall || STARTING_WALL },
  };
}
