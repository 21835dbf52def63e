import { log } from '@/server/log'
import { now } from '@/server/clock'
import { clockEdges } from '@/server/orders/clock-edges'
import { listDueOrders, readOrderById } from '@/server/orders/order-store'
import { Problem } from '@/shared/api/problem'

const MOST_AT_A_TIME = 100

/** Fires the timers that have rung. An order that moved on meanwhile is left alone; one failure stops nothing else. */
export async function ringClocks(): Promise<void> {
  for (const due of await listDueOrders(now(), Object.keys(clockEdges), MOST_AT_A_TIME)) {
    const ring = due.clockEdge ? clockEdges[due.clockEdge] : undefined
    const order = ring ? await readOrderById(due.id) : undefined
    if (!ring || !order) continue
    try {
      await ring(order)
    } catch (error) {
      if (error instanceof Problem && error.slug === 'order-moved') continue
      log.error({ err: error, orderId: due.id, edge: due.clockEdge }, 'a clock could not fire')
    }
  }
}
