import { UNRATED_RANK } from '@/server/search/search-row'

// House rule: a seller starts from an ordinary 4.0 that weighs as much as five ratings, so that one kind word does
// not outrank a hundred.
const PRIOR_MEAN = 4
const PRIOR_WEIGHT = 5

/** Mean of 1 to 5 and number of ratings → 0 best … 500 worst; no ratings: 501. */
export function ratingRank(mean: number, count: number): number {
  if (count <= 0) return UNRATED_RANK
  const shrunk = (PRIOR_MEAN * PRIOR_WEIGHT + mean * count) / (PRIOR_WEIGHT + count)
  return 500 - Math.round(Math.min(5, Math.max(0, shrunk)) * 100)
}
