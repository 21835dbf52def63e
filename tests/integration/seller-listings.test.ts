import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listing } from '@/db/schema/listings'
import { seller as sellerTable } from '@/db/schema/sellers'
import { inTransaction } from '@/db/transaction'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller, type BuiltSeller } from '@/seed/build-seller'
import { projectListings } from '@/server/search/project-listings'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { SellerListing } from '@/shared/contracts/search'
import { openListingDesk, type ListingDesk } from '@/tests/support/listing-desk'
import { TEST_NOW } from '@/tests/support/server'

const at = new Date(TEST_NOW)
let desk: ListingDesk
let farm: BuiltSeller
let neighbour: BuiltSeller
let empty: BuiltSeller
const made: string[] = []

async function batch(seller: BuiltSeller, name: string, body: Partial<FishBody> = {}) {
  const built = await buildBatch(desk.db, { seller, name, at, body })
  await inTransaction((tx) => projectListings(tx, [built.id]))
  return built
}
async function setState(id: number, state: string) {
  await inTransaction(async (tx) => {
    await tx.update(listing).set({ state }).where(eq(listing.id, id))
    await projectListings(tx, [id])
  })
}
const ask = (seller: Pick<BuiltSeller, 'publicId'>, query: object = {}) =>
  desk.visitor().get(`/api/v1/sellers/${seller.publicId}/listings`).query(query)
const idsOf = async (seller: BuiltSeller, query: object = {}) =>
  ((await ask(seller, query).expect(200)).body.items as SellerListing[]).map((one) => one.listingId)

beforeAll(async () => {
  desk = await openListingDesk('seller_listings')
  const build = async (name: string, zip: string) =>
    buildSeller(desk.db, { member: await buildMember(desk.db, { email: `${name}@example.org`, name }), zip })
  farm = await build('farm', '45202')
  neighbour = await build('neighbour', '45202')
  empty = await build('empty', '45402')
  for (const name of ['one', 'two', 'three', 'four', 'five']) made.push((await batch(farm, name)).publicId)
  await batch(neighbour, 'other')
})
afterAll(() => desk.close())

describe("a seller's listings", () => {
  it('are the live ones of this seller alone, the newest first, for anybody', async () => {
    expect(await idsOf(farm)).toEqual([...made].reverse())
    expect(await idsOf(empty)).toEqual([])
    await ask({ publicId: 'A'.repeat(22) }).expect(404)
    await ask({ publicId: 'short' }).expect(404)
  })

  it('come page by page, each once', async () => {
    const seen: string[] = []
    for (let cursor: string | undefined, pages = 0; pages < 9; pages++) {
      const { body } = await ask(farm, { limit: 2, ...(cursor ? { cursor } : {}) }).expect(200)
      expect(body.items.length).toBeLessThanOrEqual(2)
      seen.push(...body.items.map((one: SellerListing) => one.listingId))
      cursor = body.nextCursor
      if (!cursor) break
    }
    expect(seen).toEqual([...made].reverse())
    const { body } = await ask(farm, { limit: 2 })
    await ask(neighbour, { cursor: body.nextCursor }).expect(400)
    await ask(farm, { cursor: 'eyJ2IjoxfQ' }).expect(400)
  })

  it('read like the tags of a search from the same place', async () => {
    const here = await ask(farm, { near: '45402' }).expect(200)
    const search = await desk
      .visitor()
      .get('/api/v1/listings')
      .query({ near: '45402', limit: 50 })
      .expect(200)
    const found = new Map(search.body.items.map((one: SellerListing) => [one.listingId, one]))
    expect(here.body.items).toHaveLength(5)
    for (const tag of here.body.items) expect(tag).toEqual(found.get(tag.listingId))
  })

  it('tell neither distance nor law without a place, and only the centre of the cell', async () => {
    const { body } = await ask(farm).expect(200)
    const [row] = await desk.db.select().from(sellerTable).where(eq(sellerTable.publicId, farm.publicId))
    for (const tag of body.items) {
      expect(tag).not.toHaveProperty('distanceKm')
      expect(tag).not.toHaveProperty('bearing')
      expect(tag).not.toHaveProperty('legal')
      expect(tag).toMatchObject({ lat: row?.cellLat, lng: row?.cellLng, unitCents: expect.any(Number) })
    }
    const told = JSON.stringify(body)
    for (const secret of [row?.street, row?.phone, row?.zip]) {
      expect(secret).toBeTruthy()
      expect(told).not.toContain(secret)
    }
    await ask(farm, { near: 'nowhere' }).expect(422)
  })

  it('leave out what is paused, taken down, or may not be shown to people of the place', async () => {
    const [paused, down] = [await batch(farm, 'paused'), await batch(farm, 'down')]
    await setState(paused.id, 'paused')
    await setState(down.id, 'taken_down')
    expect(await idsOf(farm)).toEqual([...made].reverse())
    // Prohibited in Indiana by the demonstration rules, as search has it too.
    const tilapia = await batch(neighbour, 'tilapia', { taxonId: 'mozambique_hybrid_tilapia' })
    for (const [near, isShown] of [
      ['45202', true],
      ['47250', false],
    ] as const) {
      const search = await desk.visitor().get('/api/v1/listings').query({ near, withinKm: 900, limit: 50 })
      const found = search.body.items.map((one: SellerListing) => one.listingId)
      expect(found.includes(tilapia.publicId), near).toBe(isShown)
      expect((await idsOf(neighbour, { near })).includes(tilapia.publicId), near).toBe(isShown)
    }
    expect(await idsOf(neighbour)).toContain(tilapia.publicId)
  })

  it('are counted on the page of each of them', async () => {
    const [first = ''] = made
    const { body } = await desk.visitor().get(`/api/v1/listings/${first}`).expect(200)
    expect(body.alsoOnSale).toBe(4)
    const [alone] = await idsOf(neighbour)
    const other = await desk.visitor().get(`/api/v1/listings/${alone}`).expect(200)
    expect(other.body.alsoOnSale).toBe((await idsOf(neighbour)).length - 1)
  })

  it('stay apart from the seller’s own desk', async () => {
    const agent = await desk.signedIn('farm@example.org')
    const { body } = await agent.get('/api/v1/sellers/mine/listings').query({ limit: 50 }).expect(200)
    expect(body.items[0]).toHaveProperty('draft')
    await desk.visitor().get('/api/v1/sellers/mine/listings').expect(401)
  })
})
