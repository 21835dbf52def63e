import { safeLanes } from '@/shared/domain/season/season-at'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

// A list takes some milliseconds to make; there are 48 bands and 52 weeks, at most some 250 lanes each.
const known = new Map<string, readonly number[]>()

/** The lanes that reach this place safely in this ISO week (1-52), packs or not. */
export function safeLanesTo(place: CellPoint, week: number): readonly number[] {
  const band = seasonBandAt(place.lat, place.lng)
  const key = `${band} ${week}`
  const before = known.get(key)
  if (before) return before
  const lanes = safeLanes(band, week)
  known.set(key, lanes)
  return lanes
}
