import { calendarDay } from '@stageyard/libs/bill-of-materials';

/** Today in the reader's own time zone, `YYYY-MM-DD`. */
export function todayIso(now = new Date()): string {
  return calendarDay(now);
}
