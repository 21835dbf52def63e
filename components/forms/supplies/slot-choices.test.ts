import { expect, it } from 'vitest'

import { isSameSlot, slotChoices } from './slot-choices'

const days = (now: string) => slotChoices('2027-04-12', now).map(({ window }) => [window.day, window.from])

it('offers this evening, tomorrow morning and tomorrow evening', () => {
  expect(days('09:00')).toEqual([
    ['2027-04-12', '17:00'],
    ['2027-04-13', '07:30'],
    ['2027-04-13', '17:00'],
  ])
})

it('offers no slot that has begun', () => {
  expect(days('16:59')).toHaveLength(3)
  expect(days('17:00').map(([day]) => day)).toEqual(['2027-04-13', '2027-04-13'])
})

it('crosses the end of a month', () => {
  expect(slotChoices('2027-02-28', '20:00')[0]?.window.day).toBe('2027-03-01')
})

it('knows a slot again, whatever its places', () => {
  const slot = { day: '2027-04-13', from: '17:00', until: '19:00', capacity: '10' }
  expect(isSameSlot(slot, { ...slot, capacity: '4' })).toBe(true)
  expect(isSameSlot(slot, { ...slot, until: '18:00' })).toBe(false)
})
