import {
  trainStrip,
  type StripShape,
  type TrainFigures,
  type TrainOption,
  type TrainSpec,
} from '@stageyard/libs/train-planner';

/** One gear in both views; mm, x along the line of axes, z along the shafts from the input's inner wall. */
export interface LaidGear {
  key: string;
  role: 'pinion' | 'wheel';
  stage: number;
  teeth: number;
  x: number;
  tipRadius: number;
  pitchRadius: number;
  z1: number;
  z2: number;
}

export interface LaidShaft {
  x: number;
  z1: number;
  z2: number;
  /** mm; null while no torque decides it. */
  diameter: number | null;
}

/** A train laid out for drawing; mm. */
export interface TrainLayout {
  strip: StripShape;
  gears: LaidGear[];
  shafts: LaidShaft[];
  /** Inner width along the shafts. */
  depth: number;
  /** Wall thickness of the box drawn round it. */
  wall: number;
}

const DEFAULT_GAP = 5;

/** Lays a described train or a bare option out; what the figures know (spans, box) goes before what is derived here. */
export function layOut(
  train: TrainSpec | TrainOption,
  figures: TrainFigures | undefined,
  diameters: readonly (number | null)[] | undefined,
): TrainLayout {
  const strip = trainStrip(train);
  const gap = 'gap' in train && train.gap !== undefined ? train.gap : DEFAULT_GAP;
  const stages = train.stages.map((stage) =>
    'pinionTeeth' in stage
      ? { teeth: [stage.pinionTeeth, stage.wheelTeeth], faces: [stage.faceWidth, stage.faceWidth] }
      : {
          teeth: [stage.pinion.teeth, stage.wheel.teeth],
          faces: [stage.pinion.faceWidth, stage.wheel.faceWidth],
        },
  );
  let z = gap / 2;
  const planes = stages.map(({ faces }) => {
    const face = Math.max(...faces);
    const plane = { from: z, to: z + face };
    z += face + gap;
    return plane;
  });
  const depth = z - gap / 2;
  const gears = strip.gears.map((gear): LaidGear => {
    const plane = planes[gear.stage] ?? { from: 0, to: 0 };
    const which = gear.role === 'pinion' ? 0 : 1;
    const face = stages[gear.stage]?.faces[which] ?? 0;
    const middle = (plane.from + plane.to) / 2;
    return {
      ...gear,
      key: `${gear.stage}-${gear.role}`,
      teeth: stages[gear.stage]?.teeth[which] ?? 0,
      z1: middle - face / 2,
      z2: middle + face / 2,
    };
  });
  const last = strip.axes.length - 1;
  const shafts = strip.axes.map(({ x }, shaft): LaidShaft => {
    const known = figures?.shafts[shaft];
    const from = shaft === 0 ? 0 : (planes[shaft - 1]?.from ?? 0) - gap / 2;
    const to = shaft === last ? depth : (planes[shaft]?.to ?? depth) + gap / 2;
    return {
      x,
      z1: shaft === 0 ? 0 : from,
      z2: shaft === 0 && last > 0 ? (planes[0]?.to ?? depth) + gap / 2 : to,
      diameter: diameters?.[shaft] ?? known?.leastDiameter ?? null,
    };
  });
  const wall = figures ? Math.max(0, (figures.box.length - strip.bounds.width) / 2) : 0;
  return { strip, gears, shafts, depth, wall };
}
