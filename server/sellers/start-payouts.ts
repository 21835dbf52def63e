import type { Caller } from '@/server/http/caller'
import { orderSettings } from '@/server/orders/order-settings'
import { requireSeller } from '@/server/sellers/require-seller'
import { updateSeller, type SellerRow } from '@/server/sellers/seller-store'
import { openOnboarding } from '@/payments/open-onboarding'
import { openSellerAccount } from '@/payments/open-seller-account'
import { PaymentFailure } from '@/payments/payment-failure'
import { Problem } from '@/shared/api/problem'

/** The account is named before it is kept, and its key is the farm: a lost answer finds the same account again. */
async function accountOf(farm: SellerRow, email: string): Promise<string> {
  if (farm.payoutAccountId !== null) return farm.payoutAccountId
  const { accountId } = await openSellerAccount({
    sellerId: farm.publicId,
    email,
    displayName: farm.farmName,
    idempotencyKey: `account:${farm.publicId}`,
  })
  await updateSeller(farm.id, { payoutAccountId: accountId })
  return accountId
}

/** A link to the processor's own pages, where a seller proves who they are: none of that ever comes to us. */
export async function startPayouts(caller: Caller, commandId: string): Promise<{ url: string }> {
  const farm = await requireSeller(caller)
  const page = `${orderSettings().origin}/sell/farm`
  try {
    const accountId = await accountOf(farm, caller.email)
    const { url } = await openOnboarding({
      accountId,
      returnUrl: `${page}?payouts=back`,
      refreshUrl: `${page}?payouts=again`,
      idempotencyKey: `onboarding:${farm.publicId}:${commandId}`,
    })
    return { url }
  } catch (error) {
    if (!(error instanceof PaymentFailure)) throw error
    throw new Problem('payments-away', 'The payment service does not answer just now. Try again in a minute.')
  }
}
