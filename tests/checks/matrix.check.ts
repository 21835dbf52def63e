import { randomUUID } from 'node:crypto'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { eq } from 'drizzle-orm'
import type { Express } from 'express'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { user } from '@/db/schema/auth'
import { listing } from '@/db/schema/listings'
import { notice } from '@/db/schema/notices'
import type { TestFake } from '@/payments/fake/fake-for-tests'
import { openSellerAccount } from '@/payments/open-seller-account'
import { buildBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller } from '@/seed/build-seller'
import { buildApp } from '@/server/app'
import type { Caller } from '@/server/http/caller'
import { newPublicId } from '@/server/new-public-id'
import { configurePhotos } from '@/server/photos/photo-files'
import type { Access, Endpoint } from '@/shared/api/endpoint'
import type { ShownOrder } from '@/shared/contracts/orders'
import {
  accessMatrix,
  ROLES,
  type AccessRow,
  type ObjectKind,
  type Role,
} from '@/tests/checks/access-matrix.facts'
import { openBatch, reserveBody, type DeskBatch } from '@/tests/support/desk-ground'
import { everyEndpoint } from '@/tests/support/every-endpoint'
import { mountedRoutes } from '@/tests/support/mounted-routes'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'
import { reportFigure } from '@/tests/support/report-figure'

/** The guard that is taken out of the running server; empty while the real thing is measured. */
const cut = vi.hoisted(() => ({ guard: '' }))

vi.mock('@/server/http/caller', async (original) => {
  const real = await original<typeof import('@/server/http/caller')>()
  const nobody: Caller = {
    ...{ memberId: '', name: '', email: '', emailVerified: true },
    ...{ roles: ['member'], hasSecondFactor: false, sessionId: '' },
  }
  return {
    ...real,
    admit: (caller: Caller | null, access: Access) => {
      if (cut.guard === 'sign-in') real.admit(caller ?? nobody, access)
      else if (cut.guard === 'role' && caller)
        real.admit({ ...caller, roles: ['member', 'seller', 'admin'] }, access)
      else if (cut.guard === 'second-factor' && caller)
        real.admit({ ...caller, hasSecondFactor: true }, access)
      else real.admit(caller, access)
    },
  }
})
vi.mock('@/server/orders/party-of', async (original) => {
  const real = await original<typeof import('@/server/orders/party-of')>()
  const { readOrder } = await import('@/server/orders/order-store')
  const { Problem } = await import('@/shared/api/problem')
  return {
    ...real,
    orderSeenBy: async (caller: Caller, publicId: string) => {
      const asked = cut.guard === 'order-staff-factor' ? { ...caller, hasSecondFactor: true } : caller
      try {
        const seen = await real.orderSeenBy(asked, publicId)
        return cut.guard === 'order-side' ? { ...seen, party: 'seller' as const } : seen
      } catch (error) {
        const order = await readOrder(publicId)
        if (order && cut.guard === 'order-party') return { order, party: 'buyer' as const }
        if (order && cut.guard === 'order-silence') throw new Problem('not-found', 'This order is not yours.')
        throw error
      }
    },
  }
})
vi.mock('@/server/listings/require-own-listing', async (original) => {
  const real = await original<typeof import('@/server/listings/require-own-listing')>()
  const { findListing } = await import('@/server/listings/listing-store')
  return {
    ...real,
    requireOwnListing: async (...asked: Parameters<typeof real.requireOwnListing>) => {
      const listing = cut.guard === 'own-listing' ? await findListing(asked[1], asked[2]) : undefined
      if (!listing) return real.requireOwnListing(...asked)
      const { requireSeller } = await import('@/server/sellers/require-seller')
      return { listing, seller: await requireSeller(asked[0], asked[2]) }
    },
  }
})
vi.mock('@/server/listings/listing-policy', async (original) => {
  const real = await original<typeof import('@/server/listings/listing-policy')>()
  return {
    ...real,
    isPublic: (listing: Parameters<typeof real.isPublic>[0]) =>
      cut.guard === 'public-listing' || real.isPublic(listing),
  }
})

