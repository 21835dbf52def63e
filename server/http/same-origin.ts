import type { RequestHandler } from 'express'

import { Problem } from '@/shared/api/problem'

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Refuses state changes that another site started: the origin must be ours, and the body must be of a kind that a
 * plain form cannot send without asking first (JSON, or an upload with our own header).
 */
export function sameOrigin(origins: string[]): RequestHandler {
  return (req, _res, next) => {
    if (SAFE.has(req.method)) return next()
    const origin = req.get('origin')
    const site = req.get('sec-fetch-site')
    const ownHeader = req.get('x-tankward') === '1'
    if (origin !== undefined && !origins.includes(origin)) throw new Problem('forged-request')
    if (site !== undefined && site !== 'same-origin' && site !== 'none') throw new Problem('forged-request')
    if (origin === undefined && site === undefined && !ownHeader) throw new Problem('forged-request')
    const kind = req.get('content-type')?.split(';')[0]?.trim().toLowerCase()
    const hasBody =
      req.get('content-length') !== '0' && (req.get('content-length') ?? req.get('transfer-encoding'))
    if (hasBody && kind !== 'application/json' && !(kind === 'multipart/form-data' && ownHeader)) {
      throw new Problem('wrong-kind', 'Send JSON, or an upload from our own pages.')
    }
    next()
  }
}
