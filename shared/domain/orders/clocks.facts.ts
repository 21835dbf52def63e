interface Clock {
  minutes: number
  /** Where produce, which spoils, has a shorter one. */
  produceMinutes?: number
  says: string
}

const hour = 60
const day = 24 * hour

/** Every wait of the trade in one place. House rules, all of them, except the authorisation's own life of 7 days. */
export const clocks = {
  checkoutHold: { minutes: 15, says: 'a hold waits for the payment' },
  waitlistOffer: { minutes: 30, says: 'freed animals are offered to the first on the waitlist alone' },
  sellerAnswer: { minutes: 48 * hour, produceMinutes: 12 * hour, says: 'a seller has to accept or decline' },
  authorisationLife: {
    minutes: 6 * day,
    says: 'an authorised card may still be captured (the card itself says 7 days)',
  },
  poolFreeze: { minutes: day, says: 'before it closes, a pool can no longer be left' },
  poolWaive: { minutes: day, says: 'after it missed, a seller may still run a smaller pool' },
  freeCancel: {
    minutes: 72 * hour,
    produceMinutes: 12 * hour,
    says: 'before the slot, cancelling costs nothing',
  },
  quantityCutCancel: { minutes: day, says: 'after a cut in numbers, cancelling costs nothing' },
  neverScheduled: { minutes: 30 * day, says: 'past the promised ready date, an order without a day ends' },
  balanceDue: { minutes: 48 * hour, says: 'before the slot, the balance is due' },
  balanceGrace: { minutes: day, says: 'past its due time, an unpaid balance ends the order' },
  temperatureSnapshot: { minutes: 12 * hour, says: 'a temperature check stays fresh' },
  weatherConsent: { minutes: 72 * hour, says: 'a buyer has to answer a weather hold' },
  weatherSilence: { minutes: 30 * day, says: 'silence may move the day this far, once' },
  pickupGrace: { minutes: 60, produceMinutes: 30, says: 'past its window, a pickup still counts as kept' },
  noShowContest: { minutes: day, says: 'a no-show may be contested' },
  missedDay: { minutes: 72 * hour, says: 'past its day, an order nobody moved ends or becomes a claim' },
  claimWindow: { minutes: day, says: 'after arrival or hand-over, a loss may be reported' },
  claimWindowLeast: { minutes: 4 * hour, says: 'the shortest claim window a seller may promise' },
  claimWindowMost: { minutes: 7 * day, says: 'the longest claim window a seller may promise' },
  sellerClaimAnswer: { minutes: 48 * hour, says: 'a seller has to answer a claim' },
  adminClaimAim: { minutes: 5 * day, says: 'a moderator aims to decide a claim' },
  lateBox: { minutes: 36 * hour, says: 'past its promised delivery, a box counts as late' },
  debtPause: { minutes: 14 * day, says: 'a debt may stand before the listings pause' },
} as const satisfies Record<string, Clock>

export type ClockId = keyof typeof clocks

/** Hours of the seller's place at which route and pickup are checked for temperature. */
export const temperatureCheckHours = { dayBefore: 16, dayOf: 6 } as const

/** A debt above this pauses the listings at once. */
export const debtPauseCents = 10_000

/** The clock in ms; the shorter one for produce where there is one. */
export function clockMs(id: ClockId, category: string): number {
  const clock: Clock = clocks[id]
  const minutes = category === 'produce' ? (clock.produceMinutes ?? clock.minutes) : clock.minutes
  return minutes * 60_000
}
