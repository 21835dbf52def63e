import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { listingSearch } from '@/db/schema/listing-search'
import { listing, pickupWindow } from '@/db/schema/listings'
import { auditLog, listingReport } from '@/db/schema/moderation'
import { order } from '@/db/schema/orders'
import { outbox } from '@/db/schema/outbox'
import { callCount } from '@/db/schema/requests'
import { buildMember } from '@/seed/build-member'
import type { Letter } from '@/server/mail/letter'
import type { ReportedListing } from '@/shared/contracts/listing-reports'
import {
  begin,
  decide,
  draftOf,
  liveListing,
  openListingDesk,
  resubmit,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { keyed } from '@/tests/support/server'

const desks = '/api/v1/moderation/reported-listings'
const notAsTold = { reason: 'not-as-told', words: 'These are green sunfish, not bluegill.' }

let desk: ListingDesk
let ann: Hatchery
let mo: TestAgent
let bea: TestAgent
let cal: TestAgent
beforeAll(async () => {
  desk = await openListingDesk('report_listing')
  ann = await desk.hatchery('ann@example.org')
  mo = await desk.moderator('mo@example.org')
  await buildMember(desk.db, { email: 'bea@example.org', name: 'Bea Kowalski' })
  await buildMember(desk.db, { email: 'cal@example.org', name: 'Cal Voss' })
  bea = await desk.signedIn('bea@example.org')
  cal = await desk.signedIn('cal@example.org')
})
beforeEach(async () => {
  await desk.db.delete(callCount)
})
afterAll(() => desk.close())

const live = () => liveListing(ann, mo)
const report = (agent: TestAgent, listingId: string, body: object = notAsTold) =>
  agent.post(`/api/v1/listings/${listingId}/reports`).set(keyed()).send(body)
const reported = async (agent = mo): Promise<ReportedListing[]> =>
  (await agent.get(desks).query({ limit: 50 }).expect(200)).body.items
const rowOf = async (listingId: string, agent = mo) =>
  (await reported(agent)).find((row) => row.listingId === listingId)
const idOf = async (listingId: string) => {
  const [row] = await desk.db.select().from(listing).where(eq(listing.publicId, listingId))
  return row?.id ?? 0
}
const reportsOf = async (listingId: string) =>
  desk.db
    .select()
    .from(listingReport)
    .where(eq(listingReport.listingId, await idOf(listingId)))
const takeDown = (agent: TestAgent, listingId: string, body: object) =>
  agent.post(`${desks}/${listingId}/take-down`).set(keyed()).send(body)
const dismiss = async (agent: TestAgent, listingId: string, more: object = {}) => {
  const seenUntil = (await rowOf(listingId))?.newestAt ?? new Date().toISOString()
  return agent
    .post(`${desks}/${listingId}/dismissal`)
    .set(keyed())
    .send({ seenUntil, ...more })
}

describe('reporting a listing', () => {
  it('is for members: a visitor signs in first', async () => {
    const listingId = await live()
    await report(desk.visitor(), listingId).expect(401)
    const { body } = await desk.visitor().get(`/api/v1/listings/${listingId}`).expect(200)
    expect(body.may).toContain('report')
  })

  it('wants a reason of the list, and words with "something else"', async () => {
    const listingId = await live()
    expect((await report(bea, listingId, { reason: 'ugly' }).expect(422)).body.errors[0].pointer).toBe(
      '#/reason',
    )
    for (const words of [undefined, '', '   ']) {
      const { body } = await report(bea, listingId, { reason: 'other', words }).expect(422)
      expect(body.errors[0].pointer).toBe('#/words')
    }
    await report(bea, listingId, { reason: 'other', words: 'x'.repeat(601) }).expect(422)
    expect(await reportsOf(listingId)).toEqual([])
    await report(bea, listingId, { reason: 'other', words: 'x'.repeat(600) }).expect(201)
  })

  it('keeps one open report of a member, however often and at once they send it', async () => {
    const listingId = await live()
    const answers = await Promise.all(
      Array.from({ length: 4 }, (_, at) => report(bea, listingId, { reason: 'species', words: `try ${at}` })),
    )
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201, 201])
    const again = await report(bea, listingId, { reason: 'bad-state' }).expect(201)
    for (const answer of answers) expect(answer.body).toEqual(again.body)
    expect(again.body.reason).toBe('species')
    expect(await reportsOf(listingId)).toHaveLength(1)
    await report(cal, listingId).expect(201)
    expect((await rowOf(listingId))?.people).toBe(2)
  })

  it('is five a day for one member', async () => {
    const all = await Promise.all(Array.from({ length: 6 }, live))
    for (const listingId of all.slice(0, 5)) await report(cal, listingId).expect(201)
    const { body } = await report(cal, all[5] ?? '').expect(429)
    expect(body.facts.retryAfterS).toBeGreaterThan(0)
    // What is reported already costs nothing.
    await report(cal, all[0] ?? '').expect(201)
    await report(bea, all[5] ?? '').expect(201)
  })

  it('is not for one’s own listing, nor for what cannot be seen', async () => {
    const listingId = await live()
    const { body } = await report(ann.agent, listingId).expect(409)
    expect(body).toMatchObject({ type: '/problems/own-batch' })
    expect(body.detail).toContain('your own listing')
    expect((await ann.agent.get(`/api/v1/listings/${listingId}`)).body.may).not.toContain('report')
    const draft = await begin(ann, draftOf(ann))
    await report(bea, draft.listingId).expect(404)
  })
})

