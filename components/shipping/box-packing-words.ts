import type { BoxPacking } from '@/shared/contracts/shipments'
import { printCount } from '@/shared/units/count'
import { printMass } from '@/shared/units/mass'
import { roundTo } from '@/shared/units/round-to'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'
import { printVolume } from '@/shared/units/volume'

export interface PackingLine {
  label: string
  text: string
}

const some = (count: number, one: string) =>
  `${printCount(count)} ${one}${count === 1 ? '' : one.endsWith('x') ? 'es' : 's'}`

/** "2 boxes, up to 30 animals in each". */
export function boxWords({ boxes, animalsPerBox }: Pick<BoxPacking, 'boxes' | 'animalsPerBox'>): string {
  return boxes === 1
    ? `1 box, ${printCount(animalsPerBox)} animals in it`
    : `${some(boxes, 'box')}, up to ${printCount(animalsPerBox)} animals in each`
}

export function packWords({ packs, packCount, packHours }: BoxPacking): string {
  if (packs === 'none' || packCount === 0) return 'none'
  if (packs === 'cold') return some(packCount, 'cold pack')
  return `${some(packCount, 'heat pack')}${packHours ? ` of ${packHours} hours` : ''}`
}

/** "between 60 °F (15.5 °C) and 66 °F (19 °C)"; '' where no figures were kept. */
export function waterWords(
  { coldestC, warmestC }: Pick<BoxPacking, 'coldestC' | 'warmestC'>,
  units: UnitSystem,
): string {
  if (coldestC === undefined && warmestC === undefined) return ''
  if (warmestC === undefined) return `at its coldest ${printBothTemperatures(coldestC ?? 0, units)}`
  if (coldestC === undefined) return `at its warmest ${printBothTemperatures(warmestC, units)}`
  return `between ${printBothTemperatures(coldestC, units)} and ${printBothTemperatures(warmestC, units)}`
}

function fillingWords(packing: BoxPacking, units: UnitSystem): string {
  const { bagsPerBox, animalsPerBag, waterLPerBag, oxygenLPerBag, beddingKg } = packing
  if (bagsPerBox === undefined) {
    return beddingKg === undefined ? 'Bedding' : `${printMass(beddingKg * 1000, units)} of bedding`
  }
  const parts = [
    waterLPerBag === undefined ? '' : `${printVolume(waterLPerBag, units)} of water`,
    oxygenLPerBag === undefined ? '' : `${printVolume(oxygenLPerBag, units)} of oxygen`,
  ].filter(Boolean)
  const each = animalsPerBag === undefined ? '' : `, up to ${printCount(animalsPerBag)} animals in each`
  return `${some(bagsPerBox, 'bag')}${each}${parts.length > 0 ? `, ${parts.join(' and ')} a bag` : ''}`
}

/** How each box is packed, as lines to read at the packing table. */
export function boxPackingLines(packing: BoxPacking, units: UnitSystem): PackingLine[] {
  const isBedding = packing.bagsPerBox === undefined
  const water = waterWords(packing, units)
  return [
    { label: 'Boxes', text: boxWords(packing) },
    { label: 'In each box', text: fillingWords(packing, units) },
    { label: 'Packs in each box', text: packWords(packing) },
    {
      label: isBedding ? 'Bedding at packing' : 'Water at packing',
      text: printBothTemperatures(packing.startC, units),
    },
    ...(water ? [{ label: 'On the way', text: `${water}, over ${roundTo(packing.hours, 1)} hours` }] : []),
  ]
}
