import pino from 'pino'

import { describeError } from '@/server/describe-error'

/** Structured lines, UTC. Secrets and fine places are cut out wherever they might slip in. */
export const log = pino({
  level: 'info',
  base: null,
  timestamp: pino.stdTimeFunctions.isoTime,
  serializers: { err: describeError },
  redact: {
    paths: [
      'req.headers.cookie',
      'req.headers.authorization',
      'req.headers["idempotency-key"]',
      'res.headers["set-cookie"]',
      '*.password',
      '*.token',
      '*.secret',
      '*.trueLat',
      '*.trueLng',
      '*.street',
      '*.phone',
    ],
    censor: '[cut]',
  },
})
