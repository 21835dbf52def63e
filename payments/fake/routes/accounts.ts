import type Stripe from 'stripe'
import type { AccountRow } from '../books/rows'
import { badParameter, missingObject } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { mapOf, oneOf, textOf } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { newId } from '../ids'
import { presentAccount } from '../objects/account'

/** Only the Express kind is imitated: the platform pays fees and losses, the processor asks the questions. */
function checkController({ form }: ApiRequest): void {
  if (textOf(form, 'type') === 'express') return
  oneOf(form, 'controller[fees][payer]', ['application'])
  oneOf(form, 'controller[losses][payments]', ['application'])
  oneOf(form, 'controller[requirement_collection]', ['stripe'])
  if (oneOf(form, 'controller[stripe_dashboard][type]', ['express']) === null) {
    throw badParameter('controller', 'Only Express accounts are imitated here.')
  }
}

function create(request: ApiRequest): Stripe.Account {
  const { turn, form } = request
  checkController(request)
  oneOf(form, 'country', ['US'])
  const account: AccountRow = {
    id: newId('acct').slice(0, 21),
    createdS: turn.nowS,
    country: 'US',
    email: textOf(form, 'email'),
    businessName: textOf(form, 'business_profile[name]'),
    metadata: mapOf(form, 'metadata'),
    requested: {
      cardPayments: textOf(form, 'capabilities[card_payments][requested]') === 'true',
      transfers: textOf(form, 'capabilities[transfers][requested]') === 'true',
    },
    detailsSubmitted: false,
    chargesEnabled: false,
    payoutsEnabled: false,
    balance: 0,
  }
  turn.draft.put({ table: 'accounts', row: account })
  return presentAccount(turn, account)
}

export const accountEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/accounts',
    accepts: {
      business_profile: { name: 'text' },
      capabilities: { card_payments: { requested: 'boolean' }, transfers: { requested: 'boolean' } },
      controller: {
        fees: { payer: 'text' },
        losses: { payments: 'text' },
        requirement_collection: 'text',
        stripe_dashboard: { type: 'text' },
      },
      country: 'text',
      email: 'text',
      expand: 'list',
      metadata: 'map',
      type: 'text',
    } satisfies ShapeOf<Stripe.AccountCreateParams>,
    answer: create,
  },
  {
    method: 'GET',
    path: '/v1/accounts',
    accepts: { ...pageParameters, ...createdParameters } satisfies ShapeOf<Stripe.AccountListParams>,
    answer: ({ turn, form }) =>
      listPage(form, {
        url: '/v1/accounts',
        rows: turn.draft.all('accounts').filter((row) => isCreatedIn(form, row.createdS)),
        present: (row) => presentAccount(turn, row),
      }),
  },
  {
    method: 'GET',
    path: '/v1/accounts/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.AccountRetrieveParams>,
    answer({ turn, id }) {
      const account = turn.draft.get('accounts', id)
      if (!account) throw missingObject('account', id, 'account')
      return presentAccount(turn, account)
    },
  },
]
