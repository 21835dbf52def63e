import { eq } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { seller as sellers } from '@/db/schema/sellers'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { pdfWords } from '@/tests/support/pdf-words'
import {
  beaAddress,
  leaving,
  LOUISVILLE,
  onShipDay,
  openShipDesk,
  permit,
  SHIP_NOW,
  shipping,
  type ShipDesk,
} from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('ship_limits')
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterEach(async () => {
  // Holds that nobody pays end by themselves.
  await desk.travelTo(new Date(SHIP_NOW.getTime() + 20 * 60_000))
  expect(await brokenInvariants(desk.db)).toEqual([])
})
afterAll(() => desk.close())

const addressed = (change: Partial<typeof beaAddress>) => ({
  ship: { address: { ...beaAddress, ...change } },
})

describe('numbers at their ends', () => {
  it('ship days are told of one animal, of none never, and of a million in words', async () => {
    const batch = await desk.batchOf('counts')
    const ask = (quantity: number) =>
      desk.visitor().get(`/api/v1/listings/${batch.publicId}/ship-days`).query({ near: LOUISVILLE, quantity })
    expect((await ask(0)).status).toBe(422)
    expect((await ask(1)).body).toMatchObject({ boxes: 1, boxCents: 1200 })
    const many = await ask(1_000_000)
    expect([many.status, many.body.type]).toEqual([422, '/problems/fields-invalid'])
    expect(many.body.errors).toMatchObject([{ pointer: 'query:quantity' }])
  })

  it('five hundred boxes of one fish are one order; what comes to more than the house takes is none', async () => {
    const dear = { ...shipping, mostInBox: 1, boxCents: 100_000, freightCents: 100_000 }
    const batch = await desk.batchOf('dear boxes', { body: { shipping: dear } })
    const refused = await desk.ask(batch, { change: { quantity: 100 } })
    expect([refused.status, refused.body.errors]).toMatchObject([422, [{ pointer: '#/quantity' }]])
    const cheap = { ...shipping, mostInBox: 1, boxCents: 0, freightCents: 0 }
    const box = await desk.held('a fish a box', {
      body: { shipping: cheap },
      change: { quantity: 500 },
    })
    expect(box.order).toMatchObject({
      money: { goodsCents: 44_500, boxCents: 0, freightCents: 0, totalCents: 44_500 },
      shipment: { boxes: 500 },
    })
  })

  it('no day is promised further ahead than any is offered, and none that the calendar does not have', async () => {
    const batch = await desk.batchOf('far ahead')
    const far = await desk.ask(batch, { ship: { shipDay: '2031-05-05' } })
    expect([far.status, far.body.errors]).toMatchObject([422, [{ pointer: '#/ship/shipDay' }]])
    for (const shipDay of ['2027-02-30', 'tomorrow', ''])
      expect((await desk.ask(batch, { ship: { shipDay } })).status).toBe(422)
  })

  it('sixty papers are too many for one box', async () => {
    const box = await desk.ready('papers')
    const papers = Array.from({ length: 60 }, (_, at) => ({ ...permit, number: `A ${at}` }))
    expect((await box.press(box.hatchery, 'route-papers', { papers })).status).toBe(422)
  })
})

