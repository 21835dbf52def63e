import Papa from 'papaparse'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { monthBegins } from '@/server/statements/make-statement'
import type { SellerRecord, Statement } from '@/shared/contracts/statements'
import { openShipDesk, type ShipDesk } from '@/tests/support/ship-desk'

let desk: ShipDesk
beforeAll(async () => {
  desk = await openShipDesk('statements')
})
afterAll(() => desk.close())

const read = async (path: string) => {
  const hatchery = await desk.signedIn(desk.hatcheryEmail)
  return hatchery.get(`/api/v1/${path}`)
}

describe('the statement of a month', () => {
  it('names every cent of what was released in it, and sums up to the ledger', async () => {
    const box = await desk.dispatched('for the books')
    await desk.travelTo(new Date('2027-05-11T14:00:00Z'))
    await box.act(box.bea, 'arrival')
    await box.act(box.bea, 'confirmation')
    const late = await desk.scheduled('kept', { ship: { shipDay: '2027-05-17' } })
    // Two days before, and no balance came: the deposit stays.
    await desk.travelTo(new Date('2027-05-16T12:00:00Z'))
    expect((await late.seen()).reason).toBe('balance_unpaid')

    const reply = await read('statements/2027-05')
    expect(reply.status).toBe(200)
    const told = reply.body as Statement
    const whole = told.rows.find((row) => row.kind === 'complete')
    // The worked example of the money rules: 60 fish at $0.89, box 12.00, freight 48.50, fee 6 % of the goods.
    expect(whole).toMatchObject({
      ...{ day: '2027-05-11', quantity: 60, paidCents: 11_390, refundedCents: 0, taxCents: 0 },
      ...{ feeCents: 320, yoursCents: 11_070 },
    })
    const kept = told.rows.find((row) => row.kind === 'kept')
    expect(kept).toMatchObject({ paidCents: 1335, feeCents: 80, yoursCents: 1255 })
    for (const row of told.rows)
      expect(row.paidCents - row.refundedCents - row.taxCents - row.feeCents).toBe(row.yoursCents)
    expect(told.total.yoursCents).toBe(11_070 + 1255)
    expect(((await read('statements/2027-04')).body as Statement).rows).toEqual([])
  })

  it('is the same as a table, with numbers as numbers', async () => {
    const told = (await read('statements/2027-05')).body as Statement
    const hatchery = await desk.signedIn(desk.hatcheryEmail)
    const reply = await hatchery.get('/api/v1/statements/2027-05/csv').buffer(true)
    expect(reply.headers['content-type']).toMatch(/^text\/csv/)
    const { data } = Papa.parse<Record<string, string>>(reply.text.replace(/^\ufeff/, ''), {
      header: true,
      skipEmptyLines: true,
    })
    expect(data.map((row) => Number(row['Yours, $']))).toEqual(told.rows.map((row) => row.yoursCents / 100))
    expect(data.map((row) => row.Order)).toEqual(told.rows.map((row) => row.orderId))
  })

  it('is refused for a month that is none, and is nobody else’s', async () => {
    expect((await read('statements/2027-13')).status).toBe(404)
    const bea = await desk.signedIn('bea@example.org')
    expect((await bea.get('/api/v1/statements/2027-05')).status).toBe(403)
    expect((await desk.visitor().get('/api/v1/record')).status).toBe(401)
  })

  it('begins a month by the calendar of the farm', () => {
    expect(monthBegins('2027-03', 'America/New_York').toISOString()).toBe('2027-03-01T05:00:00.000Z')
    expect(monthBegins('2027-11', 'America/Phoenix').toISOString()).toBe('2027-11-01T07:00:00.000Z')
  })
})

describe('the record of a seller', () => {
  it('shows what was sold month by month, twelve of them, and what the law counts', async () => {
    const told = (await read('record')).body as SellerRecord
    expect(told.months).toHaveLength(12)
    expect(told.months.at(-1)).toMatchObject({
      month: '2027-05',
      kinds: [{ quantity: 60, goodsCents: 5340 }],
    })
    expect(told.months[0]).toEqual({ month: '2026-06', kinds: [] })
    expect(told.inform).toEqual({ sales: 1, grossCents: 5340, isOver: false })
  })
})
