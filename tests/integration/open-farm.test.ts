import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listingSearch } from '@/db/schema/listing-search'
import { seller } from '@/db/schema/sellers'
import { inTransaction } from '@/db/transaction'
import type { TestFake } from '@/payments/fake/fake-for-tests'
import { configurePayments } from '@/payments/stripe'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { loadPlaces } from '@/seed/load-places'
import { projectListings } from '@/server/search/project-listings'
import { refreshPayouts } from '@/server/sellers/refresh-payouts'
import { openPayments } from '@/tests/support/payments'
import { keyed, openTestServer, TEST_NOW, type TestServer } from '@/tests/support/server'

const farm = {
  farmName: 'Mill Lane Fish',
  about: 'Bluegill and perch from our own ponds.',
  kind: 'hatchery',
  street: '12 Mill Lane',
  city: 'Xenia',
  state: 'OH',
  zip: '45385',
  phone: '(937) 555-0142',
  licences: [{ state: 'OH', answer: 'have', number: 'A 1142' }],
}

let server: TestServer
let fake: TestFake
let ann: TestAgent
beforeAll(async () => {
  server = await openTestServer('open_farm')
  fake = await openPayments()
  await loadPlaces(server.db, { states: ['OH', 'KY', 'IN'] })
  await buildMember(server.db, { email: 'ann@example.org' })
  await buildMember(server.db, { email: 'ben@example.org' })
  ann = await server.signedIn('ann@example.org')
})
afterAll(async () => {
  await server.close()
  await fake.stop()
})

const open = (agent: TestAgent, body: object, key = keyed()) =>
  agent.post('/api/v1/sellers').set(key).send(body)

describe('opening a farm', () => {
  it('is for members, with a key', async () => {
    await open(server.visitor(), farm).expect(401)
    const { body } = await ann.post('/api/v1/sellers').send(farm).expect(400)
    expect(body.type).toBe('/problems/key-missing')
    await ann.get('/api/v1/sellers/mine').expect(403)
  })

  it('tells every field that is not right at once', async () => {
    const bad = {
      ...farm,
      farmName: '',
      phone: 'ask me',
      zip: '1234',
      licences: [{ state: 'OH', answer: 'have' }],
    }
    const { body } = await open(ann, bad).expect(422)
    expect(body.errors.map((error: { pointer: string }) => error.pointer).sort()).toEqual(
      ['#/farmName', '#/licences/0/number', '#/phone', '#/zip'].sort(),
    )
  })

  it.each([
    [{ zip: '00001' }, '#/zip'],
    [{ zip: '41011' }, '#/zip'],
    [{ zone: 'America/Xenia' }, '#/zone'],
    [{ licences: [{ state: 'KY', answer: 'unsure' }] }, '#/licences'],
    [{ licences: [farm.licences[0], farm.licences[0]] }, '#/licences/1/state'],
  ])('refuses %j', async (change, pointer) => {
    const { body } = await open(ann, { ...farm, ...change }).expect(422)
    expect(body.errors[0].pointer).toBe(pointer)
  })

  it('makes the member a seller, placed by cell, in the zone of the place', async () => {
    const key = keyed()
    const { body } = await open(ann, farm, key).expect(201)
    expect(body).toMatchObject({
      farmName: 'Mill Lane Fish',
      zone: 'America/New_York',
      payouts: 'not-started',
    })
    expect(body.sellerId).toMatch(/^[\w-]{22}$/)
    const again = await open(ann, farm, key).expect(201)
    expect(again.body).toEqual(body)
    const me = await ann.get('/api/v1/me').expect(200)
    expect(me.body).toMatchObject({ roles: ['member', 'seller'], sellerId: body.sellerId })
    expect((await ann.get('/api/v1/sellers/mine').expect(200)).body).toEqual(body)
  })

  it('opened on two devices at once is one farm', async () => {
    await buildMember(server.db, { email: 'twice@example.org' })
    const twice = await server.signedIn('twice@example.org')
    const answers = await Promise.all([open(twice, farm), open(twice, farm), open(twice, farm)])
    expect(answers.map((answer) => answer.status)).toEqual([201, 201, 201])
    expect(new Set(answers.map((answer) => answer.body.sellerId)).size).toBe(1)
  })

  it('opened again, perhaps after a lost answer, only changes what is told', async () => {
    const first = await ann.get('/api/v1/sellers/mine')
    const { body } = await open(ann, { ...farm, about: 'Perch.' }).expect(201)
    expect(body).toEqual({ ...first.body, about: 'Perch.' })
  })

  it('shows the public a town and a cell, never the street, the phone or the licence number', async () => {
    const mine = (await ann.get('/api/v1/sellers/mine')).body
    const { body, text } = await server.visitor().get(`/api/v1/sellers/${mine.sellerId}`).expect(200)
    expect(body).toEqual({
      sellerId: mine.sellerId,
      farmName: 'Mill Lane Fish',
      kind: 'hatchery',
      placeText: 'Xenia, OH',
      state: 'OH',
      since: '2027-01-15',
      about: 'Perch.',
      licences: [{ state: 'OH', answer: 'have' }],
    })
    for (const secret of ['Mill Lane,', '12 Mill', '555-0142', 'A 1142', '45385'])
      expect(text).not.toContain(secret)
    await server
      .visitor()
      .get(`/api/v1/sellers/${'x'.repeat(22)}`)
      .expect(404)
    await server.visitor().get('/api/v1/sellers/1').expect(404)
  })

  it('grows the cell in thin country until a thousand people live in it', async () => {
    await buildMember(server.db, { email: 'far@example.org' })
    await buildMember(server.db, { email: 'town@example.org' })
    const far = await server.signedIn('far@example.org')
    const town = await server.signedIn('town@example.org')
    const thin = await open(far, { ...farm, city: 'Blue Creek', zip: '45616' }).expect(201)
    const dense = await open(town, { ...farm, city: 'Columbus', zip: '43215' }).expect(201)
    const thousandths = (degrees: number) => Math.abs(Math.round(degrees * 1000))
    // The centre of a 0.2 degree cell stands at an odd tenth; of a 0.05 degree cell at 25 or 75 thousandths.
    expect(thousandths(thin.body.publicPlace.lat) % 200).toBe(100)
    expect(thousandths(dense.body.publicPlace.lat) % 50).toBe(25)
  })

  it('keeps a typed zone, and follows the farm when it moves', async () => {
    const { body } = await ann
      .patch('/api/v1/sellers/mine')
      .send({ ...farm, zone: 'America/Chicago', city: 'Dayton', zip: '45402' })
      .expect(200)
    expect(body).toMatchObject({ city: 'Dayton', zone: 'America/Chicago' })
    const before = (await ann.get('/api/v1/sellers/mine')).body.publicPlace
    const { body: moved } = await ann.patch('/api/v1/sellers/mine').send(farm).expect(200)
    expect(moved.publicPlace).not.toEqual(before)
    expect(moved.zone).toBe('America/New_York')
  })

  it('is nobody else’s to change', async () => {
    const ben = await server.signedIn('ben@example.org')
    const { body } = await ben.patch('/api/v1/sellers/mine').send(farm).expect(403)
    expect(body.type).toBe('/problems/not-allowed')
  })
})

