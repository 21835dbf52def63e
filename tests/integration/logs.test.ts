import { randomUUID } from 'node:crypto'

import mysql from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { BUILT_PASSWORD } from '@/seed/build-member'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { ShownOrder } from '@/shared/contracts/orders'
import { HATCHERY_EMAIL, reserveBody } from '@/tests/support/desk-ground'
import type { ServerProcess } from '@/tests/support/server-process'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'
import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const NEW_PASSWORD = 'heron-lattice-paddle-31'
const STREET = '77 Hidden Hollow Road'
const PHONE = '(513) 555-0177'

let database: TestDatabase
let desk: StandingDesk
let server: ServerProcess
const secrets: Record<string, string> = {
  'a password': BUILT_PASSWORD,
  'a new password': NEW_PASSWORD,
  STREET,
  PHONE,
}

/** What is wrong with the lines of a run: not one JSON object each, not in UTC, or holding what no log may hold. */
function logFaults(lines: string[]): string[] {
  return lines.flatMap((line) => {
    const held = Object.entries(secrets).filter(([, secret]) => line.includes(secret))
    const faults = held.map(([name]) => `${name}: ${line}`)
    if (/\nparams:|\\nparams:/.test(line)) faults.push(`values of a query: ${line}`)
    try {
      const { time, level } = JSON.parse(line) as { time?: unknown; level?: unknown }
      if (typeof level !== 'number') faults.push(`no level: ${line}`)
      if (!/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/.test(String(time))) faults.push(`no time: ${line}`)
    } catch {
      faults.push(`no JSON: ${line}`)
    }
    return faults
  })
}

/** The server's clocks read the table meanwhile: a deadlock with them is tried again. */
async function reshape(owner: mysql.Connection, statement: string): Promise<void> {
  await vi.waitFor(() => owner.query(statement), { timeout: 10_000, interval: 100 })
}

beforeAll(async () => {
  database = await freshDatabase('logs')
  desk = await openStandingDesk(database)
  server = await desk.start({ environment: { LOG_LEVEL: 'debug' } })
  const batch = await desk.batch('logged')
  const [cookie = ''] = await desk.cookies(['bea@example.org'])
  Object.assign(secrets, {
    'a session': decodeURIComponent(cookie).split('=')[1]?.split('.')[0] ?? '-',
    'the key of sessions': desk.authSecret,
    'the key of the processor': 'sk_test_standing_desk',
    'the key of the webhook': 'whsec_standing_desk',
    'the database password': new URL(database.url).password,
    'an address': 'bea@example.org',
    'the farm’s address': HATCHERY_EMAIL,
    'a newcomer’s address': 'newcomer@example.org',
    'where the farm is': String(desk.hatchery.trueLat),
    'how far east': String(desk.hatchery.trueLng),
  })

  const visitor = desk.agent(server)
  await visitor
    .post('/api/auth/sign-up/email')
    .send({ name: 'New', email: 'newcomer@example.org', password: NEW_PASSWORD })
  await visitor
    .post('/api/auth/sign-in/email')
    .send({ email: HATCHERY_EMAIL, password: `${BUILT_PASSWORD}x` })
  await visitor
    .post('/api/auth/sign-in/email')
    .send({ email: 'nobody@example.org', password: BUILT_PASSWORD })
  await visitor
    .post('/api/auth/sign-in/email')
    .send({ email: 'bea@example.org', password: BUILT_PASSWORD })
    .expect(200)
  const hatchery = desk.agent(server)
  await hatchery
    .post('/api/auth/sign-in/email')
    .send({ email: HATCHERY_EMAIL, password: BUILT_PASSWORD })
    .expect(200)
  await visitor
    .post('/api/auth/request-password-reset')
    .send({ email: 'bea@example.org', redirectTo: '/reset-password' })
  const letter = await vi.waitFor(
    async () => {
      const [found] = (await desk.mails.list({ to: 'bea@example.org' })).filter((mail) =>
        /password/i.test(mail.subject),
      )
      if (!found) throw new Error('no letter yet')
      return found
    },
    { timeout: 10_000, interval: 100 },
  )
  const link = new URL(letter.links.find((one) => /reset-password/.test(one)) ?? '')
  secrets['a token'] =
    /reset-password\/([^?/]+)/.exec(link.href)?.[1] ?? link.searchParams.get('token') ?? '-'
  await visitor.get(`${link.pathname}${link.search}`)

  const buyer = desk.agent(server, cookie)
  const key = randomUUID()
  secrets['a key'] = key
  const held = await buyer
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set({ 'idempotency-key': key })
    .send(reserveBody(batch))
  expect(held.status, held.text).toBe(201)
  await desk.fake.pay((held.body as ShownOrder).payUrl ?? '', '4242424242424242')
  await buyer.get('/api/v1/listings?near=45202')
  const own = (await hatchery.get('/api/v1/sellers/mine').expect(200)).body as OwnSeller
  const { sellerId: _id, publicPlace: _place, payouts: _payouts, ...farm } = own
  const moved = { ...farm, street: STREET, phone: PHONE }
  await hatchery.patch('/api/v1/sellers/mine').send(moved).expect(200)
  const owner = await mysql.createConnection({ uri: database.ownerUrl })
  await reshape(owner, 'ALTER TABLE seller CHANGE street street_away varchar(120)')
  await hatchery.patch('/api/v1/sellers/mine').send(moved).expect(500)
  await reshape(owner, 'ALTER TABLE seller CHANGE street_away street varchar(120) NOT NULL')
  await owner.end()
  await server.stop()
}, 90_000)
afterAll(() => desk.close())

describe('what the server writes down of a busy morning', () => {
  it('is one structured line each, in UTC, and holds no secret, no address and no door', () => {
    const lines = server.lines()
    expect(lines.length).toBeGreaterThan(15)
    expect(Object.values(secrets).filter((secret) => secret.length < 6)).toEqual([])
    expect(logFaults(lines)).toEqual([])
  })

  it('has a line for each request, with its number, and one for what broke', () => {
    const lines = server.lines().map((line) => JSON.parse(line))
    const orders = lines.filter((line) => line.req?.path?.endsWith('/orders') && line.res?.status === 201)
    expect(orders).toHaveLength(1)
    expect(orders[0].req.id).toMatch(/^[0-9a-f-]{36}$/)
    const broken = lines.filter((line) => line.level >= 50)
    expect(broken.length).toBeGreaterThan(0)
    expect(JSON.stringify(broken)).toContain('Failed query')
  })

  it('would be noticed to hold one', () => {
    const good = '{"level":30,"time":"2027-01-15T15:00:00.000Z","msg":"fine"}'
    expect(logFaults([good])).toEqual([])
    for (const secret of Object.values(secrets))
      expect(logFaults([good.replace('fine', secret)])).not.toEqual([])
    for (const line of [
      'not JSON',
      '{"level":30}',
      good.replace('Z', '+01:00'),
      good.replace('fine', '\\nparams: 1'),
    ])
      expect(logFaults([line])).not.toEqual([])
  })
})
