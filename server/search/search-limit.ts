import type { RequestHandler } from 'express'

import { minuteLimit } from '@/server/http/minute-limit'

const VISITORS_A_MINUTE = 120
const MEMBERS_A_MINUTE = 600

/** Searches are cheap but many. A forged session cookie only gets the wider limit, which is still one. */
export const searchLimit = (): RequestHandler =>
  minuteLimit({
    limit: (req) => (req.headers.cookie?.includes('session_token') ? MEMBERS_A_MINUTE : VISITORS_A_MINUTE),
    words: 'That was many searches in a minute. Wait a moment.',
  })
