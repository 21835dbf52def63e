import { writeFileSync } from 'node:fs'
import path from 'node:path'

import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { seller as sellerTable } from '@/db/schema/sellers'
import { inTransaction } from '@/db/transaction'
import { buildBatch } from '@/seed/build-batch'
import type { BuiltSeller } from '@/seed/build-seller'
import { setClockOffset } from '@/server/clock'
import { listListingIdsOf } from '@/server/listings/listing-store'
import { projectListings } from '@/server/search/project-listings'
import { updateSeller } from '@/server/sellers/seller-store'
import { cellBounds, type CellSize } from '@/shared/domain/geo/location-cell'
import { parseCellId } from '@/shared/domain/geo/location-cell-id'
import { openListingDesk, type ListingDesk } from '@/tests/support/listing-desk'
import { checkSeed, isSlice, reportFigure } from '@/tests/support/report-figure'
import { TEST_NOW } from '@/tests/support/server'

/** Where a planted fault uses the true point; empty while the real thing is measured. */
const planted = vi.hoisted(() => ({ leak: '' }))

vi.mock('@/server/search/projection-store', async (original) => {
  const real = await original<typeof import('@/server/search/projection-store')>()
  return {
    ...real,
    readSellable: async (...asked: Parameters<typeof real.readSellable>) => {
      const rows = await real.readSellable(...asked)
      if (planted.leak !== 'search') return rows
      const farms = await asked[0].select().from(sellerTable)
      return rows.map((row) => {
        const farm = farms.find((one) => one.id === row.sellerId)
        return { ...row, cellLat: farm?.trueLat ?? 0, cellLng: farm?.trueLng ?? 0 }
      })
    },
  }
})
vi.mock('@/server/listings/present-listing', async (original) => {
  const real = await original<typeof import('@/server/listings/present-listing')>()
  return {
    ...real,
    presentListing: (page: Parameters<typeof real.presentListing>[0]) => {
      const { seller } = page
      const shown = real.presentListing(page)
      if (planted.leak !== 'rounded-distance' || !page.place) return shown
      // As an unwary product would: whole kilometres, but from the true point.
      const north = (seller.trueLat - page.place.centre.lat) * 111
      const east = (seller.trueLng - page.place.centre.lng) * 86
      return { ...shown, distanceKm: Math.round(Math.hypot(north, east)) }
    },
  }
})
vi.mock('@/server/sellers/present-seller-card', async (original) => {
  const real = await original<typeof import('@/server/sellers/present-seller-card')>()
  return {
    ...real,
    presentSellerCard: (farm: Parameters<typeof real.presentSellerCard>[0]) => {
      const card = real.presentSellerCard(farm)
      return planted.leak === 'street'
        ? { ...card, placeText: `${card.placeText}, ${(farm as BuiltSeller).street}` }
        : card
    },
  }
})

const LEAKS = ['search', 'rounded-distance', 'street']
const FARMS: { zip: string; cellSize: CellSize }[] = [
  { zip: '45202', cellSize: 50 },
  { zip: '40202', cellSize: 50 },
  { zip: '46201', cellSize: 100 },
  { zip: '43215', cellSize: 50 },
  { zip: '45701', cellSize: 200 },
]
const PAIRS_A_FARM = isSlice ? 2 : 40
const CONTROL_PAIRS = isSlice ? 1 : 4

let desk: ListingDesk
const farms: { seller: BuiltSeller; listingIds: string[] }[] = []

/** Mulberry32: small, seeded, good enough to draw points. */
function drawer(seed: number): () => number {
  let state = seed
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
}

interface Secret {
  trueLat: number
  trueLng: number
  street: string
  phone: string
}

function secretIn(seller: BuiltSeller, draw: () => number): Secret {
  const cell = parseCellId(seller.cellId)
  if (!cell) throw new Error('the farm has no cell')
  const { south, north, west, east } = cellBounds(cell)
  return {
    trueLat: south + draw() * (north - south) * 0.999,
    trueLng: west + draw() * (east - west) * 0.999,
    street: `${Math.floor(draw() * 9000)} Mill Lane`,
    phone: `(513) 555-${1000 + Math.floor(draw() * 8999)}`,
  }
}

/** As the command that changes a farm does: the row and its listings in search, in one transaction. */
async function move(seller: BuiltSeller, secret: Secret): Promise<void> {
  await inTransaction(async (tx) => {
    await updateSeller(seller.id, secret, tx)
    await projectListings(tx, await listListingIdsOf(seller.id, tx))
  })
}

/** Every public address that could speak of a farm: all sorts, radii round the edges of its distance, the map, pages. */
function publicPaths(): string[] {
  const paths: string[] = ['/sitemap.xml', '/api/v1/places?q=Cinc']
  for (const near of ['45202', '40204', '45840'])
    for (const sort of ['nearest', 'cheapest', 'soonest', 'best-rated'])
      for (const withinKm of [5, 60, 161, 500])
        paths.push(`/api/v1/listings?near=${near}&sort=${sort}&withinKm=${withinKm}&limit=50`)
  for (const withinKm of [3, 25, 135, 136, 137, 300])
    paths.push(`/api/v1/listing-facets?near=45202&withinKm=${withinKm}`)
  for (const zoom of [3, 6, 9, 12, 16])
    paths.push(`/api/v1/listing-pins?south=37&north=42&west=-88&east=-80&zoom=${zoom}`)
  for (const { seller, listingIds } of farms) {
    const farm = `/api/v1/sellers/${seller.publicId}`
    paths.push(farm, `${farm}/ratings`, `${farm}/listings?limit=2`, `${farm}/listings?near=45202&limit=1`)
    for (const id of listingIds)
      paths.push(
        `/api/v1/listings/${id}`,
        `/api/v1/listings/${id}?near=45202`,
        `/api/v1/listings/${id}?near=43215`,
        `/listings/${id}`,
        `/api/v1/listings/${id}/way-home?near=45202&day=2027-01-20`,
      )
  }
  return paths
}

