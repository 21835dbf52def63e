import { createHmac } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import {
  startWebhookCatcher,
  type CaughtWebhook,
  type WebhookCatcher,
} from './fake/webhook-catcher-for-tests'
import { freshKey, paidByBuyer, sellerReady, useFake } from './payments-for-tests'
import { readPayment } from './read-payment'
import { readWebhook, type WebhookEvent } from './read-webhook'
import { refund } from './refund'
import { transfer } from './transfer'

let catcher: WebhookCatcher
let fake: TestFake

beforeAll(async () => {
  catcher = await startWebhookCatcher()
  fake = await startTestFake({ webhookUrl: catcher.url, webhookSecret: 'whsec_ours' })
  useFake(fake)
})
afterAll(async () => {
  await fake.stop()
  await catcher.stop()
})

async function caught(type: string): Promise<CaughtWebhook> {
  await catcher.until((all) => all.some((one) => one.type === type))
  const found = catcher.caught.find((one) => one.type === type)
  if (!found) throw new Error(`no ${type}`)
  return found
}

async function read(type: string): Promise<WebhookEvent> {
  const { rawBody, signature } = await caught(type)
  return readWebhook({ rawBody, signature })
}

describe('a webhook of the processor', () => {
  it('tells order, page and payment of a completed page', async () => {
    const paymentIntentId = await paidByBuyer(fake, {
      amountCents: 1335,
      capture: 'manual',
      orderId: 'ord_w',
    })
    const completed = await read('checkout.session.completed')
    expect(completed).toMatchObject({ orderId: 'ord_w', paymentIntentId, accountId: null })
    expect(completed.objectId).toBe(completed.sessionId)
    expect(completed.id).toMatch(/^evt_/)
    const capturable = await read('payment_intent.amount_capturable_updated')
    expect(capturable).toMatchObject({ objectId: paymentIntentId, orderId: 'ord_w', sessionId: null })
    expect(capturable.chargeId).toMatch(/^ch_/)
  })

  it('tells the payment of a refund and of a dispute, the account of a transfer and of an onboarding', async () => {
    const paymentIntentId = await paidByBuyer(fake, { amountCents: 9000, orderId: 'ord_d' })
    await refund({ paymentIntentId, orderId: 'ord_d', amountCents: 100, idempotencyKey: freshKey() })
    expect(await read('charge.refunded')).toMatchObject({ orderId: 'ord_d', paymentIntentId })
    const { chargeId } = await readPayment(paymentIntentId)
    await fake.control(`disputes/${chargeId}`)
    expect(await read('charge.dispute.created')).toMatchObject({ paymentIntentId, chargeId })
    const accountId = await sellerReady(fake)
    expect(await read('account.updated')).toMatchObject({ objectId: accountId, accountId, orderId: null })
    await transfer({
      accountId,
      orderId: 'ord_d',
      amountCents: 50,
      description: 'Part',
      idempotencyKey: freshKey(),
    })
    expect(await read('transfer.created')).toMatchObject({ accountId, orderId: 'ord_d' })
  })

  it('is refused when a byte, the secret, the age or the signature is not right', async () => {
    const { rawBody, signature } = await caught('checkout.session.completed')
    const sign = (secret: string, sentAtS: number) =>
      `t=${sentAtS},v1=${createHmac('sha256', secret).update(`${sentAtS}.${rawBody.toString()}`).digest('hex')}`
    const nowS = Math.floor(Date.now() / 1000)
    expect(readWebhook({ rawBody, signature: sign('whsec_ours', nowS) }).type).toBe(
      'checkout.session.completed',
    )
    const refused = [
      { rawBody: Buffer.from(rawBody.toString().replace('ord_w', 'ord_x')), signature },
      { rawBody: rawBody.subarray(0, -1), signature },
      { rawBody, signature: sign('whsec_theirs', nowS) },
      { rawBody, signature: sign('whsec_ours', nowS - 301) },
      { rawBody, signature: 't=1,v1=' },
      { rawBody, signature: undefined },
    ]
    for (const one of refused) {
      expect(() => readWebhook(one)).toThrowError(
        expect.objectContaining({ kind: 'refused', code: 'signature' }),
      )
    }
  })
})
