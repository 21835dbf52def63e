import type { Fact } from '@/components/listings/fact-rows'
import type { MediaBody } from '@/shared/contracts/media-lot'
import { unitCount } from '@/shared/domain/listings/unit-words'
import { findMedia } from '@/shared/domain/media/find-media'
import { carLoadWords, judgeStatedWeight } from '@/shared/domain/media/media-weight'
import { tierFor } from '@/shared/domain/money/tier-price'
import { supplyPrice } from '@/shared/domain/pricing/supply-price'
import { heatCaution } from '@/shared/domain/worms/heat-treated'
import { printLengthRange } from '@/shared/units/length'
import type { UnitSystem } from '@/shared/units/unit-system'

const vinegar: Record<NonNullable<MediaBody['vinegarTest']>, string> = {
  'no-fizz': 'No fizz in vinegar: it leaves the pH alone.',
  fizzes: 'Fizzes in vinegar: it holds lime and pushes the pH up.',
  'not-done': 'Not tried in vinegar.',
}

interface Asked {
  units: UnitSystem
  count: number
}

const weightKgOf = ({ saleUnit }: MediaBody) =>
  saleUnit.kind === 'volume' ? saleUnit.weightKg : saleUnit.netG / 1000

export function mediaGoods(body: MediaBody, { units, count }: Asked): Fact[] {
  const material = findMedia(body.material)
  const { saleUnit, grainLoMm, grainHiMm, rinsed, used } = body
  const unitCents = tierFor(body.tiers, Math.max(count, body.minOrder))?.unitCents ?? 0
  const { price, comparable } = supplyPrice({ unit: saleUnit, unitCents }, units)
  const name = body.material === 'other' ? body.materialWords : material?.name
  return [
    {
      term: 'Material',
      value: [name, body.material === 'other' ? '' : body.materialWords].filter(Boolean).join(', '),
    },
    {
      term: 'Grain',
      value:
        grainLoMm === undefined || grainHiMm === undefined
          ? undefined
          : `${grainLoMm} to ${grainHiMm} mm (${printLengthRange({ minCm: grainLoMm / 10, maxCm: grainHiMm / 10 }, 'us')})`,
    },
    { term: 'One unit', value: unitCount(saleUnit, 1) },
    { term: 'In the car', value: carLoadWords(count, weightKgOf(body)) },
    { term: 'Price', value: [price, comparable].filter(Boolean).join(', ') },
    { term: 'Rinsed', value: rinsed === undefined ? undefined : rinsed ? 'Yes' : 'No: rinse it before use' },
    { term: 'Vinegar', value: body.vinegarTest && vinegar[body.vinegarTest] },
    {
      term: 'New or used',
      value: used === 'new' ? 'New' : ['Used', body.usedWords].filter(Boolean).join(': '),
    },
  ]
}

/** What a buyer should mind about this material; [] where there is nothing. */
export function mediaCautions(body: MediaBody): string[] {
  const material = findMedia(body.material)
  const { saleUnit } = body
  const stated = material && saleUnit.kind === 'volume' ? judgeStatedWeight(material, saleUnit).saying : null
  const heat = material && body.heatTreated ? heatCaution(material, body.heatTreated) : null
  return [stated, heat].filter((words): words is string => Boolean(words))
}
