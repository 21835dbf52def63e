import type Stripe from 'stripe'
import type { DisputeRow } from '../books/rows'
import type { Turn } from '../turn'
import { presentBalanceTransaction } from './balance-transaction'

const noEvidence: Stripe.Dispute.Evidence = {
  access_activity_log: null,
  billing_address: null,
  cancellation_policy: null,
  cancellation_policy_disclosure: null,
  cancellation_rebuttal: null,
  customer_communication: null,
  customer_email_address: null,
  customer_name: null,
  customer_purchase_ip: null,
  customer_signature: null,
  duplicate_charge_documentation: null,
  duplicate_charge_explanation: null,
  duplicate_charge_id: null,
  enhanced_evidence: {},
  product_description: null,
  receipt: null,
  refund_policy: null,
  refund_policy_disclosure: null,
  refund_refusal_explanation: null,
  service_date: null,
  service_documentation: null,
  shipping_address: null,
  shipping_carrier: null,
  shipping_date: null,
  shipping_documentation: null,
  shipping_tracking_number: null,
  uncategorized_file: null,
  uncategorized_text: null,
}

export function presentDispute(turn: Turn, row: DisputeRow): Stripe.Dispute {
  const moves = row.balanceTransactionIds.map((id) => turn.draft.get('balanceTransactions', id))
  return {
    id: row.id,
    object: 'dispute',
    amount: row.amount,
    balance_transactions: moves
      .filter((move) => move !== undefined)
      .map((move) => presentBalanceTransaction(turn, move)),
    charge: row.chargeId,
    created: row.createdS,
    currency: 'usd',
    enhanced_eligibility_types: [],
    evidence: noEvidence,
    evidence_details: {
      due_by: row.dueByS,
      enhanced_eligibility: {},
      has_evidence: false,
      past_due: row.dueByS < turn.nowS,
      submission_count: 0,
      submission_method: 'not_submitted',
    },
    intended_submission_method: null,
    is_charge_refundable: false,
    livemode: false,
    metadata: {},
    payment_intent: row.paymentId,
    reason: row.reason,
    status: row.status,
  }
}
