import { checkAnimal, checkStates } from '@/server/listings/check-animal'
import { checkSameLot } from '@/server/listings/check-same-lot'
import { checkDates } from '@/server/listings/check-dates'
import { checkPhotos } from '@/server/listings/check-photos'
import { dayOf } from '@/server/listings/day-of'
import { judgeAtHome } from '@/server/listings/judge-at-home'
import type { ListingRow } from '@/server/listings/listing-store'
import { resolveWindows } from '@/server/listings/resolve-windows'
import { writeAudit } from '@/server/moderation/audit-store'
import { findPhotos, type PhotoRow } from '@/server/photos/photo-store'
import { requirePayouts } from '@/server/sellers/require-payouts'
import type { SellerRow } from '@/server/sellers/seller-store'
import { Problem, type FieldProblem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { findBlock } from '@/shared/domain/rules/find-block'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

export interface Submission {
  body: ListingBody
  onSale: ListingBody | null
  listing: ListingRow
  seller: SellerRow
  at: Date
}

/** Refused here and now, and remembered: nothing of it was ever public. */
async function refuseBlocked({ body, listing, seller, at }: Submission): Promise<void> {
  const { taxonId } = gateOf(body)
  const lineage = traceLineage(taxonId ?? '')
  const why = lineage ? (findBlock(lineage)?.why ?? null) : null
  if (why === null) return
  await writeAudit({
    actorId: seller.memberId,
    act: 'listing-blocked',
    subject: `listing:${listing.id}`,
    facts: { taxonId, sellerId: seller.id },
    at,
  })
  throw new Problem('species-blocked', `We do not list this species. That is our policy for everyone. ${why}`)
}

/** Rules of its category that ask about the seller or the law; the others were asked by the form. */
function checkKind(body: ListingBody, seller: SellerRow): FieldProblem[] {
  if (body.category === 'fish') return checkAnimal(body, seller)
  return body.category === 'worms' ? checkStates(body, seller) : []
}

/** Everything that can be said no to before a version is written: all fields at once, then the law, then payouts. */
export async function checkSubmission(
  submission: Submission,
): Promise<{ photos: PhotoRow[]; gate: GateVerdict }> {
  const { body, onSale, seller, at } = submission
  await refuseBlocked(submission)
  const photos = await findPhotos(body.photos.map((photo) => photo.photoId))
  const errors = [
    ...checkKind(body, seller),
    ...checkSameLot(body, onSale),
    ...checkDates(body, dayOf(at, seller.zone), onSale),
    ...checkPhotos(body, photos, seller.memberId),
    ...resolveWindows(body.windows, { zone: seller.zone, at }).errors,
  ]
  if (errors.length > 0) throw new Problem('listing-incomplete', undefined, { errors })
  const gate = await judgeAtHome(body, seller.state)
  requirePayouts(seller)
  return { photos, gate }
}
