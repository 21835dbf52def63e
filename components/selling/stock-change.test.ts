import { describe, expect, it } from 'vitest'

import { stockChange } from './stock-change'

describe('correcting the free count', () => {
  it('takes deaths, regraded and kept fish away', () => {
    expect(stockChange('die-off', '120', 300)).toBe(-120)
    expect(stockChange('regraded', '1,000', 2000)).toBe(-1000)
    expect(stockChange('used-here', '4', 300)).toBe(-4)
  })

  it('adds fish that have become ready', () => {
    expect(stockChange('more-ready', '50', 300)).toBe(50)
  })

  it('turns a new count into a difference', () => {
    expect(stockChange('recount', '280', 300)).toBe(-20)
    expect(stockChange('recount', '310', 300)).toBe(10)
    expect(stockChange('recount', '0', 300)).toBe(-300)
  })

  it('knows no change and no number', () => {
    expect(stockChange('recount', '300', 300)).toBeNull()
    expect(stockChange('die-off', '0', 300)).toBeNull()
    expect(stockChange('die-off', 'a few', 300)).toBeNull()
    expect(stockChange('die-off', '2.5', 300)).toBeNull()
  })
})
