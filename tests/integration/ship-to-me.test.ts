import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { inTransaction } from '@/db/transaction'
import { listingSearch } from '@/db/schema/listing-search'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller } from '@/seed/build-seller'
import { setClockOffset } from '@/server/clock'
import { projectListings } from '@/server/search/project-listings'
import { theSearch } from '@/server/search/the-search'
import type { BatchShipping } from '@/shared/contracts/fish-batch'
import { countFacets, searchListings, type SearchAsked } from '@/shared/contracts/search'
import { readListing } from '@/shared/contracts/listings'
import { chances } from '@/tests/bench/chances'
import { begin, draftOf, openListingDesk, submit, type ListingDesk } from '@/tests/support/listing-desk'
import { disagreements, readStrip, type Told } from '@/tests/support/season-tellers'
import { TEST_NOW } from '@/tests/support/server'

const TRIPLES = 300
const DAY_MS = 86_400_000
const at = new Date(TEST_NOW)
const zips = { OH: ['45202', '45402', '44101'], KY: ['40202', '41011'], IN: ['46204'] }
const allZips = Object.values(zips).flat()
const taxonIds = ['bluegill', 'nile_tilapia', 'channel_catfish', 'rainbow_trout', 'yellow_perch']
const thick: BatchShipping = {
  packing: 'foam-38-overnight',
  boxCents: 1200,
  freightCents: 4800,
  carrier: 'Overnight air',
  carrierAccepts: true,
  holdsAtCounter: true,
  mostInBox: 100,
  days: ['mon'],
}

let desk: ListingDesk
/** Public ids of the batches that can be shipped, and the states each goes to. */
const shipped = new Map<string, readonly string[]>()

beforeAll(async () => {
  desk = await openListingDesk('ship_to_me')
  const chance = chances(5)
  for (const [farm, zip] of allZips.entries()) {
    const member = await buildMember(desk.db, { email: `farm${farm}@example.org` })
    const seller = await buildSeller(desk.db, { member, zip })
    for (const [kind, taxonId] of taxonIds.entries()) {
      const statesServed = chance.yes(0.5) ? ['OH', 'KY', 'IN'] : ['OH']
      const packing = chance.yes(0.7) ? thick.packing : 'foam-25-overnight'
      const shipping = kind === farm % taxonIds.length ? {} : { shipping: { ...thick, packing } }
      const body = { taxonId, statesServed, ...shipping }
      const built = await buildBatch(desk.db, { seller, name: `${farm} ${taxonId}`, at, body })
      await inTransaction((tx) => projectListings(tx, [built.id]))
      if (shipping.shipping) shipped.set(built.publicId, statesServed)
    }
  }
  await theSearch().refresh()
})
afterAll(() => desk.close())

const wide: Omit<SearchAsked, 'near'> = { withinKm: 1000, limit: 50 }

const daysLater = (days: number) => setClockOffset(at.getTime() + days * DAY_MS - Date.now())

async function find(asked: SearchAsked) {
  const { body } = await desk
    .visitor()
    .get('/api/v1/listings')
    .query({ ...wide, ...asked })
    .expect(200)
  const page = searchListings.reply?.parse(body)
  if (!page) throw new Error('no reply')
  return page
}
async function listingOf(listingId: string, near: string) {
  const { body } = await desk.visitor().get(`/api/v1/listings/${listingId}`).query({ near }).expect(200)
  const shown = readListing.reply?.parse(body)
  if (!shown) throw new Error('no reply')
  return shown
}
const facetsOf = async (asked: SearchAsked) => {
  const query = { withinKm: 1000, ...asked }
  const { body } = await desk.visitor().get('/api/v1/listing-facets').query(query).expect(200)
  return countFacets.reply?.parse(body)
}
const idsOf = ({ items }: Awaited<ReturnType<typeof find>>) => items.map(({ listingId }) => listingId)

