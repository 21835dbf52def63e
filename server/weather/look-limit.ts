import type { RequestHandler } from 'express'

import { minuteLimit } from '@/server/http/minute-limit'

const LOOKS_A_MINUTE = 60
/** Each looks at up to 200 ways. */
const BULK_LOOKS_A_MINUTE = 6

const words = 'That was many looks at the way in a minute. Wait a moment; what was found before still counts.'

/** A look at a way asks the forecast anew, costs some 40 ms of reckoning and is kept for ever. */
export const lookLimit = (): RequestHandler => minuteLimit({ limit: LOOKS_A_MINUTE, words })
export const bulkLookLimit = (): RequestHandler => minuteLimit({ limit: BULK_LOOKS_A_MINUTE, words })
