import type Stripe from 'stripe'
import { ApiFailure, missingObject } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import type { AccountRow } from '../books/rows'
import { presentBalance } from '../objects/balance'
import { presentBalanceTransaction } from '../objects/balance-transaction'

function accountOf({ turn, accountId }: ApiRequest): AccountRow | null {
  if (accountId === null) return null
  const account = turn.draft.get('accounts', accountId)
  if (!account) {
    const message = `The provided key does not have access to account '${accountId}'.`
    throw new ApiFailure(403, { type: 'invalid_request_error', code: 'account_invalid', message })
  }
  return account
}

export const balanceEndpoints: Endpoint[] = [
  {
    method: 'GET',
    path: '/v1/balance',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.BalanceRetrieveParams>,
    answer: (request) => presentBalance(request.turn, accountOf(request)),
  },
  {
    method: 'GET',
    path: '/v1/balance_transactions',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      source: 'text',
      type: 'text',
    } satisfies ShapeOf<Stripe.BalanceTransactionListParams>,
    answer({ turn, form }) {
      const source = textOf(form, 'source')
      const kind = textOf(form, 'type')
      return listPage(form, {
        url: '/v1/balance_transactions',
        rows: turn.draft
          .all('balanceTransactions')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => source === null || row.sourceId === source)
          .filter((row) => kind === null || row.kind === kind),
        present: (row) => presentBalanceTransaction(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/balance_transactions/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.BalanceTransactionRetrieveParams>,
    answer({ turn, id }) {
      const row = turn.draft.get('balanceTransactions', id)
      if (!row) throw missingObject('balance transaction', id)
      return presentBalanceTransaction(turn, row)
    },
  },
]
