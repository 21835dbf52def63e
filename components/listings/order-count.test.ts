import { describe, expect, it } from 'vitest'

import { fitCount } from './order-count'

const limits = { least: 25, step: 10, most: 62 }

describe('a count that may be ordered', () => {
  it('keeps to the steps above the smallest order', () => {
    expect(fitCount(25, limits)).toBe(25)
    expect(fitCount(33, limits)).toBe(35)
    expect(fitCount(20, limits)).toBe(25)
  })

  it('never asks for more than is left', () => {
    expect(fitCount(1000, limits)).toBe(55)
  })

  it('is none when the smallest order is not left', () => {
    expect(fitCount(25, { ...limits, most: 24 })).toBeNull()
  })
})
