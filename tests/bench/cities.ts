import type { CellPoint } from '@/shared/domain/geo/location-cell'
import places from '@/tests/bench/us-cities.json'

export interface City {
  name: string
  state: string
  place: CellPoint
  population: number
}

export const cities: readonly City[] = places.cities.map(([name, state, lat, lng, population]) => ({
  name: String(name),
  state: String(state),
  place: { lat: Number(lat), lng: Number(lng) },
  population: Number(population),
}))
