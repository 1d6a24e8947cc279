const ISO_DATE = /^\d{4}-\d{2}-\d{2}$/;
const DAY_MS = 86_400_000;
const FIRST_YEAR = 1900;
const LAST_YEAR = 2999;
const DAYS_OF_MONTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/** Whether the text is a day of the calendar, 1900 to 2999, as ISO 8601 writes it: `2026-02-28`, not `2026-02-30`. */
export function isCalendarDate(text: string): boolean {
  if (typeof text !== 'string' || !ISO_DATE.test(text)) return false;
  const [year, month, day] = [Number(text.slice(0, 4)), Number(text.slice(5, 7)), Number(text.slice(8))];
  if (year < FIRST_YEAR || year > LAST_YEAR || day < 1) return false;
  if (month === 2 && day === 29) return isLeapYear(year);
  return day <= (DAYS_OF_MONTHS[month - 1] ?? 0);
}

const isLeapYear = (year: number) => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

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
