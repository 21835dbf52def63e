import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'

import { listing, pickupWindow } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import { buildMember } from '@/seed/build-member'
import { now } from '@/server/clock'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const HOUR = 3600_000
let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('order_endings')
  await desk.member('bea@example.org')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
afterEach(async () => {
  await desk.travelTo(new Date())
  expect(await brokenInvariants(desk.db)).toEqual([])
})
afterAll(() => desk.close())

const dayAhead = (days: number) => new Date(Date.now() + days * 24 * HOUR).toISOString().slice(0, 10)

/** A paid order whose slot is `days` ahead, with the means to act on it. */
async function paid(name: string, more: { days?: number; full?: boolean; before?: boolean } = {}) {
  const days = more.days ?? 10
  const windows = [days, days + 2].map((ahead) => ({
    day: dayAhead(ahead),
    from: '09:00',
    until: '10:00',
    capacity: 4,
  }))
  const batch = await desk.batch(name, {
    body: { windows, balanceDue: more.before ? 'before' : 'at-handover' },
  })
  const bea = await desk.signedIn('bea@example.org')
  const hatchery = await desk.signedIn(desk.hatcheryEmail)
  const body = reserveBody(batch, { payMode: more.full ? 'full' : 'deposit' })
  const reply = await bea.post(`/api/v1/listings/${batch.publicId}/orders`).set(keyed()).send(body)
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  const order = reply.body as ShownOrder
  await desk.pay(order)
  const path = `/api/v1/orders/${order.orderId}`
  const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
  const act = async (by: typeof bea, what: string, send: object = {}) => {
    const answer = await by.post(`${path}/${what}`).set(keyed()).send(send)
    await desk.quiet()
    return answer
  }
  const stock = async () => {
    const [row] = await desk.db.select().from(listing).where(eq(listing.id, batch.id))
    return row && { free: row.free, held: row.held, sold: row.sold, delivered: row.delivered }
  }
  const payBalance = async () => desk.pay((await act(bea, 'balance-payment')).body as ShownOrder)
  const slot = batch.windows[0]
  if (!slot) throw new Error('the batch has no window')
  return { batch, bea, hatchery, order, path, seen, act, stock, payBalance, slot }
}

const taken = async (id: number) =>
  (await desk.db.select().from(pickupWindow).where(eq(pickupWindow.id, id)))[0]?.taken

describe('a buyer who cancels', () => {
  it('gets everything back inside the free time, and the place in the window is free again', async () => {
    const { bea, act, seen, stock, slot } = await paid('free-time')
    expect(await taken(slot.id)).toBe(1)
    expect((await act(bea, 'cancellation')).status).toBe(200)
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'buyer_cancelled',
      money: { refundedCents: 625, strip: { heldCents: 0, releasedCents: 0, refundedCents: 625 } },
    })
    expect(await stock()).toMatchObject({ free: 500, sold: 0 })
    expect(await taken(slot.id)).toBe(0)
  })

  it('leaves the deposit, and no cent more, after the free time', async () => {
    const { bea, act, seen } = await paid('late', { days: 2, full: true })
    expect((await act(bea, 'cancellation')).status).toBe(200)
    const done = await seen()
    expect(done.money).toMatchObject({
      refundedCents: 1875,
      feeCents: 38,
      strip: { heldCents: 0, releasedCents: 587 },
    })
  })

  it('keeps the free time when the seller has the animals ready long before the window', async () => {
    const { bea, hatchery, act, seen, payBalance, stock } = await paid('ready-early')
    await act(hatchery, 'readiness')
    await payBalance()
    expect((await act(bea, 'cancellation')).status).toBe(200)
    expect((await seen()).money).toMatchObject({
      refundedCents: 2500,
      strip: { heldCents: 0, releasedCents: 0 },
    })
    expect(await stock()).toMatchObject({ free: 500, sold: 0 })
  })

  it('may still cancel when the animals are ready and the free time is over, and leaves the deposit', async () => {
    const { bea, hatchery, act, seen, payBalance, stock } = await paid('ready-cancel', { days: 2 })
    await act(hatchery, 'readiness')
    await payBalance()
    expect((await act(bea, 'cancellation')).status).toBe(200)
    expect((await seen()).money).toMatchObject({
      refundedCents: 1875,
      strip: { heldCents: 0, releasedCents: 587 },
    })
    expect(await stock()).toMatchObject({ free: 500, sold: 0 })
  })

  it('ends the order once, however often the same press is sent', async () => {
    const { bea, path, seen, stock } = await paid('twice')
    const key = keyed()
    await bea.post(`${path}/cancellation`).set(key).send({}).expect(200)
    await bea.post(`${path}/cancellation`).set(key).send({}).expect(200)
    const other = await bea.post(`${path}/cancellation`).set(keyed()).send({})
    expect([other.status, other.body.type]).toEqual([409, '/problems/order-moved'])
    await desk.quiet()
    expect((await seen()).money.refundedCents).toBe(625)
    expect(await stock()).toMatchObject({ free: 500 })
  })
})

