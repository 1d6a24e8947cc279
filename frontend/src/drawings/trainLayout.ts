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
  let z = 0;
  const planes = stages.map(({ faces }) => {
    const face = Math.max(...faces);
    const plane = { from: z, to: z + face };
    z += face + gap;
    return plane;
  });
  const depth = z - gap;
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
  const spare = figures ? (figures.box.length - strip.bounds.width) / 2 : 0;
  // A wall thinner than a hundredth is rounding, not a wall.
  const wall = spare > 0.01 ? spare : 0;
  // A shaft spans its gears' planes and half a gap each side; the first and the last run through their walls.
  const through = Math.max(gap / 2, wall);
  const shafts = strip.axes.map(({ x }, shaft): LaidShaft => {
    const known = figures?.shafts[shaft];
    const first = planes[Math.max(0, shaft - 1)]?.from ?? 0;
    const final = planes[Math.min(planes.length - 1, shaft)]?.to ?? depth;
    return {
      x,
      z1: known?.z1 ?? first - (shaft === 0 ? through : gap / 2),
      z2: known?.z2 ?? final + (shaft === last ? through : gap / 2),
      diameter: diameters?.[shaft] ?? known?.leastDiameter ?? null,
    };
  });
  return { strip, gears, shafts, depth, wall };
}
