import type { FoundPlace } from '@/server/places/find-place'
import type { Place } from '@/shared/contracts/places'

/** lat and lng are the cell's centre. */
export function presentPlace(found: FoundPlace): Place {
  const { label, cellId, state, zip, zone, centre } = found
  return { label, cell: cellId, state, zone, lat: centre.lat, lng: centre.lng, ...(zip ? { zip } : {}) }
}
