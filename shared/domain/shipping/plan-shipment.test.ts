import { describe, expect, it } from 'vitest'

import { findSpecies } from '@/shared/domain/species/find-species'
import { planShipment, planShipmentAhead, type ShipmentTask } from '@/shared/domain/shipping/plan-shipment'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { Weather } from '@/shared/domain/transport/leg-air'

const air = (minC: number, maxC: number) => ({ cold: { minC, maxC }, hot: { minC, maxC } })
const both = (minC: number, maxC: number): Weather => ({
  origin: air(minC, maxC),
  destination: air(minC, maxC),
})

function task(changes: Partial<ShipmentTask> = {}, count = 60): ShipmentTask {
  const species = findSpecies('channel_catfish')
  if (!species) throw new Error('no catfish')
  return {
    animals: {
      species,
      count,
      massG: 4,
      stage: 'fingerling',
      shortestMm: 60,
      longestMm: 75,
      fastedHours: 48,
    },
    water: { alkalinityMeqPerL: 2, pH: 7.5 },
    packing: 'foam-38-overnight',
    boxes: 1,
    weather: both(8, 18),
    ...changes,
  }
}

describe('packing an order for its weather', () => {
  it('takes no packs on a mild day, and its own trip says safe', () => {
    const { verdict, plan } = planShipment(task())
    expect(verdict).toBe('safe')
    expect(plan).toMatchObject({ animalsPerBox: 60, bagsPerBox: 3 })
    expect(plan && checkTrip(plan.trip).verdict).toBe('safe')
  })

  it('adds heat packs against frost and cold packs against heat', () => {
    expect(planShipment(task({ weather: both(-6, 2) })).plan?.option).toMatch(/^heat|warm$/)
    const summer = planShipment(task({ weather: both(20, 33) }))
    expect(summer.verdict).toBe('safe')
    expect(summer.plan?.option).toMatch(/^cold/)
  })

  it('says no to deep frost, with what speaks against it', () => {
    const { verdict, reasons } = planShipment(task({ weather: both(-30, -20) }))
    expect(verdict).toBe('unsafe')
    expect(reasons.map(({ code }) => code)).toContain('too-cold')
  })

  it('says no to a box with too many, whatever the weather, and yes to the same in more boxes', () => {
    expect(planShipment(task({}, 2000)).verdict).toBe('unsafe')
    expect(planShipment(task({ boxes: 34 }, 2000))).toMatchObject({
      verdict: 'safe',
      plan: { animalsPerBox: 59 },
    })
  })

  it('says that nobody knows an animal without a class', () => {
    const species = { ...task().animals.species, id: 'no_such_animal' as 'channel_catfish' }
    expect(planShipment(task({ animals: { ...task().animals, species } })).verdict).toBe('unknown')
  })

  it('plans long before for the cold and for the hot day apart', () => {
    const wide: Weather = {
      origin: { cold: { minC: -6, maxC: 2 }, hot: { minC: 20, maxC: 33 } },
      destination: { cold: { minC: -6, maxC: 2 }, hot: { minC: 20, maxC: 33 } },
    }
    // One packing cannot do both; each day has one, and which it is the forecast will say.
    expect(planShipment(task({ weather: wide })).verdict).toBe('unsafe')
    expect(planShipmentAhead(task({ weather: wide }))).toEqual({ verdict: 'safe', plan: null, reasons: [] })
    expect(planShipmentAhead(task()).plan?.option).toBe(planShipment(task()).plan?.option)
    expect(planShipmentAhead(task({ weather: both(-30, -20) })).verdict).toBe('unsafe')
  })
})
