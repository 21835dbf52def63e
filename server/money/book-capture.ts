import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import { changePayment, type PaymentRow } from '@/server/money/payment-store'
import type { OrderRow } from '@/server/orders/order-store'
import type { PaymentFacts } from '@/payments/payment-facts'

type Charged = { payment: PaymentRow; order: OrderRow }

/** Books a captured charge: card → held. */
export async function bookCapture(tx: Tx, { payment, order }: Charged, facts: PaymentFacts): Promise<void> {
  await book(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    kind: 'capture',
    cause: `capture:${payment.id}`,
    processorId: facts.chargeId,
    rows: [
      ['buyer_card', -payment.amountCents],
      ['held', payment.amountCents],
    ],
    at: now(),
  })
}

/** Books what the processor kept of the charge: the platform's cost, never netted from anybody's refund. */
export async function bookProcessorCost(
  tx: Tx,
  { payment, order }: Charged,
  facts: PaymentFacts,
): Promise<void> {
  const cost = facts.processorFeeCents
  if (!cost) return
  const isNew = await book(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    kind: 'processor-cost',
    cause: `processor-cost:${payment.id}`,
    processorId: facts.chargeId,
    rows: [
      ['platform_fee', -cost],
      ['processor_cost', cost],
    ],
    at: now(),
  })
  if (isNew) await changePayment(tx, payment.id, { processorCostCents: cost })
}
