import type { RowDataPacket } from 'mysql2/promise'

import { rawPool } from '@/db/client'
import { openListingSearch } from '@/server/search/search-listings'
import { openBenchServer } from '@/tests/bench/bench-server'
import { pagingFaults } from '@/tests/bench/check-paging'
import { planFaults } from '@/tests/bench/check-plans'
import { measureExtras } from '@/tests/bench/measure-extras'
import { measureSeason, slownessFaults } from '@/tests/bench/measure-season'
import { loadListings } from '@/tests/bench/load-listings'
import { makeListings } from '@/tests/bench/make-listings'
import type { OpenPeer, Peer, PeerGround } from '@/tests/bench/peers/peer'
import { openPlainScan } from '@/tests/bench/peers/plain-scan'
import { openSelectOne } from '@/tests/bench/peers/select-one'
import { openSpatialIndex } from '@/tests/bench/peers/spatial-index'
import { plantFault, plantSlowness } from '@/tests/bench/plant-fault'
import { readFlags, type BenchFlags } from '@/tests/bench/read-flags'
import { makeReport, printReport, saveReport, type BenchReport } from '@/tests/bench/report'
import { rowFaults } from '@/tests/bench/row-budgets'
import { runShape, type ShapeResult } from '@/tests/bench/run-shape'

const PAGING_WALKS = 60
/** Of each question of the shapes, so many pairs: a ratio of medians wants more than a median. */
const PAIRS_A_QUERY = 6

/** PostGIS joins here: one more file in peers/ that says why it is skipped where it is not installed. */
const OPENERS: Record<string, OpenPeer> = {
  'SELECT 1': openSelectOne,
  'plain scan': openPlainScan,
  'SPATIAL INDEX': openSpatialIndex,
}

async function openPeers(
  names: readonly string[],
  ground: PeerGround,
): Promise<{ peers: Peer[]; skipped: string[] }> {
  const peers: Peer[] = []
  const skipped: string[] = []
  for (const name of names) {
    const peer = await OPENERS[name]?.(ground)
    if (!peer) continue
    if ('skipped' in peer) skipped.push(peer.skipped)
    else peers.push(peer)
  }
  return { peers, skipped }
}

async function bench(flags: BenchFlags): Promise<BenchReport> {
  const say = (text: string) => console.log(`${(performance.now() / 1000).toFixed(1)} s  ${text}`)
  const made = makeListings(flags.listings, flags.seed)
  const server = await openBenchServer(flags.listings)
  // Ended from outside, the run still ends its server.
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => void server.close().finally(() => process.exit(1)))
  }
  try {
    await loadListings(made, server.ownerUrl)
    say(`${made.count} listings loaded`)
    const seldom = flags.listings > 200_000 ? 10 : flags.listings > 20_000 ? 4 : 1
    const { peers, skipped } = await openPeers(flags.peers, { made, ownerUrl: server.ownerUrl, seldom })
    if (flags.plantFault) await plantFault(server.ownerUrl)
    const search = openListingSearch()
    await search.refresh()
    const faults = await planFaults()
    const results: ShapeResult[] = []
    for (const shape of flags.shapes) {
      results.push(await runShape(shape, { made, search, peers }, flags))
      say(`shape ${shape}`)
    }
    const season = await measureSeason(made, flags.plantSlowness ? plantSlowness(search) : search, {
      pairs: flags.queries * PAIRS_A_QUERY,
      seed: flags.seed,
    })
    say('with and without the season filter')
    faults.push(...season.faults, ...slownessFaults(flags.listings, season))
    faults.push(...results.flatMap((result) => result.faults), ...rowFaults(flags.listings, results))
    faults.push(...(await pagingFaults(made, search, PAGING_WALKS)))
    for (const peer of peers) await peer.close()
    const extras = await measureExtras(made, server.ownerUrl)
    faults.push(...extras.faults)
    say('facets, map, writes')
    const [version] = await rawPool().query<RowDataPacket[]>('SELECT VERSION() AS mariadb')
    return makeReport({
      flags,
      mariadb: String(version[0]?.mariadb),
      results,
      season,
      extras: extras.times,
      skipped,
      faults,
    })
  } finally {
    await server.close()
  }
}

const report = await bench(readFlags(process.argv.slice(2)))
printReport(report)
console.log(`\n${saveReport(report)}`)
for (const reason of report.skipped) console.log(`skipped: ${reason}`)
for (const fault of report.faults.slice(0, 20)) console.log(`FAULT ${fault}`)
console.log(report.faults.length === 0 ? 'every answer is right' : `${report.faults.length} faults`)
process.exitCode = report.faults.length === 0 ? 0 : 1
