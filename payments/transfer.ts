import { askProcessor } from './ask-processor'
import { transferFacts, type TransferFacts } from './transfer-facts'
import { transferGroupOf } from './transfer-group'

export interface TransferToMake {
  accountId: string
  orderId: string
  /** At least 1. */
  amountCents: number
  description: string
  idempotencyKey: string
}

/**
 * Platform balance -> seller's account. Throws `insufficient` when the balance does not bear it (a later try needs a
 * new key: the refusal is kept under this one), `refused` when the account may not receive.
 */
export async function transfer(wanted: TransferToMake): Promise<TransferFacts> {
  const { idempotencyKey } = wanted
  const made = await askProcessor((stripe) =>
    stripe.transfers.create(
      {
        amount: wanted.amountCents,
        currency: 'usd',
        destination: wanted.accountId,
        description: wanted.description,
        metadata: { order_id: wanted.orderId, act_key: idempotencyKey },
        transfer_group: transferGroupOf(wanted.orderId),
      },
      { idempotencyKey },
    ),
  )
  return transferFacts(made)
}
