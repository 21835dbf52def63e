import { errnoOf, inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { newPublicId } from '@/server/new-public-id'
import { changeFarm, type Farm } from '@/server/sellers/change-farm'
import { checkLicences } from '@/server/sellers/check-licences'
import { placeFarm } from '@/server/sellers/place-farm'
import { presentOwnSeller } from '@/server/sellers/present-own-seller'
import { findSellerOf, grantSellerRole, insertSeller } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { OwnSeller } from '@/shared/contracts/sellers'

const DUPLICATE = 1062

/** Begins selling. A member has one farm: opening it again, perhaps after a lost answer, only changes it. */
export async function openFarm(caller: Caller, farm: Farm): Promise<OwnSeller> {
  if (!caller.emailVerified) throw new Problem('email-unverified')
  if (await findSellerOf(caller.memberId)) return changeFarm(caller, farm)
  checkLicences(farm.licences, farm.state)
  const place = await placeFarm(farm)
  const work = inTransaction(async (tx) => {
    const at = now()
    await insertSeller(
      { publicId: newPublicId(), memberId: caller.memberId, ...farm, ...place, createdAt: at, updatedAt: at },
      tx,
    )
    await grantSellerRole(caller.memberId, tx)
    return findSellerOf(caller.memberId, tx)
  })
  try {
    const row = await work
    if (!row) throw new Error('the farm was not kept')
    return presentOwnSeller(row)
  } catch (error) {
    // Two devices at once: the second finds the first one's farm.
    if (errnoOf(error) === DUPLICATE) return changeFarm(caller, farm)
    throw error
  }
}
