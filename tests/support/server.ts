import { randomInt, randomUUID } from 'node:crypto'
import { mkdtemp, rm } from 'node:fs/promises'
import type { Server } from 'node:http'
import { tmpdir } from 'node:os'
import path from 'node:path'

import request from 'supertest'
import type TestAgent from 'supertest/lib/agent'

import { connect, db, disconnect, type Database } from '@/db/client'
import { BUILT_PASSWORD } from '@/seed/build-member'
import { buildApp } from '@/server/app'
import { openAuth } from '@/server/auth/auth'
import { setClockOffset } from '@/server/clock'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { log } from '@/server/log'
import { configureUnsubscribe } from '@/server/mail/unsubscribe-token'
import { configureOrders } from '@/server/orders/order-settings'
import { configurePhotos } from '@/server/photos/photo-files'
import { forgetPlaces } from '@/server/places/find-place'
import { freshDatabase } from '@/tests/support/test-database'
import { totpOf } from '@/tests/support/totp'

const TEST_ORIGIN = 'http://127.0.0.1:8080'
/** The trade's clock in tests: a Friday morning in Ohio. It runs on from here in real time. */
export const TEST_NOW = '2027-01-15T15:00:00.000Z'

export interface TestServer {
  db: Database
  /** Where uploaded photos land. */
  uploadDir: string
  /** A visitor. Each has an address of its own, so that call limits do not mix. */
  visitor: () => TestAgent
  /** Signs in through the real sign-in; `secondFactor` sets one up and passes it, as staff must. */
  signedIn: (email: string, more?: { secondFactor?: boolean }) => Promise<TestAgent>
  close: () => Promise<void>
}

/** The header of a command; a repeat passes the same key. */
export function keyed(key: string = randomUUID()): { 'idempotency-key': string } {
  return { 'idempotency-key': key }
}

async function setUpSecondFactor(agent: TestAgent, password: string): Promise<void> {
  const begun = await agent.post('/api/auth/two-factor/enable').send({ password }).expect(200)
  const code = await totpOf((begun.body as { totpURI: string }).totpURI)
  await agent.post('/api/auth/two-factor/verify-totp').send({ code }).expect(200)
}

/** The product on a database of its own, answering on a free port. `label`: lower case words with underscores. */
export async function openTestServer(label: string): Promise<TestServer> {
  log.level = 'silent'
  setClockOffset(Date.parse(TEST_NOW) - Date.now())
  const database = await freshDatabase(label)
  connect(database.url)
  openAuth({ secret: 'test-secret-'.repeat(4), origin: TEST_ORIGIN, alsoTrusted: [] })
  configureOrders({ origin: TEST_ORIGIN, feeBp: 600 })
  configureUnsubscribe({ origin: TEST_ORIGIN, secret: 'test-secret-'.repeat(4) })
  configureForecast({ url: null })
  const uploadDir = await mkdtemp(path.join(tmpdir(), 'tankward-test-photos-'))
  configurePhotos({ dir: uploadDir })
  forgetPlaces()
  const app = buildApp({ origins: [TEST_ORIGIN], https: false, webDir: uploadDir, trustProxyHops: 1 })
  const server = await new Promise<Server>((done, fail) => {
    const listening = app.listen(0, '127.0.0.1', (error) => (error ? fail(error) : done(listening)))
  })
  const visitor = (): TestAgent => {
    const from = `10.${randomInt(256)}.${randomInt(256)}.${randomInt(1, 255)}`
    return request
      .agent(server)
      .set({ origin: TEST_ORIGIN, 'x-tankward': '1', 'x-forwarded-for': from }) as unknown as TestAgent
  }
  return {
    db: db(),
    uploadDir,
    visitor,
    signedIn: async (email, more) => {
      const agent = visitor()
      await agent.post('/api/auth/sign-in/email').send({ email, password: BUILT_PASSWORD }).expect(200)
      if (more?.secondFactor) await setUpSecondFactor(agent, BUILT_PASSWORD)
      return agent
    },
    close: async () => {
      await new Promise((done) => server.close(done))
      await disconnect()
      await database.drop()
      await rm(uploadDir, { recursive: true, force: true })
    },
  }
}
