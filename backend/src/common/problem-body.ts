import { type FieldIssue, ProblemError } from './errors.js';

export interface ProblemBody {
  statusCode: number;
  code: string;
  message: string;
  errors?: FieldIssue[];
  requestId: string;
  [extra: string]: unknown;
}

const LONGEST_ECHO = 120;
const SECRET = /password|token|secret/i;

/** The answer to a refusal. Values are echoed cut short, and never from a field that holds a secret. */
export function problemBody(problem: ProblemError, requestId: string): ProblemBody {
  const { statusCode, code, message, extra } = problem;
  const errors = problem.errors?.map((issue) => ({
    ...issue,
    // A field that is not known was named by the sender, at any length.
    field: cut(issue.field),
    value: echo(issue.field, issue.value),
  }));
  return { statusCode, code, message, ...(errors && { errors }), requestId, ...extra };
}

function echo(field: string, value: unknown): unknown {
  if (value === undefined || SECRET.test(field)) return null;
  if (typeof value === 'bigint' || (typeof value === 'number' && !Number.isFinite(value)))
    return String(value);
  if (typeof value === 'string') return cut(value);
  if (typeof value !== 'object' || value === null) return value;
  return cut(JSON.stringify(value) ?? '');
}

function cut(text: string): string {
  return text.length > LONGEST_ECHO ? `${text.slice(0, LONGEST_ECHO)}…` : text;
}
