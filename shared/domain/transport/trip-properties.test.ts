import { assert, double, integer, nat, property, record, type Arbitrary } from 'fast-check'
import { describe, expect, it } from 'vitest'

import { checkTrip } from '@/shared/domain/transport/check-trip'
import { gPerLFromPoundsPerGal, poundsPerGalFromGPerL } from '@/shared/units/load'
import type { Trip, TripAnswer } from '@/shared/domain/transport/trip'
import { animals, bags, foamBox, tripOf } from '@/shared/domain/transport/trips-for-tests'
import { rankOf } from '@/shared/domain/transport/verdict'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { kmFromMiles, milesFromKm } from '@/shared/units/distance'
import { cmFromInches, inchesFromCm } from '@/shared/units/length'
import { gramsFromPounds, poundsFromG } from '@/shared/units/mass'
import { celsiusFromF, fahrenheitFromC } from '@/shared/units/temperature'
import { gallonsFromL, litresFromGallons } from '@/shared/units/volume'

const inWater = speciesFacts.filter(({ travels }) => travels === 'in-water')

interface Draw {
  species: number
  startC: number
  dropC: number
  hours: number
  count: number
  massG: number
  wallMm: number
}

const draws: Arbitrary<Draw> = record({
  species: nat(inWater.length - 1),
  startC: double({ min: 4, max: 32, noNaN: true }),
  dropC: double({ min: 0, max: 30, noNaN: true }),
  hours: double({ min: 1, max: 50, noNaN: true }),
  count: integer({ min: 1, max: 600 }),
  massG: double({ min: 0.05, max: 20, noNaN: true }),
  wallMm: double({ min: 15, max: 60, noNaN: true }),
})

/** A cold trip: the air is never warmer than the water at packing. */
function coldTrip(draw: Draw): Trip {
  const { startC, count, massG, wallMm } = draw
  return tripOf({
    animals: animals(inWater[draw.species]?.id ?? 'bluegill', { count, massG }),
    water: { startC, alkalinityMeqPerL: 2, pH: 7.5 },
    container: bags({ box: { ...foamBox, wallMm } }),
    legs: [{ hours: draw.hours, airC: startC - draw.dropC }],
  })
}

const rank = (draw: Draw) => rankOf(checkTrip(coldTrip(draw)).verdict)
const never = (worse: (draw: Draw, by: number) => Draw) =>
  assert(
    property(draws, double({ min: 0, max: 1, noNaN: true }), (draw, by) => {
      expect(rank(worse(draw, by))).toBeGreaterThanOrEqual(rank(draw))
    }),
    { numRuns: 300 },
  )

describe('a cold trip never gets better', () => {
  it('with more hours', () => never((draw, by) => ({ ...draw, hours: draw.hours + by * 20 })))
  it('with more fish', () => never((draw, by) => ({ ...draw, count: draw.count + Math.round(by * 400) })))
  it('with colder air', () => never((draw, by) => ({ ...draw, dropC: draw.dropC + by * 15 })))
  it('with thinner walls', () => never((draw, by) => ({ ...draw, wallMm: draw.wallMm * (1 - by * 0.9) })))
})

describe('a trip never gets worse', () => {
  it('with more bags in larger boxes for the same fish', () => {
    assert(
      property(draws, integer({ min: 1, max: 4 }), (draw, more) => {
        const trip = coldTrip(draw)
        const box = { ...foamBox, lengthCm: 80, heightCm: 60, widthCm: 40 }
        const of = (bagsPerBox: number) =>
          rankOf(checkTrip({ ...trip, container: bags({ box, bagsPerBox }) }).verdict)
        expect(of(1 + more)).toBeLessThanOrEqual(of(1))
      }),
      { numRuns: 200 },
    )
  })

  it('with more boxes for the same fish', () => {
    assert(
      property(draws, integer({ min: 1, max: 5 }), (draw, boxes) => {
        const trip = coldTrip(draw)
        const spread = checkTrip({ ...trip, container: bags({ boxes: boxes + 1 }) })
        expect(rankOf(spread.verdict)).toBeLessThanOrEqual(
          rankOf(checkTrip({ ...trip, container: bags({ boxes }) }).verdict),
        )
      }),
      { numRuns: 200 },
    )
  })
})

describe('the figures', () => {
  it('are never NaN or infinite', () => {
    const figures = ({ cold, hot, reasons }: TripAnswer) => [
      ...[cold, hot].flatMap((side) => (side?.steps ?? []).flatMap((step) => Object.values(step))),
      ...reasons.flatMap(({ value, limit }) => [value, limit]),
    ]
    assert(
      property(draws, (draw) => {
        for (const figure of figures(checkTrip(coldTrip(draw))))
          expect(figure === null || Number.isFinite(figure)).toBe(true)
      }),
      { numRuns: 100 },
    )
  })

  it('go from one unit to the other and back', () => {
    assert(
      property(double({ min: 0, max: 1e4, noNaN: true }), (value) => {
        const slack = 1e-9 * Math.max(1, value)
        expect(Math.abs(gPerLFromPoundsPerGal(poundsPerGalFromGPerL(value)) - value)).toBeLessThanOrEqual(
          slack,
        )
        expect(Math.abs(celsiusFromF(fahrenheitFromC(value)) - value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(gramsFromPounds(poundsFromG(value)) - value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(litresFromGallons(gallonsFromL(value)) - value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(cmFromInches(inchesFromCm(value)) - value)).toBeLessThanOrEqual(slack)
        expect(Math.abs(kmFromMiles(milesFromKm(value)) - value)).toBeLessThanOrEqual(slack)
      }),
    )
  })
})
