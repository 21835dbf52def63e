import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import {
  countTransferRefusal,
  finishTransfer,
  readTransfer,
  type TransferRow,
} from '@/server/money/payment-store'
import { readOrderById, type OrderRow } from '@/server/orders/order-store'
import { readSellerById } from '@/server/orders/party-store'
import { failPoint } from '@/server/outbox/fail-point'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'
import { PaymentFailure } from '@/payments/payment-failure'
import { transfer as sendToSeller } from '@/payments/transfer'

/** One key an order; a balance that did not bear it is kept as a refusal under the key, so the next try takes a new one. */
async function send(order: OrderRow, accountId: string, wanted: TransferRow) {
  const tries = wanted.refusals === 0 ? '' : `:${wanted.refusals}`
  try {
    return await sendToSeller({
      accountId,
      orderId: order.publicId,
      amountCents: wanted.amountCents,
      description: `Order ${order.publicId}`,
      idempotencyKey: `transfer:order:${order.publicId}${tries}`,
    })
  } catch (error) {
    if (error instanceof PaymentFailure && error.kind === 'insufficient') await countTransferRefusal(order.id)
    throw error
  }
}

/** The one transfer of a settled order; waits in the outbox while the seller's payouts are switched off. */
export async function sendTransfer(effect: Effect): Promise<void> {
  const wanted = await readTransfer(effect.ref)
  const order = await readOrderById(effect.ref)
  const seller = order ? await readSellerById(order.sellerId) : undefined
  if (!wanted || !order || !seller?.payoutAccountId) throw new GiveUp('the transfer has no seller account')
  if (!seller.payoutsEnabled) throw new Error('the seller is finishing paperwork: the transfer waits')
  const sent = await send(order, seller.payoutAccountId, wanted)
  failPoint('transfer:called')
  await inTransaction(async (tx) => {
    await finishTransfer(tx, order.id, { processorId: sent.transferId, at: now() })
    await book(tx, {
      orderId: order.id,
      sellerId: order.sellerId,
      kind: 'transfer',
      cause: `transfer:${order.id}`,
      processorId: sent.transferId,
      rows: [
        ['seller_payable', -wanted.amountCents],
        ['seller_connected', wanted.amountCents],
      ],
      at: now(),
    })
    await finishEffect(effect.seq, tx)
  })
}
