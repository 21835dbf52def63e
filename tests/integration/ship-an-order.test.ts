import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { orderEvent } from '@/db/schema/orders'
import { routeCheck } from '@/db/schema/shipments'
import { buildMember } from '@/seed/build-member'
import type { ShipDayOffers } from '@/shared/contracts/shipments'
import { printDate } from '@/shared/domain/calendar/print-date'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import {
  beaAddress,
  leaving,
  LOUISVILLE,
  onShipDay,
  openShipDesk,
  permit,
  SHIP_DAY,
  SHIP_NOW,
  shipping,
  type ShipDesk,
} from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('ship_an_order')
  await desk.member('eve@example.org')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterAll(() => desk.close())

const subjects = (to: string) =>
  desk.letters.filter((letter) => letter.to.email === to).map((letter) => letter.subject)

describe('reserving a box', () => {
  it('asks for an address that is the place judged, and for what the seller offers', async () => {
    const batch = await desk.batchOf('address', {
      body: { shipping: { ...shipping, holdsAtCounter: false } },
    })
    const pointers = async (ship: object, change: object = {}) => {
      const { status, body } = await desk.ask(batch, { ship: ship as never, change: change as never })
      expect(status).toBe(422)
      return (body.errors as { pointer: string }[]).map(({ pointer }) => pointer)
    }
    expect(await pointers({ address: { ...beaAddress, zip: '45202' } })).toEqual(['#/ship/address/zip'])
    expect(await pointers({ address: { ...beaAddress, state: 'OH' } })).toEqual(['#/ship/address/state'])
    expect(await pointers({ deliverTo: 'counter' })).toEqual(['#/ship/deliverTo'])
    const windowId = batch.windows[0]?.publicId
    expect(await pointers({ deliverTo: 'counter' }, { windowId })).toEqual(['#/ship/deliverTo', '#/windowId'])
    const late = await desk.ask(batch, { ship: { shipDay: '2027-05-04' } })
    expect(late.body).toMatchObject({
      type: '/problems/fields-invalid',
      errors: [{ pointer: '#/ship/shipDay' }],
      facts: { nearestShipDay: '2027-05-05' },
    })
    const weekend = await desk.ask(batch, { ship: { shipDay: '2027-05-06' } })
    expect(weekend.body.facts).toEqual({ nearestShipDay: '2027-05-10' })
  })

  it('refuses a day on which they would not survive, with the reasons and the next day that is safe', async () => {
    await desk.travelToWithoutRest(new Date('2027-01-04T15:00:00Z'))
    const batch = await desk.batchOf('frost')
    const reply = await desk.ask(batch, { ship: { shipDay: '2027-01-11' } })
    expect([reply.status, reply.body.type]).toEqual([409, '/problems/trip-unsafe'])
    expect(reply.body.detail).toContain('colder')
    expect(reply.body.facts).toEqual({ verdict: 'unsafe' })
    expect(await desk.db.select().from(routeCheck).where(eq(routeCheck.shipDay, '2027-01-11'))).toEqual([])
    // A fortnight later some of the next days are mild enough: the first of them is named, as the offers have it.
    await desk.travelToWithoutRest(new Date('2027-01-18T15:00:00Z'))
    const later = await desk.ask(batch, { ship: { shipDay: '2027-01-20' } })
    const offers = (
      await desk
        .visitor()
        .get(`/api/v1/listings/${batch.publicId}/ship-days`)
        .query({ near: LOUISVILLE, quantity: 60 })
        .expect(200)
    ).body as ShipDayOffers
    const safe = offers.days.find(({ verdict }) => verdict === 'safe')?.shipDay
    expect(offers.days[0]?.reasons.join(' ')).toContain('colder')
    expect(safe).toMatch(/^2027-0[12]-/)
    expect(later.body.facts).toEqual({ verdict: 'unsafe', nearestSafeDay: safe })
    expect(later.body.detail).toContain(`The nearest day that is safe is ${printDate(safe ?? '')}.`)
  })

  it('refuses animals so small that no figures reach them', async () => {
    const batch = await desk.batchOf('unknown', { body: { sizeLoMm: 6.35, sizeHiMm: 6.35 } })
    const reply = await desk.ask(batch)
    expect([reply.status, reply.body.type]).toEqual([409, '/problems/trip-unsafe'])
    expect(reply.body.facts).toEqual({ verdict: 'unknown' })
  })

  it('makes one order of one key', async () => {
    const batch = await desk.batchOf('twice')
    const key = keyed()
    const [first, second] = [await desk.ask(batch, {}, key), await desk.ask(batch, {}, key)]
    expect(first.status).toBe(201)
    expect(second.body.orderId).toBe(first.body.orderId)
    await (
      await desk.signedIn('bea@example.org')
    )
      .post(`/api/v1/orders/${first.body.orderId}/departure`)
      .set(keyed())
      .expect(200)
  })
})

