import { inTransaction } from '@/db/transaction'
import { readOpenHold } from '@/server/orders/hold-store'
import { lockOrder, type OrderRow } from '@/server/orders/order-store'
import { takeNewDay } from '@/server/weather/take-new-day'

/** E19 by the clock: the first hold, a named day within 30 days, no answer. */
export async function takeDayBySilence(order: OrderRow, commandId: string): Promise<void> {
  await inTransaction(async (tx) => {
    const [locked, hold] = [await lockOrder(tx, order.id), await readOpenHold(tx, order.id)]
    if (!locked || locked.state !== 'weather_hold' || !hold?.silenceMoves) return
    await takeNewDay(tx, { order: locked, hold }, { by: 'timer', commandId })
  })
}
