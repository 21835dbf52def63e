import { readFileSync } from 'node:fs'
import path from 'node:path'

import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { isoWeekOf } from '@/shared/domain/season/iso-week'
import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import { animalClasses } from '@/shared/domain/season/season-classes.facts'
import type { AnimalClassId, PackingClassId } from '@/shared/domain/season/season-classes.facts'
import { animalClassIds, packingClassIds } from '@/shared/domain/season/season-lane'
import type { Journey } from '@/scripts/season/simulate-season'

export interface RandomJourney extends Journey {
  animals: AnimalClassId
  packing: PackingClassId
  week: number
}

/** Small seeded generator (mulberry32), 0 to below 1: the same journeys for the same seed. */
function chances(seed: number): () => number {
  let state = seed
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
}

function postalPoints(): CellPoint[] {
  const lines = readFileSync(path.resolve('assets/data/zips.csv'), 'utf8').split('\n')
  return lines.flatMap((line) => {
    const parts = line.split(',')
    const [lat, lng] = [Number(parts[3]), Number(parts[4])]
    return line.startsWith('#') || !Number.isFinite(lat) || parts.length < 5 ? [] : [{ lat, lng }]
  })
}

/** Postal codes are numbered by neighbourhood: so many places on in the list is mostly the same part of the country. */
const NEIGHBOURS = 300

/** Journeys between postal codes, every other one between neighbours, on any day of 2024 to 2033, any class and packing. */
export function randomJourneys(count: number, seed: number): RandomJourney[] {
  const [chance, points] = [chances(seed), postalPoints()]
  const one = <T>(all: readonly T[]): T => {
    const chosen = all[Math.floor(chance() * all.length)]
    if (chosen === undefined) throw new Error('Nothing to choose from.')
    return chosen
  }
  return Array.from({ length: count }, (_, at) => {
    const start = Math.floor(chance() * (points.length - NEIGHBOURS))
    const near = points.slice(start, start + NEIGHBOURS)
    const animals = one(animalClassIds)
    const date = new Date(Date.UTC(2024, 0, 1 + Math.floor(chance() * 3653))).toISOString().slice(0, 10)
    const [week, day] = [isoWeekOf(date), dayOfYear(date)]
    if (week === null || day === null) throw new Error(`${date} is no date`)
    return {
      from: one(near),
      to: one(at % 2 === 0 ? near : points),
      animals,
      species: one(animalClasses[animals].species),
      packing: one(packingClassIds),
      week,
      day,
    }
  })
}
