import { ValidationPipe } from '@nestjs/common';
import { getMetadataStorage, type ValidationError } from 'class-validator';
import { badInput, type FieldIssue, type ProblemError } from './errors.js';

/** Checks every input by its DTO: unknown fields are refused, nothing is converted silently. */
export function inputPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: true,
    transform: true,
    // The checks' limits are looked up by the class of the input.
    validationError: { target: true, value: true },
    transformOptions: { enableImplicitConversion: false, exposeUnsetFields: false },
    exceptionFactory: (errors) => validationProblem(errors),
  });
}

/** The refusal that lists every field at fault. */
export function validationProblem(errors: ValidationError[]): ProblemError {
  const issues = errors.flatMap((error) => issuesOf(error, ''));
  if (issues.length > 0) return badInput(issues);
  return badInput([], 'The request must hold one JSON object with the fields of this kind of thing.');
}

function issuesOf(error: ValidationError, prefix: string): FieldIssue[] {
  const field = prefix + error.property;
  const own = Object.entries(error.constraints ?? {});
  // Several checks of one field often say the same thing; the first declared is the plainest.
  const last = own.at(-1);
  const issues = last ? [issueOf(error, field, ...last)] : [];
  return [...issues, ...(error.children ?? []).flatMap((child) => issuesOf(child, `${field}.`))];
}

function issueOf(error: ValidationError, field: string, rule: string, given: string): FieldIssue {
  const limits = limitsOf(error, rule);
  const [limit] = limits;
  const say = SENTENCES[rule];
  const message = say ? say(field, limits, error.value) : sentence(given.replaceAll(error.property, field));
  const isPlain = typeof limit === 'number' || typeof limit === 'string';
  return { field, value: error.value as unknown, ...(isPlain && { limit }), message };
}

/** The figures given to the decorator, which the error itself does not carry. */
function limitsOf(error: ValidationError, rule: string): unknown[] {
  const type = error.target?.constructor;
  if (!type) return [];
  const rules = getMetadataStorage().getTargetValidationMetadatas(type, '', false, false);
  const found = rules.find(({ propertyName, name }) => propertyName === error.property && name === rule);
  return (found?.constraints as unknown[] | undefined) ?? [];
}

type Sentence = (field: string, limits: unknown[], value: unknown) => string;

const SENTENCES: Record<string, Sentence> = {
  whitelistValidation: (field) => `“${shortened(field)}” is not a field of this request. Leave it out.`,
  isString: (field) => `${field} must be text.`,
  isInt: (field) => `${field} must be a whole number.`,
  isNumber: (field) => `${field} must be a number.`,
  isBoolean: (field) => `${field} must be true or false.`,
  isObject: (field) => `${field} must be an object.`,
  isArray: (field) => `${field} must be a list.`,
  isEmail: (field) => `${field} must be an e-mail address, such as name@example.com.`,
  nestedValidation: (field) => `${field} must be an object.`,
  isIn: (field, [values]) => `${field} must be one of: ${listed(values)}.`,
  isEnum: (field, [values]) => `${field} must be one of: ${listed(values)}.`,
  min: (field, [limit], value) => `${field} must be at least ${figure(limit)}; it is ${figure(value)}.`,
  max: (field, [limit], value) => `${field} must be at most ${figure(limit)}; it is ${figure(value)}.`,
  minLength: (field, [limit]) => `${field} must have at least ${counted(limit, 'character')}.`,
  maxLength: (field, [limit], value) => {
    const length = typeof value === 'string' ? `; it has ${figure(value.length)}` : '';
    return `${field} may have at most ${counted(limit, 'character')}${length}. Shorten it.`;
  },
  arrayMinSize: (field, [limit]) => `${field} must have at least ${counted(limit, 'entry', 'entries')}.`,
  arrayMaxSize: (field, [limit]) => `${field} may have at most ${counted(limit, 'entry', 'entries')}.`,
  arrayUnique: (field) => `${field} names the same thing twice.`,
};

function figure(value: unknown): string {
  return typeof value === 'number'
    ? value.toLocaleString('en-GB', { maximumFractionDigits: 6 })
    : 'not a number';
}

function counted(limit: unknown, one: string, many = `${one}s`): string {
  return `${figure(limit)} ${limit === 1 ? one : many}`;
}

function listed(values: unknown): string {
  return Object.values(values ?? {}).join(', ');
}

function shortened(field: string): string {
  return field.length > 60 ? `${field.slice(0, 60)}…` : field;
}

function sentence(text: string): string {
  return /[.!?]$/.test(text) ? text : `${text}.`;
}
