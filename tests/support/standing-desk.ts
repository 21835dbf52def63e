import { randomInt } from 'node:crypto'
import { once } from 'node:events'
import { mkdtemp, rm } from 'node:fs/promises'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'

import request from 'supertest'
import type TestAgent from 'supertest/lib/agent'

import { connect, db, disconnect, type Database } from '@/db/client'
import { startTestFake, type TestFake } from '@/payments/fake/fake-for-tests'
import { configurePayments } from '@/payments/stripe'
import { tryPort } from '@/scripts/ports.mjs'
import { buildMembers } from '@/seed/build-member'
import type { BuiltSeller } from '@/seed/build-seller'
import { setClockOffset } from '@/server/clock'
import { log } from '@/server/log'
import { openMailBox, type MailBox } from '@/server/mail/catcher/mail-box'
import { receiveMail } from '@/server/mail/catcher/receive-mail'
import {
  layGround,
  openBatch,
  openHatchery,
  type BatchWish,
  type DeskBatch,
} from '@/tests/support/desk-ground'
import { startServerProcess, type ServerProcess, type ServerWish } from '@/tests/support/server-process'
import { openSessions } from '@/tests/support/session-cookie'
import type { TestDatabase } from '@/tests/support/test-database'

const WEBHOOK_SECRET = 'whsec_standing_desk'
const AUTH_SECRET = 'standing-desk-secret-'.repeat(3)

export interface StandingDesk {
  db: Database
  fake: TestFake
  mails: MailBox
  hatchery: BuiltSeller
  batch: (name: string, wish?: BatchWish) => Promise<DeskBatch>
  /** Built members with a session each, as cookies. */
  cookies: (emails: string[]) => Promise<string[]>
  /** A session of a member who exists already. */
  cookieOf: (memberId: string) => Promise<string>
  /** Speaks to a server as one browser; without a cookie as a visitor. */
  agent: (server: Pick<ServerProcess, 'origin'>, cookie?: string) => TestAgent
  /** One more server process on the same database; the processor's events go to the first port. */
  start: (more?: Partial<ServerWish>) => Promise<ServerProcess>
  port: number
  /** What the servers sign sessions with. */
  authSecret: string
  origin: string
  smtpUrl: string
  /** Where the servers keep their photos. */
  uploadDir: string
  close: () => Promise<void>
}

/**
 * Database, practice processor and mail catcher standing beside servers that are processes of their own: they can be
 * killed while everything else goes on.
 */
export async function openStandingDesk(database: TestDatabase): Promise<StandingDesk> {
  log.level = 'silent'
  setClockOffset(0)
  connect(database.url)
  const port = (await tryPort(0)) ?? 0
  const origin = `http://127.0.0.1:${port}`
  const folder = await mkdtemp(path.join(tmpdir(), 'tankward-desk-'))
  const mails = await openMailBox(path.join(folder, 'mail'))
  const smtp = receiveMail(mails)
  smtp.on('error', () => undefined)
  await once(smtp.listen(0, '127.0.0.1'), 'listening')
  const smtpUrl = `smtp://127.0.0.1:${(smtp.server.address() as AddressInfo).port}`
  const fake = await startTestFake({
    webhookUrl: `${origin}/api/v1/stripe-events`,
    webhookSecret: WEBHOOK_SECRET,
    platformOrigin: origin,
    openingBalanceCents: 1_000_000,
  })
  const key = 'sk_test_standing_desk'
  configurePayments({
    secretKey: key,
    webhookSecret: WEBHOOK_SECRET,
    host: '127.0.0.1',
    port: fake.port,
    protocol: 'http',
  })
  await layGround(db())
  const hatchery = await openHatchery(db(), fake)
  const running: ServerProcess[] = []
  const uploadDir = path.join(folder, 'uploads')
  const environment = {
    NODE_ENV: 'development',
    PUBLIC_ORIGIN: origin,
    DATABASE_URL: database.url,
    AUTH_SECRET,
    STRIPE_SECRET_KEY: key,
    STRIPE_WEBHOOK_SECRET: WEBHOOK_SECRET,
    STRIPE_API_BASE: fake.origin,
    SMTP_URL: smtpUrl,
    UPLOAD_DIR: uploadDir,
    WEB_DIR: path.resolve('dist'),
    TRUST_PROXY_HOPS: '1',
  }
  const open = (memberIds: string[]) => openSessions(db(), AUTH_SECRET, memberIds)
  return {
    db: db(),
    fake,
    mails,
    hatchery,
    port,
    origin,
    smtpUrl,
    authSecret: AUTH_SECRET,
    uploadDir,
    batch: (name, wish = {}) => openBatch(db(), { seller: hatchery, name, ...wish }),
    cookies: async (emails) => {
      const members = await buildMembers(
        db(),
        emails.map((email) => ({ email })),
      )
      return open(members.map(({ memberId }) => memberId))
    },
    cookieOf: async (memberId) => (await open([memberId]))[0] ?? '',
    agent: (server, cookie) => {
      const from = `10.${randomInt(256)}.${randomInt(256)}.${randomInt(1, 255)}`
      return request.agent(server.origin).set({
        origin,
        'x-tankward': '1',
        'x-forwarded-for': from,
        ...(cookie ? { cookie } : {}),
      }) as unknown as TestAgent
    },
    start: async (more = {}) => {
      const server = await startServerProcess({
        port,
        ...more,
        environment: { ...environment, ...more.environment },
      })
      running.push(server)
      void server.ended.then(() => running.splice(running.indexOf(server), 1))
      return server
    },
    close: async () => {
      await Promise.all(running.map((server) => server.kill()))
      await fake.stop()
      await new Promise<void>((done) => smtp.close(() => done()))
      await disconnect()
      await database.drop()
      await rm(folder, { recursive: true, force: true })
    },
  }
}
