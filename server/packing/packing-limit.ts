import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'

import { Problem } from '@/shared/api/problem'

const MINUTE_MS = 60_000
const SHEETS_A_MINUTE = 20

/** A sheet costs a packing search and a page: few are needed. Counted in memory, each process for itself. */
export function packingLimit(): RequestHandler {
  return rateLimit({
    windowMs: MINUTE_MS,
    limit: SHEETS_A_MINUTE,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // The app itself says how many proxies it trusts; a forged header is ignored, not an error.
    validate: { xForwardedForHeader: false },
    handler: (_req, _res, next) =>
      next(
        new Problem('too-often', 'That was many packing sheets in a minute. Wait a moment.', {
          facts: { retryAfterS: MINUTE_MS / 1000 },
        }),
      ),
  })
}
