import type { CardUsed } from '../card-used'
import type { Decline } from '../test-cards.facts'

/** What the practice processor writes down. Amounts are US cents, times are seconds of its own clock. */
export interface PaymentRow {
  id: string
  createdS: number
  amount: number
  amountReceived: number
  captureMethod: 'automatic' | 'manual'
  status:
    | 'requires_payment_method'
    | 'requires_confirmation'
    | 'requires_action'
    | 'requires_capture'
    | 'canceled'
    | 'succeeded'
  description: string | null
  transferGroup: string | null
  metadata: Record<string, string>
  paymentMethodId: string | null
  /** The card chosen but not yet charged: before confirmation, or while the bank asks its holder. */
  card: CardUsed | null
  returnUrl: string | null
  chargeId: string | null
  lastDecline: (Decline & { chargeId: string | null }) | null
  canceledAtS: number | null
  cancellationReason: 'automatic' | 'abandoned' | 'duplicate' | 'fraudulent' | 'requested_by_customer' | null
  sessionId: string | null
}

export interface ChargeRow {
  id: string
  createdS: number
  paymentId: string
  amount: number
  amountCaptured: number
  amountRefunded: number
  status: 'failed' | 'succeeded'
  captured: boolean
  /** An authorisation given up: by us, or because it lapsed. */
  released: boolean
  disputed: boolean
  captureBeforeS: number | null
  decline: Decline | null
  card: CardUsed
  balanceTransactionId: string | null
  description: string | null
  transferGroup: string | null
  metadata: Record<string, string>
}

export interface BalanceTransactionRow {
  id: string
  createdS: number
  availableOnS: number
  kind: 'adjustment' | 'charge' | 'refund' | 'topup' | 'transfer' | 'transfer_refund'
  amount: number
  fee: number
  sourceId: string | null
  description: string | null
}

export interface RefundRow {
  id: string
  createdS: number
  chargeId: string
  paymentId: string
  amount: number
  status: 'pending' | 'succeeded'
  reason: 'duplicate' | 'fraudulent' | 'requested_by_customer' | null
  metadata: Record<string, string>
  balanceTransactionId: string | null
}

export interface LineRow {
  id: string
  name: string
  description: string | null
  unitAmount: number
  quantity: number
}

export interface SessionRow {
  id: string
  createdS: number
  expiresAtS: number
  status: 'complete' | 'expired' | 'open'
  lines: LineRow[]
  successUrl: string
  cancelUrl: string | null
  clientReferenceId: string | null
  customerEmail: string | null
  submitType: 'auto' | 'book' | 'pay' | null
  metadata: Record<string, string>
  captureMethod: 'automatic' | 'manual'
  description: string | null
  transferGroup: string | null
  paymentMetadata: Record<string, string>
  paymentId: string | null
}

export interface AccountRow {
  id: string
  createdS: number
  country: string
  email: string | null
  businessName: string | null
  metadata: Record<string, string>
  requested: { cardPayments: boolean; transfers: boolean }
  detailsSubmitted: boolean
  chargesEnabled: boolean
  payoutsEnabled: boolean
  balance: number
}

export interface AccountLinkRow {
  id: string
  createdS: number
  expiresAtS: number
  accountId: string
  refreshUrl: string
  returnUrl: string
  used: boolean
}

export interface TransferRow {
  id: string
  createdS: number
  amount: number
  amountReversed: number
  accountId: string
  description: string | null
  transferGroup: string | null
  metadata: Record<string, string>
  balanceTransactionId: string
}

export interface ReversalRow {
  id: string
  createdS: number
  transferId: string
  amount: number
  metadata: Record<string, string>
  balanceTransactionId: string
}

export interface DisputeRow {
  id: string
  createdS: number
  dueByS: number
  chargeId: string
  paymentId: string
  amount: number
  reason: string
  status: 'lost' | 'needs_response' | 'won'
  balanceTransactionIds: string[]
}

export interface DeliveryRow {
  id: string
  state: 'abandoned' | 'acknowledged' | 'waiting'
  attempts: number
}

/** The answer kept for an idempotency key. Real time: key expiry does not follow the injected clock. */
export interface ReplyRow {
  id: string
  fingerprint: string
  keptAtMs: number
  requestId: string
  status: number
  body: string
}
