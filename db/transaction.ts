import { db, type Tx } from '@/db/client'

export type { Tx }

// Deadlock, lock wait timeout, snapshot conflict: the whole transaction may run again (robustness: 3.3 rule 2).
const RETRYABLE = new Set([1213, 1205, 1020])
const MOST_TRIES = 10

/** MariaDB's error number, wherever Drizzle wrapped it; null when the error is not the driver's. */
export function errnoOf(error: unknown): number | null {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    if ('errno' in at && typeof at.errno === 'number') return at.errno
  }
  return null
}

/**
 * Runs `work` in one transaction and runs it again after a deadlock, also when COMMIT reports it.
 * `work` must have no effect outside the database. A lost connection is not retried: the outcome is unknown.
 */
export async function inTransaction<T>(work: (tx: Tx) => Promise<T>): Promise<T> {
  for (let tries = 1; ; tries++) {
    try {
      return await db().transaction((tx) => work(tx))
    } catch (error) {
      const errno = errnoOf(error)
      if (errno === null || !RETRYABLE.has(errno) || tries >= MOST_TRIES) throw error
      await new Promise((done) => setTimeout(done, Math.random() * 15 * tries))
    }
  }
}
