import { FactRows } from './fact-rows'
import { percent } from './percent'

import type { ListingBody } from '@/shared/contracts/listings'
import { thingsOf } from '@/shared/domain/listings/count-words'
import { shippingOf } from '@/shared/domain/listings/shipping-of'
import { clockMs, clocks } from '@/shared/domain/orders/clocks.facts'

const minutesPerHour = 60
const minuteMs = 60_000

/** Deposit, balance, cancelling and not coming, in plain words. */
export function MoneyTerms({ body }: { body: ListingBody }) {
  const answerHours = clockMs('sellerAnswer', body.category) / minuteMs / minutesPerHour
  const graceMinutes = clockMs('pickupGrace', body.category) / minuteMs
  return (
    <FactRows
      title="Paying and cancelling"
      facts={[
        {
          term: 'Holding',
          value: `Holding sets your ${thingsOf(body)} aside for ${clocks.checkoutHold.minutes} minutes while you pay the deposit.`,
        },
        {
          term: 'Deposit',
          value: `${percent(body.depositPct)} of the price, by card, when you hold them. Our payment processor holds it; the grower gets it after you confirm.`,
        },
        {
          term: 'The rest',
          value:
            body.balanceDue === 'at-handover'
              ? 'By card before you collect; it is released when you have the ${thingsOf(body)} and say all is good.'
              : `By card, at the latest ${clocks.balanceDue.minutes / minutesPerHour} hours before the pickup window.`,
        },
        {
          term: 'Answer',
          value:
            body.accept === 'instant'
              ? 'The order stands as soon as the deposit is paid.'
              : `The grower says yes or no within ${answerHours} hours. No answer: nothing is taken from your card.`,
        },
        {
          term: 'Cancelling',
          value: `Free until ${body.freeCancelHours} hours before the window. After that the grower may keep the deposit, never more.`,
        },
        ...(shippingOf(body)
          ? [
              {
                term: 'When shipped',
                value: `The rest is due ${clocks.balanceDue.minutes / minutesPerHour} hours before the ship day; cancelling is free until ${body.freeCancelHours} hours before it. If the weather stops the day and you do not want another, everything goes back.`,
              },
            ]
          : []),
        {
          term: 'Not coming',
          value: `If you are not there ${graceMinutes} minutes after the window, the grower may keep the deposit; the rest goes back to your card. If the grower is not there, everything goes back.`,
        },
      ]}
    />
  )
}
