import type { BriefField } from './briefForm';

/** Where each field of the form lives in the requirement, and what the screen calls it. */
export const FIELD_NAMES: Record<BriefField, { path: string; label: string }> = {
  title: { path: 'title', label: 'Title' },
  note: { path: 'note', label: 'Note' },
  ratioTarget: { path: 'ratio.target', label: 'Ratio' },
  tolerancePercent: { path: 'ratio.tolerancePercent', label: 'Tolerance' },
  stagesMin: { path: 'stages.min', label: 'Stages from' },
  stagesMax: { path: 'stages.max', label: 'Stages to' },
  pinionMin: { path: 'teeth.pinion.min', label: 'Pinion teeth from' },
  pinionMax: { path: 'teeth.pinion.max', label: 'Pinion teeth to' },
  wheelMin: { path: 'teeth.wheel.min', label: 'Wheel teeth from' },
  wheelMax: { path: 'teeth.wheel.max', label: 'Wheel teeth to' },
  modules: { path: 'modules', label: 'Modules' },
  pressureAngleDeg: { path: 'pressureAngleDeg', label: 'Pressure angle' },
  helixAngleDeg: { path: 'helixAngleDeg', label: 'Helix angle' },
  faceWidthFactor: { path: 'faceWidthFactor', label: 'Face width' },
  shiftPolicy: { path: 'shiftPolicy', label: 'Profile shift' },
  leastContactRatio: { path: 'leastContactRatio', label: 'Least contact ratio' },
  centreDistanceAllowance: { path: 'centreDistanceAllowance', label: 'Centre-distance allowance' },
  undercut: { path: 'undercut', label: 'Undercut' },
  stageRatioMin: { path: 'stageRatio.min', label: 'Stage ratio from' },
  stageRatioMax: { path: 'stageRatio.max', label: 'Stage ratio to' },
  envelopeLength: { path: 'envelope.length', label: 'Box length' },
  envelopeWidth: { path: 'envelope.width', label: 'Box width' },
  envelopeHeight: { path: 'envelope.height', label: 'Box height' },
  envelopeWall: { path: 'envelope.wall', label: 'Wall' },
  direction: { path: 'direction', label: 'Output turns' },
  objective: { path: 'objective', label: 'Best by' },
  limit: { path: 'limit', label: 'Options to keep' },
  bestOf: { path: 'bestOf', label: 'Keep the best' },
  inputSpeed: { path: 'duty.inputSpeed', label: 'Input speed' },
  outputTorque: { path: 'duty.outputTorque', label: 'Output torque' },
  applicationFactor: { path: 'duty.applicationFactor', label: 'Application factor' },
  buildQuantity: { path: 'buildQuantity', label: 'Build quantity' },
};

/** Whole groups and the field that stands for them on the screen. */
const GROUPS: Record<string, BriefField> = {
  ratio: 'ratioTarget',
  stages: 'stagesMax',
  teeth: 'pinionMin',
  'teeth.pinion': 'pinionMin',
  'teeth.wheel': 'wheelMin',
  stageRatio: 'stageRatioMax',
  envelope: 'envelopeLength',
  duty: 'inputSpeed',
};

const BY_PATH = new Map(
  Object.entries(FIELD_NAMES).map(([field, { path }]) => [path, field as BriefField] as const),
);

/** The form field for a path in an answer (`requirement.teeth.pinion.min`, `modules.2`, `modules[2]`), or null. */
export function fieldForPath(path: string): BriefField | null {
  let rest = path.replace(/^requirement\./, '').replace(/\[(\d+)\]/g, '.$1');
  while (rest !== '') {
    const field = BY_PATH.get(rest) ?? GROUPS[rest];
    if (field) return field;
    const dot = rest.lastIndexOf('.');
    rest = dot < 0 ? '' : rest.slice(0, dot);
  }
  return null;
}
