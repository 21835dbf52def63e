import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { askProcessor } from '@/payments/ask-processor'
import { capture } from '@/payments/capture'
import { expireCheckout } from '@/payments/expire-checkout'
import { startTestFake, type TestFake } from '@/payments/fake/fake-for-tests'
import { startRecorder, type RecordedAnswer, type Recorder } from '@/payments/fake/recorder-for-tests'
import { endpoints } from '@/payments/fake/routes/endpoints'
import { testCards } from '@/payments/fake/test-cards.facts'
import { startWebhookCatcher, type WebhookCatcher } from '@/payments/fake/webhook-catcher-for-tests'
import { findRefunds } from '@/payments/find-refunds'
import { findTransfers } from '@/payments/find-transfers'
import { openCheckout } from '@/payments/open-checkout'
import { freshKey, paidByBuyer, sellerReady } from '@/payments/payments-for-tests'
import { readCheckout } from '@/payments/read-checkout'
import { readPayment } from '@/payments/read-payment'
import { readRefund } from '@/payments/read-refund'
import { readSellerAccount } from '@/payments/read-seller-account'
import { refund } from '@/payments/refund'
import { reverseTransfer } from '@/payments/reverse-transfer'
import { configurePayments } from '@/payments/stripe'
import { transfer } from '@/payments/transfer'
import { voidAuthorisation } from '@/payments/void-authorisation'
import { faultsIn, knowsParameter, objectNames, requiredFields } from './processor-description'

const DAY_MS = 86_400_000
const OPENING_CENTS = 100_000

let catcher: WebhookCatcher
let fake: TestFake
let recorder: Recorder

beforeAll(async () => {
  catcher = await startWebhookCatcher()
  fake = await startTestFake({
    openingBalanceCents: OPENING_CENTS,
    webhookUrl: catcher.url,
    webhookSecret: 'whsec_r',
  })
  recorder = await startRecorder(fake.port)
  configurePayments({
    secretKey: 'sk_test_x',
    webhookSecret: 'whsec_r',
    host: '127.0.0.1',
    port: recorder.port,
    protocol: 'http',
  })
})
afterAll(async () => {
  await fake.stop()
  await recorder.stop()
  await catcher.stop()
})

async function availableCents(): Promise<number> {
  const balance = await askProcessor((stripe) => stripe.balance.retrieve())
  return balance.available[0]?.amount ?? Number.NaN
}

function toSeller(accountId: string, amountCents: number, orderId = 'ord_1') {
  return { accountId, orderId, amountCents, description: 'Order settled', idempotencyKey: freshKey() }
}

function back(paymentIntentId: string, amountCents: number) {
  return refund({ paymentIntentId, orderId: 'ord_1', amountCents, idempotencyKey: freshKey() })
}

// Facts about cards that shape deposits. Sources, read in part: docs.stripe.com pages on holds, extended
// authorisations, separate charges and transfers, transfer reversals, refunds, disputes, decline codes and testing.
// Two facts of the set move nothing here and are not asserted: how long manual payouts may wait in a connected account
// (up to 2 years in the US), and that ring-fenced funds are a private preview.