describe('what is printed', () => {
  it('asks for an address in letters that a carrier can read, and takes accents', async () => {
    const batch = await desk.batchOf('letters')
    for (const [field, text] of [
      ['name', 'Олена Шевченко'],
      ['street', '77 Quiet Alley 🐟'],
      ['city', '路易斯维尔'],
    ] as const) {
      const reply = await desk.ask(batch, addressed({ [field]: text }))
      expect([reply.status, reply.body.errors]).toMatchObject([
        422,
        [{ pointer: `#/ship/address/${field}`, detail: expect.stringContaining('A to Z') }],
      ])
    }
    // Typed on some keyboards as a letter and an accent after it.
    const box = await desk.scheduled('accents', addressed({ name: 'Zoe\u0308 Núñez' }))
    expect((await box.seen()).shipment?.address?.name).toBe('Zoë Núñez')
    const reply = await box.hatchery.get(`${box.path}/packing-sheet`).buffer(true).expect(200)
    expect((await pdfWords(reply.body as Uint8Array))[1]).toContain('Zoë Núñez')
  })

  it('keeps the longest label on one page, and prints nothing that the font does not have', async () => {
    const box = await desk.scheduled('long', {
      ...addressed({ name: 'N'.repeat(80), street: 'W'.repeat(120), city: 'M'.repeat(64) }),
      body: { shipping: { ...shipping, carrier: 'C'.repeat(60) } },
    })
    await desk.db.update(sellers).set({ farmName: 'Łąka ферма 🐟', street: 'W'.repeat(120) })
    const reply = await box.hatchery.get(`${box.path}/packing-sheet`).buffer(true).expect(200)
    const pages = await pdfWords(reply.body as Uint8Array)
    expect(pages).toHaveLength(2)
    expect(pages[1]).toContain('?aka ????? ?')
    await desk.db.update(sellers).set({ farmName: 'Marsh Hatchery', street: '12 Mill Lane' })
  })
})

describe('a box does not leave', () => {
  it('while nobody knows how it is packed, however usual the weather', async () => {
    const perch = await desk.ready('open packing', { body: { taxonId: 'yellow_perch' } })
    await desk.travelTo(onShipDay(14))
    await perch.act(perch.hatchery, 'route-papers', { papers: [permit] })
    const checked = await perch.act(perch.hatchery, 'route-check')
    expect(checked.shipment?.check).toMatchObject({ verdict: 'safe', basis: 'long-term' })
    expect(checked.shipment?.check?.packing).toBeUndefined()
    const { status, body } = await perch.press(perch.hatchery, 'dispatch', leaving())
    expect([status, body.errors]).toMatchObject([409, [{ pointer: '#/check' }]])
    expect((await perch.seen()).state).toBe('ready')
  })

  it('before the animals are ready, whatever day was asked for', async () => {
    const batch = await desk.batchOf('not ready', { body: { readyOn: '2027-05-17' } })
    const early = await desk.ask(batch)
    expect([early.status, early.body.errors]).toMatchObject([422, [{ pointer: '#/ship/shipDay' }]])
    expect((await desk.ask(batch, { ship: { shipDay: '2027-05-17' } })).status).toBe(201)
  })
})

describe('money of a shipped order', () => {
  it('comes back whole inside the free time, box and freight too', async () => {
    const box = await desk.ready('free')
    await box.act(box.bea, 'cancellation')
    expect((await box.seen()).money).toMatchObject({ refundedCents: 11_390, strip: { heldCents: 0 } })
  })

  it('keeps the deposit on the goods alone when everything was paid at once', async () => {
    const box = await desk.scheduled('paid whole', { change: { payMode: 'full' } })
    expect(box.order.money.firstChargeCents).toBe(11_390)
    await desk.travelTo(new Date('2027-05-08T14:00:00Z'))
    await box.act(box.bea, 'cancellation')
    expect((await box.seen()).money).toMatchObject({
      refundedCents: 10_055,
      feeCents: 80,
      strip: { heldCents: 0, releasedCents: 1255 },
    })
  })
})

describe('an order that is open while its listing changes', () => {
  it('runs on by the terms it was made with, also when the seller moves', async () => {
    const box = await desk.ready('moved')
    const where = eq(sellers.id, desk.hatchery.id)
    await desk.db.update(sellers).set({ zone: 'America/Phoenix' }).where(where)
    await desk.travelTo(onShipDay(14))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    expect((await box.act(box.hatchery, 'dispatch', leaving())).state).toBe('dispatched')
    await desk.db.update(sellers).set({ zone: 'America/New_York' }).where(where)
  })
})
