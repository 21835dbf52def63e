import { mkdirSync, readdirSync, writeFileSync } from 'node:fs'
import { createServer, get, type IncomingMessage, type OutgoingHttpHeaders, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import path from 'node:path'

import express from 'express'
import mysql from 'mysql2/promise'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { buildApp } from '@/server/app'
import { openAuth } from '@/server/auth/auth'
import { headerFaults, type Answered } from '@/tests/checks/judge-headers'
import { openBrowser, type TestBrowser } from '@/tests/support/browser'
import type { DeskBatch } from '@/tests/support/desk-ground'
import { isSlice, reportFigure } from '@/tests/support/report-figure'
import type { ServerProcess } from '@/tests/support/server-process'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'
import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const SITE = 'https://farms.test'
const DIST = path.resolve('dist')
const PHOTO = `${'a'.repeat(32)}-320.webp`
const HOSTILE = [
  'null',
  'https://farms.test.elsewhere.example',
  'https://notfarms.test',
  'https://farms.test:8443',
  'http://farms.test',
  'https://www.farms.test',
]

let database: TestDatabase
let desk: StandingDesk
let batch: DeskBatch
let live: ServerProcess

beforeAll(async () => {
  database = await freshDatabase('check_headers')
  desk = await openStandingDesk(database)
  batch = await desk.batch('headers')
  mkdirSync(desk.uploadDir, { recursive: true })
  writeFileSync(path.join(desk.uploadDir, PHOTO), 'a photo')
  live = await desk.start({
    port: undefined,
    environment: {
      NODE_ENV: 'production',
      PUBLIC_ORIGIN: SITE,
      STRIPE_API_BASE: undefined,
      STRIPE_SECRET_KEY: 'sk_live_of_nobody',
      STRIPE_WEBHOOK_SECRET: 'whsec_of_nobody_at_all',
      JOBS: 'off',
    },
  })
})
afterAll(() => desk.close())

type Call = [kind: string, address: string, more?: RequestInit, status?: number]

const ours = { origin: SITE, 'x-tankward': '1' }
const json = (body: string): RequestInit => ({
  method: 'POST',
  headers: { ...ours, 'content-type': 'application/json' },
  body,
})

function firstFile(folder: string, ending: RegExp): string {
  const found = readdirSync(path.join(DIST, folder), { recursive: true, encoding: 'utf8' })
  const name = found.sort().find((one) => ending.test(one))
  if (!name) throw new Error(`the exported web app has no file like ${ending}`)
  return `/${path.posix.join(folder, name)}`
}

/** One answer of every kind this server can give, with the status that proves that it was that kind. */
function everyKind(): Call[] {
  const script = firstFile('_expo/static/js/web', /^entry-.*\.js$/)
  return [
    ['page', '/', {}, 200],
    ['page of a listing', `/listings/${batch.publicId}`, {}, 200],
    ['page that is not there', '/no/such/page', {}, 200],
    ['script', script, {}, 200],
    ['script, packed', script, { headers: { 'accept-encoding': 'br' } }, 200],
    ['font', firstFile('fonts', /\.woff2$/), {}, 200],
    ['style', '/global.css', {}, 200],
    ['manifest', '/manifest.webmanifest', {}, 200],
    ['icon', '/icon-192.png', {}, 200],
    ['robots', '/robots.txt', {}, 200],
    ['sitemap', '/sitemap.xml', {}, 200],
    ['file that is not there', '/no-such-file.js', {}, 404],
    ['head of a page', '/', { method: 'HEAD' }, 200],
    ['options', '/api/v1/me', { method: 'OPTIONS' }],
    ['api', '/api/v1/me', {}, 200],
    ['search', '/api/v1/listings?near=45202', {}, 200],
    ['auth', '/api/auth/get-session', {}, 200],
    ['auth, nothing there', '/api/auth/no-such-thing', {}, 404],
    ['redirect', '/api/auth/verify-email?token=nothing&callbackURL=/', { redirect: 'manual' }, 302],
    ['body that is no JSON', '/api/v1/sellers', json('{"farmName": '), 400],
    ['not signed in', '/api/v1/orders', {}, 401],
    ['forged', '/api/v1/sellers', { method: 'POST', headers: { origin: 'https://elsewhere.example' } }, 403],
    ['unknown path of the api', '/api/v1/nothing', {}, 404],
    ['unreadable path', '/api/v1/listings/%E0%A4%A', {}],
    ['too large', '/api/v1/sellers', json(JSON.stringify('x'.repeat(300_000))), 413],
    [
      'form post',
      '/api/v1/sellers',
      { method: 'POST', headers: { ...ours, 'content-type': 'text/plain' }, body: 'a' },
      415,
    ],
    ['fields at fault', '/api/v1/listings?limit=many', {}, 422],
    ['webhook unsigned', '/api/v1/stripe-events', json('{}'), 400],
    ['photo', `/photos/${PHOTO}`, {}, 200],
    ['photo that is not there', `/photos/${'b'.repeat(32)}-320.webp`, {}, 404],
    ['leaving a list, forged', '/unsubscribe/forged', {}, 404],
    ['alive', '/healthz', {}, 200],
    ['ready', '/readyz', {}, 200],
  ]
}

async function answer(origin: string, [kind, address, more]: Call): Promise<Answered> {
  const { headers, status, body } = await fetch(`${origin}${address}`, more)
  await body?.cancel()
  return { kind, status, headers }
}

/** By plain HTTP: fetch adds `cache-control: no-cache` to a conditional request, and then nothing is ever unchanged. */
async function unchangedPage(): Promise<Answered> {
  const ask = (headers: OutgoingHttpHeaders) =>
    new Promise<IncomingMessage>((done, fail) => {
      get(`${live.origin}/`, { headers }, (reply) => done(reply.resume())).once('error', fail)
    })
  const first = await ask({})
  const { statusCode, headers } = await ask({ 'if-none-match': first.headers.etag })
  const plain = Object.entries(headers).map(([name, value]) => [name, String(value)] as [string, string])
  return { kind: 'not changed', status: statusCode ?? 0, headers: new Headers(plain) }
}

/** Kinds that need a state first: not changed, too often, broken inside. */
async function kindsOfTrouble(): Promise<Answered[]> {
  const unchanged = await unchangedPage()
  const busy = { headers: { 'x-forwarded-for': '10.9.9.9' } }
  let often: Answered | undefined
  for (let search = 0; search <= 121 && often?.status !== 429; search++)
    often = await answer(live.origin, [
      'too often',
      '/api/v1/listing-pins?south=1&north=2&west=1&east=2&zoom=8',
      busy,
    ])
  const owner = await mysql.createConnection({ uri: database.ownerUrl })
  await owner.query('RENAME TABLE zip_place TO zip_place_away')
  const broken = await answer(live.origin, ['broken inside', '/api/v1/places?q=45211', {}])
  await owner.query('RENAME TABLE zip_place_away TO zip_place')
  await owner.end()
  expect([unchanged.status, often?.status, broken.status]).toEqual([304, 429, 500])
  return [unchanged, ...(often ? [often] : []), broken]
}

/** The product in this process, with one header of each answer taken away or put in. */
async function spoilt(spoil: (res: express.Response) => void): Promise<Server> {
  openAuth({ secret: 'headers-check-'.repeat(4), origin: SITE, alsoTrusted: [] })
  const outer = express()
  outer.disable('x-powered-by')
  outer.use((_req, res, next) => {
    const write = res.writeHead.bind(res)
    res.writeHead = ((...said: Parameters<typeof write>) => {
      spoil(res)
      return write(...said)
    }) as typeof res.writeHead
    next()
  })
  outer.use(buildApp({ origins: [SITE], https: true, webDir: DIST, trustProxyHops: 0 }))
  const server = createServer(outer)
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done))
  return server
}

