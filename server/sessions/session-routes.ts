import { Router } from 'express'

import { on } from '@/server/http/on'
import { endOtherSessions } from '@/server/sessions/end-other-sessions'
import { endSession } from '@/server/sessions/end-session'
import { listSessions } from '@/server/sessions/list-sessions'
import * as calls from '@/shared/contracts/sessions'

export function sessionRoutes(): Router {
  const router = Router()
  on(router, calls.listSessions)(({ caller }) => listSessions(caller))
  on(router, calls.endSession)(({ caller, params }) => endSession(caller, params.sessionId))
  on(router, calls.endOtherSessions)(({ caller }) => endOtherSessions(caller))
  return router
}
