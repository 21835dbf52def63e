import type { SaleUnit } from '@/shared/domain/listings/sale-unit'

// Sizes of the bases in units so small that all of them are whole: nanograms, nanolitres, animals.
const bases = {
  lb: { size: 453_592_370_000n, measure: 'mass', mark: 'lb' },
  oz: { size: 28_349_523_125n, measure: 'mass', mark: 'oz' },
  kg: { size: 1_000_000_000_000n, measure: 'mass', mark: 'kg' },
  '100g': { size: 100_000_000_000n, measure: 'mass', mark: '100 g' },
  'cu-ft': { size: 28_316_846_592n, measure: 'volume', mark: 'cu ft' },
  '10L': { size: 10_000_000_000n, measure: 'volume', mark: '10 L' },
  '100': { size: 100n, measure: 'count', mark: '100' },
} as const

export type PriceBasis = keyof typeof bases

/** '$/lb' of a basis, as it stands behind a price: 'lb', '100 g', 'cu ft'. */
export const basisMark = (basis: PriceBasis): string => bases[basis].mark

/** How much one unit holds in the measure of a basis. null: the unit does not say. */
function contents(unit: SaleUnit, measure: 'mass' | 'volume' | 'count'): bigint | null {
  if (measure === 'count') return unit.kind === 'pack' ? BigInt(unit.count) : null
  if (measure === 'volume') return unit.kind === 'volume' ? BigInt(Math.round(unit.litres * 1e9)) : null
  if (unit.kind === 'volume') return BigInt(Math.round(unit.weightKg * 1e12))
  const netG = unit.kind === 'weight' || unit.kind === 'bunch' ? unit.netG : undefined
  return netG === undefined ? null : BigInt(Math.round(netG * 1e9))
}

/**
 * Cents for one pound, ounce, cubic foot …, half up, in whole numbers throughout: exact for every weight of whole
 * ounces or grams. null: the unit does not hold a measured amount of that kind.
 */
export function comparableCents(unitCents: number, unit: SaleUnit, basis: PriceBasis): number | null {
  const { size, measure } = bases[basis]
  const held = contents(unit, measure)
  if (held === null || held <= 0n) return null
  return Number((2n * BigInt(unitCents) * size + held) / (2n * held))
}
