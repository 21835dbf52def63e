import { now } from '@/server/clock'
import type { OrderRow } from '@/server/orders/order-store'
import { ratingActsOf, type AfterHandOver, type RatingAct } from '@/server/ratings/rating-policy'
import type { ShownOrder } from '@/shared/contracts/orders'
import { clockMs } from '@/shared/domain/orders/clocks.facts'

export type Party = ShownOrder['party']
type OrderAct = Exclude<ShownOrder['may'][number], RatingAct>

const isRunning = (order: OrderRow) => order.freeze === 'none'
const GIVES_OUT = new Set<OrderAct>(['mark-ready', 'hand-over', 'dispatch', 'confirm-good'])
const isHeldBack = (act: OrderAct, order: OrderRow) => order.recall === 'open' && GIVES_OUT.has(act)
const isBalancePaid = (order: OrderRow) => order.balanceCents === 0 || order.balancePaidAt !== null

const CANCELLABLE = ['deposit_paid', 'scheduled', 'ready']
const isShipped = (order: OrderRow) => order.handOver === 'ship'
const BEFORE_DISPATCH = ['scheduled', 'weather_hold', 'ready']
const UNCLEAR = ['handover_unclear', 'late_or_lost']
const STOPPABLE = ['requested', ...CANCELLABLE, 'weather_hold']

/** The promised delivery is over: the clock of a sent box rings 36 hours after it. */
const isBoxLate = (order: OrderRow) =>
  order.clockAt !== null && now().getTime() >= order.clockAt.getTime() - clockMs('lateBox', order.category)

const isSellersBox = (order: OrderRow, party: Party) => party === 'seller' && isShipped(order)

/** The one who waits may say so: a buyer from the start of the window, a seller after its end and the grace. */
function hasWaited(order: OrderRow, party: Party): boolean {
  const { slotStartsAt, slotEndsAt } = order
  if (!slotStartsAt || !slotEndsAt) return false
  const graceMs = clockMs('pickupGrace', order.category)
  return party === 'buyer' ? now() >= slotStartsAt : now().getTime() >= slotEndsAt.getTime() + graceMs
}

const movesOf = (order: OrderRow, party: Party) => (party === 'buyer' ? order.buyerMoves : order.sellerMoves)

/** One readable line an act: who may do it, and in which state. The same answers guard the acts and fill `may`. */
const abilities: Record<OrderAct, (order: OrderRow, party: Party) => boolean> = {
  'pay-deposit': (order, party) => party === 'buyer' && order.state === 'reserved',
  leave: (order, party) => party === 'buyer' && order.state === 'reserved',
  withdraw: (order, party) => party === 'buyer' && order.state === 'requested' && order.acceptedAt === null,
  accept: (order, party) => party === 'seller' && order.state === 'requested' && order.acceptedAt === null,
  decline: (order, party) => party === 'seller' && order.state === 'requested' && order.acceptedAt === null,
  'mark-ready': (order, party) =>
    party === 'seller' &&
    order.state === 'scheduled' &&
    (order.balanceDue === 'at-handover' || isBalancePaid(order)),
  'pay-balance': (order, party) =>
    party === 'buyer' && ['scheduled', 'ready'].includes(order.state) && !isBalancePaid(order),
  'hand-over': (order, party) =>
    party === 'seller' && !isShipped(order) && order.state === 'ready' && isBalancePaid(order),
  'confirm-good': (order, party) => party === 'buyer' && ['handed_over', 'arrived'].includes(order.state),
  'choose-slot': (order, party) =>
    party !== 'staff' &&
    !isShipped(order) &&
    (order.state === 'deposit_paid' ||
      (order.state === 'ready' && !order.noShowBy && movesOf(order, party) === 0)),
  'choose-ship-day': (order, party) =>
    party !== 'staff' &&
    isShipped(order) &&
    (order.state === 'deposit_paid' || (order.state === 'ready' && movesOf(order, party) === 0)),
  cancel: (order, party) =>
    party !== 'staff' &&
    (CANCELLABLE.includes(order.state) || (party === 'seller' && order.state === 'weather_hold')),
  'check-route': (order, party) => isSellersBox(order, party) && BEFORE_DISPATCH.includes(order.state),
  'name-papers': (order, party) =>
    isSellersBox(order, party) && ['deposit_paid', ...BEFORE_DISPATCH].includes(order.state),
  dispatch: (order, party) => isSellersBox(order, party) && order.state === 'ready',
  'report-arrival': (order, party) => party === 'buyer' && order.state === 'dispatched',
  'report-late-box': (order, party) => party === 'buyer' && order.state === 'dispatched' && isBoxLate(order),
  'report-late-arrival': (order, party) =>
    party === 'buyer' && order.state === 'claim_open' && order.claimType === 'late_or_lost',
  'hold-for-weather': (order, party) =>
    party === 'seller' && ['scheduled', 'ready'].includes(order.state) && !order.noShowBy,
  'agree-new-day': (order, party) => party === 'buyer' && order.state === 'weather_hold',
  'decline-new-day': (order, party) => party === 'buyer' && order.state === 'weather_hold',
  'report-no-show': (order, party) =>
    party !== 'staff' &&
    !isShipped(order) &&
    order.state === 'ready' &&
    !order.noShowBy &&
    hasWaited(order, party),
  contest: (order, party) =>
    party !== 'staff' && order.state === 'ready' && Boolean(order.noShowBy) && order.noShowBy !== party,
  stop: (order, party) => party === 'staff' && STOPPABLE.includes(order.state),
  decide: (order, party) =>
    party === 'staff' && order.state === 'claim_open' && UNCLEAR.includes(order.claimType ?? ''),
}

export function mayAct(act: OrderAct, order: OrderRow, party: Party): boolean {
  return isRunning(order) && !isHeldBack(act, order) && abilities[act](order, party)
}

/** Every act open to this party now, those after the hand-over included. */
export function actsOf(order: OrderRow, party: Party, after: AfterHandOver): ShownOrder['may'] {
  const acts = (Object.keys(abilities) as OrderAct[]).filter((act) => mayAct(act, order, party))
  return [...acts, ...ratingActsOf({ order, party, ...after })]
}

/** The true place and phone: for the two parties alone, from `scheduled` until the order is over. */
export function mayMeet(order: OrderRow, party: Party): boolean {
  return (
    party !== 'staff' &&
    !isShipped(order) &&
    ['scheduled', 'weather_hold', 'ready', 'handed_over', 'claim_open'].includes(order.state)
  )
}

/** Where a shipped order goes: the buyer's own, and the seller's to read from the agreed day on. Never for staff. */
export function mayReadAddress(order: OrderRow, party: Party): boolean {
  return (
    party === 'buyer' ||
    (party === 'seller' &&
      [...BEFORE_DISPATCH, 'dispatched', 'arrived', 'claim_open', 'settled'].includes(order.state))
  )
}

/** The code appears to the buyer when the animals are ready and nothing is left to pay. */
export function maySeeCode(order: OrderRow, party: Party): boolean {
  return party === 'buyer' && !isShipped(order) && order.state === 'ready' && isBalancePaid(order)
}
