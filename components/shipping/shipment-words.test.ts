import { describe, expect, it } from 'vitest'

import { hoursInBag, LONG_BAG_HOURS, openingSteps } from './shipment-words'

import type { BoxPacking, ShownRouteCheck } from '@/shared/contracts/shipments'

const packing: BoxPacking = {
  ...{ boxes: 1, animalsPerBox: 30, packs: 'none', packCount: 0, startC: 17, hours: 18.2 },
}
const check: ShownRouteCheck = {
  ...{ kind: 'morning', at: '2027-05-10T10:00:00Z', shipDay: '2027-05-10', verdict: 'safe' },
  ...{ basis: 'forecast', reasons: [], packing },
}

describe('the bag that is opened', () => {
  it('has been shut from the counter to the arrival, and before that as planned', () => {
    const sent = { dispatchedAt: '2027-05-10T20:00:00Z', check }
    expect(hoursInBag({ ...sent, arrivedAt: '2027-05-11T15:30:00Z' })).toBe(20)
    expect(hoursInBag(sent)).toBe(18)
    expect(hoursInBag({})).toBeNull()
  })

  it('is emptied at once when it was shut for more than six hours, and mixed slowly before', () => {
    expect(openingSteps(LONG_BAG_HOURS + 1).join(' ')).toMatch(/at once.*Do not mix slowly/)
    expect(openingSteps(LONG_BAG_HOURS).join(' ')).toMatch(/little by little/)
    expect(openingSteps(LONG_BAG_HOURS).join(' ')).not.toMatch(/at once/)
    expect(openingSteps(null)).toEqual([])
  })
})
