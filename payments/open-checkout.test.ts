import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { expireCheckout } from './expire-checkout'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { openCheckout, type CheckoutToOpen } from './open-checkout'
import { readCheckout } from './read-checkout'
import { readPayment } from './read-payment'
import { configurePayments } from './stripe'

let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake()
  configurePayments({
    secretKey: 'sk_test_x',
    webhookSecret: 'whsec_x',
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
  })
})
afterAll(() => fake.stop())

const deposit: CheckoutToOpen = {
  orderId: 'ord_7',
  part: 'deposit',
  capture: 'manual',
  amountCents: 1335,
  description: 'Deposit for 60 bluegill',
  successUrl: 'http://platform.test/orders/7?paid={CHECKOUT_SESSION_ID}',
  cancelUrl: 'http://platform.test/orders/7',
  idempotencyKey: 'checkout:1',
}

describe('the hosted payment page of an order', () => {
  it('opens with an address and no payment yet', async () => {
    const opened = await openCheckout(deposit)
    expect(opened.paymentIntentId).toBeNull()
    expect(await readCheckout(opened.sessionId)).toEqual({
      sessionId: opened.sessionId,
      status: 'open',
      url: opened.url,
      amountCents: 1335,
      paymentIntentId: null,
      orderId: 'ord_7',
    })
  })

  it('asked for twice under one key is the same page', async () => {
    expect((await openCheckout(deposit)).sessionId).toBe((await openCheckout(deposit)).sessionId)
  })

  it('refuses one key for two amounts', async () => {
    await expect(openCheckout({ ...deposit, amountCents: 1336 })).rejects.toMatchObject({ kind: 'refused' })
  })

  it('paid by hold, the payment names the order and waits for its capture', async () => {
    const opened = await openCheckout({ ...deposit, idempotencyKey: 'checkout:2' })
    await fake.pay(opened.url, '4242424242424242')
    const page = await readCheckout(opened.sessionId)
    expect(page.status).toBe('completed')
    const payment = await readPayment(String(page.paymentIntentId))
    expect(payment).toMatchObject({
      status: 'authorised',
      amountCents: 1335,
      capturableCents: 1335,
      capturedCents: 0,
      refundedCents: 0,
      processorFeeCents: null,
      orderId: 'ord_7',
    })
    const daysLeft = (Number(payment.captureBefore) - Date.now()) / 86_400_000
    expect(daysLeft).toBeGreaterThan(6.9)
    expect(daysLeft).toBeLessThanOrEqual(7)
  })

  it('paid at once, the money and the processor’s fee are known', async () => {
    const opened = await openCheckout({
      ...deposit,
      part: 'balance',
      capture: 'automatic',
      amountCents: 10_055,
      idempotencyKey: 'checkout:3',
    })
    await fake.pay(opened.url, '4242424242424242')
    const { paymentIntentId } = await readCheckout(opened.sessionId)
    expect(await readPayment(String(paymentIntentId))).toMatchObject({
      status: 'captured',
      capturedCents: 10_055,
      processorFeeCents: 322,
      captureBefore: null,
    })
  })

  it('a declined card leaves the page open and the payment unpaid', async () => {
    const opened = await openCheckout({ ...deposit, idempotencyKey: 'checkout:4' })
    await fake.pay(opened.url, '4000000000000002')
    const page = await readCheckout(opened.sessionId)
    expect(page.status).toBe('open')
    expect(await readPayment(String(page.paymentIntentId))).toMatchObject({
      status: 'unpaid',
      chargeId: null,
    })
  })

  it('closes by itself at the moment given', async () => {
    const closesAt = new Date(Date.now() + 31 * 60_000)
    const opened = await openCheckout({ ...deposit, closesAt, idempotencyKey: 'checkout:5' })
    await fake.control('clock', { offsetMs: 32 * 60_000 })
    expect((await readCheckout(opened.sessionId)).status).toBe('expired')
    await fake.control('clock', { offsetMs: 0 })
  })
})

describe('closing a payment page', () => {
  it('ends it, and a second time changes nothing', async () => {
    const { sessionId } = await openCheckout({ ...deposit, idempotencyKey: 'checkout:6' })
    const nothingPaid = { outcome: 'expired', paymentIntentId: null }
    expect(await expireCheckout({ sessionId, idempotencyKey: 'expire:6' })).toEqual(nothingPaid)
    expect(await expireCheckout({ sessionId, idempotencyKey: 'expire:6' })).toEqual(nothingPaid)
    expect(await expireCheckout({ sessionId, idempotencyKey: 'expire:6 again' })).toEqual(nothingPaid)
  })

  it('says when the buyer was faster', async () => {
    const { sessionId, url } = await openCheckout({ ...deposit, idempotencyKey: 'checkout:7' })
    await fake.pay(url, '4242424242424242')
    const expired = await expireCheckout({ sessionId, idempotencyKey: 'expire:7' })
    expect(expired.outcome).toBe('completed')
    expect((await readPayment(String(expired.paymentIntentId))).status).toBe('authorised')
  })

  it('refuses a page nobody opened', async () => {
    const unknown = expireCheckout({ sessionId: 'cs_test_none', idempotencyKey: 'expire:8' })
    await expect(unknown).rejects.toMatchObject({ kind: 'refused', code: 'resource_missing' })
  })
})
