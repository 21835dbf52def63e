import type { ReversalRow, TransferRow } from '../books/rows'
import { badParameter, refusal } from '../failure'
import { newId } from '../ids'
import { presentTransfer } from '../objects/transfer'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { bookMoney } from './book-money'

/** Connected account -> platform, in full or in part, only as far as the account's balance bears it. */
export function reverseTransfer(
  turn: Turn,
  transfer: TransferRow,
  wish: { cents: number | null; metadata: Record<string, string> },
): ReversalRow {
  const left = transfer.amount - transfer.amountReversed
  const cents = wish.cents ?? left
  if (left === 0) throw refusal(undefined, `Transfer ${transfer.id} has already been reversed in full.`)
  if (cents < 1) throw badParameter('amount', 'Invalid positive integer', 'parameter_invalid_integer')
  if (cents > left)
    throw refusal(undefined, `Only ${left} c of transfer ${transfer.id} are left to reverse.`, {
      param: 'amount',
    })
  const account = turn.draft.get('accounts', transfer.accountId)
  if (!account || account.balance < cents) {
    throw refusal(
      'balance_insufficient',
      `Account ${transfer.accountId} does not hold enough for this reversal.`,
    )
  }
  const id = newId('trr')
  const reversal: ReversalRow = {
    id,
    createdS: turn.nowS,
    transferId: transfer.id,
    amount: cents,
    metadata: wish.metadata,
    balanceTransactionId: bookMoney(turn, { kind: 'transfer_refund', amount: cents, sourceId: id }),
  }
  const after: TransferRow = { ...transfer, amountReversed: transfer.amountReversed + cents }
  turn.draft.put({ table: 'reversals', row: reversal })
  turn.draft.put({ table: 'transfers', row: after })
  turn.draft.put({ table: 'accounts', row: { ...account, balance: account.balance - cents } })
  announce(turn, { type: 'transfer.reversed', object: presentTransfer(turn, after) })
  return reversal
}
