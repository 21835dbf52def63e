/** The first day of day numbers, 2020-01-01. */
const DAY_ZERO_MS = Date.UTC(2020, 0, 1)
const MS_PER_DAY = 86_400_000
/** openDays has this many bits, and so many days ahead are looked at. */
export const DAYS_HELD = 64

/** '2027-01-15' → days since 2020-01-01. */
export function dayNumber(day: string): number {
  return Math.round((Date.parse(`${day}T00:00:00Z`) - DAY_ZERO_MS) / MS_PER_DAY)
}

/** Days since 2020-01-01 → '2027-01-15'. */
export function dayText(number: number): string {
  return new Date(DAY_ZERO_MS + number * MS_PER_DAY).toISOString().slice(0, 10)
}

export interface OpenDays {
  nextDay: number
  lastDay: number
  /** Bit d mod 64 stands for day d. Unambiguous, as lastDay - nextDay is at most 63 and both ends are open. */
  openDays: bigint
}

/** The days on which a listing can be had, from the first on as far as the bits reach. null: on none. */
export function packOpenDays(days: readonly number[]): OpenDays | null {
  if (days.length === 0) return null
  const nextDay = Math.min(...days)
  const held = days.filter((day) => day < nextDay + DAYS_HELD)
  let openDays = 0n
  for (const day of held) openDays |= 1n << BigInt(day % DAYS_HELD)
  return { nextDay, lastDay: Math.max(...held), openDays }
}

/** Bits of a range of days. null: it is so long that it asks for nothing. */
export function dayMask({ from, until }: { from: number; until: number }): bigint | null {
  if (until - from >= DAYS_HELD - 1) return null
  let mask = 0n
  for (let day = from; day <= until; day++) mask |= 1n << BigInt(day % DAYS_HELD)
  return mask
}
