import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { orderEvent } from '@/db/schema/orders'
import { routeCheck } from '@/db/schema/shipments'
import { buildMember } from '@/seed/build-member'
import { remindBoxes } from '@/server/notices/remind-boxes'
import { remindPickups } from '@/server/notices/remind-pickups'
import type { ShipDayOffers } from '@/shared/contracts/shipments'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { printDate } from '@/shared/domain/calendar/print-date'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { keyed } from '@/tests/support/order-desk'
import { pdfWords } from '@/tests/support/pdf-words'
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

describe('the days on which a box could leave', () => {
  const days = (listingId: string, query: object) =>
    desk.visitor().get(`/api/v1/listings/${listingId}/ship-days`).query(query)

  it('are told to anybody, lawful, judged, with what the boxes cost', async () => {
    const batch = await desk.batchOf('days')
    const { body } = await days(batch.publicId, { near: LOUISVILLE, quantity: 120 }).expect(200)
    const offers = body as ShipDayOffers
    expect(offers).toMatchObject({ boxes: 2, boxCents: 2400, freightCents: 9700 })
    expect(offers.days.map(({ shipDay }) => shipDay).slice(0, 4)).toEqual([
      ...['2027-05-05', '2027-05-10', '2027-05-11', '2027-05-12'],
    ])
    expect(offers.days).toHaveLength(9)
    expect(offers.days[1]).toMatchObject({ arriveDay: '2027-05-11', verdict: 'safe', basis: 'long-term' })
    expect(offers.days[1]?.packing).toMatchObject({ animalsPerBox: 60, packs: 'none' })
    expect(JSON.stringify(offers)).not.toContain('trueLat')
  })

  it('leave out the holiday and the day before it, and days that a moderator closes', async () => {
    const batch = await desk.batchOf('holidays')
    await desk.travelToWithoutRest(new Date('2027-05-24T14:00:00Z'))
    const asked = { near: LOUISVILLE, quantity: 60 }
    const told = async () => {
      const { body } = await days(batch.publicId, asked).expect(200)
      return (body as ShipDayOffers).days.map(({ shipDay }) => shipDay)
    }
    // Memorial Day 2027 is Monday, May 31: nothing leaves on it.
    expect((await told()).slice(0, 3)).toEqual(['2027-05-26', '2027-06-01', '2027-06-02'])
    const staff = await desk.staff('staff@example.org')
    const keep = (body: object) => staff.post('/api/v1/moderation/no-ship-days').set(keyed()).send(body)
    await keep({ day: '2027-06-02', why: 'Carriers on strike', isOff: false }).expect(200)
    const kept = await keep({ day: '2027-05-31', why: 'Carriers work', isOff: true }).expect(200)
    expect(kept.body.days).toContainEqual({
      ...{ day: '2027-05-31', why: 'Carriers work', source: 'federal', isOff: true },
    })
    // The strike also closes the day on whose morrow it lies; the holiday taken off does not come back.
    expect((await told()).slice(0, 3)).toEqual(['2027-05-26', '2027-05-31', '2027-06-07'])
    await keep({ day: '2027-05-01', why: 'Long ago', isOff: false }).expect(422)
    await desk.visitor().get('/api/v1/moderation/no-ship-days').expect(401)
  })

  it('are refused where nothing is shipped', async () => {
    const [batch, near] = [await desk.batchOf('served', { body: { statesServed: ['OH'] } }), LOUISVILLE]
    const collected = await desk.batch('collected')
    const elsewhere = await days(batch.publicId, { near, quantity: 60 })
    expect([elsewhere.status, elsewhere.body.type]).toEqual([409, '/problems/not-shipped'])
    expect(elsewhere.body.detail).toContain('Kentucky')
    expect((await days(collected.publicId, { near, quantity: 60 })).body.type).toBe('/problems/not-shipped')
    expect((await days('A'.repeat(22), { near, quantity: 60 })).status).toBe(404)
  })
})

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

  it('carries a paper of everything that travels, kept as it stood', async () => {
    const box = await desk.dispatched('movement')
    const paper = (await box.bea.get(`${box.path}/movement-document`).expect(200)).body
    expect(paper).toMatchObject({
      seller: { licences: 'Class A 1142', address: expect.stringContaining('12 Mill Lane') },
      buyer: { name: 'Bea Holt', address: '77 Quiet Alley, Louisville, KY 40202' },
      ...{ count: 60, boxes: 1, carrier: 'Overnight air', tracking: '9400 1112 0255 5512' },
      scientificName: 'Lepomis macrochirus',
      notForRelease: expect.stringContaining('storm drain'),
    })
    const staff = await desk.staff('staff@example.org')
    expect((await staff.get(`${box.path}/movement-document`).expect(200)).body).toEqual(paper)
    expect(JSON.stringify(await box.seen(staff))).not.toContain('Quiet Alley')
  })

  it('prints how to pack and a label for each box, for its seller alone', async () => {
    const box = await desk.scheduled('labels', { body: { shipping: { ...shipping, mostInBox: 40 } } })
    const reply = await box.hatchery.get(`${box.path}/packing-sheet`).buffer(true).expect(200)
    expect(reply.headers['content-type']).toBe('application/pdf')
    const pages = await pdfWords(new Uint8Array(reply.body as Uint8Array))
    expect(pages).toHaveLength(3)
    expect(pages[0]).toMatch(/60 Bluegill/i)
    expect(pages[0]).toContain('2 boxes')
    expect(pages[0]).toContain('no free postal boxes')
    for (const [at, page] of pages.slice(1).entries()) {
      expect(page).toContain(`Box ${at + 1} of 2: 30`)
      for (const words of ['LIVE ANIMALS', 'This side up', 'Keep between', '77 Quiet Alley', '12 Mill Lane'])
        expect(page).toContain(words)
    }
    await box.bea.get(`${box.path}/packing-sheet`).expect(404)
    const perch = await desk.scheduled('open packing', { body: { taxonId: 'yellow_perch' } })
    const open = await perch.hatchery.get(`${perch.path}/packing-sheet`)
    expect([open.status, open.body.type]).toEqual([409, '/problems/packing-open'])
    expect(open.body.detail).toContain('it reaches Mon, May 10 from Mon, May 3 on.')
  })

  it('stands in both calendars on its own day, and is not called a pickup the evening before', async () => {
    const box = await desk.ready('calendar')
    const file = async (by: typeof box.bea) =>
      Buffer.from((await by.get(`${box.path}/calendar.ics`).expect(200)).text)
    const [mine, theirs] = [await file(box.bea), await file(box.hatchery)]
    expect([...calendarFaults(mine), ...calendarFaults(theirs)]).toEqual([])
    expect(mine.toString()).toContain('DTSTART:20270511T130000Z')
    expect(theirs.toString()).toContain('DTSTART:20270510T100000Z')
    expect(theirs.toString()).not.toContain('Quiet Alley')
    const remindAt = async (at: Date) => {
      desk.letters.length = 0
      await desk.travelToWithoutRest(at)
      await remindPickups()
      await remindBoxes()
      await remindBoxes()
      await desk.quiet()
      return desk.letters.filter(({ blocks }) => JSON.stringify(blocks).includes(box.order.orderId))
    }
    const before = await remindAt(new Date('2027-05-09T22:30:00Z'))
    expect(before.map(({ subject }) => subject)).toEqual(['Tomorrow: 1 box to bea'])
    await desk.travelTo(onShipDay(18))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    await box.act(box.hatchery, 'dispatch', leaving())
    const evening = await remindAt(onShipDay(22))
    expect(evening.map(({ subject, to }) => [subject, to.email])).toEqual([
      ['Tomorrow: your animals arrive', 'bea@example.org'],
    ])
    expect(JSON.stringify(evening)).toContain('Be at home')
  })
})
