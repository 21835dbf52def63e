import { Router } from 'express'

import { on } from '@/server/http/on'
import { changeMe } from '@/server/members/change-me'
import { readMe } from '@/server/members/read-me'
import { changeMe as changeMeCall, readMe as readMeCall } from '@/shared/contracts/members'

export function memberRoutes(): Router {
  const router = Router()
  on(router, readMeCall)(async ({ caller }) => (caller ? readMe(caller) : null))
  on(router, changeMeCall)(async ({ caller, body }) => changeMe(caller, body))
  return router
}
