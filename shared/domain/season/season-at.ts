import {
  packingClasses,
  seasonOptionIds,
  seasonOptions,
  type AnimalClassId,
  type PackingClassId,
  type SeasonOption,
} from '@/shared/domain/season/season-classes.facts'
import { valueOf } from '@/shared/domain/season/season-code'
import { animalClassIds, laneOf, packingClassIds } from '@/shared/domain/season/season-lane'
import type { SeasonTable, WeekDay } from '@/shared/domain/season/season-table'
import { seasonTable } from '@/shared/domain/season/season-table.gen'

export type SeasonVerdict = 'safe' | 'safe-with-packs' | 'too-cold' | 'too-hot' | 'unknown'

export interface Shipment {
  /** Climate bands of both ends, from `seasonBandAt`; null where none is known. */
  origin: number | null
  destination: number | null
  animals: AnimalClassId
  packing: PackingClassId
}

export interface Season {
  verdict: SeasonVerdict
  /**
   * Rows of `seasonOptions`: packs in each box and warmth at packing, for when cold and for when warm days are forecast.
   * null unless safe.
   */
  forCold: SeasonOption | null
  forHeat: SeasonOption | null
}

export const WEEKS_A_YEAR = 52

const none = { forCold: null, forHeat: null }
const unknown: Season = { verdict: 'unknown', ...none }

/**
 * Whether animals of a class, packed so, usually survive being shipped in this ISO week (1-52; 53 counts as 52), by
 * long-term weather: safe in nine of ten such trips on the cold and on the hot side, each day packed as its forecast asks:
 * `safe` needs no packs for that, `safe-with-packs` does. Stricter than the trip check on either day, never milder.
 */
export function seasonAt(shipment: Shipment, week: number, table: SeasonTable = seasonTable): Season {
  const { origin, destination, animals, packing } = shipment
  const limits = table.limits[`${animals} ${packing}`]
  if (origin === null || destination === null || !limits || !isWeek(week)) return unknown
  const { nights } = packingClasses[packing]
  const at = Math.min(week, WEEKS_A_YEAR) - 1
  const bears = (option: SeasonOption, day: WeekDay) => {
    const weeks = table.weeks[day][nights]
    const [from, to] = [valueOf(weeks[origin] ?? '', at), valueOf(weeks[destination] ?? '', at)]
    const least = from === null ? null : valueOf(limits[option][day] ?? '', from)
    return to !== null && least !== null && to >= least
  }
  const forCold = seasonOptionIds.find((one) => bears(one, 'cold') && bears(one, 'mildCold'))
  const forHeat = seasonOptionIds.find((one) => bears(one, 'hot') && bears(one, 'mildHot'))
  if (forCold && forHeat) {
    const isBare = [forCold, forHeat].every((option) => seasonOptions[option].kind === 'none')
    return { verdict: isBare ? 'safe' : 'safe-with-packs', forCold, forHeat }
  }
  // What hurts a box without packs, made as warm or as cool as it may be, gives the season its name.
  const [coldHurts, heatHurts] = [!bears('none-warm', 'cold'), !bears('none-cool', 'hot')]
  const isHot = coldHurts === heatHurts ? forCold !== undefined : heatHurts
  return { verdict: isHot ? 'too-hot' : 'too-cold', ...none }
}

const isWeek = (week: number) => Number.isInteger(week) && week >= 1 && week <= WEEKS_A_YEAR + 1

/** All 52 weeks, first ISO week first. */
export function seasonStrip(shipment: Shipment): Season[] {
  return Array.from({ length: WEEKS_A_YEAR }, (_, at) => seasonAt(shipment, at + 1))
}

/** The first ISO week from `fromWeek` on, around the year, that is safe, with packs or without. null: none. */
export function nextSafeWeek(shipment: Shipment, fromWeek: number): number | null {
  for (let gone = 0; gone < WEEKS_A_YEAR; gone++) {
    const week = ((Math.min(fromWeek, WEEKS_A_YEAR) - 1 + gone) % WEEKS_A_YEAR) + 1
    const { verdict } = seasonAt(shipment, week)
    if (verdict === 'safe' || verdict === 'safe-with-packs') return week
  }
  return null
}

/** Every `lane` of a search row that reaches this band safely in this ISO week, with packs or without; rising. */
export function safeLanes(destination: number | null, week: number): number[] {
  const origins = Array.from({ length: seasonTable.bands }, (_, origin) => origin)
  return origins.flatMap((origin) =>
    animalClassIds.flatMap((animals) =>
      packingClassIds.flatMap((packing) => {
        const { verdict } = seasonAt({ origin, destination, animals, packing }, week)
        const isSafe = verdict === 'safe' || verdict === 'safe-with-packs'
        return isSafe ? [laneOf({ origin, animals, packing })] : []
      }),
    ),
  )
}
