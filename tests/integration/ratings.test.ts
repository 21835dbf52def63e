import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { listingSearch } from '@/db/schema/listing-search'
import { auditLog } from '@/db/schema/moderation'
import { rating as ratingTable } from '@/db/schema/ratings'
import { inTransaction } from '@/db/transaction'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller } from '@/seed/build-seller'
import { now } from '@/server/clock'
import { askSurvival } from '@/server/ratings/ask-survival'
import { projectListings } from '@/server/search/project-listings'
import { refreshSiteMean } from '@/server/search/refresh-site-mean'
import type { ShownNotice } from '@/shared/contracts/notices'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { ShownRating } from '@/shared/contracts/ratings'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const DAY = 24 * 3600_000
const GOOD = { marks: { fish: 5, count: 4, contact: 5 }, words: 'Lively fish, honest count.' }

let desk: OrderDesk
let bea: TestAgent
let hatchery: TestAgent
let count = 0

beforeAll(async () => {
  desk = await openOrderDesk('ratings')
  await buildMember(desk.db, { email: 'bea@example.org', name: 'Bea Kowalski' })
  await buildMember(desk.db, { email: 'stranger@example.org', name: 'Stran Ger' })
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
beforeEach(async () => {
  bea = await desk.signedIn('bea@example.org')
  hatchery = await desk.signedIn(desk.hatcheryEmail)
})
afterEach(() => desk.travelTo(new Date()))
afterAll(() => desk.close())

const inDays = (days: number) => desk.travelTo(new Date(now().getTime() + days * DAY))

async function ordered() {
  const batch = await desk.batch(`rated-${++count}`)
  const reply = await bea
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch, { payMode: 'full' }))
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  const order = reply.body as ShownOrder
  await desk.pay(order)
  const path = `/api/v1/orders/${order.orderId}`
  const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
  const rate = (by = bea, body: object = GOOD) => by.post(`${path}/rating`).set(keyed()).send(body)
  const answer = (alive: number, by = bea) => by.post(`${path}/survival`).set(keyed()).send({ alive })
  return { batch, path, seen, rate, answer }
}

async function handedOver() {
  const made = await ordered()
  await hatchery.post(`${made.path}/readiness`).set(keyed()).expect(200)
  const { handOverCode: code } = await made.seen()
  await hatchery.post(`${made.path}/hand-over`).set(keyed()).send({ code, count: 25 }).expect(200)
  await desk.quiet()
  return made
}

const record = async () =>
  (await desk.visitor().get(`/api/v1/sellers/${desk.hatchery.publicId}`).expect(200)).body
const ratings = async (query: object = {}) =>
  (await desk.visitor().get(`/api/v1/sellers/${desk.hatchery.publicId}/ratings`).query(query).expect(200))
    .body as { items: ShownRating[]; nextCursor?: string }

