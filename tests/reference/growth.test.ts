import { describe, expect, it } from 'vitest'

import { errorOf } from './checks/check'
import { growthChecks } from './checks/growth-checks'

describe('growth figures against published ones', () => {
  it.each(growthChecks)('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 16 standard weights, 4 Piper, 10 catfish table, 4 samples, 6 TGC, 5 bass, 3 trout.
  it('drops none of them', () => expect(growthChecks).toHaveLength(48))
})
