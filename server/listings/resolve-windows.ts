import { instantOf, type LocalInstant } from '@/server/listings/instant-of'
import type { FieldProblem } from '@/shared/api/problem'
import type { TypedWindow } from '@/shared/contracts/fish-batch'

export interface ResolvedWindow {
  startsAt: Date
  endsAt: Date
  capacity: number
}

const DAY_MS = 86_400_000
const MOST_DAYS_AHEAD = 180

function faultOf(read: LocalInstant): string | null {
  if (read.kind === 'never') return 'The clocks jump over that time on that day. Choose another.'
  if (read.kind === 'twice')
    return 'The clocks go back over that time: it comes twice on that day. Choose another.'
  return null
}

/** Typed days and times as instants in the zone of the farm, and what is wrong with them, window by window. */
export function resolveWindows(
  typed: TypedWindow[],
  place: { zone: string; at: Date },
): { windows: ResolvedWindow[]; errors: FieldProblem[] } {
  const windows: ResolvedWindow[] = []
  const errors: FieldProblem[] = []
  typed.forEach((window, index) => {
    const wrong = (field: string, detail: string | null) => {
      if (detail) errors.push({ detail, pointer: `#/draft/windows/${index}/${field}` })
    }
    const from = instantOf(window.day, window.from, place.zone)
    const until = instantOf(window.day, window.until, place.zone)
    wrong('from', faultOf(from))
    wrong('until', faultOf(until))
    if (from.kind !== 'once' || until.kind !== 'once') return
    const [startsAt, endsAt] = [from.at, until.at]
    if (startsAt.getTime() > place.at.getTime() + MOST_DAYS_AHEAD * DAY_MS) {
      wrong('day', 'At most half a year ahead.')
    }
    if (windows.some((other) => +other.startsAt === +startsAt && +other.endsAt === +endsAt)) {
      wrong('from', 'That window is there twice.')
    } else windows.push({ startsAt, endsAt, capacity: window.capacity })
  })
  return { windows, errors }
}
