import type { SaleUnit } from '@/shared/domain/listings/sale-unit'
import { supplyPrice } from '@/shared/domain/pricing/supply-price'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { unitPrice } from '@/shared/domain/produce/unit-price'
import { printCents } from '@/shared/units/money'
import type { UnitSystem } from '@/shared/units/unit-system'

/** A listing as far as its price goes. */
export type PricedLot =
  | { category: 'fish' }
  | { category: 'worms' | 'media'; saleUnit: Extract<SaleUnit, { kind: 'pack' | 'weight' | 'volume' }> }
  | { category: 'produce'; cropId: string; saleUnit: SaleUnit }

/** What one unit costs, and what stands beside it so that offers can be compared: '$3.00 a head', '$9.33/lb'. */
export function printLotPrice(
  lot: PricedLot,
  unitCents: number,
  units: UnitSystem,
): { price: string; comparable: string | null } {
  if (lot.category === 'fish') return { price: `${printCents(unitCents)} each`, comparable: null }
  if (lot.category !== 'produce') return supplyPrice({ unit: lot.saleUnit, unitCents }, units)
  const crop = findCrop(lot.cropId)
  if (!crop) return { price: printCents(unitCents), comparable: null }
  const { price, comparable } = unitPrice({ crop, unit: lot.saleUnit, unitCents }, units)
  return { price, comparable }
}
