import { readDecimal } from '../../../components/decimalText';
import type { Requirement } from '../../../api/types';
import type { BriefField, BriefForm } from './briefForm';
import { FIELD_NAMES } from './fieldNames';

export interface FormIssue {
  field: BriefField;
  message: string;
}

export type RequirementReading =
  { requirement: Requirement; issues: [] } | { requirement: null; issues: FormIssue[] };

/**
 * The form's text as a requirement for the server. Only reading is done here (is it a number, is it whole, is it
 * there at all); what a figure may be is judged by the planner, so that both sides refuse the same things.
 */
export function requirementFromForm(form: BriefForm): RequirementReading {
  const issues: FormIssue[] = [];
  const reader = new FieldReader(form, issues);

  const target = reader.decimalText('ratioTarget');
  const requirement: Requirement = {
    ratio: { target, tolerancePercent: reader.decimalText('tolerancePercent') },
    stages: { min: reader.whole('stagesMin'), max: reader.whole('stagesMax') },
    teeth: {
      pinion: { min: reader.whole('pinionMin'), max: reader.whole('pinionMax') },
      wheel: { min: reader.whole('wheelMin'), max: reader.whole('wheelMax') },
    },
    modules: [...form.modules],
    pressureAngleDeg: reader.number('pressureAngleDeg') as Requirement['pressureAngleDeg'],
    helixAngleDeg: reader.number('helixAngleDeg', 0),
    faceWidthFactor: reader.number('faceWidthFactor', 10),
    shiftPolicy: form.shiftPolicy,
    leastContactRatio: reader.number('leastContactRatio', 1.2),
    centreDistanceAllowance: reader.number('centreDistanceAllowance', 0),
    undercut: form.undercut,
    stageRatio: readStageRatio(reader),
    arrangement: 'in-line',
    source: 'any',
    direction: form.direction,
    objective: form.objective,
    limit: reader.whole('limit', 50),
    bestOf: form.bestOf,
    duty: readDuty(reader),
  };
  const buildQuantity = reader.optionalWhole('buildQuantity');
  if (buildQuantity !== null) requirement.buildQuantity = buildQuantity;
  const envelope = readEnvelope(reader);
  if (envelope) requirement.envelope = envelope;

  if (form.title.trim() === '') {
    issues.unshift({ field: 'title', message: 'Give the brief a title, so that others find it.' });
  }
  if (form.modules.length === 0) issues.push({ field: 'modules', message: 'Choose at least one module.' });
  return issues.length > 0 ? { requirement: null, issues } : { requirement, issues: [] };
}

/** Kept as decimal text, so that the planner compares exactly; without an upper limit there is none. */
function readStageRatio(reader: FieldReader): Requirement['stageRatio'] {
  const max = reader.optionalText('stageRatioMax');
  return { min: reader.optionalText('stageRatioMin') ?? '1', ...(max === null ? {} : { max }) };
}

/** Only the sides that were given are limited; without any side there is no box at all. */
function readEnvelope(reader: FieldReader): Requirement['envelope'] | null {
  const length = reader.optional('envelopeLength');
  const width = reader.optional('envelopeWidth');
  const height = reader.optional('envelopeHeight');
  const wall = reader.optional('envelopeWall');
  if (length === null && width === null && height === null) return null;
  return {
    ...(length === null ? {} : { length }),
    ...(width === null ? {} : { width }),
    ...(height === null ? {} : { height }),
    wall: wall ?? 0,
  };
}

/** The factor K_A always has a value; speed and torque only when they were given. */
function readDuty(reader: FieldReader): Requirement['duty'] {
  const inputSpeed = reader.optional('inputSpeed');
  const outputTorque = reader.optional('outputTorque');
  return {
    ...(inputSpeed === null ? {} : { inputSpeed }),
    ...(outputTorque === null ? {} : { outputTorque }),
    applicationFactor: reader.number('applicationFactor', 1.25),
  };
}

/** Reads one field after another and notes what cannot be read; a noted field reads as 0 and is never sent. */
class FieldReader {
  constructor(
    private readonly form: BriefForm,
    private readonly issues: FormIssue[],
  ) {}

  decimalText(field: BriefField): string {
    return this.read(field)?.text ?? this.missing(field, '0');
  }

  number(field: BriefField, whenBlank?: number): number {
    return this.read(field)?.value ?? whenBlank ?? this.missing(field, 0);
  }

  whole(field: BriefField, whenBlank?: number): number {
    const value = this.number(field, whenBlank);
    if (!Number.isInteger(value)) {
      this.issues.push({ field, message: `${FIELD_NAMES[field].label} must be a whole number.` });
    }
    return value;
  }

  optionalWhole(field: BriefField): number | null {
    return this.read(field) === null ? null : this.whole(field);
  }

  optionalText(field: BriefField): string | null {
    return this.read(field)?.text ?? null;
  }

  optional(field: BriefField): number | null {
    return this.read(field)?.value ?? null;
  }

  private read(field: BriefField): { text: string; value: number } | null {
    const reading = readDecimal(String(this.form[field]));
    if (reading.kind === 'problem') this.issues.push({ field, message: reading.message });
    return reading.kind === 'number' ? reading : null;
  }

  private missing<T>(field: BriefField, standIn: T): T {
    if (!this.issues.some((issue) => issue.field === field)) {
      this.issues.push({ field, message: `${FIELD_NAMES[field].label} is missing.` });
    }
    return standIn;
  }
}
