import { printCount } from '@/shared/units/count'
import type { SellerCard } from '@/shared/contracts/sellers'

/** "4.8 of 5 from 12 ratings". */
export function ratingWords({ rating }: Pick<SellerCard, 'rating'>): string {
  if (!rating) return 'No ratings yet'
  const from = rating.count === 1 ? '1 rating' : `${printCount(rating.count)} ratings`
  return `${rating.mean.toFixed(1)} of 5 from ${from}`
}

/** "Answered 18 of 20 requests in time"; '' before the first. */
export function answerWords({ answerRate }: Pick<SellerCard, 'answerRate'>): string {
  if (!answerRate) return ''
  const { inTime, asked } = answerRate
  return `Answered ${printCount(inTime)} of ${printCount(asked)} ${asked === 1 ? 'request' : 'requests'} in time`
}

/** "Here since March 2026". */
export function sinceWords({ since }: Pick<SellerCard, 'since'>): string {
  const month = new Intl.DateTimeFormat('en-US', { timeZone: 'UTC', month: 'long', year: 'numeric' })
  return `Here since ${month.format(new Date(`${since.slice(0, 10)}T12:00:00Z`))}`
}

const licences: Record<string, string> = {
  have: 'They hold the licence or permit the state asks for.',
  'not-needed': 'They say none is needed for what they sell.',
  unsure: 'They are not sure yet.',
}

/** What a seller answered about a state's licence; their word, not our check. */
export function licenceWords(answer: string): string {
  return licences[answer] ?? 'No answer.'
}