describe('rating an order', () => {
  it('waits for the hand-over, and shows "no ratings yet" as no rating at all', async () => {
    expect((await record()).rating).toBeUndefined()
    expect(await ratings()).toEqual({ items: [] })
    const { seen, rate } = await ordered()
    expect((await seen()).may).not.toContain('rate')
    const early = await rate()
    expect([early.status, early.body.type]).toEqual([409, '/problems/rating-closed'])
    expect(await ratings()).toEqual({ items: [] })
  })

  it('is for the buyer, once; the count on the seller’s page is the truth', async () => {
    const { seen, rate } = await handedOver()
    expect((await seen()).may).toContain('rate')
    expect((await seen(hatchery)).may).not.toContain('rate')
    expect((await rate(hatchery)).status).toBe(404)
    expect((await rate(await desk.signedIn('stranger@example.org'))).status).toBe(404)
    expect((await rate(desk.visitor())).status).toBe(401)
    const given = await rate()
    expect(given.status, JSON.stringify(given.body)).toBe(201)
    expect(given.body).toMatchObject({ buyerName: 'Bea K.', marks: GOOD.marks, words: GOOD.words })
    const again = await rate()
    expect([again.status, again.body.type]).toEqual([409, '/problems/rating-closed'])
    expect((await seen()).may).not.toContain('rate')
    expect(await record()).toMatchObject({
      rating: { mean: 4.7, count: 1 },
      marks: { fish: 5, count: 4, contact: 5 },
    })
    expect(JSON.stringify(await ratings())).not.toContain('Kowalski')
    const listed = await desk
      .visitor()
      .get(`/api/v1/listings/${(await seen()).listingId}`)
      .expect(200)
    expect(listed.body.seller.rating).toEqual({ mean: 4.7, count: 1 })
  })

  it('counts one of two presses at once', async () => {
    const { rate } = await handedOver()
    const before = (await record()).rating.count
    const answers = await Promise.all([rate(), rate(), rate()])
    expect(answers.map((one) => one.status).sort()).toEqual([201, 409, 409])
    expect((await record()).rating.count).toBe(before + 1)
  })

  it('counts both of two ratings of one seller at once', async () => {
    const [one, two] = [await handedOver(), await handedOver()]
    const before = (await record()).rating.count
    const answers = await Promise.all([one.rate(), two.rate()])
    expect(answers.map((answer) => answer.status)).toEqual([201, 201])
    expect((await record()).rating.count).toBe(before + 2)
    const rows = await desk.db.select().from(ratingTable)
    expect((await record()).rating.count).toBe(rows.length)
  })

  it('takes whole marks from 1 to 5 and at most 600 characters', async () => {
    const { rate } = await handedOver()
    for (const marks of [
      { fish: 0, count: 1, contact: 1 },
      { fish: 6, count: 1, contact: 1 },
      { fish: 4.5, count: 1, contact: 1 },
      { fish: 5 },
    ]) {
      expect((await rate(bea, { marks })).status, JSON.stringify(marks)).toBe(422)
    }
    expect((await rate(bea, { marks: GOOD.marks, words: 'x'.repeat(601) })).status).toBe(422)
    expect((await rate(bea, { marks: GOOD.marks, words: 'x'.repeat(600) })).status).toBe(201)
  })

  it('may be changed for 14 days and not a minute longer', async () => {
    const { rate, path, seen } = await handedOver()
    await rate()
    const change = () => bea.patch(`${path}/rating`).send({ marks: { fish: 1, count: 1, contact: 1 } })
    await inDays(13.9)
    expect((await seen()).may).toContain('change-rating')
    const changed = await change()
    expect(changed.body).toMatchObject({
      marks: { fish: 1, count: 1, contact: 1 },
      editedAt: expect.any(String),
    })
    expect(changed.body.words).toBeUndefined()
    await inDays(0.2)
    expect((await seen()).may).not.toContain('change-rating')
    const late = await change()
    expect([late.status, late.body.type]).toEqual([409, '/problems/rating-closed'])
  })

  it('gets one reply, from that seller alone', async () => {
    const { rate, path, seen } = await handedOver()
    const reply = (by: TestAgent) =>
      by.post(`${path}/rating/reply`).set(keyed()).send({ words: 'Thank you, Bea.' })
    expect((await reply(hatchery)).status).toBe(404)
    await rate()
    expect((await seen(hatchery)).may).toContain('reply-to-rating')
    expect((await reply(bea)).status).toBe(404)
    const other = await buildMember(desk.db, { email: `other-${count}@example.org` })
    await buildSeller(desk.db, { member: other })
    expect((await reply(await desk.signedIn(other.email))).status).toBe(404)
    expect((await reply(hatchery)).status).toBe(201)
    const second = await reply(hatchery)
    expect([second.status, second.body.type]).toEqual([409, '/problems/rating-closed'])
    expect((await ratings()).items[0]?.reply?.words).toBe('Thank you, Bea.')
    expect((await seen()).rating?.reply?.words).toBe('Thank you, Bea.')
    await desk.quiet()
    const told = async (by: TestAgent, kind: string) =>
      ((await by.get('/api/v1/notices').expect(200)).body.items as ShownNotice[]).filter(
        (notice) => notice.kind === kind && path.endsWith(notice.about.id),
      )
    expect(await told(hatchery, 'rated')).toHaveLength(1)
    expect(await told(bea, 'rating-reply')).toHaveLength(1)
  })

  it('keeps scripts and tags as the text they are', async () => {
    const { rate, path } = await handedOver()
    const words = '<script>alert(1)</script> <img src=x onerror=alert(2)> & "quotes"'
    await rate(bea, { marks: GOOD.marks, words })
    await hatchery.post(`${path}/rating/reply`).set(keyed()).send({ words }).expect(201)
    const answer = await desk.visitor().get(`/api/v1/sellers/${desk.hatchery.publicId}/ratings`).expect(200)
    expect(answer.headers['content-type']).toContain('application/json')
    expect(answer.headers['x-content-type-options']).toBe('nosniff')
    expect(answer.body.items[0]).toMatchObject({ words, reply: { words } })
  })

  it('is listed page by page, each once, newest first', async () => {
    const all = (await ratings({ limit: 50 })).items.map((one) => one.ratingId)
    expect(all.length).toBeGreaterThan(4)
    const met: string[] = []
    let cursor: string | undefined
    do {
      const page = await ratings({ limit: 2, ...(cursor ? { cursor } : {}) })
      met.push(...page.items.map((one) => one.ratingId))
      cursor = page.nextCursor
    } while (cursor && met.length < 100)
    expect(met).toEqual(all)
    await desk
      .visitor()
      .get(`/api/v1/sellers/${'A'.repeat(22)}/ratings`)
      .expect(404)
  })
})