const GUARDS = [
  'sign-in',
  'role',
  'second-factor',
  'order-party',
  'order-side',
  'order-silence',
  'order-staff-factor',
  'own-listing',
  'public-listing',
]

type Which = 'own' | 'foreign' | 'missing'
type Ids = Record<ObjectKind, Partial<Record<Which, string>>>

const NEVER = 'Z'.repeat(22)

/** The doors below an endpoint's own. */
function lowerDoors(auth: Access): Access[] {
  if (auth === 'public') return []
  return auth === 'member' ? ['public'] : ['public', 'member']
}

let desk: OrderDesk
let agents: Record<Role, TestAgent>
let ids: Ids
let webDir = ''
const calls = new Map<string, { method: string; address: string }>()
let endpoints: [name: string, endpoint: Endpoint][] = []

async function orderOf(batch: DeskBatch, buyer: TestAgent, ending: 'left' | 'agreed'): Promise<string> {
  const reply = await buyer
    .post(`/api/v1/listings/${batch.publicId}/orders`)
    .set(keyed())
    .send(reserveBody(batch))
  expect(reply.status, JSON.stringify(reply.body)).toBe(201)
  const order = reply.body as ShownOrder
  if (ending === 'agreed') await desk.pay(order)
  else await buyer.post(`/api/v1/orders/${order.orderId}/departure`).set(keyed()).send({}).expect(200)
  await desk.quiet()
  return order.orderId
}

async function payoutsOf(fake: TestFake, email: string): Promise<string> {
  const account = { sellerId: email, email, displayName: 'Second Hatchery', idempotencyKey: randomUUID() }
  const { accountId } = await openSellerAccount(account)
  await fake.control(`onboarding/${accountId}`)
  return accountId
}

beforeAll(async () => {
  webDir = mkdtempSync(path.join(tmpdir(), 'tankward-shell-'))
  writeFileSync(path.join(webDir, 'index.html'), '<html><head><title>T</title></head></html>')
  desk = await openOrderDesk('check_matrix', webDir)
  configurePhotos({ dir: webDir })
  const { db } = desk
  const mail = (name: string) => `${name}@example.org`
  for (const name of ['member', 'other-member']) await desk.member(mail(name))
  for (const [name, role] of [
    ['moderator', 'member,moderator'],
    ['plain-moderator', 'member,moderator'],
    ['admin', 'member,admin'],
    ['plain-admin', 'member,admin'],
  ] as const)
    await buildMember(db, { email: mail(name), role })
  const owner = await buildMember(db, { email: mail('other-seller') })
  const payoutAccountId = await payoutsOf(desk.fake, owner.email)
  const other = await buildSeller(db, { member: owner, payoutAccountId })
  agents = {
    anonymous: desk.visitor(),
    member: await desk.signedIn(mail('member')),
    seller: await desk.signedIn(desk.hatcheryEmail),
    'other-seller': await desk.signedIn(mail('other-seller')),
    moderator: await desk.staff(mail('moderator')),
    admin: await desk.staff(mail('admin')),
    'plain-moderator': await desk.signedIn(mail('plain-moderator')),
    'plain-admin': await desk.signedIn(mail('plain-admin')),
  }
  const mine = await desk.batch('matrix')
  const theirs = await openBatch(db, { seller: other, name: 'matrix' })
  const hidden = await buildBatch(db, { seller: other, name: 'hidden', at: new Date() })
  await db.update(listing).set({ state: 'taken_down' }).where(eq(listing.id, hidden.id))
  const otherMember = await desk.signedIn(mail('other-member'))
  const own = await orderOf(mine, agents.member, 'left')
  const foreign = await orderOf(theirs, otherMember, 'left')
  const agreed = await orderOf(mine, agents.member, 'agreed')
  const foreignAgreed = await orderOf(theirs, otherMember, 'agreed')
  const notices = await Promise.all(
    ['member', 'other-member'].map(async (name) => {
      const [row] = await db
        .select()
        .from(user)
        .where(eq(user.email, mail(name)))
      const told = {
        publicId: newPublicId(),
        memberId: row?.id ?? '',
        kind: 'ready',
        cause: `matrix:${name}`,
        listingId: mine.id,
      }
      await db
        .insert(notice)
        .values({ ...told, facts: { subject: 'Ready', title: 'Bluegill' }, createdAt: new Date() })
      return told.publicId
    }),
  )
  ids = {
    notice: { own: notices[0], foreign: notices[1], missing: NEVER },
    none: { own: '' },
    order: { own, foreign, missing: NEVER },
    'agreed-order': { own: agreed, foreign: foreignAgreed, missing: NEVER },
    'own-listing': { own: mine.publicId, foreign: theirs.publicId, missing: NEVER },
    'public-listing': { own: mine.publicId, foreign: hidden.publicId, missing: NEVER },
    version: { own: String(mine.versionId), missing: '4000000000' },
    seller: { own: desk.hatchery.publicId, missing: NEVER },
    rating: { missing: NEVER },
    session: { missing: randomUUID() },
  }
  endpoints = await everyEndpoint()
  for (const [name, endpoint] of endpoints)
    calls.set(name, { method: endpoint.method, address: `/api/v1${endpoint.path}` })
})
afterAll(async () => {
  await desk.close()
  rmSync(webDir, { recursive: true, force: true })
})

