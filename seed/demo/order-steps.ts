import type { OrderDesk } from '@/seed/demo/order-desk'
import type { OrderPath } from '@/seed/demo/order-story.facts'
import type { GoodsPath, OrderPlan } from '@/seed/demo/plan-orders'
import type { ShipPath } from '@/seed/demo/ship-story.facts'
import { after, DAY_MS, HOUR_MS, MINUTE_MS, type Step } from '@/seed/demo/timeline'
import { claimWindowHours } from '@/shared/domain/listings/claim-promise'

type Timed = readonly [at: Date, act: keyof OrderDesk]

/** The moments an order's acts hang on. */
interface Times {
  reserved: Date
  /** Begin and end of the pickup window; the moment of the order where there is none. */
  begins: Date
  ends: Date
  now: Date
  claimHours: number
}

const bought = ({ reserved }: Times): Timed[] => [
  [reserved, 'reserve'],
  [after(reserved, 2 * MINUTE_MS), 'payDeposit'],
]
const agreed = (times: Times): Timed[] => [...bought(times), [after(times.reserved, 7 * HOUR_MS), 'accept']]
/** Balance first: some sellers ask for it two days before, and it is never too early. */
const readied = (times: Times): Timed[] => [
  ...agreed(times),
  [after(times.reserved, 8 * HOUR_MS), 'payBalance'],
  [after(times.begins, -26 * HOUR_MS), 'markReady'],
]
const handedOver = (times: Times, act: 'handOver' | 'handOverShort' = 'handOver'): Timed[] => [
  ...readied(times),
  [after(times.begins, 14 * MINUTE_MS), act],
]
/** What follows a hand-over, as far as the demo's day has come. */
const afterwards = ({ begins, now }: Times): Timed[] =>
  (
    [
      [after(begins, 2 * DAY_MS + 3 * HOUR_MS), 'rate'],
      [after(begins, 3 * DAY_MS + 9 * HOUR_MS), 'reply'],
      [after(begins, 7 * DAY_MS + 15 * MINUTE_MS), 'askSurvival'],
      [after(begins, 7 * DAY_MS + 9 * HOUR_MS), 'answerSurvival'],
    ] satisfies Timed[]
  ).filter(([at]) => at < now)

const missed = (times: Times, by: 'buyer' | 'seller'): Timed[] => {
  const reported = by === 'buyer' ? after(times.begins, 25 * MINUTE_MS) : after(times.ends, 62 * MINUTE_MS)
  return [...readied(times), [reported, by === 'buyer' ? 'reportSellerAbsent' : 'reportBuyerAbsent']]
}
const cancelled = (times: Times, by: 'buyer' | 'seller', at: Date): Timed[] => [
  ...agreed(times),
  [at, by === 'buyer' ? 'cancelAsBuyer' : 'cancelAsSeller'],
]

/** Ordered, paid and counted; a step that lies ahead is left to the people of the demo. */
const boxed = (times: Times): Timed[] => [
  ...agreed(times),
  [after(times.reserved, 8 * HOUR_MS), 'payBalance'],
  [after(times.begins, -13 * HOUR_MS), 'namePapers'],
  [after(times.begins, -12 * HOUR_MS), 'markReady'],
]
const sent = (times: Times): Timed[] => [
  ...boxed(times),
  [after(times.begins, 8 * HOUR_MS), 'checkRoute'],
  [after(times.begins, 8 * HOUR_MS + 10 * MINUTE_MS), 'dispatch'],
]

