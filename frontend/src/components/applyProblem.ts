import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import type { Problem } from '../api/problem';

/**
 * Puts the server's refusals at their fields and returns what has no field on this form (or the whole message when
 * none has), to stand at the form's head. `fieldOf` maps the server's dotted path to the form's field, or null.
 */
export function applyProblem<Form extends FieldValues>(
  problem: Problem,
  setError: UseFormSetError<Form>,
  fieldOf: (path: string) => FieldPath<Form> | null,
): string | null {
  const homeless: string[] = [];
  let placed = 0;
  for (const issue of problem.errors) {
    const field = fieldOf(issue.field);
    if (field === null) {
      homeless.push(issue.message);
    } else {
      setError(field, { type: 'server', message: issue.message }, { shouldFocus: placed === 0 });
      placed += 1;
    }
  }
  if (homeless.length > 0) return homeless.join(' ');
  return placed > 0 ? null : problem.message;
}
