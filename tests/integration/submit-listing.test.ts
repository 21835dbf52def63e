import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listingSearch } from '@/db/schema/listing-search'
import { listing, listingVersion, stockMovement } from '@/db/schema/listings'
import { auditLog } from '@/db/schema/moderation'
import type { FieldProblem } from '@/shared/api/problem'
import {
  begin,
  decide,
  draftOf,
  openListingDesk,
  resubmit,
  submit,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { keyed } from '@/tests/support/server'

const own = '/api/v1/sellers/mine/listings'

let desk: ListingDesk
let ann: Hatchery
let mo: TestAgent
beforeAll(async () => {
  desk = await openListingDesk('submit_listing')
  ann = await desk.hatchery('ann@example.org')
  mo = await desk.moderator('mo@example.org')
})
afterAll(() => desk.close())

const pointers = (errors: FieldProblem[]) => errors.map((error) => error.pointer)
const rowOf = async (publicId: string) => {
  const [row] = await desk.db.select().from(listing).where(eq(listing.publicId, publicId))
  if (!row) throw new Error('no such listing')
  return row
}
const isFound = async (publicId: string) => {
  const { id } = await rowOf(publicId)
  return (await desk.db.$count(listingSearch, eq(listingSearch.listingId, id))) === 1
}
const refused = async (change: Parameters<typeof draftOf>[1]) => {
  const answer = await submit(ann, await begin(ann, draftOf(ann, change)))
  return {
    status: answer.status,
    type: answer.body.type,
    pointers: pointers(answer.body.errors ?? []),
    body: answer.body,
  }
}

describe('a hatchery lists a batch', () => {
  it('drafts it, sends it in, and after a moderator’s yes it is found with its stock in the ledger', async () => {
    const tiers = [
      { fromCount: 25, unitCents: 100 },
      { fromCount: 100, unitCents: 89 },
      { fromCount: 500, unitCents: 75 },
    ]
    const drafted = await begin(ann, draftOf(ann, { countOnHand: 2000, tiers }))
    expect(drafted).toMatchObject({
      state: 'draft',
      title: 'Bluegill fingerlings',
      may: ['edit', 'submit', 'discard'],
    })
    const sent = await submit(ann, drafted).expect(200)
    expect(sent.body).toMatchObject({
      state: 'pending_review',
      review: { number: 1, state: 'waiting' },
      stock: { free: 0 },
    })
    expect(await isFound(drafted.listingId)).toBe(false)
    await desk.visitor().get(`/api/v1/listings/${drafted.listingId}`).expect(404)

    await (
      await decide(mo, drafted.listingId)
    ).ok
    const { body } = await ann.agent.get(`${own}/${drafted.listingId}`).expect(200)
    expect(body).toMatchObject({
      state: 'live',
      liveVersion: 1,
      stock: { free: 2000 },
      may: ['edit', 'submit', 'pause'],
    })
    expect(body.windows).toMatchObject([
      { startsAt: '2027-01-22T14:00:00.000Z', placesLeft: 6, zone: 'America/New_York' },
    ])
    expect(await isFound(drafted.listingId)).toBe(true)
    const { id } = await rowOf(drafted.listingId)
    const moved = await desk.db.select().from(stockMovement).where(eq(stockMovement.listingId, id))
    expect(moved).toMatchObject([{ reason: 'published', free: 2000, orderId: null }])
    const page = await desk
      .visitor()
      .get(`/api/v1/listings/${drafted.listingId}`)
      .query({ near: '45202' })
      .expect(200)
    expect(page.body).toMatchObject({
      free: 2000,
      version: 1,
      body: { tiers },
      gate: { status: 'permit_seller', buy: 'ticks' },
    })
  })

  it('is told every field that is missing, at its place in the form', async () => {
    const drafted = await begin(ann, { category: 'fish', taxonId: 'bluegill', sizeLoMm: 'about two' })
    const { body } = await submit(ann, drafted).expect(422)
    expect(body.type).toBe('/problems/listing-incomplete')
    expect(pointers(body.errors)).toEqual(
      expect.arrayContaining([
        '#/draft/sizeLoMm',
        '#/draft/stage',
        '#/draft/tiers',
        '#/draft/windows',
        '#/draft/photos',
      ]),
    )
    expect(body.errors.every((error: FieldProblem) => error.detail.length > 5)).toBe(true)
  })

  it('cannot ask more for more', async () => {
    const tiers = [
      { fromCount: 25, unitCents: 100 },
      { fromCount: 100, unitCents: 105 },
    ]
    const answer = await refused({ tiers })
    expect([answer.status, answer.pointers]).toEqual([422, ['#/draft/tiers/1/unitCents']])
    expect(answer.body.errors[0].detail).toBe('The price must fall as the count grows.')
  })

  it.each([
    [
      'stale water readings',
      { water: { ...draftOf0().water, measuredOn: '2026-12-31' } },
      '#/draft/water/measuredOn',
    ],
    ['an unhatched batch without a ready date', { hatchedOn: '2027-02-01' }, '#/draft/readyOn'],
    [
      'half past two when the clocks jump',
      { windows: [window('2027-03-14', '02:30', '03:30')] },
      '#/draft/windows/0/from',
    ],
    [
      'half past one when it comes twice',
      { windows: [window('2027-11-07', '01:30', '03:30')] },
      '#/draft/windows/0/from',
    ],
    ['a window that is over', { windows: [window('2027-01-14', '09:00', '10:00')] }, '#/draft/windows'],
    [
      'the same window twice',
      { windows: [window('2027-01-22', '09:00', '10:00'), window('2027-01-22', '09:00', '10:00')] },
      '#/draft/windows/1/from',
    ],
    ['a whole genus', { taxonId: 'lepomis' }, '#/draft/taxonId'],
    ['a worm on the fish form', { taxonId: 'red_wiggler' }, '#/draft/taxonId'],
    ['a species nobody knows', { taxonId: 'sea_monkey' }, '#/draft/taxonId'],
    [
      'inch-long fish called advanced fingerlings',
      { stage: 'advanced-fingerling', sizeLoMm: 25.4, sizeHiMm: 25.4 },
      '#/draft/stage',
    ],
    ['serving Alaska', { statesServed: ['OH', 'AK'] }, '#/draft/statesServed/1'],
    [
      'a photo from the summer',
      { photos: [{ photoId: '', takenOn: '2026-07-01', hasRuler: true }] },
      '#/draft/photos/0/takenOn',
    ],
    [
      'a photo from tomorrow',
      { photos: [{ photoId: '', takenOn: '2027-01-16', hasRuler: true }] },
      '#/draft/photos/0/takenOn',
    ],
  ])('is refused for %s', async (_, change, pointer) => {
    const given = 'photos' in change ? { photos: [{ ...change.photos[0], photoId: ann.photoId }] } : change
    const answer = await refused(given as Parameters<typeof draftOf>[1])
    expect([answer.status, answer.type, answer.pointers]).toEqual([
      422,
      '/problems/listing-incomplete',
      [pointer],
    ])
  })

  it('may not sell what was caught in the wild', async () => {
    const answer = await refused({ wildCaught: true } as object)
    expect(answer.pointers).toEqual(['#/draft/wildCaught'])
  })

  it('may not show another member’s photo', async () => {
    const ben = await desk.hatchery('ben@example.org')
    const answer = await refused({
      photos: [{ photoId: ben.photoId, takenOn: '2027-01-12', hasRuler: true }],
    })
    expect(answer.pointers).toEqual(['#/draft/photos/0/photoId'])
  })

  it('is refused a blocked animal, as our policy, with the attempt on record', async () => {
    const answer = await refused({ taxonId: 'northern_snakehead' })
    expect([answer.status, answer.type]).toEqual([409, '/problems/species-blocked'])
    expect(answer.body.detail).toMatch(/^We do not list this species\. That is our policy for everyone\./)
    const [entry] = await desk.db.select().from(auditLog).where(eq(auditLog.act, 'listing-blocked'))
    expect(entry).toMatchObject({ actorId: ann.member.memberId, facts: { taxonId: 'northern_snakehead' } })
  })

  it('is refused an animal that its own state prohibits, with the source', async () => {
    const eve = await desk.hatchery('eve@example.org', { zip: '47250' })
    const drafted = await begin(eve, draftOf(eve, { taxonId: 'mozambique_hybrid_tilapia' }))
    const { body } = await submit(eve, drafted).expect(409)
    expect(body.type).toBe('/problems/species-prohibited')
    expect(body.detail).toContain('Demonstration only')
  })

  it('waits until it can be paid', async () => {
    const poor = await desk.hatchery('poor@example.org', { payouts: 'unfinished' })
    const { body } = await submit(poor, await begin(poor, draftOf(poor))).expect(409)
    expect(body.type).toBe('/problems/seller-unready')
  })

  it('is not overwritten by a page that was open too long', async () => {
    const drafted = await begin(ann, draftOf(ann))
    const { listingId, draftRevision } = drafted
    await ann.agent
      .patch(`${own}/${listingId}`)
      .send({ draft: { words: 'newer' }, draftRevision })
      .expect(200)
    const late = await ann.agent
      .patch(`${own}/${listingId}`)
      .send({ draft: { words: 'late' }, draftRevision })
      .expect(409)
    expect(late.body).toMatchObject({
      type: '/problems/version-stale',
      facts: { draftRevision: draftRevision + 1 },
    })
    const { body } = await submit(ann, drafted).expect(409)
    expect(body.type).toBe('/problems/version-stale')
    expect((await ann.agent.get(`${own}/${listingId}`)).body.draft).toEqual({ words: 'newer' })
  })

  it('sent twice is sent once', async () => {
    const drafted = await begin(ann, draftOf(ann))
    const [key, other] = [keyed(), keyed()]
    const post = (header: ReturnType<typeof keyed>) =>
      ann.agent
        .post(`${own}/${drafted.listingId}/submission`)
        .set(header)
        .send({ draftRevision: drafted.draftRevision })
    const first = await post(key).expect(200)
    expect((await post(key).expect(200)).body).toEqual(first.body)
    await post(other).expect(200)
    const { id } = await rowOf(drafted.listingId)
    expect(await desk.db.$count(listingVersion, eq(listingVersion.listingId, id))).toBe(1)
    await Promise.all([post(keyed()), post(keyed()), post(keyed())])
    expect(await desk.db.$count(listingVersion, eq(listingVersion.listingId, id))).toBe(1)
  })

  it('sent again changed, takes the place of what waited', async () => {
    const drafted = await begin(ann, draftOf(ann, { words: 'First words.' }))
    await submit(ann, drafted).expect(200)
    await (
      await resubmit(ann, drafted.listingId, draftOf(ann, { words: 'Second words.' }))
    ).ok
    const { id } = await rowOf(drafted.listingId)
    const versions = await desk.db.select().from(listingVersion).where(eq(listingVersion.listingId, id))
    expect(versions.map(({ number, review }) => [number, review])).toEqual([
      [1, 'superseded'],
      [2, 'waiting'],
    ])
  })

  it('is nobody else’s: another’s listing answers like none', async () => {
    const { listingId } = await begin(ann, draftOf(ann))
    const cy = await desk.hatchery('cy@example.org')
    const other = await cy.agent.get(`${own}/${listingId}`).expect(404)
    const none = await cy.agent.get(`${own}/${'x'.repeat(22)}`).expect(404)
    const { instance: _one, ...told } = other.body
    const { instance: _two, ...alike } = none.body
    expect(told).toEqual(alike)
    await cy.agent.patch(`${own}/${listingId}`).send({ draft: {}, draftRevision: 0 }).expect(404)
    await cy.agent.delete(`${own}/${listingId}`).expect(404)
    await cy.agent.post(own).set(keyed()).send({ copyOf: listingId }).expect(404)
    await desk.visitor().get(own).expect(401)
  })
})

describe('drafts', () => {
  it('are copied without what was said about one batch', async () => {
    const { listingId } = await begin(ann, draftOf(ann, { words: 'Our usual words.' }))
    const { body } = await ann.agent.post(own).set(keyed()).send({ copyOf: listingId }).expect(201)
    expect(body.draft).toMatchObject({ words: 'Our usual words.', taxonId: 'bluegill', water: { pH: 7.4 } })
    for (const field of ['photos', 'windows', 'hatchedOn', 'countOnHand', 'health', 'singleSpeciesChecked']) {
      expect(body.draft).not.toHaveProperty(field)
    }
    expect(body.draft.water).not.toHaveProperty('measuredOn')
  })

  it('are copied without what was said about one harvest or one lot of worms', async () => {
    const said = { harvest: { day: '2027-01-12', time: '07:00' }, lotCode: 'L-0112', sellBy: '2027-01-14' }
    const draft = {
      category: 'produce',
      cropId: 'leaf_lettuce',
      standing: 'covered',
      ...said,
      lotChecked: true,
    }
    const { listingId } = await begin(ann, draft)
    const { body } = await ann.agent.post(own).set(keyed()).send({ copyOf: listingId }).expect(201)
    expect(body.draft).toEqual({ category: 'produce', cropId: 'leaf_lettuce', standing: 'covered' })
  })

  it('are thrown away while they are drafts, and not later', async () => {
    const { listingId } = await begin(ann, {})
    await ann.agent.delete(`${own}/${listingId}`).expect(204)
    await ann.agent.get(`${own}/${listingId}`).expect(404)
    const sent = await begin(ann, draftOf(ann))
    await submit(ann, sent).expect(200)
    const { body } = await ann.agent.delete(`${own}/${sent.listingId}`).expect(409)
    expect(body.type).toBe('/problems/listing-closed')
  })

  it('are no larger than a listing can be', async () => {
    const { listingId, draftRevision } = await begin(ann, {})
    const draft = { words: 'x'.repeat(21_000) }
    const { body } = await ann.agent.patch(`${own}/${listingId}`).send({ draft, draftRevision }).expect(422)
    expect(pointers(body.errors)).toEqual(['#/draft'])
  })

  it('are listed newest change first, page by page, each once', async () => {
    const dee = await desk.hatchery('dee@example.org')
    const made: string[] = []
    for (let n = 0; n < 5; n++) made.push((await begin(dee, { words: `batch ${n}` })).listingId)
    const seen: string[] = []
    for (let cursor: string | undefined, page = 0; page < 4; page++) {
      const { body } = await dee.agent
        .get(own)
        .query({ limit: 2, ...(cursor ? { cursor } : {}) })
        .expect(200)
      seen.push(...body.items.map((one: { listingId: string }) => one.listingId))
      cursor = body.nextCursor
      if (!cursor) break
    }
    expect(seen).toEqual(made.reverse())
    const { body } = await dee.agent.get(own).query({ cursor: 'nonsense' }).expect(400)
    expect(body.type).toBe('/problems/cursor-unreadable')
  })
})

function window(day: string, from: string, until: string) {
  return { day, from, until, capacity: 3 }
}

function draftOf0() {
  return draftOf({ photoId: '0'.repeat(32) } as Hatchery)
}
