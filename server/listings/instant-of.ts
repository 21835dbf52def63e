import { TZDate } from '@date-fns/tz'

export type LocalInstant =
  | { kind: 'once'; at: Date }
  /** The clocks jump over it in spring. */
  | { kind: 'never' }
  /** The clocks come back to it in autumn. */
  | { kind: 'twice' }

const HOUR_MS = 3_600_000

function reads(at: number, zone: string, wanted: string): boolean {
  const local = new TZDate(at, zone)
  const two = (part: number) => String(part).padStart(2, '0')
  const text = `${local.getFullYear()}-${two(local.getMonth() + 1)}-${two(local.getDate())}T${two(local.getHours())}:${two(local.getMinutes())}`
  return text === wanted
}

/** The instant that a clock on the wall of `zone` shows as this day and time. Invalid days and times are `never`. */
export function instantOf(day: string, time: string, zone: string): LocalInstant {
  const wanted = `${day}T${time}`
  const asUtc = Date.parse(`${wanted}:00Z`)
  if (Number.isNaN(asUtc)) return { kind: 'never' }
  // Offsets a day before and after cover both sides of any change of the clocks.
  const offsets = [-24, 24].map((hours) => {
    const near = new TZDate(asUtc + hours * HOUR_MS, zone)
    return near.getTimezoneOffset() * 60_000
  })
  const instants = [...new Set(offsets.map((offset) => asUtc + offset))].filter((at) =>
    reads(at, zone, wanted),
  )
  const [first] = instants
  if (first === undefined) return { kind: 'never' }
  return instants.length > 1 ? { kind: 'twice' } : { kind: 'once', at: new Date(first) }
}
