import { countCall } from '@/server/http/call-limit-store'
import { Problem } from '@/shared/api/problem'

interface Limit {
  /** What is counted, e.g. `upload`. */
  name: string
  windowS: number
  most: number
}

/** Counts one call of `who` and refuses it past the limit, saying when to come back. Real time. */
export async function limitCalls(limit: Limit, who: string): Promise<void> {
  const nowS = Math.floor(Date.now() / 1000)
  const windowStart = nowS - (nowS % limit.windowS)
  const used = await countCall(`${limit.name}:${who}`, windowStart)
  if (used > limit.most) {
    const retryAfterS = windowStart + limit.windowS - nowS
    throw new Problem('too-often', 'That was often. Take a short break, then try again.', {
      facts: { retryAfterS },
    })
  }
}
