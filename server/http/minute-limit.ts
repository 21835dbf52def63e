import type { Request, RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'

import { Problem } from '@/shared/api/problem'

const MINUTE_MS = 60_000

interface MinuteLimit {
  /** Requests of one address in a minute. */
  limit: number | ((req: Request) => number)
  words: string
}

/** Counted in memory, each process for itself. */
export function minuteLimit({ limit, words }: MinuteLimit): RequestHandler {
  return rateLimit({
    windowMs: MINUTE_MS,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // The app itself says how many proxies it trusts; a forged header is ignored, not an error.
    validate: { xForwardedForHeader: false },
    handler: (_req, _res, next) =>
      next(new Problem('too-often', words, { facts: { retryAfterS: MINUTE_MS / 1000 } })),
  })
}
