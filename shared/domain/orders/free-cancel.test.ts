import { describe, expect, it } from 'vitest'
import { freeCancelUntilMs, isFreeCancel, type CancelFacts } from '@/shared/domain/orders/free-cancel'

const hours = (count: number) => count * 3_600_000
const slot = hours(1000)
const facts = (given: Partial<CancelFacts> = {}): CancelFacts => ({
  slotStartMs: slot,
  category: 'fish',
  freeCancelHours: null,
  quantityCutMs: null,
  isMovedBySeller: false,
  ...given,
})

describe('free cancelling', () => {
  it('is free until 72 hours before the slot, and not a moment later', () => {
    expect(isFreeCancel(facts(), slot - hours(72))).toBe(true)
    expect(isFreeCancel(facts(), slot - hours(72) + 1)).toBe(false)
  })

  it('is free until 12 hours before a produce slot', () => {
    expect(freeCancelUntilMs(facts({ category: 'produce' }))).toBe(slot - hours(12))
  })

  it('follows the listing where it says otherwise', () => {
    expect(freeCancelUntilMs(facts({ freeCancelHours: 24 }))).toBe(slot - hours(24))
  })

  it('is always free while no day is agreed', () => {
    expect(isFreeCancel(facts({ slotStartMs: null }), slot * 2)).toBe(true)
  })

  it('is free until the slot itself when the seller moved the day', () => {
    const moved = facts({ isMovedBySeller: true })
    expect(isFreeCancel(moved, slot)).toBe(true)
    expect(isFreeCancel(moved, slot + 1)).toBe(false)
  })

  it('is free for a day after the seller cut the quantity', () => {
    const cut = facts({ quantityCutMs: slot - hours(10) })
    expect(isFreeCancel(cut, slot)).toBe(true)
    expect(isFreeCancel(cut, slot + hours(14) + 1)).toBe(false)
  })
})