describe('a seller who cancels', () => {
  it('must say why', async () => {
    const { hatchery, act } = await paid('no-reason')
    const reply = await act(hatchery, 'cancellation')
    expect([reply.status, reply.body.errors[0].pointer]).toEqual([422, '#/reason'])
    expect((await act(hatchery, 'cancellation', { reason: 'other' })).status).toBe(200)
  })

  it('costs the buyer nothing, and the animals do not come back by themselves', async () => {
    const { hatchery, act, seen, stock } = await paid('die-off')
    await act(hatchery, 'cancellation', { reason: 'die-off', note: 'The pump failed overnight' })
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'seller_cancelled',
      money: { refundedCents: 625, strip: { heldCents: 0 } },
    })
    expect(await stock()).toMatchObject({ free: 475, sold: 0 })
  })
})

describe('clocks that nobody beats', () => {
  it('ends an order whose balance is not paid, and keeps the deposit', async () => {
    const { seen, slot } = await paid('unpaid', { before: true })
    await desk.travelTo(new Date(slot.startsAt.getTime() - 23 * HOUR))
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'balance_unpaid',
      money: { refundedCents: 0, strip: { releasedCents: 587 } },
    })
  })

  it('lets an order run whose balance came in time, however late the seller marks it ready', async () => {
    const { seen, slot, payBalance, act, hatchery } = await paid('paid-in-time', { before: true })
    await payBalance()
    await desk.travelTo(new Date(slot.startsAt.getTime() - 23 * HOUR))
    expect(await seen()).toMatchObject({ state: 'scheduled', balancePaid: true, clock: { edge: 'E26' } })
    await act(hatchery, 'cancellation', { reason: 'other' })
  })

  it('refunds everything when the seller lets the day pass', async () => {
    const before = (await desk.db.select().from(seller))[0]?.daysMissed ?? 0
    const { seen, slot, stock } = await paid('missed-day')
    await desk.travelTo(new Date(slot.endsAt.getTime() + 73 * HOUR))
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'seller_missed_day',
      money: { refundedCents: 625 },
    })
    expect(await stock()).toMatchObject({ free: 475, sold: 0 })
    expect((await desk.db.select().from(seller))[0]?.daysMissed).toBe(before + 1)
  })

  it('opens an unclear hand-over when nobody marks anything, and a moderator decides', async () => {
    const { hatchery, act, seen, slot, path, stock, payBalance } = await paid('nobody')
    await act(hatchery, 'readiness')
    await payBalance()
    await desk.travelTo(new Date(slot.endsAt.getTime() + 73 * HOUR))
    expect(await seen()).toMatchObject({ state: 'claim_open' })
    const staff = await desk.staff('staff@example.org')
    const empty = await staff
      .post(`/api/v1/moderation${path.slice(7)}/decision`)
      .set(keyed())
      .send({ outcome: 'handed-over' })
    expect(empty.status).toBe(422)
    const decided = await staff
      .post(`/api/v1/moderation${path.slice(7)}/decision`)
      .set(keyed())
      .send({ outcome: 'handed-over', note: 'Photos of the bucket show the count.' })
    expect(decided.status, JSON.stringify(decided.body)).toBe(200)
    await desk.quiet()
    expect(await seen()).toMatchObject({ state: 'settled', money: { strip: { releasedCents: 2350 } } })
    expect(await stock()).toMatchObject({ sold: 0, delivered: 25 })
    expect((await seen()).may).toContain('rate')
    expect((await seen()).survival?.handedOver).toBe(25)
  })
})

