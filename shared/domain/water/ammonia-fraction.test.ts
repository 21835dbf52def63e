import { describe, expect, it } from 'vitest'

import { ammoniaFraction, ammoniaPKa } from '@/shared/domain/water/ammonia-fraction'

describe('ammonia', () => {
  it('gets more poisonous with pH and warmth', () => {
    const cool = ammoniaFraction({ waterC: 15, pH: 7.5 }) ?? NaN
    expect(ammoniaFraction({ waterC: 25, pH: 7.5 })).toBeGreaterThan(cool)
    expect(ammoniaFraction({ waterC: 15, pH: 8.5 })).toBeGreaterThan(cool)
  })

  it('says nothing outside the range of its source', () => {
    expect(ammoniaPKa(-0.1)).toBeNull()
    expect(ammoniaFraction({ waterC: 51, pH: 7 })).toBeNull()
    expect(ammoniaFraction({ waterC: 20, pH: 12.5 })).toBeNull()
    expect(ammoniaFraction({ waterC: NaN, pH: 7 })).toBeNull()
    expect(ammoniaFraction({ waterC: 20, pH: NaN })).toBeNull()
  })
})
