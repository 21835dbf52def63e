import { log } from '@/server/log'
import { changePaymentNow, insertPayment, listPayments, type PaymentRow } from '@/server/money/payment-store'
import { now } from '@/server/clock'
import { orderSettings } from '@/server/orders/order-settings'
import { readOrderById, type OrderRow } from '@/server/orders/order-store'
import { readTermsOf } from '@/server/orders/terms-store'
import { describeListing } from '@/server/listings/describe-listing'
import { inTransaction } from '@/db/transaction'
import { openCheckout } from '@/payments/open-checkout'
import { PaymentFailure } from '@/payments/payment-failure'

type Purpose = 'deposit' | 'balance'

const OPEN = new Set(['opening', 'open'])

async function rowFor(order: OrderRow, purpose: Purpose): Promise<PaymentRow | undefined> {
  const rows = (await listPayments(order.id)).filter((row) => row.purpose === purpose)
  const open = rows.findLast((row) => OPEN.has(row.status))
  if (open || purpose === 'deposit') return open
  const amountCents = order.balanceCents
  await inTransaction((tx) => insertPayment(tx, { orderId: order.id, purpose, amountCents, at: now() }))
  return (await listPayments(order.id)).findLast((row) => row.purpose === purpose && OPEN.has(row.status))
}

async function whatFor(order: OrderRow, purpose: Purpose): Promise<string> {
  const terms = (await readTermsOf([order.listingVersionId])).get(order.listingVersionId)
  const title = terms ? describeListing(terms).title : 'an order'
  const part = purpose === 'balance' ? 'Balance' : order.payMode === 'full' ? 'Whole price' : 'Deposit'
  return `${part} for ${order.quantity} × ${title}`
}

/**
 * Opens the processor's payment page for an order, outside any transaction; keeps the page that is open already.
 * Quietly leaves the payment unopened when the processor does not answer: the order page offers to try again.
 */
export async function openPayment(orderId: number, purpose: Purpose): Promise<void> {
  const order = await readOrderById(orderId)
  if (!order) return
  const payment = await rowFor(order, purpose)
  if (!payment || payment.status === 'open') return
  const page = `${orderSettings().origin}/orders/${order.publicId}`
  try {
    const opened = await openCheckout({
      orderId: order.publicId,
      part: purpose === 'balance' ? 'balance' : order.payMode === 'full' ? 'full' : 'deposit',
      amountCents: payment.amountCents,
      description: await whatFor(order, purpose),
      capture: purpose === 'deposit' && order.needsAcceptance ? 'manual' : 'automatic',
      successUrl: `${page}?paid=${purpose}`,
      cancelUrl: `${page}?left=${purpose}`,
      idempotencyKey: `checkout:${payment.id}`,
    })
    await changePaymentNow(payment.id, {
      status: 'open',
      sessionId: opened.sessionId,
      payUrl: opened.url,
      intentId: opened.paymentIntentId,
      updatedAt: new Date(),
    })
  } catch (error) {
    if (!(error instanceof PaymentFailure)) throw error
    log.warn({ orderId, purpose, kind: error.kind }, 'payment page not opened')
  }
}
