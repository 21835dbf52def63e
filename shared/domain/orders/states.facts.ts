export const orderStates = [
  'reserved',
  'requested',
  'pledged',
  'deposit_paid',
  'scheduled',
  'weather_hold',
  'ready',
  'dispatched',
  'handed_over',
  'arrived',
  'claim_open',
  'settled',
  'cancelled',
] as const

export type OrderState = (typeof orderStates)[number]

/** Nothing leaves these; a later refund is an adjustment, not a new state. */
export const finalStates: readonly OrderState[] = ['settled', 'cancelled']

export const cancelReasons = [
  'hold_expired',
  'buyer_left',
  'seller_declined',
  'seller_silent',
  'buyer_changed_mind',
  'pool_missed',
  'left_pool',
  'buyer_cancelled',
  'seller_cancelled',
  'never_scheduled',
  'hold_declined',
  'hold_no_consent',
  'balance_unpaid',
  'seller_missed_day',
  'buyer_no_show',
  'seller_no_show',
  'admin_stop',
] as const

export type CancelReason = (typeof cancelReasons)[number]
