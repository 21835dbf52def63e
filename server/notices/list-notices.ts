import type { Caller } from '@/server/http/caller'
import { listNoticeRows } from '@/server/notices/notice-store'
import { presentNotice } from '@/server/notices/present-notice'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

type Asked = ParsedQuery<Endpoints['listNotices']>
type Page = ReplyOf<Endpoints['listNotices']>

/** The caller's own notices, newest first. */
export async function listNotices(caller: Caller, asked: Asked): Promise<Page> {
  const beforeId = asked.cursor ? Number(readCursor(asked.cursor).id) : undefined
  const rows = await listNoticeRows({ memberId: caller.memberId, beforeId, limit: asked.limit + 1 })
  const page = rows.slice(0, asked.limit)
  const items = page.map(presentNotice)
  const last = page.at(-1)
  return rows.length > asked.limit && last ? { items, nextCursor: writeCursor({ id: last.id }) } : { items }
}