describe('somebody who does not come', () => {
  it('cannot be reported before the window and its hour of grace are over', async () => {
    const { hatchery, act, slot } = await paid('too-early')
    await act(hatchery, 'readiness')
    await desk.travelTo(new Date(slot.endsAt.getTime() + 30 * 60_000))
    expect((await act(hatchery, 'no-show')).status).toBe(409)
    await desk.travelTo(new Date(slot.endsAt.getTime() + 61 * 60_000))
    expect((await act(hatchery, 'no-show')).status).toBe(200)
  })

  it('loses the deposit as a buyer when a day passes without a word; the balance goes back', async () => {
    const { hatchery, act, seen, slot, stock, payBalance } = await paid('buyer-absent')
    await act(hatchery, 'readiness')
    await payBalance()
    await desk.travelTo(new Date(slot.endsAt.getTime() + 65 * 60_000))
    const marked = await act(hatchery, 'no-show', { note: 'Waited until eleven' })
    expect(marked.body).toMatchObject({ state: 'ready', noShow: { by: 'seller' } })
    expect((await seen()).may).toContain('contest')
    await desk.travelTo(new Date(now().getTime() + 25 * HOUR))
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'buyer_no_show',
      money: { refundedCents: 1875, strip: { heldCents: 0, releasedCents: 587 } },
    })
    expect(await stock()).toMatchObject({ free: 500, sold: 0 })
  })

  it('refunds everything when it was the seller', async () => {
    const { bea, hatchery, act, seen, slot, payBalance } = await paid('seller-absent')
    await act(hatchery, 'readiness')
    await payBalance()
    await desk.travelTo(new Date(slot.startsAt.getTime() + 20 * 60_000))
    expect((await act(bea, 'no-show', { note: 'The gate is locked' })).status).toBe(200)
    await desk.travelTo(new Date(now().getTime() + 25 * HOUR))
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'seller_no_show',
      money: { refundedCents: 2500, strip: { heldCents: 0, releasedCents: 0 } },
    })
  })

  it('may object, and then a moderator decides instead of the clock', async () => {
    const { bea, hatchery, act, seen, slot, path, stock } = await paid('contested')
    await act(hatchery, 'readiness')
    await desk.travelTo(new Date(slot.endsAt.getTime() + 65 * 60_000))
    await act(hatchery, 'no-show')
    expect((await act(hatchery, 'contest', { note: 'I object to myself' })).status).toBe(409)
    expect((await act(bea, 'contest', { note: 'short' })).status).toBe(422)
    expect((await act(bea, 'contest', { note: 'I stood at the gate from nine to ten.' })).body.state).toBe(
      'claim_open',
    )
    const staff = await desk.staff('staff@example.org')
    const reply = await staff
      .post(`/api/v1/moderation${path.slice(7)}/decision`)
      .set(keyed())
      .send({ outcome: 'seller-absent', note: 'The buyer sent a dated photo of the gate.' })
    expect(reply.status).toBe(200)
    await desk.quiet()
    expect(await seen()).toMatchObject({
      state: 'settled',
      money: { refundedCents: 625, strip: { heldCents: 0 } },
    })
    expect(await stock()).toMatchObject({ free: 500, sold: 0 })
  })
})

describe('moving the day', () => {
  it('works once for each side while the animals are ready, and the old place is free again', async () => {
    const { batch, bea, hatchery, act, seen, slot } = await paid('move')
    await act(hatchery, 'readiness')
    const other = batch.windows[1]
    expect((await act(bea, 'slot', { windowId: other?.publicId })).body).toMatchObject({ state: 'scheduled' })
    expect([await taken(slot.id), await taken(other?.id ?? 0)]).toEqual([0, 1])
    await act(hatchery, 'readiness')
    expect((await act(bea, 'slot', { windowId: slot.publicId })).status).toBe(409)
    expect((await act(hatchery, 'slot', { windowId: slot.publicId })).status).toBe(200)
    expect((await seen()).slot?.startsAt).toBe(slot.startsAt.toISOString())
  })
})

describe('a seller who moves the day', () => {
  it('cannot take the free time away: a buyer whom the new day does not suit gets everything back', async () => {
    const { batch, bea, hatchery, act, seen, payBalance } = await paid('moved-near', { days: 2 })
    await act(hatchery, 'readiness')
    await payBalance()
    const other = batch.windows[1]
    expect((await act(hatchery, 'slot', { windowId: other?.publicId })).status).toBe(200)
    expect((await seen()).freeCancelUntil).toBe(other?.startsAt.toISOString())
    await act(hatchery, 'readiness')
    expect((await act(bea, 'cancellation')).status).toBe(200)
    expect((await seen()).money).toMatchObject({ refundedCents: 2500, strip: { releasedCents: 0 } })
  })
})

describe('a moderator who stops an order', () => {
  it('needs a second factor and is no party of it', async () => {
    const { bea, path } = await paid('stop-guard')
    const body = { cause: 'recall', animals: 'frozen', note: 'A sample of this batch is under test.' }
    expect(
      (
        await bea
          .post(`/api/v1/moderation${path.slice(7)}/stop`)
          .set(keyed())
          .send(body)
      ).status,
    ).toBe(403)
    const weak = await desk.signedIn('weak@example.org').catch(async () => {
      await buildMember(desk.db, { email: 'weak@example.org', role: 'member,moderator' })
      return desk.signedIn('weak@example.org')
    })
    const refused = await weak
      .post(`/api/v1/moderation${path.slice(7)}/stop`)
      .set(keyed())
      .send(body)
    expect(refused.body.type).toBe('/problems/second-factor-needed')
  })

  it('gives everything back and keeps the animals out of sale until somebody frees them', async () => {
    const { path, seen, stock } = await paid('stopped')
    const staff = await desk.staff('staff@example.org')
    const stop = { cause: 'recall', animals: 'frozen', note: 'A sample of this batch is under test.' }
    await staff
      .post(`/api/v1/moderation${path.slice(7)}/stop`)
      .set(keyed())
      .send(stop)
      .expect(200)
    await desk.quiet()
    expect(await seen()).toMatchObject({
      state: 'cancelled',
      reason: 'admin_stop',
      money: { refundedCents: 625 },
    })
    expect(await stock()).toMatchObject({ free: 475, sold: 0 })
  })
})