describe('the desk', () => {
  it('is for moderators and admins with a second factor only', async () => {
    const listingId = await live()
    await buildMember(desk.db, { email: 'bare@example.org', role: 'member,moderator' })
    const bare = await desk.signedIn('bare@example.org')
    await desk.visitor().get(desks).expect(401)
    for (const agent of [bea, bare]) {
      await agent.get(desks).expect(403)
      await takeDown(agent, listingId, { reason: 'unlawful' }).expect(403)
      expect((await dismiss(agent, listingId)).status).toBe(403)
    }
  })

  it('shows one row a listing: how many people, the newest three in their words, no names', async () => {
    const listingId = await live()
    for (let at = 0; at < 4; at++) {
      const email = `many${at}@example.org`
      await buildMember(desk.db, { email, name: `Many ${at}` })
      await report(await desk.signedIn(email), listingId, {
        reason: 'bad-state',
        words: `word ${at}`,
      }).expect(201)
    }
    const row = await rowOf(listingId)
    expect(row).toMatchObject({
      people: 4,
      title: 'Bluegill fingerlings',
      farmName: "ann's hatchery",
      openOrders: 0,
    })
    expect(row?.newest.map(({ words }) => words)).toEqual(['word 3', 'word 2', 'word 1'])
    expect(JSON.stringify(row)).not.toMatch(/many\d|Many \d/)
  })

  it('comes page by page, the one that waits longest first', async () => {
    const all = (await reported()).map((row) => row.listingId)
    expect(all.length).toBeGreaterThan(3)
    const seen: string[] = []
    for (let cursor: string | undefined, pages = 0; pages < 30; pages++) {
      const { body } = await mo
        .get(desks)
        .query({ limit: 2, ...(cursor ? { cursor } : {}) })
        .expect(200)
      seen.push(...body.items.map((row: ReportedListing) => row.listingId))
      cursor = body.nextCursor
      if (!cursor) break
    }
    expect(seen).toEqual(all)
    await mo.get(desks).query({ cursor: 'eyJ2IjoxfQ' }).expect(400)
  })

  it('never gives moderators their own listing, nor a competitor’s', async () => {
    const sal = await desk.hatchery('sal@example.org')
    const mine = await liveListing(sal, mo)
    const rival = await live()
    for (const listingId of [mine, rival]) await report(bea, listingId).expect(201)
    await desk.db.execute("update user set role = 'member,seller,moderator' where email = 'sal@example.org'")
    const judge = await desk.signedIn('sal@example.org', { secondFactor: true })
    expect(await reported(judge)).toEqual([])
    for (const listingId of [mine, rival]) {
      const { body } = await takeDown(judge, listingId, { reason: 'unlawful' }).expect(403)
      expect(body.type).toBe('/problems/not-allowed')
      expect((await dismiss(judge, listingId)).status).toBe(403)
      expect((await rowOf(listingId))?.people).toBe(1)
    }
  })
})

