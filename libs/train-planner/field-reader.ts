import { compareRatios, InputError, toRatio, type FieldIssue, type RatioInput } from '../units/index.js';

/** Reads fields of unknown input one by one and gathers every issue, so that a person sees all of them at once. */
export class FieldReader {
  readonly issues: FieldIssue[] = [];

  /** An object at `field`. A missing one counts as empty: its fields then say what is wanted. */
  object(value: unknown, field: string): Record<string, unknown> {
    if (isRecord(value)) return value;
    if (isGiven(value)) this.refuse(field, value, `The field ${field} must be an object with named fields.`);
    return {};
  }

  number(value: unknown, field: string, words: string, [least, most]: Bounds, fallback?: number): number {
    if (!isGiven(value) && fallback !== undefined) return fallback;
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      this.refuse(field, value, `${words} must be a number from ${least} to ${most}.`);
    } else if (value < least || value > most) {
      const message = `${words} is ${plain(value)}. It must be from ${least} to ${most}.`;
      this.refuse(field, value, message, value < least ? least : most);
    } else {
      return value;
    }
    return fallback ?? least;
  }

  whole(value: unknown, field: string, words: string, bounds: Bounds, fallback?: number): number {
    const read = this.number(value, field, words, bounds, fallback);
    if (Number.isInteger(read)) return read;
    this.refuse(field, value, `${words} is ${plain(read)}. It must be a whole number.`);
    return Math.round(read);
  }

  /** Two whole numbers, the first not above the second. */
  range(value: unknown, field: string, words: string, bounds: Bounds): { min: number; max: number } {
    const found = this.issues.length;
    const { min, max } = this.object(value, field);
    const read = {
      min: this.whole(min, `${field}.min`, `Least ${words}`, bounds),
      max: this.whole(max, `${field}.max`, `Greatest ${words}`, bounds),
    };
    if (this.issues.length === found && read.min > read.max) {
      const message = `Greatest ${words} is ${read.max}, below the least, ${read.min}. Swap the two figures.`;
      this.refuse(`${field}.max`, read.max, message, read.min);
    }
    return read;
  }

  /** A decimal that is kept exact; numbers count as their shortest decimal. */
  decimal(value: unknown, field: string, words: string, [least, most]: Bounds): string | number {
    if ((typeof value !== 'string' && typeof value !== 'number') || value === '') {
      this.refuse(field, value, `${words} must be a decimal figure from ${least} to ${most}.`);
      return least;
    }
    try {
      const exact = toRatio(value, field);
      const tooSmall = compareRatios(exact, toRatio(least)) < 0;
      if (!tooSmall && compareRatios(exact, toRatio(most)) <= 0) return value;
      const message = `${words} is ${plain(value)}. It must be from ${least} to ${most}.`;
      this.refuse(field, value, message, tooSmall ? least : most);
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      this.refuse(field, value, `${words} must be a decimal figure from ${least} to ${most}, such as 37.5.`);
    }
    return least;
  }

  choice<T extends string | number>(
    value: unknown,
    field: string,
    words: string,
    choices: readonly T[],
    fallback?: T,
  ): T {
    if (!isGiven(value) && fallback !== undefined) return fallback;
    const match = choices.find((choice) => choice === value);
    if (match !== undefined) return match;
    const list = choices.join(', ');
    const message =
      choices.length === 1 ? `${words} can only be ${list} for now.` : `${words} must be one of: ${list}.`;
    this.refuse(field, value, message, list);
    return fallback ?? (choices[0] as T);
  }

  /** Refuses a field that must be left out. */
  absent(value: unknown, field: string, message: string): void {
    if (isGiven(value)) this.refuse(field, value, message);
  }

  refuse(field: string, value: unknown, message: string, limit?: string | number): void {
    const issue: FieldIssue = { field, value: shown(value), message };
    if (limit !== undefined) issue.limit = limit;
    this.issues.push(issue);
  }
}

type Bounds = readonly [least: number, most: number];

export function isGiven(value: unknown): boolean {
  return value !== undefined && value !== null;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Values travel back in error messages: long text is cut, and what JSON cannot carry is spelled out. */
function shown(value: unknown): unknown {
  if (typeof value === 'string') return value.length > 60 ? `${value.slice(0, 60)}…` : value;
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  if (typeof value === 'boolean' || value === null) return value;
  if (value === undefined) return null;
  return Array.isArray(value) ? `a list of ${value.length}` : 'an object';
}

function plain(value: RatioInput): string {
  return String(shown(value));
}
