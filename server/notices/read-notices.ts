import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { countUnread, markAllRead, markRead } from '@/server/notices/notice-store'
import { Problem } from '@/shared/api/problem'

type Unread = { unread: number }

/** Somebody else's notice is a 404, like one that never was. */
export async function readNotice(caller: Caller, noticeId: string): Promise<Unread> {
  const isOwn = await markRead({ memberId: caller.memberId, publicId: noticeId }, now())
  if (!isOwn) throw new Problem('not-found')
  return { unread: await countUnread(caller.memberId) }
}

export async function readAllNotices(caller: Caller): Promise<Unread> {
  await markAllRead(caller.memberId, now())
  return { unread: await countUnread(caller.memberId) }
}