/** What differs with every request by itself, and says nothing of the answer. */
const OF_THE_REQUEST = /^(x-request-id|date|ratelimit.*|connection|keep-alive)$/

type Dump = Map<string, string>

async function dump(paths: string[]): Promise<Dump> {
  setClockOffset(Date.parse(TEST_NOW) - Date.now())
  const answers: Dump = new Map()
  const ask = async (address: string) => {
    const reply = await desk.visitor().get(address)
    const headers = Object.entries(reply.headers).filter(([name]) => !OF_THE_REQUEST.test(name))
    answers.set(address, `${reply.status} ${JSON.stringify(headers)} ${reply.text}`)
    const next: unknown = reply.body?.nextCursor
    if (typeof next === 'string') await ask(`${address.replace(/&cursor=.*/, '')}&cursor=${next}`)
  }
  const left = [...paths]
  const worker = async () => {
    for (let address = left.pop(); address; address = left.pop()) await ask(address)
  }
  await Promise.all(Array.from({ length: 6 }, worker))
  return answers
}

const differing = (one: Dump, two: Dump): string[] =>
  [...new Set([...one.keys(), ...two.keys()])].filter((address) => one.get(address) !== two.get(address))

/** Moves a farm from one drawn point to the next and tells which public answers changed. */
async function tellTales(moving: typeof farms, pairsAFarm: number, draw: () => number) {
  const paths = publicPaths()
  const tales: string[] = []
  let pairs = 0
  let compared = 0
  let told = 0
  for (const { seller } of moving) {
    await move(seller, secretIn(seller, draw))
    let before = await dump(paths)
    for (let pair = 0; pair < pairsAFarm; pair++) {
      await move(seller, secretIn(seller, draw))
      const after = await dump(paths)
      const changed = differing(before, after)
      if (changed.length > 0) told += 1
      tales.push(...changed.slice(0, 3))
      compared += after.size
      pairs += 1
      before = after
    }
  }
  return { pairs, compared, told, tales }
}

beforeAll(async () => {
  desk = await openListingDesk('check_privacy')
  writeFileSync(
    path.join(desk.uploadDir, 'index.html'),
    '<html><head><title>T</title></head><body></body></html>',
  )
  for (const [at, wish] of FARMS.entries()) {
    const { seller } = await desk.hatchery(`farm${at}@example.org`, wish)
    const listingIds: string[] = []
    for (const name of ['first', 'second']) {
      const batch = await buildBatch(desk.db, { seller, name, at: new Date(TEST_NOW), free: 400 + at })
      listingIds.push(batch.publicId)
      await inTransaction((tx) => projectListings(tx, [batch.id]))
    }
    farms.push({ seller, listingIds })
  }
})
afterAll(() => desk.close())

describe('where a farm really is', () => {
  it('is asked for in answers that are about it, and that repeat themselves', async () => {
    const paths = publicPaths()
    const one = await dump(paths)
    const good = [...one.values()].filter((answer) => answer.startsWith('200'))
    expect(good.length).toBe(one.size)
    const found = [...one.values()].filter((answer) =>
      farms.some(({ listingIds }) => answer.includes(listingIds[0] ?? '-')),
    )
    expect(found.length).toBeGreaterThan(50)
    expect(differing(one, await dump(paths))).toEqual([])
  })

  it('changes no public answer by a byte', async () => {
    const { pairs, compared, told, tales } = await tellTales(farms, PAIRS_A_FARM, drawer(checkSeed))
    const seed = checkSeed
    const bar = PAIRS_A_FARM * FARMS.length
    await reportFigure({ id: 'SEC-8-pairs', figure: pairs, bar, pass: pairs >= bar, seed })
    await reportFigure({
      id: 'SEC-8-answers',
      figure: compared,
      bar: 'for the record',
      pass: compared > 0,
      seed,
    })
    await reportFigure({ id: 'SEC-8-pairs-told-apart', figure: told, bar: 0, pass: told === 0, seed })
    expect([...new Set(tales)]).toEqual([])
  })

  it('is told apart as soon as anything is computed from it', async () => {
    const missed: string[] = []
    for (const leak of LEAKS) {
      planted.leak = leak
      const { told, pairs } = await tellTales(farms.slice(0, 2), CONTROL_PAIRS, drawer(checkSeed + 1))
      planted.leak = ''
      if (told < pairs / 2) missed.push(`${leak}: ${told} of ${pairs}`)
    }
    const figure = LEAKS.length - missed.length
    await reportFigure({
      id: 'SEC-8-control',
      figure,
      bar: LEAKS.length,
      pass: missed.length === 0,
      seed: checkSeed,
    })
    expect(missed).toEqual([])
  })

  it('is still in the farm’s own record', async () => {
    const [row] = await desk.db
      .select()
      .from(sellerTable)
      .where(eq(sellerTable.id, farms[0]?.seller.id ?? 0))
    expect(row?.trueLat).not.toBe(row?.cellLat)
  })
})
