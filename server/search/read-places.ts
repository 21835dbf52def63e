import { requirePlace, type FoundPlace } from '@/server/places/find-place'
import { seasonWeek, type SeasonWeek } from '@/server/listings/season-week'
import type { SearchFilters } from '@/shared/contracts/search'

export interface SearchPlaces {
  place: FoundPlace
  /** Where what is shipped would arrive: the same, unless another place is named. */
  destination: FoundPlace
  when: SeasonWeek
  /** null: shipped or not, all are asked for. */
  shipTo: { place: FoundPlace; week: number } | null
}

/** Where a search stands, and where and when what it finds would arrive. */
export async function readPlaces(asked: SearchFilters, at: Date): Promise<SearchPlaces> {
  const place = await requirePlace(asked.near, 'query:near')
  const destination = asked.shipTo === undefined ? place : await requirePlace(asked.shipTo, 'query:shipTo')
  const when = seasonWeek(at, asked.shipWeek)
  const isAsked = asked.shipTo !== undefined || asked.shipWeek !== undefined
  return { place, destination, when, shipTo: isAsked ? { place: destination, week: when.week } : null }
}
