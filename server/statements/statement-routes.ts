import { Router } from 'express'

import { on } from '@/server/http/on'
import { makeStatement } from '@/server/statements/make-statement'
import { printStatement } from '@/server/statements/print-statement'
import { readRecord } from '@/server/statements/read-record'
import * as calls from '@/shared/contracts/statements'

export function statementRoutes(): Router {
  const router = Router()
  on(router, calls.readStatement)(({ caller, params }) => makeStatement(caller, params.month))
  on(router, calls.printStatement)(({ caller, params }) => printStatement(caller, params.month))
  on(router, calls.readRecord)(({ caller }) => readRecord(caller))
  return router
}