describe('a moderator', () => {
  it('hides words for one of three reasons; marks keep counting', async () => {
    const { rate, path, seen } = await handedOver()
    const { ratingId } = (
      await rate(bea, { marks: { fish: 1, count: 1, contact: 1 }, words: 'Call 555-0142' })
    ).body
    const before = (await record()).rating
    const staff = await desk.staff('staff@example.org')
    const hide = (by: TestAgent, body: object) =>
      by.post(`/api/v1/moderation/ratings/${ratingId}/hiding`).set(keyed()).send(body)
    expect((await hide(hatchery, { part: 'words', reason: 'threats' })).status).toBe(403)
    expect((await hide(staff, { part: 'words', reason: 'negative' })).status).toBe(422)
    expect((await hide(staff, { part: 'words' })).status).toBe(422)
    expect((await hide(staff, { part: 'reply', reason: 'threats' })).status).toBe(404)
    expect((await hide(staff, { part: 'words', reason: 'personal-data' })).status).toBe(200)
    for (const shown of [(await ratings()).items[0], (await seen()).rating, (await seen(hatchery)).rating]) {
      expect(shown).toMatchObject({ ratingId, wordsHidden: 'personal-data', marks: { fish: 1 } })
      expect(shown?.words).toBeUndefined()
    }
    expect((await record()).rating).toEqual(before)
    await bea.patch(`${path}/rating`).send({ marks: GOOD.marks, words: 'Call 555-0142 again' }).expect(200)
    expect(JSON.stringify(await ratings())).not.toContain('555-0142')
    const [entry] = await desk.db.select().from(auditLog).where(eq(auditLog.act, 'rating-words-hidden'))
    expect(entry?.facts).toMatchObject({ part: 'words', reason: 'personal-data', said: 'Call 555-0142' })
  })

  it('has no way to remove a rating', async () => {
    const { rate } = await handedOver()
    const { ratingId } = (await rate()).body
    const staff = await desk.staff('staff@example.org')
    for (const path of [`moderation/ratings/${ratingId}`, `ratings/${ratingId}`]) {
      await staff.delete(`/api/v1/${path}`).expect(404)
    }
  })
})

describe('the seventh day', () => {
  const asked = () => desk.letters.filter((letter) => letter.subject.startsWith('How many of your')).length
  const run = async () => {
    await Promise.all([askSurvival(), askSurvival()])
    await desk.quiet()
  }

  it('is asked by one mail, on day 7, however often the runner runs', async () => {
    const { seen, answer, path } = await handedOver()
    await run()
    const before = asked()
    await inDays(6.9)
    await run()
    expect((await seen()).may).not.toContain('answer-survival')
    expect((await answer(20)).body.type).toBe('/problems/rating-closed')
    const early = asked()
    await inDays(0.2)
    await run()
    await run()
    const mails = desk.letters.filter(
      (letter) =>
        letter.subject === 'How many of your 25 are alive?' &&
        JSON.stringify(letter).includes(path.split('/').at(-1) ?? ''),
    )
    expect(mails.map((mail) => mail.to.email)).toEqual(['bea@example.org'])
    expect(early).toBe(before)
    expect((await seen()).may).toContain('answer-survival')
    await inDays(1)
    await run()
    expect(
      desk.letters.filter(
        (letter) =>
          JSON.stringify(letter).includes(path.split('/').at(-1) ?? '') &&
          letter.subject.startsWith('How many'),
      ),
    ).toHaveLength(1)
  })

  it('takes 0 to what was handed over, adds up, and can be corrected for 7 days', async () => {
    const { seen, answer } = await handedOver()
    await inDays(7.1)
    await run()
    const before = (await record()).survival
    expect((await answer(26)).status).toBe(422)
    expect((await answer(-1)).status).toBe(422)
    expect((await answer(2.5)).status).toBe(422)
    expect((await answer(24, hatchery)).status).toBe(404)
    expect((await answer(24, await desk.signedIn('stranger@example.org'))).status).toBe(404)
    expect((await answer(24)).body).toMatchObject({ handedOver: 25, alive: 24 })
    expect((await record()).survival).toEqual({
      ...{ alive: before.alive + 24, handedOver: before.handedOver + 25 },
      ...{ answered: before.answered + 1, asked: before.asked },
    })
    await inDays(6.9)
    expect((await answer(0)).status).toBe(200)
    expect((await record()).survival.alive).toBe(before.alive)
    expect((await record()).survival.answered).toBe(before.answered + 1)
    await inDays(0.2)
    expect((await seen()).may).not.toContain('answer-survival')
    expect((await answer(25)).body.type).toBe('/problems/rating-closed')
    expect((await seen()).survival?.alive).toBe(0)
  })

  it('is not mailed any more to a buyer who answered before the runner came round', async () => {
    const { answer } = await handedOver()
    await inDays(7.1)
    const before = { mails: asked(), record: (await record()).survival }
    expect((await answer(25)).status).toBe(200)
    await run()
    const { survival } = await record()
    expect(survival.asked - before.record.asked).toBe(1)
    expect(survival.answered - before.record.answered).toBe(1)
    expect(asked()).toBe(before.mails)
  })

  it('is neither asked nor answered for weeks later', async () => {
    const { answer, seen } = await handedOver()
    await inDays(7 + 14.1)
    const before = asked()
    await run()
    expect(asked()).toBe(before)
    expect((await seen()).may).not.toContain('answer-survival')
    expect((await answer(25)).body.type).toBe('/problems/rating-closed')
  })
})

