import { eq } from 'drizzle-orm'

import { db } from '@/db/client'
import { listing } from '@/db/schema/listings'
import type { LotPlan } from '@/seed/demo/batch-plan'
import type { PhotoDesk } from '@/seed/demo/photo-desk'
import { need, type Stage } from '@/seed/demo/stage'
import type { Step } from '@/seed/demo/timeline'
import { seededPublicId } from '@/seed/seeded-id'
import { beginListing } from '@/server/listings/begin-listing'
import { findListing } from '@/server/listings/listing-store'
import { saveDraft } from '@/server/listings/save-draft'
import { submitListing } from '@/server/listings/submit-listing'
import { findLatestVersion } from '@/server/listings/version-store'
import { decideReview } from '@/server/moderation/decide-review'
import type { ListingBody, ListingDraft } from '@/shared/contracts/listings'

type Decision = Parameters<typeof decideReview>[2]

/** What sellers and moderators do with listings, by the key of the batch. */
export interface ListingDesk {
  idOf: (key: string) => string
  begin: (plan: LotPlan, draft?: ListingDraft) => Promise<void>
  submit: (plan: LotPlan, change?: object) => Promise<void>
  decide: (key: string, given: Decision) => Promise<void>
  /** Submitted one day and, where animals are looked at first, approved the next. */
  publish: (plan: LotPlan) => Step[]
}

const typedWindows = ({ slots }: LotPlan): ListingBody['windows'] =>
  slots
    .toSorted((one, other) => one.startsAt.getTime() - other.startsAt.getTime())
    .map(({ day, from, until, capacity }) => ({ day, from, until, capacity }))

const isLookedAt = ({ body }: LotPlan) => body.category === 'fish' || body.category === 'worms'

export function openListingDesk(stage: Stage, photos: PhotoDesk): ListingDesk {
  const ids = new Map<string, string>()
  const idOf = (key: string) => need(ids.get(key), `listing "${key}"`)
  const moderator = need(stage.people.get('moderator'), 'moderator')

  const begin = async ({ key, farm }: LotPlan, draft?: ListingDraft) => {
    const { listingId } = await beginListing(farm.owner.caller, undefined)
    // The address of a listing stays good from one build of the demo to the next.
    const publicId = seededPublicId(`demo listing ${key}`)
    await db().update(listing).set({ publicId }).where(eq(listing.publicId, listingId))
    ids.set(key, publicId)
    if (draft) await saveDraft(farm.owner.caller, publicId, { draft, draftRevision: 0 })
  }
  const submit = async (plan: LotPlan, change: object = {}) => {
    if (!ids.has(plan.key)) await begin(plan)
    const publicId = idOf(plan.key)
    const photoIds = await photos.photosOf(plan.key)
    const draft: ListingDraft = {
      ...plan.body,
      windows: typedWindows(plan),
      photos: plan.shots.map(({ takenOn, hasRuler, caption }, at) => ({
        ...{ photoId: need(photoIds[at], `photo ${at} of ${plan.key}`), takenOn, hasRuler },
        ...(caption ? { caption } : {}),
      })),
      ...change,
    }
    const { caller } = plan.farm.owner
    const draftRevision = need(await findListing(publicId), plan.key).draftRevision
    const saved = await saveDraft(caller, publicId, { draft, draftRevision })
    await submitListing(caller, publicId, saved.draftRevision)
  }
  const decide = async (key: string, given: Decision) => {
    const row = need(await findListing(idOf(key)), key)
    const version = need(await findLatestVersion(row.id), `version of ${key}`)
    await decideReview(moderator.caller, version.id, given)
  }
  return {
    ...{ idOf, begin, submit, decide },
    publish: (plan) => [
      { at: plan.submittedAt, story: plan.key, what: 'submitted', run: () => submit(plan) },
      ...(isLookedAt(plan)
        ? [
            {
              at: plan.decidedAt,
              story: plan.key,
              what: 'approved',
              run: () => decide(plan.key, { decision: 'approve' }),
            },
          ]
        : []),
    ],
  }
}
