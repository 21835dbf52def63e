import Stripe from 'stripe'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from '../fake-for-tests'

let fake: TestFake
let stripe: Stripe

beforeAll(async () => {
  fake = await startTestFake()
  stripe = new Stripe('sk_test_x', { host: '127.0.0.1', port: fake.port, protocol: 'http', telemetry: false })
})
afterAll(() => fake.stop())

async function openLink(): Promise<{ accountId: string; url: string }> {
  const account = await stripe.accounts.create({
    controller: { stripe_dashboard: { type: 'express' } },
    capabilities: { transfers: { requested: true } },
    email: 'grower@example.org',
  })
  const link = await stripe.accountLinks.create({
    account: account.id,
    type: 'account_onboarding',
    return_url: 'http://platform.test/back',
    refresh_url: 'http://platform.test/again',
  })
  return { accountId: account.id, url: link.url }
}

describe('the practice onboarding page', () => {
  it('finished, the account may charge, be paid and receive transfers', async () => {
    const { accountId, url } = await openLink()
    expect(await (await fetch(url)).text()).toContain('grower@example.org')
    expect((await fake.submit(url, { choice: 'finish' })).next).toBe('http://platform.test/back')
    expect(await stripe.accounts.retrieve(accountId)).toMatchObject({
      charges_enabled: true,
      payouts_enabled: true,
      details_submitted: true,
      capabilities: { transfers: 'active' },
      requirements: { currently_due: [], disabled_reason: null },
    })
  })

  it('left for later, the account stays incomplete and says what is due', async () => {
    const { accountId, url } = await openLink()
    expect((await fake.submit(url, { choice: 'later' })).next).toBe('http://platform.test/back')
    const account = await stripe.accounts.retrieve(accountId)
    expect(account).toMatchObject({
      charges_enabled: false,
      payouts_enabled: false,
      details_submitted: false,
    })
    expect(account.requirements?.currently_due).toContain('external_account')
  })

  it('a link used or too old leads to where a new one is made', async () => {
    const used = await openLink()
    await fake.submit(used.url, { choice: 'later' })
    expect((await fake.submit(used.url, { choice: 'finish' })).next).toBe('http://platform.test/again')
    const old = await openLink()
    await fake.control('clock', { offsetMs: 10 * 60_000 })
    const visit = await fetch(old.url, { redirect: 'manual' })
    expect(visit.headers.get('location')).toBe('http://platform.test/again')
    await fake.control('clock', { offsetMs: 0 })
  })
})
