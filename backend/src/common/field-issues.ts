import { type ValidationError } from 'class-validator';
import { type FieldIssue } from './errors.js';

/**
 * Every fault of a checked object as field issues with dotted paths, at most one a field.
 * @param path put in front, such as `attributes`
 */
export function fieldIssues(faults: ValidationError[], path = ''): FieldIssue[] {
  return faults.flatMap((fault) => {
    const field = path === '' ? fault.property : `${path}.${fault.property}`;
    const own = ownIssue(fault, field);
    return own ? [own] : fieldIssues(fault.children ?? [], field);
  });
}

function ownIssue(fault: ValidationError, field: string): FieldIssue | null {
  const [constraint, text] = Object.entries(fault.constraints ?? {})[0] ?? [];
  if (constraint === undefined || text === undefined) return null;
  const value: unknown = fault.value;
  if (constraint === 'whitelistValidation') {
    const message = `There is no field “${shortened(field)}”. Check its spelling or leave it out.`;
    return { field: shortened(field), value, message };
  }
  const limit = limitOf(fault.contexts?.[constraint]);
  return { field, value, ...(limit === undefined ? {} : { limit }), message: text };
}

function limitOf(context: unknown): number | string | undefined {
  if (typeof context !== 'object' || context === null || !('limit' in context)) return undefined;
  const { limit } = context;
  return typeof limit === 'number' || typeof limit === 'string' ? limit : undefined;
}

/** Names that come from outside are echoed cut short. */
function shortened(text: string): string {
  return text.length > 80 ? `${text.slice(0, 80)}…` : text;
}
