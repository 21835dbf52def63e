import { log } from '@/server/log'
import { now } from '@/server/clock'
import { clockEdges } from '@/server/orders/clock-edges'
import { listDueOrders, readOrderById, type DueOrders } from '@/server/orders/order-store'
import { Problem } from '@/shared/api/problem'

const MOST_AT_A_TIME = 100

async function ringOne(due: { id: number; clockEdge: string | null }): Promise<void> {
  const ring = due.clockEdge ? clockEdges[due.clockEdge] : undefined
  const order = ring ? await readOrderById(due.id) : undefined
  if (!ring || !order) return
  try {
    await ring(order)
  } catch (error) {
    if (error instanceof Problem && error.slug === 'order-moved') return
    log.error({ err: error, orderId: due.id, edge: due.clockEdge }, 'a clock could not fire')
  }
}

/** Where the last full look ended; undefined: the next one begins at the oldest. */
let after: DueOrders['after']

/**
 * Fires the timers that have rung. An order that moved on meanwhile is left alone; one failure stops nothing else. What
 * stays due (an accepted order waits for the processor) is passed by the next look, or a hundred such would stop all others.
 */
export async function ringClocks(): Promise<void> {
  const edges = Object.keys(clockEdges)
  const due = await listDueOrders({ at: now(), edges, after, most: MOST_AT_A_TIME })
  after = due.length < MOST_AT_A_TIME ? undefined : due.at(-1)
  for (const one of due) await ringOne(one)
}
