import { randomUUID } from 'node:crypto'

import type { RequestHandler } from 'express'
import { pinoHttp } from 'pino-http'

import { describeError } from '@/server/describe-error'
import { log } from '@/server/log'

/** Links to leave a list or to a new password carry their permission in the path: no log keeps it. */
const loggedPath = (url: string) =>
  (url.split('?')[0] ?? '').replace(/^(\/unsubscribe\/|\/api\/auth\/reset-password\/).*/s, '$1…')

/** Gives every request an id, and logs it as one line without query texts: places stand there. */
export function requestLog(): RequestHandler[] {
  const name: RequestHandler = (_req, res, next) => {
    res.locals.requestId = randomUUID()
    res.setHeader('x-request-id', String(res.locals.requestId))
    next()
  }
  const write = pinoHttp({
    logger: log,
    genReqId: (_req, res) => String(res.getHeader('x-request-id')),
    autoLogging: { ignore: (req) => req.url === '/healthz' || req.url?.startsWith('/_expo/') === true },
    serializers: {
      req: (req: { id: string; method: string; url: string }) => ({
        id: req.id,
        method: req.method,
        path: loggedPath(req.url),
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
      err: describeError,
    },
  })
  return [name, write as RequestHandler]
}
