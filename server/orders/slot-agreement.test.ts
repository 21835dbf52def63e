import { describe, expect, it } from 'vitest'

import { agreementOf } from '@/server/orders/slot-agreement'

const event = (fromState: string, toState: string, minute: number) => ({
  fromState,
  toState,
  at: new Date(minute * 60_000),
})

describe('what an order’s events say of its pickup time', () => {
  const first = event('deposit_paid', 'scheduled', 1)
  const ready = event('scheduled', 'ready', 2)
  const moved = event('ready', 'scheduled', 3)
  const off = event('scheduled', 'cancelled', 4)

  it('is nothing before a time was agreed, even when the order ended', () => {
    expect(agreementOf([event('reserved', 'cancelled', 1)])).toBeNull()
  })

  it('counts moves and the end, and nothing else', () => {
    const marked = event('ready', 'ready', 2)
    expect(agreementOf([first])).toEqual({ sequence: 0, agreedAt: first.at })
    expect(agreementOf([first, ready, marked])).toEqual({ sequence: 0, agreedAt: first.at })
    expect(agreementOf([first, ready, moved])).toEqual({ sequence: 1, agreedAt: moved.at })
    const held = event('scheduled', 'weather_hold', 3)
    const again = event('weather_hold', 'scheduled', 5)
    expect(agreementOf([first, held])).toEqual({ sequence: 1, agreedAt: first.at })
    expect(agreementOf([first, held, again])).toEqual({ sequence: 2, agreedAt: again.at })
    expect(agreementOf([first, ready, moved, off])).toEqual({ sequence: 2, agreedAt: moved.at })
  })
})
