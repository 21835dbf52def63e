import { now } from '@/server/clock'
import { isStaff, type Caller } from '@/server/http/caller'
import { countOrdersWaiting, countReviewsWaiting, findMember } from '@/server/members/member-store'
import { presentMe } from '@/server/members/present-me'
import { Problem } from '@/shared/api/problem'
import type { Me } from '@/shared/contracts/members'

export async function readMe(caller: Caller): Promise<Me> {
  const member = await findMember(caller.memberId)
  if (!member) throw new Problem('not-signed-in')
  const sellerId = member.seller?.id ?? null
  const [orders, reviews] = await Promise.all([
    countOrdersWaiting({ memberId: caller.memberId, sellerId }, now()),
    isStaff(caller) ? countReviewsWaiting(sellerId) : 0,
  ])
  return presentMe(caller, member, { orders, reviews })
}
