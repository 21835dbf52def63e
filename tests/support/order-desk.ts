import { randomInt, randomUUID } from 'node:crypto'
import type { Server } from 'node:http'
import type { AddressInfo } from 'node:net'

import { sql } from 'drizzle-orm'
import type { Express } from 'express'
import request from 'supertest'
import type TestAgent from 'supertest/lib/agent'

import { connect, db, disconnect, type Database } from '@/db/client'
import { configurePayments } from '@/payments/stripe'
import { startTestFake, type TestFake } from '@/payments/fake/fake-for-tests'
import { BUILT_PASSWORD, buildMember, type BuiltMember } from '@/seed/build-member'
import type { BuiltSeller } from '@/seed/build-seller'
import { buildApp } from '@/server/app'
import { openAuth } from '@/server/auth/auth'
import { setClockOffset } from '@/server/clock'
import { ringClocks } from '@/server/jobs/ring-clocks'
import { log } from '@/server/log'
import type { Letter } from '@/server/mail/letter'
import { configureUnsubscribe } from '@/server/mail/unsubscribe-token'
import { configureOrders } from '@/server/orders/order-settings'
import { registerDoers } from '@/server/outbox/doers'
import { finishEffect } from '@/server/outbox/outbox-store'
import { registerDoer, runEffects } from '@/server/outbox/run-effects'
import type { ShownOrder } from '@/shared/contracts/orders'
import {
  HATCHERY_EMAIL,
  layGround,
  openBatch,
  openHatchery,
  type BatchWish,
  type DeskBatch,
} from '@/tests/support/desk-ground'
import { totpOf } from '@/tests/support/totp'
import { freshDatabase } from '@/tests/support/test-database'

const ORIGIN = 'http://127.0.0.1:8080'
const WEBHOOK_SECRET = 'whsec_order_desk_tests'
const PASSES = 80

export interface OrderDesk {
  db: Database
  fake: TestFake
  letters: Letter[]
  hatchery: BuiltSeller
  hatcheryEmail: string
  /** A live batch of the hatchery. */
  batch: (name: string, wish?: BatchWish) => Promise<DeskBatch>
  member: (email: string) => Promise<BuiltMember>
  signedIn: (email: string) => Promise<TestAgent>
  visitor: () => TestAgent
  /** Signed in with the second factor that staff must have. */
  staff: (email: string) => Promise<TestAgent>
  /** Runs effects and lets webhooks arrive until nothing waits any more. */
  quiet: () => Promise<void>
  /** Moves domain time and rings what is due. */
  travelTo: (at: Date) => Promise<void>
  /** The same, leaving effects and webhooks where they are. */
  travelToWithoutRest: (at: Date) => Promise<void>
  /** Pays an open payment page as a person does. */
  pay: (order: ShownOrder, card?: string) => Promise<void>
  /** The mounted application itself, to see what it answers to. */
  app: Express
  close: () => Promise<void>
}

export const keyed = (key: string = randomUUID()) => ({ 'idempotency-key': key })

/** The whole server in this process on its own database, with the practice processor beside it over real HTTP. */
export async function openOrderDesk(label: string, webDir = 'nowhere'): Promise<OrderDesk> {
  log.level = 'silent'
  const database = await freshDatabase(label)
  connect(database.url)
  setClockOffset(0)
  openAuth({ secret: 'test-secret-'.repeat(4), origin: ORIGIN, alsoTrusted: [] })
  configureOrders({ origin: ORIGIN, feeBp: 600 })
  configureUnsubscribe({ origin: ORIGIN, secret: 'test-secret-'.repeat(4) })
  const letters: Letter[] = []
  registerDoers()
  registerDoer('mail', async (effect) => {
    letters.push(effect.body.letter as Letter)
    await finishEffect(effect.seq)
  })
  const app = buildApp({ origins: [ORIGIN], https: false, webDir, trustProxyHops: 1 })
  const server = await new Promise<Server>((done, fail) => {
    const listening = app.listen(0, '127.0.0.1', (error) => (error ? fail(error) : done(listening)))
  })
  const { port } = server.address() as AddressInfo
  const fake = await startTestFake({
    webhookUrl: `http://127.0.0.1:${port}/api/v1/stripe-events`,
    webhookSecret: WEBHOOK_SECRET,
    platformOrigin: ORIGIN,
    openingBalanceCents: 100_000,
  })
  configurePayments({
    secretKey: 'sk_test_order_desk',
    webhookSecret: WEBHOOK_SECRET,
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
  })

  const base = db()
  await layGround(base)
  const hatcheryEmail = HATCHERY_EMAIL
  const hatchery = await openHatchery(base, fake)

  const visitor = (): TestAgent => {
    const from = `10.${randomInt(256)}.${randomInt(256)}.${randomInt(1, 255)}`
    return request
      .agent(server)
      .set({ origin: ORIGIN, 'x-tankward': '1', 'x-forwarded-for': from }) as unknown as TestAgent
  }
  const signedIn = async (email: string): Promise<TestAgent> => {
    const agent = visitor()
    await agent.post('/api/auth/sign-in/email').send({ email, password: BUILT_PASSWORD }).expect(200)
    return agent
  }
  const staffAgents = new Map<string, TestAgent>()
  const staff = async (email: string): Promise<TestAgent> => {
    const known = staffAgents.get(email)
    if (known) return known
    const agent = await signedIn(email)
    const begun = await agent
      .post('/api/auth/two-factor/enable')
      .send({ password: BUILT_PASSWORD })
      .expect(200)
    const code = await totpOf((begun.body as { totpURI: string }).totpURI)
    await agent.post('/api/auth/two-factor/verify-totp').send({ code }).expect(200)
    staffAgents.set(email, agent)
    return agent
  }
  const waiting = async (): Promise<number> => {
    // The webhooks first: one that arrives between the two looks has then become a row of the outbox.
    const told = await fetch(`${fake.origin}/_control/state`, {
      headers: { 'x-control-token': 'control-for-tests' },
    })
    const state = (await told.json()) as { waitingWebhooks: number }
    const [rows] = await base.execute(
      sql`select count(*) as n from outbox where done_at is null and dead_at is null and run_after <= utc_timestamp(3)`,
    )
    return Number((rows as unknown as { n: number }[])[0]?.n ?? 0) + state.waitingWebhooks
  }
  const quiet = async (): Promise<void> => {
    for (let pass = 0; pass < PASSES; pass++) {
      await runEffects()
      if ((await waiting()) === 0) return
      await new Promise((done) => setTimeout(done, 25))
    }
    throw new Error('the outbox and the webhooks did not come to rest')
  }
  return {
    db: base,
    app,
    fake,
    letters,
    hatchery,
    hatcheryEmail,
    batch: (name, wish = {}) => openBatch(base, { seller: hatchery, name, ...wish }),
    member: (email) => buildMember(base, { email }),
    visitor,
    signedIn,
    staff,
    quiet,
    travelTo: async (at) => {
      setClockOffset(at.getTime() - Date.now())
      await ringClocks()
      await quiet()
    },
    travelToWithoutRest: async (at) => {
      setClockOffset(at.getTime() - Date.now())
      await ringClocks()
    },
    pay: async (order, card = '4242424242424242') => {
      if (!order.payUrl) throw new Error('the order has no payment page')
      await fake.pay(order.payUrl, card)
      await quiet()
    },
    close: async () => {
      setClockOffset(0)
      await fake.stop()
      await new Promise((done) => server.close(done))
      await disconnect()
      await database.drop()
    },
  }
}
