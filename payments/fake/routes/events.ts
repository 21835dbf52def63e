import type Stripe from 'stripe'
import { missingObject } from '../failure'
import type { Endpoint } from '../http/endpoint'
import { listOf, textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { presentEvent } from '../objects/event'

export const eventEndpoints: Endpoint[] = [
  {
    method: 'GET',
    path: '/v1/events',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      type: 'text',
      types: 'list',
    } satisfies ShapeOf<Stripe.EventListParams>,
    answer({ turn, form }) {
      const one = textOf(form, 'type')
      const wanted = one === null ? listOf(form, 'types') : [one]
      return listPage(form, {
        url: '/v1/events',
        rows: turn.draft
          .all('events')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => wanted.length === 0 || wanted.includes(row.type)),
        present: (row) => presentEvent(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/events/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.EventRetrieveParams>,
    answer({ turn, id }) {
      const event = turn.draft.get('events', id)
      if (!event) throw missingObject('event', id)
      return presentEvent(turn, event)
    },
  },
]
