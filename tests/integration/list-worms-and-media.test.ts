import { and, eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listing, listingVersion } from '@/db/schema/listings'
import { clayOf, dayAt, lettuceOf, wigglersOf } from '@/tests/support/greens'
import {
  begin,
  decide,
  liveListing,
  openListingDesk,
  submit,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { TEST_NOW } from '@/tests/support/server'

const NOW = new Date(TEST_NOW)

let desk: ListingDesk
let wilma: Hatchery
let mo: TestAgent
beforeAll(async () => {
  desk = await openListingDesk('list_worms_media')
  wilma = await desk.hatchery('wilma@example.org')
  mo = await desk.moderator('mo@example.org')
})
afterAll(() => desk.close())

const sent = async (draft: object) => submit(wilma, await begin(wilma, draft))
const worms = (change: object = {}) => ({ ...wigglersOf(NOW, wilma.photoId), ...change })
const clay = (change: object = {}) => ({ ...clayOf(NOW, wilma.photoId), ...change })
const flagsOf = async (publicId: string) => {
  const [row] = await desk.db
    .select({ flags: listingVersion.flags })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(and(eq(listing.publicId, publicId), eq(listingVersion.number, 1)))
  return row?.flags ?? []
}
const find = async (query: object) =>
  (
    await desk
      .visitor()
      .get('/api/v1/listings')
      .query({ near: '45202', withinKm: 400, ...query })
      .expect(200)
  ).body.items as Record<string, unknown>[]

describe('worms', () => {
  it('are looked at like fish, and then found by their category with price for a hundred', async () => {
    const waiting = await sent(worms())
    expect(waiting.status, JSON.stringify(waiting.body)).toBe(200)
    expect(waiting.body).toMatchObject({ state: 'pending_review', title: 'Red wiggler' })
    await (
      await decide(mo, waiting.body.listingId)
    ).ok
    const [tag, ...others] = await find({ category: 'worms' })
    expect(others).toEqual([])
    expect(tag).toMatchObject({
      ...{ category: 'worms', soldBy: '250 worms', unitCents: 1600, free: 20 },
      scientificName: 'Eisenia fetida',
      comparable: { us: '$6.40/100' },
    })
    const page = await desk
      .visitor()
      .get(`/api/v1/listings/${waiting.body.listingId}`)
      .query({ near: '45202' })
    expect(page.body.gate.cautions.map(({ id }: { id: string }) => id)).toContain('G-1')
  })

  it.each([
    ['the animal', { taxonId: 'jumping_worms' }, '#/draft/taxonId'],
    ['its strain', { strain: 'Alabama jumper' }, '#/draft/strain'],
    ['an unchecked lot', { lotChecked: false }, '#/draft/lotChecked'],
    ['a state we do not serve', { statesServed: ['AK'] }, '#/draft/statesServed/0'],
    ['a bag of no size', { saleUnit: { kind: 'head' } }, '#/draft/saleUnit'],
  ])('are refused for %s', async (_name, change, pointer) => {
    const { status, body } = await sent(worms(change))
    const pointers = body.errors?.map((error: { pointer: string }) => error.pointer) ?? []
    expect([status, pointers.some((one: string) => one.startsWith(pointer))], JSON.stringify(body)).toEqual([
      422,
      true,
    ])
  })

  it('are read by a person when the words name a jumping worm or they come from abroad', async () => {
    const named = await sent(worms({ words: 'We checked: no Alabama jumpers in here.' }))
    expect(named.status).toBe(200)
    expect(await flagsOf(named.body.listingId)).toEqual(
      expect.arrayContaining([expect.stringMatching(/^names-blocked:/)]),
    )
    const abroad = await sent(worms({ raisedInUs: false, origin: 'hatched-here' }))
    expect(await flagsOf(abroad.body.listingId)).toContain('not-raised-in-us')
    expect(abroad.body.review.why[0]).toMatch(/federal import permit/)
  })
})

describe('media', () => {
  it('are on sale at once, with their price by volume', async () => {
    const answer = await sent(clay())
    expect(answer.body).toMatchObject({ state: 'live', title: 'Expanded clay' })
    const [tag] = await find({ category: 'media' })
    expect(tag).toMatchObject({
      material: 'expanded_clay',
      comparable: { us: '$16.99/cu ft', metric: '$6.00/10 L' },
    })
    expect(await flagsOf(answer.body.listingId)).not.toContain('weight-differs')
  })

  it('keep a note about a weight that hardly fits, and are on sale all the same', async () => {
    const answer = await sent(clay({ saleUnit: { kind: 'volume', litres: 50, weightKg: 48 } }))
    expect(answer.body.state).toBe('live')
    expect(await flagsOf(answer.body.listingId)).toContain('weight-differs')
  })

  it('wait for a moderator when their words name a jumping worm', async () => {
    const answer = await sent(
      clay({ ...clayWithout(), material: 'compost', heatTreated: 'no', words: 'May hold Alabama jumpers.' }),
    )
    expect(answer.status, JSON.stringify(answer.body)).toBe(200)
    expect(answer.body).toMatchObject({ state: 'pending_review' })
    expect(answer.body.review.why[0]).toMatch(/do not list/)
  })

  it('say what is missing', async () => {
    const { rinsed: _rinsed, ...unrinsed } = clay()
    const { status, body } = await sent(unrinsed)
    expect([status, body.errors[0].pointer]).toEqual([422, '#/draft/rinsed'])
    const bag = await sent(clay({ saleUnit: { kind: 'bag' } }))
    expect(bag.body.errors[0].pointer).toMatch(/^#\/draft\/saleUnit/)
  })

  const clayWithout = () => ({
    grainLoMm: undefined,
    grainHiMm: undefined,
    rinsed: undefined,
    vinegarTest: undefined,
  })
})

describe('four categories side by side', () => {
  it('are each found under their own, all without one, and counted apart', async () => {
    await liveListing(wilma, mo)
    await sent({ ...lettuceOf(NOW, wilma.photoId) })
    for (const category of ['fish', 'worms', 'media', 'produce']) {
      const found = await find({ category })
      expect(found.length).toBeGreaterThan(0)
      expect(new Set(found.map((tag) => tag.category))).toEqual(new Set([category]))
    }
    const all = await find({ limit: 50 })
    expect(new Set(all.map((tag) => tag.category)).size).toBe(4)
    const { body } = await desk
      .visitor()
      .get('/api/v1/listing-facets')
      .query({ near: '45202', withinKm: 400 })
    expect(body.categories.map(({ category }: { category: string }) => category).toSorted()).toEqual([
      'fish',
      'media',
      'produce',
      'worms',
    ])
    expect(await find({ category: 'worms', sizeFromMm: 40 })).toEqual([])
    expect((await find({ from: dayAt(NOW, 1), until: dayAt(NOW, 1), category: 'produce' })).length).toBe(1)
  })
})
