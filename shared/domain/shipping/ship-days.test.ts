import { describe, expect, it } from 'vitest'

import {
  judgeShipDay,
  lawfulShipDays,
  nearestShipDay,
  type ShipDayRule,
} from '@/shared/domain/shipping/ship-days'

const overnight: ShipDayRule = { days: ['mon', 'tue', 'wed'], nights: 1, noShipDays: new Map() }
const twoDays: ShipDayRule = { ...overnight, days: ['mon', 'tue'], nights: 2 }
const codes = (day: string, rule: ShipDayRule) => judgeShipDay(day, rule).faults.map(({ code }) => code)

// 2027-07-04 is a Sunday: the holiday is observed on Monday the 5th.
const july = new Map([['2027-07-05', 'Independence Day (observed)']])

describe('the days live animals may leave on', () => {
  it('takes Monday to Wednesday and says when the box arrives', () => {
    expect(judgeShipDay('2027-05-12', overnight)).toEqual({
      shipDay: '2027-05-12',
      arriveDay: '2027-05-13',
      faults: [],
    })
    expect(judgeShipDay('2027-05-11', twoDays).arriveDay).toBe('2027-05-13')
  })

  it('refuses other days of the week, and days the seller did not choose', () => {
    for (const day of ['2027-05-13', '2027-05-14', '2027-05-15', '2027-05-16'])
      expect(codes(day, overnight)).toContain('not-a-ship-day')
    expect(codes('2027-05-12', twoDays)).toEqual(['not-a-ship-day'])
  })

  it('lets nothing leave on a holiday, pass one, or arrive on one', () => {
    expect(codes('2027-07-05', { ...overnight, noShipDays: july })).toEqual(['holiday'])
    const tuesday = new Map([['2027-05-11', 'A day of ours']])
    expect(codes('2027-05-10', { ...overnight, noShipDays: tuesday })).toEqual(['arrives-on-holiday'])
    expect(codes('2027-05-10', { ...twoDays, noShipDays: tuesday })).toEqual(['holiday-on-the-way'])
    const wednesday = new Map([['2027-05-12', 'A day of ours']])
    expect(codes('2027-05-10', { ...twoDays, noShipDays: wednesday })).toEqual(['arrives-on-holiday'])
  })

  it('names every fault of a Thursday before a Friday holiday, and the holiday itself', () => {
    const friday = new Map([['2027-06-18', 'Juneteenth (observed)']])
    const judged = judgeShipDay('2027-06-17', { ...overnight, noShipDays: friday })
    expect(judged.faults).toEqual([
      { code: 'not-a-ship-day', day: '2027-06-17', why: null },
      { code: 'arrives-on-holiday', day: '2027-06-18', why: 'Juneteenth (observed)' },
    ])
    expect(nearestShipDay('2027-06-17', { ...overnight, noShipDays: friday })?.shipDay).toBe('2027-06-21')
  })

  it('never lets a box arrive on a Sunday, however many nights it takes', () => {
    const slow: ShipDayRule = { ...overnight, nights: 4 }
    expect(codes('2027-05-12', slow)).toEqual(['arrives-on-sunday'])
  })

  it('lists the next ones in order, past a holiday week and a year’s end', () => {
    const days = lawfulShipDays(
      '2027-12-29',
      { ...overnight, noShipDays: new Map([['2027-12-31', 'New Year']]) },
      3,
    )
    expect(days.map(({ shipDay }) => shipDay)).toEqual(['2027-12-29', '2028-01-03', '2028-01-04'])
    expect(lawfulShipDays('2027-12-29', { ...overnight, days: [] }, 3)).toEqual([])
    expect(nearestShipDay('2027-12-29', { ...overnight, days: [] })).toBeNull()
  })

  it('throws for what is no date rather than invent one', () => {
    expect(() => judgeShipDay('2027-02-30', overnight)).toThrow(RangeError)
    expect(() => lawfulShipDays('soon', overnight, 1)).toThrow(RangeError)
  })
})
