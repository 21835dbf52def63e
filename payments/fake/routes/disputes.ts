import type Stripe from 'stripe'
import { missingObject } from '../failure'
import type { Endpoint } from '../http/endpoint'
import type { ShapeOf } from '../http/shape'
import { presentDispute } from '../objects/dispute'

export const disputeEndpoints: Endpoint[] = [
  {
    method: 'GET',
    path: '/v1/disputes/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.DisputeRetrieveParams>,
    answer({ turn, id }) {
      const dispute = turn.draft.get('disputes', id)
      if (!dispute) throw missingObject('dispute', id, 'dispute')
      return presentDispute(turn, dispute)
    },
  },
]