describe('a hold on a card (docs.stripe.com: place a hold on a payment method)', () => {
  it('lives 7 days and says until when it may be captured', async () => {
    const askedAtS = Math.floor(Date.now() / 1000)
    const { captureBefore } = await readPayment(
      await paidByBuyer(fake, { amountCents: 1335, capture: 'manual' }),
    )
    const livesS = Number(captureBefore) / 1000 - askedAtS
    expect(livesS).toBeGreaterThanOrEqual(7 * 86_400)
    expect(livesS).toBeLessThan(7 * 86_400 + 10)
  })

  it('is cancelled by itself after that, and an event says so', async () => {
    const id = await paidByBuyer(fake, { amountCents: 1335, capture: 'manual' })
    await fake.control('clock', { offsetMs: 7 * DAY_MS + 2000 })
    expect(await readPayment(id)).toMatchObject({ status: 'cancelled', hasLapsed: true, capturedCents: 0 })
    await catcher.until((caught) =>
      caught.some((one) => one.type === 'payment_intent.canceled' && one.rawBody.includes(id)),
    )
    const tooLate = capture({ paymentIntentId: id, idempotencyKey: freshKey() })
    await expect(tooLate).rejects.toMatchObject({ kind: 'lapsed' })
    await fake.control('clock', { offsetMs: 0 })
  })

  it('is captured for less or in full, never for more; the rest is released', async () => {
    const less = await paidByBuyer(fake, { amountCents: 1000, capture: 'manual' })
    const partly = await askProcessor((stripe) =>
      stripe.paymentIntents.capture(less, { amount_to_capture: 400 }),
    )
    expect(partly).toMatchObject({ status: 'succeeded', amount_received: 400, amount_capturable: 0 })
    const more = await paidByBuyer(fake, { amountCents: 1000, capture: 'manual' })
    const greedy = askProcessor((stripe) => stripe.paymentIntents.capture(more, { amount_to_capture: 1001 }))
    await expect(greedy).rejects.toMatchObject({ kind: 'refused', code: 'amount_too_large' })
    await voidAuthorisation({ paymentIntentId: more, idempotencyKey: freshKey() })
  })
})

describe('separate charges and transfers (docs.stripe.com: connect, separate charges and transfers)', () => {
  it('one charge feeds any number of transfers, later', async () => {
    await paidByBuyer(fake, { amountCents: 9000, orderId: 'ord_two' })
    const [one, other] = [await sellerReady(fake), await sellerReady(fake)]
    await transfer(toSeller(one, 3000, 'ord_two'))
    await transfer(toSeller(other, 2000, 'ord_two'))
    await transfer(toSeller(one, 1000, 'ord_two'))
    expect((await findTransfers('ord_two')).map((made) => made.amountCents)).toEqual([1000, 2000, 3000])
  })

  it('the platform’s balance pays fees, refunds and disputes', async () => {
    const before = await availableCents()
    const id = await paidByBuyer(fake, { amountCents: 10_000 })
    expect(await availableCents()).toBe(before + 10_000 - 320)
    await back(id, 2500)
    expect(await availableCents()).toBe(before + 10_000 - 320 - 2500)
    const { chargeId } = await readPayment(id)
    await fake.control(`disputes/${chargeId}`)
    // 1,500 c: the fee for a dispute, from memory.
    expect(await availableCents()).toBe(before - 320 - 1500)
    expect((await readPayment(id)).isDisputed).toBe(true)
  })

  it('a transfer larger than the available balance is refused (from memory: balance_insufficient)', async () => {
    const tooMuch = transfer(toSeller(await sellerReady(fake), 99_000_000))
    await expect(tooMuch).rejects.toMatchObject({
      kind: 'insufficient',
      code: 'balance_insufficient',
      httpStatus: 400,
    })
  })
})

describe('transfer reversals (docs.stripe.com: api, transfer reversals)', () => {
  it('take back all or part, only as far as the connected account holds it', async () => {
    const accountId = await sellerReady(fake)
    const { transferId } = await transfer(toSeller(accountId, 900))
    const reverse = (amountCents: number) =>
      reverseTransfer({ transferId, orderId: 'ord_1', amountCents, idempotencyKey: freshKey() })
    await reverse(300)
    await fake.control(`payouts/${accountId}`, { cents: 350 })
    await expect(reverse(251)).rejects.toMatchObject({ kind: 'insufficient' })
    expect((await reverse(250)).amountCents).toBe(250)
  })
})