describe('a shipped order', () => {
  it('goes from the hold to the money, cent for cent', async () => {
    const box = await desk.held('whole')
    const { bea, hatchery, act, seen, stock } = box
    expect(box.order.money).toMatchObject({
      ...{ goodsCents: 5340, boxCents: 1200, freightCents: 4850, totalCents: 11_390 },
      ...{ depositCents: 1335, balanceCents: 10_055, feeCents: 320 },
    })
    expect(box.order).toMatchObject({ handOver: 'ship', balanceDue: 'before' })
    await desk.pay(box.order)
    const agreed = await seen()
    expect(agreed).toMatchObject({
      state: 'scheduled',
      slot: { startsAt: '2027-05-10T10:00:00.000Z', endsAt: '2027-05-10T22:00:00.000Z' },
      shipment: {
        shipDay: SHIP_DAY,
        arriveDay: '2027-05-11',
        boxes: 1,
        toZone: 'America/Kentucky/Louisville',
      },
    })
    expect(agreed.meeting).toBeUndefined()
    expect((await box.press(hatchery, 'readiness')).body.type).toBe('/problems/balance-unpaid')
    await desk.pay(await act(bea, 'balance-payment'))
    expect((await act(hatchery, 'readiness')).state).toBe('ready')
    expect((await seen()).handOverCode).toBeUndefined()
    expect(await stock()).toMatchObject({ free: 440, sold: 60 })

    await desk.travelTo(onShipDay(12))
    const named = await act(hatchery, 'route-papers', { papers: [permit] })
    expect(named.shipment).toMatchObject({ papersNeeded: [permit.kind], papers: [permit] })
    const checked = await act(hatchery, 'route-check')
    expect(checked.state).toBe('ready')
    expect(checked.shipment?.check).toMatchObject({ kind: 'seller', verdict: 'safe', shipDay: SHIP_DAY })
    expect(checked.shipment?.check?.goodUntil).toBeDefined()
    const sent = await act(hatchery, 'dispatch', leaving())
    expect(sent).toMatchObject({ state: 'dispatched', shipment: { tracking: '9400 1112 0255 5512' } })
    // 20:00 in Louisville on the next day, and 36 hours.
    expect(sent.clock).toEqual({ at: '2027-05-13T12:00:00.000Z', edge: 'E36' })
    expect(await stock()).toMatchObject({ sold: 0, shipped: 60 })

    await desk.travelTo(new Date('2027-05-11T16:00:00Z'))
    const arrived = await act(bea, 'arrival')
    expect(arrived).toMatchObject({ state: 'arrived', clock: { at: expect.any(String), edge: 'E38' } })
    expect(arrived.may).toEqual(expect.arrayContaining(['confirm-good', 'rate']))
    expect(await stock()).toMatchObject({ shipped: 0, delivered: 60 })
    const done = await act(bea, 'confirmation')
    expect(done.state).toBe('settled')
    expect((await seen()).money).toMatchObject({
      feeCents: 320,
      strip: { heldCents: 0, releasedCents: 11_070 },
    })
    expect(await brokenInvariants(desk.db)).toEqual([])
    const events = await desk.db
      .select()
      .from(orderEvent)
      .where(eq(orderEvent.orderId, (await box.row())?.id ?? 0))
    expect(events.map(({ edge }) => edge)).toEqual(['E01', 'E05', 'E14', 'E22', 'E29', 'E35', 'E38'])
    expect(events.find(({ edge }) => edge === 'E29')?.facts.ticks).toContain('strong-carton')
    expect(subjects('bea@example.org')).toEqual(
      expect.arrayContaining([
        'The box leaves Mon, May 10',
        'On their way: arriving Tue, May 11',
        'They have arrived: look after them now',
        'Receipt: your order is complete',
      ]),
    )
    expect(subjects(desk.hatcheryEmail)).toEqual(
      expect.arrayContaining(['The box has arrived', 'Your money is on its way']),
    )
  })

  it('pays the seller by itself when the claim window is over', async () => {
    const box = await desk.dispatched('silent buyer')
    await desk.travelTo(new Date('2027-05-11T16:00:00Z'))
    await box.act(box.bea, 'arrival')
    await desk.travelTo(new Date('2027-05-12T16:00:01Z'))
    expect(await box.seen()).toMatchObject({ state: 'settled', money: { strip: { releasedCents: 11_070 } } })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('gives everything back when the box is never sent, and counts it', async () => {
    const box = await desk.ready('never sent')
    await desk.travelTo(new Date('2027-05-13T22:00:01Z'))
    const over = await box.seen()
    expect(over).toMatchObject({ state: 'cancelled', reason: 'seller_missed_day' })
    expect(over.money).toMatchObject({ refundedCents: 11_390, strip: { heldCents: 0 } })
    expect(await box.stock()).toMatchObject({ free: 440, sold: 0, shipped: 0 })
    expect(subjects('bea@example.org')).toContain('The box was never sent')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('keeps at most the deposit on the goods when it is cancelled late', async () => {
    const box = await desk.ready('late cancel')
    await desk.travelTo(new Date('2027-05-08T14:00:00Z'))
    expect((await box.press(box.hatchery, 'hand-over', { code: '000000', count: 60 })).body.type).toBe(
      '/problems/order-moved',
    )
    await box.act(box.bea, 'cancellation')
    expect((await box.seen()).money).toMatchObject({
      ...{ refundedCents: 10_055, feeCents: 80 },
      strip: { heldCents: 0, releasedCents: 1255 },
    })
    expect(await box.stock()).toMatchObject({ free: 500, sold: 0 })
    expect(await brokenInvariants(desk.db)).toEqual([])
  })

  it('tells the address to its buyer always, to its seller from the agreed day on, to nobody else', async () => {
    const box = await desk.held('secret', { body: { accept: 'ask' } })
    const said = async (by: typeof box.bea) => JSON.stringify(await box.seen(by))
    expect(await said(box.bea)).toContain('77 Quiet Alley')
    await desk.pay(box.order)
    expect(await said(box.hatchery)).not.toContain('Quiet Alley')
    await box.act(box.hatchery, 'acceptance')
    expect((await box.seen()).state).toBe('scheduled')
    expect(await said(box.hatchery)).toContain('77 Quiet Alley')
    const staff = await desk.staff('staff@example.org')
    expect(await said(staff)).not.toContain('Quiet Alley')
    const eve = await desk.signedIn('eve@example.org')
    const paths = ['', '/ship-days', '/movement-document', '/packing-sheet']
    for (const path of paths) await eve.get(`${box.path}${path}`).expect(404)
    const acts = [
      ...[
        ['ship-day', { shipDay: '2027-05-12' }],
        ['route-check', {}],
        ['route-papers', { papers: [] }],
      ],
      ...[
        ['dispatch', leaving()],
        ['arrival', {}],
        ['late-box', {}],
        ['late-arrival', { aliveCount: 1 }],
      ],
    ] as [string, object][]
    for (const [act, send] of acts) {
      const { status, body } = await box.press(eve, act, send)
      expect([act, status, JSON.stringify(body).includes('Quiet')]).toEqual([act, 404, false])
    }
    await box.act(box.bea, 'cancellation')
    expect(await said(box.hatchery)).not.toContain('Quiet Alley')
  })

  it('does not agree on a day that came too near while the seller thought about it', async () => {
    const box = await desk.held('slow seller', {
      body: { accept: 'ask' },
      ship: { shipDay: '2027-05-05' },
    })
    await desk.pay(box.order)
    await desk.travelTo(new Date('2027-05-04T14:00:00Z'))
    await box.act(box.hatchery, 'acceptance')
    const waiting = await box.seen()
    expect(waiting.state).toBe('deposit_paid')
    expect(waiting.may).toContain('choose-ship-day')
    expect(subjects('bea@example.org')).toContain('Your animals are set aside')
    const chosen = await box.act(box.bea, 'ship-day', { shipDay: '2027-05-11' })
    expect(chosen).toMatchObject({ state: 'scheduled', shipment: { shipDay: '2027-05-11' } })
    await box.act(box.bea, 'cancellation')
  })

  it('moves once for each side when it is ready, to lawful and safe days only', async () => {
    const box = await desk.ready('moving')
    const { bea, hatchery, act, press } = box
    const offered = (await bea.get(`${box.path}/ship-days`).expect(200)).body as ShipDayOffers
    expect(offered.days[0]?.shipDay).toBe('2027-05-05')
    const unlawful = await press(bea, 'ship-day', { shipDay: '2027-05-13' })
    expect(unlawful.body).toMatchObject({ errors: [{ pointer: '#/shipDay' }] })
    expect((await press(bea, 'ship-day', { shipDay: SHIP_DAY })).status).toBe(422)
    const key = keyed()
    const moved = await box.pressAs(key, bea, ['ship-day', { shipDay: '2027-05-12' }])
    expect(moved.body).toMatchObject({
      state: 'scheduled',
      slot: { startsAt: '2027-05-12T10:00:00.000Z' },
      shipment: { arriveDay: '2027-05-13', promisedAt: '2027-05-14T00:00:00.000Z' },
    })
    expect((await box.pressAs(key, bea, ['ship-day', { shipDay: '2027-05-12' }])).body).toEqual(moved.body)
    await act(hatchery, 'readiness')
    expect((await press(bea, 'ship-day', { shipDay: '2027-05-17' })).body.type).toBe('/problems/order-moved')
    await act(hatchery, 'ship-day', { shipDay: '2027-05-17' })
    await act(hatchery, 'readiness')
    expect((await press(hatchery, 'ship-day', { shipDay: '2027-05-18' })).status).toBe(409)
    expect((await press(hatchery, 'hand-over', { code: '000000', count: 60 })).status).toBe(409)
    expect((await press(bea, 'no-show')).status).toBe(409)
    await act(bea, 'cancellation')
    expect(await brokenInvariants(desk.db)).toEqual([])
  })
})
