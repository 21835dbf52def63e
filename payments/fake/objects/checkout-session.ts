import type Stripe from 'stripe'
import type { LineRow, SessionRow } from '../books/rows'
import type { Turn } from '../turn'

export function totalOf(row: SessionRow): number {
  return row.lines.reduce((sum, line) => sum + line.unitAmount * line.quantity, 0)
}

export function presentLine(line: LineRow): Stripe.LineItem {
  const amount = line.unitAmount * line.quantity
  return {
    id: line.id,
    object: 'item',
    adjustable_quantity: null,
    amount_discount: 0,
    amount_subtotal: amount,
    amount_tax: 0,
    amount_total: amount,
    currency: 'usd',
    description: line.name,
    metadata: {},
    price: null,
    quantity: line.quantity,
  }
}

/** With a hold the session stays unpaid until the capture (from memory): read the payment, not this. */
function paymentStatusOf(turn: Turn, row: SessionRow): Stripe.Checkout.Session.PaymentStatus {
  const payment = row.paymentId === null ? undefined : turn.draft.get('payments', row.paymentId)
  return payment?.status === 'succeeded' ? 'paid' : 'unpaid'
}

export function presentSession(turn: Turn, row: SessionRow): Stripe.Checkout.Session {
  const amount = totalOf(row)
  return {
    id: row.id,
    object: 'checkout.session',
    adaptive_pricing: null,
    after_expiration: null,
    allow_promotion_codes: null,
    allowed_payment_method_types: ['card'],
    amount_subtotal: amount,
    amount_total: amount,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    billing_address_collection: null,
    cancel_url: row.cancelUrl,
    client_reference_id: row.clientReferenceId,
    client_secret: null,
    collected_information: null,
    consent: null,
    consent_collection: null,
    created: row.createdS,
    currency: 'usd',
    currency_conversion: null,
    custom_fields: [],
    custom_text: {
      after_submit: null,
      shipping_address: null,
      submit: null,
      terms_of_service_acceptance: null,
    },
    customer: null,
    customer_account: null,
    customer_creation: 'if_required',
    customer_details: null,
    customer_email: row.customerEmail,
    discounts: null,
    expires_at: row.expiresAtS,
    integration_identifier: null,
    invoice: null,
    invoice_creation: null,
    livemode: false,
    locale: null,
    managed_payments: null,
    metadata: row.metadata,
    mode: 'payment',
    origin_context: null,
    payment_intent: row.paymentId,
    payment_link: null,
    payment_method_collection: 'if_required',
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: ['card'],
    payment_status: paymentStatusOf(turn, row),
    permissions: null,
    recovered_from: null,
    saved_payment_method_options: null,
    setup_intent: null,
    shipping_address_collection: null,
    shipping_cost: null,
    shipping_options: [],
    status: row.status,
    submit_type: row.submitType,
    subscription: null,
    success_url: row.successUrl,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted_page',
    url: row.status === 'open' ? `${turn.world.origin}/pay/${row.id}` : null,
    wallet_options: null,
  }
}
