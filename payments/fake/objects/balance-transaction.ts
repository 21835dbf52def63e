import type Stripe from 'stripe'
import type { BalanceTransactionRow } from '../books/rows'
import type { Turn } from '../turn'

export function presentBalanceTransaction(turn: Turn, row: BalanceTransactionRow): Stripe.BalanceTransaction {
  return {
    id: row.id,
    object: 'balance_transaction',
    amount: row.amount,
    available_on: row.availableOnS,
    balance_type: 'payments',
    created: row.createdS,
    currency: 'usd',
    description: row.description,
    exchange_rate: null,
    fee: row.fee,
    fee_details: row.fee
      ? [
          {
            amount: row.fee,
            application: null,
            currency: 'usd',
            description: 'Processing fee',
            type: 'stripe_fee',
          },
        ]
      : [],
    net: row.amount - row.fee,
    reporting_category: row.kind,
    source: row.sourceId,
    status: row.availableOnS <= turn.nowS ? 'available' : 'pending',
    type: row.kind,
  }
}
