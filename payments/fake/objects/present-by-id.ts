import type { RowOf, TableName } from '../books/tables'
import type { Turn } from '../turn'
import { presentAccount } from './account'
import { presentBalanceTransaction } from './balance-transaction'
import { presentCharge } from './charge'
import { presentSession } from './checkout-session'
import { presentDispute } from './dispute'
import { presentPaymentIntent } from './payment-intent'
import { presentRefund } from './refund'
import { presentTransfer } from './transfer'
import { presentReversal } from './transfer-reversal'

type Look = (turn: Turn, id: string) => object | null

function look<T extends TableName>(table: T, present: (turn: Turn, row: RowOf[T]) => object): Look {
  return (turn, id) => {
    const row = turn.draft.get(table, id)
    return row ? present(turn, row) : null
  }
}

const byPrefix: Record<string, Look> = {
  acct: look('accounts', presentAccount),
  ch: look('charges', presentCharge),
  cs: look('sessions', presentSession),
  du: look('disputes', presentDispute),
  pi: look('payments', presentPaymentIntent),
  re: look('refunds', presentRefund),
  tr: look('transfers', presentTransfer),
  trr: look('reversals', presentReversal),
  txn: look('balanceTransactions', presentBalanceTransaction),
}

/** The object behind an id, told by its prefix; null when there is none. */
export function presentById(turn: Turn, id: string): object | null {
  return byPrefix[id.slice(0, id.indexOf('_'))]?.(turn, id) ?? null
}
