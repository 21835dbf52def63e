import { describe, expect, it } from 'vitest'

import { checkTrip } from '@/shared/domain/transport/check-trip'
import { reasonTexts } from '@/shared/domain/transport/reason-texts.facts'
import type { Trip } from '@/shared/domain/transport/trip'
import { animals, bags, bucket, foamBox, tripOf } from '@/shared/domain/transport/trips-for-tests'

const codesOf = (trip: Trip) => checkTrip(trip).reasons.map(({ code }) => code)
const coldBox = { ...foamBox, heightCm: 25 }
const coldDay = [{ hours: 24, airC: 8 }]
const flat10L = bags({ waterLPerBag: 10, oxygenLPerBag: 10, box: coldBox })

describe('a trip in bags', () => {
  it('keeps bluegill through a day at 8 °C, and says how cold it got', () => {
    const trip = tripOf({
      container: flat10L,
      legs: coldDay,
      animals: animals('hybrid_bluegill', { count: 20 }),
    })
    const answer = checkTrip(trip)
    expect(answer.verdict).toBe('safe')
    expect(answer.cold?.coldest?.waterC).toBeCloseTo(11.76, 1)
    expect(answer.cold?.steps).toHaveLength(97)
  })

  it('refuses the same day for tilapia, and lets heat packs save them', () => {
    const tilapia = {
      animals: animals('nile_tilapia', { count: 20 }),
      water: { startC: 24, alkalinityMeqPerL: 2, pH: 7.5 },
    }
    const without = checkTrip(tripOf({ ...tilapia, container: flat10L, legs: coldDay }))
    expect(without.verdict).toBe('unsafe')
    expect(without.reasons[0]?.code).toBe('too-cold')
    expect(without.cold?.coldest?.waterC).toBeCloseTo(13.01, 1)
    const packs = { heat: { id: 'heat-40h', count: 3 }, cold: null, hasAirHoles: true } as const
    expect(checkTrip(tripOf({ ...tilapia, container: { ...flat10L, packs }, legs: coldDay })).verdict).toBe(
      'safe',
    )
    const sealed = { ...packs, hasAirHoles: false }
    expect(
      codesOf(tripOf({ ...tilapia, container: { ...flat10L, packs: sealed }, legs: coldDay })),
    ).toContain('pack-without-air')
  })

  it('gives every reason at once: load, oxygen, carbon dioxide', () => {
    const crowded = tripOf({
      animals: animals('nile_tilapia', { count: 2400, massG: 1 }),
      water: { startC: 25, alkalinityMeqPerL: 2, pH: 7.5 },
      legs: [{ hours: 24, airC: 25 }],
    })
    expect(codesOf(crowded)).toEqual(
      expect.arrayContaining(['bag-too-full', 'oxygen-runs-out', 'carbon-dioxide-high']),
    )
    expect(checkTrip(crowded).verdict).toBe('unsafe')
  })

  it('halves the load of a parcel that stands still', () => {
    const count = 200
    const moving = tripOf({ animals: animals('hybrid_bluegill', { count }) })
    expect(codesOf(moving)).not.toContain('bag-too-full')
    expect(
      codesOf(
        tripOf({ animals: animals('hybrid_bluegill', { count }), container: bags({ standsStill: true }) }),
      ),
    ).toContain('bag-too-full')
  })

  it('does not know a trip of 60 hours, nor prawns, nor fry too small for the model', () => {
    const few = animals('hybrid_bluegill', { count: 5 })
    expect(checkTrip(tripOf({ animals: few, legs: [{ hours: 60, airC: 20 }] })).verdict).toBe('unknown')
    const prawns = tripOf({
      animals: animals('freshwater_prawn', { count: 20 }),
      water: { startC: 22, alkalinityMeqPerL: 2, pH: 7.5 },
      legs: [{ hours: 8, airC: 22 }],
    })
    expect(checkTrip(prawns).verdict).toBe('unknown')
    expect(codesOf(prawns)).toContain('no-oxygen-model')
    const specks = animals('hybrid_bluegill', { count: 100, massG: 0.01, stage: 'swim-up-fry' })
    expect(codesOf(tripOf({ animals: specks }))).toContain('too-small-for-model')
  })

  it('watches spines, sizes, fasting and bags that do not fit', () => {
    const big = animals('channel_catfish', {
      count: 2,
      massG: 20,
      shortestMm: 130,
      longestMm: 140,
      fastedHours: 10,
    })
    const single = tripOf({ animals: big, container: bags({ isDoubled: false }) })
    expect(codesOf(single)).toEqual(
      expect.arrayContaining(['spines-puncture', 'not-fasted', 'stand-in-model']),
    )
    expect(checkTrip(single).verdict).toBe('unsafe')
    expect(
      codesOf(tripOf({ animals: animals('hybrid_bluegill', { shortestMm: 30, longestMm: 60 }) })),
    ).toContain('sizes-too-mixed')
    expect(codesOf(tripOf({ container: bags({ bagsPerBox: 3 }) }))).toContain('does-not-fit')
  })

  it('sends crayfish damp and worms in bedding, fish in neither', () => {
    const bedding = { kind: 'bedding', beddingKg: 3, box: foamBox, packs: bags().packs } as const
    expect(codesOf(tripOf({ animals: animals('redclaw_crayfish') }))).toContain('needs-damp')
    expect(codesOf(tripOf({ container: bedding }))).toContain('needs-water')
    const worms = tripOf({ animals: animals('red_wiggler', { massG: 0.5, count: 1000 }), container: bedding })
    expect(checkTrip(worms).verdict).toBe('safe')
    expect(checkTrip({ ...worms, legs: [{ hours: 30, airC: 38 }] }).verdict).toBe('unsafe')
  })
})

