import { describe, expect, it } from 'vitest'

import { bedMark, isLotCodeOf, nextLotCode, readLotCode } from '@/shared/domain/produce/lot-code'

describe('lot codes', () => {
  it('are made from the harvest day, the bed and a running mark', () => {
    expect(nextLotCode('2027-04-12', null, [])).toBe('L-0412')
    expect(nextLotCode('2027-04-12', null, ['L-0412'])).toBe('L-0412-2')
    expect(nextLotCode('2027-04-12', 'bed 3', [])).toBe('L-0412-B3')
    expect(nextLotCode('2027-04-12', 'East', ['L-0412-EAST', 'L-0412-EAST-2'])).toBe('L-0412-EAST-3')
  })

  it('run out after 99 lots of one bed and day, and need a day of the calendar', () => {
    const all = Array.from({ length: 99 }, (_, at) => (at === 0 ? 'L-0412' : `L-0412-${at + 1}`))
    expect(nextLotCode('2027-04-12', null, all.slice(0, 98))).toBe('L-0412-99')
    expect(nextLotCode('2027-04-12', null, all)).toBeNull()
    expect(nextLotCode('2027-02-30', null, [])).toBeNull()
  })

  it('are read back as they were made', () => {
    for (const bed of [null, '3', 'bed 12', 'East', 'Nft rail 2'])
      for (const taken of [0, 1, 20]) {
        const used: string[] = []
        for (let n = 0; n < taken; n++) used.push(nextLotCode('2028-02-29', bed, used) ?? '')
        const code = nextLotCode('2028-02-29', bed, used) ?? ''
        expect(readLotCode(code)).toEqual({ monthDay: '0229', bed: bed && bedMark(bed), run: taken + 1 })
        expect(isLotCodeOf(code, '2028-02-29')).toBe(true)
        expect(isLotCodeOf(code, '2028-02-28')).toBe(false)
      }
  })

  it.each([
    '',
    'L-412',
    'l-0412',
    'L-1312',
    'L-0230',
    'L-0412-1',
    'L-0412-02',
    'L-0412-',
    'L-0412-TOOLONG',
    'L-0412 ',
    'L-0412-B3-1',
    "L-0412'--",
  ])('does not take %j for one', (code) => expect(readLotCode(code)).toBeNull())
})
