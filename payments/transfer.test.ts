import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { findTransfers } from './find-transfers'
import { openSellerAccount } from './open-seller-account'
import { freshKey, paidByBuyer, sellerReady, useFake } from './payments-for-tests'
import { readPayment } from './read-payment'
import { refund } from './refund'
import { reverseTransfer } from './reverse-transfer'
import { transfer } from './transfer'

let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake({ openingBalanceCents: 0 })
  useFake(fake)
})
afterAll(() => fake.stop())

function toSeller(accountId: string, amountCents: number, orderId = 'ord_1') {
  return { accountId, orderId, amountCents, description: 'Order settled', idempotencyKey: freshKey() }
}

describe('paying the seller', () => {
  it('waits for the balance: refused under one key, made under the next', async () => {
    const accountId = await sellerReady(fake)
    const early = toSeller(accountId, 500)
    await expect(transfer(early)).rejects.toMatchObject({
      kind: 'insufficient',
      code: 'balance_insufficient',
    })
    await paidByBuyer(fake, { amountCents: 2000 })
    await expect(transfer(early)).rejects.toMatchObject({ kind: 'insufficient' })
    expect(await transfer({ ...early, idempotencyKey: freshKey() })).toMatchObject({
      amountCents: 500,
      accountId,
    })
  })

  it('is refused before onboarding is finished, and after payouts were stopped', async () => {
    await paidByBuyer(fake, { amountCents: 2000 })
    const { accountId } = await openSellerAccount({
      sellerId: 'sel_2',
      email: 'worms@example.org',
      displayName: 'Lee Worms',
      idempotencyKey: freshKey(),
    })
    const refusal = { kind: 'refused', code: 'insufficient_capabilities_for_transfer' }
    await expect(transfer(toSeller(accountId, 100))).rejects.toMatchObject(refusal)
    await fake.control(`onboarding/${accountId}`)
    await transfer(toSeller(accountId, 100))
    await fake.control(`accounts/${accountId}`, { payoutsEnabled: false })
    await expect(transfer(toSeller(accountId, 100))).rejects.toMatchObject(refusal)
  })

  it('settles the worked example to the cent: two charges, one refund, one transfer', async () => {
    const deposit = await paidByBuyer(fake, { amountCents: 1335, orderId: 'ord_60' })
    const balance = await paidByBuyer(fake, { amountCents: 10_055, orderId: 'ord_60' })
    const fees = [await readPayment(deposit), await readPayment(balance)].map(
      (facts) => facts.processorFeeCents,
    )
    expect(fees).toEqual([69, 322])
    await paidByBuyer(fake, { amountCents: 2000 })
    const accountId = await sellerReady(fake)
    await refund({
      paymentIntentId: balance,
      orderId: 'ord_60',
      amountCents: 534,
      idempotencyKey: freshKey(),
    })
    const made = await transfer(toSeller(accountId, 10_568, 'ord_60'))
    expect(await findTransfers('ord_60')).toEqual([made])
    expect(10_568 + 288 + 534).toBe(
      (await readPayment(deposit)).capturedCents + (await readPayment(balance)).capturedCents,
    )
  })

  it('asked for twice under one key moves the money once', async () => {
    await paidByBuyer(fake, { amountCents: 4000, orderId: 'ord_twice' })
    const wanted = toSeller(await sellerReady(fake), 300, 'ord_twice')
    expect(await transfer(wanted)).toEqual(await transfer(wanted))
    expect(await findTransfers('ord_twice')).toHaveLength(1)
  })
})

describe('taking a transfer back', () => {
  it('in part, as far as the seller’s account bears it', async () => {
    await paidByBuyer(fake, { amountCents: 4000, orderId: 'ord_back' })
    const accountId = await sellerReady(fake)
    const { transferId } = await transfer(toSeller(accountId, 1000, 'ord_back'))
    const back = (amountCents: number) =>
      reverseTransfer({ transferId, orderId: 'ord_back', amountCents, idempotencyKey: freshKey() })
    expect(await back(400)).toMatchObject({ amountCents: 400 })
    await expect(back(601)).rejects.toMatchObject({ kind: 'refused' })
    await fake.control(`payouts/${accountId}`, { cents: 500 })
    await expect(back(101)).rejects.toMatchObject({ kind: 'insufficient' })
    await back(100)
    expect((await findTransfers('ord_back'))[0]?.reversedCents).toBe(500)
  })
})
