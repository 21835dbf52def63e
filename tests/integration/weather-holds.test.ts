import { and, eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { routeCheck, weatherHold } from '@/db/schema/shipments'
import { pickupWindow } from '@/db/schema/listings'
import { seller as sellers } from '@/db/schema/sellers'
import { forgetForecasts } from '@/server/forecast/read-forecast'
import { checkDueWays } from '@/server/weather/check-due-ways'
import type { ShownOrder } from '@/shared/contracts/orders'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import { SHIP_DAY, SHIP_NOW } from '@/tests/support/ship-desk'
import { openWeatherDesk, type WeatherDesk } from '@/tests/support/weather-desk'

let desk: WeatherDesk

beforeAll(async () => {
  desk = await openWeatherDesk('weather_holds')
})
afterAll(() => desk.close())
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterEach(async () => {
  desk.mild()
  expect(await brokenInvariants(desk.db)).toEqual([])
})

const DAY_MS = 86_400_000
/** 16:00 and 06:00 in Cincinnati in May are 20:00 and 10:00 UTC. */
const EVENING = new Date('2027-05-09T20:00:30Z')
const MORNING = new Date('2027-05-10T10:00:30Z')

const frost = (from: string, until: string) => desk.frost(from, until)

/** The day agreed and everything paid: what an unpaid balance does is another story. */
async function agreed(name: string) {
  const box = await desk.scheduled(name)
  await desk.pay(await box.act(box.bea, 'balance-payment'))
  return box
}

async function lookAt(at: Date): Promise<void> {
  await desk.travelTo(at)
  await checkDueWays()
  await desk.quiet()
}

/** Time passes and what is due rings. */
const wait = (from: Date, hours: number) => desk.travelTo(new Date(from.getTime() + hours * 3_600_000))

const checksOf = async (box: { row: () => Promise<{ id: number } | undefined> }, kind: string) =>
  desk.db
    .select()
    .from(routeCheck)
    .where(and(eq(routeCheck.orderId, (await box.row())?.id ?? 0), eq(routeCheck.kind, kind)))

const lettersAbout = (subject: RegExp) => desk.letters.filter((letter) => subject.test(letter.subject))

describe('a cold snap before a box leaves', () => {
  it('B-A5: holds the order in the evening, proposes a day, and moves there when the buyer says nothing', async () => {
    const box = await agreed('silent first')
    frost('2027-05-10', '2027-05-12')
    await lookAt(new Date(EVENING.getTime() - 60_000))
    expect((await box.seen()).state).toBe('scheduled')

    await lookAt(EVENING)
    const held = await box.seen()
    expect(held.state).toBe('weather_hold')
    expect(held.hold).toMatchObject({ number: 1, startedBy: 'system', silenceMoves: true })
    expect(held.hold?.proposed?.shipDay).toBe('2027-05-17')
    expect(held.hold?.why).toMatch(
      /^The route is too cold on Mon, May 10: .+, (OH|KY) 3 °F \(-16 °C\)\. We propose Mon, May 17\. You may cancel for a full refund\.$/,
    )
    expect(held.may).toEqual(expect.arrayContaining(['agree-new-day', 'decline-new-day']))
    const told = lettersAbout(/Held for weather/)
    expect(told).toHaveLength(2)
    // The held day leaves both calendars; the day that comes instead has a higher number.
    expect(told.map((letter) => letter.calendar?.method)).toEqual(['CANCEL', 'CANCEL'])
    expect(told[0]?.calendar?.text).toMatch(/^SEQUENCE:1\r?$/m)

    await wait(EVENING, 71.9)
    expect((await box.seen()).state).toBe('weather_hold')
    await wait(EVENING, 72.1)
    const moved = await box.seen()
    expect(moved.state).toBe('scheduled')
    expect(moved.shipment).toMatchObject({ shipDay: '2027-05-17', arriveDay: '2027-05-18' })
    expect(moved.hold?.answer).toBe('silence')
    expect(lettersAbout(/^New day/)[0]?.calendar?.text).toMatch(/^SEQUENCE:2\r?$/m)
    // A day that nobody chose binds nobody: free to cancel until it begins.
    expect(moved.freeCancelUntil).toBe('2027-05-17T10:00:00.000Z')
  })

  it('B-A5: gives every cent back when a second hold gets no answer', async () => {
    const box = await desk.ready('silent twice')
    frost('2027-05-10', '2027-05-10')
    await lookAt(EVENING)
    await wait(EVENING, 72.1)
    expect((await box.seen()).state).toBe('scheduled')

    frost('2027-05-17', '2027-05-19')
    const again = new Date(EVENING.getTime() + 7 * DAY_MS)
    await lookAt(again)
    const held = await box.seen()
    expect(held.state).toBe('weather_hold')
    expect(held.hold).toMatchObject({ number: 2, silenceMoves: false })
    await wait(again, 72.1)
    const ended = await box.seen()
    expect(ended).toMatchObject({ state: 'cancelled', reason: 'hold_no_consent' })
    expect(ended.money.refundedCents).toBe(11_390)
    expect(ended.hold?.answer).toBe('no-consent')
    const stock = await box.stock()
    expect(stock).toMatchObject({ sold: 0, shipped: 0 })
    const [seller] = await desk.db.select().from(sellers)
    expect(seller?.daysMissed).toBe(0)
  })

  it('keeps no deposit for a day that came by silence, when its balance is not paid', async () => {
    const box = await desk.scheduled('silent and unpaid', { ship: { shipDay: '2027-05-12' } })
    frost('2027-05-10', '2027-05-14')
    await box.act(box.hatchery, 'weather-hold', { why: 'Ice on the road.', shipDay: '2027-05-17' })
    await wait(SHIP_NOW, 72.1)
    expect((await box.seen()).state).toBe('scheduled')
    await desk.travelTo(new Date('2027-05-16T10:00:30Z'))
    const ended = await box.seen()
    expect(ended).toMatchObject({ state: 'cancelled', reason: 'balance_unpaid' })
    expect(ended.money.refundedCents).toBe(1335)
  })

  it('catches in the morning what the evening did not know, also when the animals are ready', async () => {
    const box = await desk.ready('morning')
    await lookAt(EVENING)
    expect((await box.seen()).state).toBe('ready')
    expect(await checksOf(box, 'evening')).toMatchObject([{ verdict: 'safe' }])
    frost('2027-05-10', '2027-05-12')
    await lookAt(MORNING)
    expect((await box.seen()).state).toBe('weather_hold')
    expect(await checksOf(box, 'morning')).toMatchObject([{ verdict: 'unsafe' }])
    // Each look is made once, however often the runner comes by.
    await lookAt(new Date(MORNING.getTime() + 60_000))
    expect(await checksOf(box, 'morning')).toHaveLength(1)
  })

  it('lets the buyer take the proposed day, another safe one, or end it for everything', async () => {
    const boxes = [await agreed('takes it'), await agreed('takes another'), await agreed('ends it')]
    frost('2027-05-10', '2027-05-12')
    await lookAt(EVENING)
    const [takes, takesOther, ends] = boxes
    if (!takes || !takesOther || !ends) throw new Error('three boxes')
    const taken = await takes.act(takes.bea, 'new-day')
    expect(taken).toMatchObject({ state: 'scheduled', shipment: { shipDay: '2027-05-17' } })
    expect(taken.hold?.answer).toBe('agreed')

    const frosty = await takesOther.press(takesOther.bea, 'new-day', { shipDay: '2027-05-12' })
    expect(frosty.status).toBe(409)
    expect(frosty.body).toMatchObject({ type: '/problems/trip-unsafe' })
    const sunday = await takesOther.press(takesOther.bea, 'new-day', { shipDay: '2027-05-16' })
    expect(sunday.status).toBe(422)
    const other = await takesOther.act(takesOther.bea, 'new-day', { shipDay: '2027-05-18' })
    expect(other).toMatchObject({ state: 'scheduled', shipment: { shipDay: '2027-05-18' } })

    const ended = await ends.act(ends.bea, 'new-day-refusal')
    expect(ended).toMatchObject({ state: 'cancelled', reason: 'hold_declined' })
    expect(ended.money.refundedCents).toBe(11_390)
  })

  it('ends open when no better day can be named, and then silence means a refund', async () => {
    const box = await agreed('open end')
    await box.act(box.hatchery, 'weather-hold', { why: 'Ice on the road, nobody knows how long.' })
    const held = await box.seen()
    expect(held.hold).toMatchObject({ startedBy: 'seller', silenceMoves: false })
    expect(held.hold?.proposed).toBeUndefined()
    const unnamed = await box.press(box.bea, 'new-day')
    expect(unnamed.status).toBe(422)
    await wait(SHIP_NOW, 72.1)
    expect(await box.seen()).toMatchObject({ state: 'cancelled', reason: 'hold_no_consent' })
  })

  it('keeps what it found where nobody can say, and falls back on many years when the forecast is away', async () => {
    const box = await agreed('no forecast')
    desk.weather.setMode('refuses')
    forgetForecasts()
    await lookAt(EVENING)
    expect(await checksOf(box, 'evening')).toMatchObject([{ verdict: 'safe', facts: { basis: 'long-term' } }])
    expect((await box.seen()).shipment?.check?.basis).toBe('long-term')
    desk.weather.setMode('normal')
  })
})

describe('who may, and twice', () => {
  it('is the buyer’s to answer and the seller’s to hold; to others the order does not exist', async () => {
    const box = await agreed('whose')
    const stranger = await desk
      .member('stranger@example.org')
      .then(() => desk.signedIn('stranger@example.org'))
    for (const what of ['weather-hold', 'new-day', 'new-day-refusal'])
      expect(
        (await box.press(stranger, what, what === 'weather-hold' ? { why: 'Frost tonight.' } : {})).status,
      ).toBe(404)
    expect((await box.press(box.bea, 'weather-hold', { why: 'Frost tonight.' })).status).toBe(404)
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost tonight.', shipDay: '2027-05-17' })
    expect((await box.press(box.hatchery, 'new-day')).status).toBe(404)
    // A second hold of a held order has nothing to hold.
    expect((await box.press(box.hatchery, 'weather-hold', { why: 'Frost again.' })).status).toBe(409)
  })

  it('takes one of two answers that come at once, and the same key twice as one', async () => {
    const box = await agreed('at once')
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost tonight.', shipDay: '2027-05-17' })
    const key = keyed()
    const answers = await Promise.all([
      box.bea.post(`${box.path}/new-day`).set(key).send({}),
      box.bea.post(`${box.path}/new-day-refusal`).set(keyed()).send({}),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    await desk.quiet()
    const holds = await desk.db
      .select()
      .from(weatherHold)
      .where(eq(weatherHold.orderId, (await box.row())?.id ?? 0))
    expect(holds).toHaveLength(1)
  })
})

describe('a pickup held by its seller', () => {
  it('keeps a place in the proposed window, and gives the right one back', async () => {
    const windows = [10, 12, 14].map((days) => ({
      day: new Date(SHIP_NOW.getTime() + days * DAY_MS).toISOString().slice(0, 10),
      ...{ from: '09:00', until: '10:00', capacity: 4 },
    }))
    const batch = await desk.batchOf('icy lane', { body: { windows } })
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const [first, second, third] = batch.windows
    const reply = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send({ quantity: 60, near: '40202', version: 1, ticked: batch.ticks, windowId: first?.publicId })
    expect(reply.status, JSON.stringify(reply.body)).toBe(201)
    const order = reply.body as ShownOrder
    await desk.pay(order)
    const path = `/api/v1/orders/${order.orderId}`
    await hatchery
      .post(`${path}/weather-hold`)
      .set(keyed())
      .send({ why: 'The lane is sheer ice.', windowId: second?.publicId })
      .expect(200)
    const taken = async () =>
      Object.fromEntries(
        (await desk.db.select().from(pickupWindow))
          .filter((row) => batch.windows.some((one) => one.publicId === row.publicId))
          .map((row) => [row.publicId, row.taken]),
      )
    expect(await taken()).toEqual({
      [first?.publicId ?? '']: 1,
      [second?.publicId ?? '']: 1,
      [third?.publicId ?? '']: 0,
    })
    const moved = await bea
      .post(`${path}/new-day`)
      .set(keyed())
      .send({ windowId: third?.publicId })
      .expect(200)
    expect((moved.body as ShownOrder).state).toBe('scheduled')
    expect(await taken()).toEqual({
      [first?.publicId ?? '']: 0,
      [second?.publicId ?? '']: 0,
      [third?.publicId ?? '']: 1,
    })
  })
})

describe('the seller’s day of boxes', () => {
  it('looks at all ways of a day, and holds those that are not safe when told to', async () => {
    const box = await agreed('in bulk')
    frost(SHIP_DAY, '2027-05-12')
    const look = (hold: boolean) =>
      box.hatchery.post('/api/v1/routes/checks').set(keyed()).send({ shipDay: SHIP_DAY, hold }).expect(200)
    const seen = (await look(false)).body as {
      rows: { orderId: string; verdict?: string; words?: string }[]
      held: number
    }
    const row = seen.rows.find((one) => one.orderId === box.order.orderId)
    expect(row).toMatchObject({ verdict: 'unsafe', state: 'scheduled' })
    expect(row?.words).toMatch(/^Too cold: /)
    expect(seen.held).toBe(0)
    expect((await look(true)).body).toMatchObject({ held: expect.any(Number) as number })
    expect((await box.seen()).state).toBe('weather_hold')
    const bea = await box.bea.get('/api/v1/routes')
    expect(bea.status).toBe(403)
  })
})
