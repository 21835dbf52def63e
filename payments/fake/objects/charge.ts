import type Stripe from 'stripe'
import type { ChargeRow } from '../books/rows'
import type { Turn } from '../turn'
import { presentCardDetails } from './card-details'

const nobody = { address: null, email: null, phone: null, tax_id: null }

function outcomeOf(row: ChargeRow): Stripe.Charge.Outcome {
  const declined = row.status === 'failed'
  return {
    advice_code: null,
    network_advice_code: null,
    network_decline_code: null,
    network_status: declined ? 'declined_by_network' : 'approved_by_network',
    reason: row.decline ? (row.decline.declineCode ?? row.decline.code) : null,
    risk_level: 'normal',
    seller_message: declined ? 'The bank declined the payment.' : 'Payment complete.',
    type: declined ? 'issuer_declined' : 'authorized',
  }
}

export function presentCharge(_turn: Turn, row: ChargeRow): Stripe.Charge {
  return {
    id: row.id,
    object: 'charge',
    amount: row.amount,
    amount_captured: row.amountCaptured,
    amount_refunded: row.released ? row.amount : row.amountRefunded,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: row.balanceTransactionId,
    billing_details: { ...nobody, name: row.card.holder },
    calculated_statement_descriptor: null,
    captured: row.captured,
    created: row.createdS,
    currency: 'usd',
    customer: null,
    description: row.description,
    disputed: row.disputed,
    failure_balance_transaction: null,
    failure_code: row.decline?.code ?? null,
    failure_message: row.decline?.message ?? null,
    fraud_details: {},
    livemode: false,
    metadata: row.metadata,
    on_behalf_of: null,
    outcome: outcomeOf(row),
    paid: row.status === 'succeeded',
    payment_intent: row.paymentId,
    payment_method: null,
    payment_method_details: { card: presentCardDetails(row), type: 'card' },
    receipt_email: null,
    receipt_number: null,
    receipt_url: null,
    refunded: row.released || (row.captured && row.amountRefunded === row.amountCaptured),
    review: null,
    shipping: null,
    source: null,
    source_transfer: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: row.status,
    transfer_data: null,
    transfer_group: row.transferGroup,
  }
}