describe('nothing wrong', () => {
  it('closes every open report, leaves the listing, and lets members report anew', async () => {
    const listingId = await live()
    for (const agent of [bea, cal]) await report(agent, listingId).expect(201)
    const { body } = await dismiss(mo, listingId, { note: 'The photo shows bluegill.' })
    expect(body).toEqual({ listingId, state: 'live', closed: 2 })
    expect(await rowOf(listingId)).toBeUndefined()
    await desk.visitor().get(`/api/v1/listings/${listingId}`).expect(200)
    const [log] = await desk.db
      .select()
      .from(auditLog)
      .where(eq(auditLog.subject, `listing:${await idOf(listingId)}`))
      .orderBy(auditLog.id)
      .then((rows) => rows.slice(-1))
    expect(log).toMatchObject({
      act: 'listing-reports-dismissed',
      facts: { reports: 2, note: 'The photo shows bluegill.' },
    })
    expect((await dismiss(mo, listingId)).body).toMatchObject({ type: '/problems/version-stale' })
    await report(bea, listingId, { reason: 'bad-state' }).expect(201)
    expect(await rowOf(listingId)).toMatchObject({ people: 1, newest: [{ reason: 'bad-state' }] })
  })

  it('closes nothing that the moderator has not read', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    const seenUntil = (await rowOf(listingId))?.newestAt
    await new Promise((done) => setTimeout(done, 5))
    await report(cal, listingId).expect(201)
    const { body } = await mo
      .post(`${desks}/${listingId}/dismissal`)
      .set(keyed())
      .send({ seenUntil })
      .expect(409)
    expect(body.type).toBe('/problems/version-stale')
    expect((await rowOf(listingId))?.people).toBe(2)
  })
})

