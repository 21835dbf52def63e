const DAY_MS = 86_400_000

/** The Monday of an ISO week, YYYY-MM-DD: the first week holds 4 January. `week` 1-53; 53 of a short year is week 1 of the next. */
export function mondayOfWeek(year: number, week: number): string {
  const fourth = Date.UTC(year, 0, 4)
  const weekday = (new Date(fourth).getUTCDay() + 6) % 7
  return new Date(fourth + ((week - 1) * 7 - weekday) * DAY_MS).toISOString().slice(0, 10)
}
