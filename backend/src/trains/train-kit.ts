import { type KitGear, type KitRequest } from '@stageyard/libs/bill-of-materials';
import { standardRack } from '@stageyard/libs/gear-geometry';
import { describeTrain, type TrainFigures } from '@stageyard/libs/train-planner';
import { type AdoptedSpec, gearsOf } from './adopted-spec.js';

/** Wall of a housing when the brief says nothing of it, mm. */
export const STARTING_WALL = 5;

/** What the kit rules need to know of a train. */
export function kitOf(title: string, spec: AdoptedSpec, figures: TrainFigures): KitRequest {
  const wall = spec.envelope?.wall || STARTING_WALL;
  // Without a wall in the brief the box ends at the gears: the starting wall stands round it, not in it.
  const walled = spec.envelope?.wall
    ? figures
    : describeTrain({ ...spec, envelope: { ...spec.envelope, wall: STARTING_WALL } });
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
        rack: standardRack(spec.pressureAngleDeg),
        ...(gear.density === undefined ? {} : { density: gear.density }),
        ...(computed ? { figures: computed } : {}),
      };
    }),
    shafts: spec.shafts.map(({ diameter }, index) => {
      const span = walled.shafts[index];
      return { index, diameter, length: span ? Math.ceil(span.z2 - span.z1) : 0 };
    }),
    box: { ...walled.box, wall },
  };
}
