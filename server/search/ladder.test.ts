import { describe, expect, it } from 'vitest'

import { Ladder } from '@/server/search/ladder'

describe('how many listings stand on which rung', () => {
  const ladder = new Ladder([
    { categoryCode: 1, rung: 12, count: 5 },
    { categoryCode: 1, rung: 10, count: 3 },
    { categoryCode: 2, rung: 11, count: 4 },
  ])

  it.each([
    [9, 0],
    [10, 3],
    [11, 7],
    [12, 12],
    [99, 12],
  ])('up to rung %i there are %i', (rung, count) => expect(ladder.upTo([1, 2], rung)).toBe(count))

  it.each([
    [1, 10],
    [3, 10],
    [4, 11],
    [8, 12],
    [12, 12],
    [13, null],
  ])('%i stand up to rung %s', (count, rung) => expect(ladder.reaching([1, 2], count)).toBe(rung))

  it('keeps the categories apart', () => {
    expect(ladder.upTo([2], 12)).toBe(4)
    expect(ladder.reaching([2], 5)).toBeNull()
    expect(ladder.upTo([3], 12)).toBe(0)
  })
})
