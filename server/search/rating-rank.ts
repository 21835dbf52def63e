import { UNRATED_RANK } from '@/server/search/search-row'

// House rule: a seller starts from the site's mean, which weighs as much as five ratings, so that one kind word does
// not outrank a hundred.
const PRIOR_WEIGHT = 5

interface Rated {
  /** 1 to 5. */
  mean: number
  count: number
}

/** 0 best … 500 worst; no ratings: 501. */
export function ratingRank({ mean, count }: Rated, siteMean: number): number {
  if (count <= 0) return UNRATED_RANK
  const shrunk = (siteMean * PRIOR_WEIGHT + mean * count) / (PRIOR_WEIGHT + count)
  return 500 - Math.round(Math.min(5, Math.max(0, shrunk)) * 100)
}
