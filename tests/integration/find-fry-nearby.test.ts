import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { inTransaction } from '@/db/transaction'
import { listing, pickupWindow } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller, type BuiltSeller } from '@/seed/build-seller'
import { setClockOffset } from '@/server/clock'
import { expireListings } from '@/server/listings/expire-listings'
import { projectListings } from '@/server/search/project-listings'
import { theSearch } from '@/server/search/the-search'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { searchListings, type FoundListing, type SearchAsked } from '@/shared/contracts/search'
import { cellBounds } from '@/shared/domain/geo/location-cell'
import { parseCellId } from '@/shared/domain/geo/location-cell-id'
import { openListingDesk, type ListingDesk } from '@/tests/support/listing-desk'
import { TEST_NOW } from '@/tests/support/server'

const at = new Date(TEST_NOW)
const ids = new Map<string, string>()

let desk: ListingDesk
let cincinnati: BuiltSeller
let dayton: BuiltSeller
let covington: BuiltSeller

async function farm(name: string, zip: string, more: Partial<Parameters<typeof buildSeller>[1]> = {}) {
  const member = await buildMember(desk.db, { email: `${name}@example.org`, name })
  return buildSeller(desk.db, { member, zip, ...more })
}

async function batch(seller: BuiltSeller, name: string, body: Partial<FishBody> = {}) {
  const built = await buildBatch(desk.db, { seller, name, at, body })
  ids.set(name, built.publicId)
  await inTransaction((tx) => projectListings(tx, [built.id]))
  return built
}

beforeAll(async () => {
  desk = await openListingDesk('find_fry_nearby')
  cincinnati = await farm('cincinnati', '45202', { rating: { count: 20, sum: 96 } })
  dayton = await farm('dayton', '45402')
  covington = await farm('covington', '41011')
  const window = (day: string) => ({ windows: [{ day, from: '09:00', until: '10:00', capacity: 2 }] })
  await batch(cincinnati, 'near-bluegill', window('2027-01-30'))
  await batch(dayton, 'far-bluegill', {
    ...window('2027-01-23'),
    tiers: [{ fromCount: 25, unitCents: 60 }],
  })
  await batch(covington, 'niles', {
    taxonId: 'nile_tilapia',
    minOrder: 10,
    tiers: [{ fromCount: 10, unitCents: 90 }],
  })
  await batch(cincinnati, 'mozambique', { taxonId: 'mozambique_hybrid_tilapia' })
  await batch(covington, 'blues', { taxonId: 'blue_tilapia' })
  const few = { countOnHand: 12, minOrder: 5, orderStep: 1, tiers: [{ fromCount: 5, unitCents: 80 }] }
  await batch(dayton, 'few', { taxonId: 'channel_catfish', ...few })
})
afterAll(() => desk.close())

const get = (query: Partial<SearchAsked> & { near?: string }) =>
  desk
    .visitor()
    .get('/api/v1/listings')
    .query({ near: '45202', ...query })
const find = async (query: Partial<SearchAsked> = {}) => {
  const { body } = await get(query).expect(200)
  const page = searchListings.reply?.parse(body)
  if (!page) throw new Error('no reply')
  return page
}
const nameOf = (one: FoundListing) => [...ids].find(([, id]) => id === one.listingId)?.[0] ?? one.listingId
const names = async (query: Partial<SearchAsked> = {}) => (await find(query)).items.map(nameOf)

