import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { callCount } from '@/db/schema/requests'
import { auditLog } from '@/db/schema/moderation'
import { outbox } from '@/db/schema/outbox'
import type { Letter } from '@/server/mail/letter'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller } from '@/seed/build-seller'
import {
  begin,
  decide,
  draftOf,
  liveListing,
  openListingDesk,
  resubmit,
  submit,
  uploadPhoto,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { keyed } from '@/tests/support/server'

const queue = '/api/v1/moderation/listings'
const own = '/api/v1/sellers/mine/listings'

let desk: ListingDesk
let ann: Hatchery
let mo: TestAgent
beforeAll(async () => {
  desk = await openListingDesk('review_listing')
  ann = await desk.hatchery('ann@example.org')
  mo = await desk.moderator('mo@example.org')
})
beforeEach(async () => {
  await desk.db.delete(callCount)
})
afterAll(() => desk.close())

const sent = async (change: Partial<FishBody> = {}, hatchery = ann) => {
  const drafted = await begin(hatchery, draftOf(hatchery, change))
  await submit(hatchery, drafted).expect(200)
  return drafted.listingId
}
const waiting = async (agent = mo) => (await agent.get(queue).query({ limit: 50 }).expect(200)).body.items
const versionOf = async (listingId: string) => {
  const row = (await waiting()).find((one: { listingId: string }) => one.listingId === listingId)
  return row.versionId as string
}
const letters = async () => {
  const rows = await desk.db.select().from(outbox).where(eq(outbox.kind, 'mail'))
  return rows.map((row) => row.body.letter as Letter)
}

describe('the queue', () => {
  it('is for staff alone', async () => {
    await desk.visitor().get(queue).expect(401)
    await ann.agent.get(queue).expect(403)
    await ann.agent.get(`${queue}/1`).expect(403)
    await ann.agent.post(`${queue}/1/decision`).set(keyed()).send({ decision: 'approve' }).expect(403)
  })

  it('shows the riskiest first, and among equals the one that has waited longest', async () => {
    const plain = await sent()
    const plainLater = await sent()
    const snakehead = await sent({ taxonId: 'channel_catfish', words: 'Indian murrel fingerlings' })
    const phoned = await sent({ words: 'Call 513 555 0142' })
    const rows = await waiting()
    const order = rows.map((row: { listingId: string }) => row.listingId)
    expect(order.indexOf(snakehead)).toBeLessThan(order.indexOf(phoned))
    expect(order.indexOf(phoned)).toBeLessThan(order.indexOf(plainLater))
    expect(order.indexOf(plain)).toBeLessThan(order.indexOf(plainLater))
    expect(rows[0]).toMatchObject({
      listingId: snakehead,
      farmName: "ann's hatchery",
      number: 1,
      state: 'pending_review',
    })
    expect(rows[0].flags).toContain('names-blocked:striped_snakehead')
  })

  it('comes page by page, each version once', async () => {
    const all = (await waiting()).map((row: { versionId: string }) => row.versionId)
    const seen: string[] = []
    for (let cursor: string | undefined, pages = 0; pages < 20; pages++) {
      const { body } = await mo
        .get(queue)
        .query({ limit: 1, ...(cursor ? { cursor } : {}) })
        .expect(200)
      seen.push(...body.items.map((row: { versionId: string }) => row.versionId))
      cursor = body.nextCursor
      if (!cursor) break
    }
    expect(seen).toEqual(all)
    await mo.get(queue).query({ cursor: 'eyJ2IjoxfQ' }).expect(400)
  })

  it('is counted on the moderator’s own page', async () => {
    const rows = await waiting()
    expect((await mo.get('/api/v1/me')).body.waiting.reviews).toBe(rows.length)
    expect((await ann.agent.get('/api/v1/me')).body.waiting.reviews).toBe(0)
  })
})

describe('one version', () => {
  it('shows facts, photos, rules, the seller’s record and the next in line', async () => {
    const listingId = await sent()
    const { body } = await mo.get(`${queue}/${await versionOf(listingId)}`).expect(200)
    expect(body).toMatchObject({
      listingId,
      listingState: 'pending_review',
      review: 'waiting',
      number: 1,
      changes: [],
      seller: {
        farmName: "ann's hatchery",
        state: 'OH',
        licences: [{ state: 'OH', answer: 'have', number: 'OH-A 1142' }],
      },
    })
    expect(body.photos).toMatchObject([
      { photoId: ann.photoId, alt: 'Bluegill fingerlings, beside a ruler, photo 1 of 1' },
    ])
    expect(body.rules.length).toBeGreaterThan(0)
    expect(body.rules[0]).toHaveProperty('sourceTitle')
    const next = await mo.get(`${queue}/${body.nextVersionId}`).expect(200)
    expect(next.body.review).toBe('waiting')
    expect(next.body.versionId).not.toBe(body.versionId)
  })

  it.each(['999999999', '0', 'abc', '1e3'])('%s is a 404 when there is none', async (id) => {
    await mo.get(`${queue}/${id}`).expect(404)
    await mo.post(`${queue}/${id}/decision`).set(keyed()).send({ decision: 'approve' }).expect(404)
  })

  it('shows photos that served before, or that another member uploaded', async () => {
    const first = await liveListing(ann, mo)
    const again = await sent()
    const ben = await desk.hatchery('ben@example.org')
    const twin = await sent({}, ben)
    const flagsOf = async (id: string) =>
      (await waiting()).find((row: { listingId: string }) => row.listingId === id).flags
    expect(first).not.toBe(again)
    expect(await flagsOf(again)).toContain('photo-used-before')
    expect(await flagsOf(twin)).toEqual(expect.arrayContaining(['photo-of-another', 'first-listing', 'new']))
  })
})

describe('deciding', () => {
  it('asks: the seller gets the words by mail and on the desk, and may send it in again', async () => {
    const listingId = await sent()
    const note = 'Please show the ruler from above.'
    const said = await decide(mo, listingId, { decision: 'ask', reason: 'no-ruler', note })
    expect(said.body).toMatchObject({ review: 'asked', listingState: 'draft' })
    const { body } = await ann.agent.get(`${own}/${listingId}`)
    expect(body).toMatchObject({
      state: 'draft',
      review: { state: 'asked', reasonCode: 'no-ruler', reasonText: note },
    })
    const letter = (await letters()).at(-1)
    expect(letter).toMatchObject({
      to: { email: 'ann@example.org' },
      subject: 'Bluegill fingerlings needs an answer from you',
    })
    expect(JSON.stringify(letter)).toContain(note)
    const photoId = await uploadPhoto(ann.agent, 700)
    const photos = [{ photoId, takenOn: '2027-01-14', hasRuler: true }]
    const { body: again } = await resubmit(ann, listingId, draftOf(ann, { photos }))
    expect(again).toMatchObject({ state: 'pending_review', review: { number: 2, state: 'waiting' } })
  })

  it('rejects: nothing of it was ever public, and the listing is closed for good', async () => {
    const listingId = await sent()
    const said = await decide(mo, listingId, { decision: 'reject', reason: 'species-doubtful' })
    expect(said.body).toMatchObject({ review: 'rejected', listingState: 'taken_down' })
    await desk.visitor().get(`/api/v1/listings/${listingId}`).expect(404)
    const refused = await resubmit(ann, listingId, draftOf(ann)).catch((error: Error) => error)
    expect(String(refused)).toContain('409')
    const later = await sent()
    expect((await waiting()).find((row: { listingId: string }) => row.listingId === later).flags).toContain(
      'removed-before',
    )
  })

  it('writes each decision down', async () => {
    const listingId = await sent()
    await decide(mo, listingId, { decision: 'reject', reason: 'other', note: 'Sold elsewhere.' })
    const rows = await desk.db.select().from(auditLog).where(eq(auditLog.act, 'listing-rejected'))
    expect(rows.at(-1)).toMatchObject({ facts: { version: 1, reason: 'other', note: 'Sold elsewhere.' } })
  })

  it('wants a reason with every no, and words with "other"', async () => {
    const versionId = await versionOf(await sent())
    const post = (body: object) =>
      mo.post(`${queue}/${versionId}/decision`).set(keyed()).send(body).expect(422)
    expect((await post({ decision: 'reject' })).body.errors[0].pointer).toBe('#/reason')
    expect((await post({ decision: 'reject', reason: 'other' })).body.errors[0].pointer).toBe('#/note')
    expect((await post({ decision: 'ask', reason: 'no-ruler' })).body.errors[0].pointer).toBe('#/note')
  })

  it('happens once: a second moderator is told to look again', async () => {
    const cleo = await desk.moderator('cleo@example.org')
    const versionId = await versionOf(await sent())
    const decision = { decision: 'approve' }
    const both = await Promise.all(
      [mo, cleo].map((agent) => agent.post(`${queue}/${versionId}/decision`).set(keyed()).send(decision)),
    )
    expect(both.map((answer) => answer.status).sort()).toEqual([200, 409])
    expect(both.find((answer) => answer.status === 409)?.body).toMatchObject({
      type: '/problems/version-stale',
      facts: { review: 'approved' },
    })
  })

  it('is refused on what the seller has replaced meanwhile', async () => {
    const listingId = await sent()
    const old = await versionOf(listingId)
    await resubmit(ann, listingId, draftOf(ann, { words: 'Other words.' }))
    const { body } = await mo
      .post(`${queue}/${old}/decision`)
      .set(keyed())
      .send({ decision: 'approve' })
      .expect(409)
    expect(body).toMatchObject({ type: '/problems/version-stale', facts: { review: 'superseded' } })
  })

  it('is nobody’s who sells: neither their own batch nor a competitor’s', async () => {
    const member = await buildMember(desk.db, { email: 'sal@example.org', role: 'member,moderator' })
    await buildSeller(desk.db, { member })
    const agent = await desk.signedIn('sal@example.org', { secondFactor: true })
    const sal = { agent, member, photoId: await uploadPhoto(agent, 720) } as Hatchery
    const rival = await versionOf(await sent())
    await agent.get(`${queue}/${rival}`).expect(200)
    const mine = await sent({}, sal)
    const version = await versionOf(mine)
    for (const id of [version, rival]) {
      const { body } = await agent
        .post(`${queue}/${id}/decision`)
        .set(keyed())
        .send({ decision: 'approve' })
        .expect(403)
      expect(body.type).toBe('/problems/not-allowed')
    }
    expect(await waiting(agent)).toEqual([])
  })
})
