import { findPlace, placeOf, type FoundPlace } from '@/server/places/find-place'
import { findCities, findZips } from '@/server/places/place-store'
import { presentPlace } from '@/server/places/present-place'
import type { Place } from '@/shared/contracts/places'
import { parseCellId } from '@/shared/domain/geo/location-cell-id'
import { usStates } from '@/shared/domain/rules/state-bits'

const MOST = 8

const kept = (places: (FoundPlace | null)[]): FoundPlace[] => places.filter((place) => place !== null)

async function byZip(prefix: string): Promise<FoundPlace[]> {
  const zips = await findZips(prefix, MOST)
  return kept(zips.map((zip) => placeOf(zip, `${zip.name}, ${zip.state} ${zip.zip ?? ''}`)))
}

/** "Dayton, OH" and "Dayton OH" are a town and a state; "El Pa" may be one, so the plain beginning is tried too. */
async function byName(typed: string): Promise<FoundPlace[]> {
  const split = /^(.+?)[\s,]+([A-Za-z]{2})$/.exec(typed)
  const state = split?.[2]?.toUpperCase() ?? ''
  const inState = usStates.includes(state) ? await findCities({ name: split?.[1] ?? '', state }, MOST) : []
  const name = typed.replace(/[\s,]+$/, '')
  const cities = inState.length > 0 ? inState : await findCities({ name }, MOST)
  return kept(cities.map((city) => placeOf(city, `${city.name}, ${city.state}`)))
}

/** Up to eight places for what was typed so far; an empty list when nothing fits. */
export async function findPlaces(typed: string): Promise<Place[]> {
  if (parseCellId(typed)) return kept([await findPlace(typed)]).map(presentPlace)
  if (/^\d+$/.test(typed)) return (/^\d{3,5}$/.test(typed) ? await byZip(typed) : []).map(presentPlace)
  return (await byName(typed)).map(presentPlace)
}