describe('being paid', () => {
  const start = (agent: TestAgent) => agent.post('/api/v1/sellers/mine/payout-onboarding').set(keyed())
  const payouts = async () => (await ann.get('/api/v1/sellers/mine').expect(200)).body.payouts

  it('goes through the processor’s own pages, and is known when the seller comes back', async () => {
    const { body } = await start(ann).expect(201)
    expect(body.url).toMatch(/^http/)
    expect(await payouts()).toBe('unfinished')
    await fake.submit(body.url, { choice: 'later' })
    expect(await payouts()).toBe('unfinished')
    const again = await start(ann).expect(201)
    const { next } = await fake.submit(again.body.url, { choice: 'finish' })
    expect(next).toBe('http://127.0.0.1:8080/sell/farm?payouts=back')
    expect(await payouts()).toBe('ready')
  })

  it('stopped by the processor, takes the farm’s batches out of search until it may go on', async () => {
    const [ready] = await server.db.select().from(seller).where(eq(seller.farmName, farm.farmName)).limit(1)
    if (!ready?.payoutAccountId) throw new Error('the farm has no account')
    const batch = await buildBatch(server.db, { seller: ready, name: 'perch', at: new Date(TEST_NOW) })
    const found = () => server.db.$count(listingSearch, eq(listingSearch.listingId, batch.id))
    await inTransaction((tx) => projectListings(tx, [batch.id]))
    expect(await found()).toBe(1)
    await fake.control(`accounts/${ready.payoutAccountId}`, { chargesEnabled: false })
    await refreshPayouts(ready.payoutAccountId)
    expect([await payouts(), await found()]).toEqual(['unfinished', 0])
    await fake.control(`accounts/${ready.payoutAccountId}`, { chargesEnabled: true })
    expect([await payouts(), await found()]).toEqual(['ready', 1])
    await refreshPayouts('acct_nobody_here')
  })

  it('says so when the processor does not answer, and shows the farm all the same', async () => {
    await buildMember(server.db, { email: 'cy@example.org' })
    const cy = await server.signedIn('cy@example.org')
    await open(cy, farm).expect(201)
    await start(cy).expect(201)
    const settings = { secretKey: 'sk_test_farms', webhookSecret: 'whsec_farms', host: '127.0.0.1' } as const
    configurePayments({ ...settings, port: 9, protocol: 'http' })
    const { body } = await start(cy).expect(503)
    expect(body.type).toBe('/problems/payments-away')
    expect((await cy.get('/api/v1/sellers/mine').expect(200)).body.payouts).toBe('unfinished')
    configurePayments({ ...settings, port: fake.port, protocol: 'http' })
    await start(cy).expect(201)
  })
})
