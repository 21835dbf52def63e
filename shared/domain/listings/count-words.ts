import { printSaleUnit, type SaleUnit } from '@/shared/domain/listings/sale-unit'
import { wormKinds } from '@/shared/domain/worms/worms.facts'
import { printCount } from '@/shared/units/count'

/** A listing as far as its count goes. */
export type CountedLot =
  | { category: 'fish' }
  | { category: 'worms'; taxonId: string; saleUnit: SaleUnit }
  | { category: 'media' | 'produce'; saleUnit: SaleUnit }

const manyOf = (taxonId: string) => wormKinds.find((kind) => kind.taxonId === taxonId)?.many ?? 'worms'

/** What is talked of, always as more than one: 'The animals are free again.' */
export function thingsOf(lot: CountedLot): 'animals' | 'worms' | 'larvae' | 'goods' {
  if (lot.category === 'fish') return 'animals'
  return lot.category === 'worms' ? manyOf(lot.taxonId) : 'goods'
}

const plural: Partial<Record<SaleUnit['kind'], [one: string, many: string]>> = {
  each: ['piece', 'pieces'],
  head: ['head', 'heads'],
  bunch: ['bunch', 'bunches'],
  'dry-pint': ['dry pint', 'dry pints'],
}

/** One unit without its measure, as it stands behind a price or a count: 'head', 'pack', 'unit'. */
export function unitWordOf(lot: CountedLot): string {
  if (lot.category === 'fish') return 'animal'
  const { kind } = lot.saleUnit
  return plural[kind]?.[0] ?? (kind === 'pack' ? 'pack' : 'unit')
}

/** How many of a listing, in words: '60 animals', '3 heads', '2 × 250 worms', '4 × 8 oz (227 g) net'. */
export function countWords(lot: CountedLot, count: number): string {
  if (lot.category === 'fish') return `${printCount(count)} ${count === 1 ? 'animal' : 'animals'}`
  const words = plural[lot.saleUnit.kind]
  if (words) return `${printCount(count)} ${words[count === 1 ? 0 : 1]}`
  return `${printCount(count)} × ${printSaleUnit(lot.saleUnit, thingsOf(lot))}`
}
