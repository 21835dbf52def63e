import { describe, expect, it } from 'vitest'

import { errorOf } from './checks/check'
import { distanceChecks } from './checks/distance-checks'

describe('distance figures against published ones', () => {
  it.each(distanceChecks)('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 8 named lines, 2 of the test set, 5 ZIP pairs twice.
  it('drops none of them', () => expect(distanceChecks).toHaveLength(20))
})
