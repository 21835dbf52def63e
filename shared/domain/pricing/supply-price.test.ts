import { expect, it } from 'vitest'

import { supplyPrice } from '@/shared/domain/pricing/supply-price'

it.each([
  [{ kind: 'pack', count: 500 }, 2400, 'us', '$24.00 for 500', '$4.80/100'],
  [{ kind: 'weight', netG: 453.59237 }, 3500, 'us', '$35.00 for 1 lb (454 g)', '$35.00/lb'],
  [{ kind: 'weight', netG: 500 }, 3500, 'metric', '$35.00 for 1.1 lb (500 g)', '$70.00/kg'],
  [{ kind: 'volume', litres: 50, weightKg: 14 }, 4000, 'us', '$40.00 for 1.8 cu ft', '$22.65/cu ft'],
  [{ kind: 'volume', litres: 50, weightKg: 14 }, 4000, 'metric', '$40.00 for 50 L', '$8.00/10 L'],
] as const)('prices %j at %i cents (%s)', (unit, unitCents, ...[units, price, comparable]) => {
  expect(supplyPrice({ unit, unitCents }, units)).toEqual({ price, comparable })
})
