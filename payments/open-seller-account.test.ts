import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from './fake/fake-for-tests'
import { openOnboarding } from './open-onboarding'
import { openSellerAccount } from './open-seller-account'
import { freshKey, useFake } from './payments-for-tests'
import { readSellerAccount } from './read-seller-account'

let fake: TestFake

beforeAll(async () => {
  fake = await startTestFake()
  useFake(fake)
})
afterAll(() => fake.stop())

async function newSeller(): Promise<string> {
  const wanted = { sellerId: 'sel_9', email: 'hatchery@example.org', displayName: 'Marsh Hatchery' }
  return (await openSellerAccount({ ...wanted, idempotencyKey: freshKey() })).accountId
}

function onboarding(accountId: string) {
  return openOnboarding({
    accountId,
    returnUrl: 'http://platform.test/back',
    refreshUrl: 'http://platform.test/again',
    idempotencyKey: freshKey(),
  })
}

describe('a seller’s account at the processor', () => {
  it('new, it may not receive and says what is due', async () => {
    const facts = await readSellerAccount(await newSeller())
    expect(facts).toMatchObject({
      detailsSubmitted: false,
      chargesEnabled: false,
      payoutsEnabled: false,
      mayReceive: false,
    })
    expect(facts.due).not.toHaveLength(0)
    expect(facts.disabledReason).not.toBeNull()
  })

  it('after onboarding it may receive; left for later it may not', async () => {
    const done = await newSeller()
    await fake.submit((await onboarding(done)).url, { choice: 'finish' })
    expect(await readSellerAccount(done)).toEqual({
      accountId: done,
      detailsSubmitted: true,
      chargesEnabled: true,
      payoutsEnabled: true,
      mayReceive: true,
      due: [],
      disabledReason: null,
    })
    const later = await newSeller()
    await fake.submit((await onboarding(later)).url, { choice: 'later' })
    expect((await readSellerAccount(later)).mayReceive).toBe(false)
  })

  it('stopped by the processor, it says so', async () => {
    const accountId = await newSeller()
    await fake.submit((await onboarding(accountId)).url, { choice: 'finish' })
    await fake.control(`accounts/${accountId}`, { payoutsEnabled: false })
    expect(await readSellerAccount(accountId)).toMatchObject({
      mayReceive: false,
      disabledReason: 'under_review',
    })
  })

  it('opens a link that ends within minutes', async () => {
    const { expiresAt } = await onboarding(await newSeller())
    expect(expiresAt.getTime()).toBeLessThan(Date.now() + 10 * 60_000)
  })
})
