import { describe, expect, it } from 'vitest'

import { readNetWeight } from '@/shared/domain/listings/read-net-weight'

describe('a net weight as typed', () => {
  it.each([
    ['8 oz', 226.796185],
    ['1/2 lb', 226.796185],
    ['250 g', 250],
    ['1.2 kg', 1200],
  ])('reads %s', (typed, netG) => {
    const read = readNetWeight(typed)
    expect('netG' in read ? read.netG : read.fault).toBeCloseTo(netG, 6)
  })

  it.each([
    ['8', '8 what? Write the unit too: 8 oz, 8 lb or 8 g.'],
    ['8 bags', '"bags" is not a weight. Use oz, lb, g or kg.'],
    ['a bag', 'Give a net weight with its unit, like 8 oz or 250 g.'],
    ['0 oz', 'Give a net weight with its unit, like 8 oz or 250 g.'],
    ['-3 oz', 'Give a net weight with its unit, like 8 oz or 250 g.'],
  ])('asks about %s', (typed, fault) => expect(readNetWeight(typed)).toEqual({ fault }))
})
