import type { Caller } from '@/server/http/caller'
import { log } from '@/server/log'
import { presentOwnSeller, payoutState } from '@/server/sellers/present-own-seller'
import { refreshPayouts } from '@/server/sellers/refresh-payouts'
import { requireSeller } from '@/server/sellers/require-seller'
import { PaymentFailure } from '@/payments/payment-failure'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** While the processor's questions are open the farm page asks it anew: its event may be slower than the seller. */
export async function readOwnFarm(caller: Caller): Promise<OwnSeller> {
  const row = await requireSeller(caller)
  if (row.payoutAccountId === null || payoutState(row) !== 'unfinished') return presentOwnSeller(row)
  try {
    await refreshPayouts(row.payoutAccountId)
  } catch (error) {
    if (!(error instanceof PaymentFailure)) throw error
    log.warn({ sellerId: row.id, kind: error.kind }, 'payout state not read')
  }
  return presentOwnSeller(await requireSeller(caller))
}
