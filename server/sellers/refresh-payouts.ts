import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { listListingIdsOf } from '@/server/listings/listing-store'
import { projectListings } from '@/server/search/project-listings'
import { findSellerByAccount, updateSeller } from '@/server/sellers/seller-store'
import { readSellerAccount } from '@/payments/read-seller-account'

/**
 * Reads what the processor lets an account do and keeps it; listings follow, for nobody finds what cannot be paid
 * for. Called on the processor's event and when the seller comes back from its pages. Throws PaymentFailure.
 */
export async function refreshPayouts(accountId: string): Promise<void> {
  const row = await findSellerByAccount(accountId)
  if (!row) return
  const account = await readSellerAccount(accountId)
  const chargesEnabled = account.chargesEnabled
  const payoutsEnabled = account.payoutsEnabled && account.mayReceive
  if (row.chargesEnabled === chargesEnabled && row.payoutsEnabled === payoutsEnabled) return
  await inTransaction(async (tx) => {
    await updateSeller(row.id, { chargesEnabled, payoutsEnabled, updatedAt: now() }, tx)
    await projectListings(tx, await listListingIdsOf(row.id, tx))
  })
}
