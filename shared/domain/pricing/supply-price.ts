import { printBothMasses, type SaleUnit } from '@/shared/domain/listings/sale-unit'
import { comparableCents, basisMark, type PriceBasis } from '@/shared/domain/pricing/comparable-price'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'
import type { UnitSystem } from '@/shared/units/unit-system'
import { printDryVolume } from '@/shared/units/volume'

/** What worms and media are sold by. */
export type SupplyUnit = Extract<SaleUnit, { kind: 'pack' | 'weight' | 'volume' }>

const measures: Record<SupplyUnit['kind'], Record<UnitSystem, PriceBasis>> = {
  pack: { us: '100', metric: '100' },
  weight: { us: 'lb', metric: 'kg' },
  volume: { us: 'cu-ft', metric: '10L' },
}

/** '$9.33/lb', '$4.80/100'. null: the unit holds no measured amount of that kind. */
export function printComparable(unitCents: number, unit: SaleUnit, basis: PriceBasis): string | null {
  const cents = comparableCents(unitCents, unit, basis)
  return cents === null ? null : `${printCents(cents)}/${basisMark(basis)}`
}

function printHeld(unit: SupplyUnit, units: UnitSystem): string {
  if (unit.kind === 'pack') return `for ${printCount(unit.count)}`
  if (unit.kind === 'volume') return `for ${printDryVolume(unit.litres, units)}`
  return `for ${printBothMasses(unit.netG)}`
}

/** The price of worms or media for what is sold, and the one that people can compare. */
export function supplyPrice(
  { unit, unitCents }: { unit: SupplyUnit; unitCents: number },
  units: UnitSystem,
): { price: string; comparable: string | null } {
  return {
    price: `${printCents(unitCents)} ${printHeld(unit, units)}`,
    comparable: printComparable(unitCents, unit, measures[unit.kind][units]),
  }
}
