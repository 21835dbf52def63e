import { execFile } from 'node:child_process'
import { promisify } from 'node:util'

import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, expect, inject, it } from 'vitest'

import { connect, db, disconnect } from '@/db/client'
import { plainEnvironment } from '@/scripts/plain-environment.mjs'
import { brokenInvariants } from '@/tests/support/money-invariants'

const { origin, databaseUrl } = inject('wholeProduct')
const run = promisify(execFile)

beforeAll(() => connect(databaseUrl))
afterAll(disconnect)

async function countsBy(query: ReturnType<typeof sql>): Promise<Map<string, number>> {
  const [rows] = (await db().execute(query)) as unknown as [{ name: string; n: number }[]]
  return new Map(rows.map(({ name, n }) => [name, Number(n)]))
}

it('has the people, farms and listings that the demo promises', async () => {
  const counts = await countsBy(sql`
    SELECT 'sellers' AS name, COUNT(*) AS n FROM seller
    UNION ALL SELECT 'members', COUNT(*) FROM user
    UNION ALL SELECT 'listings', COUNT(*) FROM listing`)
  expect(counts.get('sellers')).toBeGreaterThanOrEqual(24)
  expect(counts.get('members')).toBeGreaterThanOrEqual(24 + 60)
  expect(counts.get('listings')).toBeGreaterThanOrEqual(100)
})

it('has orders in every state that a pickup can be in, each reached by real commands', async () => {
  const states = await countsBy(sql`SELECT state AS name, COUNT(*) AS n FROM orders GROUP BY state`)
  // A hold lasts 15 minutes: whether one still runs depends on when this is asked.
  const pickupStates = ['requested', 'deposit_paid', 'scheduled', 'ready', 'handed_over']
  for (const state of [...pickupStates, 'claim_open', 'settled', 'cancelled']) {
    expect(states.get(state) ?? 0, state).toBeGreaterThan(0)
  }
  const silent = await countsBy(sql`
    SELECT o.public_id AS name, COUNT(e.order_id) AS n FROM orders o LEFT JOIN order_event e ON e.order_id = o.id
    GROUP BY o.public_id HAVING COUNT(e.order_id) = 0`)
  expect([...silent.keys()], 'orders without an event').toEqual([])
})

it('keeps every rule about money and stock', async () => {
  expect(await brokenInvariants(db())).toEqual([])
})

it('shows other law on each side of the river', async () => {
  const statusesNear = async (zip: string) => {
    const answer = await fetch(`${origin}/api/v1/listings?near=${zip}&within=100&limit=48`)
    const { items } = (await answer.json()) as { items: { legal?: { status: string } }[] }
    return new Set(items.map((item) => item.legal?.status))
  }
  const [ohio, kentucky, indiana] = await Promise.all(['45202', '41011', '47374'].map(statusesNear))
  expect(ohio).toContain('permit_seller')
  expect(kentucky).toContain('allowed')
  expect(indiana).toContain('permit_both')
})

it('is refused in production', async () => {
  const environment = {
    ...plainEnvironment(),
    ...{ NODE_ENV: 'production' as const, DEMO: 'on', DATABASE_URL: databaseUrl },
  }
  const ended = run('node', ['--import', 'tsx', 'seed/run.ts'], { env: environment })
  await expect(ended).rejects.toMatchObject({ stderr: expect.stringContaining('refused in production') })
})
