import { Router } from 'express'

import { on } from '@/server/http/on'
import { listNotices } from '@/server/notices/list-notices'
import { countUnread } from '@/server/notices/notice-store'
import { readAllNotices, readNotice } from '@/server/notices/read-notices'
import * as notices from '@/shared/contracts/notices'

export function noticeRoutes(): Router {
  const router = Router()
  on(router, notices.listNotices)(({ caller, query }) => listNotices(caller, query))
  on(
    router,
    notices.countUnreadNotices,
  )(async ({ caller }) => ({ unread: await countUnread(caller.memberId) }))
  on(router, notices.readNotice)(({ caller, params }) => readNotice(caller, params.noticeId))
  on(router, notices.readAllNotices)(({ caller }) => readAllNotices(caller))
  return router
}
