import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import { loadPlaces } from '@/seed/load-places'
import { openTestServer, type TestServer } from '@/tests/support/server'

let server: TestServer
let ann: TestAgent
beforeAll(async () => {
  server = await openTestServer('keep_profile')
  await loadPlaces(server.db, { states: ['OH', 'KY'] })
  await buildMember(server.db, { email: 'ann@example.org', name: 'Ann Reed' })
  ann = await server.signedIn('ann@example.org')
})
afterAll(() => server.close())

describe('the member’s own page', () => {
  it('is for members', async () => {
    const { body } = await server.visitor().get('/api/v1/me').expect(200)
    expect(body).toBeNull()
    await server.visitor().patch('/api/v1/me').send({ units: 'metric' }).expect(401)
  })

  it('begins with nothing told and US units', async () => {
    const { body } = await ann.get('/api/v1/me').expect(200)
    expect(body).toEqual({
      name: 'Ann Reed',
      email: 'ann@example.org',
      emailVerified: true,
      roles: ['member'],
      secondFactor: { enabled: false, required: false },
      units: 'us',
      theme: 'system',
      mail: { reminders: true },
      waiting: { orders: 0, reviews: 0 },
    })
  })

  it('keeps a place as a cell, units, theme and a name', async () => {
    const places = await server.visitor().get('/api/v1/places').query({ q: '41011' })
    const { cell } = places.body.items[0]
    const change = { name: 'Ann R.', place: cell, placeLabel: 'Home', units: 'metric', theme: 'dark' }
    const { body } = await ann.patch('/api/v1/me').send(change).expect(200)
    expect(body).toMatchObject({ name: 'Ann R.', units: 'metric', theme: 'dark' })
    expect(body.place).toMatchObject({ label: 'Home', cell })
    const later = await ann.patch('/api/v1/me').send({ units: 'us' }).expect(200)
    expect(later.body).toMatchObject({ units: 'us', theme: 'dark', place: { label: 'Home' } })
  })

  it('says what is wrong, field by field, and keeps nothing of it', async () => {
    const wrong = { name: '  ', units: 'stone', role: 'admin' }
    const { body } = await ann.patch('/api/v1/me').send(wrong).expect(422)
    const pointers = body.errors.map((error: { pointer: string }) => error.pointer)
    expect(pointers).toEqual(expect.arrayContaining(['#/name', '#/units', '#/']))
    const nowhere = await ann.patch('/api/v1/me').send({ place: '50.2000.100' }).expect(422)
    expect(nowhere.body.errors[0].pointer).toBe('#/place')
    expect((await ann.get('/api/v1/me')).body).toMatchObject({ name: 'Ann R.', roles: ['member'] })
  })

  it('asks staff for a second factor, and lets them in with it', async () => {
    await buildMember(server.db, { email: 'mo@example.org', role: 'member,moderator' })
    const bare = await server.signedIn('mo@example.org')
    expect((await bare.get('/api/v1/me')).body.secondFactor).toEqual({ enabled: false, required: true })
    const refused = await bare.get('/api/v1/moderation/listings').expect(403)
    expect(refused.body.type).toBe('/problems/second-factor-needed')
    const mo = await server.signedIn('mo@example.org', { secondFactor: true })
    expect((await mo.get('/api/v1/me')).body.secondFactor).toEqual({ enabled: true, required: true })
    await mo.get('/api/v1/moderation/listings').expect(200)
  })
})
