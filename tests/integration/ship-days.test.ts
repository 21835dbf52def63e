import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import type { ShipDayOffers } from '@/shared/contracts/shipments'
import { keyed } from '@/tests/support/order-desk'
import { LOUISVILLE, openShipDesk, SHIP_NOW, type ShipDesk } from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('ship_days')
  await buildMember(desk.db, { email: 'staff@example.org', role: 'member,moderator' })
})
beforeEach(() => desk.travelToWithoutRest(SHIP_NOW))
afterAll(() => desk.close())

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
