import { type OptionRequest, validateOptionRequest } from '@stageyard/libs/train-planner';
import { type FieldIssue, InputError } from '@stageyard/libs/units';
import { badInput } from '../common/errors.js';

/** Recorded for speeds and shaft sizes; strength is not rated from it. */
export interface Duty {
  /** rpm */
  inputSpeed?: number;
  /** N·m */
  outputTorque?: number;
  /** K_A, how rough the drive and the load are. */
  applicationFactor?: number;
}

/** What a brief asks for: an option request, and the duty beside it. */
export interface Requirement extends OptionRequest {
  duty?: Duty;
}

interface DutyBound {
  above?: number;
  min?: number;
  max: number;
  unit: string;
  label: string;
}

const DUTY_BOUNDS: Record<keyof Duty, DutyBound> = {
  inputSpeed: { above: 0, max: 100_000, unit: ' rpm', label: 'The input speed' },
  outputTorque: { above: 0, max: 1_000_000, unit: ' N·m', label: 'The output torque' },
  applicationFactor: { min: 1, max: 5, unit: '', label: 'The application factor' },
};

/**
 * Checks a requirement as it came in and gives the form that is kept: only known fields, the target as decimal text.
 * @throws ProblemError 400 naming every field at fault, paths beginning with `requirement.`
 */
export function checkRequirement(input: object): Requirement {
  const { duty, ...request } = input as Record<string, unknown>;
  const issues = dutyIssues(duty);
  try {
    // A brief compares stage counts side by side, so each keeps its own best unless told otherwise.
    const checked = validateOptionRequest({ bestOf: 'each-count', ...request });
    if (issues.length === 0) return keptForm(checked, duty as Duty | null | undefined);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    issues.unshift(...error.errors);
  }
  throw badInput(issues.map((issue) => ({ ...issue, field: `requirement.${issue.field}` })));
}

function keptForm(checked: ReturnType<typeof validateOptionRequest>, duty?: Duty | null): Requirement {
  const { target, tolerancePercent } = checked.ratio;
  const given = Object.entries(duty ?? {}).filter(([, value]) => isGiven(value));
  return {
    ...checked,
    ratio: { target: String(target), tolerancePercent: String(tolerancePercent) },
    ...(given.length > 0 ? { duty: Object.fromEntries(given) } : {}),
  };
}

/** A form sends null for a field that was emptied. */
function isGiven(value: unknown): boolean {
  return value !== undefined && value !== null;
}

/** The part of a requirement that the planner searches by. */
export function optionRequestOf({ duty: _duty, ...request }: Requirement): OptionRequest {
  return request;
}

function dutyIssues(duty: unknown): FieldIssue[] {
  if (!isGiven(duty)) return [];
  if (typeof duty !== 'object' || duty === null || Array.isArray(duty)) {
    return [
      { field: 'duty', value: duty, message: 'The duty must hold speed, torque and application factor.' },
    ];
  }
  return Object.entries(duty).flatMap(([name, value]): FieldIssue[] => {
    const field = `duty.${name}`;
    if (!isGiven(value)) return [];
    if (!Object.hasOwn(DUTY_BOUNDS, name)) {
      return [{ field, value, message: `The duty has no field “${name.slice(0, 40)}”. Leave it out.` }];
    }
    const { above, min, max, unit, label } = DUTY_BOUNDS[name as keyof Duty];
    const low = above ?? min ?? 0;
    const fits =
      typeof value === 'number' && value <= max && (above === undefined ? value >= low : value > low);
    if (fits) return [];
    const from = above === undefined ? `from ${low}` : `above ${above}`;
    const to = `${above === undefined ? 'to' : 'and at most'} ${max.toLocaleString('en-GB')}${unit}`;
    const limit = typeof value === 'number' && value > max ? max : low;
    return [{ field, value, limit, message: `${label} must be a number ${from} ${to}.` }];
  });
}
