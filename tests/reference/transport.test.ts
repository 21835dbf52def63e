import { describe, expect, it } from 'vitest'

import { boxChecks } from './checks/box-checks'
import { errorOf } from './checks/check'
import { transportChecks } from './checks/transport-checks'

describe('bags, tanks and boxes against published figures', () => {
  it.each([...transportChecks, ...boxChecks])('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  it('drops none of them', () => {
    // 36 + 6 oxygen use, 17 gas and CO2, 24 worked bags, 1 table, 19 warmth, 6 hauling, 5 end to end.
    expect(transportChecks).toHaveLength(114)
    // 7 measured box, 7 + 6 + 3 lumped box, 3 ice.
    expect(boxChecks).toHaveLength(26)
  })
})
