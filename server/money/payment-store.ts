import { and, asc, eq, inArray, isNotNull, lte, ne, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { payment, processorEvent, refund, transfer } from '@/db/schema/payments'
import { errnoOf } from '@/db/transaction'

export type PaymentRow = typeof payment.$inferSelect
export type RefundRow = typeof refund.$inferSelect
export type PaymentStatus = 'opening' | 'open' | 'authorised' | 'captured' | 'voided' | 'expired' | 'failed'

const DUPLICATE = 1062

/** Why a charge that came too late, or twice, went straight back. */
export const STRAY = 'paid-too-late'
/** The fee falls on goods alone: what goes back of box and freight does not lower it. */
export const BOX_AND_FREIGHT = 'box-and-freight'

export async function insertPayment(
  tx: Tx,
  row: { orderId: number; purpose: 'deposit' | 'balance'; amountCents: number; at: Date },
): Promise<number> {
  const { at, ...rest } = row
  const [made] = await tx
    .insert(payment)
    .values({ ...rest, status: 'opening', createdAt: at, updatedAt: at })
    .$returningId()
  if (!made) throw new Error('the payment row has no number')
  return made.id
}

export async function readPaymentRow(id: number, tx: Tx = db()): Promise<PaymentRow | undefined> {
  const [row] = await tx.select().from(payment).where(eq(payment.id, id))
  return row
}

export async function lockPayment(tx: Tx, id: number): Promise<PaymentRow | undefined> {
  const [row] = await tx.select().from(payment).where(eq(payment.id, id)).for('update')
  return row
}

export async function listPayments(orderId: number, tx: Tx = db()): Promise<PaymentRow[]> {
  return tx.select().from(payment).where(eq(payment.orderId, orderId)).orderBy(asc(payment.id))
}

export async function listPaymentsOf(orderIds: number[], tx: Tx = db()): Promise<PaymentRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(payment).where(inArray(payment.orderId, orderIds)).orderBy(asc(payment.id))
}

/** The payment behind a processor's session or intent. */
export async function findPayment(by: {
  sessionId?: string
  intentId?: string
}): Promise<PaymentRow | undefined> {
  const where = by.sessionId ? eq(payment.sessionId, by.sessionId) : eq(payment.intentId, by.intentId ?? '')
  const [row] = await db().select().from(payment).where(where)
  return row
}

/** Payment pages opened a while ago whose outcome nobody has told us: asked again, in case an event was lost. */
export async function listQuietPayments(openedBefore: Date, most: number): Promise<PaymentRow[]> {
  return db()
    .select()
    .from(payment)
    .where(
      and(eq(payment.status, 'open'), isNotNull(payment.sessionId), lte(payment.updatedAt, openedBefore)),
    )
    .orderBy(asc(payment.id))
    .limit(most)
}

export async function changePayment(
  tx: Tx,
  id: number,
  change: Partial<typeof payment.$inferInsert>,
): Promise<void> {
  await tx.update(payment).set(change).where(eq(payment.id, id))
}

export async function changePaymentNow(
  id: number,
  change: Partial<typeof payment.$inferInsert>,
): Promise<void> {
  await changePayment(db(), id, change)
}

export async function insertRefund(
  tx: Tx,
  row: { orderId: number; paymentId: number; amountCents: number; why: string; at: Date },
): Promise<number> {
  const { at, ...rest } = row
  const [made] = await tx
    .insert(refund)
    .values({ ...rest, status: 'wanted', createdAt: at, updatedAt: at })
    .$returningId()
  if (!made) throw new Error('the refund row has no number')
  await tx
    .update(payment)
    .set({ refundedCents: sql`${payment.refundedCents} + ${row.amountCents}` })
    .where(eq(payment.id, row.paymentId))
  return made.id
}

export async function readRefund(id: number): Promise<RefundRow | undefined> {
  const [row] = await db().select().from(refund).where(eq(refund.id, id))
  return row
}

export async function finishRefund(
  tx: Tx,
  id: number,
  done: { processorId: string; at: Date },
): Promise<void> {
  await tx
    .update(refund)
    .set({ status: 'done', processorId: done.processorId, updatedAt: done.at })
    .where(eq(refund.id, id))
}

/** What went back of the goods themselves, and what went back because it should never have been charged. */
export async function sumRefunds(
  tx: Tx,
  orderId: number,
): Promise<{ goodsCents: number; otherCents: number }> {
  const rows = await tx
    .select({ amountCents: refund.amountCents, why: refund.why })
    .from(refund)
    .where(and(eq(refund.orderId, orderId), ne(refund.status, 'failed')))
  const isOther = (why: string) => why === STRAY || why === BOX_AND_FREIGHT
  const sum = (other: boolean) =>
    rows.filter((row) => isOther(row.why) === other).reduce((total, row) => total + row.amountCents, 0)
  return { goodsCents: sum(false), otherCents: sum(true) }
}

export async function insertTransfer(
  tx: Tx,
  row: { orderId: number; amountCents: number; at: Date },
): Promise<void> {
  const { at, ...rest } = row
  await tx.insert(transfer).values({ ...rest, status: 'wanted', createdAt: at, updatedAt: at })
}

export type TransferRow = typeof transfer.$inferSelect

export async function readTransfer(orderId: number): Promise<TransferRow | undefined> {
  const [row] = await db().select().from(transfer).where(eq(transfer.orderId, orderId))
  return row
}

export async function countTransferRefusal(orderId: number): Promise<void> {
  await db()
    .update(transfer)
    .set({ refusals: sql`${transfer.refusals} + 1` })
    .where(eq(transfer.orderId, orderId))
}

export async function finishTransfer(
  tx: Tx,
  orderId: number,
  done: { processorId: string; at: Date },
): Promise<void> {
  await tx
    .update(transfer)
    .set({ status: 'done', processorId: done.processorId, updatedAt: done.at })
    .where(eq(transfer.orderId, orderId))
}

/** Keeps a verified event; false when this very event was kept before. */
export async function keepProcessorEvent(tx: Tx, row: typeof processorEvent.$inferInsert): Promise<boolean> {
  try {
    await tx.insert(processorEvent).values(row)
    return true
  } catch (error) {
    if (errnoOf(error) === DUPLICATE) return false
    throw error
  }
}

export async function readProcessorEvent(
  id: string,
): Promise<typeof processorEvent.$inferSelect | undefined> {
  const [row] = await db().select().from(processorEvent).where(eq(processorEvent.id, id))
  return row
}

export async function markEventApplied(tx: Tx, id: string): Promise<void> {
  await tx.update(processorEvent).set({ appliedAt: new Date() }).where(eq(processorEvent.id, id))
}
