import { describe, expect, it } from 'vitest'

import { holdLeftS } from './hold-left'

const MINUTE_MS = 60_000
const endsAtMs = 15 * MINUTE_MS

describe('what is left of a hold', () => {
  it('loses a second a second, however often the server is asked again', () => {
    const atOpening = { endsAtMs, asOfMs: 0, receivedAtMs: 0 }
    const askedAgain = { endsAtMs, asOfMs: 5 * MINUTE_MS, receivedAtMs: 5 * MINUTE_MS }
    expect(holdLeftS(atOpening, 6 * MINUTE_MS)).toBe(9 * 60)
    expect(holdLeftS(askedAgain, 6 * MINUTE_MS)).toBe(9 * 60)
  })

  it('goes by the server’s clock when the device’s is an hour fast', () => {
    const anHourMs = 60 * MINUTE_MS
    expect(holdLeftS({ endsAtMs, asOfMs: 0, receivedAtMs: anHourMs }, anHourMs + MINUTE_MS)).toBe(14 * 60)
  })

  it('never says less than nothing', () => {
    expect(holdLeftS({ endsAtMs, asOfMs: 0, receivedAtMs: 0 }, 20 * MINUTE_MS)).toBe(0)
  })
})
