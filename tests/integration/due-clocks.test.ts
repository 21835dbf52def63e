import { randomBytes } from 'node:crypto'

import { eq, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { order } from '@/db/schema/orders'
import { now } from '@/server/clock'
import { ringClocks } from '@/server/jobs/ring-clocks'
import { listDueOrders } from '@/server/orders/order-store'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const MINUTE_MS = 60_000
/** More than one look at the clocks takes. */
const MANY = 120

let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('due_clocks')
  await desk.member('bea@example.org')
})
afterAll(() => desk.close())

/** An unpaid hold of Bea's. */
async function held(name: string): Promise<string> {
  const batch = await desk.batch(name)
  const bea = await desk.signedIn('bea@example.org')
  const reply = await bea
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch))
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  return (reply.body as ShownOrder).orderId
}

async function rowOf(publicId: string) {
  const [row] = await desk.db.select().from(order).where(eq(order.publicId, publicId))
  if (!row) throw new Error('no such order')
  return row
}

/** Older orders like that one whose clock rang an hour ago. */
async function rungBefore(publicId: string, change: Partial<typeof order.$inferInsert>): Promise<void> {
  const { id: _id, ...row } = await rowOf(publicId)
  const clockAt = new Date(now().getTime() - 60 * MINUTE_MS)
  await desk.db.insert(order).values(
    Array.from({ length: MANY }, () => ({
      ...row,
      ...{ clockAt, publicId: randomBytes(16).toString('base64url'), ...change },
    })),
  )
}

async function ringLater(): Promise<void> {
  await desk.travelToWithoutRest(new Date(now().getTime() + 16 * MINUTE_MS))
  await ringClocks()
}

const forget = (edge: string) =>
  desk.db.delete(order).where(sql`${order.clockEdge} = ${edge} and ${order.state} <> 'cancelled'`)

describe('a clock that rings', () => {
  it('is heard behind many whose edge nobody has wired', async () => {
    const orderId = await held('behind claims')
    await rungBefore(orderId, { state: 'claim_open', clockEdge: 'E42' })
    await ringLater()
    expect((await rowOf(orderId)).state).toBe('cancelled')
    await forget('E42')
  })

  it('is heard behind many that ring and may not act yet', async () => {
    const orderId = await held('behind the processor')
    // Accepted, but the processor has not confirmed: E09 waits.
    await rungBefore(orderId, { state: 'requested', clockEdge: 'E09', acceptedAt: now() })
    await ringLater()
    expect((await rowOf(orderId)).state).toBe('cancelled')
    await forget('E09')
  })

  it.each([
    ['rest', { state: 'settled', clockAt: null, clockEdge: null }],
    ['wait for an edge that nobody has wired', { state: 'claim_open', clockEdge: 'E42' }],
  ])('is looked for on the index of clocks, however many orders %s', async (name, change) => {
    const orderId = await held(name)
    for (let times = 0; times < 20; times++) await rungBefore(orderId, change)
    await desk.db.execute(sql`analyze table orders`)
    const before = { id: 1, clockAt: new Date(now().getTime() - 61 * MINUTE_MS) }
    for (const after of [undefined, before]) {
      const asked = listDueOrders({ at: now(), edges: ['E02', 'E40'], after, most: 100 }).getSQL()
      const [plan] = await desk.db.execute(sql`explain ${asked}`)
      expect(plan).toMatchObject([{ key: 'k_order_clock', type: 'range' }])
      expect(JSON.stringify(plan)).not.toContain('filesort')
    }
  })
})
