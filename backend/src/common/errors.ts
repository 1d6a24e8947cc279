import { type FieldIssue } from '@stageyard/libs/units';

export type { FieldIssue };

interface ProblemDetails {
  errors?: FieldIssue[];
  /** Further fields of the answer, such as `current` of a stale edit. */
  extra?: Record<string, unknown>;
}

/** A refusal that a person can act on; the filter turns it into the answer. */
export class ProblemError extends Error {
  readonly errors: FieldIssue[] | undefined;
  readonly extra: Record<string, unknown>;

  constructor(
    readonly statusCode: number,
    readonly code: string,
    message: string,
    { errors, extra = {} }: ProblemDetails = {},
  ) {
    super(message);
    this.name = 'ProblemError';
    this.errors = errors;
    this.extra = extra;
  }
}

/** 409: somebody else saved since this person read. Carries the thing as it stands now. */
export class ChangedMeanwhileError extends ProblemError {
  constructor(current: unknown) {
    const message =
      'Somebody else changed this meanwhile, so nothing was saved. Look at the present state, then save again.';
    super(409, 'changed-meanwhile', message, { extra: { current } });
    this.name = 'ChangedMeanwhileError';
  }
}

/** 404. @param what the kind of thing in a person's words, such as `part` */
export function notFound(what: string, id: string): ProblemError {
  const shown = id.length > 60 ? `${id.slice(0, 60)}…` : id;
  return new ProblemError(404, 'not-found', `There is no ${what} “${shown}”. Check it, or look in the list.`);
}

/** 400 with every field at fault. */
export function badInput(errors: FieldIssue[], message = joined(errors)): ProblemError {
  return new ProblemError(400, 'bad-input', message, { errors });
}

/** 409 for a state that does not allow the act. */
export function conflict(code: string, message: string, extra?: Record<string, unknown>): ProblemError {
  return new ProblemError(409, code, message, { extra });
}

/** 403 for a signed-in person who may not do this. */
export function forbidden(
  message = 'Your roles do not allow this. Ask an administrator if you need it.',
): ProblemError {
  return new ProblemError(403, 'forbidden', message);
}

/** 401: nobody is signed in, or the session is over. */
export function signedOut(): ProblemError {
  return new ProblemError(401, 'signed-out', 'You are signed out. Sign in, then try again.');
}

function joined(errors: FieldIssue[]): string {
  return errors.map((issue) => issue.message).join(' ');
}
