import { describe, expect, it } from 'vitest'

import { informWords, monthName, shortMonth } from './record-words'

describe('words of a seller’s record', () => {
  it('names months, and the year where it turns', () => {
    expect(monthName('2027-05')).toBe('May 2027')
    expect(shortMonth('2027-05')).toBe('May')
    expect(shortMonth('2027-01')).toBe('Jan 27')
  })

  it('says how far the federal line is, and what follows once it is passed', () => {
    const below = informWords({ sales: 1, grossCents: 5340, isOver: false })
    expect(below).toMatch(/^1 sale and \$53\.40 in your fullest twelve months/)
    expect(below).toContain('From 200 sales and $5,000.00 on')
    const over = informWords({ sales: 240, grossCents: 620_000, isOver: true, dueOn: '2027-06-11' })
    expect(over).toContain('by June 11, 2027')
  })
})
