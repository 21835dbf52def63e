import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest'

import { listing } from '@/db/schema/listings'
import { configurePayments } from '@/payments/stripe'
import { now } from '@/server/clock'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody, type DeskBatch } from '@/tests/support/desk-ground'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const SAYS_SO_WITHIN_MS = 5000
const REST_MS = 700
/** Longer than anybody asks for an answer. */
const HANGS_MS = 6000

const pause = (ms: number) => new Promise((done) => setTimeout(done, ms))

let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('payments_away')
  await desk.member('bea@example.org')
})
afterAll(() => desk.close())

/** As at the start of the process, with a rest that a test can wait for. */
function freshPayments(): void {
  configurePayments({
    secretKey: 'sk_test_order_desk',
    webhookSecret: 'whsec_order_desk_tests',
    host: '127.0.0.1',
    port: desk.fake.port,
    protocol: 'http',
    restMs: REST_MS,
  })
}

async function timed<R>(work: PromiseLike<R>): Promise<[reply: R, tookMs: number]> {
  const began = performance.now()
  const reply = await work
  return [reply, performance.now() - began]
}

async function freeOf(batch: DeskBatch): Promise<number | undefined> {
  return (await desk.db.select().from(listing).where(eq(listing.id, batch.id)))[0]?.free
}

const ways: [way: string, goAway: () => Promise<unknown>, comeBack: () => Promise<unknown>][] = [
  [
    'refuses connections',
    () => desk.fake.control('refuse-connections', { ms: 2500 }).then(() => pause(60)),
    () => pause(2600),
  ],
  [
    'takes connections and never answers',
    () => desk.fake.control('faults', { kind: 'slow', ms: HANGS_MS, times: 1000, match: '' }),
    () =>
      fetch(`${desk.fake.origin}/_control/faults`, {
        method: 'DELETE',
        headers: { 'x-control-token': 'control-for-tests' },
      }),
  ],
]

describe.each(ways)('while the processor %s', (way, goAway, comeBack) => {
  beforeAll(() => freshPayments())
  afterEach(() => comeBack())

  it('browsing goes on as ever', async () => {
    const batch = await desk.batch(`browsing ${way}`)
    await goAway()
    for (const path of [
      '/listings?near=45202',
      '/listing-facets?near=45202',
      `/listings/${batch.publicId}?near=45202`,
      `/sellers/${desk.hatchery.publicId}`,
      '/places?q=Cin',
    ]) {
      const [reply, tookMs] = await timed(desk.visitor().get(`/api/v1${path}`))
      expect(reply.status, path).toBe(200)
      expect(tookMs, path).toBeLessThan(1000)
    }
  })

  it('the start of the checkout says so, keeps the hold, and the same reservation pays afterwards', async () => {
    const batch = await desk.batch(`checkout ${way}`)
    const bea = await desk.signedIn('bea@example.org')
    const key = keyed()
    const reserve = () =>
      bea.post(`/api/v1/listings/${batch.publicId}/orders`).set(key).send(reserveBody(batch))
    await goAway()
    const [held, heldMs] = await timed(reserve())
    expect(held.status, JSON.stringify(held.body)).toBe(201)
    const order = held.body as ShownOrder
    expect(order.payUrl).toBeUndefined()
    expect(order.may).toContain('pay-deposit')
    expect(heldMs).toBeLessThan(SAYS_SO_WITHIN_MS)

    const pay = () => bea.post(`/api/v1/orders/${order.orderId}/deposit-payment`).set(keyed()).send({})
    const [told, toldMs] = await timed(pay())
    expect(told.headers['content-type']).toContain('application/problem+json')
    expect(told.body).toMatchObject({ type: '/problems/payments-away', status: 503 })
    expect(told.body.detail).toMatch(/still held/)
    expect(toldMs).toBeLessThan(SAYS_SO_WITHIN_MS)
    expect(await freeOf(batch)).toBe(475)

    await comeBack()
    const again = (await reserve()).body as ShownOrder
    expect(again.orderId).toBe(order.orderId)
    // A processor that is still busy with the call of before says so; then the page opens under the same key.
    const opened = await vi.waitFor(
      async () => {
        const reply = await pay()
        expect(reply.status).toBe(200)
        return reply.body as ShownOrder
      },
      { timeout: HANGS_MS + 2000, interval: 250 },
    )
    await desk.pay(opened)
    const seen = (await bea.get(`/api/v1/orders/${order.orderId}`)).body as ShownOrder
    expect(seen.state).toBe('scheduled')
    expect(await freeOf(batch)).toBe(475)
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('a hold that nobody could pay gives its animals back', async () => {
    const batch = await desk.batch(`given back ${way}`)
    const bea = await desk.signedIn('bea@example.org')
    await goAway()
    const held = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    expect(held.status).toBe(201)
    expect(await freeOf(batch)).toBe(475)
    await desk.travelToWithoutRest(new Date(now().getTime() + 18 * 60_000))
    expect(await freeOf(batch)).toBe(500)
    await comeBack()
    await desk.travelTo(new Date())
    const anew = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    await desk.pay(anew.body as ShownOrder)
    const seen = (await bea.get(`/api/v1/orders/${(anew.body as ShownOrder).orderId}`)).body as ShownOrder
    expect(seen.state).toBe('scheduled')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })
})

describe('a processor that has not answered five times', () => {
  it('is left alone for a while, so nobody waits for it, and is asked again after that', async () => {
    freshPayments()
    const batch = await desk.batch('circuit')
    const bea = await desk.signedIn('bea@example.org')
    await desk.fake.control('refuse-connections', { ms: 600 })
    await pause(60)
    const held = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    const pay = () =>
      bea
        .post(`/api/v1/orders/${(held.body as ShownOrder).orderId}/deposit-payment`)
        .set(keyed())
        .send({})
    for (let press = 0; press < 4; press++) expect((await pay()).status).toBe(503)
    // From here on it hangs: whoever asked it would wait four seconds.
    await pause(600)
    await desk.fake.control('faults', { kind: 'slow', ms: 30_000, times: 1, match: '' })
    const [quick, quickMs] = await timed(pay())
    expect(quick.status).toBe(503)
    expect(quickMs).toBeLessThan(500)
    await fetch(`${desk.fake.origin}/_control/faults`, {
      method: 'DELETE',
      headers: { 'x-control-token': 'control-for-tests' },
    })
    await pause(REST_MS)
    expect((await pay()).status).toBe(200)
  })
})
