import Stripe from 'stripe'
import { makeCircuit, type Circuit } from './circuit'

export interface PaymentsConfig {
  secretKey: string
  webhookSecret: string
  /** Left out: the processor's own address. Given: the practice processor's. */
  host?: string
  port?: number
  protocol?: 'http' | 'https'
  /** How long a processor that does not answer is left alone; 15 s unless said. */
  restMs?: number
}

interface Configured {
  client: Stripe
  webhookSecret: string
  circuit: Circuit
}

/** Longer than the processor usually takes, shorter than a buyer waits. */
const ANSWER_WITHIN_MS = 4000

let configured: Configured | null = null

/** Once, at the start of the process, before any act of payment; a second call replaces the first. */
export function configurePayments({ secretKey, webhookSecret, restMs, ...address }: PaymentsConfig): void {
  // No retries here: the outbox repeats an act with its own key. Beware: the SDK itself still repeats once after a
  // connection reset, with the same key.
  const client = new Stripe(secretKey, {
    ...address,
    timeout: ANSWER_WITHIN_MS,
    maxNetworkRetries: 0,
    telemetry: false,
  })
  configured = { client, webhookSecret, circuit: makeCircuit(restMs) }
}

/** The configured SDK and webhook secret; throws before `configurePayments`. */
export function configuredPayments(): Configured {
  if (!configured) throw new Error('configurePayments has not been called')
  return configured
}
