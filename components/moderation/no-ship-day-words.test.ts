import { expect, it } from 'vitest'

import { noShipDayErrors, noShipDayWords } from './no-ship-day-words'

it('says a day with its year, in no zone but the calendar’s', () => {
  expect(noShipDayWords('2027-09-06')).toBe('Monday, September 6, 2027')
})

it('wants a day that is not on the list and what is on it; one taken off may come back', () => {
  const taken = [
    { day: '2027-09-06', isOff: false },
    { day: '2027-11-11', isOff: true },
  ]
  expect(noShipDayErrors({ day: '', why: '' }, taken)).toHaveLength(2)
  expect(noShipDayErrors({ day: '2027-09-06', why: 'Labor Day' }, taken)).toEqual([
    { fieldId: 'no-ship-day', message: 'That day is on the list already.' },
  ])
  expect(noShipDayErrors({ day: '2027-11-11', why: 'Storm' }, taken)).toEqual([])
})
