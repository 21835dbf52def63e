import { createHash } from 'node:crypto'
import { ApiFailure } from '../failure'
import type { ReplyRow } from '../books/rows'
import type { Draft } from '../books/draft'

/** What makes two requests the same: method, path and every parameter, in any order. */
export function fingerprintOf(method: string, path: string, form: ReadonlyMap<string, string>): string {
  const fields = [...form].sort(([a], [b]) => (a < b ? -1 : 1))
  return createHash('sha256')
    .update(JSON.stringify([method, path, fields]))
    .digest('hex')
}

/** Keys whose request is being answered right now. Lost with the process, as it should be. */
export class KeysInUse {
  private readonly keys = new Set<string>()

  async hold<R>(key: string | null, act: () => Promise<R>): Promise<R> {
    if (key === null) return act()
    if (this.keys.has(key)) {
      const message = 'There is currently another in-progress request using this idempotency key.'
      throw new ApiFailure(409, { type: 'idempotency_error', code: 'idempotency_key_in_use', message })
    }
    this.keys.add(key)
    try {
      return await act()
    } finally {
      this.keys.delete(key)
    }
  }
}

/** The answer given before for this key; throws when the key was used for something else. */
export function keptReply(draft: Draft, key: string, fingerprint: string): ReplyRow | null {
  const reply = draft.get('replies', key)
  if (!reply) return null
  if (reply.fingerprint !== fingerprint) {
    const message =
      'Keys for idempotent requests can only be used with the same parameters they were first used with.'
    throw new ApiFailure(400, { type: 'idempotency_error', message })
  }
  return reply
}
