import { kmFromMiles } from '@/shared/units/distance'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface Reach {
  km: number
  label: string
}

const miles = [10, 25, 50, 100, 250]
const kilometres = [15, 40, 80, 160, 400]

/** Distances to choose from, in whole km as the search takes them; a mile's fraction is rounded outwards. */
export function reaches(units: UnitSystem): Reach[] {
  return units === 'us'
    ? miles.map((mi) => ({ km: Math.ceil(kmFromMiles(mi)), label: `${mi} mi` }))
    : kilometres.map((km) => ({ km, label: `${km} km` }))
}

/** The choice closest to a distance from the address, which may come from somebody with other units. */
export function reachOf(km: number, units: UnitSystem): Reach {
  const all = reaches(units)
  return all.reduce((best, one) => (Math.abs(one.km - km) < Math.abs(best.km - km) ? one : best))
}

/** The next wider choice. undefined: it is the widest already. */
export function widerReach(km: number, units: UnitSystem): Reach | undefined {
  return reaches(units).find((one) => one.km > km * 1.05)
}
