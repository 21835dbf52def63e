import { describe, expect, it } from 'vitest'
import { parseCount, printCount } from '@/shared/units/count'

describe('counts', () => {
  it('prints thousands with commas', () => expect(printCount(1200)).toBe('1,200'))

  it.each([
    ['1,200', 1200],
    ['20 fish', 20],
    ['14 heads', 14],
    ['0', 0],
  ])('reads %s', (typed, count) => expect(parseCount(typed)).toBe(count))

  it.each(['', '2.5', '-3', '20 lb', '9999999999', 'twenty'])('does not read %j', (typed) =>
    expect(parseCount(typed)).toBeNull(),
  )
})
