import { expect } from 'vitest'

import type { ListingBody } from '@/shared/contracts/listings'
import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed, openOrderDesk, type OrderDesk } from '@/tests/support/order-desk'

const DAY_MS = 86_400_000

interface Wish {
  /** Days and hours at the hatchery in Ohio; the order takes the first, the second is there to move to. */
  windows?: ListingBody['windows']
  full?: boolean
}

/** The order desk with a buyer, Bea, whose pickup is agreed. */
export async function openPickupDesk(label: string) {
  const desk = await openOrderDesk(label)
  await desk.member('bea@example.org')
  const ahead = (days: number) => new Date(Date.now() + days * DAY_MS).toISOString().slice(0, 10)
  const usual = [10, 12].map((days) => ({ day: ahead(days), from: '09:00', until: '10:00', capacity: 4 }))

  async function scheduled(name: string, wish: Wish = {}) {
    const batch = await desk.batch(name, { body: { windows: wish.windows ?? usual } })
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const body = reserveBody(batch, { payMode: wish.full ? 'full' : 'deposit' })
    const reply = await bea.post(`/api/v1/listings/${batch.publicId}/orders`).set(keyed()).send(body)
    expect(reply.status, JSON.stringify(reply.body)).toBe(201)
    const order = reply.body as ShownOrder
    await desk.pay(order)
    const path = `/api/v1/orders/${order.orderId}`
    const seen = async (by = bea) => (await by.get(path).expect(200)).body as ShownOrder
    expect((await seen()).state).toBe('scheduled')
    const act = async (by: typeof bea, what: string, send: object = {}) => {
      const answer = await by.post(`${path}/${what}`).set(keyed()).send(send)
      expect(answer.status, JSON.stringify(answer.body)).toBe(200)
      await desk.quiet()
      return answer.body as ShownOrder
    }
    /** A pickup can be moved once it is ready. */
    const move = async (by = bea) => {
      await act(hatchery, 'readiness')
      return act(by, 'slot', { windowId: batch.windows[1]?.publicId })
    }
    return { batch, order, bea, hatchery, path, seen, act, move }
  }
  return { ...desk, scheduled }
}

export type PickupDesk = OrderDesk & Awaited<ReturnType<typeof openPickupDesk>>
