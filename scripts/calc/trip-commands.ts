import { z } from 'zod'

import { massForLoadG } from '@/shared/domain/animals/length-to-mass'
import { normalsAt } from '@/shared/domain/climate/climate-grid'
import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import { designWeather } from '@/shared/domain/climate/design-weather'
import { normalDay } from '@/shared/domain/climate/normal-day'
import { USUAL_ALKALINITY_MEQ_PER_L } from '@/shared/domain/transport/bag-equations.facts'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { TripAnswer, TripSide } from '@/shared/domain/transport/trip'
import { findSpecies } from '@/shared/domain/species/find-species'
import { shippedClimate } from '@/scripts/calc/climate-commands'
import { command, Refusal, type Command } from '@/scripts/calc/command'

const place = z.strictObject({ lat: z.number(), lng: z.number() })
const box = z.strictObject({
  lengthCm: z.number(),
  widthCm: z.number(),
  heightCm: z.number(),
  wallMm: z.number(),
  conductivityWPerMK: z.number(),
})
const packs = z.strictObject({
  heat: z
    .strictObject({ id: z.enum(['heat-24h', 'heat-40h', 'heat-72h']), count: z.int().min(1).max(20) })
    .nullable(),
  cold: z.strictObject({ id: z.enum(['cold-450g']), count: z.int().min(1).max(20) }).nullable(),
  hasAirHoles: z.boolean(),
})
const container = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('bags'),
    boxes: z.number(),
    bagsPerBox: z.number(),
    waterLPerBag: z.number(),
    oxygenLPerBag: z.number(),
    isDoubled: z.boolean(),
    standsStill: z.boolean(),
    box,
    packs,
  }),
  z.strictObject({
    kind: z.literal('vessel'),
    waterL: z.number(),
    box,
    aeration: z.enum(['none', 'air', 'oxygen']),
  }),
  z.strictObject({ kind: z.literal('bedding'), beddingKg: z.number(), box, packs }),
])
const exposure = z.enum(['outdoor', 'depot', 'van', 'cabin', 'parked-car'])
const leg = z.union([
  z.strictObject({ hours: z.number(), airC: z.number() }),
  z.strictObject({ hours: z.number(), exposure, end: z.enum(['origin', 'destination']) }),
])

const trip = z.strictObject({
  species: z.string(),
  count: z.number(),
  /** Either the mass of one animal or its length. */
  massG: z.number().optional(),
  lengthMm: z.number().optional(),
  stage: z.enum(['eggs', 'yolk-sac-fry', 'swim-up-fry', 'fingerling']).default('fingerling'),
  shortestMm: z.number().nullable().default(null),
  longestMm: z.number().nullable().default(null),
  fastedHours: z.number().nullable().default(null),
  startC: z.number(),
  alkalinityMeqPerL: z.number().default(USUAL_ALKALINITY_MEQ_PER_L),
  pH: z.number().default(8),
  container,
  legs: z.array(leg).max(50),
  departHour: z.number().default(12),
  /** Needed where a leg names an end instead of its air. */
  weather: z
    .strictObject({
      origin: place,
      destination: place,
      date: z.string(),
      nights: z.int().min(1).max(7),
      confidence: z.number(),
    })
    .nullable()
    .default(null),
})

function weatherOf(asked: z.infer<typeof trip>['weather']) {
  if (!asked) return null
  const day = dayOfYear(asked.date)
  if (day === null) throw new Refusal('weather.date: give a day of the calendar as YYYY-MM-DD.')
  const at = ({ lat, lng }: z.infer<typeof place>) => {
    const normals = normalsAt(shippedClimate(), lat, lng)
    const normal = normals && normalDay(normals, day)
    const design = normal && designWeather(normal, asked.nights, asked.confidence)
    if (!design) throw new Refusal('weather: no climate for this place, or a confidence outside 0.5 to 1.')
    return design
  }
  return { origin: at(asked.origin), destination: at(asked.destination) }
}

const sideOf = (side: TripSide | null) =>
  side && { coldest: side.coldest, warmest: side.warmest, end: side.steps.at(-1) ?? null }

/** The worst moments instead of every quarter of an hour. */
const shortened = ({ cold, hot, ...rest }: TripAnswer) => ({ ...rest, cold: sideOf(cold), hot: sideOf(hot) })

export const tripCommands: Record<string, Command> = {
  trip: command(trip, 'animals we hold figures for', (asked) => {
    const species = findSpecies(asked.species)
    if (!species) throw new Refusal(`species: we hold no figures for "${asked.species}".`)
    const massG = asked.massG ?? (asked.lengthMm === undefined ? null : massForLoadG(species, asked.lengthMm))
    if (massG === null) throw new Refusal('massG: give the mass of one animal, or for fish its lengthMm.')
    const { count, stage, fastedHours, startC, alkalinityMeqPerL, pH, legs, departHour } = asked
    const shortestMm = asked.shortestMm ?? asked.lengthMm ?? null
    const longestMm = asked.longestMm ?? asked.lengthMm ?? null
    return shortened(
      checkTrip({
        animals: { species, count, massG, stage, shortestMm, longestMm, fastedHours },
        water: { startC, alkalinityMeqPerL, pH },
        container: asked.container,
        legs,
        departHour,
        weather: weatherOf(asked.weather),
      }),
    )
  }),
}