const isRaw = (row: AccessRow) => row.route.includes(' ')

/** What is mounted and has no row, and rows of what is not mounted. */
function routesOutOfStep(app: Express): string[] {
  const rows = accessMatrix.map((row) => {
    if (!isRaw(row)) {
      const call = calls.get(row.route)
      return call ? `${call.method} ${call.address.slice('/api/v1'.length)}` : `gone: ${row.route}`
    }
    return row.route.replace(' /photos/', ' /').replace(' /api/v1/', ' /')
  })
  const left = [...rows]
  const unknown: string[] = []
  for (const route of mountedRoutes(app)) {
    const at = left.indexOf(route)
    if (at < 0) unknown.push(`no row: ${route}`)
    else left.splice(at, 1)
  }
  return [...unknown, ...left.map((route) => `not mounted: ${route}`)]
}

async function ask(row: AccessRow, role: Role, id: string) {
  const raw = row.route.split(' ')
  const call = isRaw(row) ? { method: raw[0] ?? '', address: raw[1] ?? '' } : calls.get(row.route)
  if (!call) throw new Error(`nothing is called ${row.route}`)
  const address = call.address
    .replace('*splat', 'get-session')
    .replace(':token', 'forged')
    .replace(':file', `${'0'.repeat(32)}-320.webp`)
    .replace(':month', '2027-01')
    .replace(/:\w+/, id)
  const verb =
    call.method === 'ALL' ? 'get' : (call.method.toLowerCase() as 'get' | 'post' | 'patch' | 'delete')
  const asked = agents[role][verb](row.query ? `${address}?${row.query}` : address).set(keyed())
  return row.send || verb !== 'get' ? asked.send(row.send) : asked
}

/** The whole answer but for what names the request itself. */
function anonymised(
  reply: { status: number; headers: Record<string, string>; text: string },
  id: string,
): string {
  const requestId = reply.headers['x-request-id']
  const ofTheRequest = /^(x-request-id|date|etag|ratelimit.*)$/
  const headers = Object.entries(reply.headers).filter(([name]) => !ofTheRequest.test(name))
  const said = `${reply.text}${JSON.stringify(headers)}`
  return `${reply.status} ${said.replaceAll(requestId ?? '-', '').replaceAll(id || 'none', '')}`
}

const cells = (row: AccessRow, which: Which): [Role, number][] => {
  const statuses = row[which]?.split(' ').map(Number) ?? []
  return statuses.map((status, at) => [ROLES[at] ?? 'anonymous', status])
}

interface Findings {
  cells: number
  wrong: string[]
  compared: number
  different: string[]
}

