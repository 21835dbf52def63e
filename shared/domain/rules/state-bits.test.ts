import { describe, expect, it } from 'vitest'

import { stateBit, usStates } from '@/shared/domain/rules/state-bits'

describe('bits of the states', () => {
  it('gives the fifty states and DC one bit each, inside 64', () => {
    const bits = usStates.map((state) => stateBit(state) ?? 0n)
    expect(new Set(bits).size).toBe(51)
    expect(bits.reduce((all, bit) => all | bit, 0n)).toBe((1n << 51n) - 1n)
  })

  it('keeps the bits that stored rows use', () => {
    expect([stateBit('AL'), stateBit('OH'), stateBit('WY')]).toEqual([1n, 1n << 35n, 1n << 50n])
  })

  it.each(['PR', 'oh', '', 'Ohio'])('knows no bit for %j', (state) => expect(stateBit(state)).toBeNull())
})
