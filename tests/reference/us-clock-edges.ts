/** Every zone of ours by what the law makes of it: clocks that change, and clocks that do not. */
export const changing = [
  'America/New_York',
  'America/Detroit',
  'America/Chicago',
  'America/Denver',
  'America/Boise',
  'America/Los_Angeles',
  'America/Anchorage',
  'America/Adak',
  // Indiana has followed the law of the land since 2006; Starke and Perry counties keep Central time.
  'America/Indiana/Indianapolis',
  'America/Indiana/Knox',
  'America/Indiana/Tell_City',
] as const
export const still = ['America/Phoenix', 'Pacific/Honolulu'] as const

export interface Edge {
  kind: 'spring' | 'autumn'
  /** The local day; at 02:00 clocks go to 03:00, or back to 01:00. */
  day: string
}

const DAY_MS = 86_400_000

export const dayText = (ms: number) => new Date(ms).toISOString().slice(0, 10)

function sunday(year: number, month: number, nth: number): string {
  const first = Date.UTC(year, month, 1)
  return dayText(first + (((7 - new Date(first).getUTCDay()) % 7) + 7 * (nth - 1)) * DAY_MS)
}

/** Energy Policy Act of 2005, sec. 110: from the second Sunday of March to the first Sunday of November, at 02:00. */
export const edges: readonly Edge[] = [2024, 2025, 2026, 2027, 2028, 2029, 2030].flatMap((year) => [
  { kind: 'spring', day: sunday(year, 2, 2) },
  { kind: 'autumn', day: sunday(year, 10, 1) },
])

const formats = new Map<string, Intl.DateTimeFormat>()

/** What a clock on the wall shows, '2027-03-14T01:30'; by Intl alone, not by what the product reads with. */
export function wallText(ms: number, zone: string): string {
  let format = formats.get(zone)
  if (!format) {
    format = new Intl.DateTimeFormat('sv-SE', {
      timeZone: zone,
      ...{ year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit' },
    })
    formats.set(zone, format)
  }
  return format.format(ms).replace(' ', 'T')
}

/** Every half hour in UTC from two days before that day to three after it, by what the wall shows then. */
export function halfHoursAround(day: string, zone: string): Map<string, number[]> {
  const from = Date.parse(`${day}T00:00:00Z`) - 2 * DAY_MS
  const shown = new Map<string, number[]>()
  for (let ms = from; ms < from + 5 * DAY_MS; ms += DAY_MS / 48) {
    const text = wallText(ms, zone)
    shown.set(text, [...(shown.get(text) ?? []), ms])
  }
  return shown
}

/** The day before, the day and the day after. */
export const daysAround = (day: string) =>
  [-1, 0, 1].map((off) => dayText(Date.parse(`${day}T00:00:00Z`) + off * DAY_MS))
