/** What must hold before an edge may be taken, in words; the use case of the edge proves it. */
export const guardTexts = {
  'may-reserve':
    'the listing is live, the legal gate passes, and the quantity is between the minimum and what is free',
  'hold-over': 'the 15 minutes are over and no payment has been reported',
  'payment-good-ask': 'the seller wants to be asked; the event is genuine and its amount is the order’s',
  'payment-good-instant': 'the listing accepts at once; the event is genuine and its amount is the order’s',
  'payment-good-pool':
    'the line belongs to a pool that is open; the event is genuine and its amount is the order’s',
  'answer-in-time': 'inside the answer clock and the authorisation’s life; the legal gate passes again',
  'reason-code': 'a reason code is given',
  'no-answer': 'the seller has not answered',
  'not-accepted': 'the seller has not accepted yet',
  'pool-met': 'the pool closes at or over its minimum',
  'pool-missed': 'the pool closed under its minimum and the seller did not waive it in time',
  'pool-not-frozen': 'the pool is not frozen yet',
  'day-agreed':
    'one published slot or ship day is chosen, or proposed and accepted; the route’s papers hold on that day',
  'no-day': 'no day was agreed',
  'outside-limits': 'the forecast leaves the limits of species and packing, or the pickup is unsafe',
  'new-day': 'a new day; silence counts for the first hold only, and for 30 days at most',
  'before-dispatch': 'nothing has been dispatched',
  'no-consent': 'a second, longer or open-ended hold without an answer',
  'balance-ready': 'shipping: the balance is captured; pickup: captured, or due at the hand-over',
  'balance-missing': 'the balance is not paid',
  'day-missed': 'neither ready nor held on the day',
  'last-check-red': 'a last check, the evening before or that morning, leaves the limits',
  'free-move': 'the slot moves; one free move for each side',
  'may-dispatch':
    'the balance is captured, the temperature check is fresh and good, papers and tracking number are there, the ship day is allowed',
  'count-agreed': 'the code fits, both agree on the count, the balance is captured',
  'buyer-absent': 'window and grace are over; the buyer may contest for a day',
  'seller-absent': 'the buyer is at the place in the window; the seller may contest for a day',
  'nobody-marked': 'the window ended and nobody marked anything',
  delivered: 'a delivery scan, or the buyer says so',
  'late-or-lost': 'the promised delivery is long past',
  'loss-shown': 'inside the window, with alive and dead counts and photos',
  'in-window': 'inside the claim window',
  'all-good': 'the buyer says all is good, or the window ended',
  'claim-agreed': 'an agreed amount, a withdrawn claim, or a decision with its reason',
  'claim-unanswered': 'the seller has not answered and the evidence is complete',
  'admin-cause': 'prohibited species, recall, fraud, or a seller who is gone',
  'admin-cause-goods-out': 'recall, or a prohibited species found',
  'pool-waived': 'the pool is under its minimum and the seller runs it all the same, in time',
  'before-hand-over': 'nothing was handed over or dispatched',
} as const

export type GuardKey = keyof typeof guardTexts
