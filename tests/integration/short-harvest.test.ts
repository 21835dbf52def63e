import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { listing } from '@/db/schema/listings'
import { order as orders } from '@/db/schema/orders'
import { setClockOffset } from '@/server/clock'
import type { ListingBody } from '@/shared/contracts/listings'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody, type DeskBatch } from '@/tests/support/desk-ground'
import { clayOf, dayAt, lettuceOf } from '@/tests/support/greens'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const HOUR_MS = 3_600_000
const NOON = new Date('2027-01-15T17:00:00Z')

let desk: OrderDesk
type Agent = Awaited<ReturnType<OrderDesk['signedIn']>>
let bea: Agent
let cal: Agent
let grower: Agent
beforeAll(async () => {
  desk = await openOrderDesk('short_harvest')
  await desk.member('bea@example.org')
  await desk.member('cal@example.org')
  bea = await desk.signedIn('bea@example.org')
  cal = await desk.signedIn('cal@example.org')
  grower = await desk.signedIn(desk.hatcheryEmail)
})
beforeEach(() => setClockOffset(NOON.getTime() - Date.now()))
afterAll(() => desk.close())

const lot = (name: string, whole: ListingBody) => desk.batch(name, { whole, free: whole.countOnHand })
async function reserve(by: Agent, batch: DeskBatch, quantity: number) {
  return by
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch, { quantity }))
}
async function bought(by: Agent, batch: DeskBatch, quantity: number): Promise<ShownOrder> {
  const reply = await reserve(by, batch, quantity)
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  await desk.pay(reply.body as ShownOrder)
  return seen(by, reply.body as ShownOrder)
}
const seen = async (by: Agent, { orderId }: ShownOrder) =>
  (await by.get(`/api/v1/orders/${orderId}`).expect(200)).body as ShownOrder
async function act(by: Agent, { orderId }: ShownOrder, done: string | [what: string, send: object]) {
  const [what, send] = typeof done === 'string' ? [done, {}] : done
  const answer = await by.post(`/api/v1/orders/${orderId}/${what}`).set(keyed()).send(send)
  await desk.quiet()
  return answer
}
async function cut(batch: DeskBatch, count: unknown, by = grower) {
  const answer = await by.post(`/api/v1/listings/${batch.publicId}/harvest`).set(keyed()).send({ count })
  await desk.quiet()
  return answer
}
const stockOf = async ({ id }: DeskBatch) =>
  (await desk.db.select().from(listing).where(eq(listing.id, id)))[0]

