const DAY_MS = 86_400_000

/** The Monday of the week that a day YYYY-MM-DD lies in. */
export function mondayOf(day: string): string {
  const noon = new Date(`${day}T12:00:00Z`)
  const weekday = (noon.getUTCDay() + 6) % 7
  return new Date(noon.getTime() - weekday * DAY_MS).toISOString().slice(0, 10)
}