describe('finding fry nearby', () => {
  it('says for each batch how far, which way, when, at what price and whether it is lawful', async () => {
    const { items, place } = await find({ species: 'bluegill', count: 100 })
    expect(place).toMatchObject({ label: 'Cincinnati, OH 45202', state: 'OH' })
    expect(items.map(nameOf)).toEqual(['near-bluegill', 'far-bluegill'])
    const [near, far] = items
    expect(near).toMatchObject({
      title: 'Bluegill fingerlings',
      scientificName: 'Lepomis macrochirus',
      unitCents: 89,
      totalCents: 8900,
      distanceKm: 0,
      bearing: 'here',
      placeText: 'Cincinnati, OH',
      nextPickup: { startsAt: '2027-01-30T14:00:00.000Z', zone: 'America/New_York' },
      rating: { mean: 4.8, count: 20 },
      photo: { ground: '#8a9a7b' },
      legal: { status: 'permit_seller', buy: 'ticks' },
    })
    expect(far?.bearing).toBe('north')
    expect(far?.distanceKm).toBeGreaterThan(70)
    expect(far?.distanceKm).toBeLessThan(85)
    expect(far?.rating).toBeUndefined()
  })

  it('sorts by distance, price, day and rating', async () => {
    expect(await names({ species: 'bluegill' })).toEqual(['near-bluegill', 'far-bluegill'])
    expect(await names({ species: 'bluegill', sort: 'cheapest' })).toEqual(['far-bluegill', 'near-bluegill'])
    expect(await names({ species: 'bluegill', sort: 'soonest' })).toEqual(['far-bluegill', 'near-bluegill'])
    expect(await names({ species: 'bluegill', sort: 'best-rated' })).toEqual([
      'near-bluegill',
      'far-bluegill',
    ])
  })

  it('holds to distance, count, size, day and price', async () => {
    expect(await names({ species: 'bluegill', withinKm: 40 })).toEqual(['near-bluegill'])
    expect(await names({ species: 'channel_catfish', count: 12 })).toEqual(['few'])
    expect(await names({ species: 'channel_catfish', count: 13 })).toEqual([])
    expect(await names({ species: 'nile_tilapia', count: 9 })).toEqual([])
    expect(await names({ species: 'bluegill', from: '2027-01-23', until: '2027-01-24' })).toEqual([
      'far-bluegill',
    ])
    expect(await names({ species: 'bluegill', mostCents: 70 })).toEqual(['far-bluegill'])
    expect(await names({ species: 'bluegill', sizeFromMm: 100 })).toEqual([])
    expect(await names({ species: 'bluegill', sizeFromMm: 70, sizeToMm: 90 })).toHaveLength(2)
  })

  it('shows nobody what may not be sold to their state, and says what is unsure', async () => {
    const inOhio = await names({ species: 'mozambique_hybrid_tilapia' })
    expect(inOhio).toEqual(['mozambique'])
    expect(await names({ species: 'mozambique_hybrid_tilapia', near: '47250' })).toEqual([])
    const { items } = await find({ species: 'blue_tilapia', near: '47250' })
    expect(items).toMatchObject([{ state: 'KY', legal: { status: 'unknown', buy: 'ask-moderators' } }])
  })

  it('goes page by page, each batch once, from the same place', async () => {
    const seen: string[] = []
    for (let cursor: string | undefined, pages = 0; pages < 10; pages++) {
      const page = await find({ limit: 2, ...(cursor ? { cursor } : {}) })
      seen.push(...page.items.map(nameOf))
      cursor = page.nextCursor
      if (!cursor) break
    }
    expect(seen).toEqual(await names())
    const { nextCursor } = await find({ limit: 2 })
    const { body } = await get({
      near: '45402',
      limit: 2,
      ...(nextCursor ? { cursor: nextCursor } : {}),
    }).expect(400)
    expect(body.type).toBe('/problems/cursor-unreadable')
  })

  it.each([
    [{ near: '99999' }, 'query:near'],
    [{ near: 'Dayton' }, 'query:near'],
    [{ species: 'sea_monkey' }, 'query:species'],
    [{ from: '2027-02-01', until: '2027-01-01' }, 'query:until'],
    [{ sizeFromMm: 90, sizeToMm: 70 }, 'query:sizeToMm'],
    [{ count: 0 }, 'query:count'],
    [{ sort: 'dearest' as 'cheapest' }, 'query:sort'],
  ])('asks again about %j', async (query, pointer) => {
    const { body } = await get(query).expect(422)
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toContain(pointer)
  })

  it('counts categories and species, and marks places on the map', async () => {
    await theSearch().refresh()
    const { body } = await desk.visitor().get('/api/v1/listing-facets').query({ near: '45202' }).expect(200)
    expect(body.categories).toEqual([{ category: 'fish', count: 6, atLeast: false }])
    expect(body.species).toContainEqual({ speciesId: 'bluegill', count: 2, atLeast: false })
    const bounds = { south: 38, north: 41, west: -86, east: -83 }
    const pins = await desk
      .visitor()
      .get('/api/v1/listing-pins')
      .query({ ...bounds, zoom: 14 })
      .expect(200)
    expect(pins.body.pins.map((pin: { count: number }) => pin.count)).toEqual([2, 2, 2])
    const turned = await desk
      .visitor()
      .get('/api/v1/listing-pins')
      .query({ ...bounds, south: 42, zoom: 4 })
      .expect(422)
    expect(turned.body.errors[0].pointer).toBe('query:south')
  })

  it('lets a visitor search 120 times a minute', async () => {
    const visitor = desk.visitor()
    const ask = () =>
      visitor.get('/api/v1/listing-pins').query({ south: 1, north: 2, west: 1, east: 2, zoom: 3 })
    for (let n = 0; n < 120; n++) await ask().expect(200)
    const { body, headers } = await ask().expect(429)
    expect(body.type).toBe('/problems/too-often')
    expect(Number(headers['retry-after'])).toBeGreaterThan(0)
    await desk.visitor().get('/api/v1/listings').query({ near: '45202' }).expect(200)
  })
})

