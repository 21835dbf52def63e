import { now } from '@/server/clock'
import type { OrderRow } from '@/server/orders/order-store'
import type { Party } from '@/server/orders/order-policy'
import type { RatingRow } from '@/server/ratings/rating-store'
import type { SurvivalRow } from '@/server/ratings/survival-store'
import { ratingTimes } from '@/shared/domain/ratings/rating-times.facts'

/** What was said about an order after its hand-over. */
export interface AfterHandOver {
  rating?: RatingRow | undefined
  survival?: SurvivalRow | undefined
}

interface Looking extends AfterHandOver {
  order: OrderRow
  party: Party
}

const until = (from: Date, ms: number) => new Date(from.getTime() + ms)
const RATEABLE = ['handed_over', 'arrived', 'claim_open', 'settled']

/** Handed over, and not merely closed: a kept deposit is settled too. */
const wasHandedOver = ({ order }: Looking) => order.handedOverAt !== null && RATEABLE.includes(order.state)

export function editableUntil(rating: RatingRow): Date {
  return until(rating.createdAt, ratingTimes.editMs)
}

/** The end of the time to answer, or, once answered, to correct the answer. */
export function survivalOpenUntil({ dueAt, answeredAt }: SurvivalRow): Date {
  return answeredAt
    ? until(answeredAt, ratingTimes.survivalCorrectMs)
    : until(dueAt, ratingTimes.survivalOpenMs)
}

const abilities = {
  rate: (seen: Looking) => seen.party === 'buyer' && wasHandedOver(seen) && !seen.rating,
  'change-rating': ({ party, rating }: Looking) =>
    party === 'buyer' && rating !== undefined && now() <= editableUntil(rating),
  'reply-to-rating': ({ party, rating }: Looking) =>
    party === 'seller' && rating !== undefined && rating.repliedAt === null,
  'answer-survival': (seen: Looking) =>
    seen.party === 'buyer' &&
    wasHandedOver(seen) &&
    seen.survival !== undefined &&
    now() >= seen.survival.dueAt &&
    now() <= survivalOpenUntil(seen.survival),
}
export type RatingAct = keyof typeof abilities

export function mayRate(act: RatingAct, seen: Looking): boolean {
  return seen.order.freeze === 'none' && abilities[act](seen)
}

export function ratingActsOf(seen: Looking): RatingAct[] {
  return (Object.keys(abilities) as RatingAct[]).filter((act) => mayRate(act, seen))
}
