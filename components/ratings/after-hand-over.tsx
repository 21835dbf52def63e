import { useState } from 'react'

import { RateOrder } from './rate-order'
import { ReplyToRating } from './reply-to-rating'
import { ShownRatingCard } from './shown-rating'
import { SurvivalQuestion } from './survival-question'

import { Button } from '@/components/ui/button'
import type { ShownOrder } from '@/shared/contracts/orders'

/** What remains to be said once the animals have changed hands: the count of day 7, the rating and its reply. */
export function AfterHandOver({ order }: { order: ShownOrder }) {
  const [isRating, setRating] = useState(false)
  const { rating, survival } = order
  const may = new Set(order.may)
  const zone = order.slot?.zone ?? 'America/New_York'
  return (
    <>
      {survival ? (
        <SurvivalQuestion
          orderId={order.orderId}
          survival={survival}
          mayAnswer={may.has('answer-survival')}
          zone={zone}
        />
      ) : null}
      {may.has('rate') ? (
        <Button label="Rate this order" icon="star" kind="secondary" isWide onPress={() => setRating(true)} />
      ) : null}
      {rating ? (
        <ShownRatingCard rating={rating}>
          {may.has('change-rating') ? (
            <Button label="Change your rating" kind="quiet" icon="edit" onPress={() => setRating(true)} />
          ) : null}
          {may.has('reply-to-rating') ? <ReplyToRating orderId={order.orderId} /> : null}
        </ShownRatingCard>
      ) : null}
      {isRating ? <RateOrder order={order} onClose={() => setRating(false)} /> : null}
    </>
  )
}
