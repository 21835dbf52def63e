import type { RequestHandler } from 'express'
import { rateLimit } from 'express-rate-limit'

import { Problem } from '@/shared/api/problem'

const MINUTE_MS = 60_000
const VISITORS_A_MINUTE = 120
const MEMBERS_A_MINUTE = 600

/**
 * Searches are cheap but many: counted in memory, each process for itself. A forged session cookie only gets the
 * wider limit, which is still one.
 */
export function searchLimit(): RequestHandler {
  return rateLimit({
    windowMs: MINUTE_MS,
    limit: (req) => (req.headers.cookie?.includes('session_token') ? MEMBERS_A_MINUTE : VISITORS_A_MINUTE),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // The app itself says how many proxies it trusts; a forged header is ignored, not an error.
    validate: { xForwardedForHeader: false },
    handler: (_req, _res, next) =>
      next(
        new Problem('too-often', 'That was many searches in a minute. Wait a moment.', {
          facts: { retryAfterS: MINUTE_MS / 1000 },
        }),
      ),
  })
}
