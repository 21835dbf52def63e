import type Stripe from 'stripe'
import { missingObject } from '../failure'
import type { Endpoint } from '../http/endpoint'
import { textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { presentCharge } from '../objects/charge'

export const chargeEndpoints: Endpoint[] = [
  {
    method: 'GET',
    path: '/v1/charges',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      payment_intent: 'text',
      transfer_group: 'text',
    } satisfies ShapeOf<Stripe.ChargeListParams>,
    answer({ turn, form }) {
      const paymentId = textOf(form, 'payment_intent')
      const group = textOf(form, 'transfer_group')
      return listPage(form, {
        url: '/v1/charges',
        rows: turn.draft
          .all('charges')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => paymentId === null || row.paymentId === paymentId)
          .filter((row) => group === null || row.transferGroup === group),
        present: (row) => presentCharge(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/charges/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.ChargeRetrieveParams>,
    answer({ turn, id }) {
      const charge = turn.draft.get('charges', id)
      if (!charge) throw missingObject('charge', id)
      return presentCharge(turn, charge)
    },
  },
]
