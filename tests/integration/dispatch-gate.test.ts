import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { order, orderEvent } from '@/db/schema/orders'
import { noShipDay, routeCheck } from '@/db/schema/shipments'
import { packingTicks } from '@/shared/contracts/ship-acts'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import {
  leaving,
  onShipDay,
  openShipDesk,
  permit,
  SHIP_DAY,
  SHIP_NOW,
  type Box,
  type ShipDesk,
} from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('dispatch_gate')
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterAll(() => desk.close())

/** Ready on its day with its paper and a safe look at the way: one press and it is gone. */
async function waiting(name: string): Promise<Box> {
  const box = await desk.ready(name)
  await desk.travelTo(onShipDay(14))
  await box.act(box.hatchery, 'route-papers', { papers: [permit] })
  await box.act(box.hatchery, 'route-check')
  return box
}

async function refused(box: Box, send: object = leaving()) {
  const { status, body } = await box.press(box.hatchery, 'dispatch', send)
  expect([status, body.type]).toEqual([409, '/problems/dispatch-refused'])
  const errors = body.errors as { pointer: string; detail: string }[]
  const { nearestShipDay } = body.facts as { nearestShipDay?: string }
  return {
    pointers: errors.map(({ pointer }) => pointer),
    errors,
    nearestShipDay,
    detail: String(body.detail),
  }
}

const changeChecks = async (box: Box, change: Partial<typeof routeCheck.$inferInsert>) =>
  desk.db
    .update(routeCheck)
    .set(change)
    .where(eq(routeCheck.orderId, (await box.row())?.id ?? 0))

const stays = async (box: Box) => {
  expect((await box.seen()).state).toBe('ready')
  expect(await box.stock()).toMatchObject({ sold: 60, shipped: 0 })
}

describe('the dispatch gate refuses', () => {
  it('a balance that was not paid', async () => {
    const box = await desk.scheduled('unpaid')
    const told = await refused(box)
    expect(told.pointers).toContain('#/balance')
    expect(told.errors.find(({ pointer }) => pointer === '#/balance')?.detail).toContain('not paid')
    expect((await box.seen()).state).toBe('scheduled')

    const ready = await waiting('unpaid ready')
    await ready.setOrder({ balancePaidAt: null })
    const alone = await refused(ready)
    expect([alone.pointers, alone.nearestShipDay]).toEqual([['#/balance'], SHIP_DAY])
    await stays(ready)
  })

  it('a paper that is not named, and one that is over before the box arrives', async () => {
    const box = await waiting('papers')
    await box.act(box.hatchery, 'route-papers', { papers: [] })
    const missing = await refused(box)
    expect([missing.pointers, missing.nearestShipDay]).toEqual([['#/papers'], SHIP_DAY])
    expect(missing.detail).toContain(permit.kind)
    await box.act(box.hatchery, 'route-papers', { papers: [{ ...permit, expiresOn: SHIP_DAY }] })
    const over = await refused(box)
    expect(over.pointers).toEqual(['#/papers'])
    expect(over.detail).toContain('expires on Mon, May 10, 2027')
    await stays(box)
    const backwards = { ...permit, expiresOn: '2026-01-01' }
    expect((await box.press(box.hatchery, 'route-papers', { papers: [backwards] })).status).toBe(422)
    await box.act(box.hatchery, 'route-papers', { papers: [{ ...permit, expiresOn: '2027-05-11' }] })
    expect((await box.act(box.hatchery, 'dispatch', leaving())).state).toBe('dispatched')
  })

  it('a look at the way that is older than 12 hours, of another day, not safe, or none', async () => {
    const box = await waiting('looks')
    const at = (hours: number) => new Date(onShipDay(14).getTime() - hours * 3_600_000)
    await changeChecks(box, { at: at(12.1) })
    const old = await refused(box)
    expect([old.pointers, old.nearestShipDay]).toEqual([['#/check'], SHIP_DAY])
    expect(old.detail).toContain('12 hours old')
    await changeChecks(box, { at: at(1), verdict: 'unsafe' })
    expect((await refused(box)).detail).toContain('not safe')
    await changeChecks(box, { verdict: 'unknown' })
    expect((await refused(box)).pointers).toEqual(['#/check'])
    await changeChecks(box, { verdict: 'safe', shipDay: '2027-05-12' })
    expect((await refused(box)).detail).toContain('has not been looked at')
    await stays(box)
    // The latest look counts, whatever an older one said.
    await changeChecks(box, { verdict: 'unsafe', shipDay: SHIP_DAY })
    await box.act(box.hatchery, 'route-check')
    expect((await box.act(box.hatchery, 'dispatch', leaving())).state).toBe('dispatched')
  })

  it('any day but the agreed one', async () => {
    const box = await desk.ready('early')
    await desk.travelTo(new Date('2027-05-05T14:00:00Z'))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    const early = await refused(box)
    expect([early.pointers, early.nearestShipDay]).toEqual([['#/shipDay'], SHIP_DAY])
    expect(early.detail).toContain('Mon, May 10')
    await desk.travelTo(new Date('2027-05-11T14:00:00Z'))
    await box.act(box.hatchery, 'route-check')
    const late = await refused(box)
    // Two days without food first: Thursday is no ship day, so the next Monday.
    expect([late.pointers, late.nearestShipDay]).toEqual([['#/shipDay'], '2027-05-17'])
    await stays(box)
  })

  it('a day that a moderator closed meanwhile, where it leaves or where it arrives', async () => {
    const box = await waiting('closed')
    const close = { why: 'Founders day', source: 'own', changedAt: SHIP_NOW }
    await desk.db.insert(noShipDay).values({ ...close, day: '2027-05-11' })
    const told = await refused(box)
    expect([told.pointers, told.nearestShipDay]).toEqual([['#/shipDay'], '2027-05-12'])
    expect(told.detail).toContain('Founders day')
    await desk.db.delete(noShipDay).where(eq(noShipDay.day, '2027-05-11'))
    await box.act(box.hatchery, 'dispatch', leaving())
  })

  it('a Thursday for an overnight box before a Friday without carriers, and names the Monday after', async () => {
    // Juneteenth 2027 falls on a Saturday and is observed on Friday, June 18.
    await desk.travelToWithoutRest(new Date('2027-06-07T14:00:00Z'))
    const box = await desk.ready('thursday', { ship: { shipDay: '2027-06-16' } })
    await box.setShipment({ shipDay: '2027-06-17', arriveDay: '2027-06-18' })
    await box.setOrder({ slotEndsAt: new Date('2027-06-17T22:00:00Z') })
    await desk.travelTo(new Date('2027-06-17T14:00:00Z'))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    const told = await refused(box)
    // In June cold and heat of many years ask for two packings: without a forecast nobody knows which.
    const pointers = ['#/check', '#/shipDay', '#/shipDay']
    expect([told.pointers, told.nearestShipDay]).toEqual([pointers, '2027-06-21'])
    expect(told.errors.map(({ detail }) => detail).join(' ')).toMatch(/Fri, Jun 18.*Juneteenth/)
    await stays(box)
  })

  it('ticks that are missing, each by its name', async () => {
    const box = await waiting('ticks')
    const told = await refused(box, leaving({ ticks: ['strong-carton', 'carrier-told'] }))
    const missing = packingTicks.filter((tick) => !['strong-carton', 'carrier-told'].includes(tick))
    expect(told.pointers).toEqual(missing.map((tick) => `#/ticks/${tick}`))
    const noNumber = await box.press(box.hatchery, 'dispatch', leaving({ tracking: '' }))
    expect(noNumber.body).toMatchObject({ status: 422, errors: [{ pointer: '#/tracking' }] })
    await stays(box)
  })

  it('with all reasons at once', async () => {
    const box = await waiting('everything')
    await box.act(box.hatchery, 'route-papers', { papers: [{ ...permit, expiresOn: '2027-05-01' }] })
    await box.setOrder({ balancePaidAt: null })
    await box.setShipment({ shipDay: '2027-05-12', arriveDay: '2027-05-13' })
    const told = await refused(box, leaving({ ticks: [] }))
    expect(told.pointers).toEqual([
      ...['#/balance', '#/papers', '#/check', '#/shipDay'],
      ...packingTicks.map((tick) => `#/ticks/${tick}`),
    ])
    expect(told.nearestShipDay).toBe('2027-05-12')
    await stays(box)
  })

  it('a batch that is being recalled, and an order that is frozen', async () => {
    const box = await waiting('overlays')
    await box.setOrder({ recall: 'open' })
    expect((await box.press(box.hatchery, 'dispatch', leaving())).status).toBe(409)
    await box.setOrder({ recall: 'none', freeze: 'admin' })
    expect((await box.press(box.hatchery, 'dispatch', leaving())).status).toBe(409)
    await stays(box)
    await box.setOrder({ freeze: 'none' })
    expect((await box.press(box.bea, 'dispatch', leaving())).status).toBe(404)
  })
})

