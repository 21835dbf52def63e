import type { TownRow } from '@/seed/places/place-packages'

export interface Town {
  name: string
  state: string
  lat: number
  lng: number
  population: number
  /** A part of another town, whose people are counted there already. */
  isPart: boolean
}

/** US places by name, the largest first among those of one name. */
export function listTowns(rows: readonly TownRow[]): Town[] {
  return rows
    .filter((row) => row.country === 'US')
    .map(({ name, adminCode, featureCode, population, loc: { coordinates } }) => ({
      name,
      state: adminCode,
      lat: coordinates[1],
      lng: coordinates[0],
      population,
      isPart: featureCode === 'PPLX',
    }))
    .sort((one, other) => one.name.localeCompare(other.name, 'en') || other.population - one.population)
}
