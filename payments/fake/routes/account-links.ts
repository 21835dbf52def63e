import type Stripe from 'stripe'
import type { AccountLinkRow } from '../books/rows'
import { badParameter, missingObject } from '../failure'
import type { Endpoint } from '../http/endpoint'
import { oneOf, requiredText, textOf } from '../http/form'
import type { ShapeOf } from '../http/shape'
import { newId } from '../ids'
import { presentAccountLink } from '../objects/account-link'

/** From memory: an onboarding link is good for a few minutes and for one person going through it once. */
const LINK_LIFE_S = 300

export const accountLinkEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/account_links',
    accepts: {
      account: 'text',
      expand: 'list',
      refresh_url: 'text',
      return_url: 'text',
      type: 'text',
    } satisfies ShapeOf<Stripe.AccountLinkCreateParams>,
    answer({ turn, form }) {
      const accountId = requiredText(form, 'account')
      if (!turn.draft.get('accounts', accountId)) throw missingObject('account', accountId, 'account')
      if (oneOf(form, 'type', ['account_onboarding']) === null) {
        throw badParameter('type', 'Missing required param: type.', 'parameter_missing')
      }
      for (const name of ['refresh_url', 'return_url']) {
        if (!URL.canParse(textOf(form, name) ?? ''))
          throw badParameter(name, `Not a valid URL: ${name}`, 'url_invalid')
      }
      const link: AccountLinkRow = {
        id: newId('alink'),
        createdS: turn.nowS,
        expiresAtS: turn.nowS + LINK_LIFE_S,
        accountId,
        refreshUrl: requiredText(form, 'refresh_url'),
        returnUrl: requiredText(form, 'return_url'),
        used: false,
      }
      turn.draft.put({ table: 'accountLinks', row: link })
      return presentAccountLink(turn, link)
    },
  },
]
