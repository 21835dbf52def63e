import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { log } from '@/server/log'
import { applyCharge } from '@/server/money/apply-charge'
import { changePaymentNow, listPayments } from '@/server/money/payment-store'
import { readCharge } from '@/server/money/read-charge'
import { applyEdge } from '@/server/orders/apply-edge'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { readOrderById, type OrderRow } from '@/server/orders/order-store'
import { expireCheckout } from '@/payments/expire-checkout'
import { PaymentFailure } from '@/payments/payment-failure'

/** How long a hold may outlive its 15 minutes while the processor does not answer. */
const GRACE_MS = 2 * 60_000

/**
 * Closes the payment page first and asks what became of it: had the buyer just paid, the payment wins over the clock.
 * True when the hold may end.
 */
async function closePage(order: OrderRow): Promise<boolean> {
  for (const payment of await listPayments(order.id)) {
    if (payment.status !== 'open' || !payment.sessionId) continue
    const { outcome } = await expireCheckout({
      sessionId: payment.sessionId,
      idempotencyKey: `expire:${payment.id}`,
    })
    if (outcome === 'expired') {
      await changePaymentNow(payment.id, { status: 'expired', updatedAt: new Date() })
      continue
    }
    await applyCharge({ paymentId: payment.id, orderId: order.id }, await readCharge(payment))
    const fresh = await readOrderById(order.id)
    if (fresh?.state !== 'reserved') return false
  }
  return true
}

/** E02: 15 minutes without payment. The fish and the slot are free again; a payment page still open is closed. */
export async function endHold(order: OrderRow, commandId: string): Promise<void> {
  try {
    if (!(await closePage(order))) return
  } catch (error) {
    if (!(error instanceof PaymentFailure) || error.kind !== 'away') throw error
    const lateMs = now().getTime() - (order.clockAt?.getTime() ?? 0)
    if (lateMs < GRACE_MS) return
    log.warn({ orderId: order.id }, 'hold ended although the processor does not answer')
  }
  await inTransaction(async (tx) => {
    const outcome = await applyEdge(tx, { edge: 'E02', orderId: order.id, commandId, actor: 'timer' })
    if (outcome.applied) await letMoneyGo(tx, outcome.order)
  })
}
