import type { Tx } from '@/db/transaction'
import { checkWindows } from '@/server/listings/apply-windows'
import { assignLotCode } from '@/server/listings/assign-lot-code'
import { collectFlags, type Submitted } from '@/server/listings/collect-flags'
import { lockListing, setListing } from '@/server/listings/listing-store'
import { publishVersion } from '@/server/listings/publish-version'
import { findLatestVersion, insertVersion, supersedeWaiting } from '@/server/listings/version-store'
import { projectListings } from '@/server/search/project-listings'
import { Problem } from '@/shared/api/problem'
import { riskOfFlags } from '@/shared/domain/listings/flag-weights'
import { heldWords } from '@/shared/domain/listings/held-words'
import { changedFields } from '@/shared/domain/listings/flatten-body'
import { effectOfEdit, type EditEffect } from '@/shared/domain/listings/material-edit'

type Kept = Submitted & { at: Date }

/** The seller took every change back: what was approved stands, and nothing waits any more. */
async function standByApproved({ listing, seller, onSale, at }: Kept, tx: Tx): Promise<void> {
  await supersedeWaiting(listing.id, at, tx)
  if (!['pending_review', 'draft', 'expired'].includes(listing.state)) return
  if (listing.liveVersion === null || !onSale) return
  const version = { number: listing.liveVersion, body: onSale }
  await publishVersion({ listing, version, zone: seller.zone, by: seller.memberId, at }, tx)
}

/**
 * What submitting does. Animals are always looked at first. Media and produce are on sale at once unless something
 * about them asks for a moderator: nobody is poisoned by an unread page of gravel, and greens wait for nobody.
 */
function effectOf({ body, onSale, flags }: Pick<Submitted, 'body' | 'onSale'> & { flags: string[] }) {
  const byEdit = onSale ? (effectOfEdit(onSale, body) ?? 'live') : 'hide'
  const isAnimal = body.category === 'fish' || body.category === 'worms'
  return isAnimal || flags.some((flag) => heldWords(flag) !== null) ? byEdit : 'live'
}

/** Where the listing stands while the new version waits: hidden, or on sale as it was approved. */
function stateWhileWaiting(effect: EditEffect, before: string): string {
  return effect === 'hide' || before === 'draft' ? 'pending_review' : before
}

/** Writes the version and does what the edit calls for, in one transaction with search. */
export async function keepSubmission(submitted: Kept, tx: Tx): Promise<void> {
  const { onSale, seller, at } = submitted
  const listing = await lockListing(submitted.listing.id, tx)
  if (
    !listing ||
    listing.draftRevision !== submitted.listing.draftRevision ||
    listing.state === 'taken_down'
  ) {
    throw new Problem('version-stale', 'The listing has changed meanwhile. Load it again.')
  }
  const latest = await findLatestVersion(listing.id, tx)
  const { id: listingId } = listing
  const body = await assignLotCode(
    { body: submitted.body, latest: latest?.body ?? null, listingId, sellerId: seller.id },
    tx,
  )
  const isRepeat = latest?.review === 'waiting' && changedFields(latest.body, body).length === 0
  if (isRepeat) return
  await checkWindows({ listingId: listing.id, body, zone: seller.zone, at }, tx)
  if (onSale && changedFields(onSale, body).length === 0) {
    return standByApproved({ ...submitted, body, listing }, tx)
  }
  const flags = await collectFlags({ ...submitted, body, listing }, tx)
  const effect = effectOf({ body, onSale, flags })
  await supersedeWaiting(listing.id, at, tx)
  const number = (latest?.number ?? 0) + 1
  await insertVersion(
    {
      ...{ listingId: listing.id, number, body, flags, risk: riskOfFlags(flags), submittedAt: at },
      ...(effect === 'live' ? { review: 'approved', decidedAt: at } : { review: 'waiting' }),
    },
    tx,
  )
  if (effect === 'live') {
    await publishVersion(
      { listing, version: { number, body }, zone: seller.zone, by: seller.memberId, at },
      tx,
    )
    return
  }
  const state = stateWhileWaiting(effect, listing.state)
  await setListing(listing.id, { state, category: body.category, updatedAt: at }, tx)
  await projectListings(tx, [listing.id])
}