describe('the page of a batch', () => {
  const page = (name: string, near?: string) =>
    desk
      .visitor()
      .get(`/api/v1/listings/${ids.get(name) ?? ''}`)
      .query(near ? { near } : {})

  it('shows facts without a way to buy where it may not be sold, with rule, source and date', async () => {
    const { body } = await page('mozambique', '47250').expect(200)
    expect(body.may).toEqual(['report'])
    expect(body.gate).toMatchObject({
      status: 'prohibited',
      buy: 'no',
      buyerState: 'IN',
      crossesStateLine: true,
      demonstration: true,
    })
    expect(body.gate.reasons).toContainEqual(
      expect.objectContaining({
        jurisdiction: 'IN',
        status: 'prohibited',
        checkedOn: expect.stringMatching(/^\d{4}-/),
      }),
    )
  })

  it('offers to buy where it is lawful, and words every caution', async () => {
    const { body } = await page('mozambique', '45202').expect(200)
    expect(body.may).toEqual(['reserve', 'report'])
    expect(body.gate.ticks.map((tick: { id: string }) => tick.id)).toContain('never-release')
    for (const { text } of [...body.gate.cautions, ...body.gate.ticks]) expect(text).not.toMatch(/[{}]/)
  })

  it('offers nothing across a line where nobody has checked', async () => {
    const unsure = await page('blues', '47250').expect(200)
    expect(unsure.body).toMatchObject({ may: ['report'], gate: { buy: 'ask-moderators' } })
  })

  it('says no to a place that does not exist, and knows nothing of other addresses', async () => {
    const { body } = await page('niles', '00000').expect(422)
    expect(body.errors[0].pointer).toBe('query:near')
    await desk
      .visitor()
      .get(`/api/v1/listings/${'y'.repeat(22)}`)
      .expect(404)
    await desk.visitor().get('/api/v1/listings/1').expect(404)
  })

  it('holds no street, phone or true point', async () => {
    const { text, body } = await page('niles').expect(200)
    for (const secret of ['Mill Lane', '555-0142', String(covington.trueLat), String(covington.trueLng)]) {
      expect(text).not.toContain(secret)
    }
    expect([body.lat, body.lng]).toEqual([covington.cellLat, covington.cellLng])
  })
})

