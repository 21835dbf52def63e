import { askProcessor } from './ask-processor'
import { transferFacts, type TransferFacts } from './transfer-facts'
import { transferGroupOf } from './transfer-group'

const MOST = 100

/** Every transfer of an order, newest first. Keys are forgotten after 24 h: look here before an act is repeated. */
export async function findTransfers(orderId: string): Promise<TransferFacts[]> {
  const found = await askProcessor((stripe) =>
    stripe.transfers.list({ transfer_group: transferGroupOf(orderId), limit: MOST }),
  )
  return found.data.map(transferFacts)
}
