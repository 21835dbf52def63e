import type { RequestHandler } from 'express'

import { minuteLimit } from '@/server/http/minute-limit'

const SHEETS_A_MINUTE = 20

/** A sheet costs a packing search and a page: few are needed. */
export const packingLimit = (): RequestHandler =>
  minuteLimit({
    limit: SHEETS_A_MINUTE,
    words: 'That was many packing sheets in a minute. Wait a moment.',
  })
