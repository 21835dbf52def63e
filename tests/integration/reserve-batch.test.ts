import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listing } from '@/db/schema/listings'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('reserve_batch')
  await desk.member('bea@example.org')
})
afterAll(() => desk.close())

async function stockOf(publicId: string) {
  const [row] = await desk.db.select().from(listing).where(eq(listing.publicId, publicId))
  return row
}

describe('holding animals for fifteen minutes', () => {
  it('takes them out of the free count and opens a payment page', async () => {
    const batch = await desk.batch('plain')
    const bea = await desk.signedIn('bea@example.org')
    const reply = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    expect(reply.status, JSON.stringify(reply.body)).toBe(201)
    const order = reply.body as ShownOrder
    expect(order.state).toBe('reserved')
    expect(order.payUrl).toContain(desk.fake.origin)
    expect(order.money.goodsCents).toBe(2500)
    expect(order.money.depositCents).toBe(625)
    expect(order.money.balanceCents).toBe(1875)
    expect(order.meeting).toBeUndefined()
    expect(order.may).toContain('pay-deposit')
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 475, held: 25 })
    expect(await brokenInvariants(desk.db)).toEqual([])
    await bea.post(`/api/v1/orders/${order.orderId}/departure`).set(keyed()).expect(200)
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 500, held: 0 })
  })

  it('makes one order of the same press sent twice, and of a key whose first answer was lost', async () => {
    const batch = await desk.batch('twice')
    const bea = await desk.signedIn('bea@example.org')
    const key = keyed()
    const path = `/api/v1/listings/${batch.publicId}/orders`
    const both = await Promise.all([
      bea.post(path).set(key).send(reserveBody(batch)),
      bea.post(path).set(key).send(reserveBody(batch)),
    ])
    expect(both.map((one) => one.status).sort()).toEqual([201, 409])
    const again = await bea.post(path).set(key).send(reserveBody(batch)).expect(201)
    const first = both.find((one) => one.status === 201)?.body as ShownOrder
    expect((again.body as ShownOrder).orderId).toBe(first.orderId)
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 475, held: 25 })
    const other = await bea
      .post(path)
      .set(key)
      .send(reserveBody(batch, { quantity: 30 }))
    expect([other.status, other.body.type]).toEqual([422, '/problems/key-reused'])
    await bea.post(`/api/v1/orders/${first.orderId}/departure`).set(keyed()).expect(200)
  })

  it.each([
    [{ quantity: 5 }, 409, 'below-minimum'],
    [{ quantity: 27 }, 422, 'fields-invalid'],
    [{ quantity: 100_000 }, 409, 'batch-short'],
    [{ windowId: undefined }, 422, 'fields-invalid'],
    [{ windowId: 'A'.repeat(22) }, 409, 'slot-full'],
    [{ near: '00000' }, 422, 'fields-invalid'],
    [{ version: 7 }, 409, 'version-stale'],
    [{ ticked: [] }, 422, 'ticks-missing'],
  ])('refuses %j', async (change, status, slug) => {
    const batch = await desk.batch(`refuses-${JSON.stringify(change)}`)
    const bea = await desk.signedIn('bea@example.org')
    const reply = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch, change))
    expect([reply.status, reply.body.type]).toEqual([status, `/problems/${slug}`])
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 500, held: 0 })
  })

  it('refuses an order beyond $100,000 before anything is held, and sells up to it', async () => {
    const dear = { minOrder: 1, orderStep: 1, tiers: [{ fromCount: 1, unitCents: 7_500 }] }
    const batch = await desk.batch('dear', { free: 2000, body: dear })
    const bea = await desk.signedIn('bea@example.org')
    const hold = (quantity: number) =>
      bea
        .post(`/api/v1/listings/${batch.publicId}/orders`)
        .set(keyed())
        .send(reserveBody(batch, { quantity }))
    const refused = await hold(1334)
    expect([refused.status, refused.body.type]).toEqual([422, '/problems/fields-invalid'])
    expect(refused.body.errors).toEqual([
      { detail: 'One order may come to at most $100,000.00. Ask for fewer.', pointer: '#/quantity' },
    ])
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 2000, held: 0 })
    const held = await hold(1333)
    expect([held.status, held.body.money?.totalCents]).toEqual([201, 9_997_500])
    await bea.get('/api/v1/orders').expect(200)
    await bea.post(`/api/v1/orders/${held.body.orderId}/departure`).set(keyed()).expect(200)
  })

  it('does not sell to oneself', async () => {
    const batch = await desk.batch('own')
    const owner = await desk.signedIn(desk.hatcheryEmail)
    const reply = await owner
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    expect([reply.status, reply.body.type]).toEqual([409, '/problems/own-batch'])
  })

  it('lets one member hold three unpaid orders and no more', async () => {
    await desk.member('greedy@example.org')
    const greedy = await desk.signedIn('greedy@example.org')
    const batch = await desk.batch('greedy')
    const path = `/api/v1/listings/${batch.publicId}/orders`
    for (let at = 0; at < 3; at++) await greedy.post(path).set(keyed()).send(reserveBody(batch)).expect(201)
    const fourth = await greedy.post(path).set(keyed()).send(reserveBody(batch))
    expect([fourth.status, fourth.body.type]).toEqual([409, '/problems/holds-too-many'])
  })

  it('gives the last twenty-five to exactly one of twenty buyers at once', async () => {
    const batch = await desk.batch('race', {
      free: 25,
      body: {
        countOnHand: 25,
        windows: [{ day: '2099-01-05', from: '09:00', until: '10:00', capacity: 40 }],
      },
    })
    const buyers = Array.from({ length: 20 }, (_, at) => `racer${at}@example.org`)
    for (const email of buyers) await desk.member(email)
    const agents = await Promise.all(buyers.map((email) => desk.signedIn(email)))
    const replies = await Promise.all(
      agents.map((agent) =>
        agent.post(`/api/v1/listings/${batch.publicId}/orders`).set(keyed()).send(reserveBody(batch)),
      ),
    )
    const won = replies.filter((reply) => reply.status === 201)
    const lost = replies.filter((reply) => reply.status === 409)
    expect([won.length, lost.length]).toEqual([1, 19])
    expect(lost.every((reply) => reply.body.type === '/problems/batch-short')).toBe(true)
    expect(lost.every((reply) => reply.body.facts.left === 0)).toBe(true)
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 0, held: 25 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('never books a pickup window past its places', async () => {
    const batch = await desk.batch('slots', {
      body: { windows: [{ day: '2099-01-05', from: '09:00', until: '10:00', capacity: 2 }] },
    })
    const buyers = ['slot0@example.org', 'slot1@example.org', 'slot2@example.org', 'slot3@example.org']
    for (const email of buyers) await desk.member(email)
    const agents = await Promise.all(buyers.map((email) => desk.signedIn(email)))
    const replies = await Promise.all(
      agents.map((agent) =>
        agent.post(`/api/v1/listings/${batch.publicId}/orders`).set(keyed()).send(reserveBody(batch)),
      ),
    )
    expect(replies.map((reply) => reply.status).sort()).toEqual([201, 201, 409, 409])
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 450, held: 50 })
  })

  it('keeps the hold when the payment service is away, and opens the page later', async () => {
    const batch = await desk.batch('away')
    await desk.member('patient@example.org')
    const patient = await desk.signedIn('patient@example.org')
    await desk.fake
      .control('faults', { kind: 'fail', match: '/v1/checkout/sessions', times: 1 })
      .catch(() => undefined)
    await desk.fake.control('refuse-connections', { ms: 1500 })
    const began = Date.now()
    const reply = await patient
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    expect(Date.now() - began).toBeLessThan(5000)
    expect(reply.status).toBe(201)
    const held = reply.body as ShownOrder
    expect(held.payUrl).toBeUndefined()
    await new Promise((done) => setTimeout(done, 1600))
    const opened = await patient.post(`/api/v1/orders/${held.orderId}/deposit-payment`).set(keyed())
    expect(opened.status, JSON.stringify(opened.body)).toBe(200)
    expect((opened.body as ShownOrder).payUrl).toBeTruthy()
  })

  it('ends an unpaid hold after 15 minutes and gives the animals back', async () => {
    const batch = await desk.batch('expires')
    await desk.member('late@example.org')
    const late = await desk.signedIn('late@example.org')
    const reply = await late
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
      .expect(201)
    const held = reply.body as ShownOrder
    await desk.travelTo(new Date(Date.now() + 16 * 60_000))
    const after = await late.get(`/api/v1/orders/${held.orderId}`).expect(200)
    expect(after.body).toMatchObject({ state: 'cancelled', reason: 'hold_expired' })
    expect(await stockOf(batch.publicId)).toMatchObject({ free: 500, held: 0 })
    const page = await fetch(held.payUrl ?? '')
    expect(await page.text()).not.toContain('name="cardNumber"')
    await desk.travelTo(new Date())
  })

  it('answers another member’s order exactly like one that never was', async () => {
    const batch = await desk.batch('private')
    await desk.member('mine@example.org')
    const mine = await desk.signedIn('mine@example.org')
    const reply = await mine
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
      .expect(201)
    await desk.member('nosy@example.org')
    const nosy = await desk.signedIn('nosy@example.org')
    const foreign = await nosy.get(`/api/v1/orders/${(reply.body as ShownOrder).orderId}`)
    const missing = await nosy.get(`/api/v1/orders/${'A'.repeat(22)}`)
    const strip = (body: Record<string, unknown>) => ({ ...body, instance: '' })
    expect(foreign.status).toBe(404)
    expect(strip(foreign.body as Record<string, unknown>)).toEqual(
      strip(missing.body as Record<string, unknown>),
    )
  })
})