describe('greens, paid at once', () => {
  it('are prepaid, answered within twelve hours, free to cancel until twelve before, claimed within four', async () => {
    const asked = await lot('ask', lettuceOf(NOON, undefined, { accept: 'ask' }))
    const order = await bought(bea, asked, 3)
    expect(order).toMatchObject({ state: 'requested', quantity: 3, payMode: 'full', unitCents: 300 })
    expect(order.money).toMatchObject({ totalCents: 900, firstChargeCents: 900, balanceCents: 0 })
    expect(Date.parse(order.clock?.at ?? '') - NOON.getTime()).toBeLessThan(12 * HOUR_MS + 60_000)
    expect(order.arrivalPromise).toMatch(/within 4 hours/)
    await desk.travelTo(new Date(NOON.getTime() + 12 * HOUR_MS + 120_000))
    expect(await seen(bea, order)).toMatchObject({ state: 'cancelled', reason: 'seller_silent' })
    expect(await stockOf(asked)).toMatchObject({ free: 14, held: 0 })
  })

  it('are handed over, asked no seven-day question, and settled four hours later', async () => {
    const batch = await lot('whole way', lettuceOf(NOON))
    const order = await bought(bea, batch, 3)
    expect(order.state).toBe('scheduled')
    expect((await act(grower, order, 'readiness')).status).toBe(200)
    const { handOverCode } = await seen(bea, order)
    const handed = await act(grower, order, ['hand-over', { code: handOverCode, count: 3 }])
    expect(handed.status, JSON.stringify(handed.body)).toBe(200)
    const after = await seen(bea, order)
    expect(after.survival).toBeUndefined()
    const mail = desk.letters.find((letter) => letter.heading === '3 heads: yours now')
    expect(JSON.stringify(mail?.blocks)).toMatch(/Wash before eating/)
    await desk.travelTo(new Date(NOON.getTime() + 4 * HOUR_MS + 120_000))
    expect((await seen(bea, order)).state).toBe('settled')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('have one winner for the last bunch; the other is told that none is left', async () => {
    const batch = await lot('last bunch', lettuceOf(NOON, undefined, { countOnHand: 1 }))
    const replies = await Promise.all([reserve(bea, batch, 1), reserve(cal, batch, 1)])
    expect(replies.map(({ status }) => status).toSorted()).toEqual([201, 409])
    const winner = replies.findIndex(({ status }) => status === 201)
    await act(winner === 0 ? bea : cal, replies[winner]?.body as ShownOrder, 'leave')
    const loser = replies.find(({ status }) => status === 409)
    expect(loser?.body.type).toBe('/problems/batch-short')
    expect(JSON.stringify(loser?.body)).toMatch(/"left":0/)
  })

  it('not collected, stay paid and may be sold again, thirty minutes after the window', async () => {
    const batch = await lot('nobody came', lettuceOf(NOON))
    const order = await bought(bea, batch, 3)
    await act(grower, order, 'readiness')
    const ends = Date.parse(order.slot?.endsAt ?? '')
    await desk.travelTo(new Date(ends + 29 * 60_000))
    expect((await act(grower, order, 'no-show')).status).toBe(409)
    await desk.travelTo(new Date(ends + 31 * 60_000))
    expect((await act(grower, order, 'no-show')).status).toBe(200)
    await desk.travelTo(new Date(ends + 25 * HOUR_MS))
    const over = await seen(bea, order)
    expect(over).toMatchObject({ state: 'cancelled', reason: 'buyer_no_show' })
    expect(over.money).toMatchObject({ refundedCents: 0, feeCents: 54 })
    expect(await stockOf(batch)).toMatchObject({ free: 14, sold: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('are held for five minutes, and paid whole, by who let three pickups pass in sixty days', async () => {
    const batch = await lot('forgetful', clayOf(NOON))
    await desk.member('fay@example.org')
    const fay = await desk.signedIn('fay@example.org')
    const usual = (await reserve(fay, batch, 1)).body as ShownOrder
    expect([usual.money.firstChargeCents, usual.clock?.edge]).toEqual([600, 'E02'])
    await act(fay, usual, 'leave')
    const [{ id } = { id: 0 }] = await desk.db
      .select({ id: orders.id })
      .from(orders)
      .where(eq(orders.publicId, usual.orderId))
    const [row] = await desk.db.select().from(orders).where(eq(orders.id, id))
    if (!row) throw new Error('the order is gone')
    const missed = { state: 'cancelled', reason: 'buyer_no_show', noShowBy: 'seller', clockAt: null }
    const before = (days: number) => new Date(NOON.getTime() - days * 24 * HOUR_MS)
    const copy = (days: number) => {
      const { id: _id, ...facts } = row
      return { ...facts, ...missed, publicId: `no-show-${days}`.padEnd(22, '0'), noShowAt: before(days) }
    }
    await desk.db.insert(orders).values([copy(3), copy(20), copy(61)])
    expect(((await reserve(fay, batch, 1)).body as ShownOrder).money.firstChargeCents).toBe(600)
    await desk.db.insert(orders).values(copy(40))
    const short = (await reserve(fay, batch, 1)).body as ShownOrder
    expect(short.money).toMatchObject({ firstChargeCents: 3000, balanceCents: 0 })
    const waitsMs = Date.parse(short.clock?.at ?? '') - NOON.getTime()
    expect(waitsMs).toBeGreaterThan(4 * 60_000)
    expect(waitsMs).toBeLessThan(6 * 60_000)
  })
})

describe('a short harvest', () => {
  it('of 11 for 14 sold takes the last three in order time, pays back at once and tells the buyers', async () => {
    const batch = await lot('eleven', lettuceOf(NOON))
    const first = await bought(bea, batch, 6)
    setClockOffset(NOON.getTime() + 60_000 - Date.now())
    const second = await bought(cal, batch, 6)
    setClockOffset(NOON.getTime() + 120_000 - Date.now())
    const third = await bought(bea, batch, 2)
    desk.letters.length = 0
    const answer = await cut(batch, 11)
    expect(answer.status, JSON.stringify(answer.body)).toBe(200)
    expect(answer.body).toMatchObject({
      unsold: 0,
      cut: [
        { orderId: third.orderId, units: 2, left: 0, refundCents: 600 },
        { orderId: second.orderId, units: 1, left: 5, refundCents: 300 },
      ],
    })
    expect(await seen(bea, first)).toMatchObject({ state: 'scheduled', quantity: 6 })
    expect(await seen(bea, third)).toMatchObject({ state: 'cancelled', reason: 'seller_cancelled' })
    const rest = await seen(cal, second)
    expect(rest).toMatchObject({ state: 'scheduled', quantity: 5, unitCents: 300 })
    expect(rest.money).toMatchObject({ refundedCents: 300, feeCents: 90, strip: { heldCents: 1500 } })
    expect(desk.letters.map((letter) => letter.subject)).toEqual(
      expect.arrayContaining(['Fewer than you ordered: 5 heads', 'The seller cancelled the order']),
    )
    expect(await stockOf(batch)).toMatchObject({ free: 0, sold: 11 })

    const again = await cut(batch, 11)
    expect(again.body).toMatchObject({ unsold: 0, cut: [] })
    await act(grower, second, 'readiness')
    const { handOverCode } = await seen(cal, second)
    await act(grower, second, ['hand-over', { code: handOverCode, count: 4 }])
    expect((await seen(cal, second)).money.refundedCents).toBe(600)
    await act(cal, second, 'confirmation')
    expect(await seen(cal, second)).toMatchObject({ state: 'settled', money: { feeCents: 72 } })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('lets the buyer cancel for nothing during the next 24 hours, however late', async () => {
    const batch = await lot('late cut', lettuceOf(NOON))
    const order = await bought(cal, batch, 14)
    const slot = Date.parse(order.slot?.startsAt ?? '')
    await desk.travelTo(new Date(slot - 5 * HOUR_MS))
    await cut(batch, 10)
    const told = await seen(cal, order)
    expect(Date.parse(told.freeCancelUntil ?? '')).toBeGreaterThan(slot)
    expect((await act(cal, order, 'cancellation')).status).toBe(200)
    expect((await seen(cal, order)).money).toMatchObject({ refundedCents: 4200 })
    expect(await stockOf(batch)).toMatchObject({ free: 10, sold: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('takes what nobody bought first, and a request before what is paid', async () => {
    const asked = await lot('ask first', lettuceOf(NOON, undefined, { accept: 'ask' }))
    const request = await bought(bea, asked, 5)
    expect((await cut(asked, 9)).body).toMatchObject({ unsold: 5, cut: [] })
    const more = await cut(asked, 3)
    expect(more.body).toMatchObject({
      unsold: 4,
      cut: [{ orderId: request.orderId, units: 2, refundCents: 0 }],
    })
    expect(await seen(bea, request)).toMatchObject({ state: 'cancelled', reason: 'seller_declined' })
    expect(await stockOf(asked)).toMatchObject({ free: 3, held: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('asks for less at the hand-over where the rest was not paid yet, and closes the page over the old sum', async () => {
    const batch = await lot('bags', clayOf(NOON, undefined, { countOnHand: 4 }))
    const order = await bought(bea, batch, 4)
    expect(order.money).toMatchObject({ firstChargeCents: 2400, balanceCents: 9600 })
    await act(grower, order, 'readiness')
    const open = (await act(bea, order, 'balance-payment')).body as ShownOrder
    expect(open.payUrl).toBeTruthy()
    await cut(batch, 3)
    const less = await seen(bea, order)
    expect(less).toMatchObject({ quantity: 3, unitCents: 3000 })
    expect(less.money).toMatchObject({
      totalCents: 9000,
      balanceCents: 6600,
      refundedCents: 0,
      feeCents: 540,
    })
    await desk.pay(open)
    expect(await seen(bea, order)).toMatchObject({ balancePaid: false, money: { refundedCents: 0 } })
    const anew = (await act(bea, order, 'balance-payment')).body as ShownOrder
    await desk.pay(anew)
    const { handOverCode } = await seen(bea, order)
    await act(grower, order, ['hand-over', { code: handOverCode, count: 3 }])
    await act(bea, order, 'confirmation')
    expect(await seen(bea, order)).toMatchObject({
      state: 'settled',
      money: { feeCents: 540, refundedCents: 0 },
    })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('waits while somebody pays, and says so; nothing is changed', async () => {
    const batch = await lot('paying', lettuceOf(NOON))
    const held = await reserve(bea, batch, 14)
    expect(held.status).toBe(201)
    const answer = await cut(batch, 10)
    expect([answer.status, answer.body.type]).toEqual([409, '/problems/order-moved'])
    expect(answer.body.detail).toMatch(/Nothing was changed/)
    expect(await stockOf(batch)).toMatchObject({ free: 0, held: 14 })
    await act(bea, held.body as ShownOrder, 'leave')
  })

  it('is the seller’s own, a whole number, no more than was promised, and never of fish', async () => {
    const batch = await lot('bad input', lettuceOf(NOON))
    for (const count of [-1, 1.5, '3', null, undefined]) {
      const answer = await cut(batch, count)
      expect([answer.status, answer.body.errors[0].pointer]).toEqual([422, '#/count'])
    }
    const more = await cut(batch, 15)
    expect([more.status, more.body.errors[0].pointer]).toEqual([422, '#/count'])
    expect((await cut(batch, 3, bea)).status).toBe(403)
    const fish = await desk.batch('fish are not cut')
    expect((await cut(fish, 3)).status).toBe(409)
    expect(await stockOf(batch)).toMatchObject({ free: 14 })
  })

  it('and two cuts at once, or a cut against a buyer, leave the books whole', async () => {
    const batch = await lot('race', lettuceOf(NOON))
    await bought(bea, batch, 8)
    const answers = await Promise.all([cut(batch, 6), cut(batch, 5), reserve(cal, batch, 4)])
    expect(answers.every(({ status }) => status < 500)).toBe(true)
    await desk.quiet()
    const row = await stockOf(batch)
    expect((row?.free ?? 0) + (row?.held ?? 0) + (row?.sold ?? 0)).toBeLessThanOrEqual(14)
    expect(await brokenInvariants(desk.db)).toEqual([])
    expect(dayAt(NOON, 0)).toBe('2027-01-15')
  })
})
