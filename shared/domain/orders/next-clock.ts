import { clockMs } from '@/shared/domain/orders/clocks.facts'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import type { OrderState } from '@/shared/domain/orders/states.facts'

const HOUR_MS = 3_600_000

export interface ClockFacts {
  state: OrderState
  /** When this state began. All times in ms since 1970. */
  sinceMs: number
  category: string
  /** Promised ready date, end of that day; null when the animals are ready now. */
  readyMs: number | null
  slotStartMs: number | null
  slotEndMs: number | null
  balanceDue: 'before' | 'at-handover'
  isBalancePaid: boolean
  claimWindowHours: number
  promisedDeliveryMs: number | null
  handOver: 'pickup' | 'ship'
  /** Held for weather: whether the buyer's silence moves the day rather than ending the order. */
  silenceMoves: boolean
  /** A reported no-show that is not contested yet. */
  noShow: { by: 'buyer' | 'seller'; sinceMs: number } | null
}

export interface NextClock {
  atMs: number
  edge: EdgeId
}

function whileScheduled(facts: ClockFacts): NextClock {
  const { sinceMs, category } = facts
  const slotStartMs = facts.slotStartMs ?? sinceMs
  if (facts.balanceDue === 'before' && !facts.isBalancePaid) {
    const dueMs = Math.max(sinceMs, slotStartMs - clockMs('balanceDue', category))
    return { atMs: dueMs + clockMs('balanceGrace', category), edge: 'E23' }
  }
  return { atMs: (facts.slotEndMs ?? slotStartMs) + clockMs('missedDay', category), edge: 'E26' }
}

/** The timer that rings next in a state, so that nothing can rest for ever. null only in a final state. */
export function nextClock(facts: ClockFacts): NextClock | null {
  const { state, sinceMs, category } = facts
  switch (state) {
    case 'reserved':
      return { atMs: sinceMs + clockMs('checkoutHold', category), edge: 'E02' }
    case 'requested':
      return { atMs: sinceMs + clockMs('sellerAnswer', category), edge: 'E09' }
    case 'pledged':
      return { atMs: sinceMs + clockMs('poolWaive', category), edge: 'E12' }
    case 'deposit_paid':
      return {
        atMs: Math.max(sinceMs, facts.readyMs ?? sinceMs) + clockMs('neverScheduled', category),
        edge: 'E17',
      }
    case 'scheduled':
      return whileScheduled(facts)
    case 'weather_hold':
      return {
        atMs: sinceMs + clockMs('weatherConsent', category),
        edge: facts.silenceMoves ? 'E19' : 'E21',
      }
    case 'ready':
      if (facts.noShow) {
        // The one who did not come is not the one who says so.
        const edge = facts.noShow.by === 'seller' ? 'E31' : 'E32'
        return { atMs: facts.noShow.sinceMs + clockMs('noShowContest', category), edge }
      }
      return {
        atMs: (facts.slotEndMs ?? sinceMs) + clockMs('missedDay', category),
        edge: facts.handOver === 'ship' ? 'E34' : 'E33',
      }
    case 'dispatched':
      return { atMs: (facts.promisedDeliveryMs ?? sinceMs) + clockMs('lateBox', category), edge: 'E36' }
    case 'handed_over':
      return { atMs: sinceMs + facts.claimWindowHours * HOUR_MS, edge: 'E40' }
    case 'arrived':
      return { atMs: sinceMs + facts.claimWindowHours * HOUR_MS, edge: 'E38' }
    case 'claim_open':
      return { atMs: sinceMs + clockMs('sellerClaimAnswer', category), edge: 'E42' }
    case 'settled':
    case 'cancelled':
      return null
  }
}
