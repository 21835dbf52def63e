import { expect, it } from 'vitest'

import { printSaleUnit } from '@/shared/domain/listings/sale-unit'
import { gramsPerOunce } from '@/shared/units/mass'

it.each([
  [{ kind: 'each' }, 'each'],
  [{ kind: 'head' }, 'head'],
  [{ kind: 'dry-pint' }, 'dry pint'],
  [{ kind: 'bunch' }, 'bunch'],
  [{ kind: 'bunch', netG: 6 * gramsPerOunce }, 'bunch, 6 oz (170 g) net'],
  [{ kind: 'weight', netG: 8 * gramsPerOunce }, '8 oz (227 g) net'],
  [{ kind: 'weight', netG: 13.5 * gramsPerOunce }, '13.5 oz (383 g) net'],
  [{ kind: 'weight', netG: 36 * gramsPerOunce }, '2.25 lb (1.02 kg) net'],
  [{ kind: 'pack', count: 1000 }, '1,000 worms'],
  [{ kind: 'volume', litres: 50, weightKg: 14 }, '50 L (1.8 cu ft), about 31 lb (14 kg)'],
] as const)('says what one unit is: %j', (unit, words) => expect(printSaleUnit(unit)).toBe(words))
