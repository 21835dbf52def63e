import { describe, expect, it } from 'vitest'

import { ordersWords, peopleWords, takeDownChoices, takeDownReasonOf } from './report-words'

describe('the words about reported listings', () => {
  it('count people and orders, singular and plural', () => {
    expect(peopleWords(1)).toBe('1 member reports it')
    expect(peopleWords(12)).toBe('12 members report it')
    expect(ordersWords(0)).toBe('No order is open from it.')
    expect(ordersWords(1)).toContain('It is not touched')
    expect(ordersWords(3)).toMatch(/^3 orders .* not touched/)
  })

  it('let the key in front of a reason choose it, and no other key', () => {
    for (const { value, label } of takeDownChoices) expect(takeDownReasonOf(label.charAt(0))).toBe(value)
    for (const key of ['0', '8', '9', 'a', 'Enter', '']) expect(takeDownReasonOf(key)).toBeUndefined()
  })
})
