import { and, eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { listing, pickupWindow } from '@/db/schema/listings'
import { routeCheck } from '@/db/schema/shipments'
import { clockEdges } from '@/server/orders/clock-edges'
import { readOrder } from '@/server/orders/order-store'
import { keepFederalDays } from '@/server/shipping/no-ship-days'
import { checkDueWays } from '@/server/weather/check-due-ways'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import { leaving, onShipDay, permit, SHIP_DAY, SHIP_NOW, shipBody, type Box } from '@/tests/support/ship-desk'
import { openWeatherDesk, type WeatherDesk } from '@/tests/support/weather-desk'

let desk: WeatherDesk

beforeAll(async () => {
  desk = await openWeatherDesk('ship_races')
})
afterAll(() => desk.close())
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterEach(async () => {
  desk.mild()
  await desk.quiet()
  expect(await brokenInvariants(desk.db)).toEqual([])
})

const HOUR_MS = 3_600_000
const EVENING = new Date('2027-05-09T20:00:30Z')

const frost = (from: string, until: string) => desk.frost(from, until)

const rowOf = async (box: Pick<Box, 'order'>) => {
  const found = await readOrder(box.order.orderId)
  if (!found) throw new Error('the order is gone')
  return found
}
const at = (from: Date, hours: number) => new Date(from.getTime() + hours * HOUR_MS)

describe('a clock that was read before its order moved on', () => {
  it('does not end an order whose balance came at that very moment', async () => {
    const box = await desk.scheduled('paid in time')
    const page = await box.act(box.bea, 'balance-payment')
    const read = await rowOf(box)
    expect(read.clockEdge).toBe('E23')
    await desk.pay(page)
    await desk.travelToWithoutRest(at(read.clockAt ?? SHIP_NOW, 0.01))
    await clockEdges.E23?.(read)
    expect(await box.seen()).toMatchObject({ state: 'scheduled', balancePaid: true })
  })

  it('does not end a second hold by the time of the first', async () => {
    const box = await desk.ready('held twice')
    await box.act(box.hatchery, 'weather-hold', { why: 'Ice on the road.' })
    const read = await rowOf(box)
    expect(read.clockEdge).toBe('E21')
    await box.act(box.bea, 'new-day', { shipDay: '2027-05-17' })
    await desk.travelToWithoutRest(at(SHIP_NOW, 72.1))
    await box.act(box.hatchery, 'weather-hold', { why: 'Ice once more.' })
    await clockEdges.E21?.(read)
    expect((await box.seen()).state).toBe('weather_hold')
  })

  it('rings once for two processes', async () => {
    const box = await desk.ready('two clocks')
    await box.act(box.hatchery, 'weather-hold', { why: 'Ice on the road.' })
    const read = await rowOf(box)
    await desk.travelToWithoutRest(at(SHIP_NOW, 71))
    const late = { ...read }
    await desk.travelToWithoutRest(at(SHIP_NOW, 72.1))
    await Promise.allSettled([clockEdges.E21?.(late), clockEdges.E21?.(late)])
    await desk.quiet()
    expect(await box.seen()).toMatchObject({ state: 'cancelled', money: { refundedCents: 11_390 } })
  })
})

describe('an answer that comes late', () => {
  it('cannot agree to a day that leaves no time to keep the animals without food', async () => {
    const box = await desk.ready('too near')
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost is coming.', shipDay: '2027-05-05' })
    await desk.travelToWithoutRest(at(SHIP_NOW, 71))
    const answer = await box.press(box.bea, 'new-day')
    expect([answer.status, answer.body.errors]).toMatchObject([422, [{ pointer: '#/shipDay' }]])
    expect((await box.seen()).state).toBe('weather_hold')
    const other = await box.act(box.bea, 'new-day', { shipDay: '2027-05-10' })
    expect(other.shipment?.shipDay).toBe('2027-05-10')
  })

  it('cannot agree to a proposed day that has turned unsafe', async () => {
    const box = await desk.ready('turned')
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost is coming.', shipDay: '2027-05-05' })
    frost('2027-05-05', '2027-05-06')
    const answer = await box.press(box.bea, 'new-day')
    expect([answer.status, answer.body.type]).toEqual([409, '/problems/trip-unsafe'])
  })

  it('leaves the seller two days after a silent buyer’s time is over', async () => {
    const box = await desk.ready('friday')
    frost(SHIP_DAY, SHIP_DAY)
    await desk.travelToWithoutRest(new Date('2027-05-07T16:00:00Z'))
    await box.hatchery
      .post('/api/v1/routes/checks')
      .set(keyed())
      .send({ shipDay: SHIP_DAY, hold: true })
      .expect(200)
    const { hold } = await box.seen()
    expect(hold).toMatchObject({ silenceMoves: true, proposed: { shipDay: '2027-05-12' } })
  })
})

describe('two at once', () => {
  async function waiting(name: string): Promise<Box> {
    const box = await desk.ready(name)
    await desk.travelTo(onShipDay(14))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    return box
  }

  it('dispatch against a check that would hold it: one of both, and the box is where the order says', async () => {
    const box = await waiting('gate and check')
    frost(SHIP_DAY, '2027-05-12')
    const [pressed] = await Promise.all([
      box.hatchery.post(`${box.path}/dispatch`).set(keyed()).send(leaving()),
      checkDueWays(),
    ])
    await desk.quiet()
    const { state } = await box.seen()
    expect(pressed.status === 200 ? 'dispatched' : 'weather_hold').toBe(state)
    const shipped = state === 'dispatched' ? 60 : 0
    expect(await box.stock()).toMatchObject({ shipped, sold: 60 - shipped })
  })

  it('the buyer’s word against the clock of silence', async () => {
    const box = await desk.ready('word and silence')
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost is coming.', shipDay: '2027-05-17' })
    const read = await rowOf(box)
    await desk.travelToWithoutRest(at(SHIP_NOW, 71.999))
    const due = { ...read }
    const [answer] = await Promise.all([
      box.bea.post(`${box.path}/new-day`).set(keyed()).send({ shipDay: '2027-05-18' }),
      desk.travelToWithoutRest(at(SHIP_NOW, 72.001)),
      clockEdges.E19?.(due),
    ])
    await desk.quiet()
    const seen = await box.seen()
    expect(seen.state).toBe('scheduled')
    expect(seen.shipment?.shipDay).toBe(answer.status === 200 ? '2027-05-18' : '2027-05-17')
  })

  it('a hold of the seller against a cancellation of the buyer', async () => {
    const box = await desk.ready('hold and cancel')
    const replies = await Promise.all([
      box.hatchery
        .post(`${box.path}/weather-hold`)
        .set(keyed())
        .send({ why: 'Frost is coming.', shipDay: '2027-05-17' }),
      box.bea.post(`${box.path}/cancellation`).set(keyed()).send({}),
    ])
    await desk.quiet()
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409])
    expect((await box.seen()).state).toBe(replies[0].status === 200 ? 'weather_hold' : 'cancelled')
  })

  it('two moves of the day by one party count once', async () => {
    const box = await desk.ready('two moves')
    const replies = await Promise.all(
      ['2027-05-11', '2027-05-12'].map((shipDay) =>
        box.bea.post(`${box.path}/ship-day`).set(keyed()).send({ shipDay }),
      ),
    )
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 409])
    expect((await rowOf(box)).buyerMoves).toBe(1)
  })

  it('the last fish, one collected and one shipped', async () => {
    const day = at(SHIP_NOW, 240).toISOString().slice(0, 10)
    const windows = [{ day, from: '09:00', until: '10:00', capacity: 4 }]
    const batch = await desk.batchOf('last sixty', { body: { windows } })
    await desk.db.update(listing).set({ free: 60 }).where(eq(listing.id, batch.id))
    await desk.member('cal@example.org')
    const [bea, cal] = await Promise.all(['bea@example.org', 'cal@example.org'].map(desk.signedIn))
    const path = `/api/v1/listings/${batch.publicId}/orders`
    const replies = await Promise.all([
      bea?.post(path).set(keyed()).send(shipBody(batch)),
      cal
        ?.post(path)
        .set(keyed())
        .send({
          ...{ quantity: 60, near: '40202', version: 1, ticked: batch.ticks },
          windowId: batch.windows[0]?.publicId,
        }),
    ])
    expect(replies.map((reply) => reply?.status).sort()).toEqual([201, 409])
    const [left] = await desk.db.select().from(listing).where(eq(listing.id, batch.id))
    expect(left).toMatchObject({ free: 0, held: 60 })
    // The book of stock begins with what the seller put in; sixty were left by hand here.
    await desk.db.update(listing).set({ free: 440 }).where(eq(listing.id, batch.id))
  })

  it('the last place of a window, proposed to one and chosen by another', async () => {
    const windows = [10, 12].map((days) => ({
      day: at(SHIP_NOW, days * 24)
        .toISOString()
        .slice(0, 10),
      ...{ from: '09:00', until: '10:00', capacity: 1 },
    }))
    const batch = await desk.batchOf('one place', { body: { windows } })
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const [first, second] = batch.windows
    const ask = (windowId: string | undefined) =>
      bea
        .post(`/api/v1/listings/${batch.publicId}/orders`)
        .set(keyed())
        .send({ quantity: 60, near: '40202', version: 1, ticked: batch.ticks, windowId })
    const order = (await ask(first?.publicId)).body as ShownOrder
    await desk.pay(order)
    const path = `/api/v1/orders/${order.orderId}`
    const replies = await Promise.all([
      hatchery
        .post(`${path}/weather-hold`)
        .set(keyed())
        .send({ why: 'The lane is sheer ice.', windowId: second?.publicId }),
      ask(second?.publicId),
    ])
    expect(replies.map(({ status }) => status < 300).sort()).toEqual([false, true])
    const [window] = await desk.db
      .select()
      .from(pickupWindow)
      .where(and(eq(pickupWindow.listingId, batch.id), eq(pickupWindow.publicId, second?.publicId ?? '')))
    expect(window?.taken).toBe(1)
  })

  it('the evening check of two processes holds once', async () => {
    const box = await desk.ready('two checks')
    frost(SHIP_DAY, '2027-05-12')
    await desk.travelTo(EVENING)
    await Promise.all([checkDueWays(), checkDueWays()])
    await desk.quiet()
    expect(await box.seen()).toMatchObject({ state: 'weather_hold', hold: { number: 1 } })
    const checks = await desk.db
      .select()
      .from(routeCheck)
      .where(and(eq(routeCheck.orderId, (await rowOf(box)).id), eq(routeCheck.kind, 'evening')))
    expect(checks.length).toBeGreaterThan(0)
  })

  it('federal days by two processes stand once', async () => {
    await Promise.all([keepFederalDays(), keepFederalDays(), keepFederalDays()])
    await keepFederalDays()
  })
})

