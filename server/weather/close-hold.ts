import type { Tx } from '@/db/transaction'
import { answerHold, readOpenHold, type HoldAnswer } from '@/server/orders/hold-store'
import { freeSlot } from '@/server/orders/order-store'
import type { EdgeActor, EdgeId } from '@/shared/domain/orders/edges.facts'

interface Closing {
  orderId: number
  edge: EdgeId
  actor: EdgeActor
  /** The window that the order has from now on; another one that was proposed is given back. */
  windowId: number | null
  at: Date
}

function answerOf({ edge, actor }: Closing): HoldAnswer {
  if (edge === 'E19') return actor === 'timer' ? 'silence' : 'agreed'
  if (edge === 'E20') return 'declined'
  return edge === 'E21' ? 'no-consent' : 'cancelled'
}

/** Whatever leaves `weather_hold` answers its hold, in the transaction of the edge. */
export async function closeHold(tx: Tx, closing: Closing): Promise<void> {
  const hold = await readOpenHold(tx, closing.orderId)
  if (!hold) return
  await answerHold(tx, hold.id, { answer: answerOf(closing), answeredAt: closing.at })
  const isKept = closing.edge === 'E19' && hold.proposedWindowId === closing.windowId
  if (hold.proposedWindowId !== null && !isKept) await freeSlot(tx, hold.proposedWindowId)
}
