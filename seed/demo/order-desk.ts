import { doEffects } from '@/seed/demo/effects'
import type { ListingDesk } from '@/seed/demo/listing-desk'
import type { OrderPlan } from '@/seed/demo/plan-orders'
import { pressButton } from '@/seed/demo/press-button'
import { planRating } from '@/seed/demo/rating-plan'
import { need, type Actor } from '@/seed/demo/stage'
import { ringClocks } from '@/server/jobs/ring-clocks'
import { readListing } from '@/server/listings/read-listing'
import { listPayments } from '@/server/money/payment-store'
import { refreshPayment } from '@/server/money/refresh-payment'
import { acceptOrder } from '@/server/orders/accept-order'
import { cancelOrder } from '@/server/orders/cancel-order'
import { confirmGood } from '@/server/orders/confirm-good'
import { contestNoShow } from '@/server/orders/contest-no-show'
import { decideOrder } from '@/server/orders/decide-order'
import { declineOrder } from '@/server/orders/decline-order'
import { handOver } from '@/server/orders/hand-over'
import { leaveReservation } from '@/server/orders/leave-reservation'
import { markReady } from '@/server/orders/mark-ready'
import { readOrder } from '@/server/orders/order-store'
import { payBalance } from '@/server/orders/pay-balance'
import { reportNoShow } from '@/server/orders/report-no-show'
import { reserveBatch } from '@/server/orders/reserve-batch'
import { stopOrder } from '@/server/orders/stop-order'
import { withdrawRequest } from '@/server/orders/withdraw-request'
import { answerSurvival } from '@/server/ratings/answer-survival'
import { askSurvival } from '@/server/ratings/ask-survival'
import { rateOrder } from '@/server/ratings/rate-order'
import { replyToRating } from '@/server/ratings/reply-to-rating'
import { checkRoute } from '@/server/shipping/check-route'
import { dispatchOrder } from '@/server/shipping/dispatch-order'
import { listOrderShipDays } from '@/server/shipping/list-order-ship-days'
import { keepRoutePapers } from '@/server/shipping/keep-route-papers'
import { showOrder } from '@/server/orders/show-order'
import { after, DAY_MS } from '@/seed/demo/timeline'
import { reportArrival } from '@/server/shipping/report-arrival'
import { requirePlace } from '@/server/places/find-place'
import { holdForWeather } from '@/server/weather/hold-for-weather'
import { packingTicks } from '@/shared/contracts/ship-acts'
import { seededRandom } from '@/seed/seeded-random'
import type { ShownOrder } from '@/shared/contracts/orders'

/** A practice card that goes through. */
const CARD = { cardNumber: '4242 4242 4242 4242', expiry: '12/40', cvc: '123' }

/** The acts of one order, by the people who do them, through the product's own commands. */
export interface OrderDesk {
  reserve: () => Promise<void>
  payDeposit: () => Promise<void>
  payBalance: () => Promise<void>
  accept: () => Promise<void>
  decline: () => Promise<void>
  leave: () => Promise<void>
  withdraw: () => Promise<void>
  markReady: () => Promise<void>
  handOver: () => Promise<void>
  /** Two fewer than ordered: both count, and see it. */
  handOverShort: () => Promise<void>
  confirm: () => Promise<void>
  rate: () => Promise<void>
  reply: () => Promise<void>
  /** Day 7: the runner asks, the buyer counts. */
  askSurvival: () => Promise<void>
  answerSurvival: () => Promise<void>
  cancelAsBuyer: () => Promise<void>
  cancelAsSeller: () => Promise<void>
  reportBuyerAbsent: () => Promise<void>
  reportSellerAbsent: () => Promise<void>
  contest: () => Promise<void>
  decide: () => Promise<void>
  stop: () => Promise<void>
  ring: () => Promise<void>
  namePapers: () => Promise<void>
  checkRoute: () => Promise<void>
  dispatch: () => Promise<void>
  arrive: () => Promise<void>
  /** The seller sees the sky, and proposes the next day that is offered. */
  holdForWeather: () => Promise<void>
}

/** Pays an open page as a person does and comes back from it, which is when the product asks how it went. */
async function payOn(order: ShownOrder, { caller }: Actor): Promise<void> {
  await pressButton(need(order.payUrl, 'payment page'), { ...CARD, name: caller.name })
  const { id } = need(await readOrder(order.orderId), order.orderId)
  for (const payment of await listPayments(id)) await refreshPayment(payment)
}

const trackingOf = (key: string) =>
  `DEMO ${String(seededRandom(`tracking ${key}`).whole(1_000_000, 9_999_999))}`

async function boxFor({ buyer }: OrderPlan, { shipDay, street }: NonNullable<OrderPlan['ship']>) {
  const { label, state } = await requirePlace(buyer.zip, '#/near')
  const address = {
    ...{ name: buyer.caller.name, street, city: label.split(',')[0] ?? label, state, zip: buyer.zip },
    phone: '(555) 010-0142',
  }
  return { shipDay, deliverTo: 'counter' as const, address }
}

