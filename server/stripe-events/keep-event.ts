import { inTransaction } from '@/db/transaction'
import { keepProcessorEvent } from '@/server/money/payment-store'
import { queueEffect } from '@/server/outbox/outbox-store'
import type { WebhookEvent } from '@/payments/read-webhook'

/** Writes a verified event and its work into the outbox together; a second delivery of the same event does nothing. */
export async function keepEvent(event: WebhookEvent): Promise<void> {
  await inTransaction(async (tx) => {
    const facts = {
      sessionId: event.sessionId,
      paymentIntentId: event.paymentIntentId,
      accountId: event.accountId,
    }
    const isNew = await keepProcessorEvent(tx, {
      id: event.id,
      type: event.type,
      facts,
      receivedAt: new Date(),
    })
    if (isNew) await queueEffect({ kind: 'payment-event', ref: 0, body: { eventId: event.id } }, tx)
  })
}