const paths: Record<OrderPath | ShipPath | GoodsPath, (times: Times) => Timed[]> = {
  'ship-settled': (times) => [
    ...sent(times),
    [after(times.begins, 28 * HOUR_MS), 'arrive'],
    [after(times.begins, 33 * HOUR_MS), 'confirm'],
    ...afterwards({ ...times, begins: after(times.begins, DAY_MS) }),
  ],
  // Promised for 20:00 of the day after, and 36 hours more: nobody said that it came.
  'ship-late': (times) => [...sent(times), [after(times.begins, 75 * HOUR_MS), 'ring']],
  'ship-leaving': (times) => boxed(times).filter(([at]) => at < times.now),
  'ship-coming': (times) => boxed(times).filter(([at]) => at < times.now),
  'ship-held': (times) => [
    ...boxed(times).filter(([at]) => at < times.now),
    [after(times.now, -90 * MINUTE_MS), 'holdForWeather'],
  ],
  'goods-settled': (times) => [
    ...handedOver(times),
    [after(times.begins, times.claimHours * HOUR_MS + 16 * MINUTE_MS), 'ring'],
  ],
  confirmed: (times) => [
    ...handedOver(times),
    [after(times.begins, 5 * HOUR_MS), 'confirm'],
    ...afterwards(times),
  ],
  'closed-by-time': (times) => [
    ...handedOver(times),
    [after(times.begins, times.claimHours * HOUR_MS + 16 * MINUTE_MS), 'ring'],
    ...afterwards(times),
  ],
  short: (times) => [
    ...handedOver(times, 'handOverShort'),
    [after(times.begins, 20 * HOUR_MS * (times.claimHours / 24)), 'confirm'],
  ],
  decided: (times) => [
    ...missed(times, 'seller'),
    [after(times.ends, 4 * HOUR_MS), 'contest'],
    [after(times.ends, 26 * HOUR_MS), 'decide'],
  ],
  'handed-over': (times) => handedOver(times),
  contested: (times) => [...missed(times, 'seller'), [after(times.ends, 5 * HOUR_MS), 'contest']],
  'ready-paid': (times) => [
    ...agreed(times),
    [after(times.now, -5 * HOUR_MS), 'markReady'],
    [after(times.now, -80 * MINUTE_MS), 'payBalance'],
  ],
  ready: (times) => [...agreed(times), [after(times.now, -4 * HOUR_MS), 'markReady']],
  scheduled: (times) => [...bought(times), [after(times.reserved, 2 * HOUR_MS), 'accept']],
  'no-day-yet': bought,
  requested: bought,
  reserved: ({ reserved }) => [[reserved, 'reserve']],
  'hold-expired': ({ reserved }) => [
    [reserved, 'reserve'],
    [after(reserved, 16 * MINUTE_MS), 'ring'],
  ],
  left: ({ reserved }) => [
    [reserved, 'reserve'],
    [after(reserved, 5 * MINUTE_MS), 'leave'],
  ],
  declined: (times) => [...bought(times), [after(times.reserved, 9 * HOUR_MS), 'decline']],
  silent: (times) => [...bought(times), [after(times.reserved, 48 * HOUR_MS + 3 * MINUTE_MS), 'ring']],
  withdrawn: (times) => [...bought(times), [after(times.reserved, 3 * HOUR_MS), 'withdraw']],
  'buyer-cancelled': (times) => cancelled(times, 'buyer', after(times.reserved, 11 * HOUR_MS)),
  'buyer-cancelled-late': (times) => cancelled(times, 'buyer', after(times.begins, -20 * HOUR_MS)),
  'seller-cancelled': (times) => cancelled(times, 'seller', after(times.reserved, 30 * HOUR_MS)),
  'day-missed': (times) => [...agreed(times), [after(times.ends, 3 * DAY_MS + MINUTE_MS), 'ring']],
  'balance-unpaid': (times) => [...agreed(times), [after(times.begins, -22 * HOUR_MS), 'ring']],
  'buyer-absent': (times) => [...missed(times, 'seller'), [after(times.ends, 26 * HOUR_MS), 'ring']],
  'seller-absent': (times) => [...missed(times, 'buyer'), [after(times.begins, 25 * HOUR_MS), 'ring']],
  stopped: (times) => [...agreed(times), [after(times.reserved, 20 * HOUR_MS), 'stop']],
}

/** The acts of one order on the timeline. */
export function orderSteps(plan: OrderPlan, desk: OrderDesk, now: Date): Step[] {
  const { key, path, slot, reservedAt, batch } = plan
  const times: Times = {
    ...{ reserved: reservedAt, now, claimHours: claimWindowHours(batch.body) },
    begins: slot?.startsAt ?? reservedAt,
    ends: slot?.endsAt ?? reservedAt,
  }
  return paths[path](times)
    .filter(([, act]) => act !== 'accept' || batch.body.accept === 'ask')
    .map(([at, act]) => ({ at, story: `order ${key}`, what: act, run: () => desk[act]() }))
}
