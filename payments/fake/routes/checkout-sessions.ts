import type Stripe from 'stripe'
import { expireSession } from '../acts/expire-session'
import type { LineRow, SessionRow } from '../books/rows'
import { badParameter, missingObject, refusal } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { indexesOf, integerOf, mapOf, oneOf, requiredText, textOf, type Form } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { newId } from '../ids'
import { presentSession, totalOf } from '../objects/checkout-session'

const MINUTE_S = 60
const SHORTEST_MIN = 30
const LONGEST_MIN = 24 * 60
const SMALLEST_CENTS = 50
const captureMethods = ['automatic', 'automatic_async', 'manual'] as const

function lineOf(form: Form, index: string): LineRow {
  const price = `line_items[${index}][price_data]`
  if (requiredText(form, `${price}[currency]`) !== 'usd') {
    throw badParameter(`${price}[currency]`, 'Only usd is imitated here.')
  }
  const unitAmount = Number(requiredText(form, `${price}[unit_amount]`))
  const quantity = Number(requiredText(form, `line_items[${index}][quantity]`))
  if (unitAmount < 0) throw badParameter(`${price}[unit_amount]`, 'Invalid non-negative integer')
  if (quantity < 1) throw badParameter(`line_items[${index}][quantity]`, 'Invalid positive integer')
  return {
    id: newId('li'),
    name: requiredText(form, `${price}[product_data][name]`),
    description: textOf(form, `${price}[product_data][description]`),
    unitAmount,
    quantity,
  }
}

/** A page stays open 24 hours unless told otherwise; never under 30 minutes (from memory). */
function expiryOf({ turn, form }: ApiRequest): number {
  const wanted = integerOf(form, 'expires_at')
  if (wanted === null) return turn.nowS + LONGEST_MIN * MINUTE_S
  if (wanted < turn.nowS + SHORTEST_MIN * MINUTE_S) {
    throw badParameter('expires_at', 'The `expires_at` timestamp must be at least 30 minutes from now.')
  }
  if (wanted > turn.nowS + LONGEST_MIN * MINUTE_S) {
    throw badParameter('expires_at', 'The `expires_at` timestamp must be at most 24 hours from now.')
  }
  return wanted
}

function addressOf(form: Form, name: string): string {
  const address = requiredText(form, name)
  if (!URL.canParse(address) || !/^https?:/.test(address)) {
    throw badParameter(name, `Not a valid URL: ${name}`, 'url_invalid')
  }
  return address
}

function create(request: ApiRequest): Stripe.Checkout.Session {
  const { turn, form } = request
  if (oneOf(form, 'mode', ['payment']) === null)
    throw badParameter('mode', 'Missing required param: mode.', 'parameter_missing')
  const session: SessionRow = {
    id: newId('cs_test'),
    createdS: turn.nowS,
    expiresAtS: expiryOf(request),
    status: 'open',
    lines: indexesOf(form, 'line_items').map((index) => lineOf(form, index)),
    successUrl: addressOf(form, 'success_url'),
    cancelUrl: textOf(form, 'cancel_url') === null ? null : addressOf(form, 'cancel_url'),
    clientReferenceId: textOf(form, 'client_reference_id'),
    customerEmail: textOf(form, 'customer_email'),
    submitType: oneOf(form, 'submit_type', ['auto', 'book', 'pay']),
    metadata: mapOf(form, 'metadata'),
    captureMethod:
      oneOf(form, 'payment_intent_data[capture_method]', captureMethods) === 'manual'
        ? 'manual'
        : 'automatic',
    description: textOf(form, 'payment_intent_data[description]'),
    transferGroup: textOf(form, 'payment_intent_data[transfer_group]'),
    paymentMetadata: mapOf(form, 'payment_intent_data[metadata]'),
    paymentId: null,
  }
  if (totalOf(session) < SMALLEST_CENTS) {
    throw badParameter('line_items', 'The total must be at least 50 cents.', 'amount_too_small')
  }
  turn.draft.put({ table: 'sessions', row: session })
  return presentSession(turn, session)
}

function findSession({ turn, id }: ApiRequest): SessionRow {
  const session = turn.draft.get('sessions', id)
  if (!session) throw missingObject('checkout.session', id, 'session')
  return session
}

export const checkoutSessionEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/checkout/sessions',
    accepts: {
      allowed_payment_method_types: 'list',
      cancel_url: 'text',
      client_reference_id: 'text',
      customer_email: 'text',
      expand: 'list',
      expires_at: 'integer',
      line_items: [
        {
          price_data: {
            currency: 'text',
            product_data: { description: 'text', name: 'text' },
            unit_amount: 'integer',
          },
          quantity: 'integer',
        },
      ],
      metadata: 'map',
      mode: 'text',
      payment_intent_data: {
        capture_method: 'text',
        description: 'text',
        metadata: 'map',
        transfer_group: 'text',
      },
      submit_type: 'text',
      success_url: 'text',
    } satisfies ShapeOf<Stripe.Checkout.SessionCreateParams>,
    answer: create,
  },
  {
    method: 'GET',
    path: '/v1/checkout/sessions',
    accepts: {
      ...pageParameters,
      ...createdParameters,
      payment_intent: 'text',
      status: 'text',
    } satisfies ShapeOf<Stripe.Checkout.SessionListParams>,
    answer({ turn, form }) {
      const paymentId = textOf(form, 'payment_intent')
      const status = oneOf(form, 'status', ['complete', 'expired', 'open'])
      return listPage(form, {
        url: '/v1/checkout/sessions',
        rows: turn.draft
          .all('sessions')
          .filter((row) => isCreatedIn(form, row.createdS))
          .filter((row) => paymentId === null || row.paymentId === paymentId)
          .filter((row) => status === null || row.status === status),
        present: (row) => presentSession(turn, row),
      })
    },
  },
  {
    method: 'GET',
    path: '/v1/checkout/sessions/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.Checkout.SessionRetrieveParams>,
    answer: (request) => presentSession(request.turn, findSession(request)),
  },
  {
    method: 'POST',
    path: '/v1/checkout/sessions/:id/expire',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.Checkout.SessionExpireParams>,
    answer(request) {
      const session = findSession(request)
      if (session.status !== 'open') {
        throw refusal(
          undefined,
          `Only open Checkout Sessions can be expired; this one has a status of ${session.status}.`,
        )
      }
      return presentSession(request.turn, expireSession(request.turn, session))
    },
  },
]
