import { now } from '@/server/clock'
import { listingActs } from '@/server/listings/listing-policy'
import { countOpenOrders, type ListingRow } from '@/server/listings/listing-store'
import { presentWindow } from '@/server/listings/present-window'
import { listLatestReviews } from '@/server/listings/version-store'
import { listOpenWindows } from '@/server/listings/window-store'
import { presentTakenDown } from '@/server/moderation/present-report'
import { listTakenDown } from '@/server/moderation/report-store'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'
import { matchCrop } from '@/shared/domain/produce/find-crop'
import { heldWords } from '@/shared/domain/listings/held-words'
import { lotTitle, type NamedLot } from '@/shared/domain/listings/lot-title'

const typed = (value: unknown): string => (typeof value === 'string' ? value : '')

/** What is being typed, as far as it has a name yet. */
function draftLot(draft: ListingDraft): NamedLot | null {
  const { category, taxonId, material, cropId } = draft
  const strain = typed(draft.strain) || undefined
  if (category === 'media' && material) {
    const materialWords = typed(draft.materialWords) || undefined
    return { category, material: typed(material), materialWords, used: typed(draft.used) }
  }
  if (category === 'produce' && cropId) {
    const variety = typed(draft.variety) || undefined
    return { category, cropId: matchCrop(typed(cropId))?.id ?? '', variety, form: typed(draft.form) }
  }
  if (!typed(taxonId)) return null
  if (category === 'worms') return { category, taxonId: typed(taxonId), strain }
  return { category: 'fish', taxonId: typed(taxonId), strain, stage: typed(draft.stage) }
}

const blankTitles: Record<string, string> = {
  worms: 'New worms',
  media: 'New media',
  produce: 'New harvest',
}

function draftTitle(draft: ListingDraft): string {
  const lot = draftLot(draft)
  return lot ? lotTitle(lot) : (blankTitles[typed(draft.category)] ?? 'New batch')
}

/** Why a version waits, as far as something about it asks for a moderator. */
function whyHeld({ review, flags }: { review: string; flags: string[] }) {
  if (review !== 'waiting') return {}
  const why = [...new Set(flags.map(heldWords))].filter((words) => words !== null)
  return why.length > 0 ? { why } : {}
}

/** A seller's listings with drafts, stock and what may be done; one query a table however many there are. */
export async function presentOwnListings(rows: ListingRow[]): Promise<OwnListing[]> {
  const ids = rows.map((row) => row.id)
  const [reviews, windows, openOrders, down] = await Promise.all([
    listLatestReviews(ids),
    listOpenWindows(ids, now()),
    countOpenOrders(ids),
    listTakenDown(rows.filter((row) => row.state === 'taken_down').map((row) => row.id)),
  ])
  return rows.map((row) => {
    const review = reviews.get(row.id)
    const takenDown = presentTakenDown(down.get(row.id))
    const { free, held, pledged, sold, shipped, delivered } = row
    return {
      listingId: row.publicId,
      state: row.state as OwnListing['state'],
      title: draftTitle(row.draft),
      draft: row.draft,
      draftRevision: row.draftRevision,
      ...(row.liveVersion === null ? {} : { liveVersion: row.liveVersion }),
      ...(review
        ? {
            review: {
              number: review.number,
              state: review.review,
              ...(review.reasonCode ? { reasonCode: review.reasonCode } : {}),
              ...(review.reasonText ? { reasonText: review.reasonText } : {}),
              ...whyHeld(review),
            },
          }
        : {}),
      ...(takenDown ? { takenDown } : {}),
      stock: { free, held, pledged, sold, shipped, delivered },
      windows: windows.filter((window) => window.listingId === row.id).map(presentWindow),
      openOrders: openOrders.get(row.id) ?? 0,
      updatedAt: row.updatedAt.toISOString(),
      may: listingActs({ ...row, everSubmitted: review !== undefined }),
    }
  })
}
