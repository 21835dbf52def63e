import type Stripe from 'stripe'
import { refundCharge } from '../acts/refund-charge'
import type { ChargeRow } from '../books/rows'
import { badParameter, missingObject } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { integerOf, mapOf, oneOf, textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { presentRefund } from '../objects/refund'

const reasons = ['duplicate', 'fraudulent', 'requested_by_customer'] as const

function findCharge({ turn, form }: ApiRequest): ChargeRow {
  const paymentId = textOf(form, 'payment_intent')
  const given = textOf(form, 'charge')
  if (!paymentId && !given) {
    throw badParameter('charge', 'One of charge or payment_intent is needed.', 'parameter_missing')
  }
  const payment = paymentId === null ? undefined : turn.draft.get('payments', paymentId)
  if (paymentId !== null && !payment) throw missingObject('payment_intent', paymentId, 'payment_intent')
  const id = given ?? payment?.chargeId
  const charge = id ? turn.draft.get('charges', id) : undefined
  if (!charge) throw missingObject('charge', id ?? '', 'charge')
  return charge
}

export const refundEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/refunds',
    accepts: {
      amount: 'integer',
      charge: 'text',
      expand: 'list',
      metadata: 'map',
      payment_intent: 'text',
      reason: 'text',
    } satisfies ShapeOf<Stripe.RefundCreateParams>,
    answer(request) {
      const { turn, form } = request
      const refund = refundCharge(turn, findCharge(request), {
        cents: integerOf(form, 'amount'),
        reason: oneOf(form, 'reason', reasons),
        metadata: mapOf(form, 'metadata'),
      })
      return presentRefund(turn, refund)
    },
  },
  {
    method: 'GET',
    path: '/v1/refunds',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      charge: 'text',
      payment_intent: 'text',
    } satisfies ShapeOf<Stripe.RefundListParams>,
    answer({ turn, form }) {
      const chargeId = textOf(form, 'charge')
      const paymentId = textOf(form, 'payment_intent')
      return listPage(form, {
        url: '/v1/refunds',
        rows: turn.draft
          .all('refunds')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => chargeId === null || row.chargeId === chargeId)
          .filter((row) => paymentId === null || row.paymentId === paymentId),
        present: (row) => presentRefund(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/refunds/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.RefundRetrieveParams>,
    answer({ turn, id }) {
      const refund = turn.draft.get('refunds', id)
      if (!refund) throw missingObject('refund', id)
      return presentRefund(turn, refund)
    },
  },
]
