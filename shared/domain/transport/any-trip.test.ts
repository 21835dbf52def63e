import {
  assert,
  constantFrom,
  double,
  integer,
  nat,
  oneof,
  property,
  record,
  type Arbitrary,
} from 'fast-check'
import { describe, expect, it } from 'vitest'

import { speciesFacts } from '@/shared/domain/species/species.facts'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { Container, Trip, TripAnswer } from '@/shared/domain/transport/trip'
import { animals, bags, bucket, foamBox, tripOf } from '@/shared/domain/transport/trips-for-tests'
import { rankOf } from '@/shared/domain/transport/verdict'

/** Figures as people and programs send them: sound ones, and every kind of nonsense. */
const nonsense = constantFrom(0, -1, NaN, Infinity, -Infinity, 1e12)
const figure = (min: number, max: number) =>
  oneof({ weight: 39, arbitrary: double({ min, max, noNaN: true }) }, { weight: 1, arbitrary: nonsense })

const noPacks = { heat: null, cold: null, hasAirHoles: false }
const heated = { heat: { id: 'heat-40h', count: 3 }, cold: null, hasAirHoles: true } as const
const cooled = { heat: null, cold: { id: 'cold-450g', count: 2 }, hasAirHoles: false } as const

const boxes = record({
  lengthCm: figure(10, 90),
  widthCm: figure(10, 60),
  heightCm: figure(10, 60),
  wallMm: figure(1, 80),
  conductivityWPerMK: figure(0.02, 0.5),
})
const containers: Arbitrary<Container> = oneof(
  record({ box: boxes, packs: constantFrom(noPacks, heated, cooled), waterLPerBag: figure(0.2, 20) }).map(
    (part) => bags(part),
  ),
  record({ box: boxes, waterL: figure(1, 400), aeration: constantFrom('none', 'air', 'oxygen') }).map(
    (part) => bucket(part),
  ),
  record({ box: boxes, packs: constantFrom(noPacks, heated, cooled), beddingKg: figure(0.1, 20) }).map(
    (part): Container => ({ kind: 'bedding', ...part }),
  ),
)
const days = record({ minC: figure(-40, 30), spanC: figure(0, 18) }).map(({ minC, spanC }) => ({
  minC,
  maxC: minC + spanC,
}))
const weathers = record({ cold: days, hot: days })

const trips: Arbitrary<Trip> = record({
  species: nat(speciesFacts.length - 1),
  count: oneof(integer({ min: 1, max: 900 }), nonsense),
  massG: figure(0.005, 900),
  startC: figure(0, 35),
  hours: figure(0.2, 70),
  container: containers,
  weather: record({ origin: weathers, destination: weathers }),
}).map(({ species, count, massG, startC, hours, container, weather }) =>
  tripOf({
    animals: animals(speciesFacts[species]?.id ?? 'bluegill', { count, massG }),
    water: { startC, alkalinityMeqPerL: 2, pH: 7.5 },
    container,
    legs: [
      { hours, exposure: 'depot', end: 'origin' },
      { hours: 1, exposure: 'van', end: 'destination' },
    ],
    weather,
  }),
)

const figuresOf = ({ cold, hot, reasons, loadGPerL }: TripAnswer) => [
  loadGPerL,
  ...[cold, hot].flatMap((side) => (side?.steps ?? []).flatMap((step) => Object.values(step))),
  ...reasons.flatMap(({ value, limit, atHour }) => [value, limit, atHour]),
]

describe('any trip at all', () => {
  it('is answered without NaN, and unknown says why', () => {
    let answered = 0
    assert(
      property(trips, (trip) => {
        const answer = checkTrip(trip)
        for (const one of figuresOf(answer)) expect(one === null || Number.isFinite(one)).toBe(true)
        expect(['safe', 'caution', 'unsafe', 'unknown']).toContain(answer.verdict)
        if (answer.verdict !== 'safe') expect(answer.reasons.length).toBeGreaterThan(0)
        if (answer.cold) answered++
      }),
      { numRuns: 600, seed: 11 },
    )
    expect(answered).toBeGreaterThan(100)
  })
})

describe('a cold trip of worms never gets better', () => {
  const worms = (wallMm: number, airC: number, hours = 24) =>
    rankOf(
      checkTrip(
        tripOf({
          animals: animals('red_wiggler', { count: 1000, massG: 0.5 }),
          water: { startC: 18, alkalinityMeqPerL: 2, pH: 7.5 },
          container: { kind: 'bedding', beddingKg: 4, box: { ...foamBox, wallMm }, packs: noPacks },
          legs: [{ hours, airC }],
        }),
      ).verdict,
    )
  const walls = double({ min: 2, max: 60, noNaN: true })
  const airs = double({ min: -20, max: 18, noNaN: true })
  const share = double({ min: 0, max: 1, noNaN: true })

  it('with thinner walls, colder air or more hours', () => {
    assert(
      property(walls, airs, share, (wallMm, airC, by) => {
        const before = worms(wallMm, airC)
        expect(worms(Math.max(1, wallMm * (1 - by)), airC)).toBeGreaterThanOrEqual(before)
        expect(worms(wallMm, airC - 15 * by)).toBeGreaterThanOrEqual(before)
        expect(worms(wallMm, airC, 24 + 40 * by)).toBeGreaterThanOrEqual(before)
      }),
      { numRuns: 300 },
    )
  })

  it('and is refused without insulation below 4 °C or above 27 °C outside, however short', () => {
    expect(worms(4, 3.9, 0.5)).toBe(rankOf('unsafe'))
    expect(worms(4, 27.1, 0.5)).toBe(rankOf('unsafe'))
    expect(worms(38, 3.9, 0.5)).toBe(rankOf('safe'))
    expect(worms(4, 15, 0.5)).toBe(rankOf('safe'))
  })
})
