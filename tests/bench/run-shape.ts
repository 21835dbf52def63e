import type { ListingSearch } from '@/server/search/listing-search'
import type { SearchQuery } from '@/server/search/search-query'
import { bruteForce, type BruteHit } from '@/tests/bench/brute-force'
import { chances } from '@/tests/bench/chances'
import { pageFault } from '@/tests/bench/compare-page'
import type { MadeListings } from '@/tests/bench/made-listings'
import { shapedQueries, type Shape } from '@/tests/bench/make-query'
import type { Peer, PeerHit } from '@/tests/bench/peers/peer'
import { rowsRead } from '@/tests/bench/rows-read'
import { timesOf, type Times } from '@/tests/bench/times'

const WARM_UP = 10
const METRES_APART = 5

export interface ShapeResult {
  shape: Shape
  ours: Times
  peers: Record<string, Times>
  meanTrips: number
  meanRowsRead: number
  meanHits: number
  faults: string[]
}

/** Ties may stand in another order elsewhere, so a peer is held to what it found, not to which of equals. */
function peerFault(
  hits: readonly PeerHit[],
  expected: readonly BruteHit[],
  { sort }: SearchQuery,
): string | null {
  if (hits.length !== expected.length) return `${hits.length} rows, not ${expected.length}`
  for (const [at, want] of expected.entries()) {
    const hit = hits[at]
    if (!hit) return `row ${at} is missing`
    if (sort === 'cheapest' && hit.unitCents !== want.unitCents) return `row ${at} costs ${hit.unitCents}`
    if (sort === 'nearest' && Math.abs(hit.distanceKm - want.distanceKm) * 1000 > METRES_APART) {
      return `row ${at} is ${hit.distanceKm} km away, not ${want.distanceKm}`
    }
  }
  return null
}

interface Ground {
  made: MadeListings
  search: ListingSearch
  peers: readonly Peer[]
}

/** Asks every question of every way in rotating order, checks every answer, and times what is right. */
export async function runShape(shape: Shape, ground: Ground, asked: { queries: number; seed: number }) {
  const { made, search } = ground
  const ask = shapedQueries(shape, made, chances(asked.seed + shape.charCodeAt(0)))
  const peers = ground.peers.filter((peer) => peer.shapes.includes(shape))
  const faults: string[] = []
  const ms = new Map<string, number[]>([
    ['ours', []],
    ...peers.map((peer): [string, number[]] => [peer.name, []]),
  ])
  let trips = 0
  let hits = 0
  for (let warm = 0; warm < WARM_UP; warm++) await search.search(ask())

  async function one(name: string, query: SearchQuery, expected: readonly BruteHit[]): Promise<void> {
    const peer = peers.find((one) => one.name === name)
    const before = performance.now()
    const answer = await (peer ? peer.find(query) : search.search(query)).catch((error: unknown) =>
      String(error),
    )
    ms.get(name)?.push(performance.now() - before)
    if (answer === null) return
    if (typeof answer === 'string') {
      faults.push(`${shape} ${name}: ${answer} for ${JSON.stringify(query)}`)
      return
    }
    const fault = Array.isArray(answer)
      ? peerFault(answer, expected, query)
      : pageFault(answer.hits, expected)
    if (fault) faults.push(`${shape} ${name}: ${fault} for ${JSON.stringify(query)}`)
    if (!Array.isArray(answer)) trips += answer.trips
  }

  for (let at = 0; at < asked.queries; at++) {
    const query = ask()
    const expected = bruteForce(made, query).slice(0, query.limit)
    hits += expected.length
    const ways = ['ours', ...peers.filter((peer) => at % peer.every === 0).map((peer) => peer.name)]
    for (let turn = 0; turn < ways.length; turn++)
      await one(ways[(turn + at) % ways.length] ?? 'ours', query, expected)
  }

  let rows = 0
  for (let at = 0; at < asked.queries; at++) rows += (await rowsRead(() => search.search(ask()))).rows
  const result: ShapeResult = {
    shape,
    ours: timesOf(ms.get('ours') ?? []),
    peers: Object.fromEntries(peers.map((peer) => [peer.name, timesOf(ms.get(peer.name) ?? [])])),
    meanTrips: trips / asked.queries,
    meanRowsRead: rows / asked.queries,
    meanHits: hits / asked.queries,
    faults,
  }
  return result
}
