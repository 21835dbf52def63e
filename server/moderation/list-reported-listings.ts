import type { Caller } from '@/server/http/caller'
import { countOpenOrders } from '@/server/listings/listing-store'
import { presentReport } from '@/server/moderation/present-report'
import { listNewestReports, listReported } from '@/server/moderation/report-store'
import { listOwnCategories } from '@/server/moderation/review-store'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import { Problem } from '@/shared/api/problem'
import type { ReportedListing } from '@/shared/contracts/listing-reports'
import { lotTitle } from '@/shared/domain/listings/lot-title'

function idAfter(cursor: string): number {
  const { id } = readCursor(cursor)
  if (typeof id !== 'number') throw new Problem('cursor-unreadable')
  return id
}

/** What one moderator may decide on: the listing whose oldest report waits longest comes first. */
export async function listReportedListings(
  caller: Caller,
  page: { cursor?: string | undefined; limit: number },
): Promise<{ items: ReportedListing[]; nextCursor?: string }> {
  const afterId = page.cursor ? idAfter(page.cursor) : null
  const categories = await listOwnCategories(caller.memberId)
  const rows = await listReported(
    { memberId: caller.memberId, categories },
    { afterId, limit: page.limit + 1 },
  )
  const shown = rows.slice(0, page.limit)
  const ids = shown.map((row) => row.listingId)
  const [newest, orders] = await Promise.all([listNewestReports(ids), countOpenOrders(ids)])
  const last = rows.length > page.limit ? shown.at(-1) : undefined
  return {
    items: shown.map((row) => ({
      listingId: row.publicId,
      title: lotTitle(row.body),
      farmName: row.farmName,
      state: row.state as ReportedListing['state'],
      people: row.people,
      newest: newest.filter((report) => report.listingId === row.listingId).map(presentReport),
      firstAt: row.firstAt.toISOString(),
      newestAt: row.newestAt.toISOString(),
      openOrders: orders.get(row.listingId) ?? 0,
    })),
    ...(last ? { nextCursor: writeCursor({ id: last.firstId }) } : {}),
  }
}
