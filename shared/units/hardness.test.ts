import { describe, expect, it } from 'vitest'

import { parseHardnessPpm } from '@/shared/units/hardness'

describe('hardness', () => {
  it.each([
    ['100', 100],
    [' 100 ppm', 100],
    ['1,000 mg/L', 1000],
    ['6 dKH', 107.09],
    ['6 kh', 107.09],
    ['5.6 °dH', 99.95],
    ['4 degrees', 71.39],
  ])('reads %s', (text, ppm) => {
    expect(parseHardnessPpm(text)).toBeCloseTo(ppm, 1)
  })

  it.each(['', 'soft', '-5', '100 grains', 'ppm', '1e3'])('does not read %s', (text) => {
    expect(parseHardnessPpm(text)).toBeNull()
  })
})
