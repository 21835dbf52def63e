import { describe, expect, it } from 'vitest'

import { supplyCautions } from './supply-cautions'
import { supplyFacts } from './supply-facts'

import type { SupplyBody } from './supply-body'
import { clay, redWigglers } from '@/shared/domain/listings/lots-for-tests'

const basil = {
  category: 'produce',
  cropId: 'basil',
  form: 'harvest-cut',
  saleUnit: { kind: 'weight', netG: 113.3980925 },
  harvest: { day: '2027-04-12', time: '07:30' },
  lotCode: 'L-0412',
  handling: { touchesSystemWater: 'not-sure', rinsedInDrinkingWater: true, heldC: 13, coldAtPickup: false },
  growing: 'On rafts.',
  standing: 'qualified-exempt',
  farm: { name: 'Millrace Greens', street: '4 Canal Rd', city: 'Dayton', state: 'OH', zip: '45402' },
  tiers: [{ fromCount: 1, unitCents: 450 }],
  minOrder: 1,
}

const told = (lot: object) =>
  Object.fromEntries(
    supplyFacts(lot as SupplyBody, { units: 'us', count: 2 })
      .flatMap(({ facts }) => facts)
      .flatMap(({ term, value }) => (value ? [[term, value]] : [])),
  )
const minded = (lot: object) => supplyCautions(lot as SupplyBody).map(({ text }) => text)

describe('what a page says of produce', () => {
  const facts = told(basil)
  it('gives the price that people can compare, and the words of the label', () => {
    expect(facts.Price).toBe('$4.50 for 4 oz (113 g), $1.13/oz')
    expect(facts['Net weight']).toMatch(/^Net weight 4 oz/)
    expect(facts['On the label']).toBe('Wash before eating.')
    expect(facts['Before eating']).toMatch(/^Wash before eating/)
  })
  it('says when it was cut, how cold it wants it and until when it is sold', () => {
    expect(facts.Harvested).toBe('April 12, 2027, 7:30 AM')
    expect(facts['Mind the cold']).toMatch(/^Harmed below 54 °F/)
    expect(facts['Sold until']).toBe('April 19, 2027')
    expect(facts['Lot code']).toBe('L-0412')
  })
  it('shows the address of a qualified exempt farm, and of no other', () => {
    expect(facts['Grown by']).toBe('Millrace Greens, 4 Canal Rd, Dayton, OH 45402')
    expect(told({ ...basil, standing: 'covered', farm: undefined })).not.toHaveProperty('Grown by')
  })
  it('cautions about fish water on the leaf', () =>
    expect(minded(basil).some((text) => text.startsWith('Fish water can carry germs'))).toBe(true))
})

describe('what a page says of worms and media', () => {
  it('counts worms by the pack and compares by the hundred', () => {
    expect(told(redWigglers)).toMatchObject({
      'One unit': '1 pack of 500 worms',
      Price: '$24.00 for 500, $4.80/100',
      Kind: 'Red wiggler, Eisenia fetida',
    })
  })
  it('says what the bags weigh in the car, in both systems', () =>
    expect(told(clay)['In the car']).toBe('2 units weigh about 62 lb (28 kg) in the car.'))
  it('asks about a weight that hardly can be, and is silent about one that can', () => {
    const wet = { ...clay, saleUnit: { kind: 'volume', litres: 50, weightKg: 40 } }
    expect(minded(wet).some((text) => text.startsWith('Expanded clay: dry, that volume'))).toBe(true)
    expect(minded(clay).some((text) => text.startsWith('Expanded clay'))).toBe(false)
  })
  it('never speaks of washing what nobody eats', () =>
    expect([...minded(redWigglers), ...minded(clay)].join(' ')).not.toMatch(/Wash before eating/))
})
