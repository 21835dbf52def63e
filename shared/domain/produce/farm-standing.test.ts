import { describe, expect, it } from 'vitest'

import { farmStandings, isPastNotCovered, judgeStanding } from '@/shared/domain/produce/farm-standing'
import { farmThresholds, newestThreshold } from '@/shared/domain/produce/farm-thresholds.facts'
import { sources } from '@/shared/sources'

const farm = { name: 'Willow Run', street: '12 Mill Rd', city: 'Oxford', state: 'OH', zip: '45056' }

describe('the standing of a farm', () => {
  it('shows name and full address of a qualified exempt farm, and says so beforehand', () => {
    const judged = judgeStanding('qualified-exempt', farm)
    expect(judged.shows).toBe('Willow Run, 12 Mill Rd, Oxford, OH 45056')
    expect(judged.caution).toContain('become public')
  })

  it.each([
    null,
    { ...farm, street: ' ' },
    { ...farm, zip: '450' },
    { ...farm, name: '' },
    { ...farm, state: 'Ohio' },
  ])('cannot be claimed with %j', (given) => {
    const judged = judgeStanding('qualified-exempt', given)
    expect([judged.shows, judged.fault]).toEqual([null, expect.stringContaining('full business address')])
  })

  it('shows no address for any other answer and blocks none', () => {
    for (const standing of farmStandings.filter((one) => one !== 'qualified-exempt')) {
      expect(judgeStanding(standing, farm)).toMatchObject({ shows: null, fault: null })
    }
    expect(judgeStanding('unknown', null).caution).toContain('state department')
  })

  it('never says that a small farm has no duties', () => {
    for (const standing of farmStandings)
      expect(judgeStanding(standing, farm).caution ?? '').not.toMatch(/no dut|no rules|free of/i)
  })

  it('takes its sums from facts with years and sources, the newest one', () => {
    for (const row of farmThresholds) {
      expect(Object.keys(sources)).toContain(row.sourceKey)
      expect(row.years.length).toBeGreaterThan(5)
    }
    expect(newestThreshold('not-covered').years).toContain('2021 to 2023')
    expect(judgeStanding('not-covered', null).caution).toContain('$32,100 (2021 to 2023, our own sum)')
    expect([isPastNotCovered(32_100_00), isPastNotCovered(32_100_01)]).toEqual([false, true])
  })
})
