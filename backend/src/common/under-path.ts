import { DomainError } from '@stageyard/libs/units';
import { badInput, type FieldIssue, ProblemError } from './errors.js';

/** The fields at fault that an error lists; null for an error that is no refusal. */
export function issuesOf(error: unknown): FieldIssue[] | null {
  if (!(error instanceof DomainError || error instanceof ProblemError)) return null;
  return [...(error.errors ?? [{ field: '', value: null, message: error.message }])];
}

/**
 * Runs a check of a part of a larger input.
 * @throws ProblemError whose fields are named from the larger input: `<path>.<field>`
 */
export function underPath<T>(path: string, check: () => T): T {
  try {
    return check();
  } catch (error) {
    const issues = issuesOf(error);
    if (issues === null) throw error;
    throw badInput(
      issues.map((issue) => ({ ...issue, field: [path, issue.field].filter(Boolean).join('.') })),
    );
  }
}
