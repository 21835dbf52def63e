import { randomUUID } from 'node:crypto'

import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { order } from '@/db/schema/orders'
import { outbox } from '@/db/schema/outbox'
import { ledgerGroup } from '@/db/schema/payments'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody, roomyWindow } from '@/tests/support/desk-ground'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { startOwnDatabase, type OwnDatabase } from '@/tests/support/own-database'
import type { ServerProcess } from '@/tests/support/server-process'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'

const pause = (ms: number) => new Promise((done) => setTimeout(done, ms))
const keyed = () => ({ 'idempotency-key': randomUUID() })

interface Seen {
  path: string
  /** When it was asked. */
  at: number
  tookMs: number
  status: number
  kind: string
}

let database: OwnDatabase
let desk: StandingDesk
let server: ServerProcess
const seen: Seen[] = []
const acknowledged: string[] = []

async function look(agent: TestAgent, path: string): Promise<void> {
  const at = Date.now()
  const reply = await agent.get(path)
  const kind = String(reply.headers['content-type'])
  seen.push({ path, at, tookMs: Date.now() - at, status: reply.status, kind })
}

const between = (path: string, from: number, until: number) =>
  seen.filter((one) => one.path.startsWith(path) && one.at >= from && one.at < until)

describe('the database dies under the running server and comes back', () => {
  let diedAt = 0
  let backAt = 0
  let askedOrder = ''

  beforeAll(async () => {
    database = await startOwnDatabase('database-away')
    desk = await openStandingDesk(database)
    server = await desk.start()
    const batch = await desk.batch('plenty', { free: 5000, body: roomyWindow(100) })
    const asks = await desk.batch('asks', { body: { accept: 'ask' } })
    const buyers = await desk.cookies(Array.from({ length: 60 }, (_, n) => `buyer${n}@example.org`))
    const buyer = desk.agent(server, buyers[0])
    const hatchery = desk.agent(server, await desk.cookieOf(desk.hatchery.memberId))
    const held = await buyer
      .post(`/api/v1/listings/${asks.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(asks))
    expect(held.status, JSON.stringify(held.body)).toBe(201)
    askedOrder = (held.body as ShownOrder).orderId
    await desk.fake.pay((held.body as ShownOrder).payUrl ?? '', '4242424242424242')
    await vi.waitFor(
      async () => expect((await buyer.get(`/api/v1/orders/${askedOrder}`)).body.state).toBe('requested'),
      { timeout: 10_000, interval: 100 },
    )

    let running = true
    const visitor = desk.agent(server, buyers[1])
    const watch = async (path: string) => {
      while (running) {
        await look(visitor, path)
        await pause(60)
      }
    }
    const buy = async () => {
      for (const cookie of buyers.slice(2)) {
        if (!running) return
        const reply = await desk
          .agent(server, cookie)
          .post(`/api/v1/listings/${batch.publicId}/orders`)
          .set(keyed())
          .send(reserveBody(batch))
        if (reply.status === 201) acknowledged.push((reply.body as ShownOrder).orderId)
        await pause(150)
      }
    }
    const busy = [
      watch('/readyz'),
      watch('/healthz'),
      watch('/api/v1/listings?near=45202'),
      watch('/api/v1/me'),
      buy(),
    ]
    await pause(1000)
    // The capture is at the processor, and slow, when the database goes.
    await desk.fake.control('faults', { kind: 'slow-reply', match: 'POST /v1/payment_intents', ms: 1200 })
    const acceptance = hatchery.post(`/api/v1/orders/${askedOrder}/acceptance`).set(keyed()).send({})
    const accepting = acceptance.then((reply) => reply)
    await pause(500)
    diedAt = Date.now()
    await database.kill()
    await accepting
    await pause(diedAt + 3500 - Date.now())
    const goesUp = database.startAgain()
    await goesUp
    backAt = Date.now()
    await pause(9000)
    running = false
    await Promise.all(busy)
  }, 90_000)
  afterAll(() => desk.close())

  it('says 503 as a problem within two seconds while the database is away, and never anything else', () => {
    const answers = [
      ...between('/api/v1/listings', diedAt + 200, diedAt + 3500),
      ...between('/api/v1/me', diedAt + 200, diedAt + 3500),
    ]
    expect(answers.length).toBeGreaterThan(6)
    const odd = answers.filter(
      (one) => one.status !== 503 || !one.kind.includes('application/problem+json') || one.tookMs > 2000,
    )
    // Search keeps its overview in memory: an answer from there is no fault.
    expect(odd.filter((one) => !(one.status === 200 && one.path.startsWith('/api/v1/listings')))).toEqual([])
  })

  it('is alive all the time, and ready only while it can serve', () => {
    const alive = between('/healthz', 0, Infinity)
    expect(alive.length).toBeGreaterThan(20)
    expect(alive.filter((one) => one.status !== 200)).toEqual([])
    const away = between('/readyz', diedAt + 2000, diedAt + 3500)
    expect(away.length).toBeGreaterThan(0)
    expect(new Set(away.map((one) => one.status))).toEqual(new Set([503]))
    const back = between('/readyz', backAt + 5000, Infinity)
    expect(back.length).toBeGreaterThan(5)
    expect(new Set(back.map((one) => one.status))).toEqual(new Set([200]))
  })

  it('shows no 5xx any more five seconds after the database is back', () => {
    const after = between('/', backAt + 5000, Infinity)
    expect(after.length).toBeGreaterThan(40)
    expect(after.filter((one) => one.status >= 500)).toEqual([])
  })

  it('has kept every order that it had acknowledged', async () => {
    expect(acknowledged.length).toBeGreaterThan(10)
    const kept = new Set((await desk.db.select({ id: order.publicId }).from(order)).map((row) => row.id))
    expect(acknowledged.filter((id) => !kept.has(id))).toEqual([])
  })

  it('does the effect that was caught in the middle exactly once', async () => {
    const [row] = await desk.db.select().from(order).where(eq(order.publicId, askedOrder))
    const captures = await desk.db
      .select()
      .from(ledgerGroup)
      .where(eq(ledgerGroup.orderId, row?.id ?? 0))
    expect(captures.filter((group) => group.kind === 'capture')).toHaveLength(1)
    expect(row?.state).toBe('scheduled')
    const [effect] = await desk.db.select().from(outbox).where(eq(outbox.kind, 'capture-deposit'))
    expect(effect?.doneAt).not.toBeNull()
    expect(effect?.attempts).toBeGreaterThan(1)
    expect(await brokenInvariants(desk.db)).toEqual([])
  })
})