export function openOrderDesk(plan: OrderPlan, listings: ListingDesk, moderator: Actor): OrderDesk {
  const { buyer, batch, quantity, payMode, slot, ship } = plan
  const by = { buyer: buyer.caller, seller: batch.farm.owner.caller } as const
  const told = planRating(plan.key)
  let placed: ShownOrder | undefined
  const id = () => need(placed, `order ${plan.key}`).orderId
  const act = (name: string, work: (commandId: string) => Promise<unknown>) => async () => {
    await work(`demo ${plan.key} ${name}`)
    await doEffects()
  }
  const handOverAll = async (commandId: string, count: number) => {
    const { handOverCode: code } = need(await readOrder(id()), plan.key)
    await handOver(by.seller, id(), { commandId, count, code })
  }
  return {
    reserve: act('reserve', async (commandId) => {
      const listingId = listings.idOf(batch.key)
      const shown = await readListing(by.buyer, listingId, buyer.zip)
      const window = slot && shown.windows.find((one) => one.startsAt === slot.startsAt.toISOString())
      placed = await reserveBatch(by.buyer, listingId, {
        ...{ quantity, payMode, commandId, near: buyer.zip, version: shown.version },
        ticked: shown.gate?.ticks.map((tick) => tick.id) ?? [],
        ...(slot && !ship ? { windowId: need(window, `window of ${plan.key}`).windowId } : {}),
        ...(ship ? { ship: await boxFor(plan, ship) } : {}),
      })
    }),
    payDeposit: act('pay', async () => payOn(need(placed, plan.key), buyer)),
    payBalance: act('pay balance', async () => {
      const { balanceCents, balancePaidAt } = need(await readOrder(id()), plan.key)
      if (balanceCents > 0 && balancePaidAt === null) await payOn(await payBalance(by.buyer, id()), buyer)
    }),
    accept: act('accept', (commandId) => acceptOrder(by.seller, id(), commandId)),
    decline: act('decline', (commandId) =>
      declineOrder(by.seller, id(), {
        commandId,
        reason: 'not-ready',
        note: 'They need another week to grow.',
      }),
    ),
    leave: act('leave', (commandId) => leaveReservation(by.buyer, id(), commandId)),
    withdraw: act('withdraw', (commandId) => withdrawRequest(by.buyer, id(), commandId)),
    markReady: act('ready', (commandId) => markReady(by.seller, id(), commandId)),
    handOver: act('hand over', (commandId) => handOverAll(commandId, quantity)),
    handOverShort: act('hand over', (commandId) => handOverAll(commandId, quantity - 2)),
    confirm: act('confirm', (commandId) => confirmGood(by.buyer, id(), commandId)),
    rate: act('rate', async () => {
      if (told.rating) await rateOrder(by.buyer, id(), told.rating)
    }),
    reply: act('reply', async () => {
      if (told.rating?.reply) await replyToRating(by.seller, id(), told.rating.reply)
    }),
    askSurvival: act('ask survival', () => askSurvival()),
    answerSurvival: act('answer survival', async () => {
      const { countHandedOver } = need(await readOrder(id()), plan.key)
      const alive = Math.round((countHandedOver ?? quantity) * (told.aliveShare ?? 0))
      if (told.aliveShare !== null) await answerSurvival(by.buyer, id(), alive)
    }),
    cancelAsBuyer: act('cancel', (commandId) => cancelOrder(by.buyer, id(), { commandId })),
    cancelAsSeller: act('cancel', (commandId) =>
      cancelOrder(by.seller, id(), { commandId, reason: 'die-off', note: 'A pump failed in the night.' }),
    ),
    reportBuyerAbsent: act('no show', (commandId) =>
      reportNoShow(by.seller, id(), { commandId, note: 'Waited at the gate until the hour was over.' }),
    ),
    reportSellerAbsent: act('no show', (commandId) =>
      reportNoShow(by.buyer, id(), { commandId, note: 'The gate was locked and nobody came.' }),
    ),
    contest: act('contest', (commandId) =>
      contestNoShow(by.buyer, id(), {
        commandId,
        note: 'I was there with my pail at a quarter past, and have the fish at home.',
      }),
    ),
    decide: act('decide', (commandId) =>
      decideOrder(moderator.caller, id(), {
        commandId,
        outcome: 'handed-over',
        note: 'Both describe the same pail and the same count.',
      }),
    ),
    stop: act('stop', (commandId) =>
      stopOrder(moderator.caller, id(), {
        commandId,
        cause: 'recall',
        animals: 'frozen',
        note: 'A lab result for this pond is still open.',
      }),
    ),
    ring: act('ring', () => ringClocks()),
    namePapers: act('name papers', async () => {
      const { shipment } = await showOrder(by.seller, id())
      const [issuedOn, expiresOn] = [
        after(plan.reservedAt, -200 * DAY_MS),
        after(plan.reservedAt, 165 * DAY_MS),
      ].map((at) => at.toISOString().slice(0, 10))
      const papers = (shipment?.papersNeeded ?? []).map((kind) => ({
        ...{ kind, number: `D-${kind.length}${plan.key.length}07`, issuer: 'Demonstration office' },
        ...{ issuedOn: need(issuedOn, 'day'), expiresOn: need(expiresOn, 'day') },
      }))
      if (papers.length > 0) await keepRoutePapers(by.seller, id(), papers)
    }),
    checkRoute: act('check route', () => checkRoute(by.seller, id())),
    dispatch: act('dispatch', (commandId) =>
      dispatchOrder(by.seller, id(), { commandId, tracking: trackingOf(plan.key), ticks: [...packingTicks] }),
    ),
    arrive: act('arrive', (commandId) => reportArrival(by.buyer, id(), commandId)),
    holdForWeather: act('hold', async (commandId) => {
      const { days } = await listOrderShipDays(by.seller, id())
      const later = days.find((day) => day.verdict === 'safe' && day.shipDay !== plan.ship?.shipDay)
      await holdForWeather(by.seller, id(), {
        commandId,
        why: 'Freezing rain is forecast for the hub; the truck may stand all night.',
        ...(later ? { shipDay: later.shipDay } : {}),
      })
    }),
  }
}
