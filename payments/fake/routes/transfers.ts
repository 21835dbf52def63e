import type Stripe from 'stripe'
import { makeTransfer } from '../acts/make-transfer'
import { reverseTransfer } from '../acts/reverse-transfer'
import type { TransferRow } from '../books/rows'
import { badParameter, missingObject } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { integerOf, mapOf, requiredText, textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { presentTransfer } from '../objects/transfer'
import { presentReversal } from '../objects/transfer-reversal'

function findTransfer({ turn, id }: ApiRequest): TransferRow {
  const transfer = turn.draft.get('transfers', id)
  if (!transfer) throw missingObject('transfer', id)
  return transfer
}

function create({ turn, form }: ApiRequest): Stripe.Transfer {
  const destination = requiredText(form, 'destination')
  const account = turn.draft.get('accounts', destination)
  if (!account) throw missingObject('destination', destination, 'destination')
  if (requiredText(form, 'currency') !== 'usd') throw badParameter('currency', 'Only usd is imitated here.')
  const transfer = makeTransfer(turn, account, {
    cents: Number(requiredText(form, 'amount')),
    description: textOf(form, 'description'),
    transferGroup: textOf(form, 'transfer_group'),
    metadata: mapOf(form, 'metadata'),
  })
  return presentTransfer(turn, transfer)
}

export const transferEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/transfers',
    accepts: {
      amount: 'integer',
      currency: 'text',
      description: 'text',
      destination: 'text',
      expand: 'list',
      metadata: 'map',
      transfer_group: 'text',
    } satisfies ShapeOf<Stripe.TransferCreateParams>,
    answer: create,
  },
  {
    method: 'GET',
    path: '/v1/transfers',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      destination: 'text',
      transfer_group: 'text',
    } satisfies ShapeOf<Stripe.TransferListParams>,
    answer({ turn, form }) {
      const destination = textOf(form, 'destination')
      const group = textOf(form, 'transfer_group')
      return listPage(form, {
        url: '/v1/transfers',
        rows: turn.draft
          .all('transfers')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => destination === null || row.accountId === destination)
          .filter((row) => group === null || row.transferGroup === group),
        present: (row) => presentTransfer(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/transfers/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.TransferRetrieveParams>,
    answer: (request) => presentTransfer(request.turn, findTransfer(request)),
  },
  {
    method: 'POST',
    path: '/v1/transfers/:id/reversals',
    accepts: {
      amount: 'integer',
      expand: 'list',
      metadata: 'map',
    } satisfies ShapeOf<Stripe.TransferCreateReversalParams>,
    answer(request) {
      const reversal = reverseTransfer(request.turn, findTransfer(request), {
        cents: integerOf(request.form, 'amount'),
        metadata: mapOf(request.form, 'metadata'),
      })
      return presentReversal(request.turn, reversal)
    },
  },
]
