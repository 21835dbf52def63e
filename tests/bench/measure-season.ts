import type { ListingSearch } from '@/server/search/listing-search'
import type { SearchQuery } from '@/server/search/search-query'
import { bruteForce } from '@/tests/bench/brute-force'
import { pageFault } from '@/tests/bench/compare-page'
import { pairKinds, seasonPairs, type PairKind } from '@/tests/bench/make-pair'
import type { MadeListings } from '@/tests/bench/made-listings'
import { timesOf, type Times } from '@/tests/bench/times'

const WARM_UP = 50
/** The season filter may make the median this much longer, from so many listings on: below, the round trip hides all. */
const MOST_RATIO = 1.2
const JUDGED_FROM = 100_000

export interface PairTimes {
  plain: Times
  shipped: Times
  /** shipped / plain at the median. */
  ratio: number
  meanHits: { plain: number; shipped: number }
}

export interface SeasonResult {
  all: PairTimes
  kinds: Record<PairKind, PairTimes>
  faults: string[]
}

interface Timed {
  kind: PairKind
  plainMs: number
  shippedMs: number
  plainHits: number
  shippedHits: number
}

const mean = (figures: readonly number[]) => figures.reduce((sum, one) => sum + one, 0) / figures.length

function pairTimes(timed: readonly Timed[]): PairTimes {
  const plain = timesOf(timed.map((one) => one.plainMs))
  const shipped = timesOf(timed.map((one) => one.shippedMs))
  return {
    plain,
    shipped,
    ratio: shipped.p50Ms / plain.p50Ms,
    meanHits: {
      plain: mean(timed.map((one) => one.plainHits)),
      shipped: mean(timed.map((one) => one.shippedHits)),
    },
  }
}

/** What the season filter adds: each question with and without it, one right after the other, and both checked. */
export async function measureSeason(
  made: MadeListings,
  search: Pick<ListingSearch, 'search'>,
  asked: { pairs: number; seed: number },
): Promise<SeasonResult> {
  const ask = seasonPairs(made, asked.seed + 77)
  const faults: string[] = []
  const timed: Timed[] = []

  async function one(query: SearchQuery): Promise<{ ms: number; hits: number }> {
    const before = performance.now()
    const { hits } = await search.search(query)
    const ms = performance.now() - before
    const fault = pageFault(hits, bruteForce(made, query).slice(0, query.limit))
    if (fault) faults.push(`season: ${fault} for ${JSON.stringify(query)}`)
    return { ms, hits: hits.length }
  }

  for (let warm = 0; warm < WARM_UP; warm++) {
    const { plain, shipped } = ask()
    await search.search(plain)
    await search.search(shipped)
  }
  for (let at = 0; at < asked.pairs; at++) {
    const { kind, plain, shipped } = ask()
    // Whoever comes second finds the pages warm: each is first as often as the other.
    const [first, second] =
      Math.floor(at / Object.keys(pairKinds).length) % 2 === 0 ? [plain, shipped] : [shipped, plain]
    const answers = new Map([
      [first, await one(first)],
      [second, await one(second)],
    ])
    const [without, withIt] = [answers.get(plain), answers.get(shipped)]
    if (!without || !withIt) continue
    timed.push({
      kind,
      ...{ plainMs: without.ms, plainHits: without.hits },
      ...{ shippedMs: withIt.ms, shippedHits: withIt.hits },
    })
  }
  const kinds = Object.keys(pairKinds) as PairKind[]
  return {
    all: pairTimes(timed),
    kinds: Object.fromEntries(
      kinds.map((kind) => [kind, pairTimes(timed.filter((one) => one.kind === kind))]),
    ) as Record<PairKind, PairTimes>,
    faults,
  }
}

/** Whether the filter costs more than it may. Fewer listings are not judged. */
export function slownessFaults(listings: number, { all }: Pick<SeasonResult, 'all'>): string[] {
  if (listings < JUDGED_FROM || all.ratio <= MOST_RATIO) return []
  return [
    `season: the filter makes the median ${all.ratio.toFixed(2)} times as long, at most ${MOST_RATIO.toFixed(2)}`,
  ]
}
