import type Stripe from 'stripe'
import { idOf } from './id-of'

export interface TransferFacts {
  transferId: string
  amountCents: number
  reversedCents: number
  accountId: string | null
  /** The idempotency key it was asked for with; null for a transfer made by hand. */
  actKey: string | null
}

/** A transfer of the processor as plain facts; amounts in US cents. */
export function transferFacts(transfer: Stripe.Transfer): TransferFacts {
  return {
    transferId: transfer.id,
    amountCents: transfer.amount,
    reversedCents: transfer.amount_reversed,
    accountId: idOf(transfer.destination),
    actKey: transfer.metadata.act_key ?? null,
  }
}
