import { askProcessor } from './ask-processor'

export interface OnboardingToOpen {
  accountId: string
  /** Where the seller comes back to, finished or not: `readSellerAccount` tells which. */
  returnUrl: string
  /** Where a link that is spent or too old leads: open a new one there. */
  refreshUrl: string
  idempotencyKey: string
}

/** A link good once, for a few minutes: a new key for every visit, and never sent by mail. */
export async function openOnboarding(wanted: OnboardingToOpen): Promise<{ url: string; expiresAt: Date }> {
  const link = await askProcessor((stripe) =>
    stripe.accountLinks.create(
      {
        account: wanted.accountId,
        type: 'account_onboarding',
        return_url: wanted.returnUrl,
        refresh_url: wanted.refreshUrl,
      },
      { idempotencyKey: wanted.idempotencyKey },
    ),
  )
  return { url: link.url, expiresAt: new Date(link.expires_at * 1000) }
}
