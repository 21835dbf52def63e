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
  | 'answeredInTime'
  | 'answersMissed'
  | 'createdAt'
>

/** Mean to one decimal; absent before the first rating. */
export function presentRating(row: { ratingCount: number; ratingSum: number }): SellerCard['rating'] {
  if (row.ratingCount === 0) return undefined
  return { mean: Math.round((row.ratingSum / row.ratingCount) * 10) / 10, count: row.ratingCount }
}

/** The public face of a seller: a town and what the record shows, nothing that leads to the door. */
export function presentSellerCard(row: CardRow): SellerCard {
  const asked = row.answeredInTime + row.answersMissed
  const rating = presentRating(row)
  return {
    sellerId: row.publicId,
    farmName: row.farmName,
    kind: row.kind === 'grower' ? 'grower' : 'hatchery',
    placeText: `${row.city}, ${row.state}`,
    state: row.state,
    ...(rating ? { rating } : {}),
    ...(asked > 0 ? { answerRate: { inTime: row.answeredInTime, asked } } : {}),
    since: row.createdAt.toISOString().slice(0, 10),
  }
}
