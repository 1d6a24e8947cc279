import { currencyDecimals, DomainError, type Money, parseMoney } from '../../units/index.js';
import { isCalendarDate } from '../prices/calendar-date.js';

/** What a cell holds, or in a sentence what is wrong with it. A blank cell holds null. */
export type Cell<T> = { value: T | null; problem: null } | { value: null; problem: string };

/** Bounds of a figure: `min` and `max` are allowed, `above` is not. */
export interface CellBounds {
  min?: number;
  above?: number;
  max: number;
}

const PLAIN = /^[-\u2212+]?\d+(\.\d+)?$/;
const GROUPED = /^[-\u2212+]?[1-9]\d{0,2}(,\d{3})+(\.\d+)?$/;
/** `1,500` is one and a half in one country and fifteen hundred in the next. */
const EITHER_WAY = /^[-\u2212+]?[1-9]\d{0,2},\d{3}$/;
/** `5,40` and `1.234,5` have a comma before their decimals and nothing else: two digits group no thousands. */
const COMMA_DECIMALS = /^([-\u2212+]?(?:\d{1,3}(?:\.\d{3})+|\d+)),(\d{1,2})$/;
const SLASHED = /^(\d{1,2})\/(\d{1,2})\/(\d{4})$/;
const DOTTED = /^(\d{1,2})\.(\d{1,2})\.(\d{4})$/;

/** A figure with at most three decimals unless told otherwise. `1,5` is read as 1.5; `1,500` is refused. */
export function cellDecimal(text: string, bounds: CellBounds, decimals = 3): Cell<number> {
  const clean = withPoint(text.trim());
  if (clean === '') return blank();
  const problem = figureProblem(clean);
  if (problem !== null) return wrong(problem);
  if ((clean.split('.')[1]?.replace(/0+$/, '').length ?? 0) > decimals) {
    return wrong(
      decimals === 0
        ? `${quoted(clean)} is not a whole number.`
        : `${quoted(clean)} has more than ${decimals} decimals. Round it.`,
    );
  }
  return within(Number(clean.replaceAll(',', '').replace('\u2212', '-')), clean, bounds);
}

/** A whole number; `10.0` counts as one. */
export function cellWhole(text: string, bounds: CellBounds): Cell<number> {
  return cellDecimal(text, bounds, 0);
}

/** An ISO 8601 date from `2026-02-28` or `28.2.2026`. With slashes day and month cannot be told apart: refused. */
export function cellDate(text: string): Cell<string> {
  const clean = text.trim();
  if (clean === '') return blank();
  const slashed = SLASHED.exec(clean);
  if (slashed) return wrong(slashedProblem(clean, slashed));
  const dotted = DOTTED.exec(clean);
  const [, day = '', month = '', year = ''] = dotted ?? [];
  const date = dotted ? `${year}-${month.padStart(2, '0')}-${day.padStart(2, '0')}` : clean;
  if (isCalendarDate(date)) return { value: date, problem: null };
  return wrong(`${quoted(clean)} is not a day of the calendar. Write it like 2026-02-28.`);
}

/**
 * An amount of at least 0, bare in the given currency or with a currency code of its own.
 * @param currency ISO 4217; null where a bare figure has none to stand in
 */
export function cellMoney(text: string, currency: string | null): Cell<Money> {
  const clean = text.trim();
  if (clean === '') return blank();
  const [code] = /^[A-Za-z]{3}(?=\s)|(?<=\s)[A-Za-z]{3}$/.exec(clean) ?? [];
  const figure = (code === undefined ? clean : clean.replace(code, '')).trim();
  const pointed = withPoint(figure);
  const decimals = currencyDecimals(code?.toUpperCase() ?? currency ?? '');
  // Without decimals the comma can only group thousands.
  if (decimals !== 0 || !EITHER_WAY.test(pointed)) {
    const problem = figureProblem(pointed);
    if (problem !== null) return wrong(problem);
  }
  try {
    const value = parseMoney(clean.replace(figure, pointed), currency ?? undefined);
    return value.minor < 0
      ? wrong(`${quoted(clean)} is below 0. A price cannot be negative.`)
      : { value, problem: null };
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    return wrong(error.message);
  }
}

/** The figure with a point before its decimals, where a comma can be nothing else. */
function withPoint(figure: string): string {
  const [, whole, tail] = COMMA_DECIMALS.exec(figure) ?? [];
  return whole === undefined || tail === undefined ? figure : `${whole.replaceAll('.', '')}.${tail}`;
}

function figureProblem(figure: string): string | null {
  if (EITHER_WAY.test(figure)) {
    const [whole = '', tail = ''] = figure.split(',');
    return `${quoted(figure)} can be read two ways. Write ${whole}${tail}, or ${whole}.${tail}.`;
  }
  if (PLAIN.test(figure) || GROUPED.test(figure)) return null;
  if (/^[-\u2212+]?(\d{1,3}(\.\d{3})+|\d+),\d+$/.test(figure)) {
    const [whole = '', tail = ''] = figure.split(',');
    return `${quoted(figure)} has a comma before its decimals. Write ${shorten(whole.replaceAll('.', ''))}.${shorten(tail)}.`;
  }
  return `${quoted(figure)} is not a figure. Write it like 1234.50, with a point before the decimals.`;
}

function within(value: number, text: string, { min, above, max }: CellBounds): Cell<number> {
  const limit = max.toLocaleString('en-GB');
  const least = min ?? above ?? 0;
  if (value > max) return wrong(`${quoted(text)} is too large. At most ${limit} is allowed.`);
  if (min !== undefined && value < min)
    return wrong(`${quoted(text)} is too small. At least ${least} is needed.`);
  if (above !== undefined && value <= above)
    return wrong(`${quoted(text)} is too small. It must be above ${least}.`);
  return { value: value === 0 ? 0 : value, problem: null };
}

function slashedProblem(text: string, [, first = '', second = '', year = '']: RegExpExecArray): string {
  const [a, b] = [first.padStart(2, '0'), second.padStart(2, '0')];
  const readings = [`${year}-${b}-${a}`, `${year}-${a}-${b}`].filter(isCalendarDate);
  const [only, other] = [...new Set(readings)];
  if (only === undefined) return `${quoted(text)} is not a day of the calendar. Write it like 2026-02-28.`;
  if (other === undefined)
    return `${quoted(text)} is not read, since slashes leave open what is the month. Write ${only}.`;
  return `${quoted(text)} can be ${only} or ${other}. Write the one you mean.`;
}

function blank(): Cell<never> {
  return { value: null, problem: null };
}

function wrong(problem: string): Cell<never> {
  return { value: null, problem };
}

function quoted(text: string): string {
  return `“${shorten(text)}”`;
}

function shorten(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}
