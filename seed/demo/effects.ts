import { and, asc, eq, inArray, isNull, lt, lte, max, notInArray, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { notice } from '@/db/schema/notices'
import { outbox } from '@/db/schema/outbox'
import { payment, processorEvent } from '@/db/schema/payments'
import { refreshPayment } from '@/server/money/refresh-payment'
import { runEffectNow } from '@/server/outbox/run-effects'

/** Left to the end: mail is not sent, and an event tells what its act has asked the processor already. */
const LATER = ['mail', 'payment-event']
const QUIET_MS = 400
const LONGEST_MS = 20_000

const undone = and(isNull(outbox.doneAt), isNull(outbox.deadAt))

/** Does the captures, refunds, transfers and the like that the last act has caused, at its own moment of the demo. */
export async function doEffects(): Promise<void> {
  for (;;) {
    const due = await db()
      .select({ seq: outbox.seq })
      .from(outbox)
      .where(and(undone, notInArray(outbox.kind, LATER), lte(outbox.runAfter, new Date())))
      .orderBy(asc(outbox.seq))
    if (due.length === 0) return
    for (const { seq } of due) await runEffectNow(seq)
  }
}

/** The number of the last effect so far. */
export async function lastEffect(): Promise<number> {
  const [row] = await db()
    .select({ seq: max(outbox.seq) })
    .from(outbox)
  return row?.seq ?? 0
}

async function untilProcessorIsSilent(): Promise<void> {
  const until = Date.now() + LONGEST_MS
  for (let heard = -1, since = Date.now(); Date.now() < until;) {
    const events = await db().$count(processorEvent)
    if (events !== heard) [heard, since] = [events, Date.now()]
    else if (Date.now() - since >= QUIET_MS) return
    await new Promise((done) => setTimeout(done, 50))
  }
}

/**
 * After the last act: every page still open is asked for once more, so that nothing an event tells is news, and the
 * events are marked applied. Throws when an effect could not be done.
 */
export async function settleEvents(): Promise<void> {
  await untilProcessorIsSilent()
  for (const open of await db().select().from(payment).where(eq(payment.status, 'open')))
    await refreshPayment(open)
  await doEffects()
  const at = new Date()
  await db().update(processorEvent).set({ appliedAt: at }).where(isNull(processorEvent.appliedAt))
  await db()
    .update(outbox)
    .set({ doneAt: at })
    .where(and(undone, eq(outbox.kind, 'payment-event')))
  const [left] = await db()
    .select()
    .from(outbox)
    .where(and(undone, notInArray(outbox.kind, ['mail'])))
    .limit(1)
  if (left) throw new Error(`effect ${left.kind} could not be done: ${left.lastError ?? 'no reason given'}`)
}

/**
 * Nobody wants weeks of old mail at the first start: letters written up to that effect are marked done without being
 * sent. The later ones, of the demo's last day, go out when the server starts. Returns how many there are of each.
 */
export async function passOverOldMail(upTo: number): Promise<{ passedOver: number; kept: number }> {
  const [done] = await db()
    .update(outbox)
    .set({ doneAt: new Date() })
    .where(and(undone, inArray(outbox.kind, ['mail']), lte(outbox.seq, upTo)))
  return {
    passedOver: done.affectedRows,
    kept: await db().$count(outbox, and(undone, eq(outbox.kind, 'mail'))),
  }
}

/** Nor weeks of unread notices: those from before that moment count as read when they were written. */
export async function passOverOldNotices(before: Date): Promise<void> {
  await db()
    .update(notice)
    .set({ readAt: sql`${notice.createdAt}` })
    .where(lt(notice.createdAt, before))
}
