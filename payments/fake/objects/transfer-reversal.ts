import type Stripe from 'stripe'
import type { ReversalRow } from '../books/rows'
import type { Turn } from '../turn'

export function presentReversal(_turn: Turn, row: ReversalRow): Stripe.TransferReversal {
  return {
    id: row.id,
    object: 'transfer_reversal',
    amount: row.amount,
    balance_transaction: row.balanceTransactionId,
    created: row.createdS,
    currency: 'usd',
    destination_payment_refund: null,
    metadata: row.metadata,
    source_refund: null,
    transfer: row.transferId,
  }
}
