import tzLookup from '@photostructure/tz-lookup'

import { findZip, populationsOf } from '@/server/places/place-store'
import type { SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import { cellAt, cellCentre, widenCell } from '@/shared/domain/geo/location-cell'
import { locationCellForSeller } from '@/shared/domain/geo/location-cell-for-seller'
import { printCellId } from '@/shared/domain/geo/location-cell-id'
import { usStates } from '@/shared/domain/rules/state-bits'

type FarmPlace = Pick<SellerRow, 'trueLat' | 'trueLng' | 'cellId' | 'cellLat' | 'cellLng' | 'zone'>

const refuse = (pointer: string, detail: string): never => {
  throw new Problem('fields-invalid', undefined, { errors: [{ detail, pointer }] })
}

function isZone(zone: string): boolean {
  try {
    return Boolean(new Intl.DateTimeFormat('en-US', { timeZone: zone }))
  } catch {
    return false
  }
}

/**
 * Where a farm stands. We have no geocoder for streets: the true point is the middle of the ZIP code, and buyers find
 * the gate by the written address. The public cell grows in thin country until a thousand people live in it.
 */
export async function placeFarm(farm: {
  zip: string
  state: string
  zone?: string | undefined
}): Promise<FarmPlace> {
  const zip = await findZip(farm.zip)
  if (!zip) return refuse('#/zip', 'We know no such ZIP code.')
  if (!usStates.includes(farm.state)) return refuse('#/state', 'We serve the fifty states and DC.')
  if (zip.state !== farm.state)
    return refuse('#/zip', `That ZIP code lies in ${zip.state}, not in ${farm.state}.`)
  if (farm.zone !== undefined && !isZone(farm.zone))
    return refuse('#/zone', 'Pick the time zone from the list.')
  const small = cellAt(zip, 50)
  if (!small) return refuse('#/zip', 'We know no place for that ZIP code.')
  const cells = [small, widenCell(small, 100)]
  const people = await populationsOf(cells)
  const cell =
    locationCellForSeller(
      zip,
      (asked) => people[cells.findIndex((c) => c.sizeThousandths === asked.sizeThousandths)] ?? 0,
    ) ?? small
  const centre = cellCentre(cell)
  return {
    trueLat: zip.lat,
    trueLng: zip.lng,
    cellId: printCellId(cell),
    cellLat: centre.lat,
    cellLng: centre.lng,
    zone: farm.zone ?? tzLookup(zip.lat, zip.lng),
  }
}
