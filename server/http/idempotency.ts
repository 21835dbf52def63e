import { createHash } from 'node:crypto'

import { claimKey, finishKey, forgetKey } from '@/server/http/idempotency-store'
import type { Endpoint } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'

interface KeyedRequest {
  memberId: string
  key: string
  endpoint: Endpoint
  body: unknown
}

/**
 * Idempotency-Key after the IETF HTTPAPI draft (a draft, not a standard): the same key and body gets the stored
 * answer; another body is refused; a request still running is a 409. A failed request stores nothing: it had no
 * effect, and the use cases name the key as their command id, so a repeat after a crash changes nothing twice.
 */
export async function withIdempotency<R>(asked: KeyedRequest, run: () => Promise<R>): Promise<R> {
  const { memberId, key, endpoint } = asked
  const name = `${endpoint.method} ${endpoint.path}`
  const fingerprint = createHash('sha256').update(JSON.stringify(asked.body)).digest('hex')
  const claim = await claimKey({ memberId, key, endpoint: name, fingerprint })
  if (claim.kind === 'other-body') {
    throw new Problem('key-reused', 'Start again from the page: this attempt was made with other values.')
  }
  if (claim.kind === 'running') throw new Problem('key-running', 'It is on its way; wait a moment.')
  if (claim.kind === 'done') return JSON.parse(claim.reply) as R
  try {
    const reply = await run()
    await finishKey({ memberId, key, status: endpoint.status ?? 200, reply: JSON.stringify(reply ?? null) })
    return reply
  } catch (error) {
    await forgetKey(memberId, key)
    throw error
  }
}
