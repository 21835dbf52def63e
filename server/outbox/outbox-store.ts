import { and, asc, eq, inArray, isNotNull, isNull, lte, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { outbox } from '@/db/schema/outbox'
import { inTransaction } from '@/db/transaction'
import { failPoint } from '@/server/outbox/fail-point'
import { wakeOutbox } from '@/server/outbox/wake'

export const effectKinds = [
  'mail',
  'expire-checkout',
  'capture-deposit',
  'void-authorisation',
  'refund',
  'transfer',
  'payment-event',
] as const
export type EffectKind = (typeof effectKinds)[number]

export interface Effect {
  seq: number
  kind: EffectKind
  ref: number
  body: Record<string, unknown>
  attempts: number
}

/**
 * A claimed row is left alone by other workers for this long; a worker that died frees it by time. Short, so that a
 * restart carries on at once: a worker that lives renews its claims (run-effects).
 */
const CLAIM_MS = 6_000

/** Writes an effect beside the change that causes it; returns its number, the effect's idempotency key. */
export async function queueEffect(
  effect: { kind: EffectKind; ref: number; body: Record<string, unknown> },
  tx: Tx = db(),
): Promise<number> {
  const at = new Date()
  const [row] = await tx
    .insert(outbox)
    .values({ ...effect, createdAt: at, runAfter: at })
    .$returningId()
  wakeOutbox()
  if (!row) throw new Error('the outbox row has no number')
  return row.seq
}

/** Takes up to `most` due rows for this worker (SKIP LOCKED: two workers never take the same one). */
export async function claimEffects(most: number, only?: { seq: number }): Promise<Effect[]> {
  return inTransaction(async (tx) => {
    const waiting = and(isNull(outbox.doneAt), isNull(outbox.deadAt), lte(outbox.runAfter, new Date()))
    const rows = await tx
      .select()
      .from(outbox)
      .where(only ? and(waiting, eq(outbox.seq, only.seq)) : waiting)
      .orderBy(asc(outbox.seq))
      .limit(most)
      .for('update', { skipLocked: true })
    for (const row of rows) {
      await tx
        .update(outbox)
        .set({ attempts: sql`${outbox.attempts} + 1`, runAfter: new Date(Date.now() + CLAIM_MS) })
        .where(eq(outbox.seq, row.seq))
      failPoint(`${row.kind}:claiming`)
    }
    return rows.map((row) => ({
      seq: row.seq,
      kind: row.kind as EffectKind,
      ref: row.ref,
      body: row.body,
      attempts: row.attempts + 1,
    }))
  })
}

/** Holds rows that are still being worked on a little longer. */
export async function renewClaims(seqs: number[]): Promise<void> {
  if (seqs.length === 0) return
  await db()
    .update(outbox)
    .set({ runAfter: new Date(Date.now() + CLAIM_MS) })
    .where(and(inArray(outbox.seq, seqs), isNull(outbox.doneAt), isNull(outbox.deadAt)))
}

export async function finishEffect(seq: number, tx: Tx = db()): Promise<void> {
  await tx.update(outbox).set({ doneAt: new Date(), lastError: null }).where(eq(outbox.seq, seq))
}

export async function retryEffect(seq: number, inMs: number, error: string): Promise<void> {
  await db()
    .update(outbox)
    .set({ runAfter: new Date(Date.now() + inMs), lastError: error.slice(0, 2000) })
    .where(eq(outbox.seq, seq))
}

export async function giveUpEffect(seq: number, error: string): Promise<void> {
  await db()
    .update(outbox)
    .set({ deadAt: new Date(), lastError: error.slice(0, 2000) })
    .where(eq(outbox.seq, seq))
}

export async function countDeadEffects(): Promise<number> {
  return db().$count(outbox, isNotNull(outbox.deadAt))
}
