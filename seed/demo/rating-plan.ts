import { demoRatings } from '@/seed/demo/rating-words.facts'
import { seededRandom } from '@/seed/seeded-random'

/** Some never rate, some never answer; most fish live. */
const RATES = 0.75
const ANSWERS = 0.8

export interface RatingPlan {
  rating: (typeof demoRatings)[number] | null
  /** Share alive on day 7; null: no answer. */
  aliveShare: number | null
}

export function planRating(key: string): RatingPlan {
  const chance = seededRandom(`rating of ${key}`)
  return {
    rating: chance.happens(RATES) ? chance.pick(demoRatings) : null,
    aliveShare: chance.happens(ANSWERS) ? chance.between(0.84, 1) : null,
  }
}
