import type { SaleUnit } from '@/shared/domain/listings/sale-unit'

type Parts = Record<string, unknown>

const above = (least: number, value: unknown) => (typeof value === 'number' && value >= least ? value : null)

/** What is sold as one, from a draft that may lack any part of it. null: not enough is answered. */
export function readUnit(draft: Parts): SaleUnit | null {
  const { saleUnit } = draft
  if (typeof saleUnit !== 'object' || saleUnit === null) return null
  const { kind, netG, count, litres, weightKg } = saleUnit as Parts
  const grams = above(1, netG)
  switch (kind) {
    case 'each':
    case 'head':
    case 'dry-pint':
      return { kind }
    case 'bunch':
      return grams === null ? { kind } : { kind, netG: grams }
    case 'weight':
      return grams === null ? null : { kind, netG: grams }
    case 'pack': {
      const animals = above(1, count)
      return animals === null ? null : { kind, count: animals }
    }
    case 'volume': {
      const [volume, weight] = [above(0.5, litres), above(0.05, weightKg)]
      return volume === null || weight === null ? null : { kind, litres: volume, weightKg: weight }
    }
    default:
      return null
  }
}
