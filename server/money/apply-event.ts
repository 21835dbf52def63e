import { inTransaction } from '@/db/transaction'
import { applyCharge } from '@/server/money/apply-charge'
import { findPayment, markEventApplied, readProcessorEvent } from '@/server/money/payment-store'
import { readCharge } from '@/server/money/read-charge'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'
import { refreshPayouts } from '@/server/sellers/refresh-payouts'

type Facts = Record<string, string | null>

const ABOUT_CHARGES = /^(checkout\.session|payment_intent|charge)\./

async function applyFacts(type: string, facts: Facts): Promise<void> {
  if (type === 'account.updated' && facts.accountId) return refreshPayouts(facts.accountId)
  if (!ABOUT_CHARGES.test(type)) return
  const { sessionId, paymentIntentId } = facts
  const bySession = sessionId ? await findPayment({ sessionId }) : undefined
  const payment =
    bySession ?? (paymentIntentId ? await findPayment({ intentId: paymentIntentId }) : undefined)
  // An intent we have no row for yet is told again by its session's event.
  if (payment)
    await applyCharge({ paymentId: payment.id, orderId: payment.orderId }, await readCharge(payment))
}

/** Applies one kept event by asking the processor for the object's present state: order and repeats do not matter. */
export async function applyProcessorEvent(effect: Effect): Promise<void> {
  const id = String(effect.body.eventId)
  const event = await readProcessorEvent(id)
  if (!event) throw new GiveUp('the event is not kept')
  if (!event.appliedAt) await applyFacts(event.type, event.facts)
  await inTransaction(async (tx) => {
    await markEventApplied(tx, id)
    await finishEffect(effect.seq, tx)
  })
}
