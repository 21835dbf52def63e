import type { MapPinFacts } from '@/components/map/map.types'
import type { FoundListing } from '@/shared/contracts/search'

/** Sellers of one cell share one pin: their listings cannot be told apart on a map, and must not be. */
export function pinOf({ lat, lng }: Pick<FoundListing, 'lat' | 'lng'>): string {
  return `${lat},${lng}`
}

/** One pin for each cell of the listings found, with how many hang there. */
export function toPins(found: readonly FoundListing[]): MapPinFacts[] {
  const cells = new Map<string, FoundListing[]>()
  for (const one of found) cells.set(pinOf(one), [...(cells.get(pinOf(one)) ?? []), one])
  return Array.from(cells, ([id, here]) => ({
    id,
    lat: here[0]?.lat ?? 0,
    lng: here[0]?.lng ?? 0,
    count: here.length,
    label: pinLabel(here),
  }))
}

function pinLabel(here: readonly FoundListing[]): string {
  const [first] = here
  if (!first) return ''
  return here.length === 1
    ? `${first.title}, ${first.placeText}`
    : `${here.length} listings, ${first.placeText}`
}
