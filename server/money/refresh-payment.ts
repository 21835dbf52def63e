import { applyCharge } from '@/server/money/apply-charge'
import { changePaymentNow, listQuietPayments, type PaymentRow } from '@/server/money/payment-store'
import { readCharge } from '@/server/money/read-charge'

const QUIET_MS = 20_000
const MOST_AT_A_TIME = 20

/** Asks the processor how one open payment page stands, and applies it. */
export async function refreshPayment(payment: PaymentRow): Promise<void> {
  if (payment.status !== 'open' || !payment.sessionId) return
  const state = await readCharge(payment)
  await applyCharge({ paymentId: payment.id, orderId: payment.orderId }, state)
  if (state.kind === 'open') await changePaymentNow(payment.id, { updatedAt: new Date() })
}

/** A lost event must not lose a payment: pages nobody told us about for a while are asked for. */
export async function refreshQuietPayments(): Promise<void> {
  const quiet = await listQuietPayments(new Date(Date.now() - QUIET_MS), MOST_AT_A_TIME)
  for (const payment of quiet) await refreshPayment(payment)
}
