import { describe, expect, it } from 'vitest'

import { federalDays } from '@/server/shipping/federal-days'

const daysOf = (first: number, last = first) => federalDays(first, last).map(({ day }) => day)

describe('federal holidays', () => {
  // Written down by hand from 5 USC 6103 (from memory): fixed dates on a Saturday move to Friday, on a Sunday to Monday.
  it('are those of 2027 and the New Year after it, on the days they are observed', () => {
    expect(daysOf(2027)).toEqual([
      '2027-01-01',
      '2027-01-18',
      '2027-02-15',
      '2027-05-31',
      '2027-06-18',
      '2027-07-05',
      '2027-09-06',
      '2027-10-11',
      '2027-11-11',
      '2027-11-25',
      '2027-12-24',
      '2027-12-31',
    ])
  })

  it('put a New Year on a Saturday into the year before', () => {
    expect(daysOf(2028)).not.toContain('2027-12-31')
    expect(daysOf(2027, 2028).filter((day) => day === '2027-12-31')).toHaveLength(1)
  })
})