const SPOILS: [what: string, spoil: (res: express.Response) => void][] = [
  ['no policy', (res) => res.removeHeader('content-security-policy')],
  ['no nosniff', (res) => res.removeHeader('x-content-type-options')],
  ['no referrer policy', (res) => res.removeHeader('referrer-policy')],
  ['no HSTS', (res) => res.removeHeader('strict-transport-security')],
  ['no frame guard', (res) => res.removeHeader('x-frame-options')],
  ['open to others', (res) => res.setHeader('access-control-allow-origin', '*')],
  [
    'loose scripts',
    (res) => res.setHeader('content-security-policy', "default-src 'self'; script-src 'unsafe-inline'"),
  ],
]

describe('headers of every answer', () => {
  it('are all there on every kind of answer, in production', async () => {
    const answers: Answered[] = []
    const wrongKind: string[] = []
    for (const call of everyKind()) {
      const given = await answer(live.origin, call)
      answers.push(given)
      if (call[3] !== undefined && call[3] !== given.status)
        wrongKind.push(`${call[0]}: ${given.status}, not ${call[3]}`)
    }
    answers.push(...(await kindsOfTrouble()))
    const faults = answers.flatMap((one) => headerFaults(one, true))
    await reportFigure({
      id: 'SEC-1-kinds',
      figure: answers.length,
      bar: '>= 30',
      pass: answers.length >= 30,
    })
    await reportFigure({
      id: 'SEC-1-header-faults',
      figure: faults.length,
      bar: 0,
      pass: faults.length === 0,
    })
    expect(wrongKind).toEqual([])
    expect(faults).toEqual([])
  })

  it('let no other origin in', async () => {
    const asked: [string, RequestInit][] = [
      ['/api/v1/me', {}],
      ['/api/v1/listings?near=45202', {}],
      ['/api/auth/get-session', {}],
      ['/api/v1/sellers', { method: 'OPTIONS', headers: { 'access-control-request-method': 'POST' } }],
      [
        '/api/auth/sign-in/email',
        { method: 'OPTIONS', headers: { 'access-control-request-method': 'POST' } },
      ],
      ['/api/v1/sellers', json('{}')],
    ]
    const letIn: string[] = []
    let count = 0
    for (const origin of HOSTILE)
      for (const [address, more] of asked) {
        const given = await answer(live.origin, [
          origin,
          address,
          { ...more, headers: { ...more.headers, origin } },
        ])
        count += 1
        const isOpen =
          given.headers.has('access-control-allow-origin') ||
          given.headers.has('access-control-allow-credentials')
        if (isOpen) letIn.push(`${origin} ${address}`)
        if (more.method === 'POST' && given.status !== 403)
          letIn.push(`${origin} ${address}: ${given.status}`)
      }
    await reportFigure({
      id: 'SEC-1-hostile-origins',
      figure: letIn.length,
      bar: 0,
      pass: letIn.length === 0,
    })
    expect(count).toBe(36)
    expect(letIn).toEqual([])
  })

  it('are missed when one is dropped', async () => {
    const unnoticed: string[] = []
    for (const [what, spoil] of SPOILS) {
      const server = await spoilt(spoil)
      const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
      const calls = everyKind().filter(([kind]) =>
        ['page', 'script', 'api', 'not signed in', 'ready'].includes(kind),
      )
      for (const call of calls) {
        const faults = headerFaults(await answer(origin, call), true)
        if (faults.length === 0) unnoticed.push(`${what} on ${call[0]}`)
      }
      await new Promise((done) => server.close(done))
    }
    const pass = unnoticed.length === 0
    await reportFigure({ id: 'SEC-1-control', figure: unnoticed.length, bar: 0, pass })
    expect(unnoticed).toEqual([])
  })
})

