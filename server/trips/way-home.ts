import { readListing } from '@/server/listings/read-listing'
import { requirePlace } from '@/server/places/find-place'
import { usualAir } from '@/server/trips/usual-air'
import type { WayHome } from '@/shared/contracts/trips'
import { distanceKm } from '@/shared/domain/geo/distance'

interface Asked {
  listingId: string
  near: string
  day: string
}

/** The drive from the middle of the seller's area to the middle of the buyer's: nothing finer is computed with. */
export async function wayHome({ listingId, near, day }: Asked): Promise<WayHome> {
  const [place, from] = await Promise.all([
    requirePlace(near, 'query:near'),
    readListing(null, listingId, undefined),
  ])
  const [origin, destination] = await Promise.all([usualAir(from, day), usualAir(place.centre, day)])
  return { day, distanceKm: distanceKm(from, place.centre), origin, destination }
}
