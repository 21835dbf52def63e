import type { Fact } from '@/components/listings/fact-rows'
import { plainDay } from '@/components/listings/pickup-words'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import { unitCount } from '@/shared/domain/listings/unit-words'
import { tierFor } from '@/shared/domain/money/tier-price'
import { judgeStanding } from '@/shared/domain/produce/farm-standing'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { judgeForm, produceCaution, type ProduceForm } from '@/shared/domain/produce/judge-form'
import type { WaterTouch } from '@/shared/domain/produce/judge-holding'
import { sellBy } from '@/shared/domain/produce/sell-by'
import { unitPrice } from '@/shared/domain/produce/unit-price'
import { printWallTime } from '@/shared/times/print-wall-time'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

const forms: Record<ProduceForm, string> = {
  whole: 'Whole, as harvested',
  'harvest-cut': 'Leaves cut at the harvest',
  'cut-mixed-or-washed': 'Cut, mixed or washed ready to eat, under a food licence',
}
const touches: Record<WaterTouch, string> = {
  no: 'Does not touch the part that is eaten.',
  yes: 'Touches the part that is eaten.',
  'not-sure': 'The grower is not sure whether it touches the part that is eaten.',
}
const organics = {
  certified: 'Certified organic',
  'exempt-small': 'Organic, exempt as a small farm',
} as const

interface Asked {
  units: UnitSystem
  count: number
}

/** What is sold, what it costs to compare, and what the label says. */
export function produceGoods(body: ProduceBody, { units, count }: Asked): Fact[] {
  const crop = findCrop(body.cropId)
  const { saleUnit, form } = body
  const unitCents = tierFor(body.tiers, Math.max(count, body.minOrder))?.unitCents ?? 0
  const price = crop && unitPrice({ crop, unit: saleUnit, unitCents }, units)
  const claim = body.organic && [organics[body.organic], body.organicCertifier].filter(Boolean).join(', by ')
  return [
    { term: 'Crop', value: [crop?.name ?? body.cropId, body.variety].filter(Boolean).join(', ') },
    { term: 'Form', value: forms[form] },
    { term: 'Sold by', value: unitCount(saleUnit, 1) },
    { term: 'Price', value: price ? [price.price, price.comparable].filter(Boolean).join(', ') : undefined },
    { term: 'Net weight', value: price?.netWeight ?? undefined },
    { term: 'Organic', value: claim },
    { term: 'How it is grown', value: body.growing },
  ]
}

/** Harvest, cold and the last day: what keeps greens honest. */
export function produceHarvest(body: ProduceBody): Fact[] {
  const crop = findCrop(body.cropId)
  const { harvest, handling, form } = body
  const reckoned = crop && sellBy({ crop, form, harvestDay: harvest.day, heldC: handling.heldC })
  const lastDay = body.sellBy ?? reckoned?.day
  const cold = handling.coldAtPickup ? 'and handed over from a cooler or fridge' : 'until the pickup'
  return [
    { term: 'Harvested', value: `${plainDay(harvest.day)}, ${printWallTime(harvest.time)}` },
    { term: 'Kept at', value: `${printBothTemperatures(handling.heldC, 'us')} ${cold}` },
    {
      term: 'Keep it at',
      value:
        crop?.storeC &&
        `${printBothTemperatures(crop.storeC[0], 'us')} to ${printBothTemperatures(crop.storeC[1], 'us')} at home`,
    },
    {
      term: 'Mind the cold',
      value:
        crop?.chillsBelowC === undefined || crop.chillsBelowC === null
          ? undefined
          : `Harmed below ${printBothTemperatures(crop.chillsBelowC, 'us')}: no ice on it, not into the fridge.`,
    },
    { term: 'Sold until', value: lastDay ? plainDay(lastDay) : undefined },
    { term: 'Lot code', value: body.lotCode },
    { term: 'Fish water', value: touches[handling.touchesSystemWater] },
    { term: 'Rinsed', value: handling.rinsedInDrinkingWater ? 'In drinking water' : 'Not rinsed' },
    { term: 'On the label', value: judgeForm(form, true).label ?? undefined },
    { term: 'Before eating', value: produceCaution },
    { term: 'Grown by', value: judgeStanding(body.standing, body.farm ?? null).shows ?? undefined },
  ].map(({ term, value }) => ({ term, value: value ?? undefined }))
}
