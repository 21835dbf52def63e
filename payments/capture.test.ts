import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { capture } from './capture'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { freshKey, paidByBuyer, useFake } from './payments-for-tests'
import { readPayment } from './read-payment'
import { voidAuthorisation } from './void-authorisation'

const DAY_MS = 86_400_000
let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake()
  useFake(fake)
})
afterAll(() => fake.stop())

const held = () => paidByBuyer(fake, { amountCents: 1335, capture: 'manual' })

describe('capturing a deposit', () => {
  it('takes the whole hold and tells the charge and the fee', async () => {
    const paymentIntentId = await held()
    const captured = await capture({ paymentIntentId, idempotencyKey: freshKey() })
    expect(captured).toMatchObject({ capturedCents: 1335, processorFeeCents: 69 })
    expect(captured.chargeId).toMatch(/^ch_/)
  })

  it('done before, under this key or another, tells the same facts', async () => {
    const paymentIntentId = await held()
    const idempotencyKey = freshKey()
    const first = await capture({ paymentIntentId, idempotencyKey })
    expect(await capture({ paymentIntentId, idempotencyKey })).toEqual(first)
    expect(await capture({ paymentIntentId, idempotencyKey: freshKey() })).toEqual(first)
  })

  it('works on the sixth day and has lapsed after the seventh', async () => {
    const early = await held()
    const late = await held()
    await fake.control('clock', { offsetMs: 6 * DAY_MS })
    expect(await capture({ paymentIntentId: early, idempotencyKey: freshKey() })).toMatchObject({
      capturedCents: 1335,
    })
    await fake.control('clock', { offsetMs: 7 * DAY_MS + 5000 })
    const tooLate = capture({ paymentIntentId: late, idempotencyKey: freshKey() })
    await expect(tooLate).rejects.toMatchObject({ kind: 'lapsed', paymentStatus: 'canceled' })
    expect(await readPayment(late)).toMatchObject({
      status: 'cancelled',
      hasLapsed: true,
      captureBefore: null,
    })
    await fake.control('clock', { offsetMs: 0 })
  })

  it('is refused for a payment nobody made', async () => {
    const unknown = capture({ paymentIntentId: 'pi_none', idempotencyKey: freshKey() })
    await expect(unknown).rejects.toMatchObject({ kind: 'refused', httpStatus: 404 })
  })
})

describe('giving a hold back', () => {
  it('ends the payment without taking a cent, and again changes nothing', async () => {
    const paymentIntentId = await held()
    await voidAuthorisation({ paymentIntentId, idempotencyKey: freshKey() })
    await voidAuthorisation({ paymentIntentId, idempotencyKey: freshKey() })
    expect(await readPayment(paymentIntentId)).toMatchObject({
      status: 'cancelled',
      hasLapsed: false,
      capturedCents: 0,
      refundedCents: 0,
      processorFeeCents: null,
    })
    const tooLate = capture({ paymentIntentId, idempotencyKey: freshKey() })
    await expect(tooLate).rejects.toMatchObject({ kind: 'lapsed' })
  })

  it('is refused once the money was taken', async () => {
    const paymentIntentId = await held()
    await capture({ paymentIntentId, idempotencyKey: freshKey() })
    const tooLate = voidAuthorisation({ paymentIntentId, idempotencyKey: freshKey() })
    await expect(tooLate).rejects.toMatchObject({ kind: 'refused', paymentStatus: 'succeeded' })
  })
})
