import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { bookCapture, bookProcessorCost } from '@/server/money/book-capture'
import { changePayment, lockPayment, STRAY, type PaymentRow } from '@/server/money/payment-store'
import type { ChargeState } from '@/server/money/read-charge'
import { refundPayment } from '@/server/money/refund-payment'
import { applyEdge, clockAfter } from '@/server/orders/apply-edge'
import { changeOrder, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { scheduleOrder } from '@/server/orders/schedule-order'
import { queueEffect } from '@/server/outbox/outbox-store'
import type { PaymentFacts } from '@/payments/payment-facts'

type Locked = { payment: PaymentRow; order: OrderRow }

const UNPAID = new Set(['opening', 'open', 'expired'])

/** The first charge is earmarked: the seller may now answer (E04). Too late: it is let go at once. */
async function takeAuthorisation(tx: Tx, { payment, order }: Locked, facts: PaymentFacts): Promise<void> {
  if (!UNPAID.has(payment.status)) return
  await changePayment(tx, payment.id, {
    status: 'authorised',
    intentId: facts.paymentIntentId,
    captureBefore: facts.captureBefore,
    updatedAt: new Date(),
  })
  if (order.state === 'reserved') {
    await applyEdge(tx, {
      edge: 'E04',
      orderId: order.id,
      commandId: `authorised:${payment.id}`,
      actor: 'payment',
    })
    return
  }
  await queueEffect({ kind: 'void-authorisation', ref: payment.id, body: { late: true } }, tx)
}

async function takeBalance(tx: Tx, { payment, order }: Locked): Promise<void> {
  if (['scheduled', 'weather_hold', 'ready'].includes(order.state) && order.balancePaidAt === null) {
    const at = now()
    const paid = { ...order, balancePaidAt: at }
    // The clock that waited for the balance waits for the day from now on.
    const clock = order.state === 'scheduled' ? await clockAfter(tx, paid, at) : {}
    await changeOrder(tx, order, { balancePaidAt: at, updatedAt: at, ...clock })
    // The page was open while the seller cut the order: what is too much goes straight back.
    const tooMuch = payment.amountCents - order.balanceCents
    if (tooMuch > 0) await refundPayment(tx, { order, payment, amountCents: tooMuch, why: STRAY })
    return
  }
  await refundPayment(tx, { order, payment, amountCents: payment.amountCents, why: STRAY })
}

/** E05 for an instant listing, E07 once the seller has accepted; then the date, when a window was chosen. */
async function takeFirstCharge(tx: Tx, { payment, order }: Locked): Promise<void> {
  const edge = order.state === 'reserved' ? 'E05' : order.state === 'requested' ? 'E07' : null
  if (edge === null) {
    // The hold had ended before the money came: it goes straight back.
    await refundPayment(tx, { order, payment, amountCents: payment.amountCents, why: STRAY })
    return
  }
  await applyEdge(tx, {
    edge,
    orderId: order.id,
    commandId: `captured:${payment.id}`,
    actor: edge === 'E05' ? 'payment' : 'seller',
    facts: { cents: payment.amountCents },
  })
  await scheduleOrder(tx, order.id)
}

/** The money is in the platform's balance. */
async function takeCapture(tx: Tx, locked: Locked, facts: PaymentFacts): Promise<void> {
  const { payment, order } = locked
  if (payment.status === 'captured') {
    await bookProcessorCost(tx, locked, facts)
    return
  }
  await changePayment(tx, payment.id, {
    status: 'captured',
    intentId: facts.paymentIntentId,
    chargeId: facts.chargeId,
    updatedAt: new Date(),
  })
  await bookCapture(tx, locked, facts)
  await bookProcessorCost(tx, locked, facts)
  const paid = { payment: { ...payment, intentId: facts.paymentIntentId }, order }
  if (payment.purpose === 'balance') await takeBalance(tx, paid)
  else await takeFirstCharge(tx, paid)
}

async function closeUnpaid(tx: Tx, payment: PaymentRow): Promise<void> {
  if (payment.status === 'captured' || payment.status === 'voided') return
  const status = payment.status === 'authorised' ? 'voided' : 'expired'
  await changePayment(tx, payment.id, { status, updatedAt: new Date() })
}

/**
 * Brings one charge and its order to what the processor says is true now. Called by events, by the page the buyer
 * returns to, and by the poll for lost events; the same truth twice changes nothing.
 */
export async function applyCharge(
  charge: { paymentId: number; orderId: number },
  state: ChargeState,
): Promise<void> {
  if (state.kind === 'open') return
  await inTransaction(async (tx) => {
    const order = await lockOrder(tx, charge.orderId)
    const payment = await lockPayment(tx, charge.paymentId)
    if (!order || !payment) return
    if (state.kind === 'closed') return closeUnpaid(tx, payment)
    const { facts } = state
    // A charge over another sum than the order's was not opened by us for this order.
    if (facts.amountCents !== payment.amountCents)
      throw new Error(`payment ${payment.id} is over another amount`)
    if (facts.status === 'authorised') await takeAuthorisation(tx, { payment, order }, facts)
    else if (facts.status === 'captured') await takeCapture(tx, { payment, order }, facts)
    else if (facts.status === 'cancelled') await closeUnpaid(tx, payment)
  })
}
