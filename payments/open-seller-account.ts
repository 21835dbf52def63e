import { askProcessor } from './ask-processor'

export interface SellerAccountToOpen {
  sellerId: string
  email: string
  /** What the processor calls the seller on its pages. */
  displayName: string
  idempotencyKey: string
}

/**
 * Opens a connected account that can receive transfers once its owner has gone through onboarding. The platform pays
 * fees and losses; the processor asks the questions, so no bank or tax number ever reaches us.
 */
export async function openSellerAccount(wanted: SellerAccountToOpen): Promise<{ accountId: string }> {
  const account = await askProcessor((stripe) =>
    stripe.accounts.create(
      {
        controller: {
          fees: { payer: 'application' },
          losses: { payments: 'application' },
          requirement_collection: 'stripe',
          stripe_dashboard: { type: 'express' },
        },
        capabilities: { card_payments: { requested: true }, transfers: { requested: true } },
        country: 'US',
        email: wanted.email,
        business_profile: { name: wanted.displayName },
        metadata: { seller_id: wanted.sellerId },
      },
      { idempotencyKey: wanted.idempotencyKey },
    ),
  )
  return { accountId: account.id }
}
