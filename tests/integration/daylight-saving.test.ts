import ICAL from 'ical.js'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { pickupWindow } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { applyWindows, checkWindows } from '@/server/listings/apply-windows'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printSlot } from '@/shared/times/print-time'
import { openPickupDesk, type PickupDesk } from '@/tests/support/pickup-desk'

let desk: PickupDesk
beforeAll(async () => {
  desk = await openPickupDesk('daylight_saving')
})
afterAll(() => desk.close())

const typed = (day: string, from: string, until: string) => ({ day, from, until, capacity: 4 })

function slotOf(order: ShownOrder) {
  if (!order.slot) throw new Error('no time is agreed')
  return order.slot
}

/** The times of a calendar file, by a reader of its own. */
function readCalendar(text: string) {
  const event = new ICAL.Event(
    new ICAL.Component(ICAL.parse(text) as unknown[]).getFirstSubcomponent('vevent') ?? undefined,
  )
  return {
    startsAt: event.startDate.toJSDate().toISOString(),
    endsAt: event.endDate.toJSDate().toISOString(),
  }
}

/** What the page says, what a calendar program reads, and what stands in the buyer's last mail with a file. */
async function told({ bea, path, seen }: Awaited<ReturnType<PickupDesk['scheduled']>>) {
  const slot = slotOf(await seen())
  const { zone } = slot
  const file = (await bea.get(`${path}/calendar.ics`).expect(200)).text
  const letter = desk.letters
    .filter(({ to, calendar }) => to.email === 'bea@example.org' && calendar)
    .findLast(({ blocks }) =>
      blocks.some((block) => block.kind === 'button' && block.url.includes(path.slice(-22))),
    )
  const rows = letter?.blocks.flatMap((block) => (block.kind === 'facts' ? block.rows : [])) ?? []
  return {
    page: printSlot(slot),
    file: printSlot({ ...readCalendar(file), zone }),
    mail: rows.find(([name]) => name === 'Pickup' || name === 'When')?.[1],
    mailFile: printSlot({ ...readCalendar(letter?.calendar?.text ?? ''), zone }),
  }
}

const same = (words: string) => ({ page: words, file: words, mail: words, mailFile: words })

async function moveFarm(zone: string): Promise<void> {
  await desk.db.update(seller).set({ zone }).where(eq(seller.id, desk.hatchery.id))
}

describe('a pickup in the night the clocks change', () => {
  it.each([
    {
      night: typed('2026-11-01', '00:30', '02:30'),
      words: 'Sun, Nov 1, 12:30 AM EDT to 2:30 AM EST',
      hours: 3,
    },
    {
      night: typed('2027-03-14', '01:30', '03:00'),
      words: 'Sun, Mar 14, 1:30 AM EST to 3:00 AM EDT',
      hours: 0.5,
    },
  ])('is the same on the page, in the mail and in both files: $words', async ({ night, words, hours }) => {
    await desk.travelToWithoutRest(new Date(Date.parse(`${night.day}T15:00:00Z`) - 10 * 86_400_000))
    const pickup = await desk.scheduled(words, { windows: [night] })
    expect(await told(pickup)).toEqual(same(words))
    const { startsAt, endsAt } = slotOf(await pickup.seen())
    expect((Date.parse(endsAt) - Date.parse(startsAt)) / 3_600_000).toBe(hours)
  })
})

describe('a seller who moves to another zone', () => {
  it('takes no order along: it keeps its time and its zone, and nobody takes its window away', async () => {
    await desk.travelToWithoutRest(new Date('2027-03-05T15:00:00Z'))
    const windows = [typed('2027-03-14', '09:00', '10:00'), typed('2027-03-15', '09:00', '10:00')]
    const pickup = await desk.scheduled('moves', { windows })
    const words = 'Sun, Mar 14, 9:00 AM to 10:00 AM EDT'
    expect(await told(pickup)).toEqual(same(words))
    await moveFarm('America/Chicago')
    expect(await told(pickup)).toEqual(same(words))

    const { id: listingId, body } = pickup.batch
    const wanted = { listingId, body, zone: 'America/Chicago', at: now() }
    await expect(inTransaction((tx) => checkWindows(wanted, tx))).rejects.toMatchObject({
      errors: [expect.objectContaining({ detail: expect.stringContaining('cannot be moved') })],
    })
    await inTransaction((tx) => applyWindows(wanted, tx))
    const rows = await desk.db.select().from(pickupWindow).where(eq(pickupWindow.listingId, listingId))
    const open = rows.filter(({ closed }) => closed === 0)
    const printed = open.map((row) =>
      printSlot({ startsAt: row.startsAt.toISOString(), endsAt: row.endsAt.toISOString(), zone: row.zone }),
    )
    expect(printed.toSorted()).toEqual([
      'Mon, Mar 15, 9:00 AM to 10:00 AM CDT',
      'Sun, Mar 14, 9:00 AM to 10:00 AM CDT',
      words,
    ])
    expect(await told(pickup)).toEqual(same(words))
    await moveFarm('America/New_York')
  })

  it('has windows of the same instants called by the new zone, while an order keeps the name it was told', async () => {
    await desk.travelToWithoutRest(new Date('2027-06-01T15:00:00Z'))
    await moveFarm('America/Phoenix')
    desk.hatchery.zone = 'America/Phoenix'
    const pickup = await desk.scheduled('same hour', { windows: [typed('2027-06-14', '09:00', '10:00')] })
    const words = 'Mon, Jun 14, 9:00 AM to 10:00 AM MST'
    expect(await told(pickup)).toEqual(same(words))
    const { id: listingId, body } = pickup.batch
    // In summer nine in Phoenix is nine in Los Angeles.
    await inTransaction((tx) => applyWindows({ listingId, body, zone: 'America/Los_Angeles', at: now() }, tx))
    const rows = await desk.db.select().from(pickupWindow).where(eq(pickupWindow.listingId, listingId))
    expect(rows).toMatchObject([{ zone: 'America/Los_Angeles', taken: 1, closed: 0 }])
    expect(await told(pickup)).toEqual(same(words))
  })
})
