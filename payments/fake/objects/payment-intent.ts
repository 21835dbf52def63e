import { createHash } from 'node:crypto'
import type Stripe from 'stripe'
import type { PaymentRow } from '../books/rows'
import type { Turn } from '../turn'

function clientSecretOf(id: string): string {
  return `${id}_secret_${createHash('sha256').update(id).digest('hex').slice(0, 24)}`
}

function lastErrorOf(row: PaymentRow): Stripe.PaymentIntent.LastPaymentError | null {
  const last = row.lastDecline
  if (!last) return null
  return {
    type: 'card_error',
    code: last.code,
    message: last.message,
    ...(last.declineCode ? { decline_code: last.declineCode } : {}),
    ...(last.chargeId ? { charge: last.chargeId } : {}),
  }
}

function challengeUrl(turn: Turn, paymentId: string): string {
  return `${turn.world.origin}/challenge/${paymentId}`
}

export function presentPaymentIntent(turn: Turn, row: PaymentRow): Stripe.PaymentIntent {
  const asks = row.status === 'requires_action'
  return {
    id: row.id,
    object: 'payment_intent',
    allowed_payment_method_types: null,
    amount: row.amount,
    amount_capturable: row.status === 'requires_capture' ? row.amount : 0,
    amount_received: row.amountReceived,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: null,
    canceled_at: row.canceledAtS,
    cancellation_reason: row.cancellationReason,
    capture_method: row.captureMethod,
    client_secret: clientSecretOf(row.id),
    confirmation_method: 'automatic',
    created: row.createdS,
    currency: 'usd',
    customer: null,
    customer_account: null,
    description: row.description,
    excluded_payment_method_types: null,
    last_payment_error: lastErrorOf(row),
    latest_charge: row.chargeId,
    livemode: false,
    managed_payments: null,
    metadata: row.metadata,
    next_action: asks
      ? {
          type: 'redirect_to_url',
          redirect_to_url: { url: challengeUrl(turn, row.id), return_url: row.returnUrl },
        }
      : null,
    on_behalf_of: null,
    payment_method: row.paymentMethodId,
    payment_method_configuration_details: null,
    payment_method_options: null,
    payment_method_types: ['card'],
    payment_record: null,
    processing: null,
    receipt_email: null,
    review: null,
    setup_future_usage: null,
    shipping: null,
    source: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: row.status,
    transfer_data: null,
    transfer_group: row.transferGroup,
  }
}
