import { describe, expect, it } from 'vitest'

import { isoWeekOf } from '@/shared/domain/season/iso-week'
import {
  nextSafeWeek,
  safeLanes,
  seasonAt,
  seasonStrip,
  type Shipment,
} from '@/shared/domain/season/season-at'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import { animalClasses } from '@/shared/domain/season/season-classes.facts'
import { encodeFigures, valueOf } from '@/shared/domain/season/season-code'
import { animalClassOf, laneOf, NO_LANE } from '@/shared/domain/season/season-lane'
import { dayOfLevel, levelOfDay } from '@/shared/domain/season/season-scale'
import { seasonTable } from '@/shared/domain/season/season-table.gen'
import { findSpecies } from '@/shared/domain/species/find-species'
import { speciesFacts } from '@/shared/domain/species/species.facts'

const atlanta = seasonBandAt(33.75, -84.39)
const nashville = seasonBandAt(36.16, -86.78)
const sunfish: Shipment = {
  origin: atlanta,
  destination: nashville,
  animals: 'sunfish-and-bass',
  packing: 'foam-38-overnight',
}

describe('the season of a shipment', () => {
  it('lets sunfish travel from Atlanta to Nashville in spring, not in frost', () => {
    expect(seasonAt(sunfish, 17).verdict).toBe('safe-with-packs')
    expect(seasonAt(sunfish, 3)).toEqual({ verdict: 'too-cold', forCold: null, forHeat: null })
    expect(seasonAt({ ...sunfish, animals: 'trout', packing: 'foam-25-overnight' }, 30).verdict).toBe(
      'too-hot',
    )
    expect(seasonStrip(sunfish)).toHaveLength(52)
    expect(seasonAt(sunfish, 53)).toEqual(seasonAt(sunfish, 52))
  })

  it('finds the next week that is safe, around the turn of the year', () => {
    const first = seasonStrip(sunfish).findIndex(({ forCold }) => forCold !== null) + 1
    expect(nextSafeWeek(sunfish, 52)).toBe(first)
    expect(nextSafeWeek(sunfish, 20)).toBe(20)
    expect(nextSafeWeek({ ...sunfish, animals: 'tilapia', packing: 'carton-two-days' }, 1)).toBeNull()
  })

  it('does not know prawns, the sea, nor a week 60', () => {
    expect(seasonAt({ ...sunfish, animals: 'prawn' }, 20).verdict).toBe('unknown')
    expect(seasonAt({ ...sunfish, origin: seasonBandAt(30, -50) }, 20).verdict).toBe('unknown')
    for (const week of [0, 60, 1.5, NaN]) expect(seasonAt(sunfish, week).verdict).toBe('unknown')
  })

  it('gives every safe lane a number of its own', () => {
    const lanes = safeLanes(nashville, 17)
    expect(new Set(lanes).size).toBe(lanes.length)
    const { animals, packing } = sunfish
    expect(atlanta !== null && lanes.includes(laneOf({ origin: atlanta, animals, packing }))).toBe(true)
    expect(Math.min(...lanes)).toBeGreaterThan(NO_LANE)
    expect(Math.max(...lanes)).toBeLessThan(65_536)
    expect(safeLanes(null, 17)).toEqual([])
  })
})

describe('what the table is made of', () => {
  it('has a class for every animal, packed inside its range', () => {
    for (const { id } of speciesFacts) expect(animalClassOf(id)).not.toBeNull()
    for (const { species, packedC } of Object.values(animalClasses)) {
      for (const id of species) {
        const facts = findSpecies(id)
        const [low, high] = facts?.shipAirC ?? facts?.shipWaterC ?? [NaN, NaN]
        for (const warmthC of Object.values(packedC)) {
          expect(warmthC).toBeGreaterThan(low)
          expect(warmthC).toBeLessThan(high)
        }
      }
    }
  })

  it('has at most 48 bands', () => {
    expect(seasonTable.bands).toBe(48)
    for (const kind of Object.values(seasonTable.weeks)) {
      for (const bands of Object.values(kind)) for (const weeks of bands) expect(weeks).toHaveLength(52)
    }
  })

  it('takes a day for no milder than it is', () => {
    for (const day of [
      { minC: -3.2, maxC: 4.9 },
      { minC: 10.01, maxC: 31 },
      { minC: 24.5, maxC: 25 },
    ]) {
      const [cold, hot] = [levelOfDay('cold', day), levelOfDay('hot', day)]
      const [colder, hotter] = [dayOfLevel('cold', cold ?? NaN), dayOfLevel('hot', hot ?? NaN)]
      expect(colder.minC).toBeLessThanOrEqual(day.minC)
      expect(colder.maxC).toBeLessThanOrEqual(day.maxC)
      expect(hotter.minC).toBeGreaterThanOrEqual(day.minC)
      expect(hotter.maxC).toBeGreaterThanOrEqual(day.maxC)
    }
    expect(levelOfDay('cold', { minC: -60, maxC: -50 })).toBeNull()
    expect(levelOfDay('hot', { minC: 40, maxC: 70 })).toBeNull()
  })

  it('writes figures as letters and reads them back', () => {
    const figures = [...Array.from({ length: 81 }, (_, at) => at), null]
    const text = encodeFigures(figures)
    expect(figures.map((_, at) => valueOf(text, at))).toEqual(figures)
    expect(valueOf('', 0)).toBeNull()
  })
})

describe('ISO weeks', () => {
  it('are those of the calendar', () => {
    const known = {
      '2027-01-03': 53,
      '2027-01-04': 1,
      '2026-12-31': 53,
      '2024-12-30': 1,
      '2028-01-02': 52,
      '2028-02-29': 9,
    }
    for (const [date, week] of Object.entries(known)) expect(isoWeekOf(date)).toBe(week)
    expect(isoWeekOf('2027-02-30')).toBeNull()
  })
})
