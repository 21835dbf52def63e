import type { ClimateGrid } from '@/shared/domain/climate/climate-grid'
import { seasonAt, type Season } from '@/shared/domain/season/season-at'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import {
  packingClasses,
  seasonOptionIds,
  seasonOptions,
  type SeasonOption,
} from '@/shared/domain/season/season-classes.facts'
import { findSpecies } from '@/shared/domain/species/find-species'
import type { SeasonTable } from '@/shared/domain/season/season-table'
import type { RandomJourney } from '@/scripts/season/random-journeys'
import { simulate, weatherOf, type Simulated } from '@/scripts/season/simulate-season'

const bareOptions = seasonOptionIds.filter((option) => seasonOptions[option].kind === 'none')

export interface Comparison {
  journeys: number
  /** The table says safe with or without packs; and without. */
  tableSafe: number
  tableBare: number
  /** The engine says safe without packs, whatever the table says. */
  engineSafe: number
  /** The table says safe, with packs or without, and the engine does not: none may be. */
  milder: RandomJourney[]
  /** The engine says safe without packs and the table says too cold or too hot. */
  stricter: number
}

/** The table against the trip engine itself, journey by journey. */
export function compareSeason(
  grid: ClimateGrid,
  table: SeasonTable,
  journeys: readonly RandomJourney[],
): Comparison {
  const found: Comparison = {
    journeys: journeys.length,
    tableSafe: 0,
    tableBare: 0,
    engineSafe: 0,
    milder: [],
    stricter: 0,
  }
  for (const journey of journeys) {
    const { from, to, animals, packing, week } = journey
    const [origin, destination] = [seasonBandAt(from.lat, from.lng), seasonBandAt(to.lat, to.lng)]
    const season = seasonAt({ origin, destination, animals, packing }, week, table)
    const isSafe = season.verdict === 'safe' || season.verdict === 'safe-with-packs'
    const species = findSpecies(journey.species)
    const weather = weatherOf(grid, journey, packingClasses[packing].nights)
    const says = (option: SeasonOption) =>
      species && weather && simulate(species, weather, { animals, packing, option })
    const bare = bareOptions.some((option) => says(option)?.whole === 'safe')
    if (isSafe) found.tableSafe++
    if (season.verdict === 'safe') found.tableBare++
    if (bare) found.engineSafe++
    if (isSafe && !isBorneOut(season, says)) found.milder.push(journey)
    if (bare && (season.verdict === 'too-cold' || season.verdict === 'too-hot')) found.stricter++
  }
  return found
}

/** Each day is safe with its own packing. */
function isBorneOut({ forCold, forHeat }: Season, says: (option: SeasonOption) => Simulated | null): boolean {
  return (
    forCold !== null && forHeat !== null && says(forCold)?.cold === 'safe' && says(forHeat)?.hot === 'safe'
  )
}