describe('refunds (docs.stripe.com: refunds)', () => {
  it('go back in several parts, never above the charge', async () => {
    const id = await paidByBuyer(fake, { amountCents: 1335 })
    await back(id, 500)
    await back(id, 500)
    await expect(back(id, 336)).rejects.toMatchObject({ kind: 'refused' })
    await back(id, 335)
    expect((await findRefunds(id)).map((made) => made.amountCents)).toEqual([335, 500, 500])
  })

  it('go to the card that paid: there is no way to name another', async () => {
    const id = await paidByBuyer(fake, { amountCents: 1335 })
    const elsewhere = askProcessor((stripe) =>
      stripe.rawRequest('POST', '/v1/refunds', { payment_intent: id, destination: 'card_other' }),
    )
    await expect(elsewhere).rejects.toMatchObject({ kind: 'refused', code: 'parameter_unknown' })
  })

  it('may wait as pending for insufficient_funds, so a refund is a state', async () => {
    const id = await paidByBuyer(fake, { amountCents: 5000 })
    await transfer(toSeller(await sellerReady(fake), await availableCents()))
    const waiting = await back(id, 5000)
    expect(waiting.status).toBe('pending')
    const raw = await askProcessor((stripe) => stripe.refunds.retrieve(waiting.refundId))
    expect(raw).toMatchObject({ status: 'pending', pending_reason: 'insufficient_funds' })
    await paidByBuyer(fake, { amountCents: 200_000 })
    await expect
      .poll(() => readRefund(waiting.refundId), { timeout: 4000 })
      .toMatchObject({ status: 'succeeded' })
    await catcher.until((caught) => caught.some((one) => one.type === 'refund.updated'))
  })

  it('do not bring the processor’s fee back (from memory)', async () => {
    const id = await paidByBuyer(fake, { amountCents: 11_390 })
    const before = await readPayment(id)
    const balance = await availableCents()
    await back(id, 11_390)
    expect(before.processorFeeCents).toBe(360)
    expect((await readPayment(id)).processorFeeCents).toBe(360)
    expect(await availableCents()).toBe(balance - 11_390)
  })
})

describe('disputes (docs.stripe.com: disputes)', () => {
  it('are not possible on a charge refunded in full', async () => {
    const id = await paidByBuyer(fake, { amountCents: 1335 })
    await back(id, 1335)
    const { chargeId } = await readPayment(id)
    await expect(fake.control(`disputes/${chargeId}`)).rejects.toThrow('not refunded in full')
  })

  it('open, they stop every refund; won, the money is back and the fee is not', async () => {
    const id = await paidByBuyer(fake, { amountCents: 4000 })
    const before = await availableCents()
    const { chargeId } = await readPayment(id)
    const dispute = await fake.control(`disputes/${chargeId}`)
    await expect(back(id, 1)).rejects.toMatchObject({ kind: 'refused', code: 'charge_disputed' })
    await fake.control(`dispute-outcomes/${String(dispute.id)}`, { outcome: 'won' })
    expect(await availableCents()).toBe(before - 1500)
    const read = await askProcessor((stripe) => stripe.disputes.retrieve(String(dispute.id)))
    expect(read.status).toBe('won')
    await catcher.until((caught) => caught.some((one) => one.type === 'charge.dispute.closed'))
  })
})

describe('the processor’s fee (US card pricing, from memory: 2.9 % + 30 c)', () => {
  it.each([
    [688, 50],
    [1335, 69],
    [10_055, 322],
    [11_390, 360],
  ])('on %i c is %i c', async (amountCents, feeCents) => {
    expect((await readPayment(await paidByBuyer(fake, { amountCents }))).processorFeeCents).toBe(feeCents)
  })
})

