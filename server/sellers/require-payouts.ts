import { payoutState } from '@/server/sellers/present-own-seller'
import type { SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'

/** Nothing is put on sale that could not be paid for. */
export function requirePayouts(seller: SellerRow): void {
  if (payoutState(seller) === 'ready') return
  throw new Problem(
    'seller-unready',
    'Finish the payment set-up on your farm page first: buyers can only pay a seller who can be paid.',
  )
}