describe('the policy in a browser', () => {
  let browser: TestBrowser
  let server: ServerProcess
  beforeAll(async () => {
    server = await desk.start()
    browser = await openBrowser()
  })
  afterAll(() => browser.close())

  async function watched(): Promise<{ page: Page; broken: string[] }> {
    const page = await browser.openPage({ origin: server.origin })
    const broken: string[] = []
    await page.exposeFunction('tellViolation', (what: string) => void broken.push(what))
    await page.addInitScript(() => {
      document.addEventListener('securitypolicyviolation', (event) => {
        const tell = (window as unknown as { tellViolation: (what: string) => void }).tellViolation
        tell(`${event.violatedDirective} ${event.blockedURI} on ${location.pathname}`)
      })
    })
    page.on('console', (message) => {
      if (/content security policy|trusted ?type/i.test(message.text())) broken.push(message.text())
    })
    return { page, broken }
  }

  it('is broken by none of the main pages, and is noticed when it is', async () => {
    const { page, broken } = await watched()
    const all = [
      '/',
      '/?near=45202',
      `/listings/${batch.publicId}`,
      '/sign-in',
      '/about',
      '/me',
      '/orders',
      '/sell',
      '/no/such/page',
    ]
    const paths = isSlice ? all.slice(0, 4) : all
    for (const address of paths) {
      await page.goto(address, { waitUntil: 'networkidle' })
      expect((await page.title()).length, address).toBeGreaterThan(0)
    }
    const found = [...broken]
    await page.evaluate(() => {
      const script = document.createElement('img')
      script.src = 'http://127.0.0.1:9/elsewhere.png'
      document.body.append(script)
    })
    await page.waitForTimeout(300)
    const noticed = broken.length > found.length
    await reportFigure({
      id: 'SEC-1-policy-violations',
      figure: found.length,
      bar: 0,
      pass: found.length === 0,
    })
    await reportFigure({ id: 'SEC-1-control-policy', figure: noticed ? 1 : 0, bar: 1, pass: noticed })
    expect(found).toEqual([])
    expect(noticed).toBe(true)
  })
})
