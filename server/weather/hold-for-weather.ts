import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { hasCommand, lockOrder } from '@/server/orders/order-store'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { holdOrder } from '@/server/weather/hold-order'
import { requireNewDay } from '@/server/weather/require-new-day'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type Asked = ParsedBody<Endpoints['holdForWeather']> & { commandId: string }

/** E18, E27 by the seller, who sees the sky: a box or a pickup, with a day proposed or open-ended. */
export async function holdForWeather(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party !== 'seller') throw new Problem('not-found')
  if (mayAct('hold-for-weather', order, 'seller')) await requireNewDay(order, asked)
  await inTransaction(async (tx) => {
    const locked = await lockOrder(tx, order.id)
    if (!locked) throw new Problem('not-found')
    if (await hasCommand(tx, locked.id, asked.commandId)) return
    if (!mayAct('hold-for-weather', locked, 'seller')) {
      throw new Problem('order-moved', undefined, { facts: { state: locked.state } })
    }
    await holdOrder(tx, locked, {
      startedBy: 'seller',
      actorId: caller.memberId,
      commandId: asked.commandId,
      why: asked.why,
      proposed: { shipDay: asked.shipDay, windowId: asked.windowId },
    })
  })
  return showAgain({ order, party })
}
