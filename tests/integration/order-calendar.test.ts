import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { seriesFaults } from '@/shared/calendar/series-faults'
import { reserveBody } from '@/tests/support/desk-ground'
import { keyed } from '@/tests/support/order-desk'
import { openPickupDesk, type PickupDesk } from '@/tests/support/pickup-desk'

let desk: PickupDesk
beforeAll(async () => {
  desk = await openPickupDesk('order_calendar')
  await desk.member('eve@example.org')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
afterAll(() => desk.close())

type Agent = Awaited<ReturnType<PickupDesk['signedIn']>>

async function file(by: Agent, path: string): Promise<Buffer> {
  const reply = await by.get(`${path}/calendar.ics`).expect(200)
  return Buffer.from(reply.text)
}
const valueOf = (ics: Buffer | string, name: string) =>
  new RegExp(`^${name}:(.*)\r$`, 'm').exec(ics.toString().replaceAll('\r\n ', ''))?.[1]

const attached = (to: string) =>
  desk.letters.filter((letter) => letter.to.email === to && letter.calendar).at(-1)?.calendar

describe('the calendar file of an order', () => {
  it('is valid, tells each party what it may know, and says when', async () => {
    const { bea, hatchery, path, seen } = await desk.scheduled('file')
    const reply = await bea.get(`${path}/calendar.ics`).expect(200)
    expect(reply.headers['content-type']).toBe('text/calendar; charset=utf-8; method=PUBLISH')
    expect(reply.headers['content-disposition']).toBe('attachment; filename="pickup.ics"')
    expect(reply.headers['cache-control']).toBe('no-store')
    const [mine, theirs] = [await file(bea, path), await file(hatchery, path)]
    expect(calendarFaults(mine)).toEqual([])
    expect(calendarFaults(theirs)).toEqual([])
    const { slot } = await seen()
    expect(valueOf(mine, 'DTSTART')).toBe(slot?.startsAt.replace(/\.\d+|[-:]/g, ''))
    expect(valueOf(mine, 'LOCATION')).toContain('12 Mill Lane')
    expect(valueOf(theirs, 'SUMMARY')).toContain('bea')
    expect(valueOf(mine, 'UID')).toBe(valueOf(theirs, 'UID'))
  })

  it('is a 404 for a stranger, for staff, for a visitor a 401, and before a time is agreed', async () => {
    const { path, bea } = await desk.scheduled('strangers')
    const eve = await desk.signedIn('eve@example.org')
    const staff = await desk.staff('staff@example.org')
    await eve.get(`${path}/calendar.ics`).expect(404)
    await staff.get(`${path}/calendar.ics`).expect(404)
    await desk.visitor().get(`${path}/calendar.ics`).expect(401)
    await bea.get(`/api/v1/orders/${'A'.repeat(22)}/calendar.ics`).expect(404)
    const batch = await desk.batch('unpaid')
    const held = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
      .expect(201)
    await bea.get(`/api/v1/orders/${held.body.orderId as string}/calendar.ics`).expect(404)
  })

  it('keeps its UID while SEQUENCE rises with a move and with the end, which is a CANCEL', async () => {
    const { path, bea, hatchery, act, move } = await desk.scheduled('life')
    const files = [await file(bea, path)]
    expect(valueOf(files[0] ?? '', 'SEQUENCE')).toBe('0')
    await move()
    files.push(await file(bea, path))
    expect(valueOf(files[1] ?? '', 'SEQUENCE')).toBe('1')
    expect(valueOf(files[1] ?? '', 'DTSTART')).not.toBe(valueOf(files[0] ?? '', 'DTSTART'))
    await act(hatchery, 'readiness')
    expect(valueOf(await file(bea, path), 'SEQUENCE')).toBe('1')
    await act(bea, 'cancellation')
    files.push(await file(bea, path))
    expect(valueOf(files[2] ?? '', 'SEQUENCE')).toBe('2')
    expect(valueOf(files[2] ?? '', 'METHOD')).toBe('CANCEL')
    expect(valueOf(files[2] ?? '', 'STATUS')).toBe('CANCELLED')
    // The place is no longer theirs to know.
    expect(valueOf(files[2] ?? '', 'LOCATION')).toBeUndefined()
    for (const one of files) expect(calendarFaults(one)).toEqual([])
    expect(seriesFaults(files)).toEqual([])
  })

  it('goes with the mails of the agreement, the move and the end, to both', async () => {
    const { hatchery, act, move } = await desk.scheduled('mails')
    const told: (string | undefined)[][] = []
    const note = () =>
      told.push(
        ['bea@example.org', desk.hatcheryEmail].map((to) => {
          const calendar = attached(to)
          expect(calendarFaults(Buffer.from(calendar?.text ?? ''))).toEqual([])
          return `${calendar?.method} ${valueOf(calendar?.text ?? '', 'SEQUENCE')}`
        }),
      )
    note()
    await move()
    note()
    await act(hatchery, 'cancellation', { reason: 'die-off' })
    note()
    expect(told).toEqual([
      ['PUBLISH 0', 'PUBLISH 0'],
      ['PUBLISH 1', 'PUBLISH 1'],
      ['CANCEL 2', 'CANCEL 2'],
    ])
  })

  it('is not sent where no time had been agreed', async () => {
    const before = desk.letters.length
    const batch = await desk.batch('declined', { body: { accept: 'ask' } })
    const bea = await desk.signedIn('bea@example.org')
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const held = await bea
      .post(`/api/v1/listings/${batch.publicId}/orders`)
      .set(keyed())
      .send(reserveBody(batch))
    await desk.pay(held.body)
    await hatchery
      .post(`/api/v1/orders/${held.body.orderId as string}/refusal`)
      .set(keyed())
      .send({ reason: 'sick' })
      .expect(200)
    await desk.quiet()
    const letters = desk.letters.slice(before)
    expect(letters.length).toBeGreaterThan(2)
    expect(letters.filter((letter) => letter.calendar)).toEqual([])
  })
})
