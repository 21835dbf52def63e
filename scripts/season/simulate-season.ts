import { normalsAt, type ClimateGrid } from '@/shared/domain/climate/climate-grid'
import { designWeather, type DesignWeather } from '@/shared/domain/climate/design-weather'
import { normalDay } from '@/shared/domain/climate/normal-day'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { SEASON_CONFIDENCE } from '@/shared/domain/season/season-classes.facts'
import { seasonTrip, type SeasonPacking } from '@/shared/domain/season/season-trip'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { Weather } from '@/shared/domain/transport/leg-air'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import { strictest, type Verdict } from '@/shared/domain/transport/verdict'

export interface Journey {
  from: CellPoint
  to: CellPoint
  species: SpeciesId
  /** Day of the year at packing, 0-364. */
  day: number
}

/** What the trip engine itself says of one such trip on its cold and on its hot day: own places, own day, own species. */
export interface Simulated {
  cold: Verdict
  hot: Verdict
  /** Both days together. */
  whole: Verdict
}

/** Design weather of a journey of so many nights. null: no climate known at one of the ends. */
export function weatherOf(grid: ClimateGrid, { from, to, day }: Journey, nights: number): Weather | null {
  const at = ({ lat, lng }: CellPoint): DesignWeather | null => {
    const normals = normalsAt(grid, lat, lng)
    const normal = normals && normalDay(normals, day)
    return normal && designWeather(normal, nights, SEASON_CONFIDENCE)
  }
  const [origin, destination] = [at(from), at(to)]
  return origin && destination && { origin, destination }
}

export function simulate(
  species: SpeciesRecord<SpeciesId>,
  weather: Weather,
  packing: SeasonPacking,
): Simulated {
  const answer = checkTrip(seasonTrip(species, packing, weather))
  const sides = new Set(
    [...(answer.cold?.reasons ?? []), ...(answer.hot?.reasons ?? [])].map(({ code }) => code),
  )
  const common = answer.reasons.filter(({ code }) => !sides.has(code))
  return {
    cold: strictest([...common, ...(answer.cold?.reasons ?? [])]),
    hot: strictest([...common, ...(answer.hot?.reasons ?? [])]),
    whole: answer.verdict,
  }
}