describe('test cards (docs.stripe.com: testing; declines, codes)', () => {
  // The two 3-D Secure numbers are from memory; the practice page's own test clicks through them.
  const declines = [
    {
      number: '4000000000000002',
      code: 'card_declined',
      reason: 'generic_decline',
      words: 'Your card was declined.',
    },
    {
      number: '4000000000009995',
      code: 'card_declined',
      reason: 'insufficient_funds',
      words: 'insufficient funds',
    },
    {
      number: '4000000000009987',
      code: 'card_declined',
      reason: 'lost_card',
      words: 'Your card was declined.',
    },
    {
      number: '4000000000009979',
      code: 'card_declined',
      reason: 'stolen_card',
      words: 'Your card was declined.',
    },
    { number: '4000000000000069', code: 'expired_card', reason: undefined, words: 'Your card has expired.' },
    {
      number: '4000000000000127',
      code: 'incorrect_cvc',
      reason: undefined,
      words: 'security code is incorrect',
    },
    {
      number: '4000000000000119',
      code: 'processing_error',
      reason: undefined,
      words: 'could not be processed',
    },
    { number: '4242424242424241', code: 'incorrect_number', reason: undefined, words: 'number is incorrect' },
  ]

  it.each(declines)('$number is refused as $code, $reason', async ({ number, code, reason, words }) => {
    const opened = await openCheckout({
      orderId: 'ord_c',
      part: 'deposit',
      capture: 'manual',
      amountCents: 1335,
      description: 'Deposit',
      successUrl: 'http://platform.test/',
      cancelUrl: 'http://platform.test/',
      idempotencyKey: freshKey(),
    })
    const page = await fake.pay(opened.url, number)
    expect(page.status).toBe(402)
    expect(page.text).toContain(words)
    expect(page.text).not.toContain(reason ?? code)
    const { paymentIntentId } = await readCheckout(opened.sessionId)
    const payment = await askProcessor((stripe) => stripe.paymentIntents.retrieve(String(paymentIntentId)))
    expect(payment.status).toBe('requires_payment_method')
    expect(payment.last_payment_error?.code).toBe(code)
    expect(payment.last_payment_error?.decline_code).toBe(reason)
  })

  it('lost and stolen read to the buyer like any other decline', () => {
    const wordsFor = (reason: string) => declines.find((row) => row.reason === reason)?.words
    expect(wordsFor('lost_card')).toBe(wordsFor('generic_decline'))
    expect(wordsFor('stolen_card')).toBe(wordsFor('generic_decline'))
  })

  it('none is left untried', () => {
    const tried = [...declines.map((row) => row.number), '4242424242424242', '4000000000000259']
    const challenged = ['4000002760003184', '4000008400001629']
    expect(testCards.map((card) => card.number).sort()).toEqual([...tried, ...challenged].sort())
  })

  it('4000000000000259 goes through and is disputed', async () => {
    const id = await paidByBuyer(fake, { amountCents: 2000, card: '4000000000000259' })
    expect(await readPayment(id)).toMatchObject({ status: 'captured', isDisputed: true })
  })
})

interface Told {
  from: string
  answer: RecordedAnswer
}

/** Every object that came back, those inside a list one by one. */
function everythingTold(): Told[] {
  return recorder.recorded.flatMap(({ method, path, status, answer }) => {
    const from = `${status} ${method} ${path}`
    const inside: RecordedAnswer[] =
      answer.object === 'list' && Array.isArray(answer.data) ? answer.data : [answer]
    return inside.map((one) => ({ from, answer: one }))
  })
}

function without(answer: RecordedAnswer, field: string): RecordedAnswer {
  return Object.fromEntries(Object.entries(answer).filter(([key]) => key !== field))
}

