import type { AccountRow, TransferRow } from '../books/rows'
import { badParameter, refusal } from '../failure'
import { newId } from '../ids'
import { mayReceiveTransfers } from '../objects/account'
import { platformBalance } from '../objects/balance'
import { presentTransfer } from '../objects/transfer'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { bookMoney } from './book-money'

interface Wish {
  cents: number
  description: string | null
  transferGroup: string | null
  metadata: Record<string, string>
}

/** Platform balance -> connected account, any number of times; refused when the balance does not bear it. */
export function makeTransfer(turn: Turn, account: AccountRow, wish: Wish): TransferRow {
  if (wish.cents < 1) throw badParameter('amount', 'Invalid positive integer', 'parameter_invalid_integer')
  if (!mayReceiveTransfers(account)) {
    const message = `Account ${account.id} may not receive transfers: its onboarding is incomplete or payouts are stopped.`
    throw refusal('insufficient_capabilities_for_transfer', message)
  }
  if (platformBalance(turn).availableCents < wish.cents) {
    throw refusal(
      'balance_insufficient',
      'The available balance of the platform is too small for this transfer.',
    )
  }
  const id = newId('tr')
  const transfer: TransferRow = {
    id,
    createdS: turn.nowS,
    amount: wish.cents,
    amountReversed: 0,
    accountId: account.id,
    description: wish.description,
    transferGroup: wish.transferGroup,
    metadata: wish.metadata,
    balanceTransactionId: bookMoney(turn, { kind: 'transfer', amount: -wish.cents, sourceId: id }),
  }
  turn.draft.put({ table: 'transfers', row: transfer })
  turn.draft.put({ table: 'accounts', row: { ...account, balance: account.balance + wish.cents } })
  announce(turn, { type: 'transfer.created', object: presentTransfer(turn, transfer) })
  return transfer
}
