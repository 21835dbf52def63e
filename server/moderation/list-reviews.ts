import type { Caller } from '@/server/http/caller'
import { findVersionById } from '@/server/listings/version-store'
import {
  listOwnCategories,
  listWaiting,
  type QueuePlace,
  type QueueRow,
} from '@/server/moderation/review-store'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import { Problem } from '@/shared/api/problem'
import type { ReviewRow } from '@/shared/contracts/moderation'
import { lotTitle } from '@/shared/domain/listings/lot-title'

function presentRow(row: QueueRow): ReviewRow {
  return {
    versionId: String(row.id),
    listingId: row.listingPublicId,
    title: lotTitle(row.body),
    farmName: row.farmName,
    state: row.listingState,
    number: row.number,
    flags: row.flags,
    submittedAt: row.submittedAt.toISOString(),
  }
}

async function placeAfter(cursor: string): Promise<QueuePlace> {
  const { id } = readCursor(cursor)
  const version = typeof id === 'number' ? await findVersionById(id) : null
  if (!version) throw new Problem('cursor-unreadable')
  return { risk: version.risk, submittedAt: version.submittedAt, id: version.id }
}

/** The queue of one moderator: what they may decide on, the riskiest first. */
export async function listReviews(
  caller: Caller,
  page: { cursor?: string | undefined; limit: number },
): Promise<{ items: ReviewRow[]; nextCursor?: string }> {
  const after = page.cursor ? await placeAfter(page.cursor) : null
  const categories = await listOwnCategories(caller.memberId)
  const rows = await listWaiting({ memberId: caller.memberId, categories }, { after, limit: page.limit + 1 })
  const shown = rows.slice(0, page.limit)
  const last = rows.length > page.limit ? shown.at(-1) : undefined
  return {
    items: shown.map(presentRow),
    ...(last ? { nextCursor: writeCursor({ id: last.id }) } : {}),
  }
}
