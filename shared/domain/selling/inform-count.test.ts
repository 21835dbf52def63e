import { describe, expect, it } from 'vitest'

import { dateAfter } from '@/shared/domain/calendar/day-number'
import { informCount, informLine, type Sale } from '@/shared/domain/selling/inform-count'

const TODAY = '2027-06-01'
/** So many sales, one a day, the last so many days ago. */
const run = (count: number, lastDaysAgo: number, grossCents = 2_600): Sale[] =>
  Array.from({ length: count }, (_, at) => ({ day: dateAfter(TODAY, -lastDaysAgo - at), grossCents }))

describe('the count of the INFORM Consumers Act', () => {
  it('is reached by the 200th sale when the gross is over the line too', () => {
    const count = informCount(run(200, 0), TODAY)
    expect(count).toEqual({ sales: 200, grossCents: 520_000, reachedOn: TODAY })
  })

  it('is not reached by 199 sales, nor by 200 cheap ones', () => {
    expect(informCount(run(199, 0), TODAY).reachedOn).toBeNull()
    expect(informCount(run(200, 0, 2_499), TODAY).reachedOn).toBeNull()
    expect(informCount(run(200, 0, 2_500), TODAY).reachedOn).toBe(TODAY)
  })

  it('counts within twelve months: the same sales over two years do not add up', () => {
    const [old, young] = [run(120, 400), run(120, 0)]
    expect(informCount([...old, ...young], TODAY)).toMatchObject({ sales: 120, reachedOn: null })
  })

  it('looks back twenty-four months, so an old full year still counts and an older one does not', () => {
    expect(informCount(run(200, 500), TODAY).reachedOn).toBe(dateAfter(TODAY, -500))
    expect(informCount(run(200, 731), TODAY)).toEqual({ sales: 0, grossCents: 0, reachedOn: null })
  })

  it('takes sales in any order, none, and refuses what is no day', () => {
    expect(informCount(run(200, 0).reverse(), TODAY).sales).toBe(informLine.sales)
    expect(informCount([], TODAY)).toEqual({ sales: 0, grossCents: 0, reachedOn: null })
    expect(() => informCount([{ day: 'soon', grossCents: 1 }], TODAY)).toThrow(RangeError)
  })
})
