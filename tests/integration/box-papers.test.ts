import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import { remindBoxes } from '@/server/notices/remind-boxes'
import { remindPickups } from '@/server/notices/remind-pickups'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { pdfWords } from '@/tests/support/pdf-words'
import {
  leaving,
  onShipDay,
  openShipDesk,
  permit,
  SHIP_NOW,
  shipping,
  type ShipDesk,
} from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('box_papers')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterAll(() => desk.close())

describe('what goes with a box', () => {
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
