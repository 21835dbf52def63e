import { expect, it } from 'vitest'

import { supplyPrice, type SupplyUnit } from '@/shared/domain/pricing/supply-price'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Priced {
  unit: SupplyUnit
  unitCents: number
  units: UnitSystem
  price: string
  comparable: string
}
const clay = { kind: 'volume', litres: 50, weightKg: 14 } as const
// prettier-ignore
const priced: Priced[] = [
  { unit: { kind: 'pack', count: 500 }, unitCents: 2400, units: 'us', price: '$24.00 for 500', comparable: '$4.80/100' },
  { unit: { kind: 'weight', netG: 453.59237 }, unitCents: 3500, units: 'us', price: '$35.00 for 1 lb (454 g)', comparable: '$35.00/lb' },
  { unit: { kind: 'weight', netG: 500 }, unitCents: 3500, units: 'metric', price: '$35.00 for 1.1 lb (500 g)', comparable: '$70.00/kg' },
  { unit: clay, unitCents: 4000, units: 'us', price: '$40.00 for 1.8 cu ft', comparable: '$22.65/cu ft' },
  { unit: clay, unitCents: 4000, units: 'metric', price: '$40.00 for 50 L', comparable: '$8.00/10 L' },
]

it.each(priced)('shows $comparable beside $price', ({ unit, unitCents, units, price, comparable }) => {
  expect(supplyPrice({ unit, unitCents }, units)).toEqual({ price, comparable })
})
