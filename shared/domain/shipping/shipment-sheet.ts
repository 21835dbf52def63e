import { seasonOptions } from '@/shared/domain/season/season-classes.facts'
import type { ShipmentPlan } from '@/shared/domain/shipping/plan-shipment'
import { packingSheet, type PackingSheet, type SheetSection } from '@/shared/domain/transport/packing-sheet'
import type { Bedding } from '@/shared/domain/transport/trip'
import { fahrenheitFromC } from '@/shared/units/temperature'

interface Packed {
  plan: ShipmentPlan
  /** In all boxes together. */
  quantity: number
  boxes: number
  isForecast: boolean
  /** The rule of the box, in words. */
  boxRule: string
}

const degrees = (degreesC: number) =>
  `${Number(degreesC.toFixed(1))} °C (${Math.round(fahrenheitFromC(degreesC))} °F)`

/** How the boxes of an order are packed, in words, from the plan of its last check. */
export function shipmentSheet(packed: Packed): PackingSheet {
  const { plan, quantity, boxes, isForecast, boxRule } = packed
  const { trip, answer, animalsPerBox } = plan
  const { container } = trip
  if (container.kind === 'vessel') throw new RangeError('an open vessel is no parcel')
  const rule: SheetSection = { heading: 'The box itself', lines: [boxRule] }
  if (container.kind === 'bedding') return beddingSheet(packed, container, rule)
  const { box, packs, bagsPerBox, waterLPerBag, oxygenLPerBag } = container
  const sheet = packingSheet(
    { animals: { ...trip.animals, count: quantity }, water: trip.water },
    {
      ...{ boxes, bagsPerBox, packs, answer, isForecast, box: { box } },
      bag: { waterL: waterLPerBag, oxygenL: oxygenLPerBag },
      animalsPerBag: Math.ceil(animalsPerBox / bagsPerBox),
    },
  )
  return { ...sheet, sections: [...sheet.sections, rule] }
}

function beddingSheet(
  { plan, quantity, boxes }: Packed,
  { beddingKg, box }: Bedding,
  rule: SheetSection,
): PackingSheet {
  const { animals } = plan.trip
  const { kind, count } = seasonOptions[plan.option]
  const packs = kind === 'none' ? 'No heat packs and no cold packs.' : `${count} ${kind} packs in each box.`
  return {
    title: `Packing sheet: ${quantity} ${animals.species.commonName}`,
    sections: [
      {
        heading: 'What goes into each box',
        lines: [
          `${quantity} animals in all, in ${boxes} boxes: at most ${plan.animalsPerBox} in each`,
          `Inside ${box.lengthCm} × ${box.widthCm} × ${box.heightCm} cm, walls of ${box.wallMm} mm`,
          `${beddingKg} kg of damp bedding at ${degrees(plan.startC)}, no standing water`,
          packs,
        ],
      },
      {
        heading: 'On the way',
        lines: [`Reckoned for ${plan.answer.hours} hours from packing to release.`],
      },
      rule,
    ],
    label: [],
  }
}
