import { judgeListing } from '@/server/rules/judge-listing'
import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'

/** The gate for a sale inside the seller's own state; refuses what may not be sold there, with the source. */
export async function judgeAtHome(body: ListingBody, state: string): Promise<GateVerdict> {
  const asked = { body, sellerState: state, buyerState: state, viewer: 'seller', approved: false } as const
  const verdict = await judgeListing(asked)
  if (verdict.buy !== 'no') return verdict
  const source = verdict.reasons.find((reason) => reason.status === 'prohibited' && !reason.hint)
  throw new Problem(
    'species-prohibited',
    source
      ? `Not for sale in ${state}: ${source.sourceTitle} (${source.sourceDate}), checked ${source.checkedOn}.`
      : undefined,
  )
}
