/** A demo brief; `requirement` has the fields of the option search plus the recorded duty. */
export interface BriefRow {
  title: string;
  note: string;
  /** Books a train from the best option of the first search. */
  adoptAs: string | null;
  requirement: {
    ratio: { target: string; tolerancePercent: number };
    stages: { min: number; max: number };
    teeth: { pinion: { min: number; max: number }; wheel: { min: number; max: number } };
    modules: number[];
    pressureAngleDeg: number;
    helixAngleDeg: number;
    faceWidthFactor: number;
    shiftPolicy: 'none' | 'clear-undercut';
    leastContactRatio: number;
    centreDistanceAllowance: number;
    undercut: 'allow' | 'refuse';
    stageRatio?: { min: number; max: number };
    envelope?: { length: number; width: number; height: number; wall: number };
    arrangement: 'in-line';
    direction: 'same' | 'opposite' | 'any';
    source: 'any';
    objective: 'centre-distance' | 'ratio-error' | 'mass';
    limit: number;
    /** Drives of one batch. */
    buildQuantity?: number;
    duty: { inputSpeed?: number; outputTorque?: number; applicationFactor?: number };
  };
}

const USUAL = {
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  faceWidthFactor: 10,
  shiftPolicy: 'none',
  leastContactRatio: 1.2,
  centreDistanceAllowance: 0.02,
  undercut: 'refuse',
  arrangement: 'in-line',
  direction: 'any',
  source: 'any',
  limit: 50,
} as const;

export const DEMO_BRIEFS: BriefRow[] = [
  {
    title: '37.5 : 1 kelp-line winch',
    note: 'Hand-off drive for the line winch on the harvest raft. Must fit the box that the old worm drive leaves free.',
    adoptAs: null,
    requirement: {
      ...USUAL,
      ratio: { target: '37.5', tolerancePercent: 1 },
      stages: { min: 1, max: 3 },
      teeth: { pinion: { min: 17, max: 40 }, wheel: { min: 17, max: 120 } },
      modules: [1, 1.25, 1.5],
      envelope: { length: 220, width: 90, height: 140, wall: 6 },
      objective: 'centre-distance',
      buildQuantity: 3,
      duty: { inputSpeed: 1400, outputTorque: 45, applicationFactor: 1.25 },
    },
  },
  {
    title: '60 : 1 glasshouse vent drive',
    note: 'Opens the roof vents of glasshouse 2. Runs in both directions, a few minutes a day.',
    adoptAs: 'Vent drive, roof row 2',
    requirement: {
      ...USUAL,
      ratio: { target: '60', tolerancePercent: 0.5 },
      stages: { min: 2, max: 3 },
      teeth: { pinion: { min: 17, max: 30 }, wheel: { min: 20, max: 120 } },
      modules: [1.5, 2],
      stageRatio: { min: 1, max: 8 },
      direction: 'opposite',
      objective: 'mass',
      buildQuantity: 8,
      duty: { inputSpeed: 900, outputTorque: 80, applicationFactor: 1.25 },
    },
  },
  {
    title: '12.5 : 1 packing turntable',
    note: 'Quiet drive for the packing table beside the sorting line: helical, so that people can talk over it.',
    adoptAs: 'Packing turntable drive',
    requirement: {
      ...USUAL,
      ratio: { target: '12.5', tolerancePercent: 0.25 },
      stages: { min: 2, max: 2 },
      teeth: { pinion: { min: 16, max: 40 }, wheel: { min: 16, max: 100 } },
      modules: [1.5],
      helixAngleDeg: 15,
      faceWidthFactor: 12,
      direction: 'same',
      objective: 'ratio-error',
      buildQuantity: 2,
      duty: { inputSpeed: 1400, outputTorque: 30, applicationFactor: 1 },
    },
  },
  {
    title: '5.2 : 1 seeding-line capstan',
    note: 'One stage if it can be done; small pinions with profile shift are welcome.',
    adoptAs: null,
    requirement: {
      ...USUAL,
      ratio: { target: '5.2', tolerancePercent: 1 },
      stages: { min: 1, max: 2 },
      teeth: { pinion: { min: 11, max: 30 }, wheel: { min: 20, max: 120 } },
      modules: [2, 2.5, 3],
      shiftPolicy: 'clear-undercut',
      undercut: 'refuse',
      objective: 'centre-distance',
      duty: { inputSpeed: 960, outputTorque: 60, applicationFactor: 1.5 },
    },
  },
  {
    title: '150 : 1 rope tensioner in a 90 mm box',
    note: 'The fitter asked whether it can be done at all. Kept because the answer says what would have to give.',
    adoptAs: null,
    requirement: {
      ...USUAL,
      ratio: { target: '150', tolerancePercent: 1 },
      stages: { min: 1, max: 3 },
      teeth: { pinion: { min: 17, max: 30 }, wheel: { min: 20, max: 120 } },
      modules: [1],
      envelope: { length: 90, width: 60, height: 60, wall: 4 },
      objective: 'centre-distance',
      duty: { inputSpeed: 1400, outputTorque: 12, applicationFactor: 1.25 },
    },
  },
];
