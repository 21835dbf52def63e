import type { NoticeRow } from '@/server/notices/notice-store'
import type { NoticeKind, ShownNotice } from '@/shared/contracts/notices'

export function presentNotice(row: NoticeRow): ShownNotice {
  return {
    noticeId: row.publicId,
    kind: row.kind as NoticeKind,
    subject: row.facts.subject,
    title: row.facts.title,
    about: row.orderPublicId
      ? { noun: 'order', id: row.orderPublicId }
      : { noun: 'listing', id: row.listingPublicId ?? '' },
    createdAt: row.createdAt.toISOString(),
    ...(row.readAt ? { readAt: row.readAt.toISOString() } : {}),
  }
}
