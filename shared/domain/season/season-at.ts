import {
  packingClasses,
  seasonPacks,
  type AnimalClassId,
  type PackingClassId,
  type SeasonPacks,
} from '@/shared/domain/season/season-classes.facts'
import { valueOf } from '@/shared/domain/season/season-code'
import { animalClassIds, laneOf, packingClassIds } from '@/shared/domain/season/season-lane'
import type { SeasonTable } from '@/shared/domain/season/season-table'
import { seasonTable } from '@/shared/domain/season/season-table.gen'
import type { Side } from '@/shared/domain/season/season-scale'

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
  /** What to put into the box; `none` unless the verdict is `safe-with-packs`. */
  packs: SeasonPacks
}

export const WEEKS_A_YEAR = 52

const unknown: Season = { verdict: 'unknown', packs: 'none' }

/**
 * Whether animals of a class, packed so, usually survive being shipped in this ISO week (1-52; 53 counts as 52), by
 * long-term weather: safe in nine of ten such trips. Stricter than the trip check, never milder.
 */
export function seasonAt(shipment: Shipment, week: number, table: SeasonTable = seasonTable): Season {
  const { origin, destination, animals, packing } = shipment
  const rows = table.limits[`${animals} ${packing}`]
  if (origin === null || destination === null || !rows || !Number.isInteger(week) || week < 1 || week > 53) return unknown
  const at = Math.min(week, WEEKS_A_YEAR) - 1
  const { nights } = packingClasses[packing]
  const bears = (packs: SeasonPacks, side: Side) => {
    const weeks = table.weeks[side][nights]
    const [from, to] = [valueOf(weeks[origin] ?? '', at), valueOf(weeks[destination] ?? '', at)]
    const least = from === null ? null : valueOf(rows[packs][side], from)
    return to !== null && least !== null && to >= least
  }
  const packs = seasonPacks.find((choice) => bears(choice, 'cold') && bears(choice, 'hot'))
  if (packs !== undefined) return { verdict: packs === 'none' ? 'safe' : 'safe-with-packs', packs }
  return { verdict: bears('none', 'cold') ? 'too-hot' : 'too-cold', packs: 'none' }
}

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
