import { randomUUID } from 'node:crypto'
import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'

import { eq } from 'drizzle-orm'
import { createPool, type RowDataPacket } from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { listing } from '@/db/schema/listings'
import { order } from '@/db/schema/orders'
import { buildApp } from '@/server/app'
import { openAuth } from '@/server/auth/auth'
import { configureOrders } from '@/server/orders/order-settings'
import type { ProblemDocument } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody, roomyWindow, type DeskBatch } from '@/tests/support/desk-ground'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { startOwnDatabase, type OwnDatabase } from '@/tests/support/own-database'
import { checkSeed, isSlice, reportFigure } from '@/tests/support/report-figure'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'

/** The planted fault: look how many are left, then write what is left. Only in this process, never in the servers. */
const planted = vi.hoisted(() => ({ readThenWrite: false, look: async (_listingId: number) => 0 }))

vi.mock('@/server/orders/order-store', async (original) => {
  const real = await original<typeof import('@/server/orders/order-store')>()
  return {
    ...real,
    holdFish: async (...[tx, listingId, quantity]: Parameters<typeof real.holdFish>) => {
      if (!planted.readThenWrite) return real.holdFish(tx, listingId, quantity)
      const left = await planted.look(listingId)
      if (left < quantity) return false
      await tx
        .update(listing)
        .set({ free: left - quantity })
        .where(eq(listing.id, listingId))
      return true
    },
  }
})

const BUYERS = isSlice ? 150 : 500
const FISH = isSlice ? 30 : 100
const SEEDS = isSlice ? 1 : 5
const P99_MS = 1500

let database: OwnDatabase
let desk: StandingDesk
let origins: string[] = []

beforeAll(async () => {
  database = await startOwnDatabase('oversell')
  desk = await openStandingDesk(database)
  const servers = [await desk.start(), await desk.start({ port: undefined, environment: { JOBS: 'off' } })]
  origins = servers.map((server) => server.origin)
})
afterAll(() => desk.close())

interface Told {
  status: number
  tookMs: number
  body: Partial<ShownOrder & ProblemDocument>
}

const rush = (name: string, free: number) =>
  desk.batch(name, {
    free,
    body: { ...roomyWindow(500), minOrder: 1, orderStep: 1, tiers: [{ fromCount: 1, unitCents: 400 }] },
  })

let asked = 0

async function reserve(
  batch: DeskBatch,
  by: { origin: string; cookie: string; key?: string },
): Promise<Told> {
  asked += 1
  const began = performance.now()
  const reply = await fetch(`${by.origin}/api/v1/listings/${batch.publicId}/orders`, {
    method: 'POST',
    headers: {
      ...{ origin: desk.origin, cookie: by.cookie, 'content-type': 'application/json', 'x-tankward': '1' },
      'x-forwarded-for': `10.${asked >> 16}.${(asked >> 8) & 255}.${asked & 255}`,
      'idempotency-key': by.key ?? randomUUID(),
    },
    body: JSON.stringify(reserveBody(batch, { quantity: 1 })),
  })
  const body = (await reply.json()) as Told['body']
  return { status: reply.status, tookMs: performance.now() - began, body }
}

const buyersOf = (name: string, count: number) =>
  desk.cookies(Array.from({ length: count }, (_, n) => `${name}-${n}@example.org`))

/** Everything that must not be, in words. */
async function judge(batch: DeskBatch, told: Told[], fish: number) {
  const orders = await desk.db.select().from(order).where(eq(order.listingId, batch.id))
  const [stock] = await desk.db.select().from(listing).where(eq(listing.id, batch.id))
  const sold = orders.reduce((sum, one) => sum + one.quantity, 0)
  const won = told.filter((one) => one.status === 201)
  const lost = told.filter((one) => one.status !== 201)
  const kept = new Set(orders.map((one) => one.publicId))
  return {
    sold,
    oversold: Math.max(0, sold - fish),
    unsold: Math.max(0, fish - sold),
    forgotten: won.filter((one) => !kept.has(one.body.orderId ?? '')).length,
    adrift: Math.abs(fish - (stock?.free ?? 0) - sold),
    untold: lost.filter(
      (one) =>
        !(one.status === 409 && one.body.type === '/problems/batch-short' && one.body.facts?.left === 0),
    ),
    fivehundreds: told.filter((one) => one.status >= 500).length,
  }
}

