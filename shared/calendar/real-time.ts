const TIME = /^(\d{4})(\d{2})(\d{2})T(\d{2})(\d{2})(\d{2})(Z?)$/

/**
 * A DATE-TIME in milliseconds as if it were UTC, and whether it says that it is. Null for a day or an hour that does not
 * exist: month 13, February 30, 25 o'clock. Second 60 is allowed by RFC 5545 but never written by us, so it is null too.
 */
export function realTime(value: string): { ms: number; isUtc: boolean } | null {
  const found = TIME.exec(value)
  if (!found) return null
  const [, year, month, day, hour, minute, second, z] = found
  const iso = `${year}-${month}-${day}T${hour}:${minute}:${second}.000Z`
  const ms = Date.parse(iso)
  // Date.parse takes February 30 as March 2: only what prints as it was read is real.
  if (Number.isNaN(ms) || new Date(ms).toISOString() !== iso) return null
  return { ms, isUtc: z === 'Z' }
}
