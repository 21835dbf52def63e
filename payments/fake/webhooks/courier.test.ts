import Stripe from 'stripe'
import { afterEach, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from '../fake-for-tests'
import { startWebhookCatcher, type WebhookCatcher } from '../webhook-catcher-for-tests'
import { gapMs } from './courier'

const open: { stop(): Promise<void> }[] = []
afterEach(async () => {
  for (const one of open.splice(0)) await one.stop()
})

async function start(): Promise<{ fake: TestFake; catcher: WebhookCatcher; stripe: Stripe }> {
  const catcher = await startWebhookCatcher()
  const fake = await startTestFake({ webhookUrl: catcher.url, webhookSecret: 'whsec_test' })
  open.push(catcher, fake)
  const stripe = new Stripe('sk_test_x', {
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
    telemetry: false,
  })
  return { fake, catcher, stripe }
}

const payment = { amount: 1335, currency: 'usd', payment_method: 'pm_card_visa', confirm: true }

describe('webhooks of the practice processor', () => {
  it('are signed so that the unchanged SDK accepts them, and nothing else', async () => {
    const { catcher, stripe } = await start()
    const made = await stripe.paymentIntents.create(payment, { idempotencyKey: 'key-1' })
    await catcher.until((caught) => caught.length === 1)
    const { rawBody, signature } = catcher.first()
    const event = stripe.webhooks.constructEvent(rawBody, signature, 'whsec_test')
    expect(event).toMatchObject({
      type: 'payment_intent.succeeded',
      request: { idempotency_key: 'key-1' },
      data: { object: { id: made.id, status: 'succeeded' } },
    })
    expect(() => stripe.webhooks.constructEvent(rawBody, signature, 'whsec_other')).toThrow()
    const tampered = Buffer.from(rawBody.toString().replace('1335', '1336'))
    expect(() => stripe.webhooks.constructEvent(tampered, signature, 'whsec_test')).toThrow()
  })

  it('are sent again until they are answered 2xx, then never more', async () => {
    const { fake, catcher, stripe } = await start()
    catcher.answerWith(500)
    await stripe.paymentIntents.create(payment)
    await catcher.until((caught) => caught.length >= 2)
    catcher.answerWith(200)
    const failed = catcher.caught.length
    await catcher.until((caught) => caught.length > failed)
    const acknowledged = catcher.caught.length
    await new Promise((resolve) => setTimeout(resolve, 300))
    expect(catcher.caught.length).toBe(acknowledged)
    expect(new Set(catcher.caught.map((one) => one.id)).size).toBe(1)
    expect(await fetchState(fake)).toMatchObject({ waitingWebhooks: 0 })
  })

  it('wait longer from try to try, never more than ten minutes', () => {
    expect([1, 2, 3, 4].map((attempts) => gapMs(1000, attempts))).toEqual([1000, 2000, 4000, 8000])
    expect(gapMs(1000, 40)).toBe(600_000)
  })

  it('can be sent twice, and lost on the way, when a test asks for it', async () => {
    const { fake, catcher, stripe } = await start()
    await fake.control('webhooks', { duplicateNext: 1 })
    await stripe.paymentIntents.create(payment)
    await catcher.until((caught) => caught.length === 2)
    expect(catcher.caught[0]?.id).toBe(catcher.caught[1]?.id)
    await fake.control('webhooks', { loseNext: 1 })
    await stripe.paymentIntents.create(payment)
    await catcher.until((caught) => caught.length === 3)
  })

  it('held back, they go out once they are let go', async () => {
    const { fake, catcher, stripe } = await start()
    await fake.control('webhooks', { held: true })
    await stripe.paymentIntents.create(payment)
    await new Promise((resolve) => setTimeout(resolve, 100))
    expect(catcher.caught).toHaveLength(0)
    await fake.control('webhooks', { held: false })
    await catcher.until((caught) => caught.length === 1)
  })
})

async function fetchState(fake: TestFake): Promise<unknown> {
  const response = await fetch(`${fake.origin}/_control/state`, {
    headers: { 'x-control-token': fake.settings.controlToken ?? '' },
  })
  return response.json()
}
