import { and, eq, isNull, lt } from 'drizzle-orm'

import { db } from '@/db/client'
import { idempotencyKey } from '@/db/schema/requests'
import { errnoOf } from '@/db/transaction'

const DUPLICATE = 1062
/** A process that died in the middle leaves its key running; after this long another may take it over. */
const ABANDONED_AFTER_MS = 30_000

export interface KeyClaim {
  memberId: string
  key: string
  endpoint: string
  fingerprint: string
}

export type ClaimOutcome =
  { kind: 'claimed' } | { kind: 'running' } | { kind: 'other-body' } | { kind: 'done'; reply: string }

// Keys expire in real time: they guard requests, not the trade's clocks.
export async function claimKey(claim: KeyClaim): Promise<ClaimOutcome> {
  const startedAt = new Date()
  try {
    await db()
      .insert(idempotencyKey)
      .values({ ...claim, startedAt })
    return { kind: 'claimed' }
  } catch (error) {
    if (errnoOf(error) !== DUPLICATE) throw error
  }
  const mine = and(eq(idempotencyKey.memberId, claim.memberId), eq(idempotencyKey.key, claim.key))
  const [kept] = await db().select().from(idempotencyKey).where(mine)
  if (!kept) return { kind: 'running' }
  if (kept.fingerprint !== claim.fingerprint || kept.endpoint !== claim.endpoint)
    return { kind: 'other-body' }
  if (kept.status !== null) return { kind: 'done', reply: kept.reply ?? 'null' }
  const [taken] = await db()
    .update(idempotencyKey)
    .set({ startedAt })
    .where(
      and(
        mine,
        isNull(idempotencyKey.status),
        lt(idempotencyKey.startedAt, new Date(startedAt.getTime() - ABANDONED_AFTER_MS)),
      ),
    )
  return taken.affectedRows === 1 ? { kind: 'claimed' } : { kind: 'running' }
}

export async function finishKey(done: {
  memberId: string
  key: string
  status: number
  reply: string
}): Promise<void> {
  await db()
    .update(idempotencyKey)
    .set({ status: done.status, reply: done.reply })
    .where(and(eq(idempotencyKey.memberId, done.memberId), eq(idempotencyKey.key, done.key)))
}

export async function forgetKey(memberId: string, key: string): Promise<void> {
  await db()
    .delete(idempotencyKey)
    .where(
      and(eq(idempotencyKey.memberId, memberId), eq(idempotencyKey.key, key), isNull(idempotencyKey.status)),
    )
}

/** Drops keys older than a day; returns how many. */
export async function dropOldKeys(before: Date): Promise<number> {
  const [gone] = await db().delete(idempotencyKey).where(lt(idempotencyKey.startedAt, before))
  return gone.affectedRows
}
