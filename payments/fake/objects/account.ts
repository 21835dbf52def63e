import type Stripe from 'stripe'
import type { AccountRow } from '../books/rows'
import type { Turn } from '../turn'

/** What an individual in the US is asked for; names as the processor writes them, the choice is ours. */
const asked = [
  'business_type',
  'external_account',
  'individual.dob.day',
  'individual.ssn_last_4',
  'tos_acceptance.date',
]

export function mayReceiveTransfers(row: AccountRow): boolean {
  return row.requested.transfers && row.detailsSubmitted && row.payoutsEnabled
}

function requirementsOf(row: AccountRow): Stripe.Account.Requirements {
  const due = row.detailsSubmitted ? [] : asked
  const stopped = row.detailsSubmitted && !row.payoutsEnabled
  return {
    alternatives: [],
    current_deadline: null,
    currently_due: due,
    disabled_reason: stopped ? 'under_review' : due.length > 0 ? 'requirements.past_due' : null,
    errors: [],
    eventually_due: due,
    past_due: due,
    pending_verification: [],
  }
}

function capabilitiesOf(row: AccountRow): Stripe.Account.Capabilities {
  const transfers = mayReceiveTransfers(row) ? 'active' : 'inactive'
  const cards = row.detailsSubmitted && row.chargesEnabled ? 'active' : 'inactive'
  return {
    ...(row.requested.cardPayments ? { card_payments: cards } : {}),
    ...(row.requested.transfers ? { transfers } : {}),
  }
}

export function presentAccount(_turn: Turn, row: AccountRow): Stripe.Account {
  return {
    id: row.id,
    object: 'account',
    capabilities: capabilitiesOf(row),
    charges_enabled: row.chargesEnabled,
    controller: {
      fees: { payer: 'application' },
      is_controller: true,
      losses: { payments: 'application' },
      requirement_collection: 'stripe',
      stripe_dashboard: { type: 'express' },
      type: 'application',
    },
    country: row.country,
    created: row.createdS,
    default_currency: 'usd',
    details_submitted: row.detailsSubmitted,
    email: row.email,
    metadata: row.metadata,
    payouts_enabled: row.payoutsEnabled,
    requirements: requirementsOf(row),
    type: 'express',
  }
}
