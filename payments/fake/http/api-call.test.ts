import Stripe from 'stripe'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from '../fake-for-tests'

let fake: TestFake
let stripe: Stripe

beforeAll(async () => {
  fake = await startTestFake()
  stripe = new Stripe('sk_test_x', {
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
    maxNetworkRetries: 0,
    telemetry: false,
  })
})
afterAll(() => fake.stop())

function call(path: string, init: RequestInit = {}): Promise<Response> {
  return fetch(`${fake.origin}${path}`, {
    ...init,
    headers: { authorization: 'Bearer sk_test_x', ...init.headers },
  })
}

function post(path: string, body: string, headers: Record<string, string> = {}): Promise<Response> {
  return call(path, {
    method: 'POST',
    body,
    headers: { 'content-type': 'application/x-www-form-urlencoded', ...headers },
  })
}

describe('the edge of the practice processor', () => {
  it('names every request and echoes the version it is asked in', async () => {
    const answer = await call('/v1/balance', { headers: { 'stripe-version': '2026-10-28.endive' } })
    expect(answer.headers.get('request-id')).toMatch(/^req_\w{24}$/)
    expect(answer.headers.get('stripe-version')).toBe('2026-10-28.endive')
  })

  it('takes test keys only', async () => {
    const answer = await call('/v1/balance', { headers: { authorization: 'Bearer sk_live_x' } })
    expect(answer.status).toBe(401)
    expect(await answer.json()).toMatchObject({ error: { type: 'invalid_request_error' } })
  })

  it('refuses a parameter it does not know, in the processor’s shape', async () => {
    const answer = await post('/v1/payment_intents', 'amount=1000&currency=usd&colour=red')
    expect(answer.status).toBe(400)
    expect(await answer.json()).toMatchObject({
      error: { type: 'invalid_request_error', code: 'parameter_unknown', param: 'colour' },
    })
  })

  it('says what is not imitated instead of guessing', async () => {
    expect((await call('/v1/customers')).status).toBe(404)
  })

  it('tells an unknown object from a wrong request', async () => {
    await expect(stripe.paymentIntents.retrieve('pi_none')).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      code: 'resource_missing',
      statusCode: 404,
    })
  })

  it('lists newest first, pages by id and expands inside a list', async () => {
    const made: string[] = []
    for (const amount of [1001, 1002, 1003]) {
      const payment = await stripe.paymentIntents.create({
        amount,
        currency: 'usd',
        payment_method: 'pm_card_visa',
        confirm: true,
      })
      made.push(payment.id)
    }
    const first = await stripe.paymentIntents.list({
      limit: 2,
      expand: ['data.latest_charge.balance_transaction'],
    })
    expect(first.data.map((one) => one.id)).toEqual([made[2], made[1]])
    expect(first.has_more).toBe(true)
    expect(first.data[0]?.latest_charge).toMatchObject({ object: 'charge', balance_transaction: { fee: 59 } })
    const second = await stripe.paymentIntents.list({ limit: 2, starting_after: made[1] })
    expect(second.data[0]?.id).toBe(made[0])
    const all = await stripe.paymentIntents.list({ limit: 1 }).autoPagingToArray({ limit: 100 })
    expect(all.map((one) => one.id)).toEqual([...made].reverse())
  })

  it('refuses to expand what is no reference', async () => {
    const answer = await call('/v1/balance?expand[]=livemode.colour')
    expect(answer.status).toBe(400)
  })
})

describe('idempotency keys', () => {
  it('gives the same answer again and does nothing twice', async () => {
    const key = { 'idempotency-key': 'order:1:deposit' }
    const first = await post('/v1/payment_intents', 'amount=2000&currency=usd', key)
    const again = await post('/v1/payment_intents', 'currency=usd&amount=2000', key)
    expect(again.headers.get('idempotent-replayed')).toBe('true')
    expect(again.headers.get('original-request')).toBe(first.headers.get('request-id'))
    expect(await again.text()).toBe(await first.text())
  })

  it('refuses the key for anything else', async () => {
    const answer = await post('/v1/payment_intents', 'amount=2001&currency=usd', {
      'idempotency-key': 'order:1:deposit',
    })
    expect(answer.status).toBe(400)
    expect(await answer.json()).toMatchObject({ error: { type: 'idempotency_error' } })
  })

  it('keeps a decline under its key, but not a request that was wrong from the start', async () => {
    const key = { idempotencyKey: 'declined' }
    const params = { amount: 3000, currency: 'usd', payment_method: 'pm_card_chargeDeclined', confirm: true }
    const declined = stripe.paymentIntents.create(params, key)
    await expect(declined).rejects.toMatchObject({ statusCode: 402, decline_code: 'generic_decline' })
    const answer = await post(
      '/v1/payment_intents',
      'amount=3000&currency=usd&confirm=true&payment_method=pm_card_chargeDeclined',
      {
        'idempotency-key': 'declined',
      },
    )
    expect(answer.headers.get('idempotent-replayed')).toBe('true')

    const wrong = await post('/v1/payment_intents', 'amount=3&currency=usd', { 'idempotency-key': 'mended' })
    expect(await wrong.json()).toMatchObject({ error: { code: 'amount_too_small' } })
    const mended = await post('/v1/payment_intents', 'amount=300&currency=usd', {
      'idempotency-key': 'mended',
    })
    expect(mended.status).toBe(200)
  })

  it('answers 409 while the first request of a key is still running', async () => {
    await fake.control('faults', { kind: 'slow', ms: 1500, match: 'POST /v1/payment_intents' })
    const key = { 'idempotency-key': 'double click' }
    const first = post('/v1/payment_intents', 'amount=2000&currency=usd', key)
    await new Promise((resolve) => setTimeout(resolve, 200))
    const second = await post('/v1/payment_intents', 'amount=2000&currency=usd', key)
    expect(second.status).toBe(409)
    expect(await second.json()).toMatchObject({ error: { code: 'idempotency_key_in_use' } })
    expect((await first).status).toBe(200)
  })
})

describe('planted faults', () => {
  it('fail: 500 and nothing done, so the same key works afterwards', async () => {
    await fake.control('faults', { kind: 'fail', match: 'POST /v1/payment_intents' })
    const key = { 'idempotency-key': 'after a 500' }
    expect((await post('/v1/payment_intents', 'amount=500&currency=usd', key)).status).toBe(500)
    expect((await post('/v1/payment_intents', 'amount=500&currency=usd', key)).status).toBe(200)
  })

  it('lost-reply: done, though nobody heard of it', async () => {
    await fake.control('faults', { kind: 'lost-reply', match: 'POST /v1/payment_intents' })
    const key = { 'idempotency-key': 'unheard' }
    await expect(post('/v1/payment_intents', 'amount=777&currency=usd', key)).rejects.toThrow()
    const again = await post('/v1/payment_intents', 'amount=777&currency=usd', key)
    expect(again.headers.get('idempotent-replayed')).toBe('true')
  })

  it('has no control endpoint without the token', async () => {
    expect((await call('/_control/clock', { method: 'POST', body: '{"offsetMs":0}' })).status).toBe(404)
  })

  it('refuses connections for a while and comes back on the same port', async () => {
    const isOpen = () =>
      call('/v1/balance').then(
        (answer) => answer.status === 200,
        () => false,
      )
    await fake.control('refuse-connections', { ms: 700 })
    await expect.poll(isOpen, { timeout: 650 }).toBe(false)
    await expect.poll(isOpen, { timeout: 5000 }).toBe(true)
  })
})
