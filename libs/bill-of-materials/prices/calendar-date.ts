const ISO_DATE = /^(\d{4})-(\d{2})-(\d{2})$/;
const DAY_MS = 86_400_000;
const FIRST_YEAR = 1900;
const LAST_YEAR = 2999;

/** Whether the text is a day of the calendar, 1900 to 2999, as ISO 8601 writes it: `2026-02-28`, not `2026-02-30`. */
export function isCalendarDate(text: string): boolean {
  const match = typeof text === 'string' ? ISO_DATE.exec(text) : null;
  if (!match) return false;
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  if (year < FIRST_YEAR || year > LAST_YEAR) return false;
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
}

/** The day of a moment on the calendar of this machine's time zone, as ISO 8601 writes it. */
export function calendarDay(moment: Date): string {
  const two = (figure: number) => String(figure).padStart(2, '0');
  const year = String(moment.getFullYear()).padStart(4, '0');
  return `${year}-${two(moment.getMonth() + 1)}-${two(moment.getDate())}`;
}

/** Calendar days from one ISO 8601 date to another, below 0 when `to` is earlier. Both must be calendar dates. */
export function daysBetween(from: string, to: string): number {
  return Math.round((Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / DAY_MS);
}

/** The ISO 8601 date so many calendar days after (below 0: before) another. */
export function addDays(date: string, days: number): string {
  return new Date(Date.parse(`${date}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);
}
