import { describe, expect, it } from 'vitest'

import { errorOf } from './checks/check'
import { waterChecks } from './checks/water-checks'

describe('water figures against published ones', () => {
  it.each(waterChecks)('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 7 pKa, 19 + 4 shares of two tables, 3 examples, 13 + 2 oxygen, 2 barometer, 21 + 2 criteria, 1 salt.
  it('drops none of them', () => expect(waterChecks).toHaveLength(74))
})
