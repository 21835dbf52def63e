import { describe, expect, it } from 'vitest'

import { edges } from '@/shared/domain/orders/edges.facts'
import { nextClock, type ClockFacts } from '@/shared/domain/orders/next-clock'
import { finalStates, orderStates } from '@/shared/domain/orders/states.facts'

const HOUR_MS = 3_600_000
const facts: ClockFacts = {
  state: 'scheduled',
  sinceMs: 0,
  category: 'fish',
  readyMs: null,
  slotStartMs: 200 * HOUR_MS,
  slotEndMs: 201 * HOUR_MS,
  balanceDue: 'at-handover',
  isBalancePaid: false,
  claimWindowHours: 24,
  promisedDeliveryMs: null,
  handOver: 'pickup',
  silenceMoves: false,
  noShow: null,
}

describe('the clock of an order', () => {
  it.each(orderStates)('never lets %s rest without a timer, unless it is final', (state) => {
    const clock = nextClock({ ...facts, state })
    expect(clock === null).toBe(finalStates.includes(state))
    if (clock) expect(edges[clock.edge].from).toBe(state)
  })

  it('asks for a balance that is due before, 48 hours ahead with a day of grace', () => {
    expect(nextClock({ ...facts, balanceDue: 'before' })).toEqual({
      atMs: (200 - 48 + 24) * HOUR_MS,
      edge: 'E23',
    })
  })

  it('waits for the day itself once the balance is paid', () => {
    const paid = nextClock({ ...facts, balanceDue: 'before', isBalancePaid: true })
    expect(paid).toEqual({ atMs: (201 + 72) * HOUR_MS, edge: 'E26' })
  })

  it('leaves a day to object to a reported no-show', () => {
    const noShow = { by: 'seller', sinceMs: 5 } as const
    expect(nextClock({ ...facts, state: 'ready', noShow })).toEqual({ atMs: 5 + 24 * HOUR_MS, edge: 'E31' })
    expect(nextClock({ ...facts, state: 'ready', noShow: { ...noShow, by: 'buyer' } })?.edge).toBe('E32')
  })

  it('waits for a box by its promised delivery, and ends a ship order that nobody sent', () => {
    const ship = { ...facts, handOver: 'ship', promisedDeliveryMs: 300 * HOUR_MS } as const
    expect(nextClock({ ...ship, state: 'dispatched' })).toEqual({ atMs: 336 * HOUR_MS, edge: 'E36' })
    expect(nextClock({ ...ship, state: 'ready' })).toEqual({ atMs: (201 + 72) * HOUR_MS, edge: 'E34' })
  })

  it('lets silence move the day only where that was said', () => {
    expect(nextClock({ ...facts, state: 'weather_hold' })?.edge).toBe('E21')
    const silent = nextClock({ ...facts, state: 'weather_hold', silenceMoves: true })
    expect(silent).toEqual({ atMs: 72 * HOUR_MS, edge: 'E19' })
  })

  it('gives produce 12 hours for the answer and animals 48', () => {
    expect(nextClock({ ...facts, state: 'requested' })?.atMs).toBe(48 * HOUR_MS)
    expect(nextClock({ ...facts, state: 'requested', category: 'produce' })?.atMs).toBe(12 * HOUR_MS)
  })
})
