import { askProcessor } from './ask-processor'

export interface SellerAccountFacts {
  accountId: string
  detailsSubmitted: boolean
  chargesEnabled: boolean
  payoutsEnabled: boolean
  /** Transfers may be sent to it. */
  mayReceive: boolean
  /** What the processor still wants to know, in its own words; empty when all is in order. */
  due: string[]
  /** Why it is stopped, in the processor's own word; null when it is not. */
  disabledReason: string | null
}

/** A seller's account as it stands now. Throws PaymentFailure. */
export async function readSellerAccount(accountId: string): Promise<SellerAccountFacts> {
  const account = await askProcessor((stripe) => stripe.accounts.retrieve(accountId))
  return {
    accountId: account.id,
    detailsSubmitted: account.details_submitted,
    chargesEnabled: account.charges_enabled,
    payoutsEnabled: account.payouts_enabled,
    mayReceive: account.capabilities?.transfers === 'active',
    due: account.requirements?.currently_due ?? [],
    disabledReason: account.requirements?.disabled_reason ?? null,
  }
}