/** Asks every cell, and holds each 404 against the answer for an object that never was. */
async function measure(rows: AccessRow[], stopAtFirst = false): Promise<Findings> {
  const found: Findings = { cells: 0, wrong: [], compared: 0, different: [] }
  for (const row of rows) {
    const unknown = new Map<Role, string>()
    for (const which of ['missing', 'own', 'foreign'] as const) {
      const id = ids[row.object][which]
      if (id === undefined) continue
      for (const [role, expected] of cells(row, which)) {
        const reply = await ask(row, role, id)
        const told = anonymised(reply, id)
        found.cells += 1
        if (reply.status !== expected)
          found.wrong.push(
            `${row.route} ${which} ${role}: ${reply.status}, not ${expected} ${reply.text.slice(0, 160)}`,
          )
        if (which === 'missing') unknown.set(role, told)
        else if (expected === 404 && unknown.has(role)) {
          found.compared += 1
          if (told !== unknown.get(role)) found.different.push(`${row.route} ${which} ${role}: ${told}`)
        }
        if (stopAtFirst && found.wrong.length + found.different.length > 0) return found
      }
    }
  }
  return found
}

describe('who may do what', () => {
  it('has a row for every route that is mounted, and no row too many', async () => {
    const out = routesOutOfStep(desk.app)
    const planted = buildApp({ origins: [], https: false, webDir, trustProxyHops: 0 })
    planted.get('/api/v1/every-street', (_req, res) => void res.json([]))
    const noticed = routesOutOfStep(planted).includes('no row: GET /api/v1/every-street')
    await reportFigure({ id: 'SEC-4-routes-without-row', figure: out.length, bar: 0, pass: out.length === 0 })
    await reportFigure({ id: 'SEC-4-control-route', figure: noticed ? 1 : 0, bar: 1, pass: noticed })
    expect(out).toEqual([])
    expect(noticed).toBe(true)
  })

  it('answers every cell as written, and another’s object like one that never was', async () => {
    const found = await measure(accessMatrix)
    const { length: wrong } = found.wrong
    const { length: different } = found.different
    await reportFigure({ id: 'SEC-4-cells', figure: found.cells, bar: '>= 600', pass: found.cells >= 600 })
    await reportFigure({ id: 'SEC-4-cells-wrong', figure: wrong, bar: 0, pass: wrong === 0 })
    await reportFigure({
      id: 'SEC-4-404-compared',
      figure: found.compared,
      bar: '>= 80',
      pass: found.compared >= 80,
    })
    await reportFigure({ id: 'SEC-4-404-different', figure: different, bar: 0, pass: different === 0 })
    expect(found.wrong).toEqual([])
    expect(found.different).toEqual([])
    expect(found.cells).toBeGreaterThanOrEqual(600)
    expect(found.compared).toBeGreaterThanOrEqual(80)
  })

  it('notices every guard that is taken out', async () => {
    const unnoticed: string[] = []
    for (const guard of GUARDS) {
      cut.guard = guard
      const found = await measure(accessMatrix, true)
      cut.guard = ''
      if (found.wrong.length + found.different.length === 0) unnoticed.push(guard)
    }
    // Then each route alone, its door lowered step by step; the server reads it with every request.
    const doors = endpoints.flatMap(([name, endpoint]) =>
      lowerDoors(endpoint.auth).map((auth) => ({ name, endpoint, auth })),
    )
    for (const { name, endpoint, auth } of doors) {
      const before = endpoint.auth
      endpoint.auth = auth
      const found = await measure(
        accessMatrix.filter((row) => row.route === name),
        true,
      )
      endpoint.auth = before
      if (found.wrong.length + found.different.length === 0) unnoticed.push(`${name} for ${auth}`)
    }
    const bar = GUARDS.length + doors.length
    const figure = bar - unnoticed.length
    await reportFigure({ id: 'SEC-4-control-guards', figure, bar, pass: unnoticed.length === 0 })
    expect(unnoticed).toEqual([])
    expect(bar).toBeGreaterThan(40)
  })
})
