import { isDeepStrictEqual } from 'node:util';
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

/** How many trains may be built at once. */
export const BUILD_QUANTITY = { min: 1, max: 100_000 } as const;

/** One is built where nobody says otherwise. */
export const DEFAULT_BUILD_QUANTITY = 1;

/** What a brief asks for: an option request, with the duty and the build quantity beside it. */
export interface Requirement extends OptionRequest {
  duty?: Duty;
  /** Trains to be built at once; options are priced for so many. Nothing is searched by it. */
  buildQuantity?: number;
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
  const { duty, buildQuantity, ...request } = input as Record<string, unknown>;
  const issues = [...dutyIssues(duty), ...buildQuantityIssues(buildQuantity)];
  try {
    // A brief compares stage counts side by side, so each keeps its own best unless told otherwise.
    const checked = validateOptionRequest({ bestOf: 'each-count', ...request });
    if (issues.length === 0) {
      const kept = keptForm(checked, duty as Duty | null | undefined);
      return typeof buildQuantity === 'number' ? { ...kept, buildQuantity } : kept;
    }
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
export function optionRequestOf({
  duty: _duty,
  buildQuantity: _quantity,
  ...request
}: Requirement): OptionRequest {
  return request;
}

/** Whether what was found for one requirement still answers to the other: they differ in the build quantity at most. */
export function findsTheSame(one: Requirement, other: Requirement): boolean {
  const searched = (requirement: Requirement) => ({ ...requirement, buildQuantity: undefined });
  return isDeepStrictEqual(searched(one), searched(other));
}

function buildQuantityIssues(value: unknown): FieldIssue[] {
  if (!isGiven(value)) return [];
  const { min, max } = BUILD_QUANTITY;
  if (typeof value === 'number' && Number.isInteger(value) && value >= min && value <= max) return [];
  const limit = typeof value === 'number' && value > max ? max : min;
  const message = `The build quantity must be a whole number from ${min} to ${max.toLocaleString('en-GB')}.`;
  return [{ field: 'buildQuantity', value, limit, message }];
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
