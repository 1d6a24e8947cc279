/** Figures as the screens write them: real minus sign, fixed decimals, a dash where nothing is known. */

export const NOTHING = '–';

const MINUS = '\u2212';

/** Fixed decimals with a real minus sign; `–` for null, undefined or what is not a number. */
export function formatFixed(value: number | null | undefined, decimals: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NOTHING;
  const text = value.toFixed(decimals);
  // "-0.00" is a rounding artefact, not a sign a reader should wonder about.
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', MINUS);
}

/** A mass in kg to the gram; what is lighter than that says so rather than reading as nothing. */
export function formatMass(value: number | null | undefined): string {
  return typeof value === 'number' && value > 0 && value < 0.0005 ? '< 0.001' : formatFixed(value, 3);
}

/** Like `formatFixed`, with a plus sign on positive values. */
export function formatSigned(value: number | null | undefined, decimals: number): string {
  const text = formatFixed(value, decimals);
  return text === NOTHING || text.startsWith(MINUS) || Number(text) === 0 ? text : `+${text}`;
}

/** At most the given decimals, without trailing zeros: modules, angles, quantities. */
export function formatPlain(value: number | null | undefined, decimals = 4): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NOTHING;
  return String(Number(value.toFixed(decimals))).replace('-', MINUS);
}

/** A quantity to the thousandth, thousands parted: `1,250`, `0.5`; `–` where nothing is known. */
export function formatQuantity(value: number | null | undefined): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return NOTHING;
  return value.toLocaleString('en-GB', { maximumFractionDigits: 3 }).replace('-', MINUS);
}

/** Whole numbers with thousands separators: 1,842. */
export function formatCount(value: number): string {
  return value.toLocaleString('en-GB');
}

const WHEN = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });
const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' });

/** "1 Dec 2026, 14:05" in the reader's time zone. */
export function formatWhen(iso: string): string {
  return WHEN.format(new Date(iso));
}

const CALENDAR_DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });

/** "1 Dec 2026": the reader's day of a moment, or a day of the calendar (`YYYY-MM-DD`), which is the same everywhere. */
export function formatDay(iso: string): string {
  return (iso.length === 10 ? CALENDAR_DAY : DAY).format(new Date(iso));
}