describe('shipped to me in a week', () => {
  it(`filter, tag and listing page agree on ${TRIPLES} listings, places and weeks through the API`, async () => {
    const chance = chances(9)
    const told: Told[] = []
    while (told.length < TRIPLES) {
      const near = chance.pick(allZips)
      const listingId = chance.pick([...shipped.keys()])
      // The clock is put into the week: only this week's tag shows without the filter.
      daysLater(chance.between(0, 370))
      const [filtered, all] = [await find({ near, shipTo: near }), await find({ near })]
      const year = (await listingOf(listingId, near)).shipped
      const tag = all.items.find((one) => one.listingId === listingId)?.shipped
      if (!year || !tag) throw new Error(`${listingId} is not shipped`)
      const name = `${listingId} to ${near} in week ${year.week}`
      const isFound = idsOf(filtered).includes(listingId)
      told.push({ name, isFound, isServed: tag.isServed, badge: tag, strip: readStrip(year) })
      expect(year, name).toMatchObject(tag)
      daysLater(0)
      expect(idsOf(await find({ near, shipWeek: year.week })), name).toEqual(idsOf(filtered))
    }
    expect(disagreements(told)).toEqual([])
    expect(told.filter(({ isFound }) => isFound).length).toBeGreaterThan(20)
    expect(told.filter(({ isServed }) => !isServed).length).toBeGreaterThan(20)
  })

  it('would be caught: a row that search keeps with another lane', async () => {
    const asked = { near: '45202', shipWeek: 20 }
    const [listingId] = idsOf(await find(asked))
    if (!listingId) throw new Error('nothing is shipped in May')
    const before = await desk.db.select().from(listingSearch)
    await desk.db.update(listingSearch).set({ lane: 1 })
    const found = idsOf(await find(asked))
    const { shipped: year } = await listingOf(listingId, '45202')
    const badge = { verdict: year?.weeks[19] ?? 'none' }
    expect(
      disagreements([
        { name: 'planted', isFound: found.includes(listingId), isServed: true, badge, strip: badge },
      ]),
    ).toHaveLength(1)
    for (const { listingId: id, lane } of before) {
      await desk.db.update(listingSearch).set({ lane }).where(eq(listingSearch.listingId, id))
    }
  })

  it('pages, counts and combines like every other filter', async () => {
    const asked = { near: '45202', shipWeek: 20 }
    const all = await find(asked)
    expect(all.items.length).toBeGreaterThan(3)
    expect(all.items.every(({ shipped: way }) => way?.verdict.startsWith('safe') && way.isServed)).toBe(true)
    const walked: string[] = []
    let page = await find({ ...asked, limit: 2 })
    walked.push(...idsOf(page))
    while (page.nextCursor) {
      page = await find({ ...asked, limit: 2, cursor: page.nextCursor })
      walked.push(...idsOf(page))
    }
    expect(walked).toEqual(idsOf(all))
    const counted = await facetsOf(asked)
    expect(counted?.categories).toEqual([{ category: 'fish', count: all.items.length, atLeast: false }])
    const bluegill = await find({ ...asked, species: 'bluegill', pickup: 'yes', sort: 'cheapest' })
    expect(bluegill.items.length).toBeGreaterThan(0)
    expect(bluegill.items.every(({ speciesId }) => speciesId === 'bluegill')).toBe(true)
  })

  it('takes another place to ship to, and this week where none is said', async () => {
    const near = '45202'
    const there = await find({ near, shipTo: '46204', shipWeek: 20 })
    expect(idsOf(there).length).toBeGreaterThan(0)
    expect(idsOf(there).every((id) => shipped.get(id)?.includes('IN'))).toBe(true)
    expect(idsOf(await find({ near, shipTo: near }))).toEqual(idsOf(await find({ near, shipWeek: 2 })))
    const { body } = await desk.visitor().get('/api/v1/listings').query({ near, shipTo: '00000' }).expect(422)
    expect(body.errors[0].pointer).toBe('query:shipTo')
    await desk.visitor().get('/api/v1/listings').query({ near, shipWeek: 54 }).expect(422)
  })

  it('says in winter when the next safe week begins, and which Monday this is', async () => {
    const page = await find({ near: '45202', species: 'bluegill' })
    const cold = page.items.find(({ shipped: way }) => way?.verdict === 'too-cold' && way.nextMonday)
    expect(page.thisMonday).toBe('2027-01-11')
    expect(cold?.shipped).toMatchObject({ isThisWeek: true, monday: '2027-01-11' })
    expect(cold?.shipped?.nextMonday).toMatch(/^2027-0[3-6]-\d\d$/)
  })
})

describe('offering a batch for shipping', () => {
  it('is refused for days and animals that cannot be judged, at their fields', async () => {
    const ann = await desk.hatchery('ann@example.org')
    const refused = async (change: object) => {
      const { status, body } = await submit(ann, await begin(ann, draftOf(ann, change)))
      return [status, body.errors?.map(({ pointer }: { pointer: string }) => pointer)]
    }
    const twoDays = { ...thick, packing: 'foam-38-two-days', days: ['tue', 'wed'] }
    expect(await refused({ shipping: twoDays })).toEqual([422, ['#/draft/shipping/days']])
    expect(await refused({ shipping: { ...thick, days: [] } })).toEqual([422, ['#/draft/shipping/days']])
    expect(await refused({ shipping: { ...thick, insured: true } })).toEqual([422, ['#/draft/shipping']])
    await submit(ann, await begin(ann, draftOf(ann, { shipping: thick }))).expect(200)
  })
})
