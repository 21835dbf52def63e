import type { TestFake } from './fake/fake-for-tests'
import { openCheckout } from './open-checkout'
import { openOnboarding } from './open-onboarding'
import { openSellerAccount } from './open-seller-account'
import { readCheckout } from './read-checkout'
import { configurePayments } from './stripe'

let count = 0

/** A key of its own for every act of a test. */
export function freshKey(): string {
  count += 1
  return `test:${count}`
}

export function useFake(fake: TestFake): void {
  const { webhookSecret } = fake.settings
  configurePayments({
    secretKey: 'sk_test_x',
    webhookSecret,
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
  })
}

interface Paid {
  amountCents: number
  capture?: 'automatic' | 'manual'
  orderId?: string
  card?: string
}

/** A buyer pays (or holds) an amount on the practice page; answers the payment. */
export async function paidByBuyer(fake: TestFake, paid: Paid): Promise<string> {
  const opened = await openCheckout({
    orderId: paid.orderId ?? 'ord_1',
    part: 'full',
    capture: paid.capture ?? 'automatic',
    amountCents: paid.amountCents,
    description: 'Twenty bluegill',
    successUrl: 'http://platform.test/',
    cancelUrl: 'http://platform.test/',
    idempotencyKey: freshKey(),
  })
  await fake.pay(opened.url, paid.card ?? '4242424242424242')
  const { paymentIntentId } = await readCheckout(opened.sessionId)
  if (!paymentIntentId) throw new Error('nobody paid')
  return paymentIntentId
}

/** A seller who has gone through onboarding; answers the account. */
export async function sellerReady(fake: TestFake): Promise<string> {
  const { accountId } = await openSellerAccount({
    sellerId: 'sel_1',
    email: 'hatchery@example.org',
    displayName: 'Marsh Hatchery',
    idempotencyKey: freshKey(),
  })
  const { url } = await openOnboarding({
    accountId,
    returnUrl: 'http://platform.test/back',
    refreshUrl: 'http://platform.test/again',
    idempotencyKey: freshKey(),
  })
  await fake.submit(url, { choice: 'finish' })
  return accountId
}
