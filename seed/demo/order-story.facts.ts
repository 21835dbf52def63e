/** How an order of the demo goes, and where it stands in the end. */
export type OrderPath =
  | 'confirmed'
  | 'closed-by-time'
  | 'short'
  | 'decided'
  | 'handed-over'
  | 'contested'
  | 'ready-paid'
  | 'ready'
  | 'scheduled'
  | 'no-day-yet'
  | 'requested'
  | 'reserved'
  | 'hold-expired'
  | 'left'
  | 'declined'
  | 'silent'
  | 'withdrawn'
  | 'buyer-cancelled'
  | 'buyer-cancelled-late'
  | 'seller-cancelled'
  | 'day-missed'
  | 'balance-unpaid'
  | 'buyer-absent'
  | 'seller-absent'
  | 'stopped'

export interface PathFacts {
  path: OrderPath
  /** How often. */
  times: number
  /**
   * Which pickup window: one weeks ago, the last one that has begun, one of yesterday or the day before, the next to
   * come, one in the coming weeks, or any that lay some days after the order.
   */
  slot: 'past' | 'just' | 'gone' | 'next' | 'coming' | 'any' | 'none'
  accept?: 'ask' | 'instant'
  balanceDue?: 'before' | 'at-handover'
  /** Set where the part is played by a person that `npm start` prints. */
  farm?: string
  buyer?: 'beginner'
  /** A batch made for this. */
  batch?: string
  quantity?: number
  /** How many days ahead of the window the buyer orders, least and most; else the usual few. */
  leadDays?: readonly [number, number]
}

// prettier-ignore
export const orderPaths: readonly PathFacts[] = [
  { path: 'confirmed', times: 1, slot: 'past', farm: 'hatchery', buyer: 'beginner' },
  { path: 'scheduled', times: 1, slot: 'coming', farm: 'hatchery', buyer: 'beginner' },
  { path: 'requested', times: 2, slot: 'coming', accept: 'ask', farm: 'hatchery' },
  { path: 'ready-paid', times: 1, slot: 'next', balanceDue: 'at-handover', farm: 'hatchery' },
  { path: 'confirmed', times: 1, slot: 'past', batch: 'last pail', quantity: 20 },
  { path: 'scheduled', times: 1, slot: 'coming', batch: 'last pail', quantity: 20 },
  { path: 'no-day-yet', times: 1, slot: 'none', batch: 'no more days' },
  { path: 'confirmed', times: 8, slot: 'past' },
  { path: 'closed-by-time', times: 5, slot: 'past' },
  { path: 'short', times: 2, slot: 'past' },
  { path: 'decided', times: 1, slot: 'past' },
  { path: 'handed-over', times: 3, slot: 'just' },
  { path: 'contested', times: 1, slot: 'gone' },
  { path: 'ready', times: 3, slot: 'next', balanceDue: 'at-handover' },
  { path: 'ready-paid', times: 1, slot: 'next', balanceDue: 'at-handover' },
  { path: 'scheduled', times: 5, slot: 'coming', balanceDue: 'at-handover' },
  { path: 'requested', times: 3, slot: 'coming', accept: 'ask' },
  { path: 'reserved', times: 3, slot: 'coming' },
  { path: 'hold-expired', times: 3, slot: 'any' },
  { path: 'left', times: 2, slot: 'any' },
  { path: 'declined', times: 3, slot: 'any', accept: 'ask' },
  { path: 'silent', times: 2, slot: 'any', accept: 'ask' },
  { path: 'withdrawn', times: 2, slot: 'any', accept: 'ask' },
  { path: 'buyer-cancelled', times: 2, slot: 'past', balanceDue: 'at-handover', leadDays: [4.2, 6.5] },
  { path: 'buyer-cancelled-late', times: 1, slot: 'past', balanceDue: 'at-handover' },
  { path: 'seller-cancelled', times: 2, slot: 'past' },
  { path: 'day-missed', times: 1, slot: 'past', balanceDue: 'at-handover' },
  { path: 'balance-unpaid', times: 1, slot: 'past', balanceDue: 'before' },
  { path: 'buyer-absent', times: 2, slot: 'past' },
  { path: 'seller-absent', times: 1, slot: 'past' },
  { path: 'stopped', times: 1, slot: 'past' },
]
