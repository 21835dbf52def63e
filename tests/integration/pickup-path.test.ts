import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listing } from '@/db/schema/listings'
import { processorEvent } from '@/db/schema/payments'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

let desk: OrderDesk
beforeAll(async () => {
  desk = await openOrderDesk('pickup_path')
  await desk.member('bea@example.org')
})
afterAll(() => desk.close())

async function held(
  name: string,
  body: Parameters<OrderDesk['batch']>[1] = {},
  change: Record<string, unknown> = {},
) {
  const batch = await desk.batch(name, body)
  const bea = await desk.signedIn('bea@example.org')
  const hatchery = await desk.signedIn(desk.hatcheryEmail)
  const reply = await bea
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch, change))
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  const order = reply.body as ShownOrder
  const path = `/api/v1/orders/${order.orderId}`
  const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
  const act = async (by: typeof bea, what: string, send: object = {}) => {
    const answer = await by.post(`${path}/${what}`).set(keyed()).send(send)
    await desk.quiet()
    return answer
  }
  const stock = async () => (await desk.db.select().from(listing).where(eq(listing.id, batch.id)))[0]
  return { batch, bea, hatchery, order, path, seen, act, stock }
}

describe('from the hold to the bucket', () => {
  it('runs an instant listing whole: deposit, date, balance, code, all good, transfer', async () => {
    const { bea, hatchery, order, seen, act, stock } = await held('instant')
    await desk.pay(order)
    const scheduled = await seen()
    expect(scheduled.state).toBe('scheduled')
    expect(scheduled.meeting?.street).toBe('12 Mill Lane')
    expect(scheduled.money.strip).toMatchObject({ heldCents: 625, releasedCents: 0 })
    expect(await stock()).toMatchObject({ free: 475, held: 0, sold: 25 })

    expect((await act(hatchery, 'readiness')).status).toBe(200)
    expect((await seen()).handOverCode).toBeUndefined()
    const early = await act(hatchery, 'hand-over', { code: '000000', count: 25 })
    expect([early.status, early.body.type]).toEqual([409, '/problems/balance-unpaid'])

    const balance = await act(bea, 'balance-payment')
    await desk.pay(balance.body as ShownOrder)
    const ready = await seen()
    expect(ready).toMatchObject({ state: 'ready', balancePaid: true })
    expect(ready.money.strip.heldCents).toBe(2500)
    expect((await seen(hatchery)).handOverCode).toBeUndefined()
    const code = ready.handOverCode ?? ''
    expect(code).toMatch(/^\d{6}$/)
    const wrong = await act(hatchery, 'hand-over', {
      code: code === '111111' ? '222222' : '111111',
      count: 25,
    })
    expect([wrong.status, wrong.body.type]).toEqual([409, '/problems/code-wrong'])
    expect((await act(hatchery, 'hand-over', { code, count: 26 })).body).toMatchObject({
      state: 'handed_over',
    })

    expect((await act(bea, 'confirmation')).status).toBe(200)
    const done = await seen()
    expect(done.state).toBe('settled')
    expect(done.money).toMatchObject({ feeCents: 150, strip: { heldCents: 0, releasedCents: 2350 } })
    expect(await stock()).toMatchObject({ free: 475, sold: 0, delivered: 25 })
    expect(await brokenInvariants(desk.db)).toEqual([])
    expect(desk.letters.map((letter) => letter.subject)).toEqual(
      expect.arrayContaining([
        'Ready for pickup',
        'Receipt: your order is complete',
        'Your money is on its way',
      ]),
    )
  })

  it('counts guesses at the code one by one, also when many come at once', async () => {
    const { bea, hatchery, order, path, seen, act } = await held('guesses', {}, { payMode: 'full' })
    await desk.pay(order)
    await act(hatchery, 'readiness')
    const code = (await seen()).handOverCode ?? ''
    const guess = (wrong: string) =>
      hatchery.post(`${path}/hand-over`).set(keyed()).send({ code: wrong, count: 25 })
    const wrongs = Array.from({ length: 14 }, (_, at) => String((Number(code) + at + 1) % 1_000_000))
    const answers = await Promise.all(wrongs.map((wrong) => guess(wrong.padStart(6, '0'))))
    const told = answers.map(({ body }) => String(body.detail))
    expect(told.filter((text) => text.startsWith('That is not the code'))).toHaveLength(10)
    expect(told.filter((text) => text.startsWith('Too many wrong codes'))).toHaveLength(4)
    expect((await act(hatchery, 'hand-over', { code, count: 25 })).status).toBe(409)
    expect((await seen(bea)).state).toBe('ready')
  })

  it('waits for a seller who wants to answer first, and takes the deposit only then', async () => {
    const { hatchery, order, seen, act, stock } = await held('asks', { body: { accept: 'ask' } })
    await desk.pay(order)
    const requested = await seen()
    expect(requested.state).toBe('requested')
    expect(requested.money.strip.heldCents).toBe(0)
    expect(await stock()).toMatchObject({ free: 475, held: 25 })
    const accepted = await act(hatchery, 'acceptance')
    expect(accepted.status, JSON.stringify(accepted.body)).toBe(200)
    expect(await seen()).toMatchObject({ state: 'scheduled', money: { strip: { heldCents: 625 } } })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('lets the earmarked deposit go when the seller declines', async () => {
    const { hatchery, order, seen, act, stock } = await held('declines', { body: { accept: 'ask' } })
    await desk.pay(order)
    const missing = await act(hatchery, 'refusal', {})
    expect(missing.status).toBe(422)
    await act(hatchery, 'refusal', { reason: 'sick', note: 'White spots this morning' })
    expect(await seen()).toMatchObject({ state: 'cancelled', reason: 'seller_declined' })
    expect(await stock()).toMatchObject({ free: 500, held: 0, sold: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('ends a request that the seller never answers', async () => {
    const { order, seen, stock } = await held('silent', { body: { accept: 'ask' } })
    await desk.pay(order)
    await desk.travelTo(new Date(Date.now() + 49 * 3600_000))
    expect(await seen()).toMatchObject({ state: 'cancelled', reason: 'seller_silent' })
    expect(await stock()).toMatchObject({ free: 500, held: 0 })
    await desk.travelTo(new Date())
  })

  it('lets the buyer take a request back before the answer, and not after', async () => {
    const { bea, hatchery, order, seen, act } = await held('withdraws', { body: { accept: 'ask' } })
    await desk.pay(order)
    expect((await act(hatchery, 'withdrawal')).status).toBe(404)
    expect((await act(bea, 'withdrawal')).status).toBe(200)
    expect(await seen()).toMatchObject({ state: 'cancelled', reason: 'buyer_changed_mind' })
    expect((await act(hatchery, 'acceptance')).status).toBe(409)
  })

  it('pays the seller by itself when the claim window ends without a word', async () => {
    const { hatchery, order, seen, act } = await held('by-itself', {}, { payMode: 'full' })
    await desk.pay(order)
    expect((await seen()).balancePaid).toBe(true)
    await act(hatchery, 'readiness')
    const code = (await seen()).handOverCode
    await act(hatchery, 'hand-over', { code, count: 25 })
    await desk.travelTo(new Date(Date.now() + 25 * 3600_000))
    expect(await seen()).toMatchObject({ state: 'settled', money: { strip: { releasedCents: 2350 } } })
    await desk.travelTo(new Date())
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('refunds at once what both count short at the gate, and the fee with it', async () => {
    const { bea, hatchery, order, seen, act, stock } = await held('short', {}, { payMode: 'full' })
    await desk.pay(order)
    await act(hatchery, 'readiness')
    const code = (await seen()).handOverCode
    await act(hatchery, 'hand-over', { code, count: 22 })
    expect((await seen()).money).toMatchObject({ refundedCents: 300 })
    await act(bea, 'confirmation')
    const done = await seen()
    expect(done.money).toMatchObject({
      feeCents: 132,
      strip: { heldCents: 0, releasedCents: 2068, refundedCents: 300 },
    })
    expect(await stock()).toMatchObject({ free: 475, sold: 0, delivered: 22 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('leaves a declined card with its hold', async () => {
    const { order, seen } = await held('declined-card')
    await desk.pay(order, '4000000000000002')
    expect((await seen()).state).toBe('reserved')
    await desk.pay(order)
    expect((await seen()).state).toBe('scheduled')
  })

  it('applies an event once however often it comes', async () => {
    const { order, seen } = await held('twice-told')
    await desk.fake.control('webhooks', { duplicateNext: 4 })
    await desk.pay(order)
    expect((await seen()).state).toBe('scheduled')
    const events = await desk.db.select().from(processorEvent)
    expect(new Set(events.map((event) => event.id)).size).toBe(events.length)
    expect(events.every((event) => event.appliedAt !== null)).toBe(true)
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('accepts no event that is not signed with our secret', async () => {
    const visitor = desk.visitor()
    const forged = JSON.stringify({
      id: 'evt_forged',
      type: 'checkout.session.completed',
      data: { object: {} },
    })
    const before = await desk.db.$count(processorEvent)
    for (const signature of ['', 't=1,v1=00', `t=${Math.floor(Date.now() / 1000)},v1=${'0'.repeat(64)}`]) {
      const reply = await visitor
        .post('/api/v1/stripe-events')
        .set({ 'stripe-signature': signature, 'content-type': 'application/json' })
        .send(forged)
      expect(reply.status).toBe(400)
    }
    expect(await desk.db.$count(processorEvent)).toBe(before)
  })

  it('sends money that comes after the hold had ended straight back', async () => {
    const { order, seen } = await held('too-late')
    await desk.fake.control('webhooks', { held: true })
    await desk.fake.control('refuse-connections', { ms: 1200 })
    await desk.travelToWithoutRest(new Date(Date.now() + 20 * 60_000))
    expect((await seen()).state).toBe('cancelled')
    await new Promise((done) => setTimeout(done, 1300))
    await desk.fake.pay(order.payUrl ?? '', '4242424242424242')
    await desk.fake.control('webhooks', { held: false })
    await desk.quiet()
    const after = await seen()
    expect(after.state).toBe('cancelled')
    expect(await brokenInvariants(desk.db)).toEqual([])
    await desk.travelTo(new Date())
  })
})
