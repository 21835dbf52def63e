import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { settleOrder } from '@/server/money/settle-order'
import { applyEdge } from '@/server/orders/apply-edge'
import { endHold } from '@/server/orders/end-hold'
import { keepDeposit } from '@/server/orders/keep-deposit'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { markAnswerMissed, markDayMissed, markNoShow } from '@/server/orders/party-store'
import { lockOrder, type OrderRow } from '@/server/orders/order-store'
import { refundEverything } from '@/server/orders/refund-everything'
import { takeDayBySilence } from '@/server/weather/silent-hold'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'

type ClockEdge = (order: OrderRow) => Promise<void>
type Aftermath = (tx: Tx, order: OrderRow) => Promise<unknown>

/** A timer's command id: the same ring twice changes nothing. */
const ringOf = (edge: string, order: OrderRow) => `clock:${edge}:${order.clockAt?.getTime() ?? 0}`

/**
 * The edge by the clock, and what follows from it in the same transaction. The order was read before it is locked: a
 * balance that came meanwhile, or another hold, has set another clock, and this one is over.
 */
function byClock(edge: EdgeId, then: Aftermath, change: Partial<OrderRow> = {}): ClockEdge {
  return (order) =>
    inTransaction(async (tx) => {
      const locked = await lockOrder(tx, order.id)
      if (!locked || locked.clockEdge !== edge || ringOf(edge, locked) !== ringOf(edge, order)) return
      const outcome = await applyEdge(tx, {
        edge,
        orderId: order.id,
        commandId: ringOf(edge, order),
        actor: 'timer',
        change,
      })
      if (outcome.applied) await then(tx, outcome.order)
    })
}

const sellerSilent = byClock('E09', async (tx, order) => {
  await letMoneyGo(tx, order)
  await markAnswerMissed(tx, order.sellerId)
})

const dayMissed = (edge: 'E26' | 'E34') =>
  byClock(edge, async (tx, order) => {
    await refundEverything(tx, order, 'seller-missed-day')
    await markDayMissed(tx, order.sellerId)
  })

/** The claim window is over and nobody said a word: the money goes to the seller. */
const settled =
  (edge: 'E38' | 'E40'): ClockEdge =>
  (order) =>
    inTransaction(async (tx) => {
      await settleOrder(tx, {
        edge,
        orderId: order.id,
        commandId: ringOf(edge, order),
        actor: 'timer',
      })
    })

const buyerAbsent = byClock('E31', async (tx, order) => {
  await keepDeposit(tx, order, 'buyer-absent')
  await markNoShow(tx, order.buyerId, now())
})

const sellerAbsent = byClock('E32', async (tx, order) => {
  await refundEverything(tx, order, 'seller-absent')
  await markDayMissed(tx, order.sellerId)
})

/** What happens when a clock rings, by the edge it tries. */
export const clockEdges: Partial<Record<string, ClockEdge>> = {
  E02: (order) => endHold(order, ringOf('E02', order)),
  // A seller who has accepted waits for the processor, not for themselves.
  E09: async (order) => (order.acceptedAt === null ? sellerSilent(order) : undefined),
  E19: (order) => takeDayBySilence(order, ringOf('E19', order)),
  E21: byClock('E21', (tx, order) => refundEverything(tx, order, 'hold-no-consent')),
  E17: byClock('E17', (tx, order) => refundEverything(tx, order, 'never-scheduled')),
  // A day that came by silence may be cancelled free of cost, so not paying for it costs nothing either.
  E23: byClock('E23', (tx, order) =>
    order.isDayBySilence
      ? refundEverything(tx, order, 'balance-unpaid')
      : keepDeposit(tx, order, 'balance-unpaid'),
  ),
  E26: dayMissed('E26'),
  E31: buyerAbsent,
  E32: sellerAbsent,
  E33: byClock('E33', async () => undefined, { claimType: 'handover_unclear' }),
  E34: dayMissed('E34'),
  // Carriers are late without a seller's doing: no mark.
  E36: byClock('E36', async () => undefined, { claimType: 'late_or_lost' }),
  E38: settled('E38'),
  E40: settled('E40'),
}
