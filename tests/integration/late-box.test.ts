import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { auditLog } from '@/db/schema/moderation'
import { survival } from '@/db/schema/ratings'
import { seller } from '@/db/schema/sellers'
import { buildMember } from '@/seed/build-member'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { openShipDesk, SHIP_NOW, type Box, type ShipDesk } from '@/tests/support/ship-desk'

/** 20:00 on the promised day where Bea lives. */
const PROMISED = new Date('2027-05-12T00:00:00Z')
const LATE = new Date('2027-05-13T12:00:01Z')
const NOTE = 'The carrier says so in writing.'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('late_box')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterAll(() => desk.close())

async function late(name: string): Promise<Box> {
  const box = await desk.dispatched(name)
  await desk.travelTo(LATE)
  expect((await box.seen()).state).toBe('claim_open')
  return box
}

async function decide(box: Box, send: object) {
  const staff = await desk.staff('staff@example.org')
  const orderId = box.order.orderId
  const answer = await staff
    .post(`/api/v1/moderation/orders/${orderId}/decision`)
    .set({ 'idempotency-key': `decide-${orderId}-${JSON.stringify(send).length}` })
    .send({ note: NOTE, ...send })
  await desk.quiet()
  return answer
}

const marks = async () => {
  const [row] = await desk.db.select().from(seller).where(eq(seller.id, desk.hatchery.id))
  return { daysMissed: row?.daysMissed, answersMissed: row?.answersMissed }
}

const survivalOf = async (box: Box) =>
  desk.db
    .select()
    .from(survival)
    .where(eq(survival.orderId, (await box.row())?.id ?? 0))

describe('a box that a storm stopped', () => {
  it('opens a claim by itself 36 hours after its promised time, marks nobody and says what to do', async () => {
    const before = await marks()
    const box = await desk.dispatched('by itself')
    await desk.travelTo(new Date(LATE.getTime() - 2000))
    expect((await box.seen()).state).toBe('dispatched')
    desk.letters.length = 0
    await desk.travelTo(LATE)
    expect(await box.seen()).toMatchObject({ state: 'claim_open', money: { strip: { heldCents: 11_390 } } })
    expect((await box.row())?.claimType).toBe('late_or_lost')
    expect(await marks()).toEqual(before)
    expect(desk.letters.map(({ to }) => to.email).sort()).toEqual(['bea@example.org', desk.hatcheryEmail])
    for (const { blocks } of desk.letters) {
      const said = JSON.stringify(blocks)
      expect(said).toContain('counter')
      expect(said).toContain('9400 1112 0255 5512')
    }
    expect(JSON.stringify(desk.letters)).toContain('keep it closed, cool and shaded')
    expect(await box.stock()).toMatchObject({ shipped: 60, delivered: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('can be told of by its buyer, not before the promised time is over', async () => {
    const box = await desk.dispatched('told')
    await desk.travelTo(new Date(PROMISED.getTime() - 60_000))
    const early = await box.press(box.bea, 'late-box')
    expect([early.status, early.body.detail]).toEqual([409, expect.stringContaining('May 11')])
    expect((await box.seen()).may).not.toContain('report-late-box')
    await desk.travelTo(new Date(PROMISED.getTime() + 60_000))
    expect((await box.press(box.hatchery, 'late-box')).status).toBe(404)
    expect((await box.act(box.bea, 'late-box')).state).toBe('claim_open')
    expect((await box.row())?.claimType).toBe('late_or_lost')
  })

  it('pays the seller whole when all are alive after all', async () => {
    const box = await late('alive')
    const done = await box.act(box.bea, 'late-arrival', { aliveCount: 60 })
    expect(done.state).toBe('settled')
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: 0, feeCents: 320 },
      strip: { heldCents: 0, releasedCents: 11_070 },
    })
    expect(await box.stock()).toMatchObject({ shipped: 0, delivered: 60 })
    expect(await survivalOf(box)).toMatchObject([{ handedOver: 60 }])
    expect((await box.seen()).may).toContain('rate')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('is for a moderator when some are dead: the shortfall goes back, box and freight only under half', async () => {
    const box = await late('some dead')
    const told = await box.act(box.bea, 'late-arrival', { aliveCount: 54 })
    expect(told).toMatchObject({ state: 'claim_open', shipment: { aliveCount: 54 } })
    expect((await box.press(box.hatchery, 'late-arrival', { aliveCount: 60 })).status).toBe(404)
    expect((await decide(box, { outcome: 'handed-over' })).status).toBe(422)
    expect((await decide(box, { outcome: 'arrived' })).body.errors).toMatchObject([
      { pointer: '#/aliveCount' },
    ])
    const done = await decide(box, { outcome: 'arrived', aliveCount: 54 })
    expect([done.status, done.body.state]).toEqual([200, 'settled'])
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: 534, feeCents: 288 },
      strip: { heldCents: 0, releasedCents: 10_568 },
    })
    expect(await box.stock()).toMatchObject({ shipped: 0, delivered: 60 })
    expect(await survivalOf(box)).toMatchObject([{ handedOver: 54 }])
    const audit = await desk.db.select().from(auditLog).where(eq(auditLog.act, 'order-decided'))
    expect(audit.at(-1)?.facts).toEqual({ outcome: 'arrived', aliveCount: 54, note: NOTE })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('gives box and freight back too when fewer than half live, and the fee falls by the goods alone', async () => {
    const box = await late('most dead')
    expect((await decide(box, { outcome: 'arrived', aliveCount: 29 })).status).toBe(200)
    const goods = 31 * 89
    const fee = Math.round((5340 - goods) * 0.06)
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: goods + 6050, feeCents: fee },
      strip: { heldCents: 0, releasedCents: 11_390 - goods - 6050 - fee },
    })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('goes back to the last cent when it is lost', async () => {
    const box = await late('lost')
    const done = await decide(box, { outcome: 'lost' })
    expect([done.status, done.body.state]).toEqual([200, 'settled'])
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: 11_390, feeCents: 0 },
      strip: { heldCents: 0, releasedCents: 0 },
    })
    expect(await box.stock()).toMatchObject({ free: 440, shipped: 0, delivered: 0 })
    expect(await survivalOf(box)).toEqual([])
    expect((await box.seen()).may).not.toContain('rate')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })
})
