import { type TrainOption } from './train-option.js';
import { type TrainSpec } from './train-spec.js';

/** One gear of the strip; mm. */
export interface StripGear {
  x: number;
  y: number;
  tipRadius: number;
  /** Operating pitch circle: a pinion's and its wheel's touch. */
  pitchRadius: number;
  /** 0 for the first stage. */
  stage: number;
  role: 'pinion' | 'wheel';
}

/** The train seen along its shafts, to scale, y upwards, the input axis at the origin; mm. */
export interface StripShape {
  bounds: { x: number; y: number; width: number; height: number };
  axes: { x: number; y: number }[];
  gears: StripGear[];
  inputArrow: { x: number; y: number; radius: number; clockwise: boolean };
}

interface StripStage {
  centreDistance: number;
  teeth: [number, number];
  tipRadii: [number, number];
}

/** Drawing data of a train in line, for a described train and for a search option alike. */
export function trainStrip(train: TrainSpec | TrainOption): StripShape {
  const gears: StripGear[] = [];
  const axes = [{ x: 0, y: 0 }];
  let x = 0;
  stripStages(train).forEach(({ centreDistance, teeth, tipRadii }, stage) => {
    const pinionShare = teeth[0] / (teeth[0] + teeth[1]);
    const pinionPitch = centreDistance * pinionShare;
    gears.push({ x, y: 0, tipRadius: tipRadii[0], pitchRadius: pinionPitch, stage, role: 'pinion' });
    x += centreDistance;
    axes.push({ x, y: 0 });
    const wheelPitch = centreDistance - pinionPitch;
    gears.push({ x, y: 0, tipRadius: tipRadii[1], pitchRadius: wheelPitch, stage, role: 'wheel' });
  });
  const left = Math.min(...gears.map((gear) => gear.x - gear.tipRadius));
  const right = Math.max(...gears.map((gear) => gear.x + gear.tipRadius));
  const reach = Math.max(...gears.map((gear) => gear.tipRadius));
  const inputRadius = gears[0]?.tipRadius ?? 0;
  return {
    bounds: { x: left, y: -reach, width: right - left, height: 2 * reach },
    axes,
    gears,
    inputArrow: { x: 0, y: 0, radius: inputRadius * 1.25, clockwise: true },
  };
}

function stripStages(train: TrainSpec | TrainOption): StripStage[] {
  if (!('helixAngleDeg' in train)) {
    return train.stages.map((stage) => ({
      centreDistance: stage.centreDistance,
      teeth: [stage.pinionTeeth, stage.wheelTeeth],
      tipRadii: [stage.pinionTipDiameter / 2, stage.wheelTipDiameter / 2],
    }));
  }
  const cosHelix = Math.cos((train.helixAngleDeg * Math.PI) / 180);
  return train.stages.map(({ module, centreDistance, pinion, wheel }) => {
    // r_a = m z/(2 cos β) + m (h_a + x) with the standard addendum h_a = 1.
    const tipRadius = (gear: typeof pinion) => module * (gear.teeth / (2 * cosHelix) + 1 + gear.profileShift);
    return {
      centreDistance,
      teeth: [pinion.teeth, wheel.teeth],
      tipRadii: [tipRadius(pinion), tipRadius(wheel)],
    };
  });
}
