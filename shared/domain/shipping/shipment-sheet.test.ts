import { describe, expect, it } from 'vitest'

import { planShipment } from '@/shared/domain/shipping/plan-shipment'
import { shipmentSheet } from '@/shared/domain/shipping/shipment-sheet'
import { findSpecies } from '@/shared/domain/species/find-species'

const mild = { cold: { minC: 12, maxC: 18 }, hot: { minC: 12, maxC: 18 } }

function sheetOf(id: string, { quantity, boxes }: { quantity: number; boxes: number }) {
  const species = findSpecies(id)
  if (!species) throw new Error(`no ${id}`)
  const { plan } = planShipment({
    animals: {
      ...{ species, count: quantity, massG: 3, stage: 'fingerling', shortestMm: 50, longestMm: 60 },
      fastedHours: species.fastHours,
    },
    water: { alkalinityMeqPerL: 2, pH: 7.5 },
    packing: 'foam-38-overnight',
    boxes,
    weather: { origin: mild, destination: mild },
  })
  if (!plan) throw new Error('no plan')
  const sheet = shipmentSheet({ plan, quantity, boxes, isForecast: true, boxRule: 'Strong cartons only.' })
  return { plan, sheet, text: sheet.sections.flatMap(({ heading, lines }) => [heading, ...lines]).join('\n') }
}

describe('the packing sheet of a shipped order', () => {
  it('tells all animals, boxes and bags of fish, no price, and that the forecast was asked', () => {
    const { sheet, text } = sheetOf('bluegill', { quantity: 121, boxes: 2 })
    expect(sheet.title).toBe('Packing sheet: 121 Bluegill')
    // 121 in two boxes of three bags: at most 61 in a box and 21 in a bag.
    expect(text).toContain('2 boxes')
    expect(text).toContain('At most 21 animals a bag')
    expect(text).toContain('Reckoned by the forecast')
    expect(text).toContain('Strong cartons only.')
    expect(text).not.toContain('$')
  })

  it('tells bedding instead of bags for what travels damp', () => {
    const { plan, text } = sheetOf('red_wiggler', { quantity: 1000, boxes: 2 })
    expect(plan.trip.container.kind).toBe('bedding')
    expect(text).toContain('1000 animals in all, in 2 boxes: at most 500 in each')
    expect(text).toContain('12 kg of damp bedding')
    expect(text).not.toContain('oxygen')
  })
})
