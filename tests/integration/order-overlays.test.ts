import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'

import { order as orders } from '@/db/schema/orders'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const HOUR = 3600_000
let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('order_overlays')
  await desk.member('bea@example.org')
})
afterEach(async () => {
  await desk.travelTo(new Date())
  expect(await brokenInvariants(desk.db)).toEqual([])
})
afterAll(() => desk.close())

const dayAhead = (days: number) => new Date(Date.now() + days * 24 * HOUR).toISOString().slice(0, 10)

async function scheduled(name: string) {
  const windows = [{ day: dayAhead(10), from: '09:00', until: '10:00', capacity: 4 }]
  const batch = await desk.batch(name, { body: { windows, balanceDue: 'at-handover' } })
  const bea = await desk.signedIn('bea@example.org')
  const hatchery = await desk.signedIn(desk.hatcheryEmail)
  const made = await bea
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch))
    .expect(201)
  const { orderId } = made.body as ShownOrder
  await desk.pay(made.body as ShownOrder)
  const path = `/api/v1/orders/${orderId}`
  const act = async (by: typeof bea, what: string) => {
    const answer = await by.post(`${path}/${what}`).set(keyed()).send({})
    await desk.quiet()
    return answer
  }
  const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
  const lay = (change: Partial<typeof orders.$inferInsert>) =>
    desk.db.update(orders).set(change).where(eq(orders.publicId, orderId))
  return { bea, hatchery, act, seen, lay }
}

describe('a frozen order', () => {
  it('lets nobody act and no timer ring, and goes on when it thaws', async () => {
    const { bea, hatchery, act, seen, lay } = await scheduled('frozen')
    await lay({ freeze: 'legal' })
    expect((await seen(bea)).may).toEqual([])
    expect((await seen(hatchery)).may).toEqual([])
    for (const what of ['cancellation', 'balance-payment'])
      expect((await act(bea, what)).status, what).toBe(409)
    expect((await act(hatchery, 'readiness')).status).toBe(409)
    // Days past the window, when an unfrozen order would long have ended by itself.
    await desk.travelTo(new Date(Date.now() + 20 * 24 * HOUR))
    expect((await seen()).state).toBe('scheduled')
    await lay({ freeze: 'none' })
    await desk.travelTo(new Date(Date.now() + 20 * 24 * HOUR))
    expect((await seen()).state).toBe('cancelled')
  })
})

describe('a recalled order', () => {
  it('gives nothing out, and may still be cancelled with everything back', async () => {
    const { bea, hatchery, act, seen, lay } = await scheduled('recalled')
    await lay({ recall: 'open' })
    expect((await seen(hatchery)).may).not.toContain('mark-ready')
    expect((await act(hatchery, 'readiness')).status).toBe(409)
    expect((await seen()).state).toBe('scheduled')
    expect((await act(bea, 'cancellation')).status).toBe(200)
    expect((await seen()).money.strip.heldCents).toBe(0)
  })

  it('stays where it is at the gate, and goes on when the recall is closed', async () => {
    const { bea, hatchery, act, seen, lay } = await scheduled('recalled-late')
    await act(hatchery, 'readiness')
    await lay({ recall: 'open' })
    expect((await seen(hatchery)).may).not.toContain('hand-over')
    await lay({ recall: 'closed' })
    await desk.pay((await act(bea, 'balance-payment')).body as ShownOrder)
    expect((await seen(hatchery)).may).toContain('hand-over')
  })
})

describe('an order with an open payment dispute', () => {
  it('moves no money, whoever presses and whatever rings', async () => {
    const { bea, act, seen, lay } = await scheduled('disputed')
    await lay({ paymentDispute: 'open' })
    const refused = await act(bea, 'cancellation')
    expect([refused.status, refused.body.type]).toEqual([409, '/problems/dispute-open'])
    await desk.travelTo(new Date(Date.now() + 20 * 24 * HOUR))
    expect((await seen()).state).toBe('scheduled')
  })
})
