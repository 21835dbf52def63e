import { printBothMasses, type SaleUnit } from '@/shared/domain/listings/sale-unit'
import { comparableCents, type PriceBasis } from '@/shared/domain/pricing/comparable-price'
import { printComparable } from '@/shared/domain/pricing/supply-price'
import type { Crop } from '@/shared/domain/produce/crop'
import { printCents } from '@/shared/units/money'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface UnitPrice {
  /** The price for what is sold: '$3.00 a head', '$4.50 for 8 oz (227 g)'. */
  price: string
  /** The price people can compare: '$9.00/lb'. null: a head or a bunch that gives no weight compares with its like only. */
  comparable: string | null
  comparableCents: number | null
  basis: PriceBasis | null
  /** What a label by weight says. null: not sold by weight. */
  netWeight: string | null
}

/** Small, light crops are compared by the ounce, everything else by the pound. */
function basisOf(crop: Crop, units: UnitSystem): PriceBasis {
  const isLight = crop.group === 'microgreen' || crop.group === 'herb'
  if (units === 'metric') return isLight ? '100g' : 'kg'
  return isLight ? 'oz' : 'lb'
}

function printPrice(unitCents: number, unit: SaleUnit): string {
  const price = printCents(unitCents)
  if (unit.kind === 'each') return `${price} each`
  if (unit.kind === 'dry-pint') return `${price} a dry pint`
  return unit.kind === 'weight' ? `${price} for ${printBothMasses(unit.netG)}` : `${price} a ${unit.kind}`
}

/** What a card of produce shows beside each other: the price, what it comes to by weight, and the words of the label. */
export function unitPrice(
  asked: { crop: Crop; unit: SaleUnit; unitCents: number },
  units: UnitSystem,
): UnitPrice {
  const { crop, unit, unitCents } = asked
  const basis = basisOf(crop, units)
  const cents = comparableCents(unitCents, unit, basis)
  const netG = unit.kind === 'weight' || unit.kind === 'bunch' ? unit.netG : undefined
  return {
    price: printPrice(unitCents, unit),
    comparable: printComparable(unitCents, unit, basis),
    comparableCents: cents,
    basis: cents === null ? null : basis,
    netWeight: netG === undefined ? null : `Net weight ${printBothMasses(netG)}, without box or root ball.`,
  }
}