describe('the ride home', () => {
  const home = [{ hours: 1, airC: 22 }]

  it('takes a few fingerlings in a bucket, not a crowd without air', () => {
    const few = tripOf({
      container: bucket(),
      legs: home,
      animals: animals('hybrid_bluegill', { count: 25 }),
    })
    expect(checkTrip(few).verdict).toBe('safe')
    const crowd = { ...few, animals: animals('hybrid_bluegill', { count: 400 }) }
    expect(codesOf(crowd)).toContain('water-short-of-oxygen')
    expect(codesOf({ ...crowd, container: bucket({ aeration: 'air' }) })).not.toContain(
      'water-short-of-oxygen',
    )
    expect(
      codesOf({
        ...few,
        container: bucket({ aeration: 'air' }),
        animals: animals('hybrid_bluegill', { count: 900 }),
      }),
    ).toContain('vessel-too-full')
  })

  it('fails in a closed car in summer', () => {
    const day = { cold: { minC: 18, maxC: 28 }, hot: { minC: 24, maxC: 34 } }
    const weather = { origin: day, destination: day }
    const trip = tripOf({
      container: bucket({ waterL: 8 }),
      animals: animals('rainbow_trout', { count: 4, massG: 5 }),
      water: { startC: 12, alkalinityMeqPerL: 2, pH: 7.5 },
      legs: [{ hours: 1, exposure: 'parked-car', end: 'destination' }],
      departHour: 14,
      weather,
    })
    expect(checkTrip(trip).verdict).toBe('unsafe')
    expect(checkTrip(trip).hot?.warmest?.waterC).toBeGreaterThan(15)
    expect(checkTrip({ ...trip, weather: null }).verdict).toBe('unknown')
  })
})

describe('a figure that makes no sense', () => {
  it('is not answered, never bent into shape', () => {
    const wrong: Partial<Trip>[] = [
      { animals: animals('bluegill', { count: 0 }) },
      { animals: animals('bluegill', { count: 2.5 }) },
      { animals: animals('bluegill', { count: NaN }) },
      { animals: animals('bluegill', { massG: 0 }) },
      { legs: [] },
      { legs: [{ hours: -1, airC: 15 }] },
      { legs: [{ hours: 200, airC: 15 }] },
      { legs: [{ hours: 5, airC: NaN }] },
      { water: { startC: NaN, alkalinityMeqPerL: 2, pH: 7 } },
      { container: bags({ waterLPerBag: 0 }) },
      { container: bags({ box: { ...foamBox, wallMm: 0 } }) },
      { departHour: 30 },
    ]
    for (const changes of wrong)
      expect(checkTrip(tripOf(changes))).toMatchObject({ verdict: 'unknown', cold: null })
  })

  it('has a text for every reason', () => {
    for (const { text } of Object.values(reasonTexts)) expect(text).toMatch(/^[A-Z].*\.$/)
  })
})
