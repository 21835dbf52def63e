import type Stripe from 'stripe'
import { cancelPayment } from '../acts/cancel-payment'
import { capturePayment } from '../acts/capture-payment'
import { chargeCard } from '../acts/charge-card'
import { lapseIfDue } from '../acts/lapse'
import { wrongState } from '../acts/wrong-state'
import type { PaymentRow } from '../books/rows'
import { cardFromToken } from '../card-used'
import { ApiFailure, badParameter, missingObject } from '../failure'
import type { ApiRequest, Endpoint } from '../http/endpoint'
import { chargeAmountOf, integerOf, mapOf, oneOf, requiredText, textOf, type Form } from '../http/form'
import { createdParameters, isCreatedIn, listPage, pageParameters } from '../http/list-page'
import type { ShapeOf } from '../http/shape'
import { newId } from '../ids'
import { presentPaymentIntent } from '../objects/payment-intent'
import type { Turn } from '../turn'

const captureMethods = ['automatic', 'automatic_async', 'manual'] as const
const reasons = ['abandoned', 'duplicate', 'fraudulent', 'requested_by_customer'] as const
const YEAR_S = 31_557_600

function findPayment({ turn, id }: ApiRequest): PaymentRow {
  const found = turn.draft.get('payments', id)
  if (!found) throw missingObject('payment_intent', id, 'intent')
  return lapseIfDue(turn, found)
}

function confirm(turn: Turn, payment: PaymentRow, form: Form): PaymentRow {
  const token = requiredText(form, 'payment_method')
  const card = cardFromToken(token, 1970 + Math.floor(turn.nowS / YEAR_S))
  if (!card) throw badParameter('payment_method', `No such PaymentMethod: '${token}'`, 'resource_missing')
  const begun: PaymentRow = {
    ...payment,
    paymentMethodId: newId('pm'),
    returnUrl: textOf(form, 'return_url'),
  }
  const after = chargeCard(turn, begun, card)
  const last = after.lastDecline
  if (!last) return after
  throw new ApiFailure(
    402,
    {
      type: 'card_error',
      code: last.code,
      message: last.message,
      decline_code: last.declineCode,
      charge: last.chargeId ?? undefined,
      payment_intent: presentPaymentIntent(turn, after),
    },
    { keeps: true },
  )
}

function create({ turn, form }: ApiRequest): Stripe.PaymentIntent {
  const amount = chargeAmountOf(form, 'amount')
  if (requiredText(form, 'currency') !== 'usd') throw badParameter('currency', 'Only usd is imitated here.')
  const captureMethod = oneOf(form, 'capture_method', captureMethods)
  const payment: PaymentRow = {
    id: newId('pi'),
    createdS: turn.nowS,
    amount,
    amountReceived: 0,
    captureMethod: captureMethod === 'manual' ? 'manual' : 'automatic',
    status: 'requires_payment_method',
    description: textOf(form, 'description'),
    transferGroup: textOf(form, 'transfer_group'),
    metadata: mapOf(form, 'metadata'),
    paymentMethodId: null,
    card: null,
    returnUrl: textOf(form, 'return_url'),
    chargeId: null,
    lastDecline: null,
    canceledAtS: null,
    cancellationReason: null,
    sessionId: null,
  }
  turn.draft.put({ table: 'payments', row: payment })
  const isConfirmed = textOf(form, 'confirm') === 'true'
  return presentPaymentIntent(turn, isConfirmed ? confirm(turn, payment, form) : payment)
}

export const paymentIntentEndpoints: Endpoint[] = [
  {
    method: 'POST',
    path: '/v1/payment_intents',
    accepts: {
      amount: 'integer',
      capture_method: 'text',
      confirm: 'boolean',
      currency: 'text',
      description: 'text',
      expand: 'list',
      metadata: 'map',
      payment_method: 'text',
      return_url: 'text',
      transfer_group: 'text',
    } satisfies ShapeOf<Stripe.PaymentIntentCreateParams>,
    answer: create,
  },
  {
    method: 'GET',
    path: '/v1/payment_intents',
    accepts: { ...pageParameters, ...createdParameters } satisfies ShapeOf<Stripe.PaymentIntentListParams>,
    answer: ({ turn, form }) =>
      listPage(form, {
        url: '/v1/payment_intents',
        rows: turn.draft.all('payments').filter((row) => isCreatedIn(form, row.createdS)),
        present: (row) => presentPaymentIntent(turn, row),
      }),
  },
  {
    method: 'GET',
    path: '/v1/payment_intents/:id',
    accepts: { expand: 'list' } satisfies ShapeOf<Stripe.PaymentIntentRetrieveParams>,
    answer: (request) => presentPaymentIntent(request.turn, findPayment(request)),
  },
  {
    method: 'POST',
    path: '/v1/payment_intents/:id/confirm',
    accepts: {
      expand: 'list',
      payment_method: 'text',
      return_url: 'text',
    } satisfies ShapeOf<Stripe.PaymentIntentConfirmParams>,
    answer(request) {
      const payment = findPayment(request)
      if (payment.status !== 'requires_payment_method') throw wrongState(request.turn, payment, 'confirmed')
      return presentPaymentIntent(request.turn, confirm(request.turn, payment, request.form))
    },
  },
  {
    method: 'POST',
    path: '/v1/payment_intents/:id/capture',
    accepts: {
      amount_to_capture: 'integer',
      expand: 'list',
    } satisfies ShapeOf<Stripe.PaymentIntentCaptureParams>,
    answer(request) {
      const cents = integerOf(request.form, 'amount_to_capture')
      return presentPaymentIntent(request.turn, capturePayment(request.turn, findPayment(request), cents))
    },
  },
  {
    method: 'POST',
    path: '/v1/payment_intents/:id/cancel',
    accepts: {
      cancellation_reason: 'text',
      expand: 'list',
    } satisfies ShapeOf<Stripe.PaymentIntentCancelParams>,
    answer(request) {
      const payment = findPayment(request)
      const reason = oneOf(request.form, 'cancellation_reason', reasons)
      if (payment.status === 'canceled' || payment.status === 'succeeded')
        throw wrongState(request.turn, payment, 'canceled')
      return presentPaymentIntent(request.turn, cancelPayment(request.turn, payment, reason))
    },
  },
]