describe('the dispatch gate lets through', () => {
  it('one of two presses at once, and a repeat of the same press', async () => {
    const box = await waiting('presses')
    const press = (key = keyed()) => box.hatchery.post(`${box.path}/dispatch`).set(key).send(leaving())
    const answers = await Promise.all([press(), press(), press()])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409])
    const again = keyed()
    expect((await press(again)).status).toBe(409)
    const events = await desk.db
      .select()
      .from(orderEvent)
      .where(eq(orderEvent.orderId, (await box.row())?.id ?? 0))
    expect(events.filter(({ edge }) => edge === 'E29')).toHaveLength(1)
    expect(await box.stock()).toMatchObject({ sold: 0, shipped: 60 })

    await desk.travelToWithoutRest(SHIP_NOW)
    const same = await waiting('repeat')
    const key = keyed()
    const first = await same.pressAs(key, same.hatchery, ['dispatch', leaving()])
    const second = await same.pressAs(key, same.hatchery, ['dispatch', leaving()])
    expect([first.status, second.status]).toEqual([200, 200])
    expect(second.body).toEqual(first.body)
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('nothing of an order that is collected', async () => {
    const batch = await desk.batch('collected')
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const { ticks, publicId, windows } = batch
    const send = { quantity: 25, windowId: windows[0]?.publicId, near: '45202', version: 1, ticked: ticks }
    const held = await bea.post(`/api/v1/listings/${publicId}/orders`).set(keyed()).send(send).expect(201)
    const path = `/api/v1/orders/${held.body.orderId}`
    const answer = await hatchery.post(`${path}/dispatch`).set(keyed()).send(leaving())
    expect([answer.status, answer.body.type]).toEqual([409, '/problems/order-moved'])
    await bea.get(`${path}/ship-days`).expect(409)
    const [row] = await desk.db.select().from(order).where(eq(order.publicId, held.body.orderId))
    expect(row).toMatchObject({ handOver: 'pickup', boxCents: 0, freightCents: 0 })
  })
})
