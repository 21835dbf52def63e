import { numberOf, textOf } from './read-part'

import type { SaleUnit } from '@/shared/domain/listings/sale-unit'

/** What is sold as one, once enough of it is answered. null: not yet. */
export function unitOf(draft: unknown): SaleUnit | null {
  const netG = numberOf(draft, 'saleUnit.netG')
  switch (textOf(draft, 'saleUnit.kind')) {
    case 'each':
      return { kind: 'each' }
    case 'head':
      return { kind: 'head' }
    case 'dry-pint':
      return { kind: 'dry-pint' }
    case 'bunch':
      return netG === null ? { kind: 'bunch' } : { kind: 'bunch', netG }
    case 'weight':
      return netG === null || netG <= 0 ? null : { kind: 'weight', netG }
    case 'pack': {
      const count = numberOf(draft, 'saleUnit.count')
      return count === null || count < 1 ? null : { kind: 'pack', count }
    }
    case 'volume': {
      const [litres, weightKg] = [numberOf(draft, 'saleUnit.litres'), numberOf(draft, 'saleUnit.weightKg')]
      return litres === null || weightKg === null || litres <= 0 ? null : { kind: 'volume', litres, weightKg }
    }
    default:
      return null
  }
}