describe('search by "best rated"', () => {
  it('follows a rating at once, with the unrated last', async () => {
    const rival = await buildMember(desk.db, { email: 'rival@example.org' })
    const unrated = await buildMember(desk.db, { email: 'unrated@example.org' })
    const mine = await handedOver()
    const sellers = [
      await buildSeller(desk.db, { member: rival, rating: { count: 4, sum: 17 } }),
      await buildSeller(desk.db, { member: unrated }),
    ]
    const others: string[] = []
    for (const seller of sellers) {
      const built = await buildBatch(desk.db, { seller, name: `by-${seller.publicId}`, at: now() })
      await inTransaction((tx) => projectListings(tx, [built.id]))
      others.push(built.publicId)
    }
    const order = async () => {
      const query = { near: '45202', withinKm: 200, sort: 'best-rated', limit: 50 }
      const { body } = await desk.visitor().get('/api/v1/listings').query(query).expect(200)
      const ids = (body.items as { listingId: string }[]).map((one) => one.listingId)
      return [mine.batch.publicId, ...others].map((id) => ids.indexOf(id))
    }
    await desk.db.update(ratingTable).set({ fishMark: 1, countMark: 1, contactMark: 1 })
    const given = await mine.rate(bea, { marks: { fish: 1, count: 1, contact: 1 } })
    expect(given.status).toBe(201)
    const [low = -1, rivals = -1, last = -1] = await order()
    expect(rivals).toBeGreaterThanOrEqual(0)
    expect(low).toBeGreaterThan(rivals)
    expect(last).toBeGreaterThan(low)
    await desk.db.update(ratingTable).set({ fishMark: 5, countMark: 5, contactMark: 5 })
    await bea
      .patch(`${mine.path}/rating`)
      .send({ marks: { fish: 5, count: 5, contact: 5 } })
      .expect(200)
    const [high = -1, rivalsNow = -1, lastNow = -1] = await order()
    expect(high).toBeGreaterThanOrEqual(0)
    expect(high).toBeLessThan(rivalsNow)
    expect(lastNow).toBeGreaterThan(rivalsNow)
  })

  it('ranks anew when the mean of the whole site has moved', async () => {
    const rankOf = async (id: number) =>
      (await desk.db.select().from(listingSearch).where(eq(listingSearch.listingId, id)))[0]?.ratingRank
    const member = await buildMember(desk.db, { email: 'few@example.org' })
    const seller = await buildSeller(desk.db, { member, rating: { count: 1, sum: 5 } })
    const built = await buildBatch(desk.db, { seller, name: 'few-ratings', at: now() })
    await inTransaction((tx) => projectListings(tx, [built.id]))
    const before = (await rankOf(built.id)) ?? -1
    const many = await buildMember(desk.db, { email: 'many@example.org' })
    await buildSeller(desk.db, { member: many, rating: { count: 1000, sum: 2000 } })
    expect(await refreshSiteMean()).toBeGreaterThan(0)
    expect(await rankOf(built.id)).toBeGreaterThan(before)
    expect(await refreshSiteMean()).toBe(0)
  })
})
