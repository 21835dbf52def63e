import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { listingSearch } from '@/db/schema/listing-search'
import { listing, listingVersion, pickupWindow, stockMovement } from '@/db/schema/listings'
import { callCount } from '@/db/schema/requests'
import { seller } from '@/db/schema/sellers'
import type { FishBody } from '@/shared/contracts/fish-batch'
import {
  decide,
  draftOf,
  liveListing,
  openListingDesk,
  resubmit,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { keyed } from '@/tests/support/server'

const own = '/api/v1/sellers/mine/listings'
const nine = { day: '2027-01-22', from: '09:00', until: '10:00', capacity: 6 }
const ten = { day: '2027-01-22', from: '10:00', until: '11:00', capacity: 6 }

let desk: ListingDesk
let ann: Hatchery
let mo: TestAgent
let live: string
beforeAll(async () => {
  desk = await openListingDesk('edit_listing')
  ann = await desk.hatchery('ann@example.org')
  mo = await desk.moderator('mo@example.org')
})
beforeEach(async () => {
  await desk.db.delete(callCount)
  live = await liveListing(ann, mo)
})
afterAll(() => desk.close())

const rowOf = async (publicId: string) => {
  const [row] = await desk.db.select().from(listing).where(eq(listing.publicId, publicId))
  if (!row) throw new Error('no such listing')
  return row
}
const isFound = async (publicId: string) => {
  const { id } = await rowOf(publicId)
  return (await desk.db.$count(listingSearch, eq(listingSearch.listingId, id))) === 1
}
const edit = (change: Partial<FishBody>) => resubmit(ann, live, draftOf(ann, change))
const shown = async () => (await desk.visitor().get(`/api/v1/listings/${live}`)).body

describe('editing an approved batch', () => {
  it.each([
    ['another species', { taxonId: 'yellow_perch' }],
    ['another origin', { origin: 'bought-in', originState: 'IN' }],
    ['a named strain', { strain: 'copper-nosed' }],
  ] as [string, Partial<FishBody>][])(
    'hides it at once for %s, and shows what changed',
    async (_, change) => {
      const { body } = await edit(change)
      expect(body).toMatchObject({
        state: 'pending_review',
        liveVersion: 1,
        review: { number: 2, state: 'waiting' },
      })
      expect(await isFound(live)).toBe(false)
      await desk.visitor().get(`/api/v1/listings/${live}`).expect(404)
      const approved = await decide(mo, live)
      expect(
        approved.body.changes.filter((one: { material: boolean }) => one.material).length,
      ).toBeGreaterThan(0)
      expect(approved.body).toMatchObject({ before: { number: 1 }, review: 'approved', listingState: 'live' })
      expect(await isFound(live)).toBe(true)
      expect(await shown()).toMatchObject({ version: 2, body: change })
    },
  )

  it('stays live with a lower price, another window and a fresh reading, as a new version', async () => {
    const water = { ...draftOf(ann).water, measuredOn: '2027-01-15', temperatureC: 20 }
    const { body } = await edit({ tiers: [{ fromCount: 25, unitCents: 80 }], windows: [ten], water })
    expect(body).toMatchObject({ state: 'live', liveVersion: 2, review: { state: 'approved' } })
    expect(await isFound(live)).toBe(true)
    const page = await shown()
    expect(page.body.tiers).toEqual([{ fromCount: 25, unitCents: 80 }])
    expect(page.windows.map((one: { startsAt: string }) => one.startsAt)).toEqual([
      '2027-01-22T15:00:00.000Z',
    ])
    const { id } = await rowOf(live)
    expect(await desk.db.$count(listingVersion, eq(listingVersion.listingId, id))).toBe(2)
  })

  it('keeps the approved words on sale while new ones are read', async () => {
    const { body } = await edit({
      words: 'Call (513) 555-0142, also some zander.',
      tiers: [{ fromCount: 25, unitCents: 80 }],
    })
    expect(body).toMatchObject({ state: 'live', liveVersion: 1, review: { number: 2, state: 'waiting' } })
    expect(await shown()).toMatchObject({ version: 1, body: { words: 'Graded last week, eating well.' } })
    const { body: queue } = await mo.get('/api/v1/moderation/listings').query({ limit: 50 })
    const row = queue.items.find((one: { listingId: string }) => one.listingId === live)
    expect(row.flags).toEqual(expect.arrayContaining(['names-blocked:zander', 'contact:phone', 'edit:words']))
    const said = await decide(mo, live, { decision: 'reject', reason: 'contact-details' })
    expect(said.body).toMatchObject({ review: 'rejected', listingState: 'live' })
    expect(await shown()).toMatchObject({ version: 1 })
    expect(await isFound(live)).toBe(true)
  })

  it('taken back, stands as it was approved', async () => {
    await edit({ taxonId: 'yellow_perch' })
    expect(await isFound(live)).toBe(false)
    const { body } = await edit({})
    expect(body).toMatchObject({ state: 'live', liveVersion: 1, review: { state: 'superseded' } })
    expect(await isFound(live)).toBe(true)
  })

  it('counts the batch in the ledger alone: another figure in the form changes nothing', async () => {
    await edit({ countOnHand: 9000, tiers: [{ fromCount: 25, unitCents: 80 }] })
    expect((await rowOf(live)).free).toBe(500)
    const { body } = await ann.agent.get(`${own}/${live}`)
    expect(body.stock.free).toBe(500)
  })
})

describe('pickup windows with buyers in them', () => {
  const take = async (places: number) => {
    const { id } = await rowOf(live)
    await desk.db.update(pickupWindow).set({ taken: places }).where(eq(pickupWindow.listingId, id))
  }

  it('cannot vanish, move or shrink; the error names the window', async () => {
    await take(2)
    const gone = await edit({ windows: [ten] })
    expect([gone.status, gone.body.errors]).toEqual([
      422,
      [
        {
          detail: '2 buyers have a place in Fri, Jan 22, 9:00 AM: it cannot be moved or taken away.',
          pointer: '#/draft/windows',
        },
      ],
    ])
    const small = await edit({ windows: [{ ...nine, capacity: 1 }] })
    expect(small.body.errors[0].detail).toBe(
      '2 buyers have a place in Fri, Jan 22, 9:00 AM: it cannot hold fewer.',
    )
    const both = await edit({ windows: [{ ...nine, capacity: 2 }, ten] })
    expect(both.body.windows.map((one: { placesLeft: number }) => one.placesLeft)).toEqual([0, 6])
  })

  it('are kept even when a moderator’s yes comes after the buyers', async () => {
    await edit({ taxonId: 'yellow_perch', windows: [ten] })
    await take(1)
    const said = await decide(mo, live)
    expect(said.status).toBe(200)
    const { windows } = await shown()
    expect(windows.map((one: { placesLeft: number }) => one.placesLeft)).toEqual([5, 6])
  })
})

describe('pausing', () => {
  const selling = (wish: string) => ann.agent.post(`${own}/${live}/selling`).send({ selling: wish })

  it('takes a batch out of search and puts it back', async () => {
    const paused = await selling('paused').expect(200)
    expect(paused.body).toMatchObject({ state: 'paused', may: ['edit', 'submit', 'resume'] })
    expect(await isFound(live)).toBe(false)
    expect(await shown()).toMatchObject({ state: 'paused', may: ['report'] })
    await selling('paused').expect(200)
    const again = await selling('live').expect(200)
    expect(again.body.state).toBe('live')
    expect(await isFound(live)).toBe(true)
  })

  it('is kept through an edit', async () => {
    await selling('paused').expect(200)
    expect((await edit({ tiers: [{ fromCount: 25, unitCents: 80 }] })).body.state).toBe('paused')
    expect(await isFound(live)).toBe(false)
  })

  it('ends only when the seller can be paid', async () => {
    await selling('paused').expect(200)
    const mine = eq(seller.id, ann.seller.id)
    await desk.db.update(seller).set({ payoutsEnabled: false }).where(mine)
    const { body } = await selling('live').expect(409)
    expect(body.type).toBe('/problems/seller-unready')
    await desk.db.update(seller).set({ payoutsEnabled: true }).where(mine)
    await selling('live').expect(200)
  })

  it('is for what is live: a draft cannot be paused', async () => {
    const { body: draft } = await ann.agent.post(own).set(keyed()).send({}).expect(201)
    const { body } = await ann.agent
      .post(`${own}/${draft.listingId}/selling`)
      .send({ selling: 'paused' })
      .expect(409)
    expect(body).toMatchObject({ type: '/problems/listing-closed', facts: { state: 'draft' } })
  })

  it('follows a move into another state', async () => {
    const { farmName, about, street, phone, licences } = ann.seller
    const farm = {
      farmName,
      about,
      kind: 'hatchery',
      street,
      phone,
      city: 'Covington',
      state: 'KY',
      zip: '41011',
    }
    const answers = [...licences, { state: 'KY', answer: 'not-needed' }]
    await ann.agent
      .patch('/api/v1/sellers/mine')
      .send({ ...farm, licences: answers })
      .expect(200)
    expect((await rowOf(live)).state).toBe('paused')
    expect(await isFound(live)).toBe(false)
    const home = { ...farm, city: 'Cincinnati', state: 'OH', zip: '45202', licences: answers }
    await ann.agent.patch('/api/v1/sellers/mine').send(home).expect(200)
    await selling('live').expect(200)
  })
})

describe('correcting the count', () => {
  const adjust = (body: object, key = keyed()) =>
    ann.agent.post(`${own}/${live}/stock-movements`).set(key).send(body)

  it('books each correction with its reason, once', async () => {
    const key = keyed()
    const { body } = await adjust({ change: -120, reason: 'die-off', note: 'Pump failed.' }, key).expect(201)
    expect(body.stock.free).toBe(380)
    await adjust({ change: -120, reason: 'die-off', note: 'Pump failed.' }, key).expect(201)
    await adjust({ change: 20, reason: 'recount' }).expect(201)
    const { id, free } = await rowOf(live)
    expect(free).toBe(400)
    const moved = await desk.db.select().from(stockMovement).where(eq(stockMovement.listingId, id))
    expect(moved.map(({ reason, free: by, note }) => [reason, by, note])).toEqual([
      ['published', 500, null],
      ['die-off', -120, 'Pump failed.'],
      ['recount', 20, null],
    ])
  })

  it('never goes below none, and says how many are left to take', async () => {
    const { body } = await adjust({ change: -501, reason: 'die-off' }).expect(409)
    expect(body).toMatchObject({ type: '/problems/batch-short', facts: { left: 500 } })
    const many = await Promise.all(
      Array.from({ length: 8 }, () => adjust({ change: -100, reason: 'used-here' })),
    )
    expect(many.map((answer) => answer.status).sort()).toEqual([201, 201, 201, 201, 201, 409, 409, 409])
    expect((await rowOf(live)).free).toBe(0)
    expect(await isFound(live)).toBe(false)
    await adjust({ change: 30, reason: 'more-ready' }).expect(201)
    expect(await isFound(live)).toBe(true)
  })

  it('asks for a change, a reason we know, and a batch that was on sale', async () => {
    const { body } = await adjust({ change: 0, reason: 'magic' }).expect(422)
    expect(body.errors.map((error: { pointer: string }) => error.pointer)).toContain('#/reason')
    const { body: draft } = await ann.agent.post(own).set(keyed()).send({}).expect(201)
    const early = await ann.agent
      .post(`${own}/${draft.listingId}/stock-movements`)
      .set(keyed())
      .send({ change: 5, reason: 'recount' })
    expect([early.status, early.body.type]).toEqual([409, '/problems/listing-closed'])
  })
})