const quantile = (values: number[], part: number) =>
  values.toSorted((a, b) => a - b)[Math.min(values.length - 1, Math.ceil(values.length * part) - 1)] ?? 0

describe('five hundred buyers of the last hundred fish, at two servers', () => {
  it('gets each fish sold once, and tells everybody else that none is left', async () => {
    const faults = { oversold: 0, unsold: 0, forgotten: 0, adrift: 0, untold: 0, fivehundreds: 0 }
    const took: number[] = []
    for (let round = 0; round < SEEDS; round++) {
      const name = `rush-${checkSeed + round}`
      const batch = await rush(name, FISH)
      const cookies = await buyersOf(name, BUYERS)
      const told = await Promise.all(
        cookies.map((cookie, at) => reserve(batch, { cookie, origin: origins[(at + round) % 2] ?? '' })),
      )
      took.push(...told.map((one) => one.tookMs))
      const found = await judge(batch, told, FISH)
      if (found.untold.length > 0) console.log(JSON.stringify(found.untold.slice(0, 3)))
      faults.oversold += found.oversold
      faults.unsold += found.unsold
      faults.forgotten += found.forgotten
      faults.adrift += found.adrift
      faults.untold += found.untold.length
      faults.fivehundreds += found.fivehundreds
    }
    const seed = `${checkSeed}+${SEEDS}`
    for (const [what, figure] of Object.entries(faults))
      await reportFigure({ id: `REL-1-${what}`, figure, bar: 0, pass: figure === 0, seed })
    const [p50, p99] = [quantile(took, 0.5), quantile(took, 0.99)].map(Math.round)
    await reportFigure({ id: 'REL-1-p50-ms', figure: p50 ?? 0, bar: 'for the record', pass: true, seed })
    await reportFigure({
      id: 'REL-1-p99-ms',
      figure: p99 ?? 0,
      bar: `for the record (goal ${P99_MS})`,
      pass: true,
      seed,
    })
    expect(faults).toEqual({ oversold: 0, unsold: 0, forgotten: 0, adrift: 0, untold: 0, fivehundreds: 0 })
    expect((await brokenInvariants(desk.db)).filter((one) => !one.startsWith('every animal'))).toEqual([])
  })

  it('makes one order of one press, however often it is sent', async () => {
    const batch = await rush('double-click', 50)
    const [cookie = ''] = await buyersOf('double', 1)
    const key = randomUUID()
    const told = await Promise.all(
      Array.from({ length: 20 }, (_, at) => reserve(batch, { cookie, key, origin: origins[at % 2] ?? '' })),
    )
    const { sold } = await judge(batch, told, 50)
    const odd = told.filter((one) => one.status !== 201 && one.body.type !== '/problems/key-running')
    await reportFigure({
      id: 'REL-1-double-click',
      figure: sold,
      bar: 1,
      pass: sold === 1 && odd.length === 0,
    })
    expect(odd).toEqual([])
    expect(sold).toBe(1)
  })

  it('is oversold by a server that reads first and writes then', async () => {
    openAuth({ secret: desk.authSecret, origin: desk.origin, alsoTrusted: [] })
    configureOrders({ origin: desk.origin, feeBp: 600 })
    const app = buildApp({ origins: [desk.origin], https: false, webDir: 'nowhere', trustProxyHops: 1 })
    const server = await new Promise<Server>((done) => {
      const listening = createServer(app).listen(0, '127.0.0.1', () => done(listening))
    })
    const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
    const batch = await rush('planted', 20)
    const cookies = await buyersOf('planted', 80)
    // A line of its own: a second one of the pool, asked for inside a transaction, could wait for ever.
    const lookout = createPool({ uri: database.url, connectionLimit: 20 })
    planted.look = async (listingId) => {
      const [rows] = await lookout.query<RowDataPacket[]>('select free from listing where id = ?', [
        listingId,
      ])
      return Number(rows[0]?.free)
    }
    planted.readThenWrite = true
    const told = await Promise.all(cookies.map((cookie) => reserve(batch, { cookie, origin })))
    planted.readThenWrite = false
    const { oversold } = await judge(batch, told, 20)
    await lookout.end()
    await new Promise((done) => server.close(done))
    await reportFigure({ id: 'REL-1-control', figure: oversold, bar: '> 0', pass: oversold > 0 })
    expect(oversold).toBeGreaterThan(0)
  })
})
