import { meanRating } from '@/server/ratings/mean-rating'
import type { SellerRow } from '@/server/sellers/seller-store'
import type { SellerCard } from '@/shared/contracts/sellers'

type CardRow = Pick<
  SellerRow,
  | 'publicId'
  | 'farmName'
  | 'kind'
  | 'city'
  | 'state'
  | 'ratingCount'
  | 'ratingSum'
  | 'survivalAsked'
  | 'survivalAnswered'
  | 'survivalHandedOver'
  | 'survivalAlive'
  | 'answeredInTime'
  | 'answersMissed'
  | 'createdAt'
>

const oneDecimal = (mean: number) => Math.round(mean * 10) / 10

/** Mean to one decimal; absent before the first rating. */
export function presentRating(row: { ratingCount: number; ratingSum: number }): SellerCard['rating'] {
  if (row.ratingCount === 0) return undefined
  return { mean: oneDecimal(meanRating(row)), count: row.ratingCount }
}

/** What all day-7 answers add up to; absent before the first question. */
function presentSurvivalRecord(row: CardRow): SellerCard['survival'] {
  if (row.survivalAsked === 0) return undefined
  return {
    alive: row.survivalAlive,
    handedOver: row.survivalHandedOver,
    answered: row.survivalAnswered,
    asked: row.survivalAsked,
  }
}

/** The mean of each mark. */
export function presentMarks(row: SellerRow): { fish: number; count: number; contact: number } | undefined {
  if (row.ratingCount === 0) return undefined
  const mean = (sum: number) => oneDecimal(sum / row.ratingCount)
  return { fish: mean(row.fishMarkSum), count: mean(row.countMarkSum), contact: mean(row.contactMarkSum) }
}

/** The public face of a seller: a town and what the record shows, nothing that leads to the door. */
export function presentSellerCard(row: CardRow): SellerCard {
  const asked = row.answeredInTime + row.answersMissed
  const rating = presentRating(row)
  const survival = presentSurvivalRecord(row)
  return {
    sellerId: row.publicId,
    farmName: row.farmName,
    kind: row.kind === 'grower' ? 'grower' : 'hatchery',
    placeText: `${row.city}, ${row.state}`,
    state: row.state,
    ...(rating ? { rating } : {}),
    ...(survival ? { survival } : {}),
    ...(asked > 0 ? { answerRate: { inTime: row.answeredInTime, asked } } : {}),
    since: row.createdAt.toISOString().slice(0, 10),
  }
}
