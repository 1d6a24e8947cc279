import type { Brief, Requirement } from '../../../api/types';

/** The brief as it stands in the form: every figure is the text that was typed, so nothing typed is ever lost. */
export interface BriefForm {
  title: string;
  note: string;
  ratioTarget: string;
  tolerancePercent: string;
  stagesMin: string;
  stagesMax: string;
  pinionMin: string;
  pinionMax: string;
  wheelMin: string;
  wheelMax: string;
  /** mm, ascending. */
  modules: number[];
  pressureAngleDeg: string;
  helixAngleDeg: string;
  faceWidthFactor: string;
  shiftPolicy: 'none' | 'clear-undercut';
  leastContactRatio: string;
  centreDistanceAllowance: string;
  undercut: 'allow' | 'refuse';
  stageRatioMin: string;
  stageRatioMax: string;
  envelopeLength: string;
  envelopeWidth: string;
  envelopeHeight: string;
  envelopeWall: string;
  direction: 'any' | 'same' | 'opposite';
  objective: 'centre-distance' | 'ratio-error' | 'mass';
  limit: string;
  bestOf: 'each-count' | 'all';
  inputSpeed: string;
  outputTorque: string;
  applicationFactor: string;
  /** Trains to be built at once; blank: the options are not priced. */
  buildQuantity: string;
}

export type BriefField = keyof BriefForm;

/** A new brief: the ordinary workshop case, so that a title and a ratio are enough to search. */
export const NEW_BRIEF: BriefForm = {
  title: '',
  note: '',
  ratioTarget: '',
  tolerancePercent: '1',
  stagesMin: '1',
  stagesMax: '3',
  pinionMin: '17',
  pinionMax: '24',
  wheelMin: '20',
  wheelMax: '120',
  modules: [1],
  pressureAngleDeg: '20',
  helixAngleDeg: '0',
  faceWidthFactor: '10',
  shiftPolicy: 'clear-undercut',
  leastContactRatio: '1.2',
  centreDistanceAllowance: '0',
  undercut: 'refuse',
  stageRatioMin: '1',
  stageRatioMax: '',
  envelopeLength: '',
  envelopeWidth: '',
  envelopeHeight: '',
  envelopeWall: '',
  direction: 'any',
  objective: 'centre-distance',
  limit: '50',
  bestOf: 'each-count',
  inputSpeed: '',
  outputTorque: '',
  applicationFactor: '1.25',
  buildQuantity: '',
};

const text = (value: number | string | null | undefined): string => (value == null ? '' : String(value));

/** A saved brief as form text. Fields the requirement leaves out stand at their published default. */
export function formFromBrief(brief: Pick<Brief, 'title' | 'note' | 'requirement'>): BriefForm {
  return { title: brief.title, note: brief.note, ...formFromRequirement(brief.requirement) };
}

/** The searched part of a brief as form text; also how two requirements are held against each other. */
export function formFromRequirement(requirement: Requirement): Omit<BriefForm, 'title' | 'note'> {
  const { ratio, stages, teeth, stageRatio, envelope, duty } = requirement;
  return {
    ratioTarget: text(ratio.target),
    tolerancePercent: text(ratio.tolerancePercent),
    stagesMin: text(stages.min),
    stagesMax: text(stages.max),
    pinionMin: text(teeth.pinion.min),
    pinionMax: text(teeth.pinion.max),
    wheelMin: text(teeth.wheel.min),
    wheelMax: text(teeth.wheel.max),
    modules: [...requirement.modules].sort((a, b) => a - b),
    pressureAngleDeg: text(requirement.pressureAngleDeg ?? 20),
    helixAngleDeg: text(requirement.helixAngleDeg ?? 0),
    faceWidthFactor: text(requirement.faceWidthFactor ?? 10),
    shiftPolicy: requirement.shiftPolicy ?? 'none',
    leastContactRatio: text(requirement.leastContactRatio ?? 1.2),
    centreDistanceAllowance: text(requirement.centreDistanceAllowance ?? 0),
    undercut: requirement.undercut ?? 'allow',
    stageRatioMin: text(stageRatio?.min ?? 1),
    stageRatioMax: text(stageRatio?.max),
    envelopeLength: text(envelope?.length),
    envelopeWidth: text(envelope?.width),
    envelopeHeight: text(envelope?.height),
    envelopeWall: text(envelope?.wall),
    direction: requirement.direction ?? 'any',
    objective: requirement.objective,
    limit: text(requirement.limit ?? 50),
    bestOf: requirement.bestOf ?? 'all',
    inputSpeed: text(duty?.inputSpeed),
    outputTorque: text(duty?.outputTorque),
    applicationFactor: text(duty?.applicationFactor ?? 1.25),
    buildQuantity: text(requirement.buildQuantity),
  };
}
