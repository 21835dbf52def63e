import { convertQuantity } from '@/shared/units/convert-quantity'
import { roundTo } from '@/shared/units/round-to'
import type { UnitSystem } from '@/shared/units/unit-system'

/** The international mile, exact. */
export const kmPerMile = 1.609344
const kmIn: Record<string, number> = { m: 0.001, km: 1, mi: kmPerMile, mile: kmPerMile, miles: kmPerMile }

/** km → international miles, no rounding. */
export const milesFromKm = (km: number) => km / kmPerMile
/** International miles → km, no rounding. */
export const kmFromMiles = (miles: number) => miles * kmPerMile

/** '25 mi', '40 km' → km; a bare number is read in `units`. null: not readable. */
export function parseDistanceKm(text: string, units: UnitSystem): number | null {
  return convertQuantity(text, kmIn, units === 'us' ? 'mi' : 'km')
}

/** 'about 12 mi', 'under 1 mi'. Whole units to 50, steps of 5 above: both ends of the line are cells, not doors. */
export function aboutDistance(km: number, units: UnitSystem): string {
  const [value, unit] = units === 'us' ? [milesFromKm(km), 'mi'] : [km, 'km']
  if (value < 1) return `under 1 ${unit}`
  return `about ${roundTo(value, value < 50 ? 1 : 5).toLocaleString('en-US')} ${unit}`
}
