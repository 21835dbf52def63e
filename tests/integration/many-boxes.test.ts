import { gt, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import type { Database } from '@/db/client'
import { order as orders } from '@/db/schema/orders'
import { routeCheck, shipment } from '@/db/schema/shipments'
import { startForecast } from '@/server/forecast/fake/start-fake'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { forgetForecasts } from '@/server/forecast/read-forecast'
import { checkDueWays } from '@/server/weather/check-due-ways'
import { openShipDesk, type ShipDesk } from '@/tests/support/ship-desk'

const COUNT = 210
const EVENING = new Date('2027-05-09T20:00:30Z')
const SLOW = 24
/** 24 boxes in eight lanes wait three times 3.4 s; one after the other it would be 80 s. */
const MOST_MS = 20_000

let desk: ShipDesk
let weather: Awaited<ReturnType<typeof startForecast>>

/** Copies of the one order there is, each going to a place of its own. */
async function copyOrders(db: Database, count: number): Promise<void> {
  const [row] = await db.select().from(orders)
  const [sent] = await db.select().from(shipment)
  if (!row || !sent) throw new Error('nothing to copy')
  const { id: _id, ...rest } = row
  for (let at = 0; at < count; at++) {
    const publicId = `copy${String(at).padStart(18, '0')}`
    const [made] = await db
      .insert(orders)
      .values({ ...rest, publicId })
      .$returningId()
    const toLat = sent.toLat + (at - count / 2) * 0.05
    await db.insert(shipment).values({ ...sent, orderId: made?.id ?? 0, toLat })
  }
}

beforeAll(async () => {
  desk = await openShipDesk('many_boxes')
  weather = await startForecast({})
  configureForecast({ url: weather.url })
  await desk.ready('many')
  await copyOrders(desk.db, COUNT - 1)
}, 60_000)
afterAll(async () => {
  configureForecast({ url: null })
  await weather.stop()
  await desk.close()
})

const looks = async (kind: string) => {
  const [row] = await desk.db
    .select({ n: sql<number>`count(distinct ${routeCheck.orderId})` })
    .from(routeCheck)
    .where(sql`${routeCheck.kind} = ${kind}`)
  return Number(row?.n)
}

async function timed(work: () => Promise<unknown>): Promise<number> {
  const begun = performance.now()
  await work()
  return Math.round(performance.now() - begun)
}

describe('more boxes leave in a night than one look takes', () => {
  it('and every one of them is looked at, once', async () => {
    await desk.travelToWithoutRest(EVENING)
    await checkDueWays()
    expect(await looks('evening')).toBeGreaterThanOrEqual(200)
    await checkDueWays()
    expect(await looks('evening')).toBe(COUNT)
    await checkDueWays()
    const [all] = await desk.db.select({ n: sql<number>`count(*)` }).from(routeCheck)
    // One of the reservation; the copies have none.
    expect(Number(all?.n)).toBe(COUNT + 1)
  }, 120_000)

  it('and a service that hangs holds them up by lanes, not one by one', async () => {
    await desk.travelToWithoutRest(new Date('2027-05-10T10:00:30Z'))
    const [first] = await desk.db.select({ id: sql<number>`min(${orders.id})` }).from(orders)
    const slow = gt(orders.id, Number(first?.id) + SLOW - 1)
    await desk.db.update(orders).set({ freeze: 'admin' }).where(slow)
    weather.setMode('hangs')
    forgetForecasts()
    expect(await timed(checkDueWays)).toBeLessThan(MOST_MS)
    weather.setMode('normal')
    forgetForecasts()
    expect(await looks('morning')).toBe(SLOW)
  }, 120_000)
})
