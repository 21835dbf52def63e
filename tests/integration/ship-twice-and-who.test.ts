import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { order as orders } from '@/db/schema/orders'
import { buildMember } from '@/seed/build-member'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import {
  leaving,
  onShipDay,
  openShipDesk,
  permit,
  SHIP_NOW,
  type Box,
  type ShipDesk,
} from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('ship_twice_and_who')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
  await buildMember(desk.db, { email: 'bare@example.org', role: 'member,moderator' })
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterEach(async () => {
  await desk.quiet()
  expect(await brokenInvariants(desk.db)).toEqual([])
})
afterAll(() => desk.close())

/** Promised until 20:00 of May 11 in Louisville, and 36 hours. */
const LATE = new Date('2027-05-13T12:00:01Z')

async function decide(box: Box, send: object) {
  const staff = await desk.staff('staff@example.org')
  const answer = await staff
    .post(`/api/v1/moderation/orders/${box.order.orderId}/decision`)
    .set(keyed())
    .send({ note: 'The carrier says so in writing.', ...send })
  await desk.quiet()
  return answer
}

describe('the same key', () => {
  it('with the same words is one act, with other words is refused', async () => {
    const box = await desk.ready('keys')
    const twice = async (by: Box['bea'], what: string, [first, other]: [object, object]) => {
      const key = keyed()
      const [one, two] = [
        await box.pressAs(key, by, [what, first]),
        await box.pressAs(key, by, [what, first]),
      ]
      expect([what, one.status, two.status]).toEqual([what, 200, 200])
      expect(two.body).toEqual(one.body)
      expect([what, (await box.pressAs(key, by, [what, other])).status]).toEqual([what, 422])
    }
    await twice(box.hatchery, 'route-papers', [{ papers: [permit] }, { papers: [] }])
    await twice(box.hatchery, 'weather-hold', [{ why: 'Frost is coming.' }, { why: 'Ice is coming.' }])
    await twice(box.bea, 'new-day', [{ shipDay: '2027-05-10' }, { shipDay: '2027-05-11' }])
    await box.act(box.hatchery, 'readiness')
    await twice(box.bea, 'ship-day', [{ shipDay: '2027-05-11' }, { shipDay: '2027-05-12' }])
    await box.act(box.hatchery, 'readiness')
    await desk.travelTo(new Date(onShipDay(14).getTime() + 24 * 3_600_000))
    await box.act(box.hatchery, 'route-check')
    await twice(box.hatchery, 'dispatch', [leaving(), leaving({ tracking: 'another one' })])
    expect((await box.seen()).shipment?.tracking).toBe('9400 1112 0255 5512')
    expect(await box.stock()).toMatchObject({ sold: 0, shipped: 60 })
  })
})

describe('staff without the second factor', () => {
  it('is a stranger to every order, its papers and its acts', async () => {
    const box = await desk.dispatched('bare staff')
    const bare = await desk.signedIn('bare@example.org')
    for (const path of ['', '/ship-days', '/movement-document', '/packing-sheet'])
      expect([path, (await bare.get(`${box.path}${path}`)).status]).toEqual([path, 404])
    for (const what of ['route-check', 'arrival', 'late-box', 'new-day', 'new-day-refusal'])
      expect([what, (await box.press(bare, what)).status]).toEqual([what, 404])
    const staff = await desk.staff('staff@example.org')
    expect((await staff.get(`${box.path}/packing-sheet`)).status).toBe(404)
    expect((await box.press(staff, 'dispatch', leaving())).status).toBe(404)
  })
})

describe('looks at the way', () => {
  it('are not made without end', async () => {
    const box = await desk.scheduled('many looks')
    const last = async (path: string, send: object, most: number) => {
      const hatchery = await desk.signedIn(desk.hatcheryEmail)
      const statuses: number[] = []
      for (let at = 0; at <= most; at++)
        statuses.push((await hatchery.post(path).set(keyed()).send(send)).status)
      return [statuses.at(-2), statuses.at(-1)]
    }
    // Refused for their words, and counted all the same.
    expect(await last(`${box.path}/weather-hold`, { why: '' }, 60)).toEqual([422, 429])
    expect(await last('/api/v1/routes/checks', { shipDay: '2027-05-11', hold: false }, 6)).toEqual([200, 429])
  })
})

describe('days an order could be moved to', () => {
  it('are told while a day can be moved, and not before or after', async () => {
    const box = await desk.held('days', { body: { accept: 'ask' } })
    await desk.pay(box.order)
    const days = async (by: Box['bea']) => (await by.get(`${box.path}/ship-days`)).status
    expect(await days(box.hatchery)).toBe(409)
    await box.act(box.hatchery, 'acceptance')
    expect(await days(box.hatchery)).toBe(200)
    await box.act(box.hatchery, 'weather-hold', { why: 'Frost is coming.' })
    expect(await days(box.bea)).toBe(200)
    await box.act(box.bea, 'new-day-refusal')
    expect([await days(box.bea), await days(box.hatchery)]).toEqual([409, 409])
  })
})

describe('a late box', () => {
  it.each([
    [0, 5340 + 6050, 0],
    [1, 59 * 89 + 6050, 5],
    [30, 30 * 89, 160],
    [59, 89, 315],
    [60, 0, 320],
  ])('with %i of 60 alive gives back %i cents and leaves a fee of %i', async (aliveCount, back, fee) => {
    const box = await desk.dispatched(`late ${aliveCount}`)
    await desk.travelTo(LATE)
    expect((await decide(box, { outcome: 'arrived', aliveCount })).status).toBe(200)
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: back, feeCents: fee },
      strip: { heldCents: 0, releasedCents: 11_390 - back - fee },
    })
  })
})

describe('money while the processor is away', () => {
  it.each(['declined', 'no-consent', 'missed-day'] as const)(
    'is given back once it is there: %s',
    async (how) => {
      const box = await desk.ready(`away ${how}`)
      if (how !== 'missed-day') await box.act(box.hatchery, 'weather-hold', { why: 'Ice on the road.' })
      await desk.fake.control('refuse-connections', { ms: 600 })
      if (how === 'declined')
        await box.bea.post(`${box.path}/new-day-refusal`).set(keyed()).send({}).expect(200)
      if (how === 'no-consent')
        await desk.travelToWithoutRest(new Date(SHIP_NOW.getTime() + 72.1 * 3_600_000))
      if (how === 'missed-day') await desk.travelToWithoutRest(new Date('2027-05-13T22:00:01Z'))
      const [row] = await desk.db.select().from(orders).where(eq(orders.publicId, box.order.orderId))
      expect(row?.state).toBe('cancelled')
      // Effects come back after a pause of their own, in real time.
      const heldCents = async () => {
        await desk.quiet()
        return (await box.seen()).money.strip.heldCents
      }
      await expect.poll(heldCents, { timeout: 30_000, interval: 500 }).toBe(0)
      expect((await box.seen()).money.refundedCents).toBe(11_390)
    },
  )
})
