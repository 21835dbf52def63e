const MINUTE_MS = 60_000
const HOUR_MS = 60 * MINUTE_MS
const DAY_MS = 24 * HOUR_MS

/** The waits of the order machine, in milliseconds; a later issue lets an admin edit them. */
export const clockMs = {
  checkoutHold: 15 * MINUTE_MS,
  sellerAnswer: 48 * HOUR_MS,
  sellerAnswerProduce: 12 * HOUR_MS,
  authorisationHardStop: 6 * DAY_MS,
  neverScheduled: 30 * DAY_MS,
  balanceDueBefore: 48 * HOUR_MS,
  balanceGrace: 24 * HOUR_MS,
  missedDay: 72 * HOUR_MS,
  weatherConsent: 72 * HOUR_MS,
  lateBox: 36 * HOUR_MS,
  claimAnswer: 48 * HOUR_MS,
} as const

export interface ClockFacts {
  state: string
  /** When this state began. All times in ms since 1970. */
  sinceMs: number
  category: string
  /** Promised ready date, end of that day; null when the animals are ready now. */
  readyMs: number | null
  slotStartMs: number | null
  slotEndMs: number | null
  balanceDue: 'before' | 'at-handover'
  balancePaid: boolean
  claimWindowHours: number
  promisedDeliveryMs?: number | null
}

export interface NextClock {
  atMs: number
  edge: string
}

/** The timer that rings next in a state, so that nothing can rest for ever. null only in a final state. House rules. */
export function nextClock(facts: ClockFacts): NextClock | null {
  const { state, sinceMs } = facts
  switch (state) {
    case 'reserved':
      return { atMs: sinceMs + clockMs.checkoutHold, edge: 'E02' }
    case 'requested':
      return {
        atMs: sinceMs + (facts.category === 'produce' ? clockMs.sellerAnswerProduce : clockMs.sellerAnswer),
        edge: 'E09',
      }
    case 'deposit_paid':
      return { atMs: Math.max(sinceMs, facts.readyMs ?? sinceMs) + clockMs.neverScheduled, edge: 'E17' }
    case 'scheduled': {
      const slotStart = facts.slotStartMs ?? sinceMs
      if (facts.balanceDue === 'before' && !facts.balancePaid) {
        const due = Math.max(sinceMs, slotStart - clockMs.balanceDueBefore)
        return { atMs: due + clockMs.balanceGrace, edge: 'E23' }
      }
      return { atMs: (facts.slotEndMs ?? slotStart) + clockMs.missedDay, edge: 'E26' }
    }
    case 'weather_hold':
      return { atMs: sinceMs + clockMs.weatherConsent, edge: 'E21' }
    case 'ready':
      return { atMs: (facts.slotEndMs ?? sinceMs) + clockMs.missedDay, edge: 'E33' }
    case 'dispatched':
      return { atMs: (facts.promisedDeliveryMs ?? sinceMs) + clockMs.lateBox, edge: 'E36' }
    case 'handed_over':
      return { atMs: sinceMs + facts.claimWindowHours * HOUR_MS, edge: 'E40' }
    case 'arrived':
      return { atMs: sinceMs + facts.claimWindowHours * HOUR_MS, edge: 'E38' }
    case 'claim_open':
      return { atMs: sinceMs + clockMs.claimAnswer, edge: 'E42' }
    default:
      return null
  }
}
