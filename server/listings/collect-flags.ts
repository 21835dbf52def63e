import type { Tx } from '@/db/transaction'
import { hasApprovedCut } from '@/server/listings/lot-code-store'
import { countRemovedOf, type ListingRow } from '@/server/listings/listing-store'
import { listOtherBodies } from '@/server/listings/version-store'
import { findTwinsElsewhere, type PhotoRow } from '@/server/photos/photo-store'
import type { SellerRow } from '@/server/sellers/seller-store'
import type { ListingBody } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'
import { judgeStatedWeight } from '@/shared/domain/media/media-weight'
import { findMedia } from '@/shared/domain/media/find-media'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { judgeForm } from '@/shared/domain/produce/judge-form'
import { judgeWords } from '@/shared/domain/produce/judge-words'
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

function textsOf(body: ListingBody): (string | undefined)[] {
  switch (body.category) {
    case 'fish': {
      const { strain, feed, health, promise } = body
      const { treatments, lastLosses, papers } = health
      return [strain, feed.words, treatments, lastLosses, papers, promise.evidence]
    }
    case 'worms':
      return [body.strain, body.bedding, body.promise.evidence]
    case 'media':
      return [body.materialWords, body.usedWords]
    case 'produce':
      return [body.variety, body.growing, body.organicCertifier]
  }
}

/** Everything the seller wrote freely, as one text. */
function wordsOf(body: ListingBody): string {
  return [...textsOf(body), body.words, ...body.photos.map((photo) => photo.caption)]
    .filter(Boolean)
    .join('\n')
}

function editFlags({ body, onSale }: Submitted): string[] {
  if (!onSale) return ['new']
  return changedFields(onSale, body).flatMap((field) => {
    const effect = effectOfField(field, onSale, body)
    return effect === 'live' ? [] : [`${effect === 'hide' ? 'hides-for' : 'edit'}:${field}`]
  })
}

/** Names of fish mean nothing on a bunch of rainbow chard: produce is read for plants and for words of the law. */
function namedFlags(body: ListingBody, text: string): string[] {
  if (body.category === 'produce') {
    const taxonId = gateOf(body).taxonId
    return judgeWords(text, { organic: body.organic ?? null, form: body.form, taxonId })
      .filter(({ effect }) => effect === 'hold')
      .map(({ word }) => `words-hold:${word}`)
  }
  return nameOtherTaxa(text, gateOf(body).taxonId ?? '')
    .filter(({ blocked }) => blocked || body.category !== 'media')
    .map(({ taxonId, blocked }) => `${blocked ? 'names-blocked' : 'names-other'}:${taxonId}`)
}

/** What its own answers ask a moderator to look at. */
async function lotFlags({ body, seller }: Submitted, tx: Tx): Promise<string[]> {
  switch (body.category) {
    case 'fish':
      return []
    case 'worms':
      return body.raisedInUs ? [] : ['not-raised-in-us']
    case 'media': {
      const material = findMedia(body.material)
      if (!material || body.saleUnit.kind !== 'volume') return []
      return judgeStatedWeight(material, body.saleUnit).verdict === 'caution' ? ['weight-differs'] : []
    }
    case 'produce': {
      const taxonId = gateOf(body).taxonId
      const isHeld =
        body.form === 'cut-mixed-or-washed' &&
        judgeForm(body.form, await hasApprovedCut(seller.id, tx)).effect === 'held'
      return [...(taxonId ? [`permit-plant:${taxonId}`] : []), ...(isHeld ? ['form-needs-licence'] : [])]
    }
  }
}

function textFlags(body: ListingBody): string[] {
  const text = wordsOf(body)
  return [...namedFlags(body, text), ...contactInText(text).map((kind) => `contact:${kind}`)]
}

function lawFlags({ body, seller, gate }: Submitted): string[] {
  const { taxonId, isAnimal } = gateOf(body)
  if (!isAnimal) return []
  const answer = seller.licences.find((licence) => licence.state === seller.state)?.answer
  return [
    ...(gate.status === 'unknown' ? ['law-unknown'] : []),
    ...(answer === 'unsure' ? ['licence-unsure'] : []),
    ...(traceLineage(taxonId ?? '')?.flags.includes('protected-papers') ? ['protected-papers'] : []),
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
    ...(await lotFlags(submitted, tx)),
    ...(await photoFlags(submitted, tx)),
    ...(await historyFlags(submitted, tx)),
    ...lawFlags(submitted),
    ...editFlags(submitted),
  ]
}
