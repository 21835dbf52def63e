import { askProcessor } from './ask-processor'

export interface ReversalToMake {
  transferId: string
  orderId: string
  /** 1 to what is left of the transfer. */
  amountCents: number
  idempotencyKey: string
}

export interface Reversal {
  reversalId: string
  amountCents: number
}

/** Seller's account -> platform balance. Throws `insufficient` when the account holds less than that. */
export async function reverseTransfer(wanted: ReversalToMake): Promise<Reversal> {
  const { idempotencyKey } = wanted
  const made = await askProcessor((stripe) =>
    stripe.transfers.createReversal(
      wanted.transferId,
      { amount: wanted.amountCents, metadata: { order_id: wanted.orderId, act_key: idempotencyKey } },
      { idempotencyKey },
    ),
  )
  return { reversalId: made.id, amountCents: made.amount }
}