describe('taking off sale', () => {
  const letters = async () =>
    (await desk.db.select().from(outbox).where(eq(outbox.kind, 'mail'))).map(
      (row) => row.body.letter as Letter,
    )

  it('hides it everywhere, writes it down, and tells the seller why but not who', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    const note = 'The fish in the photo are green sunfish.'
    const { body } = await takeDown(mo, listingId, { reason: 'not-as-told', note }).expect(200)
    expect(body).toEqual({ listingId, state: 'taken_down', closed: 1 })
    await desk.visitor().get(`/api/v1/listings/${listingId}`).expect(404)
    await bea.get(`/api/v1/listings/${listingId}`).expect(404)
    const found = await desk.visitor().get('/api/v1/listings').query({ near: '45202', limit: 50 }).expect(200)
    expect(found.body.items.map((one: { listingId: string }) => one.listingId)).not.toContain(listingId)
    expect(await desk.db.$count(listingSearch, eq(listingSearch.listingId, await idOf(listingId)))).toBe(0)
    expect(await rowOf(listingId)).toBeUndefined()
    const rows = await desk.db.select().from(auditLog).where(eq(auditLog.act, 'listing-taken-down'))
    expect(rows.at(-1)).toMatchObject({
      facts: { reason: 'not-as-told', note, reports: 1, stateBefore: 'live' },
    })

    const told = (await letters()).filter(
      ({ subject }) => subject === 'Bluegill fingerlings was taken off sale',
    )
    expect(told).toHaveLength(1)
    expect(told[0]?.to.email).toBe('ann@example.org')
    const words = JSON.stringify(told[0])
    expect(words).toContain(note)
    expect(words).toContain('What is offered is not what the listing says.')
    expect(words).not.toMatch(/bea|Kowalski|not bluegill/i)
    const notices = await ann.agent.get('/api/v1/notices').expect(200)
    expect(notices.body.items[0]).toMatchObject({
      kind: 'listing-taken-down',
      about: { noun: 'listing', id: listingId },
    })
  })

  it('shows its seller the reason, and lets them neither change nor resume it', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    await takeDown(mo, listingId, { reason: 'bad-state' }).expect(200)
    const mine = `/api/v1/sellers/mine/listings/${listingId}`
    const { body } = await ann.agent.get(mine).expect(200)
    expect(body).toMatchObject({ state: 'taken_down', takenDown: { reason: 'bad-state' }, may: [] })
    await ann.agent.post(`${mine}/selling`).send({ selling: 'live' }).expect(409)
    await report(cal, listingId).expect(404)
  })

  it('wants a reason, and words with "other"', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    expect((await takeDown(mo, listingId, {}).expect(422)).body.errors[0].pointer).toBe('#/reason')
    expect((await takeDown(mo, listingId, { reason: 'other' }).expect(422)).body.errors[0].pointer).toBe(
      '#/note',
    )
    expect((await rowOf(listingId))?.people).toBe(1)
  })

  it('takes a change that waits along: approving it later brings nothing back', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    const changed = await resubmit(ann, listingId, draftOf(ann, { taxonId: 'channel_catfish' }))
    expect(changed.body.review).toMatchObject({ number: 2, state: 'waiting' })
    await takeDown(mo, listingId, { reason: 'unlawful' }).expect(200)
    await expect(decide(mo, listingId)).rejects.toThrow('nothing of this listing waits')
    await desk.visitor().get(`/api/v1/listings/${listingId}`).expect(404)
  })

  it('happens once: of two moderators one is told to look again', async () => {
    const listingId = await live()
    await report(bea, listingId).expect(201)
    const cleo = await desk.moderator('cleo@example.org')
    const both = await Promise.all(
      [mo, cleo].map((agent) => takeDown(agent, listingId, { reason: 'unlawful' })),
    )
    expect(both.map((answer) => answer.status).sort()).toEqual([200, 409])
    expect((await reportsOf(listingId)).map(({ outcome }) => outcome)).toEqual(['taken-down'])
  })

  it('leaves an open order, its fish and its place in the window where they are', async () => {
    const listingId = await live()
    const id = await idOf(listingId)
    const page = (await bea.get(`/api/v1/listings/${listingId}`).query({ near: '45202' })).body
    const placed = await bea
      .post(`/api/v1/listings/${listingId}/orders`)
      .set(keyed())
      .send({
        quantity: 25,
        windowId: page.windows[0].windowId,
        near: '45202',
        version: page.version,
        ticked: page.gate.ticks.map((tick: { id: string }) => tick.id),
      })
    const before = {
      orders: await desk.db.select().from(order).where(eq(order.listingId, id)),
      windows: await desk.db.select().from(pickupWindow).where(eq(pickupWindow.listingId, id)),
    }
    expect(before.orders.length, JSON.stringify(placed.body)).toBe(1)
    await report(cal, listingId).expect(201)
    expect((await rowOf(listingId))?.openOrders).toBe(1)
    await takeDown(mo, listingId, { reason: 'unlawful' }).expect(200)
    expect(await desk.db.select().from(order).where(eq(order.listingId, id))).toEqual(before.orders)
    expect(await desk.db.select().from(pickupWindow).where(eq(pickupWindow.listingId, id))).toEqual(
      before.windows,
    )
    const [row] = await desk.db.select().from(listing).where(eq(listing.id, id))
    expect(row).toMatchObject({ state: 'taken_down', held: 25 })
    expect(JSON.stringify((await letters()).at(-1))).toContain('One order is open from it.')
  })
})
