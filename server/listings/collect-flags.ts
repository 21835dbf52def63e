import type { Tx } from '@/db/transaction'
import { countRemovedOf, type ListingRow } from '@/server/listings/listing-store'
import { listOtherBodies } from '@/server/listings/version-store'
import { findTwinsElsewhere, type PhotoRow } from '@/server/photos/photo-store'
import type { SellerRow } from '@/server/sellers/seller-store'
import type { ListingBody } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'
import { contactInText } from '@/shared/domain/listings/contact-in-text'
import { changedFields } from '@/shared/domain/listings/flatten-body'
import { effectOfField } from '@/shared/domain/listings/material-edit'
import { nameOtherTaxa } from '@/shared/domain/listings/name-other-taxa'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

export interface Submitted {
  body: ListingBody
  /** The version buyers see; null before the first. */
  onSale: ListingBody | null
  listing: ListingRow
  seller: SellerRow
  photos: PhotoRow[]
  gate: GateVerdict
}

/** Everything the seller wrote freely, as one text. */
function wordsOf(body: ListingBody): string {
  const { strain, feed, health, promise, words, photos } = body
  const texts = [
    strain,
    words,
    feed.words,
    health.treatments,
    health.lastLosses,
    health.papers,
    promise.evidence,
  ]
  return [...texts, ...photos.map((photo) => photo.caption)].filter(Boolean).join('\n')
}

function editFlags({ body, onSale }: Submitted): string[] {
  if (!onSale) return ['new']
  return changedFields(onSale, body).flatMap((field) => {
    const effect = effectOfField(field, onSale, body)
    return effect === 'live' ? [] : [`${effect === 'hide' ? 'hides-for' : 'edit'}:${field}`]
  })
}

function textFlags(body: ListingBody): string[] {
  const text = wordsOf(body)
  const named = nameOtherTaxa(text, body.taxonId).map(
    ({ taxonId, blocked }) => `${blocked ? 'names-blocked' : 'names-other'}:${taxonId}`,
  )
  return [...named, ...contactInText(text).map((kind) => `contact:${kind}`)]
}

function lawFlags({ body, seller, gate }: Submitted): string[] {
  const answer = seller.licences.find((licence) => licence.state === seller.state)?.answer
  return [
    ...(gate.status === 'unknown' ? ['law-unknown'] : []),
    ...(answer === 'unsure' ? ['licence-unsure'] : []),
    ...(traceLineage(body.taxonId)?.flags.includes('protected-papers') ? ['protected-papers'] : []),
  ]
}

async function photoFlags({ body, photos, listing, seller }: Submitted, tx: Tx): Promise<string[]> {
  const twins = await findTwinsElsewhere(
    photos.map((photo) => photo.looksLike),
    seller.memberId,
    tx,
  )
  const others = await listOtherBodies({ sellerId: seller.id, exceptListingId: listing.id }, tx)
  const usedBefore = new Set(others.flatMap((other) => other.photos.map((photo) => photo.photoId)))
  const differs = body.photos.some(({ photoId, takenOn }) => {
    const byCamera = photos.find((photo) => photo.id === photoId)?.takenOn
    return byCamera !== null && byCamera !== undefined && byCamera !== takenOn
  })
  return [
    ...(twins.length > 0 ? ['photo-of-another'] : []),
    ...(body.photos.some((photo) => usedBefore.has(photo.photoId)) ? ['photo-used-before'] : []),
    ...(differs ? ['photo-date-differs'] : []),
  ]
}

async function historyFlags({ listing, onSale, seller }: Submitted, tx: Tx): Promise<string[]> {
  const others = await listOtherBodies({ sellerId: seller.id, exceptListingId: listing.id }, tx)
  const removed = await countRemovedOf(seller.id, tx)
  return [
    ...(others.length === 0 && !onSale ? ['first-listing'] : []),
    ...(removed > 0 ? ['removed-before'] : []),
  ]
}

/** Why a moderator should look at a submission, most telling first. None of them decides anything by itself. */
export async function collectFlags(submitted: Submitted, tx: Tx): Promise<string[]> {
  return [
    ...textFlags(submitted.body),
    ...(await photoFlags(submitted, tx)),
    ...(await historyFlags(submitted, tx)),
    ...lawFlags(submitted),
    ...editFlags(submitted),
  ]
}
