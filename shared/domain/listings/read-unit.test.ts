import { expect, it } from 'vitest'

import { readUnit } from '@/shared/domain/listings/read-unit'

it.each([
  [{ kind: 'head' }, { kind: 'head' }],
  [{ kind: 'bunch' }, { kind: 'bunch' }],
  [
    { kind: 'bunch', netG: 170 },
    { kind: 'bunch', netG: 170 },
  ],
  [{ kind: 'weight', netG: '8' }, null],
  [
    { kind: 'weight', netG: 227 },
    { kind: 'weight', netG: 227 },
  ],
  [{ kind: 'pack' }, null],
  [{ kind: 'volume', litres: 50 }, null],
  [
    { kind: 'volume', litres: 50, weightKg: 14 },
    { kind: 'volume', litres: 50, weightKg: 14 },
  ],
  [{ kind: 'bag' }, null],
  ['a bag', null],
  [undefined, null],
])('reads the unit of a draft: %j', (saleUnit, unit) => expect(readUnit({ saleUnit })).toEqual(unit))
