import { now } from '@/server/clock'
import { listingActs } from '@/server/listings/listing-policy'
import { countOpenOrders, type ListingRow } from '@/server/listings/listing-store'
import { presentWindow } from '@/server/listings/present-window'
import { listLatestReviews } from '@/server/listings/version-store'
import { listOpenWindows } from '@/server/listings/window-store'
import { presentTakenDown } from '@/server/moderation/present-report'
import { listTakenDown } from '@/server/moderation/report-store'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'
import { listingTitle } from '@/shared/domain/listings/listing-title'

function draftTitle(draft: ListingDraft): string {
  const { taxonId, strain, stage } = draft
  if (typeof taxonId !== 'string' || taxonId === '') return 'New batch'
  return listingTitle({
    taxonId,
    ...(typeof strain === 'string' ? { strain } : {}),
    stage: typeof stage === 'string' ? stage : '',
  })
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
