import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { askProcessor } from './ask-processor'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { findRefunds } from './find-refunds'
import { PaymentFailure } from './payment-failure'
import { freshKey, paidByBuyer, useFake } from './payments-for-tests'
import { readPayment } from './read-payment'
import { refund } from './refund'
import { configurePayments } from './stripe'

let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake()
  useFake(fake)
})
afterAll(() => fake.stop())

const match = 'POST /v1/refunds'

async function refundable() {
  const paymentIntentId = await paidByBuyer(fake, { amountCents: 2000 })
  return { paymentIntentId, orderId: 'ord_1', amountCents: 700, idempotencyKey: freshKey() }
}

describe('what can go wrong between us and the processor', () => {
  it('a decline is `declined`, with the bank’s reason beside it', async () => {
    const params = {
      amount: 900,
      currency: 'usd',
      payment_method: 'pm_card_chargeDeclinedInsufficientFunds',
      confirm: true,
    }
    const declined = askProcessor((stripe) => stripe.paymentIntents.create(params))
    await expect(declined).rejects.toMatchObject({
      kind: 'declined',
      code: 'card_declined',
      declineCode: 'insufficient_funds',
      httpStatus: 402,
    })
    await expect(declined).rejects.toBeInstanceOf(PaymentFailure)
  })

  it.each(['fail', 'rate-limit'])('%s is `away`, and the same key works afterwards', async (kind) => {
    const wanted = await refundable()
    await fake.control('faults', { kind, match })
    await expect(refund(wanted)).rejects.toMatchObject({ kind: 'away' })
    expect(await refund(wanted)).toMatchObject({ amountCents: 700, status: 'succeeded' })
  })

  it('a reply lost once is fetched again by the SDK itself; lost twice it is `away`, though done', async () => {
    const once = await refundable()
    await fake.control('faults', { kind: 'lost-reply', match })
    expect(await refund(once)).toMatchObject({ amountCents: 700 })
    expect(await findRefunds(once.paymentIntentId)).toHaveLength(1)

    const twice = await refundable()
    await fake.control('faults', { kind: 'lost-reply', match, times: 2 })
    await expect(refund(twice)).rejects.toMatchObject({ kind: 'away' })
    const [found] = await findRefunds(twice.paymentIntentId)
    expect(found?.actKey).toBe(twice.idempotencyKey)
    expect(await refund(twice)).toEqual(found)
    expect((await readPayment(twice.paymentIntentId)).refundedCents).toBe(700)
  })

  it('an answer slower than four seconds is `away`', async () => {
    const wanted = await refundable()
    await fake.control('faults', { kind: 'slow-reply', ms: 8000, match })
    const askedAt = Date.now()
    await expect(refund(wanted)).rejects.toMatchObject({ kind: 'away' })
    expect(Date.now() - askedAt).toBeLessThan(7000)
  })

  it('nobody at the door is `away`', async () => {
    configurePayments({
      secretKey: 'sk_test_x',
      webhookSecret: 'whsec_x',
      host: '127.0.0.1',
      port: 9,
      protocol: 'http',
    })
    await expect(readPayment('pi_any')).rejects.toMatchObject({ kind: 'away', httpStatus: null })
    useFake(fake)
  })

  it('a key of the wrong kind is `refused`', async () => {
    configurePayments({
      secretKey: 'sk_live_x',
      webhookSecret: 'whsec_x',
      host: '127.0.0.1',
      port: fake.port,
      protocol: 'http',
    })
    await expect(readPayment('pi_any')).rejects.toMatchObject({ kind: 'refused', httpStatus: 401 })
    useFake(fake)
  })

  it('a slip of our own is `unknown`', async () => {
    const slip = askProcessor(() => Promise.reject(new TypeError('slip')))
    await expect(slip).rejects.toMatchObject({ kind: 'unknown', message: 'slip' })
  })
})
