import type Stripe from 'stripe'
import type { ChargeRow } from '../books/rows'

export function presentCardDetails(row: ChargeRow): Stripe.Charge.PaymentMethodDetails.Card {
  const cvcRefused = row.decline?.code === 'incorrect_cvc'
  return {
    amount_authorized: row.status === 'succeeded' ? row.amount : null,
    authorization_code: null,
    brand: row.card.brand,
    // Present only on an authorisation that still waits for its capture.
    ...(row.captureBeforeS === null ? {} : { capture_before: row.captureBeforeS }),
    checks: {
      address_line1_check: null,
      address_postal_code_check: null,
      cvc_check: cvcRefused ? 'fail' : 'pass',
    },
    country: 'US',
    electronic_commerce_indicator: null,
    exp_month: row.card.expMonth,
    exp_year: row.card.expYear,
    funding: 'credit',
    installments: null,
    last4: row.card.last4,
    mandate: null,
    network: row.card.brand,
    network_transaction_id: null,
    regulated_status: 'unregulated',
    three_d_secure: null,
    transaction_link_id: null,
    wallet: null,
  }
}
