export type PaymentFailureKind = 'away' | 'declined' | 'insufficient' | 'lapsed' | 'refused' | 'unknown'

interface Details {
  code?: string | null
  declineCode?: string | null
  httpStatus?: number | null
  paymentStatus?: string | null
  cause?: unknown
}

/**
 * Why an act of payment did not happen. `away` leaves open whether it did (refused connection, time-out, 5xx, busy):
 * repeat it with the SAME idempotency key. After any other kind a new try needs a new key, for
 * the processor keeps its refusals under the old one.
 */
export class PaymentFailure extends Error {
  readonly kind: PaymentFailureKind
  /** The processor's own code, e.g. `balance_insufficient`; null when it gave none. */
  readonly code: string | null
  /** The bank's reason. For the records only: lost and stolen must read like any other decline. */
  readonly declineCode: string | null
  readonly httpStatus: number | null
  /** State of the payment intent the refusal speaks of; null when it speaks of none. */
  readonly paymentStatus: string | null

  constructor(kind: PaymentFailureKind, message: string, details: Details = {}) {
    super(message, { cause: details.cause })
    this.name = 'PaymentFailure'
    this.kind = kind
    this.code = details.code ?? null
    this.declineCode = details.declineCode ?? null
    this.httpStatus = details.httpStatus ?? null
    this.paymentStatus = details.paymentStatus ?? null
  }
}
