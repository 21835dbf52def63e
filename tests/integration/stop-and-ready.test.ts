import { randomUUID } from 'node:crypto'
import { request } from 'node:http'

import { isNull } from 'drizzle-orm'
import mysql from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { outbox } from '@/db/schema/outbox'
import { reserveBody, roomyWindow } from '@/tests/support/desk-ground'
import type { ServerProcess } from '@/tests/support/server-process'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'
import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const pause = (ms: number) => new Promise((done) => setTimeout(done, ms))

let database: TestDatabase
let desk: StandingDesk
beforeAll(async () => {
  database = await freshDatabase('stop_and_ready')
  desk = await openStandingDesk(database)
})
afterAll(() => desk.close())

/**
 * One request on a line of its own. null: nobody listens there any more; a line that the kernel had taken and the server
 * had not yet is reset when listening ends, and whoever stands before two servers asks the other one, as for a refusal.
 */
function ask(origin: string, path: string): Promise<number | null> {
  return new Promise((done, fail) => {
    const asked = request(`${origin}${path}`, { agent: false }, (reply) => {
      reply.resume().once('end', () => done(reply.statusCode ?? 0))
      reply.once('error', fail)
    })
    asked.once('error', (error: NodeJS.ErrnoException) =>
      ['ECONNREFUSED', 'ECONNRESET'].includes(error.code ?? '') ? done(null) : fail(error),
    )
    asked.end()
  })
}

describe('a server that is asked to stop', () => {
  it('answers what it has begun, lets its effects go, and is gone within ten seconds', async () => {
    const server = await desk.start()
    const batch = await desk.batch('stopping', { body: roomyWindow(5) })
    const [cookie = ''] = await desk.cookies(['bea@example.org'])
    await desk.fake.control('faults', { kind: 'slow', match: 'POST /v1/checkout', ms: 1500 })
    const buyer = desk.agent(server, cookie)
    const running = buyer
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set({ 'idempotency-key': randomUUID() })
      .send(reserveBody(batch))
      .then((reply) => reply)
    await pause(500)
    const began = Date.now()
    const [how, reply] = await Promise.all([server.stop(), running])
    expect(how).toEqual({ code: 0, signal: null })
    expect(Date.now() - began).toBeLessThan(10_000)
    expect(reply.status, reply.text).toBe(201)
    const claimed = await desk.db.select().from(outbox).where(isNull(outbox.doneAt))
    // Nothing is held longer than a claim: whoever starts next goes on at once.
    expect(claimed.every((row) => row.runAfter.getTime() < Date.now() + 7000)).toBe(true)
  })

  it('loses no request when two servers are restarted in turn under load', async () => {
    const ports = [desk.port, undefined]
    const servers = await Promise.all(ports.map((port) => desk.start({ port })))
    const failed: string[] = []
    let answered = 0
    let running = true
    const load = async (from: number) => {
      for (let turn = from; running; turn++) {
        const order = [servers[turn % 2], servers[(turn + 1) % 2]]
        let status: number | null = null
        for (const server of order) {
          if (server && status === null)
            status = await ask(server.origin, '/api/v1/places?q=Cin').catch((error: Error) => {
              failed.push(error.message)
              return 0
            })
        }
        if (status === 200) answered += 1
        else failed.push(String(status))
        await pause(60)
      }
    }
    const loads = [0, 1, 2].map(load)
    for (let restart = 0; restart < 4; restart++) {
      await pause(300)
      const at = restart % 2
      const old = servers[at] as ServerProcess
      expect((await old.stop()).code).toBe(0)
      servers[at] = await desk.start({ port: old.port })
    }
    running = false
    await Promise.all(loads)
    await Promise.all(servers.map((server) => server.stop()))
    expect(failed).toEqual([])
    expect(answered).toBeGreaterThan(100)
  }, 60_000)
})

describe('whether it can serve', () => {
  it('says what is missing, and that it is alive all the same', async () => {
    const server = await desk.start()
    const visitor = desk.agent(server)
    const ready = await visitor.get('/readyz').expect(200)
    expect(ready.body).toEqual({ ready: true, lateEffects: 0 })
    const owner = await mysql.createConnection({ uri: database.ownerUrl })
    const [kept] = await owner.query('SELECT * FROM __drizzle_migrations ORDER BY id DESC LIMIT 1')
    const last = (kept as { id: number; hash: string; created_at: number }[])[0]
    await owner.query('DELETE FROM __drizzle_migrations WHERE id = ?', [last?.id])
    expect((await visitor.get('/readyz').expect(503)).body).toEqual({ ready: false, missing: ['migrations'] })
    await owner.query('INSERT INTO __drizzle_migrations SET ?', [last])
    await owner.query('RENAME TABLE call_count TO call_count_away')
    expect((await visitor.get('/readyz').expect(503)).body).toEqual({ ready: false, missing: ['database'] })
    await visitor.get('/healthz').expect(200)
    await owner.query('RENAME TABLE call_count_away TO call_count')
    await owner.end()
    await visitor.get('/readyz').expect(200)
    await server.stop()
  })

  it('refuses to start in production with a place to die at', async () => {
    const server = await desk.start({
      port: undefined,
      awaited: false,
      environment: {
        NODE_ENV: 'production',
        PUBLIC_ORIGIN: 'https://farms.test',
        STRIPE_API_BASE: undefined,
        FAIL_POINT: 'mail:called',
      },
    })
    expect((await server.ended).code).toBe(1)
    expect(server.lines().join('\n')).toContain('FAIL_POINT is for local work only')
  })
})
