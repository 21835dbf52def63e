import { eq } from 'drizzle-orm'
import { expect } from 'vitest'

import { listing } from '@/db/schema/listings'
import { order as orders } from '@/db/schema/orders'
import { shipment } from '@/db/schema/shipments'
import { readListing } from '@/server/listings/read-listing'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ShownOrder } from '@/shared/contracts/orders'
import { packingTicks } from '@/shared/contracts/ship-acts'
import type { DeskBatch } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

/** A Monday morning in Ohio, in a month when the usual weather does these fish no harm. */
export const SHIP_NOW = new Date('2027-05-03T14:00:00Z')
/** The agreed ship day, a Monday, and the hours of it. */
export const SHIP_DAY = '2027-05-10'
export const onShipDay = (hourUtc: number) =>
  new Date(`${SHIP_DAY}T${String(hourUtc).padStart(2, '0')}:00:00Z`)

export const beaAddress = {
  name: 'Bea Holt',
  street: '77 Quiet Alley',
  city: 'Louisville',
  state: 'KY',
  zip: '40202',
  phone: '(502) 555-0188',
}
export const LOUISVILLE = beaAddress.zip

export const shipping: NonNullable<FishBody['shipping']> = {
  packing: 'foam-38-overnight',
  boxCents: 1200,
  freightCents: 4850,
  carrier: 'Overnight air',
  carrierAccepts: true,
  holdsAtCounter: true,
  mostInBox: 100,
  days: ['mon', 'tue', 'wed'],
}

/** Sixty fish at $0.89, box 12.00, freight 48.50: the worked example of the money rules. */
const body: Partial<FishBody> = { shipping, tiers: [{ fromCount: 25, unitCents: 89 }] }

/** The paper that the demonstration rules ask a seller in Ohio for. */
export const permit = {
  kind: 'Ohio aquaculture permit, class A or B',
  number: 'A 1142',
  issuer: 'Ohio DNR',
  issuedOn: '2027-01-04',
  expiresOn: '2027-12-31',
}

interface Wish {
  body?: Partial<FishBody>
  /** Of the reservation's body. */
  change?: Record<string, unknown>
  ship?: Record<string, unknown>
}

export function shipBody(batch: DeskBatch, { change, ship }: Wish = {}) {
  return {
    quantity: 60,
    near: LOUISVILLE,
    version: 1,
    ticked: batch.ticks,
    ship: { shipDay: SHIP_DAY, deliverTo: 'door', address: beaAddress, ...ship },
    ...change,
  }
}

/** The order desk in May with a buyer in Kentucky, Bea, to whom boxes go. */
export async function openShipDesk(label: string) {
  const desk = await openOrderDesk(label)
  await desk.member('bea@example.org')
  await desk.travelToWithoutRest(SHIP_NOW)

  /** A batch that is shipped, with what a buyer in Kentucky has to tick. */
  async function batchOf(name: string, wish: Wish = {}): Promise<DeskBatch> {
    const built = await desk.batch(name, { body: { ...body, ...wish.body } })
    const { gate } = await readListing(null, built.publicId, LOUISVILLE)
    return { ...built, ticks: gate?.ticks.map((tick) => tick.id) ?? [] }
  }
  const ask = async (batch: DeskBatch, wish: Wish = {}, key = keyed()) => {
    const bea = await desk.signedIn('bea@example.org')
    return bea.post(`/api/v1/listings/${batch.publicId}/orders`).set(key).send(shipBody(batch, wish))
  }

  /** Reserved, not paid. */
  async function held(name: string, wish: Wish = {}) {
    const batch = await batchOf(name, wish)
    const reply = await ask(batch, wish)
    expect(reply.status, JSON.stringify(reply.body)).toBe(201)
    const order = reply.body as ShownOrder
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const path = `/api/v1/orders/${order.orderId}`
    const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
    /** With a key of one's own, to press again. */
    const pressAs = async (key: ReturnType<typeof keyed>, by: typeof bea, asked: [string, object]) => {
      const answer = await by.post(`${path}/${asked[0]}`).set(key).send(asked[1])
      await desk.quiet()
      return answer
    }
    const press = (by: typeof bea, what: string, send: object = {}) => pressAs(keyed(), by, [what, send])
    const act = async (by: typeof bea, what: string, send: object = {}) => {
      const answer = await press(by, what, send)
      expect(answer.status, JSON.stringify(answer.body)).toBe(200)
      return answer.body as ShownOrder
    }
    const stock = async () => (await desk.db.select().from(listing).where(eq(listing.id, batch.id)))[0]
    const orderIs = eq(orders.publicId, order.orderId)
    const row = async () => (await desk.db.select().from(orders).where(orderIs))[0]
    const setOrder = (change: Partial<typeof orders.$inferInsert>) =>
      desk.db.update(orders).set(change).where(orderIs)
    const setShipment = async (change: Partial<typeof shipment.$inferInsert>) =>
      desk.db
        .update(shipment)
        .set(change)
        .where(eq(shipment.orderId, (await row())?.id ?? 0))
    return { batch, order, bea, hatchery, path, seen, press, pressAs, act, stock, row, setOrder, setShipment }
  }

  /** Deposit paid: the day chosen with the reservation is agreed. */
  async function scheduled(name: string, wish: Wish = {}) {
    const box = await held(name, wish)
    await desk.pay(box.order)
    expect((await box.seen()).state).toBe('scheduled')
    return box
  }

  /** Everything paid, the animals counted. */
  async function ready(name: string, wish: Wish = {}) {
    const box = await scheduled(name, wish)
    await desk.pay(await box.act(box.bea, 'balance-payment'))
    await box.act(box.hatchery, 'readiness')
    return box
  }

  /** On its way since the afternoon of the ship day. */
  async function dispatched(name: string, wish: Wish = {}) {
    const box = await ready(name, wish)
    await desk.travelTo(onShipDay(18))
    await box.act(box.hatchery, 'route-papers', { papers: [permit] })
    await box.act(box.hatchery, 'route-check')
    const state = (await box.act(box.hatchery, 'dispatch', leaving())).state
    expect(state).toBe('dispatched')
    return box
  }
  return { ...desk, batchOf, ask, held, scheduled, ready, dispatched }
}

/** What a seller says when the box goes over the counter. */
export const leaving = (change: Record<string, unknown> = {}) => ({
  tracking: '9400 1112 0255 5512',
  ticks: [...packingTicks],
  ...change,
})

export type ShipDesk = OrderDesk & Awaited<ReturnType<typeof openShipDesk>>
export type Box = Awaited<ReturnType<ShipDesk['held']>>
