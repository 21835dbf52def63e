import type { SearchQuery } from '@/server/search/search-query'

/** First guesses for the share of listings that meet a wish; served searches correct them. */
const COUNT_SHARES: readonly (readonly [from: number, share: number])[] = [
  [50, 0.22],
  [25, 0.43],
  [10, 0.72],
  [1, 1],
]
const PRICE_SHARE = 0.6
const SIZE_SHARE = 0.4
const DAYS_SHARE = 0.7
const ONE_DAY_SHARE = 0.2
const PICKUP_SHARE = 0.7
const SHIP_SHARE = 0.35
const EITHER_SHARE = 0.8
const SHIPPED_SHARE = 0.02
/** Weight of a new observation against what was learnt before. */
const LEARNING_RATE = 0.1
const MOST_REMEMBERED = 512

function countStep(count: number): { from: number; share: number } {
  const [from, share] = COUNT_SHARES.find(([least]) => count >= least) ?? [0, 1]
  return { from, share }
}

function handoverStep({
  pickup,
  lanes,
}: NonNullable<SearchQuery['handover']>): [name: string, share: number] {
  if (pickup && lanes.length > 0) return ['either', EITHER_SHARE]
  return pickup ? ['pickup', PICKUP_SHARE] : ['ship', SHIP_SHARE]
}

function firstGuess(query: SearchQuery): { wishes: string; share: number } {
  const names: string[] = []
  let share = 1
  const wish = (name: string, part: number) => {
    names.push(name)
    share *= part
  }
  if (query.count !== undefined) wish(`n${countStep(query.count).from}`, countStep(query.count).share)
  if (query.mostCents !== undefined) wish('cents', PRICE_SHARE)
  if (query.sizeMm) wish('mm', SIZE_SHARE)
  if (query.days) {
    const oneDay = query.days.from === query.days.until
    wish(oneDay ? 'day' : 'days', oneDay ? ONE_DAY_SHARE : DAYS_SHARE)
  }
  if (query.handover) wish(...handoverStep(query.handover))
  if (query.shipped) wish('shipped', SHIPPED_SHARE)
  return { wishes: names.join(' '), share }
}

/** Learns what share of the listings in a circle meets each combination of wishes. Only sizes plans. */
export class Selectivity {
  private readonly factors = new Map<string, number>()

  /** Share between 0 and 1, never 0. */
  estimate(query: SearchQuery): number {
    const { wishes, share } = firstGuess(query)
    return Math.min(1, share * (this.factors.get(wishes) ?? 1))
  }

  /** `found` listings met the wishes among about `candidates`. */
  learn(query: SearchQuery, candidates: number, found: number): void {
    if (candidates < 5) return
    const { wishes, share } = firstGuess(query)
    if (!this.factors.has(wishes) && this.factors.size >= MOST_REMEMBERED) return
    const seen = Math.min(1, Math.max(0.002, found / candidates)) / share
    const before = this.factors.get(wishes) ?? 1
    this.factors.set(wishes, before * (seen / before) ** LEARNING_RATE)
  }
}