describe('where a farm truly stands', () => {
  const answers = async () => {
    const all = ['nearest', 'cheapest', 'soonest', 'best-rated'] as const
    const texts: string[] = []
    for (const sort of all) {
      for (const withinKm of [1, 70, 75, 160]) texts.push((await get({ sort, withinKm, near: '45402' })).text)
    }
    const bounds = { south: 38, north: 41, west: -86, east: -83 }
    for (const zoom of [4, 9, 14]) {
      texts.push(
        (
          await desk
            .visitor()
            .get('/api/v1/listing-pins')
            .query({ ...bounds, zoom })
        ).text,
      )
    }
    texts.push(
      (
        await desk
          .visitor()
          .get(`/api/v1/listings/${ids.get('near-bluegill') ?? ''}`)
          .query({ near: '45402' })
      ).text,
    )
    texts.push((await desk.visitor().get(`/api/v1/sellers/${cincinnati.publicId}`)).text)
    return texts
  }

  it('changes nothing that anybody can see, as long as it is the same cell', async () => {
    const cell = parseCellId(cincinnati.cellId)
    if (!cell) throw new Error('no cell')
    const { south, north, west, east } = cellBounds(cell)
    const before = await answers()
    const corners = [
      { trueLat: south + 1e-6, trueLng: west + 1e-6 },
      { trueLat: north - 1e-6, trueLng: east - 1e-6 },
    ]
    for (const corner of corners) {
      await desk.db.update(seller).set(corner).where(eq(seller.id, cincinnati.id))
      const rows = await desk.db.select({ id: listing.id }).from(listing)
      await inTransaction((tx) =>
        projectListings(
          tx,
          rows.map((row) => row.id),
        ),
      )
      expect(await answers()).toEqual(before)
    }
  })
})

describe('a batch that nobody can have', () => {
  it('is found no more when its windows are full or its seller cannot be paid', async () => {
    const built = await batch(dayton, 'brief', { taxonId: 'goldfish' })
    const project = () => inTransaction((tx) => projectListings(tx, [built.id]))
    expect(await names({ species: 'goldfish' })).toEqual(['brief'])
    await desk.db.update(pickupWindow).set({ taken: 6 }).where(eq(pickupWindow.listingId, built.id))
    await project()
    expect(await names({ species: 'goldfish' })).toEqual([])
    await desk.db.update(pickupWindow).set({ taken: 5 }).where(eq(pickupWindow.listingId, built.id))
    await desk.db.update(seller).set({ chargesEnabled: false }).where(eq(seller.id, dayton.id))
    await project()
    expect(await names({ species: 'goldfish' })).toEqual([])
    await desk.db.update(seller).set({ chargesEnabled: true }).where(eq(seller.id, dayton.id))
    await project()
    expect(await names({ species: 'goldfish' })).toEqual(['brief'])
  })

  it('expires when its last window has begun', async () => {
    setClockOffset(Date.parse('2027-01-24T15:00:00Z') - Date.now())
    await expireListings()
    expect(await names({ species: 'goldfish' })).toEqual([])
    const { body } = await desk
      .visitor()
      .get(`/api/v1/listings/${ids.get('brief') ?? ''}`)
      .expect(200)
    expect(body).toMatchObject({ state: 'expired', windows: [], may: ['report'] })
    expect(await names({ species: 'bluegill' })).toEqual(['near-bluegill'])
    setClockOffset(Date.parse(TEST_NOW) - Date.now())
  })

  it('lists a dear batch without a total where no order may come to that much', async () => {
    const dear = { minOrder: 1, orderStep: 1, tiers: [{ fromCount: 1, unitCents: 7_500 }] }
    await batch(dayton, 'dear', { taxonId: 'yellow_perch', countOnHand: 2000, ...dear })
    const [within] = (await find({ species: 'yellow_perch', count: 1333 })).items
    expect(within).toMatchObject({ unitCents: 7_500, totalCents: 9_997_500 })
    const [beyond] = (await find({ species: 'yellow_perch', count: 1334 })).items
    expect(beyond?.unitCents).toBe(7_500)
    expect(beyond?.totalCents).toBeUndefined()
  })
})
