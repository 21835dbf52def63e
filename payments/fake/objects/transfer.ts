import type Stripe from 'stripe'
import type { TransferRow } from '../books/rows'
import type { Turn } from '../turn'
import { presentList } from './list'
import { presentReversal } from './transfer-reversal'

const SHOWN_REVERSALS = 10

export function presentTransfer(turn: Turn, row: TransferRow): Stripe.Transfer {
  const reversals = turn.draft.all('reversals').filter((reversal) => reversal.transferId === row.id)
  const shown = reversals.reverse().slice(0, SHOWN_REVERSALS)
  return {
    id: row.id,
    object: 'transfer',
    amount: row.amount,
    amount_reversed: row.amountReversed,
    balance_transaction: row.balanceTransactionId,
    created: row.createdS,
    currency: 'usd',
    description: row.description,
    destination: row.accountId,
    livemode: false,
    metadata: row.metadata,
    reversals: presentList(
      `/v1/transfers/${row.id}/reversals`,
      shown.map((reversal) => presentReversal(turn, reversal)),
      reversals.length > SHOWN_REVERSALS,
    ),
    reversed: row.amountReversed === row.amount,
    source_transaction: null,
    source_type: 'card',
    transfer_group: row.transferGroup,
  }
}
