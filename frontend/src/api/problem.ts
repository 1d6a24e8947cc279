/** One field the server refused: where, what was sent, the limit it crossed. */
export interface FieldProblem {
  field: string;
  value?: unknown;
  limit?: string | number;
  message: string;
}

/** Every refusal of the server, and a lost network, in one shape. `statusCode` is 0 when no answer came. */
export class Problem extends Error {
  override readonly name = 'Problem';

  constructor(
    readonly statusCode: number,
    readonly code: string,
    message: string,
    readonly errors: FieldProblem[] = [],
    readonly requestId: string | null = null,
    /** With `changed-meanwhile`: the thing as it stands now. */
    readonly current: unknown = undefined,
  ) {
    super(message);
  }

  get noAnswer(): boolean {
    return this.statusCode === 0;
  }

  get signedOut(): boolean {
    return this.statusCode === 401;
  }

  get changedMeanwhile(): boolean {
    return this.statusCode === 409 && this.code === 'changed-meanwhile';
  }
}

export const NO_ANSWER =
  'The server did not answer. Check the connection and try again; nothing you typed is lost.';

/** Turns anything thrown into a Problem, so that screens deal with one shape. */
export function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof DOMException && error.name === 'AbortError')
    return new Problem(0, 'stopped', 'Stopped before the answer came.');
  return new Problem(0, 'no-answer', NO_ANSWER);
}

/** Reads a refused response; a body that is not ours (a proxy's page) still gives plain words. */
export async function problemFrom(response: Response): Promise<Problem> {
  const body: unknown = await response.json().catch(() => null);
  const said = (typeof body === 'object' && body !== null ? body : {}) as Partial<Problem>;
  const message =
    typeof said.message === 'string'
      ? said.message
      : `The server refused with ${response.status}. Try again; if it stays, tell your administrator.`;
  return new Problem(
    response.status,
    typeof said.code === 'string' ? said.code : 'refused',
    message,
    Array.isArray(said.errors) ? said.errors : [],
    typeof said.requestId === 'string' ? said.requestId : null,
    said.current,
  );
}
