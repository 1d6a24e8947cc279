const DAY_MS = 86_400_000;

/** The day that the demo data is reckoned back from, ISO 8601 date. */
export function dayOf(now: Date): string {
  return now.toISOString().slice(0, 10);
}

/**
 * A moment in the working hours of a day, ISO 8601 UTC. What fell on a Saturday or Sunday happened on the Friday before,
 * later than all else of it, so that the order of the days is kept.
 * @param today ISO 8601 date
 * @param daysFromToday below 0
 * @param secondOfDay 0 to 7199, counted from the start of work
 */
export function momentOf(today: string, daysFromToday: number, secondOfDay: number): string {
  const midnight = Date.parse(`${today}T00:00:00Z`) + daysFromToday * DAY_MS;
  const late = { 6: 1, 0: 2 }[new Date(midnight).getUTCDay()] ?? 0;
  const hour = 7 + late * 3;
  return new Date(midnight - late * DAY_MS + (hour * 3600 + secondOfDay) * 1000).toISOString();
}
