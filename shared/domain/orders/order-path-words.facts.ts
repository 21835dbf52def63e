import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import type { CancelReason, OrderState } from '@/shared/domain/orders/states.facts'

/** What happens when a timer takes this edge, told before it does. */
export const silenceWords: Partial<Record<EdgeId, string>> = {
  E02: 'the hold ends, the animals go back on sale and nothing is charged',
  E09: 'the request ends, the card is not charged and the animals go back on sale',
  E11: 'the run closes; if it has reached its minimum, the order stands at the price that was reached',
  E12: 'the run is called off and every deposit goes back in full',
  E17: 'the order ends and everything paid goes back to the buyer',
  E19: 'the new day stands',
  E21: 'the order ends and everything paid goes back to the buyer',
  E23: 'the order ends; the deposit is kept, nothing else is charged',
  E26: 'the order ends and everything paid goes back to the buyer',
  E33: 'a claim opens so that somebody looks at what happened',
  E34: 'the order ends and everything paid goes back to the buyer',
  E36: 'the box counts as late and a claim opens by itself',
  E38: 'the order settles and the seller is paid',
  E40: 'the order settles and the seller is paid',
  E42: 'what was claimed goes back to the buyer and the rest is paid out',
}

export const endWords: Record<CancelReason, string> = {
  hold_expired: 'The hold ended before it was paid.',
  buyer_left: 'The buyer let the hold go.',
  seller_declined: 'The seller declined. Nothing was charged.',
  seller_silent: 'The seller did not answer in time. Nothing was charged.',
  buyer_changed_mind: 'The buyer withdrew the request. Nothing was charged.',
  pool_missed: 'The run did not reach its minimum. The deposit went back in full.',
  left_pool: 'The buyer left the run. The deposit went back in full.',
  buyer_cancelled: 'The buyer cancelled.',
  seller_cancelled: 'The seller cancelled. Everything paid went back.',
  never_scheduled: 'No day was agreed. Everything paid went back.',
  hold_declined: 'The buyer declined the new day. Everything paid went back.',
  hold_no_consent: 'The new day was not agreed to. Everything paid went back.',
  balance_unpaid: 'The balance was not paid in time. The deposit was kept.',
  seller_missed_day: 'The day passed without the animals. Everything paid went back.',
  buyer_no_show: 'Nobody came to collect. The deposit was kept, the balance went back.',
  seller_no_show: 'The seller was not there. Everything paid went back.',
  admin_stop: 'We stopped this order. Everything paid went back.',
}

export type PathStep =
  'held' | 'asked' | 'pooled' | 'paid' | 'day' | 'ready' | 'sent' | 'arrived' | 'handed-over' | 'settled'

export const stepWords: Record<PathStep, string> = {
  held: 'Held',
  asked: 'Seller asked',
  pooled: 'In the run',
  paid: 'Deposit paid',
  day: 'Day agreed',
  ready: 'Ready',
  sent: 'Sent',
  arrived: 'Arrived',
  'handed-over': 'Handed over',
  settled: 'Settled',
}

/** The step on which an order stands; a claim and a weather hold stand on the step they interrupt. */
export const stepOf: Record<Exclude<OrderState, 'cancelled' | 'claim_open'>, PathStep> = {
  reserved: 'held',
  requested: 'asked',
  pledged: 'pooled',
  deposit_paid: 'paid',
  scheduled: 'day',
  weather_hold: 'day',
  ready: 'ready',
  dispatched: 'sent',
  arrived: 'arrived',
  handed_over: 'handed-over',
  settled: 'settled',
}