describe('a pickup whose proposed time has begun', () => {
  it('is not agreed to any more', async () => {
    const windows = [10, 2].map((days) => ({
      day: at(SHIP_NOW, days * 24)
        .toISOString()
        .slice(0, 10),
      ...{ from: '09:00', until: '10:00', capacity: 4 },
    }))
    const batch = await desk.batchOf('over already', { body: { windows } })
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const [first, second] = batch.windows
    const reply = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send({
        ...{ quantity: 60, near: '40202', version: 1, ticked: batch.ticks },
        windowId: first?.publicId,
      })
    const order = reply.body as ShownOrder
    await desk.pay(order)
    const path = `/api/v1/orders/${order.orderId}`
    await hatchery
      .post(`${path}/weather-hold`)
      .set(keyed())
      .send({ why: 'The lane is sheer ice.', windowId: second?.publicId })
      .expect(200)
    await desk.travelToWithoutRest(at(SHIP_NOW, 60))
    const late = await bea.post(`${path}/new-day`).set(keyed()).send({})
    expect([late.status, late.body.type]).toEqual([409, '/problems/slot-full'])
    const odd = await bea.post(`${path}/new-day`).set(keyed()).send({ shipDay: '2027-05-17' })
    expect([odd.status, odd.body.errors]).toMatchObject([422, [{ pointer: '#/shipDay' }]])
    await bea.post(`${path}/new-day`).set(keyed()).send({ windowId: first?.publicId }).expect(200)
  })
})
