import { describe, expect, it } from 'vitest'

import { groupRoutes } from './group-routes'
import { checkedWords, dayTotals, routeDetail, routeLook } from './route-words'

import type { RouteRow } from '@/shared/contracts/ship-acts'

const row = (change: Partial<RouteRow>): RouteRow => ({
  orderId: 'a',
  state: 'ready',
  title: 'Bluegill fingerlings',
  quantity: 40,
  buyerName: 'June',
  to: 'Dayton, OH',
  shipDay: '2027-05-10',
  arriveDay: '2027-05-11',
  boxes: 2,
  balancePaid: true,
  ...change,
})

describe('what a seller ships', () => {
  it('stands by day, soonest first, within a day as it came', () => {
    const rows = [
      row({ orderId: 'late', shipDay: '2027-05-17' }),
      row({ orderId: 'one' }),
      row({ orderId: 'two' }),
    ]
    expect(groupRoutes(rows).map((day) => [day.shipDay, day.rows.map(({ orderId }) => orderId)])).toEqual([
      ['2027-05-10', ['one', 'two']],
      ['2027-05-17', ['late']],
    ])
  })

  it('is summed for the day', () => {
    expect(dayTotals([row({})])).toBe('1 order, 2 boxes')
    expect(dayTotals([row({}), row({ boxes: 1, verdict: 'unsafe' })])).toBe('2 orders, 3 boxes, 1 not safe')
  })

  it('says a way nobody has looked at so, never as safe', () => {
    expect(routeLook(row({})).word).toBe('Not looked at yet')
    expect(routeLook(row({ verdict: 'safe' })).word).toBe('Safe to ship')
    expect(routeDetail(row({ basis: 'forecast', words: 'No packs.' }))).toBe('By the forecast. No packs.')
    expect(routeDetail(row({}))).toBe('')
  })

  it('tells what looking again has brought', () => {
    const rows = [row({ verdict: 'safe' }), row({ verdict: 'unsafe' })]
    expect(checkedWords({ rows, held: 0 })).toBe('Looked at 2 ways: 1 not safe.')
    const held = [row({ verdict: 'safe' }), row({ verdict: 'unsafe', state: 'weather_hold' })]
    expect(checkedWords({ rows: held, held: 1 })).toBe('Looked at 2 ways; 1 held, and the buyers told.')
    expect(checkedWords({ rows: held, held: 0 })).toBe('Looked at 1 way: none to be held.')
    expect(checkedWords({ rows: rows.slice(0, 1), held: 0 })).toBe('Looked at 1 way: none to be held.')
  })
})
