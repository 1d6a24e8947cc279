import type { PartKind, PartStanding } from '../../api/types';

/** One attribute of a kind as the form and the part page show it; the server holds the limits. */
export interface AttributeField {
  name: string;
  label: string;
  type: 'figure' | 'text' | 'choice';
  unit?: string;
  required?: boolean;
  whole?: boolean;
  choices?: readonly { value: string; name: string }[];
  hint?: string;
  /** Prefilled in a new part. */
  start?: string;
}

const mm = (name: string, label: string, required = true): AttributeField => ({
  name,
  label,
  type: 'figure',
  unit: 'mm',
  required,
});

const text = (name: string, label: string, required: boolean, hint?: string): AttributeField => ({
  name,
  label,
  type: 'text',
  required,
  ...(hint === undefined ? {} : { hint }),
});

const PRESSURE_ANGLES = ['14.5', '15', '17.5', '20', '22.5', '25'];

const TOOTHED: readonly AttributeField[] = [
  { name: 'teeth', label: 'Teeth', type: 'figure', required: true, whole: true },
  { name: 'module', label: 'Module', type: 'figure', unit: 'mm', required: true },
  {
    name: 'pressureAngleDeg',
    label: 'Pressure angle',
    type: 'choice',
    unit: '°',
    choices: PRESSURE_ANGLES.map((value) => ({ value, name: `${value}°` })),
    start: '20',
  },
  {
    name: 'helixAngleDeg',
    label: 'Helix angle',
    type: 'figure',
    unit: '°',
    hint: '0 for a spur gear',
    start: '0',
  },
  {
    name: 'hand',
    label: 'Hand',
    type: 'choice',
    choices: [
      { value: '', name: 'none (spur)' },
      { value: 'left', name: 'left' },
      { value: 'right', name: 'right' },
    ],
  },
  { name: 'profileShift', label: 'Profile shift x', type: 'figure', hint: 'Blank if the maker does not say' },
  mm('faceWidth', 'Face width'),
];

const FINISH: readonly AttributeField[] = [
  { ...mm('thicknessAllowanceUpper', 'Tooth allowance, upper', false), hint: 'On thickness, 0 or below' },
  { ...mm('thicknessAllowanceLower', 'Tooth allowance, lower', false), hint: '0 or below' },
  text('heatTreatment', 'Heat treatment', false),
  text('hardness', 'Hardness', false, 'With its scale, such as 58 HRC'),
];

/** The attributes of every kind, in the order in which people state them. */
export const ATTRIBUTES: Record<PartKind, readonly AttributeField[]> = {
  gear: [
    ...TOOTHED,
    mm('bore', 'Bore'),
    mm('hubDiameter', 'Hub diameter', false),
    mm('hubLength', 'Hub length', false),
    ...FINISH,
  ],
  'pinion-shaft': [
    ...TOOTHED,
    mm('shaftDiameter', 'Shaft diameter'),
    mm('shaftLength', 'Shaft length'),
    ...FINISH,
  ],
  shaft: [mm('diameter', 'Diameter'), mm('length', 'Length')],
  bearing: [
    mm('bore', 'Bore'),
    mm('outerDiameter', 'Outer diameter'),
    mm('width', 'Width'),
    text('type', 'Type', true, 'Such as deep groove ball'),
    { name: 'dynamicLoadRating', label: 'Dynamic load rating C', type: 'figure', unit: 'kN' },
    { name: 'staticLoadRating', label: 'Static load rating C0', type: 'figure', unit: 'kN' },
  ],
  key: [mm('width', 'Width b'), mm('height', 'Height h'), mm('length', 'Length')],
  'retaining-ring': [
    mm('shaftDiameter', 'Shaft diameter'),
    mm('thickness', 'Thickness'),
    mm('grooveDiameter', 'Groove diameter'),
  ],
  seal: [mm('shaftDiameter', 'Shaft diameter'), mm('outerDiameter', 'Outer diameter'), mm('width', 'Width')],
  housing: [mm('length', 'Length'), mm('width', 'Width'), mm('height', 'Height'), mm('wall', 'Wall')],
  fastener: [
    text('thread', 'Thread', true, 'Such as M6'),
    mm('length', 'Length'),
    text('strengthClass', 'Strength class', true, 'Such as 8.8'),
  ],
  lubricant: [
    text('viscosityGrade', 'Viscosity grade', true, 'Such as ISO VG 220'),
    { name: 'packVolume', label: 'Pack volume', type: 'figure', unit: 'l', required: true },
  ],
  other: [],
};

export const KIND_NAMES: Record<PartKind, string> = {
  gear: 'Gear',
  'pinion-shaft': 'Pinion shaft',
  shaft: 'Shaft',
  bearing: 'Bearing',
  key: 'Key',
  'retaining-ring': 'Retaining ring',
  seal: 'Seal',
  housing: 'Housing',
  fastener: 'Fastener',
  lubricant: 'Lubricant',
  other: 'Other',
};

export const PART_KINDS = Object.keys(KIND_NAMES) as PartKind[];

export const STANDINGS: readonly PartStanding[] = ['draft', 'cleared', 'withdrawn'];

export function isToothed(kind: PartKind): boolean {
  return kind === 'gear' || kind === 'pinion-shaft';
}