describe('every answer used, against the published OpenAPI description', () => {
  beforeAll(async () => {
    const session = await openCheckout({
      orderId: 'ord_x',
      part: 'balance',
      capture: 'automatic',
      amountCents: 700,
      description: 'Balance',
      buyerEmail: 'buyer@example.org',
      closesAt: new Date(Date.now() + 40 * 60_000),
      successUrl: 'http://platform.test/',
      cancelUrl: 'http://platform.test/',
      idempotencyKey: freshKey(),
    })
    await expireCheckout({ sessionId: session.sessionId, idempotencyKey: freshKey() })
    const held = await paidByBuyer(fake, { amountCents: 900, capture: 'manual' })
    await capture({ paymentIntentId: held, idempotencyKey: freshKey() })
    await readSellerAccount(await sellerReady(fake))
    await askProcessor((stripe) => stripe.events.list({ limit: 100 }))
    await askProcessor((stripe) => stripe.balanceTransactions.list({ limit: 100 }))
    await askProcessor((stripe) => stripe.charges.list({ limit: 100, expand: ['data.refunds'] }))
    await askProcessor((stripe) => stripe.paymentIntents.list({ limit: 100 }))
    await askProcessor((stripe) =>
      stripe.checkout.sessions.list({ limit: 100, expand: ['data.payment_intent'] }),
    )
  })

  it('fits it, for every kind of object', () => {
    const told = everythingTold()
    const wrong = told.flatMap(({ from, answer }) => faultsIn(answer).map((fault) => `${from}: ${fault}`))
    expect(wrong).toEqual([])
    const kinds = new Set(told.map(({ answer }) => answer.object ?? 'error'))
    expect([...kinds].sort()).toEqual([...objectNames, 'error'].sort())
  })

  it('fits it, for every webhook and the object in it', () => {
    const events: { data: { object: RecordedAnswer } }[] = catcher.caught.map((one) =>
      JSON.parse(one.rawBody.toString()),
    )
    expect(events.length).toBeGreaterThan(20)
    expect(events.flatMap((event) => [...faultsIn(event, 'event'), ...faultsIn(event.data.object)])).toEqual(
      [],
    )
  })

  it('a changed answer is caught: a required field gone, an amount as text, a state nobody knows', () => {
    const mutants: { name: string; answer: object }[] = []
    for (const { answer } of everythingTold()) {
      const name = answer.object
      if (name === undefined) continue
      for (const field of requiredFields(name)) mutants.push({ name, answer: without(answer, field) })
      if ('amount' in answer) mutants.push({ name, answer: { ...answer, amount: '1335' } })
      if (name === 'payment_intent' || name === 'checkout.session') {
        mutants.push({ name, answer: { ...answer, status: 'held' } })
      }
    }
    expect(mutants.length).toBeGreaterThan(1000)
    expect(mutants.filter(({ name, answer }) => faultsIn(answer, name).length === 0)).toEqual([])
  })
})

describe('every parameter sent and taken, against the published OpenAPI description', () => {
  // In the SDK's types of API version 2026-10-28, not yet in the description of 2025-10.
  const newer = ['allowed_payment_method_types', 'controller']
  const isNewer = (name: string) => newer.some((one) => name === one || name.startsWith(`${one}[`))

  it('whatever we send is known to it, or newer by name', () => {
    const unknown: string[] = []
    let checked = 0
    for (const { method, path, requestBody, answer } of recorder.recorded) {
      if (method !== 'POST' || answer.error?.code === 'parameter_unknown') continue
      for (const name of new URLSearchParams(requestBody).keys()) {
        checked += 1
        if (!isNewer(name) && knowsParameter(path, name) === false) unknown.push(`${path} ${name}`)
      }
    }
    expect(checked).toBeGreaterThan(200)
    expect(unknown).toEqual([])
  })

  it('whatever the practice processor takes is known to it, or newer by name', () => {
    const taken = endpoints
      .filter(
        ({ method, path }) =>
          method === 'POST' && knowsParameter(path.replace(':id', 'x'), 'expand') !== null,
      )
      .map(({ path, accepts }) => ({ path: path.replace(':id', 'x'), names: Object.keys(accepts) }))
    expect(taken).toHaveLength(11)
    const unknown = taken.flatMap(({ path, names }) =>
      names.filter((name) => !isNewer(name) && !knowsParameter(path, name)).map((name) => `${path} ${name}`),
    )
    expect(unknown).toEqual([])
  })

  it('a misspelt parameter is caught', () => {
    expect(knowsParameter('/v1/checkout/sessions', 'line_items[0][price_data][unit_amount]')).toBe(true)
    expect(knowsParameter('/v1/checkout/sessions', 'line_items[0][price_data][unit_amnt]')).toBe(false)
    expect(knowsParameter('/v1/refunds', 'destination')).toBe(false)
  })
})
