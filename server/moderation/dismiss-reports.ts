import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { writeAudit } from '@/server/moderation/audit-store'
import { closeReports } from '@/server/moderation/report-store'
import { withReported } from '@/server/moderation/with-reported'
import type { ParsedBody, ReplyOf } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { Endpoints } from '@/shared/api/routes.gen'

/** Nothing wrong: every open report of the listing is closed, and it stays as it is. */
export async function dismissReports(
  caller: Caller,
  publicId: string,
  { seenUntil, note }: ParsedBody<Endpoints['dismissReports']>,
): Promise<ReplyOf<Endpoints['dismissReports']>> {
  return withReported(caller, publicId, async ({ listing, newestAt }, tx) => {
    if (newestAt > new Date(seenUntil)) {
      throw new Problem(
        'version-stale',
        'Somebody else has reported it meanwhile. Load the list again and read it.',
      )
    }
    const at = now()
    const by = { closedBy: caller.memberId, closedAt: at }
    const closed = await closeReports(listing.id, { outcome: 'nothing-wrong', note: note || null, ...by }, tx)
    await writeAudit(
      {
        actorId: caller.memberId,
        act: 'listing-reports-dismissed',
        subject: `listing:${listing.id}`,
        facts: { reports: closed, note: note || null },
        at,
      },
      tx,
    )
    return {
      listingId: listing.publicId,
      state: listing.state as ReplyOf<Endpoints['dismissReports']>['state'],
      closed,
    }
  })
}
