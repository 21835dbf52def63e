import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { findRefunds } from './find-refunds'
import { freshKey, paidByBuyer, sellerReady, useFake } from './payments-for-tests'
import { readPayment } from './read-payment'
import { readRefund } from './read-refund'
import { refund } from './refund'
import { transfer } from './transfer'

let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake({ openingBalanceCents: 1000 })
  useFake(fake)
})
afterAll(() => fake.stop())

describe('refunding a charge', () => {
  it('in parts, until nothing is left, and never a cent more', async () => {
    const paymentIntentId = await paidByBuyer(fake, { amountCents: 5340 })
    const part = (amountCents: number) =>
      refund({ paymentIntentId, orderId: 'ord_1', amountCents, idempotencyKey: freshKey() })
    expect(await part(534)).toMatchObject({ amountCents: 534, status: 'succeeded' })
    await expect(part(4807)).rejects.toMatchObject({ kind: 'refused' })
    await part(4806)
    await expect(part(1)).rejects.toMatchObject({ kind: 'refused', code: 'charge_already_refunded' })
    expect(await readPayment(paymentIntentId)).toMatchObject({ capturedCents: 5340, refundedCents: 5340 })
  })

  it('asked for twice under one key is one refund, found again by its key', async () => {
    const paymentIntentId = await paidByBuyer(fake, { amountCents: 5340 })
    const wanted = { paymentIntentId, orderId: 'ord_1', amountCents: 100, idempotencyKey: freshKey() }
    const first = await refund(wanted)
    expect(await refund(wanted)).toEqual(first)
    expect(await findRefunds(paymentIntentId)).toEqual([first])
    expect(first.actKey).toBe(wanted.idempotencyKey)
    expect((await readPayment(paymentIntentId)).refundedCents).toBe(100)
  })

  it('of a hold is refused: a hold is given back instead', async () => {
    const paymentIntentId = await paidByBuyer(fake, { amountCents: 5340, capture: 'manual' })
    const wanted = refund({ paymentIntentId, orderId: 'ord_1', amountCents: 100, idempotencyKey: freshKey() })
    await expect(wanted).rejects.toMatchObject({ kind: 'refused' })
  })

  it('waits while the platform’s balance is too small, and is paid once money comes in', async () => {
    const paymentIntentId = await paidByBuyer(fake, { amountCents: 20_000 })
    const response = await fetch(`${fake.origin}/_control/state`, {
      headers: { 'x-control-token': 'control-for-tests' },
    })
    const { availableCents }: { availableCents: number } = await response.json()
    const accountId = await sellerReady(fake)
    await transfer({
      accountId,
      orderId: 'ord_1',
      amountCents: availableCents,
      description: 'All of it',
      idempotencyKey: freshKey(),
    })
    const waiting = await refund({
      paymentIntentId,
      orderId: 'ord_1',
      amountCents: 20_000,
      idempotencyKey: freshKey(),
    })
    expect(waiting.status).toBe('pending')
    await paidByBuyer(fake, { amountCents: 30_000 })
    await expect
      .poll(() => readRefund(waiting.refundId), { timeout: 4000 })
      .toMatchObject({ status: 'succeeded' })
  })
})
