import type Stripe from 'stripe'
import type { RefundRow } from '../books/rows'
import type { Turn } from '../turn'

export function presentRefund(_turn: Turn, row: RefundRow): Stripe.Refund {
  return {
    id: row.id,
    object: 'refund',
    amount: row.amount,
    balance_transaction: row.balanceTransactionId,
    charge: row.chargeId,
    created: row.createdS,
    currency: 'usd',
    customer: null,
    customer_account: null,
    metadata: row.metadata,
    payment_intent: row.paymentId,
    payment_method: null,
    ...(row.status === 'pending' ? { pending_reason: 'insufficient_funds' } : {}),
    reason: row.reason,
    receipt_number: null,
    source_transfer_reversal: null,
    status: row.status,
    transfer_reversal: null,
  }
}
