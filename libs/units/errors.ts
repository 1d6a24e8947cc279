/** One thing wrong with one field of an input. `field` is the dotted path as in the JSON, such as `pinion.teeth`. */
export interface FieldIssue {
  field: string;
  value: unknown;
  limit?: string | number;
  message: string;
}

/** Every refusal by a library function: a code for programs, a message for people, and the fields at fault. */
export class DomainError extends Error {
  readonly code: string;
  readonly errors: FieldIssue[];

  constructor(code: string, message: string, errors: FieldIssue[] = []) {
    super(message);
    this.name = 'DomainError';
    this.code = code;
    this.errors = errors;
  }
}

/** The input has no meaning or lies outside what the function accepts; lists every field at fault. */
export class InputError extends DomainError {
  constructor(errors: FieldIssue[], message = errors.map((issue) => issue.message).join(' ')) {
    super('bad-input', message, errors);
    this.name = 'InputError';
  }
}

/** An `InputError` about a single field. */
export function fieldError(
  field: string,
  value: unknown,
  message: string,
  limit?: string | number,
): InputError {
  const issue: FieldIssue =
    limit === undefined ? { field, value, message } : { field, value, limit, message };
  return new InputError([issue]);
}
