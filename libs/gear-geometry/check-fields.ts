import { InputError, type FieldIssue } from '../units/index.js';

/** Bounds of a number: `min` and `max` are allowed values, `above` is not. */
export interface Bounds {
  min?: number;
  above?: number;
  max?: number;
}

/** Gathers every field at fault, so that a designer mends the form in one go. */
export class FieldChecks {
  readonly issues: FieldIssue[] = [];

  /** Adds a refusal. `label` is what a designer calls the field, `mend` says what is allowed. */
  refuse(field: string, value: unknown, label: string, mend: string, limit?: string | number): void {
    const given = shown(value);
    const message = given === '' ? `${label} ${mend}` : `${label}: ${given} ${mend}`;
    this.issues.push(limit === undefined ? { field, value, message } : { field, value, limit, message });
  }

  /** True when the value is a finite number within the bounds; otherwise adds the refusal. */
  number(field: string, value: unknown, label: string, bounds: Bounds, unit = ''): value is number {
    // Described only for a refusal: a library of parts is checked number by number.
    const range = () => describeBounds(bounds, unit);
    if (value === undefined || value === null || value === '') {
      this.refuse(field, value, label, `is missing. Enter a number ${range()}.`, range());
      return false;
    }
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      this.refuse(field, value, label, `is not a number. Enter a number ${range()}.`, range());
      return false;
    }
    const tooSmall =
      (bounds.min !== undefined && value < bounds.min) ||
      (bounds.above !== undefined && value <= bounds.above);
    const tooLarge = bounds.max !== undefined && value > bounds.max;
    if (tooSmall || tooLarge) {
      const limit = tooLarge ? bounds.max : (bounds.min ?? `above ${bounds.above}`);
      this.refuse(
        field,
        value,
        label,
        `is too ${tooSmall ? 'small' : 'large'}. Enter a number ${range()}.`,
        limit,
      );
      return false;
    }
    return true;
  }

  /** As `number`, but an absent value is fine. */
  optionalNumber(field: string, value: unknown, label: string, bounds: Bounds, unit = ''): boolean {
    return value === undefined || this.number(field, value, label, bounds, unit);
  }

  /** Ends the check: throws an `InputError` when anything was refused. */
  finish(): void {
    if (this.issues.length > 0) throw new InputError(this.issues);
  }
}

function describeBounds(bounds: Bounds, unit: string): string {
  const tail = unit === '' || unit === '°' ? unit : ` ${unit}`;
  const upTo = bounds.max === undefined ? '' : ` to ${plain(bounds.max)}${tail}`;
  if (bounds.min !== undefined)
    return upTo === '' ? `from ${plain(bounds.min)}${tail}` : `from ${plain(bounds.min)}${upTo}`;
  if (bounds.above !== undefined) {
    return upTo === '' ? `above ${plain(bounds.above)}${tail}` : `above ${plain(bounds.above)} and up${upTo}`;
  }
  return upTo === '' ? 'that is finite' : `up${upTo}`;
}

/** A figure as a person writes it: at most six significant decimals, a real minus sign. */
export function plain(value: number): string {
  return String(Number(value.toPrecision(6))).replace('-', '−');
}

/** The refused value as a person recognises it, never longer than a line. */
function shown(value: unknown): string {
  if (value === undefined || value === null || value === '') return '';
  if (typeof value === 'number') return Number.isFinite(value) ? plain(value) : 'that';
  if (typeof value === 'boolean') return String(value);
  if (typeof value === 'string') return `“${value.length > 40 ? `${value.slice(0, 40)}…` : value}”`;
  return Array.isArray(value) ? 'a list' : 'this value';
}

/** True for a plain JSON object. */
export function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
