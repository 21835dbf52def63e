import Stripe from 'stripe'
import { PaymentFailure, type PaymentFailureKind } from './payment-failure'
import { configuredPayments } from './stripe'

const { errors } = Stripe

const lapsedCodes = ['charge_expired_for_capture']
const insufficientCodes = ['balance_insufficient', 'insufficient_funds']

function kindOf(error: InstanceType<typeof errors.StripeError>): PaymentFailureKind {
  if (error instanceof errors.StripeCardError) return 'declined'
  if (error instanceof errors.StripeConnectionError) return 'away'
  if (error instanceof errors.StripeRateLimitError) return 'away'
  // 5xx, a key whose first request is still running (409), an answer that was cut short.
  if (error instanceof errors.StripeAPIError) return 'away'
  if (error.payment_intent?.status === 'canceled') return 'lapsed'
  if (lapsedCodes.includes(error.code ?? '')) return 'lapsed'
  if (insufficientCodes.includes(error.code ?? '')) return 'insufficient'
  return 'refused'
}

function failureOf(error: unknown): PaymentFailure {
  if (!(error instanceof errors.StripeError)) {
    return new PaymentFailure('unknown', error instanceof Error ? error.message : String(error), {
      cause: error,
    })
  }
  return new PaymentFailure(kindOf(error), error.message, {
    code: error.code,
    declineCode: error.decline_code,
    httpStatus: error.statusCode,
    paymentStatus: error.payment_intent?.status,
    cause: error,
  })
}

/**
 * Runs one call of the SDK; whatever it throws comes out as a PaymentFailure. After five calls in a row without any
 * answer the processor is left alone for a while: `away` at once.
 */
export async function askProcessor<R>(call: (stripe: Stripe) => Promise<R>): Promise<R> {
  const { client, circuit } = configuredPayments()
  if (!circuit.mayAsk()) throw new PaymentFailure('away', 'the processor has not answered for a while')
  try {
    const answer = await call(client)
    circuit.answered()
    return answer
  } catch (error) {
    if (error instanceof errors.StripeConnectionError) circuit.unanswered()
    else circuit.answered()
    throw failureOf(error)
  }
}
