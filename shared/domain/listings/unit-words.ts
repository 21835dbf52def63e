import { printBothMasses, type SaleUnit } from '@/shared/domain/listings/sale-unit'
import { printCount } from '@/shared/units/count'
import { printDryVolume } from '@/shared/units/volume'

const nouns: Record<SaleUnit['kind'], readonly [one: string, many: string]> = {
  each: ['piece', 'pieces'],
  head: ['head', 'heads'],
  bunch: ['bunch', 'bunches'],
  'dry-pint': ['dry pint', 'dry pints'],
  // What is weighed or counted comes in a pack; what is poured, in a bag. Neither says how much without its content.
  weight: ['pack', 'packs'],
  pack: ['pack', 'packs'],
  volume: ['bag', 'bags'],
}

/** What one counts: 'head', 'bunches', 'bags'. */
export function unitNoun({ kind }: Pick<SaleUnit, 'kind'>, count: number): string {
  return nouns[kind][count === 1 ? 0 : 1]
}

/** How much is in one: '8 oz (227 g)', '250 worms', '50 L (1.8 cu ft)'. '': a head is a head. */
export function unitContent(unit: SaleUnit, animals = 'worms'): string {
  switch (unit.kind) {
    case 'weight':
      return printBothMasses(unit.netG)
    case 'bunch':
      return unit.netG === undefined ? '' : printBothMasses(unit.netG)
    case 'pack':
      return `${printCount(unit.count)} ${animals}`
    case 'volume':
      return `${printDryVolume(unit.litres, 'metric')} (${printDryVolume(unit.litres, 'us')})`
    default:
      return ''
  }
}

/** '3 heads', '2 bags of 50 L (1.8 cu ft)', '1 pack of 250 worms'. */
export function unitCount(unit: SaleUnit, count: number, animals = 'worms'): string {
  const content = unitContent(unit, animals)
  const counted = `${printCount(count)} ${unitNoun(unit, count)}`
  return content ? `${counted} of ${content}` : counted
}

/** How it is sold, as a tag says it big: 'By the head', 'Packs of 8 oz (227 g)', 'Bags of 50 L (1.8 cu ft)'. */
export function soldAs(unit: SaleUnit, animals = 'worms'): string {
  const content = unitContent(unit, animals)
  if (!content) return unit.kind === 'each' ? 'By the piece' : `By the ${unitNoun(unit, 1)}`
  const many = unitNoun(unit, 2)
  return `${many.charAt(0).toUpperCase()}${many.slice(1)} of ${content}`
}
